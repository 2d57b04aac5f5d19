using LiteDB;
using ProcessPlan.Core.Shop;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store;

/// <summary>
/// What stands in an opened book: a head, the rows of each table, and the version that each row had before each change. A row that retires
/// keeps its place; only one whose adding is taken back goes.
/// </summary>
/// <remarks>The rows stand in pages, because the library takes ten microseconds to read a document, whatever is in it.</remarks>
internal sealed class BookContent
{
    private const int RowsOnPage = 128;
    private const string Id = "_id";
    private const string Head = "shop";
    private const string History = "versions";
    private const string Schema = "schema";
    private const string Revised = "revision";
    private const string LastRow = "lastRow";
    private const string LastVersion = "lastVersion";
    private const string Sum = "sum";
    private const string Rows = "rows";

    /// <summary>
    /// From each form of the book to the next, the first one from 1 to 2. The number stands in the head and not in the library's own field for it,
    /// because only there it changes in the same transaction as what it numbers.
    /// </summary>
    private static readonly Action<BookContent>[] Upgrades = [static book => book.PutRowsOnPages()];

    private readonly LiteDatabase _book;
    private readonly BsonDocument _head;
    private readonly Dictionary<(BookTable Table, long Page), SortedDictionary<long, ShopRow>> _pages = [];

    private BookContent(LiteDatabase book, BsonDocument head)
    {
        _book = book;
        _head = head;
    }

    public static int CurrentSchema => Upgrades.Length + 1;

    public long Revision => _head[Revised].AsInt64;

    /// <summary>The first content of an empty book.</summary>
    public static void Fill(LiteDatabase empty, ShopFloor shop, string name)
    {
        BookContent book = new(empty, new BsonDocument
        {
            [Id] = 1L,
            [Schema] = CurrentSchema,
            ["name"] = name,
            ["currency"] = shop.Currency,
            [Revised] = 1L,
            [LastRow] = 0L,
            [LastVersion] = 0L,
            [Sum] = 0L,
        });
        ShopEdition edition = ShopEdition.Of(shop);
        foreach (BookTable table in BookTables.All)
        {
            foreach (ShopRow row in table.RowsOf(edition))
            {
                book.Put(table, row.Id, row);
                book._head[LastRow] = Math.Max(row.Id, book._head[LastRow].AsInt64);
            }
        }

        book.End();
    }

    public static int SchemaOf(LiteDatabase book) => HeadOf(book)[Schema].AsInt32;

    /// <summary>The content, in the current form.</summary>
    /// <exception cref="ShopBookException">The file is another program's, or a newer version of this program wrote it.</exception>
    public static BookContent Open(LiteDatabase book)
    {
        // The head says how the rest is to be read; only that of the first schema has no sum.
        BsonDocument head = HeadOf(book);
        BookContent content = new(book, head.IsStamped() ? Intact(head, Head) : head);
        int schema = content._head[Schema].AsInt32;
        if (schema > CurrentSchema)
        {
            throw new ShopBookException($"This shop book was written by a newer version of this program (schema {schema}; this one knows {CurrentSchema}).");
        }

        foreach (Action<BookContent> upgrade in Upgrades.Skip(schema - 1))
        {
            upgrade(content);
        }

        return content;
    }

    /// <summary>Everything, every page checked.</summary>
    /// <exception cref="ShopBookException">The rows are not what was written, or make no shop together.</exception>
    public ShopEdition Edition()
    {
        long sum = 0;
        Dictionary<BookTable, object> tables = [];
        foreach (BookTable table in BookTables.All)
        {
            List<ShopRow> rows = [];
            foreach (BsonDocument page in _book.GetCollection(table.Name).FindAll())
            {
                sum = unchecked(sum + Intact(page, table.Name).CheckOf());
                rows.AddRange(RowsOn(page[Rows].AsBinary, table).Where(static row => row.Retired is null));
            }

            tables[table] = table.Read(rows);
        }

        return Intact(_head, Head)[Sum].AsInt64 == sum
            ? new ShopEdition(_head["name"].AsString, _head["currency"].AsString, Revision, tables)
            : throw new DamagedBookException("Rows of the shop book are missing; it was left as it is. Use a backup.");
    }

    /// <summary>Begins the next revision.</summary>
    public void Begin() => _head[Revised] = Revision + 1;

    /// <summary>Ends the revision that was begun: what was put is in the book now.</summary>
    public void End()
    {
        foreach (((BookTable table, long number), SortedDictionary<long, ShopRow> rows) in _pages)
        {
            ILiteCollection<BsonDocument> pages = _book.GetCollection(table.Name);
            if (pages.FindById(number) is { } before)
            {
                Count(unchecked(-Intact(before, table.Name).CheckOf()));
            }

            BsonDocument page = new BsonDocument { [Id] = number, [Rows] = Bytes(rows.Values, table) }.Stamp();
            Count(page.CheckOf());
            pages.Upsert(page);
        }

        _book.GetCollection(Head).Upsert(_head.Stamp());
    }

