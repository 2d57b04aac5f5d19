using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <summary>Every key, and the words of the feature line with examples.</summary>
internal static class HelpPage
{
    private const int HeadWidth = 12;

    /// <summary>Whole lines that can be copied.</summary>
    public static IReadOnlyList<string> Examples { get; } =
    [
        "hole 25H7 x40 thru Ra0.8 42CrMo4 28HRC 200off",
        "shaft 35 k6 x28 Ra 0.8 C45 hardened 58HRC runout 0.01 40 off",
        "bore 60 +0.030/0 x 50 wall 2 C45 cyl 0.01 12 off",
        "keyway 8 JS9 x 40 C45 1 off",
        "hole .2500 +.0005 -.0000 in x .5 6061 blind",
        "40 H7/k6 C45",
    ];

    /// <summary>What each part of a line is written like.</summary>
    public static IReadOnlyList<(string Part, string Written)> Words { get; } =
    [
        ("kind", "hole, bore; shaft, pin; slot, keyway; key, tongue"),
        ("size", "25H7 (capital: inside, small: outside); 60 +0.030/0; 60 ±0.015; 60.000-60.030; 40 H7/k6 for a fit"),
        ("unit", "mm, or in anywhere in the line; decimal point or comma"),
        ("length", "x40, depth or length"),
        ("end", "thru; blind; bottom 3 for the room below full size"),
        ("wall", "wall 2, or od 64; interrupted"),
        ("finish", "Ra0.8, Rz 6.3, N6"),
        ("material", "one of the shop, such as C45, 42CrMo4, 6061; as delivered: 28HRC, 200HB, 300HV"),
        ("treatment", "hardened 58HRC; case 0.8; nitrided 0.3"),
        ("coating", "coat zinc-nickel 8-12um before (or after: the drawing's limits are meant after it)"),
        ("form", "cyl 0.01, round 0.01, runout 0.01, coax 0.02, pos 0.1, perp 0.02"),
        ("start", "solid; cast 22; cored 18; bar 40"),
        ("lot", "200 off"),
    ];

    /// <summary>The keys that are needed first, then the words of the line.</summary>
    public static void DrawHelp(Sheet sheet, Bench bench) => Draw(sheet, bench, "help: keys", "words of the line", [.. FirstKeys(), Blank, .. Line(), Blank, .. OtherKeys()]);

    /// <summary>The words of the line, then the keys.</summary>
    public static void DrawWords(Sheet sheet, Bench bench) => Draw(sheet, bench, "help: words of the line", "keys", [.. Line(), Blank, .. FirstKeys(), .. OtherKeys()]);

    public static void DrawKeys(Sheet sheet, Bench bench) => Draw(sheet, bench, "keys", "words of the line", [.. FirstKeys(), .. OtherKeys()]);

    private static readonly Said Blank = new("", "");

    private static IEnumerable<Said> Line() =>
    [
        new Said("", "The line takes a feature as it is spoken, in any order.", Ink.Strong),
        .. Words.Select(static word => new Said(word.Part, word.Written)),
        Blank,
        new Said("", "Examples", Ink.Strong),
        .. Examples.Select(static (example, at) => new Said(at == 0 ? "line" : "", example)),
    ];

    private static IEnumerable<Said> FirstKeys() =>
    [
        new Said("", "Keys everywhere (a letter does the same outside the line)", Ink.Strong),
        .. Of(KeyChart.Everywhere),
        new Said("", "Keys on the line", Ink.Strong),
        .. Of(KeyChart.OnLine),
        .. KeyChart.InText.Select(static key => new Said(key.Key, key.Does)),
    ];

    private static IEnumerable<Said> OtherKeys() =>
    [
        new Said("", "Keys on the route", Ink.Strong),
        .. Of(KeyChart.OnRoute),
        new Said("", "Keys on the big digits", Ink.Strong),
        .. Of(KeyChart.OnBigDigits),
        new Said("", "Keys on this page", Ink.Strong),
        .. Of(KeyChart.OnText),
    ];

    private static IEnumerable<Said> Of(IEnumerable<Stroke> strokes) =>
        strokes.Select(static stroke => new Said(stroke.Letter is { } letter ? $"{stroke.Key}, {letter}" : stroke.Key, stroke.Does));

    private static void Draw(Sheet sheet, Bench bench, string title, string other, IReadOnlyList<Said> said)
    {
        sheet.Rule(0, title);
        List<(string Head, string Line, Ink Ink)> lines = [];
        foreach ((string head, string text, Ink ink) in said)
        {
            string shown = head;
            foreach (string line in sheet.Wrap(text, sheet.Width - HeadWidth - 1))
            {
                lines.Add((shown, line, ink));
                shown = "";
            }
        }

        int rows = sheet.Height - 2;
        bench.LimitScroll(lines.Count - rows);
        for (int at = 0; at < rows && bench.Scroll + at < lines.Count; at++)
        {
            (string head, string line, Ink ink) = lines[bench.Scroll + at];
            sheet.Write(1, 1 + at, head, Ink.Strong);
            sheet.Write(head.Length == 0 && ink == Ink.Strong ? 1 : HeadWidth, 1 + at, line, ink);
        }

        int hidden = lines.Count - bench.Scroll - rows;
        string more = hidden > 0 ? $"  {hidden} more: Down, PageDown" : "";
        sheet.Write(0, sheet.Height - 1, sheet.Shorten($"Esc back  Tab {other}{more}", sheet.Width), Ink.Faint);
    }
}
