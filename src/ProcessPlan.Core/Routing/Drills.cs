using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>A twist drill as it would open the hole of one job, with its pilot where it is too large for solid metal.</summary>
/// <param name="Tool">The drill.</param>
/// <param name="Leaving">What it leaves.</param>
/// <param name="CutMinutes">Time under the tool.</param>
/// <param name="Pilot">The drill before it, or null.</param>
/// <param name="PilotMinutes">Time under the pilot.</param>
/// <param name="Wear">Cost of the wear of both on one piece.</param>
internal sealed record Drill(Tool Tool, MetalWindow Leaving, double CutMinutes, Tool? Pilot, double PilotMinutes, double Wear);

/// <summary>The shop's drills for one job, each worked out when it is first asked for.</summary>
internal sealed class Drills(Job job, ShopFloor shop, CuttingData data)
{
    /// <summary>Pilot over drill, in the middle of the handbook's pairs 15 for 28 to 25 for 48 (table A1; from memory).</summary>
    private const double PilotShare = 0.55;

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

    private (double Minutes, double Wear) Work(Tool tool)
    {
        Cut cut = new(_drilling!, data, tool.Stamped, job.Extent, null, _drilling!.LeftRa, Effort.Routine);
        double minutes = CutTime.For(cut).Minutes;
        return (minutes, ToolWear.Of(cut, tool, minutes));
    }

    /// <summary>The drill nearest to the usual share of the size among those that go into solid metal.</summary>
    private Tool? PilotFor(Tool drill)
    {
        Length wanted = new((long)(drill.Stamped.Picometres * PilotShare));
        Tool? best = null;
        foreach (Tool tool in shop.Tools(ToolUse.Drill))
        {
            if (tool.Stamped > RouteSearch.LargestSingleDrill)
            {
                break;
            }

            if (best is null || Distance(tool) < Distance(best))
            {
                best = tool;
            }
        }

        return best;

        long Distance(Tool tool) => Math.Abs(tool.Stamped.Picometres - wanted.Picometres);
    }
}
