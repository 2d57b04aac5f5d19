using ProcessPlan.Core.Shop;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store;

/// <summary>The whole shop as one revision of its book has it; it never changes.</summary>
public sealed class ShopEdition
{
    private readonly Dictionary<BookTable, object> _rows;

    internal ShopEdition(string name, string currency, long revision, Dictionary<BookTable, object> rows)
    {
        Revision = revision;
        _rows = rows;
        if (Rows(BookTables.Materials).Count == 0)
        {
            throw new ShopBookException("A shop needs at least one material.");
        }

        Floor = new ShopFloor(name, currency, Values(BookTables.Machines), Values(BookTables.Tools), Values(BookTables.Materials),
            [.. Values(BookTables.Bars).OrderBy(static series => series.Over)], Values(BookTables.Suppliers));
    }

    /// <summary>Goes up with every change of the book; 0 for a shop that is in no book.</summary>
    public long Revision { get; }

    public ShopFloor Floor { get; }

    /// <summary>A shop that is in no book, its rows numbered from 1.</summary>
    public static ShopEdition Of(ShopFloor floor) => new(floor.Name, floor.Currency, 0, new Dictionary<BookTable, object>
    {
        [BookTables.Machines] = Numbered(floor.Machines),
        [BookTables.Tools] = Numbered(Enum.GetValues<ToolUse>().SelectMany(floor.Tools)),
        [BookTables.Materials] = Numbered(floor.Materials),
        [BookTables.Bars] = Numbered(floor.Bars),
        [BookTables.Suppliers] = Numbered(floor.Suppliers),
    });

    /// <summary>The rows of one table in the order in which they came into the book.</summary>
    public IReadOnlyList<BookRow<T>> Rows<T>(BookTable<T> table) => (IReadOnlyList<BookRow<T>>)_rows[table];

    private T[] Values<T>(BookTable<T> table) => [.. Rows(table).Select(static row => row.Value)];

    private static List<BookRow<T>> Numbered<T>(IEnumerable<T> values) => [.. values.Select(static (value, at) => new BookRow<T>(at + 1, value))];
}
