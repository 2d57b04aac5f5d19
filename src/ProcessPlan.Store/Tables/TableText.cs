using System.Globalization;

namespace ProcessPlan.Store.Tables;

/// <summary>The main columns of a table for a person, each as wide as it needs and cut where it is too long for a line.</summary>
public static class TableText
{
    private const int Widest = 30;
    private const string Gap = "  ";

    public static void Write(BookTable table, ShopEdition edition, TextWriter target)
    {
        Column[] shown = [.. table.Columns.Where(column => table.Shown.Contains(column.Name))];
        List<string[]> lines = [["row", .. shown.Select(static column => column.Name)]];
        lines.AddRange(table.Documents(edition).Select(row => (string[])[row[BookTable.Id].AsInt64.ToString(CultureInfo.InvariantCulture), .. shown.Select(column => Cut(column.Format(row)))]));
        int[] widths = [.. lines[0].Select((_, at) => lines.Max(line => line[at].Length))];
        foreach (string[] line in lines)
        {
            target.WriteLine(string.Join(Gap, line.Select((cell, at) => IsNumber(at) ? cell.PadLeft(widths[at]) : cell.PadRight(widths[at]))).TrimEnd());
        }

        bool IsNumber(int at) => at == 0 || shown[at - 1].Kind.IsNumber;
    }

    private static string Cut(string text)
    {
        string printable = string.Concat(text.Select(static c => char.IsControl(c) ? '?' : c));
        return printable.Length <= Widest ? printable : printable[..(Widest - 2)] + "..";
    }
}