    /// <param name="change">The change.</param>
    /// <param name="today">The date of a row that retires.</param>
    public void Make(RowChange change, string today)
    {
        ShopRow? before = change.Id is { } given ? Page(change.Table, given).GetValueOrDefault(given) : null;
        if (change.Id is { } missing && before is not { Retired: null })
        {
            throw new ShopBookException($"There is no row {missing} in {change.Table.Name}.");
        }

        long id = change.Id ?? Next(LastRow);
        _book.GetCollection(History).Insert(new BsonDocument
        {
            [Id] = Next(LastVersion),
            [Revised] = Revision,
            ["table"] = change.Table.Name,
            ["row"] = id,
            ["before"] = before is null ? BsonValue.Null : Bytes([before], change.Table),
        }.Stamp());
        Put(change.Table, id, change.Cells is { } cells ? new ShopRow(id, cells) : before! with { Retired = today });
    }

    /// <summary>Takes back all that was done in the last revision that was not taken back yet; false where there is none.</summary>
    public bool TakeBack()
    {
        ILiteCollection<BsonDocument> history = _book.GetCollection(History);
        BsonDocument? last = history.FindById(_head[LastVersion]);
        for (BsonDocument? version = last; version is not null && version[Revised] == last![Revised]; version = history.FindById(_head[LastVersion]))
        {
            BookTable table = BookTables.Find(Intact(version, History)["table"].AsString)!;
            Put(table, version["row"].AsInt64, version["before"].IsNull ? null : RowsOn(version["before"].AsBinary, table).Single());
            history.Delete(version[Id]);
            _head[LastVersion] = version[Id].AsInt64 - 1;
        }

        return last is not null;
    }

    /// <summary>Puts a row in its place, or takes it away.</summary>
    private void Put(BookTable table, long id, ShopRow? row)
    {
        SortedDictionary<long, ShopRow> page = Page(table, id);
        if (row is null)
        {
            page.Remove(id);
        }
        else
        {
            page[id] = row;
        }
    }

    private SortedDictionary<long, ShopRow> Page(BookTable table, long id)
    {
        long number = id / RowsOnPage;
        if (!_pages.TryGetValue((table, number), out SortedDictionary<long, ShopRow>? page))
        {
            BsonDocument? written = _book.GetCollection(table.Name).FindById(number);
            page = new(written is null ? [] : RowsOn(Intact(written, table.Name)[Rows].AsBinary, table).ToDictionary(static row => row.Id));
            _pages[(table, number)] = page;
        }

        return page;
    }

    private void PutRowsOnPages()
    {
        _head[Schema] = 2;
        _head[Sum] = 0L;
        foreach (BookTable table in BookTables.All)
        {
            ILiteCollection<BsonDocument> written = _book.GetCollection(table.Name);
            List<ShopRow> rows = [.. written.FindAll().Select(row => FirstSchema.Row(table, row))];
            written.DeleteAll();
            foreach (ShopRow row in rows)
            {
                Put(table, row.Id, row);
            }
        }

        ILiteCollection<BsonDocument> history = _book.GetCollection(History);
        foreach (BsonDocument version in history.FindAll().ToList())
        {
            BookTable table = BookTables.Find(version["table"].AsString)!;
            version["before"] = version["before"].IsNull ? BsonValue.Null : Bytes([FirstSchema.Row(table, version["before"].AsDocument)], table);
            history.Update(version.Stamp());
        }

        End();
        _pages.Clear();
    }

    private void Count(long check) => _head[Sum] = unchecked(_head[Sum].AsInt64 + check);

    private long Next(string counter)
    {
        long next = _head[counter].AsInt64 + 1;
        _head[counter] = next;
        return next;
    }

    private static byte[] Bytes(IEnumerable<ShopRow> rows, BookTable table)
    {
        using MemoryStream bytes = new();
        using BinaryWriter writer = new(bytes);
        foreach (ShopRow row in rows)
        {
            row.Write(writer, table);
        }

        return bytes.ToArray();
    }

    private static List<ShopRow> RowsOn(byte[] bytes, BookTable table)
    {
        using MemoryStream source = new(bytes, writable: false);
        using BinaryReader reader = new(source);
        List<ShopRow> rows = [];
        while (source.Position < source.Length)
        {
            rows.Add(ShopRow.Read(reader, table));
        }

        return rows;
    }

    private static BsonDocument HeadOf(LiteDatabase book) =>
        book.GetCollection(Head).FindById(1L) ?? throw new ShopBookException("This is a LiteDB file of another program, not a shop book; it was left as it is.");

    private static BsonDocument Intact(BsonDocument document, string table) => document.IsIntact()
        ? document
        : throw new DamagedBookException($"{table} {document[Id].AsInt64} in the shop book is not what was written there; it was left as it is. Use a backup.");
}
