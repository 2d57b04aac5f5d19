using System.Globalization;
using System.Reflection;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Standards;

/// <summary>
/// Rows read from an independent publication, in <c>Sources/*.csv</c>: a head of <c>#</c> lines that names the source, one line of
/// columns, then the rows.
/// </summary>
internal sealed class PrintedSource
{
    private readonly string[] _columns;

    public PrintedSource(string name)
    {
        using Stream stream = Assembly.GetExecutingAssembly().GetManifestResourceStream(name)!;
        using StreamReader reader = new(stream);
        string[] lines = [.. reader.ReadToEnd().Split('\n').Where(line => line.Length > 0 && line[0] != '#')];
        _columns = lines[0].Split(',');
        Rows = [.. lines[1..].Select(line => new PrintedRow(_columns, line))];
    }

    public IReadOnlyList<PrintedRow> Rows { get; }
}

internal sealed class PrintedRow(string[] columns, string line)
{
    private readonly string[] _cells = line.Split(',');

    public string this[string column] => _cells[Array.IndexOf(columns, column)];

    public decimal? Number(string column) =>
        this[column] is { Length: > 0 } cell ? decimal.Parse(cell, NumberStyles.Float, CultureInfo.InvariantCulture) : null;

    public Deviation? Micrometres(string column) =>
        Number(column) is { } um ? new Deviation((long)(um * Length.PicometresPerMicrometre)) : null;

    /// <summary>
    /// Sizes to look the row up at: just over its lower end, between, and its upper end, which belongs to it. The row up to 3 mm is
    /// looked up over 1 mm, because the publications print its footnotes for sizes up to 1 mm apart.
    /// </summary>
    public IEnumerable<Length> Sizes()
    {
        decimal over = Math.Max(Number("over")!.Value, 1);
        decimal upTo = Number("upto")!.Value;
        return [Length.FromMillimetres(over + 0.000_001m), Length.FromMillimetres((over + upTo) / 2), Length.FromMillimetres(upTo)];
    }

    public override string ToString() => line;
}
