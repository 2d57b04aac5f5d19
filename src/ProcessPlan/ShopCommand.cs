using System.Buffers;
using System.CommandLine;
using System.Globalization;
using System.Text;
using System.Text.Json;
using ProcessPlan.Core.Shop;
using ProcessPlan.Documents;
using ProcessPlan.Store;
using ProcessPlan.Store.Tables;

namespace ProcessPlan;

/// <summary><c>shop …</c>: makes, shows, exports, imports and backs up the shop book.</summary>
internal sealed class ShopCommand
{
    private const string Csv = ".csv";

    private static readonly UTF8Encoding StrictUtf8 = new(encoderShouldEmitUTF8Identifier: true, throwOnInvalidBytes: true);

    private readonly Streams _streams;
    private readonly ShopChoice _choice = new();

    private ShopCommand(Streams streams) => _streams = streams;

    private static string TableNames => string.Join(", ", BookTables.All.Select(static table => table.Name));

    public static Command Create(Streams streams)
    {
        ShopCommand shop = new(streams);
        Command command = new("shop", "Shows and edits the shop book: machines, tools, materials, bars and suppliers")
        {
            shop.Make(), shop.Show(), shop.Export(), shop.Import(), shop.Undo(), shop.Backup(),
        };
        command.SetAction(parsed => shop.Show(parsed, null));
        return command;
    }

    private Command Make()
    {
        Argument<string> file = new("FILE") { Description = "The new book; without it the user's own", Arity = ArgumentArity.ZeroOrOne };
        Command create = new("create", "Makes a shop book from the built-in handbook shop") { file };
        create.SetAction(parsed =>
        {
            ShopBook book = new(parsed.GetValue(file) ?? OwnPath(), TimeProvider.System);
            Create(book);
            Say($"{book.Path} is a shop book now, made from the handbook shop.");
            return ExitCode.Done;
        });
        return create;
    }

    private Command Show()
    {
        Argument<string> name = new("TABLE") { Description = TableNames + "; without one, what the shop has of each", Arity = ArgumentArity.ZeroOrOne };
        Flag json = new("--json", "Answer as one JSON document, with every column");
        Command show = new("show", "Shows the shop, or one table of it") { name, json.Option, _choice.Shop };
        show.SetAction(parsed =>
        {
            BookTable? table = parsed.GetValue(name) is { } asked ? Table(asked) : null;
            return json.In(parsed) ? WriteJson(Edition(parsed), table is null ? BookTables.All : [table]) : Show(parsed, table);
        });
        return show;
    }

    private int Show(ParseResult parsed, BookTable? table)
    {
        ShopEdition edition = Edition(parsed);
        using StreamWriter output = _streams.OutputText();
        Write(output, edition, table);
        return ExitCode.Done;
    }

    private Command Export()
    {
        Argument<string> target = new("TARGET") { Description = "A folder for a file of each table, or one file such as tools.csv" };
        Command export = new("export", "Writes the tables as CSV, to edit them by hand or in a spreadsheet") { target, _choice.Shop };
        export.SetAction(parsed =>
        {
            string path = parsed.GetValue(target)!;
            (BookTable Table, string File)[] files = IsCsv(path)
                ? [(TableOf(path), path)]
                : [.. BookTables.All.Select(table => (table, Path.Combine(path, table.Name + Csv)))];
            ShopEdition edition = Edition(parsed);
            if (!IsCsv(path))
            {
                Directory.CreateDirectory(path);
            }

            foreach ((BookTable table, string file) in files)
            {
                WriteWhole(file, text => TableCsv.Write(table, edition, text));
                Say($"{file}: {table.CountIn(edition)} {table.Name}");
            }

            return ExitCode.Done;
        });
        return export;
    }

    private Command Import()
    {
        Argument<string> source = new("FILE") { Description = $"A table as CSV, named after it: {TableNames}" };
        Flag yes = new("--yes", "Makes the changes; without it they are only shown");
        Command import = new("import", "Reads one table from CSV: shows what would change, and changes it when told to") { source, yes.Option, _choice.Shop };
        import.SetAction(parsed =>
        {
            string path = parsed.GetValue(source)!;
            BookTable table = TableOf(path);
            ShopEdition edition = Edition(parsed);
            TableImport read = Read(path, table, edition);
            if (read.Problems.Count > 0)
            {
                foreach (string problem in read.Problems)
                {
                    _streams.Error.WriteLine($"{path}: {problem}.");
                }

                return ExitCode.NotUnderstood;
            }

            ImportText.Write(read, Say);
            if (read.Differences.Count > 0)
            {
                Say(yes.In(parsed) ? Save(parsed, edition, read) : "Nothing is changed yet; --yes changes it.");
            }

            return ExitCode.Done;
        });
        return import;
    }

