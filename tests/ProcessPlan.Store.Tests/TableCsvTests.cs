using System.Globalization;
using CsCheck;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Values;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store.Tests;

public class TableCsvTests
{
    private static readonly ShopEdition Handbook = ShopEdition.Of(HandbookShop.Load());

    private static readonly Gen<string> Text = Gen.OneOf(
        Gen.String[Gen.Char["=+-@\t\r\n'\",;| aØ鋼0"], 0, 12],
        Gen.String[Gen.Char, 0, 20].Where(static text => !text.Any(char.IsSurrogate)));

    private static readonly Gen<Tool> AnyTool =
        from name in Text.Where(static text => !string.IsNullOrWhiteSpace(text))
        from made in Text
        from material in Text
        from use in Gen.Enum<ToolUse>()
        from stamped in Gen.Long[1, 80 * Length.PicometresPerMillimetre]
        from width in Gen.Long[0, 1_000_000]
        from price in Gen.Decimal[0, 1_000_000]
        from life in Gen.Double[1e-6, 1e6]
        select new Tool(name, use, new Length(stamped), new SizeWindow(new Length(stamped), new Length(stamped + width)), made, material, price, life);

    [Theory]
    [InlineData("machines")]
    [InlineData("tools")]
    [InlineData("materials")]
    [InlineData("bars")]
    [InlineData("suppliers")]
    public void A_table_that_is_read_back_changes_nothing(string name)
    {
        BookTable table = BookTables.Find(name)!;

        TableImport import = TableCsv.Read(table, Handbook, new StringReader(Csv(table, Handbook)));

        import.Problems.Should().BeEmpty();
        import.Differences.Should().BeEmpty();
        import.Unchanged.Should().Be(table.Documents(Handbook).Count).And.BePositive();
    }

    [Fact]
    public void Any_tool_comes_back_exactly_from_the_table_and_from_the_book()
    {
        using Folder folder = new();
        ShopBook book = folder.HandbookBook();
        ShopEdition edition = book.Read();
        AnyTool.Array[1, 20].Sample(
            tools =>
            {
                ShopEdition saved = book.Save(edition.Revision, [.. tools.Select(BookTables.Tools.Add)]);
                ShopEdition read = book.Read();
                TableImport import = TableCsv.Read(BookTables.Tools, edition, new StringReader(Csv(BookTables.Tools, read)));
                edition = book.Undo(saved.Revision);
                return read.Rows(BookTables.Tools).TakeLast(tools.Length).Select(static row => row.Value).SequenceEqual(tools)
                    && TableCsv.Read(BookTables.Tools, read, new StringReader(Csv(BookTables.Tools, read))).Differences.Count == 0
                    && import.Problems.Count == tools.Length;
            },
            iter: 30,
            threads: 1);
    }

    [Theory]
    [InlineData("=1+1", "'=1+1")]
    [InlineData("+49 911", "'+49 911")]
    [InlineData("-", "'-")]
    [InlineData("@SUM(A1)", "'@SUM(A1)")]
    [InlineData("\tx", "'\tx")]
    [InlineData("\rx", "'\rx")]
    [InlineData("\nx", "'\nx")]
    [InlineData("'", "''")]
    [InlineData("'=", "''=")]
    [InlineData("don't = ask", "don't = ask")]
    [InlineData("", "")]
    public void Text_that_a_spreadsheet_would_run_is_neutralised_and_restored(string text, string cell)
    {
        SheetText.Neutralise(text).Should().Be(cell);
        SheetText.Restore(cell).Should().Be(text);
    }

    [Fact]
    public void No_text_cell_starts_like_a_formula()
    {
        Text.Sample(static text => SheetText.Restore(SheetText.Neutralise(text)) == text && SheetText.Neutralise(text) is not ['=' or '+' or '-' or '@' or '\t' or '\r', ..]);
    }

    [Fact]
    public void What_a_spreadsheet_typed_by_hand_left_is_understood()
    {
        string csv = Csv(BookTables.Suppliers, Handbook);
        string edited = csv.Replace(",", ";", StringComparison.Ordinal).Replace("1.80", "1,85", StringComparison.Ordinal).Replace("'", "", StringComparison.Ordinal) + "\n";

        TableImport import = TableCsv.Read(BookTables.Suppliers, Handbook, new StringReader(edited.Replace("\n", "\r\n", StringComparison.Ordinal)));

        import.Problems.Should().BeEmpty();
        import.Differences.Should().ContainSingle().Which.Cells.Should().Equal(new CellDifference("piecePrice", "1.80", "1.85"));
    }

