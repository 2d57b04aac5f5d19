using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Values;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store.Tests;

public class ShopBookTests
{
    private static readonly Tool Worn = new(
        " reamer \t Ø10 ", ToolUse.Ream, Length.FromMillimetres(10), new SizeWindow(Length.FromMillimetres(9.999999999m), Length.FromMillimetres(10.008m)), "", "HSS ", 12.340m, 0.1);

    [Fact]
    public void The_handbook_shop_comes_back_as_it_went_in()
    {
        using Folder folder = new();
        ShopFloor shop = HandbookShop.Load();

        ShopEdition created = new ShopBook(folder.Book, TimeProvider.System).Create(shop);
        ShopEdition read = new ShopBook(folder.Book, TimeProvider.System).Read();

        AssertSame(created.Floor, shop);
        AssertSame(read.Floor, shop);
        read.Revision.Should().Be(1);
        folder.Files().Should().Equal("shop.db", "shop.db.lock");
    }

    [Fact]
    public void Names_are_compared_letter_by_letter_whatever_language_the_machine_speaks()
    {
        using Folder folder = new();
        folder.HandbookBook();

        new BookFile(folder.Book).Read(static file => (file.Collation.SortOptions, file.Collation.Culture, file.UtcDate))
            .Should().Be((System.Globalization.CompareOptions.Ordinal, System.Globalization.CultureInfo.InvariantCulture, true));
        Machine lathe = HandbookShop.Load().Machines.Single(static machine => machine.Name == "lathe");
        new ShopBook(folder.Book, TimeProvider.System).Save(1, BookTables.Machines.Add(lathe with { Name = "Lathe" })).Floor.Machines[^1].Name.Should().Be("Lathe");
    }

    [Fact]
    public void What_is_added_stands_in_the_book_to_the_last_blank_and_picometre()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        Machine machine = new("=SUM(A1)", [], 0.10m, 1e-9, 0.1 + 0.2, 0, Length.FromMillimetres(0.000000001m), Length.FromMillimetres(25.0000254m), 5.5);
        Material material = HandbookShop.Materials()[0] with { Designation = "x", Aliases = [], HbFrom = null, HbTo = null, Condition = " 鋼 \r\n " };
        Supplier supplier = new("chromium plating", 1.10m, 79228162.5142643375m, 0);

        ShopEdition saved = book.Save(1, BookTables.Tools.Add(Worn), BookTables.Machines.Add(machine), BookTables.Materials.Add(material), BookTables.Suppliers.Add(supplier));
        ShopEdition read = book.Read();

        saved.Revision.Should().Be(2);
        read.Revision.Should().Be(2);
        foreach (ShopEdition edition in (ShopEdition[])[saved, read])
        {
            edition.Rows(BookTables.Tools)[^1].Value.Should().Be(Worn);
            edition.Rows(BookTables.Machines)[^1].Value.Should().Be(machine);
            edition.Rows(BookTables.Materials)[^1].Value.Should().Be(material);
            edition.Rows(BookTables.Suppliers)[^1].Value.Should().Be(supplier);
            edition.Floor.Tools(ToolUse.Ream).Should().Contain(Worn);
        }

