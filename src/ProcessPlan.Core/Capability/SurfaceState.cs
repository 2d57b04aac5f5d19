using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Capability;

/// <summary>What a process leaves on the surface, for the stock of the next one.</summary>
/// <param name="RzMicrometres">Height of the roughness.</param>
/// <param name="LayerMicrometres">Depth of the damaged layer.</param>
/// <param name="ErrorShare">Share K of the blank's spatial error that is still there.</param>
/// <param name="Origin">Row of the table.</param>
public sealed record SurfaceState(double RzMicrometres, double LayerMicrometres, double ErrorShare, Citation Origin)
{
    private static readonly Dictionary<string, SizeRanges<SurfaceState>> ByProcess = Read(PublishedTable.Load("surface-left.txt"));

    /// <exception cref="InvalidDataException">The table has no row for the process at this size; cannot survive the tests.</exception>
    public static SurfaceState After(string process, Length size) =>
        ByProcess.TryGetValue(process, out SizeRanges<SurfaceState>? ranges) && ranges.TryFind(size, out SurfaceState state)
            ? state
            : throw new InvalidDataException($"surface-left.txt has no row for {process} at {size}.");

    private static Dictionary<string, SizeRanges<SurfaceState>> Read(PublishedTable table) =>
        table.Rows.GroupBy(static row => row["process"].Replace('_', ' ')).ToDictionary(
            static group => group.Key,
            group => new SizeRanges<SurfaceState>(table, group, row => new SurfaceState(row.Double("rz"), row.Double("h"), row.Double("k"),
                table.Cite($"{group.Key}, over {row["over"]} to {row["upto"]} mm"))));
}
