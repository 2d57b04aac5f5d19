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
    /// The best suited reamer: the one that leaves the largest share of good holes, to a ten-thousandth; among equals the one made for this class of
    /// hole, else the smallest, which asks least of the hole before it (every suited one has its wear left). Behind it the smallest of all, if that
    /// is another: it may be the only one that the drills of the crib can serve.
    /// </summary>
    /// <param name="near">Reamers of about this size.</param>
    /// <param name="hole">Limits of the hole.</param>
    /// <param name="asked">The class asked for, if any.</param>
    /// <param name="yield">Share of good holes that a reamer leaves.</param>
    public static IEnumerable<Tool> Best(ReadOnlySpan<Tool> near, SizeWindow hole, ToleranceClass? asked, Func<Tool, double> yield)
    {
        const int YieldPlaces = 4;
        Tool? best = null;
        Tool? smallest = null;
        (double Yield, bool MadeFor, Length Size) merit = default;
        foreach (Tool tool in near)
        {
            if (!Suits(tool, hole, out _))
            {
                continue;
            }

            (double Yield, bool MadeFor, Length Size) own =
                (Math.Round(yield(tool), YieldPlaces), asked is { } toleranceClass && tool.Made == toleranceClass.ToString(), new Length(-tool.Own.Max.Picometres));
            smallest = smallest is null || tool.Own.Max < smallest.Own.Max ? tool : smallest;
            if (best is null || own.CompareTo(merit) > 0)
            {
                (best, merit) = (tool, own);
            }
        }

        return best is null ? [] : best == smallest ? [best] : [best, smallest!];
    }

    /// <summary>A quarter of the hole tolerance whose 35 % is the reamer's own tolerance.</summary>
    private static Deviation WearReserve(Tool tool) => new(tool.Own.Width.Picometres * 25 / 35);
}
