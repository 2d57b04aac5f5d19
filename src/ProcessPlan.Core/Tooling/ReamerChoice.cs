using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tooling;

/// <summary>Whether a reamer suits the limits of a hole, judged by its own size and never by the stamp.</summary>
public static class ReamerChoice
{
    /// <summary>
    /// The reamer must stay below the upper limit of DIN 1420, and have left at least a quarter of the tolerance that it is made for to wear
    /// before holes come too small: a new H7 reamer in an H8 or H9 hole, but not in F8, G6 or M7.
    /// </summary>
    public static bool Suits(Tool tool, SizeWindow hole, out string because)
    {
        SizeWindow window = Din1420.ReamerFor(hole);
        Deviation reserve = WearReserve(tool);
        if (tool.Own.Max > window.Max)
        {
            because = $"its own size reaches {tool.Own.Max.Format(3)}, DIN 1420 allows {window.Max.Format(3)}";
            return false;
        }

        if (tool.Own.Min < hole.Min + reserve)
        {
            because = $"its own size starts at {tool.Own.Min.Format(3)}, less than {reserve.Format()} µm above the smallest hole";
            return false;
        }

        because = $"its own size {tool.Own.Min.Format(3)} to {tool.Own.Max.Format(3)} stays below {window.Max.Format(3)} (DIN 1420) with {(tool.Own.Min - hole.Min).Format()} µm to wear";
        return true;
    }

    /// <summary>
    /// Every suited reamer, the best first: the larger share of good holes, among equals the one made for this class of hole, else the smaller, which asks
    /// less of the hole before it (each has its wear left). Only with the drills of the crib in view can one be chosen.
    /// </summary>
    /// <param name="near">Reamers of about this size.</param>
    /// <param name="hole">Limits of the hole.</param>
    /// <param name="asked">The class asked for, if any.</param>
    /// <param name="yield">Share of good holes that a reamer leaves.</param>
    public static IEnumerable<Tool> Suited(ReadOnlySpan<Tool> near, SizeWindow hole, ToleranceClass? asked, Func<Tool, double> yield)
    {
        List<Tool> suited = [];
        foreach (Tool tool in near)
        {
            if (Suits(tool, hole, out _))
            {
                suited.Add(tool);
            }
        }

        return suited.OrderByDescending(yield).ThenByDescending(tool => asked is { } toleranceClass && tool.Made == toleranceClass.ToString()).ThenBy(static tool => tool.Own.Max);
    }

    /// <summary>A quarter of the hole tolerance whose 35 % is the reamer's own tolerance.</summary>
    private static Deviation WearReserve(Tool tool) => new(tool.Own.Width.Picometres * 25 / 35);
}
