using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Routing;

/// <summary>
/// Every chain of operations there is, one by one, without a bound, a queue or a shortcut: what the search must not miss. The rules of what may stand before
/// what are written down here a second time; least stock, what a tool cuts and what a step costs are the pieces that the search uses too.
/// </summary>
internal sealed class ExhaustiveSearch(Job job, ShopFloor shop)
{
    private static readonly Length LargestSingleDrill = Length.FromMillimetres(26);
    private static readonly Length LargestReamedFromRough = Length.FromMillimetres(12);
    private static readonly Deviation Cast = Deviation.FromMicrometres(1400);

    private readonly List<Candidate> _candidates = [.. Candidate.Judge(job, shop).Where(candidate => candidate.NoAtAll is null)];
    private readonly List<Change> _changes = Change.For(job, shop);
    private readonly CuttingData _data = CuttingData.For(job.Group);

    /// <summary>Chains that reached a blank.</summary>
    public long Chains { get; private set; }

    /// <summary>Cost of a good piece by the cheapest chain; infinite where there is none.</summary>
    public double Cheapest()
    {
        double best = double.PositiveInfinity;
        MetalWindow window = MetalWindow.Of(job.Feature.Limits, job.IsInternal);
        double outside = 0;
        for (int left = _changes.Count; left >= 0; left--)
        {
            foreach (Candidate candidate in _candidates.Where(candidate => candidate.Finishes is not null && Cuts(candidate, left) && !(left > 0 && _changes[left - 1].Covers)))
            {
                foreach (Node last in LastNodes(candidate, window, left))
                {
                    best = Math.Min(best, outside + UpTo(last));
                }
            }

            if (left > 0)
            {
                Change change = _changes[left - 1];
                outside += Charge(change);
                window = new MetalWindow(window.Least - change.LeastGrowth.Picometres, window.Most - change.MostGrowth.Picometres);
                if (window.Least >= window.Most)
                {
                    break;
                }
            }
        }

        return best;
    }

    private IEnumerable<Node> LastNodes(Candidate candidate, MetalWindow window, int changesLeft)
    {
        Effort least = candidate.Finishes!.Value;
        foreach (Effort effort in Enum.GetValues<Effort>())
        {
            bool reams = candidate.Process.SizedBy == ToolUse.Ream;
            if (effort < least || candidate.HeldWidth(effort).Picometres > window.Width || !(effort == least || reams || candidate.HeldWidth(least).Picometres > window.Width))
            {
                continue;
            }

            Tool?[] tools = candidate.Process.SizedBy is { } use ? [.. shop.Tools(use).Where(tool => Fits(tool, candidate, effort, window))] : [null];
            foreach (Tool? tool in tools)
            {
                foreach (Machine machine in candidate.Machines.Where(machine => tool is null || tool.Stamped <= machine.Largest))
                {
                    MetalWindow cut = tool is null ? new MetalWindow(window.Most - candidate.HeldWidth(effort).Picometres, window.Most) : Cut(tool, candidate, effort);
                    MetalWindow reach = new(Math.Max(window.Least, cut.Least), Math.Min(window.Most, cut.Most));
                    yield return new Node(candidate, machine, tool, effort, window, reach, Share(candidate, tool, effort, window, window), true, changesLeft, !candidate.Process.Follows, job.Quantity <= 50);
                    if (job.Quantity > 50)
                    {
                        yield return new Node(candidate, machine, tool, effort, window, reach, Share(candidate, tool, effort, window, window), true, changesLeft, !candidate.Process.Follows, true);
                    }
                }
            }
        }
    }

    private bool Fits(Tool tool, Candidate candidate, Effort effort, MetalWindow window) => tool.Use == ToolUse.Ream
        ? ReamerChoice.Suits(tool, window.Sizes(job.IsInternal), out _)
        : window.Holds(Cut(tool, candidate, effort));

    /// <summary>Cost of the cheapest way from a blank up to and with the node.</summary>
    private double UpTo(Node node)
    {
        double best = FromBlank(node);
        foreach (Candidate before in _candidates.Where(before => MayPrecede(before, node)))
        {
            for (int left = node.ChangesLeft; left >= 0; left--)
            {
                if (!Cuts(before, left))
                {
                    continue;
                }

                List<Change> between = [.. _changes[left..node.ChangesLeft]];
                if (node.Process.SelfGuided && between.Exists(change => change.Hardens && change.Layer is null))
                {
                    continue;
                }

                foreach (Machine machine in before.Machines)
                {
                    foreach ((Tool? tool, MetalWindow leaving) in Leavings(node, before, machine, between))
                    {
                        best = Math.Min(best, After(node, before, machine, tool, leaving, between, left));
                    }
                }
            }
        }

        return best;
    }

