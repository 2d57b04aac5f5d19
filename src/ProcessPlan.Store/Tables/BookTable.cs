using LiteDB;

namespace ProcessPlan.Store.Tables;

/// <summary>One table of the shop book.</summary>
public abstract class BookTable
{
    /// <summary>Column that tells rows apart, whatever else changes in them.</summary>
    internal const string Id = "_id";

    private protected BookTable(
        string name, string one, IReadOnlyList<Column> columns, IReadOnlyList<string> key, bool isKeyUnique, IReadOnlyList<string> shown)
    {
        Name = name;
        One = one;
        Columns = columns;
        Key = key;
        IsKeyUnique = isKeyUnique;
        Shown = shown;
    }

    /// <summary>As commands and files call it, such as tools.</summary>
    public string Name { get; }

    /// <summary>What one row is.</summary>
    internal string One { get; }

    internal IReadOnlyList<Column> Columns { get; }

    /// <summary>Columns by which a person tells the rows apart.</summary>
    internal IReadOnlyList<string> Key { get; }

    /// <summary>Whether no two rows may have the same key.</summary>
    internal bool IsKeyUnique { get; }

    /// <summary>Columns that fit on a line of text.</summary>
    internal IReadOnlyList<string> Shown { get; }

    /// <summary>A row that leaves the shop; the book keeps it with the date.</summary>
    public RowChange Retire(long id) => new(this, id, null);

    /// <summary>The key of a row as text.</summary>
    internal string KeyOf(BsonDocument row) => string.Join(' ', Columns.Where(column => Key.Contains(column.Name)).Select(column => column.Format(row)));

    /// <summary>What is wrong with a row, in words that follow its place; null where it may stand in the book.</summary>
    internal abstract string? Complaint(BsonDocument row);

    internal abstract IReadOnlyList<BsonDocument> Documents(ShopEdition edition);

    /// <summary>How many rows of it an edition has.</summary>
    public abstract int CountIn(ShopEdition edition);

    internal abstract object Read(IEnumerable<BsonDocument> rows);
}

/// <summary>One table of the shop book with the type of its rows.</summary>
public sealed class BookTable<T> : BookTable
{
    private readonly Column<T>[] _columns;
    private readonly Func<RowCells, T> _read;
    private readonly Func<RowCells, string?> _complaint;

    /// <param name="name">As commands and files call it.</param>
    /// <param name="one">What one row is.</param>
    /// <param name="columns">All columns.</param>
    /// <param name="read">Makes the value of a row without complaint.</param>
    /// <param name="complaint">What is wrong between the cells of a row whose cells are each right.</param>
    /// <param name="key">Columns by which a person tells the rows apart.</param>
    /// <param name="isKeyUnique">Whether no two rows may have the same key.</param>
    /// <param name="shown">Columns that fit on a line of text.</param>
    internal BookTable(
        string name, string one, Column<T>[] columns, Func<RowCells, T> read, Func<RowCells, string?> complaint, string[] key, bool isKeyUnique, string[] shown)
        : base(name, one, [.. columns.Select(static column => new Column(column.Name, column.Kind))], key, isKeyUnique, shown)
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

    internal override string? Complaint(BsonDocument row)
    {
        foreach (Column column in Columns)
        {
            if (column.Complaint(row) is { } complaint)
            {
                return complaint;
            }
        }

        return _complaint(new RowCells(row));
    }

    public override int CountIn(ShopEdition edition) => edition.Rows(this).Count;

    internal override IReadOnlyList<BsonDocument> Documents(ShopEdition edition) => [.. edition.Rows(this).Select(row =>
    {
        BsonDocument document = Document(row.Value);
        document[Id] = row.Id;
        return document;
    })];

    internal override object Read(IEnumerable<BsonDocument> rows)
    {
        List<BookRow<T>> read = [];
        HashSet<string> keys = new(StringComparer.Ordinal);
        foreach (BsonDocument row in rows)
        {
            long id = row[Id].AsInt64;
            if (Complaint(row) is { } complaint)
            {
                throw new ShopBookException($"The {One} in row {id} of {Name} cannot stand in the book: {complaint}.");
            }

            if (IsKeyUnique && !keys.Add(KeyOf(row)))
            {
                throw new ShopBookException($"The book can have only one {One} '{KeyOf(row)}'; row {id} of {Name} is another.");
            }

            read.Add(new BookRow<T>(id, _read(new RowCells(row))));
        }

        return read;
    }

    internal BsonDocument Document(T value)
    {
        BsonDocument row = [];
        foreach (Column<T> column in _columns)
        {
            row[column.Name] = column.Value(value);
        }

        return row;
    }

    private BsonDocument Checked(T value)
    {
        BsonDocument row = Document(value);
        return Complaint(row) is { } complaint ? throw new ShopBookException($"This {One} cannot stand in the book: {complaint}.") : row;
    }
}

/// <summary>A row of a table: its number, which never changes, and its value.</summary>
public readonly record struct BookRow<T>(long Id, T Value);

/// <summary>One change of one row, not yet made: see <see cref="BookTable{T}"/>.</summary>
public sealed class RowChange
{
    /// <param name="table">The row's table.</param>
    /// <param name="id">The row; null for a new one.</param>
    /// <param name="row">Its new values; null where it retires.</param>
    internal RowChange(BookTable table, long? id, BsonDocument? row)
    {
        Table = table;
        Id = id;
        Row = row;
    }

    internal BookTable Table { get; }

    internal long? Id { get; }

    internal BsonDocument? Row { get; }
}
