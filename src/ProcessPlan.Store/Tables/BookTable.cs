namespace ProcessPlan.Store.Tables;

/// <summary>One table of the shop book.</summary>
public abstract class BookTable
{
    private protected BookTable(string name, string one, IReadOnlyList<Column> columns, IReadOnlyList<string> key, bool isKeyUnique, IReadOnlyList<string> shown)
    {
        Name = name;
        One = one;
        Columns = columns;
        Key = [.. key.Select(Place)];
        IsKeyUnique = isKeyUnique;
        Shown = [.. shown.Select(Place)];
    }

    /// <summary>As commands and files call it, such as tools.</summary>
    public string Name { get; }

    /// <summary>What one row is.</summary>
    internal string One { get; }

    internal IReadOnlyList<Column> Columns { get; }

    /// <summary>Places of the columns by which a person tells the rows apart.</summary>
    internal IReadOnlyList<int> Key { get; }

    /// <summary>Whether no two rows may have the same key.</summary>
    internal bool IsKeyUnique { get; }

    /// <summary>Places of the columns that fit on a line of text.</summary>
    internal IReadOnlyList<int> Shown { get; }

    /// <summary>A row that leaves the shop; the book keeps it with the date.</summary>
    public RowChange Retire(long id) => new(this, id, null);

    /// <summary>How many rows of it an edition has.</summary>
    public abstract int CountIn(ShopEdition edition);

    /// <summary>The key of a row as text.</summary>
    internal string KeyOf(object?[] cells) => string.Join(' ', Key.Select(place => Format(cells, place)));

    internal string Format(object?[] cells, int place) => Columns[place].Kind.Format(cells[place]);

    internal T Cell<T>(object?[] cells, string column) => (T)cells[Place(column)]!;

    /// <summary>What is wrong with a row; null where it may stand in the book.</summary>
    internal string? Complaint(object?[] cells)
    {
        for (int i = 0; i < Columns.Count; i++)
        {
            if (!Columns[i].Kind.Holds(cells[i]))
            {
                return $"{Columns[i].Name} holds no value that it may hold; expected {Columns[i].Kind.Expected}";
            }
        }

        return ComplaintBetween(cells);
    }

    internal abstract IReadOnlyList<ShopRow> RowsOf(ShopEdition edition);

    /// <summary>The rows as what they are, in a list of <see cref="BookRow{T}"/>.</summary>
    /// <exception cref="ShopBookException">Two rows have a key that only one may have.</exception>
    internal abstract object Read(IEnumerable<ShopRow> rows);

    /// <summary>What is wrong between the cells of a row that are each right.</summary>
    private protected abstract string? ComplaintBetween(object?[] cells);

    private int Place(string column)
    {
        int place = 0;
        while (Columns[place].Name != column)
        {
            place++;
        }

        return place;
    }
}

/// <summary>One table of the shop book with the type of its rows.</summary>
public sealed class BookTable<T> : BookTable
{
    private readonly Column<T>[] _columns;
    private readonly Func<RowCells, T> _read;
    private readonly Func<BookTable, object?[], string?> _complaint;

    /// <param name="name">As commands and files call it.</param>
    /// <param name="one">What one row is.</param>
    /// <param name="columns">All columns.</param>
    /// <param name="read">Makes the value of a row; takes the cells in the order of the columns.</param>
    /// <param name="complaint">What is wrong between the cells of a row that are each right.</param>
    /// <param name="key">Columns by which a person tells the rows apart.</param>
    /// <param name="isKeyUnique">Whether no two rows may have the same key.</param>
    /// <param name="shown">Columns that fit on a line of text.</param>
    internal BookTable(
        string name, string one, Column<T>[] columns, Func<RowCells, T> read, Func<BookTable, object?[], string?> complaint, string[] key, bool isKeyUnique, string[] shown)
        : base(name, one, columns, key, isKeyUnique, shown)
    {
        _columns = columns;
        _read = read;
        _complaint = complaint;
    }

    /// <summary>A new row.</summary>
    /// <exception cref="ShopBookException">The value may not stand in the book.</exception>
    public RowChange Add(T value) => new(this, null, Checked(value));

    /// <summary>Other values in a row that is there.</summary>
    /// <exception cref="ShopBookException">The value may not stand in the book.</exception>
    public RowChange Replace(long id, T value) => new(this, id, Checked(value));

    public override int CountIn(ShopEdition edition) => edition.Rows(this).Count;

    internal override IReadOnlyList<ShopRow> RowsOf(ShopEdition edition) => [.. edition.Rows(this).Select(row => new ShopRow(row.Id, Cells(row.Value)))];

    internal override object Read(IEnumerable<ShopRow> rows)
    {
        List<BookRow<T>> read = [];
        HashSet<string> keys = new(StringComparer.Ordinal);
        foreach (ShopRow row in rows)
        {
            if (IsKeyUnique && !keys.Add(KeyOf(row.Cells)))
            {
                throw new ShopBookException($"The book can have only one {One} '{KeyOf(row.Cells)}'; row {row.Id} of {Name} is another.");
            }

            read.Add(new BookRow<T>(row.Id, _read(new RowCells(row))));
        }

        return read;
    }

    private protected override string? ComplaintBetween(object?[] cells) => _complaint(this, cells);

    private object?[] Cells(T value) => Array.ConvertAll(_columns, column => column.Value(value));

    private object?[] Checked(T value)
    {
        object?[] cells = Cells(value);
        return Complaint(cells) is { } complaint ? throw new ShopBookException($"This {One} cannot stand in the book: {complaint}.") : cells;
    }
}

/// <summary>A row of a table: its number, which never changes, and its value.</summary>
public readonly record struct BookRow<T>(long Id, T Value);

/// <summary>One change of one row, not yet made: see <see cref="BookTable{T}"/>.</summary>
public sealed class RowChange
{
    /// <param name="table">The row's table.</param>
    /// <param name="id">The row; null for a new one.</param>
    /// <param name="cells">Its new values; null where it retires.</param>
    internal RowChange(BookTable table, long? id, object?[]? cells)
    {
        Table = table;
        Id = id;
        Cells = cells;
    }

    internal BookTable Table { get; }

    internal long? Id { get; }

    internal object?[]? Cells { get; }
}