    private Command Undo()
    {
        Command undo = new("undo", "Takes the last change of the book back") { _choice.Shop };
        undo.SetAction(parsed =>
        {
            ShopBook book = Book(parsed);
            Say($"The last change is taken back; {book.Path} is at revision {book.Undo(book.Read().Revision).Revision}.");
            return ExitCode.Done;
        });
        return undo;
    }

    private Command Backup()
    {
        Argument<string> target = new("FILE") { Description = "The backup; an older backup of this name is replaced" };
        Command backup = new("backup", "Copies the shop book to a file and reads the copy") { target, _choice.Shop };
        backup.SetAction(parsed =>
        {
            ShopBook book = Book(parsed);
            book.Backup(parsed.GetValue(target)!);
            Say($"{parsed.GetValue(target)} is a backup of {book.Path} now.");
            return ExitCode.Done;
        });
        return backup;
    }

    private string Save(ParseResult parsed, ShopEdition edition, TableImport read)
    {
        ShopBook book = new(_choice.BookPath(parsed) ?? OwnPath(), TimeProvider.System);
        long revision = edition.Revision;
        if (_choice.BookPath(parsed) is null)
        {
            revision = Create(book).Revision;
        }

        return $"{book.Path} is at revision {book.Save(revision, [.. read.Differences.Select(static row => row.Change)]).Revision}; shop undo takes it back.";
    }

    /// <summary>Reads a file that a spreadsheet may have written, and refuses letters that it spoilt.</summary>
    private static TableImport Read(string path, BookTable table, ShopEdition edition)
    {
        try
        {
            using StreamReader text = new(path, StrictUtf8);
            return TableCsv.Read(table, edition, text);
        }
        catch (DecoderFallbackException)
        {
            throw new UsageException($"{path} is not UTF-8; save it as \"CSV UTF-8\".");
        }
    }

    private static ShopEdition Create(ShopBook book)
    {
        Directory.CreateDirectory(Path.GetDirectoryName(book.Path)!);
        return book.Create(HandbookShop.Load(), "shop book " + Path.GetFileName(book.Path));
    }

    private ShopBook Book(ParseResult parsed) => new(_choice.BookPath(parsed) ?? OwnPath(), TimeProvider.System);

    private ShopEdition Edition(ParseResult parsed) => _choice.BookPath(parsed) is { } path ? new ShopBook(path, TimeProvider.System).Read() : ShopEdition.Of(HandbookShop.Load());

    private static string OwnPath() => OwnBook.Path ?? throw new UsageException("this system names no place for a shop book of your own; name one with --shop FILE.");

    private static BookTable Table(string name) => BookTables.Find(name) ?? throw new UsageException($"'{name}' is no table of the shop book; expected {TableNames}.");

    private static BookTable TableOf(string file) => BookTables.Find(Path.GetFileNameWithoutExtension(file))
        ?? throw new UsageException($"{file} is not named after a table of the shop book; expected {TableNames}, such as {BookTables.Tools.Name + Csv}.");

    private static bool IsCsv(string path) => path.EndsWith(Csv, StringComparison.OrdinalIgnoreCase);

    private static void Write(TextWriter output, ShopEdition edition, BookTable? table)
    {
        if (table is not null)
        {
            TableText.Write(table, edition, output);
            return;
        }

        string revision = edition.Revision > 0 ? $", revision {edition.Revision}" : "";
        output.WriteLine($"{edition.Floor.Name}{revision}, in {edition.Floor.Currency}");
        foreach (BookTable each in BookTables.All)
        {
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{each.CountIn(edition),8}  {each.Name}"));
        }
    }

    private int WriteJson(ShopEdition edition, IReadOnlyList<BookTable> tables)
    {
        ArrayBufferWriter<byte> document = new();
        using (Utf8JsonWriter json = JsonText.Writer(document))
        {
            json.WriteStartObject();
            json.WriteString("name", edition.Floor.Name);
            json.WriteString("currency", edition.Floor.Currency);
            json.WriteNumber("revision", edition.Revision);
            foreach (BookTable table in tables)
            {
                TableJson.Write(table, edition, json);
            }

            json.WriteEndObject();
        }

        document.Write("\n"u8);
        _streams.Output.Write(document.WrittenSpan);
        return ExitCode.Done;
    }

    /// <summary>Writes a file to its end before it takes its name, so that a full disk spoils nothing that was there.</summary>
    private static void WriteWhole(string path, Action<TextWriter> write)
    {
        string part = path + ".part";
        try
        {
            using (StreamWriter text = new(part, append: false, StrictUtf8) { NewLine = "\n" })
            {
                write(text);
            }

            File.Move(part, path, overwrite: true);
        }
        finally
        {
            File.Delete(part);
        }
    }

    private void Say(string line)
    {
        using StreamWriter output = _streams.OutputText();
        output.WriteLine(line);
    }
}