    [Fact]
    public void The_preview_says_what_retires_changes_and_is_new()
    {
        string[] lines = Csv(BookTables.Suppliers, Handbook).Split('\n', StringSplitOptions.RemoveEmptyEntries);
        lines[0].Should().Be("id,process,lotCharge,piecePrice,days");
        lines[1].Should().Be("1,hardening,90,1.80,5");
        string edited = string.Join('\n', lines[0], lines[1].Replace("1.80", "1.95", StringComparison.Ordinal), lines[3], ",polishing,50,1,2");

        TableImport import = TableCsv.Read(BookTables.Suppliers, Handbook, new StringReader(edited));

        import.Problems.Should().BeEmpty();
        import.Differences.Select(static row => (row.Fate, row.Id, row.Key)).Should().Equal(
            (RowFate.Retired, 2, "case hardening"), (RowFate.Retired, 4, "coating"), (RowFate.Changed, 1, "hardening"), (RowFate.Added, null, "polishing"));
        import.Differences[2].Cells.Should().Equal(new CellDifference("piecePrice", "1.80", "1.95"));
        import.Unchanged.Should().Be(1);

        using Folder folder = new();
        ShopEdition after = folder.HandbookBook().Save(1, [.. import.Differences.Select(static row => row.Change)]);
        after.Floor.Suppliers.Select(static supplier => supplier.Process).Should().Equal("hardening", "nitriding", "polishing");
        after.Floor.Suppliers[0].PiecePrice.Should().Be(1.95m);
    }

    [Fact]
    public void A_table_without_numbers_is_matched_by_what_its_rows_are()
    {
        string[] lines = Csv(BookTables.Tools, Handbook).Split('\n', StringSplitOptions.RemoveEmptyEntries);
        string unnumbered = string.Join('\n', lines.Select(static line => line[(line.IndexOf(',', StringComparison.Ordinal) + 1)..]));

        TableImport import = TableCsv.Read(BookTables.Tools, Handbook, new StringReader(unnumbered));

        import.Problems.Should().BeEmpty();
        import.Differences.Should().BeEmpty();
        import.Unchanged.Should().Be(lines.Length - 1);
    }

    [Fact]
    public void Every_problem_is_told_with_its_place()
    {
        const string Csv = """
            id,process,lotCharge,piecePrice,days
            1,hardening,90,free,5
            1,hardening,90,1.80,5
            77,"two
            lines",90,1.80,5
            3,,90,1.80,half
            4,coating,1
            ,coating,1.2.3,1.80,-1
            """;

        TableCsv.Read(BookTables.Suppliers, Handbook, new StringReader(Csv)).Problems.Should().Equal(
            "line 2, piecePrice: 'free' is not understood; expected a number from 0, such as 12.50",
            "line 3, id: row 1 stands in line 2 already",
            "line 4, id: there is no row 77 in suppliers; a new row has no number",
            "line 6, process: '' is not understood; expected a name of at most 200 characters",
            "line 6, days: 'half' is not understood; expected a whole number from 0",
            "line 7: 3 cells stand there; expected 5, as in line 1",
            "line 8, lotCharge: '1.2.3' is not understood; expected a number from 0, such as 12.50",
            "line 8, days: '-1' is not understood; expected a whole number from 0");
        TableCsv.Read(BookTables.Suppliers, Handbook, new StringReader("process,price\nx,1\n")).Problems.Should().Equal(
            "line 1: 'price' is no column of suppliers; expected id, process, lotCharge, piecePrice, days",
            "line 1: the column lotCharge of suppliers is missing",
            "line 1: the column piecePrice of suppliers is missing",
            "line 1: the column days of suppliers is missing");
        TableCsv.Read(BookTables.Suppliers, Handbook, new StringReader("id,process,lotCharge,piecePrice,days\n,polish,1,1,1\n,polish,1,1,1\n")).Problems.Should().Equal(
            "line 3: supplier 'polish' stands in line 2 already");
    }

    [Theory]
    [InlineData("")]
    [InlineData("\n")]
    [InlineData("id,process,lotCharge,piecePrice,days\n1,\"hardening,90,1.80,5\n")]
    [InlineData("id,id,process,lotCharge,piecePrice,days\n1,1,hardening,90,1.80,5\n")]
    [InlineData("\0\0\0\0")]
    public void What_is_no_table_changes_nothing(string text)
    {
        TableImport import = TableCsv.Read(BookTables.Suppliers, Handbook, new StringReader(text));

        import.Problems.Should().NotBeEmpty();
        import.Differences.Should().BeEmpty();
    }

    [Fact]
    public void A_machine_that_writes_a_decimal_comma_writes_the_same_table_and_the_same_book()
    {
        string plain = Csv(BookTables.Machines, Handbook) + Csv(BookTables.Materials, Handbook);
        CultureInfo before = CultureInfo.CurrentCulture;
        CultureInfo comma = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        comma.NumberFormat.NumberDecimalSeparator = ",";
        comma.NumberFormat.NegativeSign = "−";
        CultureInfo.CurrentCulture = comma;
        try
        {
            1.5.ToString(CultureInfo.CurrentCulture).Should().Be("1,5");
            using Folder folder = new();
            ShopEdition read = folder.HandbookBook().Read();

            (Csv(BookTables.Machines, read) + Csv(BookTables.Materials, read)).Should().Be(plain);
            TableCsv.Read(BookTables.Machines, read, new StringReader(Csv(BookTables.Machines, read))).Differences.Should().BeEmpty();
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    private static string Csv(BookTable table, ShopEdition edition)
    {
        using StringWriter text = new(CultureInfo.InvariantCulture) { NewLine = "\n" };
        TableCsv.Write(table, edition, text);
        return text.ToString();
    }
}