    private List<(Tool? Tool, MetalWindow Leaving)> Leavings(Node node, Candidate before, Machine machine, List<Change> between)
    {
        Deviation tolerance = Iso286.TryWidth(MetalWindow.Size(node.Reach.Most), before.LeftGrade, out Deviation width) ? width : before.RoutineWidth!.Value;
        StockNeed need = StockNeed.Between(node.Process, before.Process.Name, job, MetalWindow.Size(node.Reach.Most), tolerance,
            between.Count == 0 && machine == node.Machine, between.Exists(change => change.Hardens), node.ByHandbook);
        if (before.Process.SizedBy is { } use)
        {
            MetalWindow window = Entering(node, need.Least, between);
            return [.. shop.Tools(use).Where(tool => tool.Stamped <= machine.Largest && window.Holds(Cut(tool, before, Effort.Routine)))
                .Select(tool => ((Tool?)tool, Cut(tool, before, Effort.Routine)))];
        }

        Length resolution = tolerance >= Deviation.FromMicrometres(50) ? Length.FromMicrometres(10) : Length.FromMicrometres(1);
        MetalWindow entering = Entering(node, need.Least, between);
        long least = new Length(entering.Least).RoundUp(resolution).Picometres;
        MetalWindow leaving = new(least, least + tolerance.Picometres);
        return entering.Holds(leaving) && leaving.Sizes(job.IsInternal).Min >= before.Process.Smallest ? [(null, leaving)] : [];
    }

    private double After(Node node, Candidate before, Machine machine, Tool? tool, MetalWindow leaving, List<Change> between, int left)
    {
        MetalWindow entering = leaving;
        foreach (Change change in between)
        {
            entering = new MetalWindow(entering.Least + change.LeastGrowth.Picometres, entering.Most + change.MostGrowth.Picometres);
        }

        node = HeldInside(node, entering);
        double own = Own(node, entering, between.Count > 0 || machine != node.Machine) + between.Sum(Charge);
        double yield = (tool is null ? Share(before, null, Effort.Routine, leaving, leaving) : 1) * node.YieldToEnd;
        Node earlier = new(before, machine, tool, Effort.Routine, leaving, leaving, yield, false, left, node.Places || !before.Process.Follows, node.ByHandbook);
        return own + (before.Process.SizedBy == ToolUse.Drill ? FromDrill(earlier) : UpTo(earlier));
    }

    private double FromBlank(Node node)
    {
        if (node.ChangesLeft > 0 || !node.Process.StartsRough || (job.AsksForPosition && !node.Places))
        {
            return double.PositiveInfinity;
        }

        if (job.Start.Kind == StartKind.Solid && job.IsInternal)
        {
            return node.Process.SizedBy == ToolUse.Drill ? FromDrill(node) : job.Kind == FeatureKind.Slot ? Begin(node, null) : double.PositiveInfinity;
        }

        if (job.Start.Kind is StartKind.Cast or StartKind.Cored)
        {
            return FromSize(node, "casting", new SizeWindow(job.Start.Size!.Value - Cast, job.Start.Size.Value + Cast));
        }

        double best = double.PositiveInfinity;
        foreach (BarSeries series in shop.Bars)
        {
            IEnumerable<Length> sizes = job.Start.Size is { } typed ? series.Over < typed && typed <= series.UpTo ? [typed] : [] : series.Sizes;
            foreach (Length size in sizes)
            {
                best = Math.Min(best, FromSize(node, "bar", new SizeWindow(size - series.Deviation, size + series.Deviation)));
            }
        }

        return best;
    }

    private double FromSize(Node node, string surface, SizeWindow sizes)
    {
        MetalWindow blank = MetalWindow.Of(sizes, job.IsInternal);
        Stock need = StockNeed.Between(node.Process, surface, job, MetalWindow.Size(blank.Most), new Deviation(blank.Width), false, false, node.ByHandbook).Least;
        return Entering(node, need, []).Holds(blank) ? Begin(HeldInside(node, blank), blank) : double.PositiveInfinity;
    }

    private double FromDrill(Node drill)
    {
        if (drill.ChangesLeft > 0 || job.Start.Kind != StartKind.Solid || (job.AsksForPosition && !drill.Places))
        {
            return double.PositiveInfinity;
        }

        if (drill.Tool!.Stamped <= LargestSingleDrill)
        {
            return Begin(drill, null);
        }

        double best = double.PositiveInfinity;
        foreach (Tool pilot in shop.Tools(ToolUse.Drill))
        {
            double share = pilot.Stamped.ToMillimetres() / drill.Tool.Stamped.ToMillimetres();
            if (pilot.Stamped <= LargestSingleDrill && share is >= 0.5 and <= 0.625)
            {
                MetalWindow cut = Cut(pilot, drill.Candidate, Effort.Routine);
                best = Math.Min(best, Own(drill, cut, arrives: false)
                    + Begin(drill with { Tool = pilot, Window = cut, Reach = cut, IsLast = false, Effort = Effort.Routine }, null));
            }
        }

        return best;
    }

