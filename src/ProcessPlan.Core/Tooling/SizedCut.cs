using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tooling;

/// <summary>The range of sizes that a tool of fixed size leaves.</summary>
/// <param name="Sizes">Smallest to largest hole.</param>
/// <param name="Over">How much it cuts over or under its size, least and most.</param>
/// <param name="Origin">Where that comes from.</param>
public readonly record struct SizedCut(SizeWindow Sizes, (Deviation Least, Deviation Most) Over, Citation Origin)
{
    private static readonly PublishedTable DrillTable = PublishedTable.Load("drill-overcut.txt");
    private static readonly SizeRanges<(Deviation Least, Deviation Most, Citation Origin)> Drills = new(DrillTable, static row =>
        (Micrometres(row, "least"), Micrometres(row, "most"), DrillTable.Cite($"over {row["over"]} to {row["upto"]} mm")));

    private static readonly PublishedTable ReamerTable = PublishedTable.Load("reamer-cut.txt");
    private static readonly Dictionary<string, ReamerRow> Reamers = ReamerTable.Rows.ToDictionary(static row => row["group"], static row => new ReamerRow(
        Micrometres(row, "ordinaryLeast"), Micrometres(row, "ordinaryMost"), Micrometres(row, "carefulLeast"), Micrometres(row, "carefulMost"), ReamerTable.Cite($"group {row["group"]}")));

    private static readonly Citation CoreDrillRule = new("common practice", "a core drill cuts its own size up to a grade IT10 over", Standing.CommonPractice);

    /// <summary>What <paramref name="tool"/> leaves in the job's material.</summary>
    /// <param name="tool">The tool, by its own measured or made size.</param>
    /// <param name="group">Cutting group of the material.</param>
    /// <param name="careful">Cutting oil and little run-out, or a light finishing cut.</param>
    public static SizedCut Predict(Tool tool, string group, bool careful)
    {
        switch (tool.Use)
        {
            case ToolUse.Drill:
                (Deviation least, Deviation most, Citation origin) = Drills.TryFind(tool.Stamped, out var row)
                    ? row
                    : throw new InvalidDataException($"drill-overcut.txt has no row for {tool.Stamped}.");
                return new SizedCut(new SizeWindow(tool.Stamped + least, tool.Stamped + most), (least, most), origin);
            case ToolUse.CoreDrill:
                Deviation grade = Iso286.TryWidth(tool.Stamped, ToleranceGrade.It(10), out Deviation width)
                    ? width
                    : throw new InvalidDataException($"There is no IT10 at {tool.Stamped}.");
                return new SizedCut(new SizeWindow(tool.Stamped, tool.Stamped + grade), (default, grade), CoreDrillRule);
            default:
                ReamerRow cut = Reamers[group];
                Deviation under = careful ? cut.CarefulLeast : cut.OrdinaryLeast;
                Deviation over = careful ? CarefulMost(cut, tool.Stamped) : cut.OrdinaryMost;
                return new SizedCut(new SizeWindow(tool.Own.Min + under, tool.Own.Max + over), (under, over), cut.Origin);
        }
    }

    /// <summary>With little run-out the oversize stays within the 15 % that DIN 1420 keeps free in an IT7 hole, rounded up, or the table's figure if that is less.</summary>
    private static Deviation CarefulMost(ReamerRow cut, Length size) =>
        Iso286.TryWidth(size, ToleranceGrade.It(7), out Deviation width) && Din1420.Reserve(width) < cut.CarefulMost ? Din1420.Reserve(width) : cut.CarefulMost;

    private static Deviation Micrometres(TableRow row, string column) => Deviation.FromMicrometres((long)row.Decimal(column));

    private sealed record ReamerRow(Deviation OrdinaryLeast, Deviation OrdinaryMost, Deviation CarefulLeast, Deviation CarefulMost, Citation Origin);
}
