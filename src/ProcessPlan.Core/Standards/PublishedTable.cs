using System.Globalization;
using System.Reflection;

namespace ProcessPlan.Core.Standards;

/// <summary>
/// One table as it stands in an embedded text file that a person can proofread: a head of <c>key: value</c> lines, a line
/// <c>---</c>, one line of column names, then one line a row. Columns are parted by white space; a cell <c>-</c> is empty (the source gives nothing
/// there, which is not zero); a last column named <c>note</c> takes the rest of its line. Lines that start with <c>#</c> are remarks.
/// </summary>
/// <remarks>
/// The head must hold <c>title</c>, <c>source</c>, <c>table</c>, <c>unit</c>, <c>rounding</c> and <c>standing</c>
/// (published, derived, from memory, or common practice).
/// </remarks>
public sealed class PublishedTable
{
    private static readonly string[] HeadKeys = ["title", "source", "table", "unit", "rounding", "standing"];

    private readonly Dictionary<string, string> _head;
    private readonly string[] _columns;

    private PublishedTable(string name, Dictionary<string, string> head, string[] columns, List<TableRow> rows)
    {
        Name = name;
        _head = head;
        _columns = columns;
        Rows = rows;
        Standing = head["standing"] switch
        {
            "published" => Standing.Published,
            "derived" => Standing.Derived,
            "from memory" => Standing.FromMemory,
            "common practice" => Standing.CommonPractice,
            string other => throw new InvalidDataException($"{name}: the standing '{other}' is none of published, derived, from memory, common practice."),
        };
    }

    public string Name { get; }

    public string Title => _head["title"];

    public Standing Standing { get; }

    public IReadOnlyList<string> Columns => _columns;

    public IReadOnlyList<TableRow> Rows { get; }

    /// <summary>A further value of the head, such as the values a table needs beside its rows.</summary>
    public string Head(string key) => _head[key];

    /// <summary>The citation of this table; <paramref name="place"/> is put behind the number of the table.</summary>
    public Citation Cite(string place = "")
    {
        string table = _head["table"];
        string where = table.Length > 0 && place.Length > 0 ? $"{table}, {place}" : table + place;
        return new Citation(_head["source"], where, Standing);
    }

    /// <summary>Reads an embedded table of this assembly.</summary>
    /// <exception cref="InvalidDataException">The file breaks the form that every table has; says file, line and rule.</exception>
    public static PublishedTable Load(string name) => Parse(name, Text(name));

    /// <summary>The text of an embedded table, as it is shipped.</summary>
    public static string Text(string name)
    {
        using Stream stream = Assembly.GetExecutingAssembly().GetManifestResourceStream(name)
            ?? throw new InvalidDataException($"{name}: there is no such table in the program.");
        using StreamReader reader = new(stream);
        return reader.ReadToEnd();
    }

    internal static PublishedTable Parse(string name, string text)
    {
        Dictionary<string, string> head = [];
        string[]? columns = null;
        bool inHead = true;
        List<TableRow> rows = [];
        int number = 0;
        ReadOnlySpan<char> rest = text;
        while (!rest.IsEmpty)
        {
            number++;
            int end = rest.IndexOf('\n');
            ReadOnlySpan<char> line = (end < 0 ? rest : rest[..end]).Trim();
            rest = end < 0 ? [] : rest[(end + 1)..];
            if (line.IsEmpty || line[0] == '#')
            {
                continue;
            }

            if (inHead)
            {
                inHead = !line.SequenceEqual("---");
                int colon = line.IndexOf(':');
                if (inHead && colon < 0)
                {
                    throw new InvalidDataException($"{name}, line {number}: a head line reads 'key: value', this one '{line}'.");
                }

                if (inHead)
                {
                    head[line[..colon].Trim().ToString()] = line[(colon + 1)..].Trim().ToString();
                }
            }
            else if (columns is null)
            {
                columns = Cells(line, int.MaxValue);
            }
            else
            {
                bool noted = columns[^1] == "note";
                string[] cells = Cells(line, noted ? columns.Length : int.MaxValue);
                if (cells.Length != columns.Length && !(noted && cells.Length == columns.Length - 1))
                {
                    throw new InvalidDataException($"{name}, line {number}: {cells.Length} cells where the table has {columns.Length} columns.");
                }

                rows.Add(new TableRow(name, number, columns, cells));
            }
        }

        foreach (string key in HeadKeys)
        {
            if (!head.ContainsKey(key))
            {
                throw new InvalidDataException($"{name}: the head does not say its '{key}'.");
            }
        }

        return columns is not null && rows.Count > 0
            ? new PublishedTable(name, head, columns, rows)
            : throw new InvalidDataException($"{name}: the table has no rows.");
    }

    private static string[] Cells(ReadOnlySpan<char> line, int most)
    {
        List<string> cells = [];
        while (!line.IsEmpty)
        {
            int end = cells.Count == most - 1 ? line.Length : line.IndexOfAny(' ', '\t');
            end = end < 0 ? line.Length : end;
            cells.Add(line[..end].ToString());
            line = line[end..].TrimStart();
        }

        return [.. cells];
    }
}

/// <summary>One line of a <see cref="PublishedTable"/>; cells are asked for by the name of their column.</summary>
public sealed class TableRow
{
    private readonly string _table;
    private readonly string[] _columns;
    private readonly string[] _cells;

    internal TableRow(string table, int line, string[] columns, string[] cells)
    {
        _table = table;
        Line = line;
        _columns = columns;
        _cells = cells;
    }

    /// <summary>Line of the file, counted from 1.</summary>
    public int Line { get; }

    /// <summary>The cell as it is printed; empty for a note that is not there.</summary>
    /// <exception cref="InvalidDataException">The table has no such column.</exception>
    public string this[string column]
    {
        get
        {
            int at = Array.IndexOf(_columns, column);
            return at < 0 ? throw new InvalidDataException($"{_table}: there is no column '{column}'.") : at < _cells.Length ? _cells[at] : "";
        }
    }

    /// <summary>Whether the source gives nothing in this cell.</summary>
    public bool IsEmpty(string column) => this[column] is "-" or "";

    public decimal Decimal(string column) =>
        decimal.TryParse(this[column], NumberStyles.AllowDecimalPoint | NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out decimal value)
            ? value
            : throw new InvalidDataException($"{_table}, line {Line}: '{this[column]}' in column '{column}' is no number.");

    public double Double(string column) => (double)Decimal(column);

    public double? DoubleOrNull(string column) => IsEmpty(column) ? null : Double(column);
}