    private double Begin(Node first, MetalWindow? blank)
    {
        Chains++;
        return Own(first, blank, arrives: true);
    }

    private static bool MayPrecede(Candidate before, Node after)
    {
        Process process = after.Process;
        bool sameKind = before.Process == process || (before.Process.SizedBy == ToolUse.Ream && process.SizedBy == ToolUse.Ream);
        if (process.SizedBy == ToolUse.Drill || sameKind || before.Process.LeftGrade > process.EnterGrade)
        {
            return false;
        }

        ToleranceGrade finest = after.IsLast ? after.Candidate.HeldGrade(Effort.Special) : after.Candidate.LeftGrade;
        ToleranceGrade held = after.IsLast ? after.Candidate.HeldGrade(after.Effort) : after.Candidate.LeftGrade;
        bool drilledBeforeRoughing = process.StartsRough && before.Process.SizedBy == ToolUse.Drill && before.LeftGrade == finest;
        if (before.LeftGrade <= finest && !drilledBeforeRoughing)
        {
            return false;
        }

        // A cut to a setting gains four grades at most; a reamer over 12 mm does not go from IT12 to IT7 in one pass.
        return process.SizedBy is null
            ? before.LeftGrade.Ordinal - held.Ordinal <= 4
            : !(process.SizedBy == ToolUse.Ream && after.IsLast && held <= ToleranceGrade.It(7) && after.Tool!.Stamped > LargestReamedFromRough && before.LeftGrade >= ToleranceGrade.It(12));
    }

    private static MetalWindow Entering(Node node, Stock least, List<Change> between)
    {
        MetalWindow window = new(Math.Max(node.Reach.Most + least.Picometres, node.Window.Most + Length.PicometresPerMicrometre), node.Reach.Least + MostStock(node));
        for (int i = between.Count - 1; i >= 0; i--)
        {
            window = between[i].Before(window);
        }

        return window;
    }

    private static long MostStock(Node node) => node.Process.MostStockAt(MetalWindow.Size(node.Reach.Most)).Picometres;

    private Node HeldInside(Node node, MetalWindow entering)
    {
        long least = entering.Most - MostStock(node);
        if (!node.IsLast || node.Tool is not null || MostStock(node) > Stock.FromMicrometres(200).Picometres || least <= node.Window.Least)
        {
            return node;
        }

        MetalWindow held = new(least, node.Window.Most);
        return node with { Window = held, YieldToEnd = Share(node.Candidate, null, node.Effort, held, node.Window) };
    }

    private double Own(Node node, MetalWindow? entering, bool arrives) => StepCost.Of(
        new Step { Candidate = node.Candidate, Machine = node.Machine, Tool = node.Tool, Effort = node.Effort, Leaving = node.Window, Reach = node.Reach, Next = node.IsLast ? null : new Step() },
        entering, arrives, job, _data).PerGoodPiece(node.YieldToEnd, job.Quantity);

    private double Share(Candidate candidate, Tool? tool, Effort effort, MetalWindow held, MetalWindow good)
    {
        MetalWindow aim = tool is null ? held : Cut(tool, candidate, effort);
        double sigma = (tool is null ? candidate.HeldWidth(effort).Picometres : aim.Width) / 6.0;
        double share = NormalYield.Of(good.Least, good.Most, (aim.Least + aim.Most) / 2.0, sigma);
        return tool is null ? share : Math.Round(share, 4);
    }

    private MetalWindow Cut(Tool tool, Candidate candidate, Effort effort) =>
        MetalWindow.Of(SizedCut.Predict(tool, job.Group, effort == Effort.Special || candidate.Process.EnterGrade <= ToleranceGrade.It(9)).Sizes, job.IsInternal);

    private bool Cuts(Candidate candidate, int changesBefore)
    {
        Change[] before = [.. _changes.Take(changesBefore)];
        long most = candidate.Process.MostStockAt(job.Nominal).Picometres;
        return (before.Any(change => change.Hardens) ? candidate.CutsHard : candidate.CutsSoft) && before.All(change => change.Layer is not { } layer || 2 * most <= layer.Picometres);
    }

    private double Charge(Change change) => change.Supplier is { } supplier ? (double)supplier.ChargeFor(job.Quantity) / job.Quantity : 0;

    private sealed record Node(
        Candidate Candidate, Machine Machine, Tool? Tool, Effort Effort, MetalWindow Window, MetalWindow Reach, double YieldToEnd, bool IsLast, int ChangesLeft, bool Places, bool ByHandbook)
    {
        public Process Process => Candidate.Process;
    }
}
