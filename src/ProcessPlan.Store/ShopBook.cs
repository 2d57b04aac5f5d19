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
    /// <param name="shop">What stands in the book first.</param>
    /// <param name="name">What the shop is called from now on; its old name where nothing is said.</param>
    /// <exception cref="ShopBookException">There is a file of this name, or it cannot be written.</exception>
    public ShopEdition Create(ShopFloor shop, string? name = null) => _file.Create(book => BookContent.Fill(book, shop, name ?? shop.Name), Whole);

    /// <summary>The shop as the book has it now.</summary>
    /// <exception cref="ShopBookException">There is no such book, it is damaged, or it is held by another program.</exception>
    public ShopEdition Read() => _file.Read(Whole);

    /// <summary>Makes all changes or none; when it returns they are on the disk.</summary>
    /// <param name="revision">The revision of the edition that the changes were made from.</param>
    /// <param name="changes">At least one.</param>
    /// <exception cref="BookChangedException">Another program wrote in between.</exception>
    /// <exception cref="ShopBookException">A change cannot be made, or the book cannot be written.</exception>
    public ShopEdition Save(long revision, params IReadOnlyList<RowChange> changes)
    {
        ArgumentOutOfRangeException.ThrowIfZero(changes.Count, nameof(changes));
        string today = DateOnly.FromDateTime(_clock.GetLocalNow().DateTime).ToString("O", CultureInfo.InvariantCulture);
        return Change(revision, content =>
        {
            foreach (RowChange change in changes)
            {
                content.Make(change, today);
            }
        });
    }

    /// <summary>Takes the last change back that was not taken back yet.</summary>
    /// <param name="revision">The revision of the edition that the user saw.</param>
    /// <exception cref="BookChangedException">Another program wrote in between.</exception>
    /// <exception cref="ShopBookException">There is no change to take back, or the book cannot be written.</exception>
    public ShopEdition Undo(long revision) => Change(revision, content =>
    {
        if (!content.TakeBack())
        {
            throw new ShopBookException($"{Path} has no change to take back.");
        }
    });

    /// <summary>Copies the book to another file, which may be an older backup.</summary>
    /// <exception cref="ShopBookException">The book cannot be read, or the backup not be written.</exception>
    public void Backup(string target) => _file.Backup(target, static copy => Whole(copy));

    private ShopEdition Change(long revision, Action<BookContent> change) => _file.Change(
        book =>
        {
            BookContent content = BookContent.Open(book);
            if (content.Revision != revision)
            {
                throw new BookChangedException(Path, revision, content.Revision);
            }

            content.Begin();
            change(content);
            content.End();
        },
        Whole,
        BackUpBeforeUpgrade);

    private void BackUpBeforeUpgrade(LiteDatabase book)
    {
        int schema = BookContent.SchemaOf(book);
        if (schema < BookContent.CurrentSchema)
        {
            _file.WriteBackup(new BookFile(_file.Beside($"-schema{schema}-backup")), static copy => Whole(copy));
        }
    }

    /// <summary>Always of a copy in memory, which an older book may be upgraded in.</summary>
    private static ShopEdition Whole(LiteDatabase copy) => BookContent.Open(copy).Edition();
}
