using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Tooling;

namespace ProcessPlan.Core.Routing;

/// <summary>A twist drill as it would open the hole of one job, with its pilot where it is too large for solid metal.</summary>
/// <param name="Tool">The drill.</param>
/// <param name="Leaving">What it leaves.</param>
/// <param name="CutMinutes">Time under the tool.</param>
/// <param name="Pilot">The drill before it, or null.</param>
/// <param name="PilotMinutes">Time under the pilot.</param>
/// <param name="Wear">Cost of the wear of both on one piece.</param>
internal sealed record Drill(Tool Tool, MetalWindow Leaving, double CutMinutes, Tool? Pilot, double PilotMinutes, double Wear)
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

    private readonly Dictionary<Tool, Drill> _known = new(ReferenceEqualityComparer.Instance);
    private readonly Process? _drilling = ProcessCatalogue.Handbook.FirstOrDefault(static process => process.SizedBy == ToolUse.Drill);

    public Drill Of(Tool tool)
    {
        if (!_known.TryGetValue(tool, out Drill? drill))
        {
            Tool? pilot = tool.Stamped > RouteSearch.LargestSingleDrill ? PilotFor(tool) : null;
            MetalWindow leaving = MetalWindow.Of(SizedCut.Predict(tool, job.Group, careful: false).Sizes, job.IsInternal);
            (double minutes, double wear) = Work(tool);
            (double pilotMinutes, double pilotWear) = pilot is null ? (0, 0) : Work(pilot);
            drill = new Drill(tool, leaving, minutes, pilot, pilotMinutes, wear + pilotWear);
            _known.Add(tool, drill);
        }

        return drill;
    }

    /// <summary>The least that any drill of the shop costs under the tool, time and wear.</summary>
    public double LeastCost(Machine machine)
    {
        double least = double.PositiveInfinity;
        foreach (Tool tool in shop.Tools(ToolUse.Drill))
        {
            (double minutes, double wear) = Work(tool);
            least = Math.Min(least, machine.RatePerMinute * minutes + wear);
        }

        return least;
    }

    private (double Minutes, double Wear) Work(Tool tool)
    {
        Cut cut = new(_drilling!, data, tool.Stamped, job.Extent, null, _drilling!.LeftRa, Effort.Routine);
        double minutes = CutTime.For(cut).Minutes;
        return (minutes, ToolWear.Of(cut, tool, minutes));
    }

    /// <summary>The quickest pilot within the handbook's share of the drill; null where the crib has none. What comes later does not matter to it.</summary>
    private Tool? PilotFor(Tool drill)
    {
        Tool? quickest = null;
        double least = double.PositiveInfinity;
        foreach (Tool tool in shop.Tools(ToolUse.Drill))
        {
            double share = tool.Stamped.Picometres / (double)drill.Stamped.Picometres;
            if (tool.Stamped <= RouteSearch.LargestSingleDrill && share is >= LeastPilotShare and <= MostPilotShare)
            {
                double minutes = Work(tool).Minutes;
                (quickest, least) = minutes < least ? (tool, minutes) : (quickest, least);
            }
        }

        return quickest;
    }
}
