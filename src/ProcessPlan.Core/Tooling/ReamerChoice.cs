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

    /// <summary>The best suited reamer: the one made for this class of hole first, else the largest, which has the longest life.</summary>
    public static Tool? Best(IReadOnlyList<Tool> reamers, SizeWindow hole, ToleranceClass? asked)
    {
        Tool? best = null;
        bool bestIsMadeFor = false;
        for (int i = FirstNotBelow(reamers, hole.Min); i < reamers.Count && reamers[i].Stamped <= hole.Max; i++)
        {
            Tool tool = reamers[i];
            bool madeFor = asked is { } toleranceClass && tool.Made == toleranceClass.ToString();
            bool better = best is null || (madeFor && !bestIsMadeFor) || (madeFor == bestIsMadeFor && tool.Own.Max > best.Own.Max);
            if (better && Suits(tool, hole, out _))
            {
                (best, bestIsMadeFor) = (tool, madeFor);
            }
        }

        return best;
    }

    /// <summary>Index of the first tool that could suit: stamps lie a little below or above the sizes that they cut.</summary>
    private static int FirstNotBelow(IReadOnlyList<Tool> tools, Length size)
    {
        Length from = size - Deviation.FromMicrometres(500);
        int low = 0;
        int high = tools.Count;
        while (low < high)
        {
            int middle = (low + high) / 2;
            (low, high) = tools[middle].Stamped < from ? (middle + 1, high) : (low, middle);
        }

        return low;
    }

    /// <summary>A quarter of the hole tolerance whose 35 % is the reamer's own tolerance.</summary>
    private static Deviation WearReserve(Tool tool) => new(tool.Own.Width.Picometres * 25 / 35);
}
