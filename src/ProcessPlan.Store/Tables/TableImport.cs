namespace ProcessPlan.Store.Tables;

public enum RowFate
{
    Retired,
    Changed,
    Added,
}

/// <param name="Column">The column.</param>
/// <param name="Before">What the shop has.</param>
/// <param name="After">What was read.</param>
public sealed record CellDifference(string Column, string Before, string After);

/// <summary>What an import would do to one row.</summary>
public sealed class RowDifference
{
    internal RowDifference(RowFate fate, long? id, string key, IReadOnlyList<CellDifference> cells, RowChange change)
    {
        Fate = fate;
        Id = id;
        Key = key;
        Cells = cells;
        Change = change;
    }

    public RowFate Fate { get; }

    /// <summary>The row; null for a new one.</summary>
    public long? Id { get; }

    /// <summary>How a person tells the row from others.</summary>
    public string Key { get; }

    /// <summary>The cells that differ, where the row changes.</summary>
    public IReadOnlyList<CellDifference> Cells { get; }

    public RowChange Change { get; }
}

/// <summary>What was read from a table, held against the shop: either every problem of it, or every difference.</summary>
public sealed class TableImport
{
    internal TableImport(BookTable table, IReadOnlyList<string> problems, IReadOnlyList<RowDifference> differences, int unchanged)
    {
        Table = table;
        Problems = problems;
        Differences = differences;
        Unchanged = unchanged;
    }

    public BookTable Table { get; }

    /// <summary>One sentence each, without its full stop.</summary>
    public IReadOnlyList<string> Problems { get; }

    /// <summary>Rows that retire, then rows that change, then new ones.</summary>
    public IReadOnlyList<RowDifference> Differences { get; }

    /// <summary>How many rows stay as they are.</summary>
    public int Unchanged { get; }
}
