namespace ProcessPlan.Store.Tables;

/// <summary>
/// Text in a table that a spreadsheet may open: where it would run a text as a formula, the text gets an apostrophe in front, and so does a text that has
/// one there already, so that every text comes back as it was.
/// </summary>
internal static class SheetText
{
    private const char Guard = '\'';
    private const string StartsFormula = "=+-@\t\r\n";

    public static string Neutralise(string text) => text.Length > 0 && IsGuarded(text[0]) ? Guard + text : text;

    public static string Restore(string cell) => cell.Length > 1 && cell[0] == Guard && IsGuarded(cell[1]) ? cell[1..] : cell;

    private static bool IsGuarded(char first) => first == Guard || StartsFormula.Contains(first, StringComparison.Ordinal);
}
