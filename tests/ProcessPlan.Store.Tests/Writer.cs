using System.Diagnostics;
using System.Globalization;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Values;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store.Tests;

/// <summary>
/// A program that changes books for ever and says each revision that was acknowledged. Each change adds two tools and sets a rate, so that the
/// revision alone says what must stand in a book.
/// </summary>
internal static class Writer
{
    private static readonly Material Steel = HandbookShop.Materials()[0];
    private static readonly Machine Drill = new("drill", ["drill"], 1, 1, 1, 1, Length.Zero, Length.FromMillimetres(10), 1);

    /// <summary>A book of one machine and no tools, so that a change takes little time and much of it is writing.</summary>
    public static ShopBook Create(string path)
    {
        ShopBook book = new(path, TimeProvider.System);
        book.Create(new ShopFloor("small shop", "EUR", [Drill], [], [Steel], [], []));
        return book;
    }

    /// <summary>Whether everything of the edition's revision stands in it, and nothing of another one.</summary>
    public static bool IsWhole(ShopEdition edition)
    {
        List<long> stamped = [.. edition.Rows(BookTables.Tools).Select(static row => row.Value.Stamped.Picometres)];
        return edition.Floor.Machines[0].RatePerHour == edition.Revision
            && stamped.SequenceEqual(Enumerable.Range(2, (int)edition.Revision - 1).SelectMany(static revision => (long[])[revision, revision]));
    }

    public static ShopEdition Change(ShopBook book, ShopEdition edition)
    {
        long next = edition.Revision + 1;
        Tool tool = new("tool", ToolUse.Drill, new Length(next), new SizeWindow(new Length(next), new Length(next)), "h8", "HSS", next, 20);
        return book.Save(edition.Revision, BookTables.Tools.Add(tool), BookTables.Machines.Replace(1, Drill with { RatePerHour = next }), BookTables.Tools.Add(tool));
    }

    public static Process Start(int changes, params IReadOnlyList<string> books) => Process.Start(
        new ProcessStartInfo(
            Environment.GetEnvironmentVariable("DOTNET_HOST_PATH") ?? "dotnet",
            [typeof(Writer).Assembly.Location, changes.ToString(CultureInfo.InvariantCulture), .. books])
        { RedirectStandardOutput = true }) ?? throw new InvalidOperationException("The writer did not start.");

    /// <summary>Each book is written by a thread of its own; a line of output is the number of a book and the revision that was acknowledged.</summary>
    public static void Main(string[] args)
    {
        int changes = int.Parse(args[0], CultureInfo.InvariantCulture);
        for (int i = 1; i < args.Length; i++)
        {
            int at = i;
            new Thread(() => Write(at - 1, args[at], changes)).Start();
        }
    }

    private static void Write(int number, string path, int changes)
    {
        ShopBook book = new(path, TimeProvider.System);
        for (int made = 0; made < changes;)
        {
            try
            {
                ShopEdition edition = Change(book, book.Read());
                made++;
                Console.Out.Write($"{number} {edition.Revision}\n");
            }
            catch (BookChangedException)
            {
                // Another writer came first: the change is made again from what stands there now.
            }
        }
    }
}
