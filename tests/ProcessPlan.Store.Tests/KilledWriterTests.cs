using System.Diagnostics;
using System.Globalization;

namespace ProcessPlan.Store.Tests;

/// <summary>Programs that die while they write, and programs that write at the same time.</summary>
public class KilledWriterTests
{
    [Fact]
    public void Two_programs_at_once_lose_no_change()
    {
        const int Changes = 40;
        using Folder folder = new();
        ShopBook book = Writer.Create(folder.Book);

        Process[] writers = [Writer.Start(Changes, folder.Book), Writer.Start(Changes, folder.Book)];
        long[] acknowledged = [.. writers.SelectMany(static writer => Acknowledged(writer)).Select(static line => line.Revision)];

        acknowledged.Should().OnlyHaveUniqueItems().And.HaveCount(2 * Changes);
        ShopEdition edition = book.Read();
        edition.Revision.Should().Be(1 + 2 * Changes);
        Writer.IsWhole(edition).Should().BeTrue();
    }

    /// <remarks>A process takes longer to start than to write many changes, so each one writes many books: every kill meets each of them at a moment of its own.</remarks>
    [Theory]
    [InlineData(32, 16)]
    [InlineData(10, 1)]
    public void What_was_acknowledged_before_a_program_is_killed_stands_in_the_book(int kills, int books)
    {
        Random chance = new(20261201);
        using Folder folder = new();
        ShopBook[] written = [.. Enumerable.Range(0, books).Select(book => Writer.Create(folder[$"shop{book}.db"]))];
        long[] revisions = [.. Enumerable.Repeat(1L, books)];
        int pendingLogs = 0;
        for (int kill = 0; kill < kills; kill++)
        {
            using Process writer = Writer.Start(int.MaxValue, [.. written.Select(static book => book.Path)]);
            string first = writer.StandardOutput.ReadLine()!;
            Thread.Sleep(chance.Next(100));
            writer.Kill();
            foreach ((int book, long revision) in Acknowledged(writer).Prepend(Line(first)))
            {
                revisions[book].Should().BeLessThan(revision);
                revisions[book] = revision;
            }

            for (int book = 0; book < books; book++)
            {
                pendingLogs += File.Exists(folder[$"shop{book}-log.db"]) ? 1 : 0;
                ShopEdition edition = written[book].Read();
                edition.Revision.Should().BeInRange(revisions[book], revisions[book] + 1);
                Writer.IsWhole(edition).Should().BeTrue();
                revisions[book] = edition.Revision;
            }
        }

        revisions.Should().OnlyContain(revision => revision > 1);
        pendingLogs.Should().BePositive("some were killed while they wrote");
    }

    private static List<(int Book, long Revision)> Acknowledged(Process writer)
    {
        List<(int Book, long Revision)> lines = [];
        while (writer.StandardOutput.ReadLine() is { } line)
        {
            lines.Add(Line(line));
        }

        writer.WaitForExit();
        return lines;
    }

    private static (int Book, long Revision) Line(string line)
    {
        string[] parts = line.Split(' ');
        return (int.Parse(parts[0], CultureInfo.InvariantCulture), long.Parse(parts[1], CultureInfo.InvariantCulture));
    }
}
