using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Inspection;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>A twist drill as it would open the hole of one job on one machine, with its pilot where it is too large for solid metal.</summary>
/// <param name="Tool">The drill.</param>
/// <param name="Leaving">What it leaves.</param>
/// <param name="Pilot">The drill before it, or null.</param>
/// <param name="Cost">Time under the tool, checking and wear of both, and the change between them, of one piece.</param>
internal sealed record Drill(Tool Tool, MetalWindow Leaving, Tool? Pilot, double Cost)
{
    /// <summary>Whether it goes into solid metal, alone or after its pilot.</summary>
    public bool CanOpen => Pilot is not null || Tool.Stamped <= RouteSearch.LargestSingleDrill;
}

/// <summary>The shop's drills for one job, each worked out when it is first asked for.</summary>
internal sealed class Drills(Job job, ShopFloor shop, CuttingData data)
{
    // Pilot over drill, from the handbook's pairs: 15 for 30 is the smallest share, 25 for 40 the largest (table A1; from memory).
    private const double LeastPilotShare = 0.5;
    private const double MostPilotShare = 0.625;

    private readonly Dictionary<(Tool, Machine), Drill> _known = [];
    private readonly Process? _drilling = ProcessCatalogue.Handbook.FirstOrDefault(static process => process.SizedBy == ToolUse.Drill);

    /// <summary>The drill on one machine.</summary>
    public Drill Of(Tool tool, Machine machine)
    {
        if (!_known.TryGetValue((tool, machine), out Drill? drill))
        {
            Tool? pilot = tool.Stamped > RouteSearch.LargestSingleDrill ? PilotFor(tool, machine) : null;
            double cost = CostOf(tool, machine) + (pilot is null ? 0 : CostOf(pilot, machine) + machine.RatePerMinute * machine.ToolChangeMinutes);
            drill = new Drill(tool, Leaving(tool), pilot, cost);
            _known.Add((tool, machine), drill);
        }

        return drill;
    }

    /// <summary>What a drill leaves.</summary>
    public MetalWindow Leaving(Tool tool) => MetalWindow.Of(SizedCut.Predict(tool, job.Group, careful: false).Sizes, job.IsInternal);

    /// <summary>The least that any drill of the shop costs under the tool, time, checking and wear.</summary>
    public double LeastCost(Machine machine)
    {
        double least = double.PositiveInfinity;
        foreach (Tool tool in shop.Tools(ToolUse.Drill))
        {
            least = Math.Min(least, CostOf(tool, machine));
        }

        return least;
    }

    /// <summary>Time under the tool, checking and wear, of one piece.</summary>
    private double CostOf(Tool tool, Machine machine)
    {
        SizeWindow hole = SizedCut.Predict(tool, job.Group, careful: false).Sizes;
        double checking = Instrument.For(inside: true, job.Nominal, hole.Width).Instrument.MinutesPerCheck * Checks.PerPiece(_drilling!, Effort.Routine);
        Cut cut = new(_drilling!, data, tool.Stamped, job.Extent, null, _drilling!.LeftRa, Effort.Routine);
        double minutes = CutTime.For(cut).Minutes;
        return machine.RatePerMinute * (minutes + checking) + ToolWear.Of(cut, tool, minutes);
    }

    /// <summary>The cheapest pilot within the handbook's share of the drill; null where the crib has none. What comes later does not matter to it.</summary>
    private Tool? PilotFor(Tool drill, Machine machine)
    {
        Tool? cheapest = null;
        double least = double.PositiveInfinity;
        foreach (Tool tool in shop.Tools(ToolUse.Drill))
        {
            double share = tool.Stamped.Picometres / (double)drill.Stamped.Picometres;
            if (tool.Stamped <= RouteSearch.LargestSingleDrill && share is >= LeastPilotShare and <= MostPilotShare)
            {
                double cost = CostOf(tool, machine);
                (cheapest, least) = cost < least ? (tool, cost) : (cheapest, least);
            }
        }

        return cheapest;
    }
}
