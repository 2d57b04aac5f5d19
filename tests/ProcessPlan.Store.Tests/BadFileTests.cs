using LiteDB;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store.Tests;

/// <summary>Whatever stands where a shop book should: one sentence, and not a byte of it is touched.</summary>
public class BadFileTests
{
    public static TheoryData<string, string> Foreign() => new()
    {
        { "nothing", "is empty, not a shop book; it was left as it is." },
        { "a little garbage", "is not a shop book; it was left as it is." },
        { "garbage", "is not a shop book; it was left as it is." },
        { "text", "is not a shop book; it was left as it is." },
        { "another version", "is not a shop book; it was left as it is." },
        { "the beginning", "is cut short; it was left as it is. Use a backup." },
        { "half and a bit", "is cut short; it was left as it is. Use a backup." },
        { "the first page", "is damaged and cannot be read*; it was left as it is. Use a backup." },
        { "half", "is damaged and cannot be read*; it was left as it is. Use a backup." },
        { "zeros", "is damaged and cannot be read*; it was left as it is. Use a backup." },
    };

    [Theory]
    [MemberData(nameof(Foreign))]
    public void A_file_that_is_no_whole_book_is_left_as_it_is(string content, string sentence)
    {
        const int Page = 8192;
        byte[] whole = Bytes();
        int half = whole.Length / Page / 2 * Page;
        byte[] garbage = new byte[20_000];
        new Random(1).NextBytes(garbage);
        byte[] bytes = content switch
        {
            "nothing" => [],
            "a little garbage" => garbage[..100],
            "garbage" => garbage,
            "text" => "machine;rate\nlathe;56\n"u8.ToArray(),
            "another version" => [.. whole[..59], 7, .. whole[60..]],
            "the beginning" => whole[..100],
            "half and a bit" => whole[..(half + 100)],
            "the first page" => whole[..Page],
            "half" => whole[..half],
            _ => [.. whole[..Page], .. new byte[whole.Length - Page]],
        };
        using Folder folder = new();
        File.WriteAllBytes(folder.Book, bytes);
        ShopBook book = new(folder.Book, TimeProvider.System);

        book.Invoking(static it => it.Read()).Should().Throw<ShopBookException>().WithMessage($"{book.Path} {sentence}");
        book.Invoking(static it => it.Save(1, BookTables.Tools.Retire(1))).Should().Throw<ShopBookException>();
        book.Invoking(static it => it.Undo(1)).Should().Throw<ShopBookException>();
        book.Invoking(it => it.Backup(folder["backup.db"])).Should().Throw<ShopBookException>();
        book.Invoking(static it => it.Create(Core.Shop.HandbookShop.Load())).Should().Throw<ShopBookException>();

        File.ReadAllBytes(folder.Book).Should().Equal(bytes);
        folder.Files().Should().NotContain(["backup.db", "shop-log.db"]);
    }

    [Fact]
    public void A_byte_that_has_changed_is_noticed_or_did_not_matter()
    {
        byte[] whole = Bytes();
        Random chance = new(7);
        using Folder folder = new();
        ShopBook book = new(folder.Book, TimeProvider.System);
        File.WriteAllBytes(folder.Book, whole);
        ShopEdition edition = book.Read();
        int noticed = 0;
        for (int i = 0; i < 150; i++)
        {
            byte[] bytes = [.. whole];
            bytes[chance.Next(64, bytes.Length)] ^= (byte)(1 << chance.Next(8));
            File.WriteAllBytes(folder.Book, bytes);
            try
            {
                ShopEdition read = book.Read();
                Text(read).Should().Be(Text(edition));
            }
            catch (ShopBookException told)
            {
                told.Message.Should().EndWith("Use a backup.");
                noticed++;
            }

            File.ReadAllBytes(folder.Book).AsSpan().SequenceEqual(bytes).Should().BeTrue();
        }

        // What the library could not let go of must not end the process when it is collected.
        GC.Collect();
        GC.WaitForPendingFinalizers();

        noticed.Should().BeGreaterThan(30);
    }

    [Fact]
    public void A_book_of_another_program_is_told_from_a_shop_book()
    {
        using Folder folder = new();
        new BookFile(folder.Book).Create(static other => other.GetCollection("songs").Insert(new BsonDocument { ["_id"] = 1 }), static _ => true);
        byte[] before = File.ReadAllBytes(folder.Book);

        new ShopBook(folder.Book, TimeProvider.System).Invoking(static it => it.Read()).Should().Throw<ShopBookException>()
            .WithMessage("This is a LiteDB file of another program, not a shop book; it was left as it is.");
        File.ReadAllBytes(folder.Book).Should().Equal(before);
    }

