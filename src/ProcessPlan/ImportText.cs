using ProcessPlan.Store.Tables;

namespace ProcessPlan;

/// <summary>What an import would change, for a person who has to agree to it.</summary>
internal static class ImportText
{
    private const int MostLines = 60;

    public static void Write(TableImport read, Action<string> say)
    {
        int Of(RowFate fate) => read.Differences.Count(row => row.Fate == fate);
        say($"{read.Table.Name}: {Of(RowFate.Added)} added, {Of(RowFate.Changed)} changed, {Of(RowFate.Retired)} retired, {read.Unchanged} as they are");
        foreach (RowDifference row in read.Differences.Take(MostLines))
        {
            say(row.Fate switch
            {
                RowFate.Added => $"  + {row.Key}",
                RowFate.Retired => $"  - {row.Id} {row.Key}",
                _ => $"  ~ {row.Id} {row.Key}: {string.Join(", ", row.Cells.Select(static cell => $"{cell.Column} {Shown(cell.Before)} -> {Shown(cell.After)}"))}",
            });
        }

        if (read.Differences.Count > MostLines)
        {
            say($"  and {read.Differences.Count - MostLines} more");
        }
    }

    private static string Shown(string cell) => cell.Length > 0 ? cell : "nothing";
}