        read.Rows(BookTables.Suppliers)[^1].Value.LotCharge.ToString(System.Globalization.CultureInfo.InvariantCulture).Should().Be("1.10");
    }

    [Fact]
    public void A_row_that_is_replaced_keeps_its_number()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        BookRow<Machine> lathe = book.Read().Rows(BookTables.Machines).Single(static row => row.Value.Name == "lathe");

        book.Save(1, BookTables.Machines.Replace(lathe.Id, lathe.Value with { RatePerHour = 61.50m }));

        book.Read().Rows(BookTables.Machines).Single(row => row.Id == lathe.Id).Value.Should().Be(lathe.Value with { RatePerHour = 61.50m });
    }

    [Fact]
    public void A_retired_row_leaves_the_shop_and_stays_in_the_file_with_its_date()
    {
        using Folder folder = new();
        folder.HandbookBook();
        ShopBook book = new(folder.Book, new Calendar(new DateTimeOffset(2026, 12, 24, 23, 30, 0, TimeSpan.FromHours(-10))));
        BookRow<Supplier> coating = book.Read().Rows(BookTables.Suppliers).Single(static row => row.Value.Process == "coating");

        ShopEdition saved = book.Save(1, BookTables.Suppliers.Retire(coating.Id));

        saved.Floor.Suppliers.Should().NotContain(coating.Value);
        book.Read().Floor.Suppliers.Should().NotContain(coating.Value).And.HaveCountGreaterThan(2);
        System.Text.Encoding.UTF8.GetString(File.ReadAllBytes(folder.Book)).Should().Contain("2026-12-24").And.Contain("coating");
        book.Invoking(it => it.Save(2, BookTables.Suppliers.Retire(coating.Id))).Should().Throw<ShopBookException>().WithMessage($"There is no row {coating.Id} in suppliers.");
    }

    [Fact]
    public void Changes_are_taken_back_one_after_the_other()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        ShopFloor first = book.Read().Floor;
        ShopFloor second = book.Save(1, BookTables.Tools.Add(Worn), BookTables.Tools.Add(Worn), BookTables.Machines.Retire(1)).Floor;
        book.Save(2, BookTables.Tools.Retire(2), BookTables.Tools.Replace(3, Worn));

        AssertSame(book.Undo(3).Floor, second);
        AssertSame(book.Read().Floor, second);
        AssertSame(book.Undo(4).Floor, first);
        AssertSame(book.Read().Floor, first);
        book.Read().Revision.Should().Be(5);
        book.Invoking(static it => it.Undo(5)).Should().Throw<ShopBookException>().WithMessage($"{book.Path} has no change to take back.");
    }

    [Fact]
    public void The_number_of_a_row_that_was_taken_back_is_not_given_again()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();

        long taken = book.Save(1, BookTables.Tools.Add(Worn)).Rows(BookTables.Tools)[^1].Id;
        book.Undo(2);

        book.Save(3, BookTables.Tools.Add(Worn)).Rows(BookTables.Tools)[^1].Id.Should().Be(taken + 1);
    }

    [Fact]
    public void A_change_from_an_older_revision_is_refused()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        ShopBook other = new(folder.Book, TimeProvider.System);
        long revision = book.Read().Revision;
        other.Save(revision, BookTables.Tools.Retire(1));
        byte[] before = File.ReadAllBytes(folder.Book);

        book.Invoking(it => it.Save(revision, BookTables.Tools.Retire(2))).Should().Throw<BookChangedException>()
            .WithMessage($"{book.Path} was changed by another program since it was read (revision 1, now 2); nothing was written, read it again.")
            .Which.Now.Should().Be(2);
        book.Invoking(it => it.Undo(revision)).Should().Throw<BookChangedException>();

        File.ReadAllBytes(folder.Book).Should().Equal(before);
        book.Read().Rows(BookTables.Tools)[0].Id.Should().Be(2);
    }

    [Fact]
    public void A_change_that_would_leave_the_book_wrong_is_refused_and_nothing_of_it_is_written()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        byte[] before = File.ReadAllBytes(folder.Book);
        Machine lathe = book.Read().Rows(BookTables.Machines).Single(static row => row.Value.Name == "lathe").Value;

        book.Invoking(it => it.Save(1, BookTables.Tools.Retire(1), BookTables.Machines.Add(lathe))).Should().Throw<ShopBookException>()
            .WithMessage("The book can have only one machine 'lathe'; row * of machines is another.");
        book.Invoking(it => it.Save(1, [.. it.Read().Rows(BookTables.Materials).Select(static row => BookTables.Materials.Retire(row.Id))])).Should().Throw<ShopBookException>()
            .WithMessage("A shop needs at least one material.");
        book.Invoking(it => it.Save(1, BookTables.Tools.Retire(1), BookTables.Tools.Retire(99_999))).Should().Throw<ShopBookException>()
            .WithMessage("There is no row 99999 in tools.");

        File.ReadAllBytes(folder.Book).Should().Equal(before);
        book.Read().Revision.Should().Be(1);
    }

    [Fact]
    public void A_value_that_may_not_stand_in_the_book_is_refused_before_the_book_is_asked()
    {
        Machine lathe = HandbookShop.Load().Machines[0];

        FluentActions.Invoking(() => BookTables.Machines.Add(lathe with { Name = " " })).Should().Throw<ShopBookException>()
            .WithMessage("This machine cannot stand in the book: name holds no value that it may hold; expected a name of at most 200 characters.");
        FluentActions.Invoking(() => BookTables.Machines.Add(lathe with { SetUpMinutes = double.NaN })).Should().Throw<ShopBookException>();
        FluentActions.Invoking(() => BookTables.Machines.Add(lathe with { Abilities = ["a;b"] })).Should().Throw<ShopBookException>();
        FluentActions.Invoking(() => BookTables.Machines.Add(lathe with { Name = "\uD800" })).Should().Throw<ShopBookException>();
        FluentActions.Invoking(() => BookTables.Machines.Replace(1, lathe with { Smallest = lathe.Largest, Largest = lathe.Smallest })).Should().Throw<ShopBookException>()
            .WithMessage("This machine cannot stand in the book: smallest 40 mm is above largest 1 mm.");
    }

    [Fact]
    public void A_book_is_made_once()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        byte[] before = File.ReadAllBytes(folder.Book);

        book.Invoking(static it => it.Create(HandbookShop.Load())).Should().Throw<ShopBookException>().WithMessage($"There is already a file {book.Path}; it was left as it is.");
        File.ReadAllBytes(folder.Book).Should().Equal(before);
    }

    [Fact]
    public void A_backup_is_the_whole_book_in_one_file()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        ShopFloor shop = book.Save(1, BookTables.Tools.Add(Worn)).Floor;

        book.Backup(folder["copy.db"]);
        book.Save(2, BookTables.Tools.Retire(1));
        ShopBook copy = new(folder["copy.db"], TimeProvider.System);

        AssertSame(copy.Read().Floor, shop);
        copy.Undo(2).Floor.Tools(ToolUse.Ream).Should().NotContain(Worn);
        book.Backup(copy.Path);
        copy.Read().Revision.Should().Be(3);
        book.Invoking(static it => it.Backup(it.Path)).Should().Throw<ShopBookException>().WithMessage($"{book.Path} cannot be its own backup.");
    }

    [Fact]
    public void A_book_of_the_first_schema_is_read_as_it_stands_and_upgraded_by_the_first_change()
    {
        using Folder folder = new();
        File.Copy(Path.Combine(AppContext.BaseDirectory, "Books", "schema1.db"), folder.Book);
        byte[] old = File.ReadAllBytes(folder.Book);
        ShopBook book = new(folder.Book, TimeProvider.System);

        ShopEdition read = book.Read();
        File.ReadAllBytes(folder.Book).Should().Equal(old);
        read.Revision.Should().Be(3);
        read.Floor.Currency.Should().Be("CHF");
        read.Rows(BookTables.Tools).Should().HaveCount(6);
        read.Rows(BookTables.Tools)[5].Value.Name.Should().Be(" worn \t reamer");
        read.Rows(BookTables.Machines)[2].Value.RatePerHour.Should().Be(61.50m);
        read.Rows(BookTables.Suppliers).Should().HaveCount(3);

        book.Save(3, BookTables.Tools.Retire(1)).Rows(BookTables.Tools).Should().HaveCount(5);
        ShopBook backup = new(folder["shop-schema1-backup.db"], TimeProvider.System);
        File.ReadAllBytes(backup.Path).Should().Equal(old);
        AssertSame(backup.Read().Floor, read.Floor, ToolUse.Ream);

        // What was changed before the upgrade can still be taken back.
        book.Undo(4);
        book.Undo(5).Rows(BookTables.Tools).Should().HaveCount(5);
        book.Undo(6).Rows(BookTables.Suppliers).Should().HaveCount(4);
    }

    [Fact]
    public void A_book_of_a_schema_to_come_is_left_alone()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        new BookFile(folder.Book).Change(
            static file =>
            {
                LiteDB.BsonDocument head = file.GetCollection("shop").FindById(1L);
                head["schema"] = 99;
                file.GetCollection("shop").Update(head.Stamp());
            },
            static _ => true);
        byte[] before = File.ReadAllBytes(folder.Book);

        book.Invoking(static it => it.Read()).Should().Throw<ShopBookException>()
            .WithMessage($"This shop book was written by a newer version of this program (schema 99; this one knows {BookContent.CurrentSchema}).");
        book.Invoking(static it => it.Undo(1)).Should().Throw<ShopBookException>();
        File.ReadAllBytes(folder.Book).Should().Equal(before);
    }

    private static void AssertSame(ShopFloor floor, ShopFloor expected, params ToolUse[] uses)
    {
        floor.Name.Should().Be(expected.Name);
        floor.Currency.Should().Be(expected.Currency);
        floor.Machines.Should().Equal(expected.Machines);
        floor.Materials.Should().Equal(expected.Materials);
        floor.Bars.Should().Equal(expected.Bars);
        floor.Suppliers.Should().Equal(expected.Suppliers);
        foreach (ToolUse use in uses.Length > 0 ? uses : Enum.GetValues<ToolUse>())
        {
            floor.Tools(use).Should().Equal(expected.Tools(use)).And.NotBeEmpty();
        }
    }

    private sealed class Calendar(DateTimeOffset now) : TimeProvider
    {
        public override TimeZoneInfo LocalTimeZone => TimeZoneInfo.CreateCustomTimeZone("shop", now.Offset, "shop", "shop");

        public override DateTimeOffset GetUtcNow() => now.ToUniversalTime();
    }
}
