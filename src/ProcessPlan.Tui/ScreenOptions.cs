using ProcessPlan.Core.Values;

namespace ProcessPlan.Tui;

/// <summary>How the screen is to look and what it starts with.</summary>
public sealed record ScreenOptions
{
    /// <summary>The line that the bench starts with when nothing else is given.</summary>
    public const string FirstLine = "hole 25H7 x40 thru Ra0.8 C45 200off";

    public string Line { get; init; } = FirstLine;

    public LengthUnit Unit { get; init; }

    /// <summary>Only characters up to 0x7E.</summary>
    public bool Ascii { get; init; }

    /// <summary>No colour sequence at all; bold, reverse and underline stay.</summary>
    public bool NoColour { get; init; }
}
