using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>Rows of a table by ranges of size, "over … up to and including". No interpolation between them.</summary>
public sealed class SizeRanges<T>
{
    private readonly List<(Length Over, Length UpTo, T Row)> _rows = [];

    /// <param name="table">A table with the columns <c>over</c> and <c>upto</c> in millimetres.</param>
    /// <param name="rows">The lines of it that belong together, by rising size.</param>
    /// <param name="read">Reads one line.</param>
    public SizeRanges(PublishedTable table, IEnumerable<TableRow> rows, Func<TableRow, T> read)
    {
        foreach (TableRow row in rows)
        {
            Length over = Length.FromMillimetres(row.Decimal("over"));
            if (_rows.Count > 0 && _rows[^1].UpTo != over)
            {
                throw new InvalidDataException($"{table.Name}, line {row.Line}: the range does not begin where the one before it ends.");
            }

            _rows.Add((over, Length.FromMillimetres(row.Decimal("upto")), read(row)));
        }
    }

    public SizeRanges(PublishedTable table, Func<TableRow, T> read)
        : this(table, table.Rows, read)
    {
    }

    /// <summary>The row whose range holds <paramref name="size"/>: over its lower end, up to and including its upper one.</summary>
    public bool TryFind(Length size, out T row)
    {
        foreach ((Length over, Length upTo, T value) in _rows)
        {
            if (over < size && size <= upTo)
            {
                row = value;
                return true;
            }
        }

        row = default!;
        return false;
    }
}
