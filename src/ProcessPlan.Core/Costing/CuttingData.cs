using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Costing;

/// <summary>Speeds and feeds of one group of materials.</summary>
/// <param name="Drill">HSS drilling, m/min.</param>
/// <param name="Ream">HSS reaming, m/min.</param>
/// <param name="TurnRough">Carbide turning and boring, rough, m/min.</param>
/// <param name="TurnFinish">Carbide turning and boring, finish, m/min.</param>
/// <param name="Mill">Carbide milling, m/min.</param>
/// <param name="FeedFactor">Factor on the drilling feed of steel.</param>
/// <param name="Origin">Row of the table.</param>
public sealed record CuttingData(double Drill, double Ream, double TurnRough, double TurnFinish, double Mill, double FeedFactor, Citation Origin)
{
    private static readonly PublishedTable SpeedTable = PublishedTable.Load("cutting-speeds.txt");
    private static readonly Dictionary<string, CuttingData> ByGroup = SpeedTable.Rows.ToDictionary(static row => row["group"], static row =>
        new CuttingData(row.Double("drill"), row.Double("ream"), row.Double("turnRough"), row.Double("turnFinish"), row.Double("mill"), row.Double("feed"),
            SpeedTable.Cite($"{row["group"]}, {row["note"]}")));

    private static readonly PublishedTable FeedTable = PublishedTable.Load("drill-feeds.txt");
    private static readonly SizeRanges<(double Feed, Citation Origin)> DrillFeeds = new(FeedTable, static row =>
        (row.Double("feed"), FeedTable.Cite($"over {row["over"]} to {row["upto"]} mm")));

    /// <summary>The groups of materials that there are cutting data for.</summary>
    public static IReadOnlyCollection<string> Groups => ByGroup.Keys;

    /// <exception cref="KeyNotFoundException">No cutting data for the group; cannot survive the tests.</exception>
    public static CuttingData For(string group) => ByGroup[group];

    /// <summary>Feed of an HSS twist drill in steel, mm per revolution.</summary>
    public static double DrillFeed(Length diameter) => DrillFeeds.TryFind(diameter, out (double Feed, Citation Origin) row)
        ? row.Feed
        : throw new ArgumentOutOfRangeException(nameof(diameter), diameter, "Drill feeds are given up to 100 mm.");
}