    [Fact]
    public void A_book_that_is_not_there_is_not_made_by_asking_for_it()
    {
        using Folder folder = new();
        ShopBook missing = new(folder.Book, TimeProvider.System);
        ShopBook nowhere = new(Path.Combine(folder["no-such-folder"], "shop.db"), TimeProvider.System);

        missing.Invoking(static it => it.Read()).Should().Throw<ShopBookException>().WithMessage($"There is no shop book {missing.Path}.");
        missing.Invoking(static it => it.Undo(1)).Should().Throw<ShopBookException>().WithMessage($"There is no shop book {missing.Path}.");
        nowhere.Invoking(static it => it.Create(Core.Shop.HandbookShop.Load())).Should().Throw<ShopBookException>().WithMessage($"There is no folder {folder["no-such-folder"]} for a shop book.");
        folder.Files().Should().BeEmpty();
    }

    [Fact]
    public void A_folder_is_no_book()
    {
        using Folder folder = new();
        Directory.CreateDirectory(folder.Book);

        new ShopBook(folder.Book, TimeProvider.System).Invoking(static it => it.Read()).Should().Throw<ShopBookException>().WithMessage($"{folder.Book} is a folder, not a shop book.");
    }

    [Theory]
    [InlineData("shop-log.db")]
    [InlineData("shop-tmp.db")]
    public void A_name_that_belongs_to_another_book_s_files_is_refused(string name)
    {
        using Folder folder = new();

        FluentActions.Invoking(() => new ShopBook(folder[name], TimeProvider.System)).Should().Throw<ShopBookException>()
            .WithMessage($"{folder[name]} is no name for a shop book: -log and -tmp mark the files that belong to one.");
    }

    [Fact]
    public void A_read_only_book_can_be_read_and_is_not_written()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        new FileInfo(folder.Book).IsReadOnly = true;
        byte[] before = File.ReadAllBytes(folder.Book);

        book.Read().Revision.Should().Be(1);
        book.Invoking(static it => it.Save(1, BookTables.Tools.Retire(1))).Should().Throw<ShopBookException>().WithMessage($"{book.Path} is read-only; nothing was written.");
        File.ReadAllBytes(folder.Book).Should().Equal(before);
        new FileInfo(folder.Book).IsReadOnly = false;
    }

    [Fact]
    public void A_book_that_another_program_holds_is_waited_for_and_then_told()
    {
        using Folder folder = new();
        folder.HandbookBook();
        ShopBook impatient = new(new BookFile(folder.Book, TimeSpan.FromMilliseconds(50)), TimeProvider.System);
        using (BookLock.Take(folder.Book, TimeSpan.Zero))
        {
            impatient.Invoking(static it => it.Read()).Should().Throw<ShopBookException>().WithMessage($"{folder.Book} is in use by another program; try again in a moment.");
        }

        FileStream held = BookLock.Take(folder.Book, TimeSpan.Zero);
        using Timer release = new(_ => held.Dispose(), null, 200, Timeout.Infinite);
        new ShopBook(folder.Book, TimeProvider.System).Read().Revision.Should().Be(1);
    }

    [Fact]
    public void A_link_and_its_target_are_one_book()
    {
        using Folder folder = new();
        folder.HandbookBook();
        File.CreateSymbolicLink(folder["link.db"], folder.Book);

        ShopBook link = new(folder["link.db"], TimeProvider.System);
        link.Save(1, BookTables.Tools.Retire(1));

        link.Path.Should().Be(folder.Book);
        folder.Files().Should().Equal("link.db", "shop.db", "shop.db.lock");
    }

    [Fact]
    public void A_log_without_its_book_keeps_its_name()
    {
        using Folder folder = new();
        File.WriteAllText(folder["shop-log.db"], "the last changes of a book that was moved away");

        new ShopBook(folder.Book, TimeProvider.System).Invoking(static it => it.Create(Core.Shop.HandbookShop.Load())).Should().Throw<ShopBookException>()
            .WithMessage($"{folder["shop-log.db"]} belongs to a shop book that is missing; move it away before another one takes its name.");
        File.ReadAllText(folder["shop-log.db"]).Should().StartWith("the last changes");
    }

    [Fact]
    public void A_backup_does_not_take_the_place_of_another_file()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        File.WriteAllText(folder["letter.txt"], "Dear Sir");

        book.Invoking(it => it.Backup(folder["letter.txt"])).Should().Throw<ShopBookException>().WithMessage($"{folder["letter.txt"]} is not a shop book; it was left as it is.");
        File.ReadAllText(folder["letter.txt"]).Should().Be("Dear Sir");
    }

    private static string Text(ShopEdition edition) =>
        edition.Revision + string.Concat(BookTables.All.SelectMany(table => table.RowsOf(edition).Select(row => row.Id + string.Concat(row.Cells.Select((_, place) => table.Format(row.Cells, place))))));

    private static byte[] Bytes()
    {
        using Folder folder = new();
        folder.HandbookBook();
        return File.ReadAllBytes(folder.Book);
    }
}
