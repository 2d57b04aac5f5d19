using LiteDB;
using ProcessPlan.Core.Shop;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store;

/// <summary>
/// What stands in an opened book: a head, the rows of each table, and the version that each row had before each change. A row that retires
/// keeps its place; only one whose adding is taken back goes.
/// </summary>
internal sealed class BookContent
{
    private const string Head = "shop";
    private const string History = "versions";
    private const string Retired = "retired";
    private const string Schema = "schema";
    private const string Revised = "revision";
    private const string LastRow = "lastRow";
    private const string LastVersion = "lastVersion";
    private const string Sum = "sum";

    /// <summary>
    /// From each form of the book to the next, the first one from 1 to 2. The number stands in the head and not in the library's own field for it,
    /// because only there it changes in the same transaction as what it numbers.
    /// </summary>
    private static readonly Action<BookContent>[] Upgrades = [static book => book.StampEveryRow()];

    private readonly LiteDatabase _book;
    private readonly BsonDocument _head;

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
            [BookTable.Id] = 1L,
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
            IReadOnlyList<BsonDocument> rows = table.Documents(edition);
            foreach (BsonDocument row in rows)
            {
                book.Count(row.Stamp().Checked());
            }

            empty.GetCollection(table.Name).InsertBulk(rows);
            book._head[LastRow] = Math.Max(rows.Count, book._head[LastRow].AsInt64);
        }

        empty.GetCollection(Head).Insert(book._head.Stamp());
    }

    public static int SchemaOf(LiteDatabase book) => HeadOf(book)[Schema].AsInt32;

    /// <summary>The content, in the current form.</summary>
    /// <exception cref="ShopBookException">The file is another program's, or a newer version of this program wrote it.</exception>
    public static BookContent Open(LiteDatabase book)
    {
        BookContent content = new(book, HeadOf(book));
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

    /// <summary>Everything, checked row by row.</summary>
    /// <exception cref="ShopBookException">The rows are not what was written, or make no shop together.</exception>
    public ShopEdition Edition()
    {
        long sum = 0;
        Dictionary<BookTable, object> tables = [];
        foreach (BookTable table in BookTables.All)
        {
            List<BsonDocument> rows = [];
            foreach (BsonDocument row in Rows(table.Name).FindAll())
            {
                sum = unchecked(sum + Intact(row, table.Name).Checked());
                if (!row.ContainsKey(Retired))
                {
                    rows.Add(row);
                }
            }

            tables[table] = table.Read(rows);
        }

        return Intact(_head, Head)[Sum].AsInt64 == sum
            ? new ShopEdition(_head["name"].AsString, _head["currency"].AsString, Revision, tables)
            : throw new ShopBookException("Rows of the shop book are missing; it was left as it is. Use a backup.");
    }

    /// <summary>Begins the next revision.</summary>
    public void Begin() => _head[Revised] = Revision + 1;

    /// <summary>Ends the revision that was begun.</summary>
    public void End() => Rows(Head).Update(_head.Stamp());

    /// <param name="change">The change.</param>
    /// <param name="today">The date of a row that retires.</param>
    public void Make(RowChange change, string today)
    {
        BsonDocument? before = change.Id is { } given ? Rows(change.Table.Name).FindById(given) : null;
        if (change.Id is { } missing && (before is null || before.ContainsKey(Retired)))
        {
            throw new ShopBookException($"There is no row {missing} in {change.Table.Name}.");
        }

        BsonValue id = change.Id ?? Next(LastRow);
        Rows(History).Insert(new BsonDocument
        {
            [BookTable.Id] = Next(LastVersion),
            [Revised] = Revision,
            ["table"] = change.Table.Name,
            ["row"] = id,
            ["before"] = before is null ? BsonValue.Null : new BsonDocument(before),
        }.Stamp());

        BsonDocument after = new(change.Row ?? before!) { [BookTable.Id] = id };
        if (change.Row is null)
        {
            after[Retired] = today;
        }

        Put(change.Table.Name, id, after);
    }

    /// <summary>Takes back all that was done in the last revision that was not taken back yet; false where there is none.</summary>
    public bool TakeBack()
    {
        ILiteCollection<BsonDocument> history = Rows(History);
        BsonDocument? last = history.FindById(_head[LastVersion]);
        for (BsonDocument? version = last; version is not null && version[Revised] == last![Revised]; version = history.FindById(_head[LastVersion]))
        {
            BsonValue before = Intact(version, History)["before"];
            Put(version["table"].AsString, version["row"], before.IsNull ? null : new BsonDocument(before.AsDocument));
            history.Delete(version[BookTable.Id]);
            _head[LastVersion] = version[BookTable.Id].AsInt64 - 1;
        }

        return last is not null;
    }

    /// <summary>Puts a row in its place, or takes it away.</summary>
    private void Put(string table, BsonValue id, BsonDocument? row)
    {
        ILiteCollection<BsonDocument> rows = Rows(table);
        if (rows.FindById(id) is { } before)
        {
            Count(unchecked(-Intact(before, table).Checked()));
        }

        if (row is null)
        {
            rows.Delete(id);
        }
        else
        {
            Count(row.Stamp().Checked());
            rows.Upsert(row);
        }
    }

    private void StampEveryRow()
    {
        _head[Sum] = 0L;
        foreach (string table in BookTables.All.Select(static table => table.Name))
        {
            foreach (BsonDocument row in Rows(table).FindAll().ToList())
            {
                Count(row.Stamp().Checked());
                Rows(table).Update(row);
            }
        }

        foreach (BsonDocument version in Rows(History).FindAll().ToList())
        {
            Rows(History).Update(version.Stamp());
        }

        _head[Schema] = 2;
        Rows(Head).Update(_head.Stamp());
    }

    private void Count(long check) => _head[Sum] = unchecked(_head[Sum].AsInt64 + check);

    private long Next(string counter)
    {
        long next = _head[counter].AsInt64 + 1;
        _head[counter] = next;
        return next;
    }

    private ILiteCollection<BsonDocument> Rows(string table) => _book.GetCollection(table);

    private static BsonDocument HeadOf(LiteDatabase book) =>
        book.GetCollection(Head).FindById(1L) ?? throw new ShopBookException("This is a LiteDB file of another program, not a shop book; it was left as it is.");

    private static BsonDocument Intact(BsonDocument row, string table) => row.IsIntact()
        ? row
        : throw new ShopBookException($"Row {row[BookTable.Id]} of {table} in the shop book is not what was written there; it was left as it is. Use a backup.");
}
