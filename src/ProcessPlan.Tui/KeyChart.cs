namespace ProcessPlan.Tui;

/// <summary>A key that works on the whole screen.</summary>
/// <param name="Key">Its name, as it stands on the keyboard.</param>
/// <param name="Letter">A letter that does the same outside the line, or null.</param>
/// <param name="Does">What it does, for the help.</param>
/// <param name="Act">The deed.</param>
internal sealed record Stroke(string Key, string? Letter, string Does, Action<Bench> Act);

/// <summary>Every key of the bench, once: the screen acts by it and the help prints it.</summary>
internal static class KeyChart
{
    /// <summary>The key that leaves the program, the only one that works where the window is too small.</summary>
    public const string Leave = "Ctrl+Q";

    private const int PageOfLines = 5;

    /// <summary>Keys that do the same wherever the hand is.</summary>
    public static IReadOnlyList<Stroke> Everywhere { get; } =
    [
        new("F1", "h", "help: the keys, and the words of the line", static bench => bench.Turn(Page.Help)),
        new("F2", "u", "millimetres or inches, for the whole screen", static bench => bench.FlipUnit()),
        new("F3", "b", "big digits, to be read from the machine", static bench => bench.Enlarge()),
        new("F4", "r", "next route, the next dearer one", static bench => bench.NextRoute()),
        new("F5", "c", "a new, empty line; Up brings the one before back", static bench => bench.StartNew()),
        new("F6", "n", "notes: questions, cautions, assumptions, what was not used", static bench => bench.FlipBelow()),
        new("F7", null, "the operation before", static bench => bench.PreviousOperation()),
        new("F8", null, "the operation after", static bench => bench.NextOperation()),
        new("F9", "o", "the other feature of a fit", static bench => bench.OtherFeature()),
        new("PageUp", null, "lower text: up", static bench => bench.ScrollBy(-PageOfLines)),
        new("PageDown", null, "lower text: down", static bench => bench.ScrollBy(PageOfLines)),
        new("Esc", null, "back: to the bench, to the line", static bench => bench.Back()),
        new(Leave, null, "leave", static bench => bench.Quit()),
    ];

    /// <summary>Keys while the hand is on the line; all others belong to the text.</summary>
    public static IReadOnlyList<Stroke> OnLine { get; } =
    [
        new("Enter", null, "keep the line for this run and go to its route", static bench => bench.Enter()),
        new("Tab", null, "to the route", static bench => bench.GoTo(Hand.Route)),
        new("Up", null, "the line kept before", static bench => bench.Earlier()),
        new("Down", null, "the line kept after", static bench => bench.Later()),
    ];

    /// <summary>Keys while the hand is on the route.</summary>
    public static IReadOnlyList<Stroke> OnRoute { get; } =
    [
        new("Up", null, "the operation before", static bench => bench.PreviousOperation()),
        new("Down", null, "the operation after", static bench => bench.NextOperation()),
        new("Tab", "l", "to the line", static bench => bench.GoTo(Hand.Line)),
        new("Enter", null, "its size in big digits", static bench => bench.Enlarge()),
        new("?", null, "these keys", static bench => bench.Turn(Page.Keys)),
    ];

    /// <summary>Keys on the page of big digits.</summary>
    public static IReadOnlyList<Stroke> OnBigDigits { get; } =
    [
        new("Up", null, "the size before", static bench => bench.PreviousBig()),
        new("Down", null, "the size after: the drawing, then each operation", static bench => bench.NextBig()),
        new("Enter", null, "back", static bench => bench.Back()),
        new("?", null, "these keys", static bench => bench.Turn(Page.Keys)),
    ];

    /// <summary>Keys on a page of text.</summary>
    public static IReadOnlyList<Stroke> OnText { get; } =
    [
        new("Tab", null, "from the keys to the words of the line, and back", static bench => bench.TurnHelp()),
        new("Up", null, "up", static bench => bench.ScrollBy(-1)),
        new("Down", null, "down", static bench => bench.ScrollBy(1)),
        new("Enter", null, "back", static bench => bench.Back()),
        new("?", null, "these keys", static bench => bench.Turn(Page.Keys)),
    ];

    /// <summary>What the library's text field does by itself, for the help.</summary>
    public static IReadOnlyList<(string Key, string Does)> InText { get; } =
    [
        ("a letter", "the first one replaces the example that stands there at the start"),
        ("Ctrl+Z", "take back what was typed last"),
        ("Ctrl+Y", "do it again"),
        ("Ctrl+A", "mark the whole line, to type a new one over it"),
    ];

    /// <summary>Presses a key by its name or letter.</summary>
    /// <returns>False where the key means nothing here; on the line it then belongs to the text.</returns>
    public static bool Press(Bench bench, string key)
    {
        bool inText = bench is { Page: Page.Bench, Hand: Hand.Line };
        foreach (Stroke stroke in Here(bench).Concat(Everywhere))
        {
            if (stroke.Key == key || (!inText && stroke.Letter is { } letter && letter.Equals(key, StringComparison.OrdinalIgnoreCase)))
            {
                stroke.Act(bench);
                return true;
            }
        }

        return false;
    }

    private static IReadOnlyList<Stroke> Here(Bench bench) => bench switch
    {
        { Page: Page.BigDigits } => OnBigDigits,
        { Page: Page.Help or Page.Words or Page.Keys } => OnText,
        { Hand: Hand.Route } => OnRoute,
        _ => OnLine,
    };
}
