using System.Diagnostics;
using System.Text;
using System.Text.Json;

namespace ProcessPlan.Tests;

/// <summary>What a user does with the shop book at the command line.</summary>
public sealed class ShopTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("shop-commands-").FullName;

    private string Book => In("mill.db");

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void Without_a_book_the_handbook_shop_is_shown()
    {
        Answer.To("shop").Should().Be(Answer.To("shop", "show"));
        Answer.To("shop", "show").Output.Should().Be("""
            handbook shop, in EUR
                   8  machines
                1606  tools
                  31  materials
                  11  bars
                   4  suppliers

            """);
        Answer.To("shop", "show", "suppliers").Output.Should().Be("""
            row  process         lotCharge  piecePrice  days
              1  hardening              90        1.80     5
              2  case hardening        140        2.60     8
              3  nitriding             160        2.40     8
              4  coating               110        1.50     6

            """);
    }

    [Theory]
    [InlineData("machines")]
    [InlineData("tools")]
    [InlineData("materials")]
    [InlineData("bars")]
    [InlineData("suppliers")]
    public void A_table_fits_eighty_columns(string table)
    {
        Answer.To("shop", "show", table).Output.Split('\n').Should().HaveCountGreaterThan(4).And.OnlyContain(static line => line.Length <= 80);
    }

    [Fact]
    public void The_shop_as_JSON_has_every_table_with_exact_numbers()
    {
        using JsonDocument shop = JsonDocument.Parse(Answer.To("shop", "show", "--json").Output);

        shop.RootElement.EnumerateObject().Select(static field => field.Name)
            .Should().Equal("name", "currency", "revision", "machines", "tools", "materials", "bars", "suppliers");
        JsonElement tool = shop.RootElement.GetProperty("tools")[11];
        tool.GetRawText().Should().Be("""{"id":12,"name":"twist drill","use":"drill","stamped":1.05,"ownMin":1.036,"ownMax":1.05,"made":"h8","material":"HSS","price":2.945,"lifeMetres":20}""");
        JsonElement plastic = shop.RootElement.GetProperty("materials").EnumerateArray().First(static material => material.GetProperty("group").GetString() == "O");
        plastic.GetProperty("hbTo").ValueKind.Should().Be(JsonValueKind.Null);
        plastic.GetProperty("keepsSkin").ValueKind.Should().Be(JsonValueKind.False);
        plastic.GetProperty("aliases").ValueKind.Should().Be(JsonValueKind.Array);
    }

    [Fact]
    public void A_plan_is_made_in_the_shop_that_is_named_and_says_so()
    {
        Make();
        string feature = "hole 25H7 x40 thru Ra0.8 C45 200off";
        string handbook = Answer.To("plan", feature).Output;

        string card = Answer.To("plan", feature, "--shop", Book).Output;

        handbook.Should().Contain("machines, rates and tools of the handbook shop, in EUR");
        card.Should().Contain("machines, rates and tools of the shop book mill.db, in EUR");
        Costs(feature, "--shop", Book).Should().Be(Costs(feature));
        Edit("machines", static line => line.Replace(",68,", ",99.50,", StringComparison.Ordinal).Replace(",42,", ",99.50,", StringComparison.Ordinal).Replace(",56,", ",99.50,", StringComparison.Ordinal));
        Costs(feature, "--shop", Book).Should().BeGreaterThan(Costs(feature));
    }

    [Fact]
    public void A_material_of_the_book_is_known_to_plan_and_to_limits()
    {
        Make();
        Answer.To("limits", "25H7", "Werkzeug9").Exit.Should().Be(2);
        Edit("materials", static line => line.Replace("2,C45,1.0503;", "2,C45,Werkzeug9;1.0503;", StringComparison.Ordinal));

        Answer.To("limits", "25H7", "Werkzeug9", "--shop", Book).Exit.Should().Be(0);
        Answer.To("plan", "25H7", "Werkzeug9", "--shop", Book).Exit.Should().Be(0);
    }

    [Fact]
    public void A_line_without_a_material_is_planned_where_the_shop_has_no_C45()
    {
        Make();
        Edit("materials", static line => line.StartsWith("2,C45,", StringComparison.Ordinal) ? null : line);

        Answer answer = Answer.To("plan", "25H7", "--shop", Book);

        answer.Exit.Should().Be(0, answer.Error);
        answer.Output.Should().Contain("material C15");
    }

    [Fact]
    public void An_import_is_shown_first_and_made_when_told_to_and_taken_back()
    {
        Make();
        string file = Export("suppliers");
        File.WriteAllText(file, File.ReadAllText(file).Replace("4,coating,110,1.50,6\n", ",polishing,10,1,1\n", StringComparison.Ordinal).Replace("1,hardening,90", "1,hardening,95.5", StringComparison.Ordinal));
        const string Preview = """
            suppliers: 1 added, 1 changed, 1 retired, 2 as they are
              - 4 coating
              ~ 1 hardening: lotCharge 90 -> 95.5
              + polishing

            """;

        Answer.To("shop", "import", file, "--shop", Book).Should().Be(new Answer(0, Preview + "Nothing is changed yet; --yes changes it.\n", ""));
        Show("suppliers").Should().Contain("coating").And.NotContain("polishing");
        Answer.To("shop", "import", file, "--shop", Book, "--yes").Should().Be(new Answer(0, Preview + $"{Book} is at revision 2; shop undo takes it back.\n", ""));
        Show("suppliers").Should().Contain("polishing").And.NotContain("coating");
        Answer.To("shop", "undo", "--shop", Book).Should().Be(new Answer(0, $"The last change is taken back; {Book} is at revision 3.\n", ""));
        Show("suppliers").Should().Contain("coating").And.NotContain("polishing");
        Answer.To("shop", "undo", "--shop", Book).Should().Be(new Answer(3, "", $"processplan: {Book} has no change to take back.\n"));
    }

    [Fact]
    public void A_table_with_mistakes_changes_nothing_and_each_is_told_with_its_line()
    {
        Make();
        string file = Export("suppliers");
        File.WriteAllText(file, File.ReadAllText(file).Replace("1.80", "cheap", StringComparison.Ordinal).Replace("nitriding", "", StringComparison.Ordinal));

        Answer answer = Answer.To("shop", "import", file, "--yes", "--shop", Book);

        answer.Should().Be(new Answer(2, "", $"""
            {file}: line 2, piecePrice: 'cheap' is not understood; expected a number from 0, such as 12.50.
            {file}: line 4, process: '' is not understood; expected a name of at most 200 characters.

            """));
        Answer.To("shop", "undo", "--shop", Book).Exit.Should().Be(3);
    }

    [Fact]
    public void A_table_that_lost_its_letters_is_refused()
    {
        string file = In("suppliers.csv");
        File.WriteAllBytes(file, Encoding.Latin1.GetBytes("id,process,lotCharge,piecePrice,days\n1,härten,1,1,1\n"));

        Answer.To("shop", "import", file).Should().Be(new Answer(2, "", $"processplan: {file} is not UTF-8; save it as \"CSV UTF-8\".\n"));
    }

    [Fact]
    public void All_tables_are_exported_to_a_folder_and_come_back_unchanged()
    {
        Make();
        string folder = In("tables");

        (string Name, int Rows)[] tables = [("machines", 8), ("tools", 1606), ("materials", 31), ("bars", 11), ("suppliers", 4)];

        Answer.To("shop", "export", folder, "--shop", Book).Output
            .Should().Be(string.Concat(tables.Select(table => $"{Path.Combine(folder, table.Name)}.csv: {table.Rows} {table.Name}\n")));

        foreach (string file in Directory.GetFiles(folder))
        {
            Answer.To("shop", "import", file, "--yes", "--shop", Book).Output.Should().MatchRegex("^[a-z]+: 0 added, 0 changed, 0 retired, [0-9]+ as they are\n$");
        }

        Directory.GetFiles(folder).Should().HaveCount(5);
    }

    [Fact]
    public void A_backup_can_be_planned_with()
    {
        Make();

        Answer.To("shop", "backup", In("copy.db"), "--shop", Book).Should().Be(new Answer(0, $"{In("copy.db")} is a backup of {Book} now.\n", ""));
        Answer.To("plan", "25H7", "--shop", In("copy.db")).Exit.Should().Be(0);
    }

    [Theory]
    [InlineData("limits", "25H7")]
    [InlineData("plan", "25H7")]
    [InlineData("shop", "show")]
    [InlineData("shop", "undo")]
    public void A_book_that_cannot_be_opened_is_one_sentence(params string[] words)
    {
        File.WriteAllText(Book, "no book");

        Answer.To([.. words, "--shop", Book]).Should().Be(new Answer(3, "", $"processplan: {Book} is not a shop book; it was left as it is.\n"));
        Answer.To([.. words, "--shop", In("nothing.db")]).Should().Be(new Answer(3, "", $"processplan: There is no shop book {In("nothing.db")}.\n"));
        File.ReadAllText(Book).Should().Be("no book");
    }

    [Theory]
    [InlineData("'drills' is no table of the shop book; expected machines, tools, materials, bars, suppliers.", "show", "drills")]
    [InlineData("drills.csv is not named after a table of the shop book; expected machines, tools, materials, bars, suppliers, such as tools.csv.", "import", "drills.csv")]
    [InlineData("drills.csv is not named after a table of the shop book; expected machines, tools, materials, bars, suppliers, such as tools.csv.", "export", "drills.csv")]
    [InlineData("'sell' is no command; expected create, show, export, import, undo, backup or --help.", "sell")]
    public void A_word_that_is_not_understood_is_answered_in_one_sentence(string sentence, params string[] words)
    {
        Answer.To(["shop", .. words]).Should().Be(new Answer(2, "", $"processplan: {sentence}\n"));
    }

    [Fact]
    public async Task The_first_import_makes_the_book_of_the_user_and_from_then_on_it_is_used()
    {
        string file = Export("suppliers", handbook: true);
        File.WriteAllText(file, File.ReadAllText(file).Replace("1,hardening,90", "1,hardening,95.5", StringComparison.Ordinal));
        string own = Path.Combine(_folder, "processplan", "shop.db");

        (await AsUser("shop", "import", file)).Should().Contain("Nothing is changed yet");
        File.Exists(own).Should().BeFalse();
        (await AsUser("shop", "import", file, "--yes")).Should().Contain($"{own} is at revision 2");
        (await AsUser("shop", "show", "suppliers")).Should().Contain("95.5");
        (await AsUser("plan", "25H7")).Should().Contain("of the shop book shop.db, in EUR");
    }

    [Fact]
    public async Task What_reads_a_book_is_not_loaded_without_one()
    {
        string[] files = [.. Directory.GetFiles(AppContext.BaseDirectory, "ProcessPlan*.dll"), .. Directory.GetFiles(AppContext.BaseDirectory, "processplan*"), Path.Combine(AppContext.BaseDirectory, "System.CommandLine.dll")];
        foreach (string file in files.Distinct())
        {
            File.Copy(file, In(Path.GetFileName(file)));
        }

        // Without the list of what belongs to it, the program is started with what stands beside it.
        File.Delete(In("processplan.deps.json"));
        File.Delete(In("ProcessPlan.Store.dll"));
        File.Exists(In("LiteDB.dll")).Should().BeFalse();

        (await Run(In("processplan.dll"), "limits", "25H7")).Should().StartWith("hole Ø25 H7");
        (await Run(In("processplan.dll"), "plan", "25H7")).Should().StartWith("ROUTE CARD");
        (await Run(In("processplan.dll"), "shop", "show")).Should().BeEmpty("a command that needs the book fails without it");
    }

    private Task<string> AsUser(params string[] words) => Run(Executable.Program, words);

    private async Task<string> Run(string program, params string[] words)
    {
        ProcessStartInfo start = new(Executable.Dotnet, [program, .. words]) { RedirectStandardOutput = true, RedirectStandardError = true };
        start.Environment["XDG_DATA_HOME"] = _folder;
        start.Environment["APPDATA"] = _folder;
        using Process process = Process.Start(start)!;
        Task<string> error = process.StandardError.ReadToEndAsync();
        string output = await process.StandardOutput.ReadToEndAsync();
        await error;
        return output;
    }

    private static decimal Costs(string feature, params string[] options)
    {
        using JsonDocument plan = JsonDocument.Parse(Answer.To(["plan", feature, "--json", .. options]).Output);
        return plan.RootElement.GetProperty("routes")[0].GetProperty("costPerPiece").GetDecimal();
    }

    private void Make() => Answer.To("shop", "create", Book).Should().Be(new Answer(0, $"{Book} is a shop book now, made from the handbook shop.\n", ""));

    private string Show(string table) => Answer.To("shop", "show", table, "--shop", Book).Output;

    private string Export(string table, bool handbook = false)
    {
        string file = In(table + ".csv");
        Answer answer = handbook ? Answer.To("shop", "export", file) : Answer.To("shop", "export", file, "--shop", Book);
        answer.Exit.Should().Be(0);
        return file;
    }

    /// <summary>Edits the lines of a table by hand; a line of which nothing is left goes.</summary>
    private void Edit(string table, Func<string, string?> edit)
    {
        string file = Export(table);
        File.WriteAllLines(file, File.ReadAllLines(file).Select(edit).OfType<string>());
        Answer.To("shop", "import", file, "--yes", "--shop", Book).Output.Should().EndWith("; shop undo takes it back.\n");
    }

    private string In(string name) => Path.Combine(_folder, name);
}
