namespace ProcessPlan.Tui.Paper;

/// <summary>What a piece of text is, for the screen to choose how it looks. Nothing is told by the ink alone.</summary>
internal enum Ink
{
    Plain,
    Faint,
    Strong,
    Heading,
    Chosen,
    Problem,
    Caution,
    Zone,
    Metal,
}
