using System.Globalization;
using LiteDB;
using ProcessPlan.Core.Shop;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store;

/// <summary>
/// The shop book: one file with all that a shop owns and charges, and everything that it once did. It is read whole, and the file is held only while it is
/// read or written. A change says which revision it was made from, and is refused where another program has written since.
/// </summary>
public sealed class ShopBook
{
    private const string Head = "shop";
    private const string History = "versions";
    private const string Retired = "retired";

    private readonly BookFile _file;
    private readonly TimeProvider _clock;

    /// <param name="path">The book's file; whether there is one is seen when it is used.</param>
    /// <param name="clock">Says the date on which a row retires.</param>
    /// <exception cref="ShopBookException">No book can have this name.</exception>
    public ShopBook(string path, TimeProvider clock)
        : this(new BookFile(path), clock)
    {
    }

    internal ShopBook(BookFile file, TimeProvider clock)
    {
        _file = file;
        _clock = clock;
    }

    public string Path => _file.Path;

    /// <summary>Makes the file, from a shop.</summary>
    /// <exception cref="ShopBookException">There is a file of this name, or it cannot be written.</exception>
    public ShopEdition Create(ShopFloor shop) => _file.Create(
        book =>
        {
            ShopEdition edition = ShopEdition.Of(shop);
            long last = 0;
            foreach (BookTable table in BookTables.All)
            {
                IReadOnlyList<BsonDocument> rows = table.Documents(edition);
                book.GetCollection(table.Name).InsertBulk(rows);
                last = Math.Max(last, rows.Count);
            }

            book.GetCollection(Head).Insert(new BsonDocument
            {
                [BookTable.Id] = 1L,
                ["schema"] = Schema.Current,
                ["name"] = shop.Name,
                ["currency"] = shop.Currency,
                ["revision"] = 1L,
                ["lastRow"] = last,
                ["lastVersion"] = 0L,
            });
        },
        Edition);

    /// <summary>The shop as the book has it now.</summary>
    /// <exception cref="ShopBookException">There is no such book, it is damaged, or it is held by another program.</exception>
    public ShopEdition Read() => _file.Read(book =>
    {
        Schema.RefuseNewer(HeadOf(book));
        return Edition(book);
    });

    /// <summary>Makes all changes or none; when it returns they are on the disk.</summary>
    /// <param name="revision">The revision of the edition that the changes were made from.</param>
    /// <param name="changes">At least one.</param>
    /// <exception cref="BookChangedException">Another program wrote in between.</exception>
    /// <exception cref="ShopBookException">A change cannot be made, or the book cannot be written.</exception>
    public ShopEdition Save(long revision, params IReadOnlyList<RowChange> changes)
    {
        ArgumentOutOfRangeException.ThrowIfZero(changes.Count, nameof(changes));
        string today = DateOnly.FromDateTime(_clock.GetLocalNow().DateTime).ToString("O", CultureInfo.InvariantCulture);
        return Change(revision, (book, head) =>
        {
            foreach (RowChange change in changes)
            {
                Make(book, head, change, today);
            }
        });
    }

    /// <summary>Takes the last change back that was not taken back yet.</summary>
    /// <param name="revision">The revision of the edition that the user saw.</param>
    /// <exception cref="BookChangedException">Another program wrote in between.</exception>
    /// <exception cref="ShopBookException">There is no change to take back, or the book cannot be written.</exception>
    public ShopEdition Undo(long revision) => Change(revision, (book, _) =>
    {
        ILiteCollection<BsonDocument> history = book.GetCollection(History);
        BsonDocument? last = history.Find(Query.All(BookTable.Id, Query.Descending), limit: 1).FirstOrDefault();
        if (last is null)
        {
            throw new ShopBookException($"{Path} has no change to take back.");
        }

        // Each change wrote its versions one behind the other: from the last one back to the one that has another revision.
        for (BsonDocument? version = last; version is not null && version["revision"] == last["revision"]; version = history.FindById(version[BookTable.Id].AsInt64 - 1))
        {
            ILiteCollection<BsonDocument> rows = book.GetCollection(version["table"].AsString);
            if (version["before"].IsNull)
            {
                rows.Delete(version["row"]);
            }
            else
            {
                rows.Update(version["before"].AsDocument);
            }

            history.Delete(version[BookTable.Id]);
        }
    });

    /// <summary>Copies the book to another file, which may be an older backup.</summary>
    /// <exception cref="ShopBookException">The book cannot be read, or the backup not be written.</exception>
    public void Backup(string target) => _file.Backup(target, static book => Edition(book));

    private ShopEdition Change(long revision, Action<LiteDatabase, BsonDocument> change) => _file.Change(
        book =>
        {
            BsonDocument head = HeadOf(book);
            Schema.RefuseNewer(head);
            if (head["revision"] != revision)
            {
                throw new BookChangedException(Path, revision, head["revision"].AsInt64);
            }

            head["revision"] = revision + 1;
            change(book, head);
            book.GetCollection(Head).Update(head);
        },
        Edition);

    private static void Make(LiteDatabase book, BsonDocument head, RowChange change, string today)
    {
        ILiteCollection<BsonDocument> rows = book.GetCollection(change.Table.Name);
        BsonDocument? before = change.Id is { } id ? rows.FindById(id) : null;
        if (change.Id is { } missing && (before is null || before.ContainsKey(Retired)))
        {
            throw new ShopBookException($"There is no row {missing} in {change.Table.Name}.");
        }

        long row = change.Id ?? head["lastRow"].AsInt64 + 1;
        head["lastRow"] = Math.Max(row, head["lastRow"].AsInt64);
        head["lastVersion"] = head["lastVersion"].AsInt64 + 1;
        book.GetCollection(History).Insert(new BsonDocument
        {
            [BookTable.Id] = head["lastVersion"],
            ["revision"] = head["revision"],
            ["table"] = change.Table.Name,
            ["row"] = row,
            ["before"] = before is null ? BsonValue.Null : before,
        });

        BsonDocument after = new(change.Row ?? before!) { [BookTable.Id] = row };
        if (change.Row is null)
        {
            after[Retired] = today;
        }

        rows.Upsert(after);
    }

    private static BsonDocument HeadOf(LiteDatabase book) =>
        book.GetCollection(Head).FindById(1L) ?? throw new ShopBookException("This is a LiteDB file of another program, not a shop book; it was left as it is.");

    private static ShopEdition Edition(LiteDatabase book)
    {
        BsonDocument head = HeadOf(book);
        Dictionary<BookTable, object> rows = [];
        foreach (BookTable table in BookTables.All)
        {
            rows[table] = table.Read(book.GetCollection(table.Name).FindAll().Where(static row => !row.ContainsKey(Retired)));
        }

        return new ShopEdition(head["name"].AsString, head["currency"].AsString, head["revision"].AsInt64, rows);
    }
}
