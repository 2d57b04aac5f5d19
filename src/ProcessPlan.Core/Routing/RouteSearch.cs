using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Inspection;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>
/// Finds the cheapest chains of operations by going back from the drawing: each operation asks for a window of entering sizes, and only operations
/// that can leave sizes inside it may stand before. Best first: costs only grow on the way back, so the first chain that reaches the blank is the
/// cheapest, the next one with other operations the second, and so on. Same input, same routes.
/// </summary>
internal sealed class RouteSearch
{
    /// <summary>The largest hole drilled in solid metal with one drill; larger ones need a pilot.</summary>
    public static readonly Length LargestSingleDrill = Length.FromMillimetres(26);

    /// <summary>Above this size a reamer is not asked to go from a drilled hole to IT7 in one pass.</summary>
    private static readonly Length LargestReamAfterDrill = Length.FromMillimetres(12);

    private const double PilotShare = 0.55;
    private const double RoutineChecks = 0.2;
    private static readonly Length Micrometre = new(Length.PicometresPerMicrometre);
    private static readonly Length Hundredth = Length.FromMicrometres(10);

    private readonly Job _job;
    private readonly ShopFloor _shop;
    private readonly IReadOnlyList<Candidate> _candidates;
    private readonly List<Change> _changes;
    private readonly CuttingData _data;
    private readonly PriorityQueue<Step, (double Cost, int Order)> _open = new();
    private int _order;

    public RouteSearch(Job job, ShopFloor shop, IReadOnlyList<Candidate> candidates)
    {
        _job = job;
        _shop = shop;
        _candidates = candidates;
        _changes = Change.For(job, shop);
        _data = CuttingData.For(job.Group);
    }

    /// <summary>Steps whose ways back were looked through; pinned in tests.</summary>
    public int Expanded { get; private set; }

    /// <summary>The joint that closed by the least, where any did.</summary>
    public Closure? NearestMiss { get; private set; }

    /// <summary>The change whose window closed against the drawing itself.</summary>
    public Change? ClosedChange { get; private set; }

    /// <summary>The cheapest chain and the next ones that differ in their operations.</summary>
    /// <param name="most">How many; fewer where there are no more.</param>
    public List<Step> Find(int most)
    {
        OpenLastSteps();
        List<Step> found = [];
        HashSet<string> known = [];
        while (found.Count < most && _open.TryDequeue(out Step? step, out _))
        {
            if (step.Start is not null)
            {
                if (known.Add(step.Sequence()))
                {
                    found.Add(step);
                }

                continue;
            }

            Expanded++;
            Start(step);
            Precede(step);
        }

        return found;
    }

    private void Push(Step step) => _open.Enqueue(step, (step.Cost, _order++));

    /// <summary>Operations that can finish the feature; changes that come after the last cut have moved the window already.</summary>
    private void OpenLastSteps()
    {
        MetalWindow window = MetalWindow.Of(_job.Feature.Limits, _job.IsInternal);
        Change[] after = [];
        for (int left = _changes.Count; left >= 0; left--)
        {
            foreach (Candidate candidate in _candidates)
            {
                bool coated = left > 0 && _changes[left - 1].Covers;
                if (candidate.NoAtAll is null && !coated && Cuts(candidate, left))
                {
                    Finish(candidate, window, left, after);
                }
            }

            if (left > 0)
            {
                Change change = _changes[left - 1];
                window = change.Before(window);
                after = [change, .. after];
                if (!window.IsOpen || window.Width == 0)
                {
                    ClosedChange = change;
                    return;
                }
            }
        }
    }

    private void Finish(Candidate candidate, MetalWindow window, int changesLeft, Change[] after)
    {
        Deviation width = new(window.Width);
        Effort? effort = candidate.Finishes;
        if (effort is not { } least)
        {
            return;
        }

        if (candidate.HeldWidth(least) > width)
        {
            // The change after it has eaten tolerance: only more effort can hold what is left.
            if (candidate.HeldWidth(Effort.Special) > width)
            {
                return;
            }

            least = Effort.Special;
        }

        foreach (Machine machine in candidate.Machines)
        {
            foreach (Tool? tool in LastTools(candidate, window, least))
            {
                Push(new Step
                {
                    Candidate = candidate,
                    Machine = machine,
                    Tool = tool,
                    Effort = least,
                    Leaving = window,
                    IsLast = true,
                    ChangesLeft = changesLeft,
                    ChangesAfter = after,
                    Yield = Yield(candidate, tool, least, window),
                    Places = !candidate.Process.Follows,
                    Cost = ChangeCost(after),
                }.Chained(null));
            }
        }
    }

    private double ChangeCost(Change[] changes)
    {
        double cost = 0;
        foreach (Change change in changes)
        {
            cost += change.Supplier is { } supplier ? (double)supplier.ChargeFor(_job.Quantity) / _job.Quantity : 0;
        }

        return cost;
    }

    private IEnumerable<Tool?> LastTools(Candidate candidate, MetalWindow window, Effort effort)
    {
        if (candidate.Process.SizedBy is not { } use)
        {
            yield return null;
            yield break;
        }

        SizeWindow sizes = window.Sizes(_job.IsInternal);
        if (use == ToolUse.Ream)
        {
            if (ReamerChoice.Best(_shop.Tools(use), sizes, _job.Feature.Class) is { } reamer)
            {
                yield return reamer;
            }

            yield break;
        }

        foreach (Tool tool in _shop.Tools(use))
        {
            if (sizes.Contains(SizedCut.Predict(tool, _job.Group, IsCareful(candidate, effort)).Sizes))
            {
                yield return tool;
            }
        }
    }

    private static bool IsCareful(Candidate candidate, Effort effort) => effort == Effort.Special || candidate.Process.EnterGrade <= ToleranceGrade.It(9);

    private bool Cuts(Candidate candidate, int changesBefore)
    {
        for (int i = 0; i < changesBefore; i++)
        {
            if (_changes[i].Hardens)
            {
                return candidate.CutsHard;
            }
        }

        return candidate.CutsSoft;
    }

    /// <summary>Spread from the grade held (a sixth of it), or from the tool's predicted range; the share of it inside the window.</summary>
    private double Yield(Candidate candidate, Tool? tool, Effort effort, MetalWindow window)
    {
        if (tool is null)
        {
            double half = window.Width / 2.0;
            return NormalYield.Of(-half, half, 0, candidate.HeldWidth(effort).Picometres / 6.0);
        }

        MetalWindow cut = MetalWindow.Of(SizedCut.Predict(tool, _job.Group, IsCareful(candidate, effort)).Sizes, _job.IsInternal);
        return NormalYield.Of(window.Least, window.Most, (cut.Least + cut.Most) / 2.0, cut.Width / 6.0);
    }

    /// <summary>Tries to begin the route with this step.</summary>
    private void Start(Step step)
    {
        if (step.ChangesLeft > 0 || !step.Candidate.Process.StartsRough || (_job.AsksForPosition && !step.Places))
        {
            return;
        }

        switch (_job.Start.Kind)
        {
            case StartKind.Solid when _job.IsInternal:
                if (step.Candidate.Process.SizedBy == ToolUse.Drill ? step.Tool!.Stamped <= LargestSingleDrill : _job.Kind == FeatureKind.Slot)
                {
                    Push(Settled(step, null, new Blank("solid metal", null)));
                }

                break;
            case StartKind.Cast or StartKind.Cored when _job.IsInternal && _job.Start.Size is { } cored:
                StartFromSize(step, cored, CastTolerance, "casting", $"{(_job.Start.Kind == StartKind.Cast ? "cast" : "cored")} {cored}");
                break;
            case StartKind.Cast when _job.Start.Size is { } cast:
                StartFromSize(step, cast, CastTolerance, "casting", $"cast {cast}");
                break;
            default:
                StartFromBar(step);
                break;
        }
    }

    /// <summary>Permissible deviation of a cast size (ISO 8062-3, DCTG 10, 25 to 63 mm: 2.8 mm in all; from memory).</summary>
    public static readonly Deviation CastTolerance = Deviation.FromMicrometres(1400);

    private void StartFromSize(Step step, Length size, Deviation tolerance, string surface, string name)
    {
        SizeWindow limits = new(size - tolerance, size + tolerance);
        MetalWindow blank = MetalWindow.Of(limits, _job.IsInternal);
        StockNeed need = Need(step, surface, blank.Most, new Deviation(blank.Width), sameClamping: false, afterHeat: false);
        if (Entering(step, need, []).Holds(blank))
        {
            Push(Settled(step, blank, new Blank(name, limits), need));
        }
        else
        {
            Miss(step, name, Math.Max(Entering(step, need, []).Least - blank.Least, blank.Most - Entering(step, need, []).Most));
        }
    }

    private void StartFromBar(Step step)
    {
        if (_job.Start.Size is { } typed)
        {
            Deviation tolerance = _shop.Bars.FirstOrDefault(series => series.Over < typed && typed <= series.UpTo)?.Deviation ?? _shop.Bars[^1].Deviation;
            StartFromSize(step, typed, tolerance, "bar", $"bar {typed}");
            return;
        }

        StockNeed need = Need(step, "bar", step.Leaving.Most, default, sameClamping: false, afterHeat: false);
        if (_shop.BarFor(MetalWindow.Size(step.Leaving.Most + need.Least.Picometres)) is { } bar)
        {
            MetalWindow blank = MetalWindow.Of(bar.Limits, _job.IsInternal);
            StockNeed atBar = Need(step, "bar", blank.Most, new Deviation(blank.Width), sameClamping: false, afterHeat: false);
            if (step.Leaving.Most + atBar.Least.Picometres > blank.Least && _shop.BarFor(MetalWindow.Size(step.Leaving.Most + atBar.Least.Picometres)) is { } larger)
            {
                bar = larger;
                blank = MetalWindow.Of(bar.Limits, _job.IsInternal);
            }

            Push(Settled(step, blank, new Blank($"bar {bar.Size}", bar.Limits), atBar));
        }
    }

    /// <summary>Puts every possible operation before this step.</summary>
    private void Precede(Step step)
    {
        ToleranceGrade held = step.IsLast ? GradeOf(step) : step.Candidate.LeftGrade;
        foreach (Candidate before in _candidates)
        {
            if (before.NoAtAll is not null || !MayPrecede(before, step, held))
            {
                continue;
            }

            for (int taken = 0; taken <= step.ChangesLeft; taken++)
            {
                int left = step.ChangesLeft - taken;
                if (!Cuts(before, left))
                {
                    continue;
                }

                Change[] between = [.. _changes[left..step.ChangesLeft]];
                foreach (Machine machine in before.Machines)
                {
                    Precede(step, before, machine, between, left);
                }
            }
        }
    }

    private static ToleranceGrade GradeOf(Step step)
    {
        ToleranceGrade grade = step.Candidate.Process.Grade(step.Effort);
        for (int i = 0; i < step.Candidate.GradesLost; i++)
        {
            grade = grade.Coarser ?? grade;
        }

        return grade;
    }

    private static bool MayPrecede(Candidate before, Step step, ToleranceGrade held)
    {
        Process process = step.Candidate.Process;
        if (process.SizedBy == ToolUse.Drill)
        {
            return before.Process == process && step.Tool!.Stamped > LargestSingleDrill;
        }

        // A blind guess at a smooth ladder is not needed: coarser than what this step holds, and fine enough for it to start from.
        bool coarser = before.LeftGrade > held;
        bool enough = before.LeftGrade <= process.EnterGrade || process.StartsRough || before.GradesLost > 0 && before.Process.LeftGrade <= process.EnterGrade;
        bool careful = process.Ability == "ream" && process.SizedBy == ToolUse.Ream && step.IsLast && held <= ToleranceGrade.It(7)
            && step.Tool!.Stamped > LargestReamAfterDrill;
        return coarser && enough && !(careful && before.Process.SizedBy == ToolUse.Drill);
    }

    private void Precede(Step step, Candidate before, Machine machine, Change[] between, int changesLeft)
    {
        bool same = between.Length == 0 && machine == step.Machine;
        bool heat = Array.Exists(between, static change => change.Hardens);
        Deviation tolerance = Iso286.TryWidth(MetalWindow.Size(step.Leaving.Most), before.LeftGrade, out Deviation width) ? width : before.RoutineWidth!.Value;
        StockNeed need = Need(step, before.Process.Name, step.Leaving.Most, tolerance, same, heat);
        MetalWindow entering = Entering(step, need, between);
        if (before.Process.SizedBy is { } use)
        {
            PrecedeWithTools(step, before, machine, between, changesLeft, need, entering, use);
            return;
        }

        Length resolution = tolerance >= Deviation.FromMicrometres(50) ? Hundredth : Micrometre;
        long least = new Length(entering.Least).RoundUp(resolution).Picometres;
        MetalWindow leaving = new(least, least + tolerance.Picometres);
        if (entering.Holds(leaving))
        {
            Push(Before(step, before, machine, null, leaving, between, changesLeft, need));
        }
        else
        {
            Miss(step, before.Process.Name, leaving.Most - entering.Most);
        }
    }

    private void PrecedeWithTools(
        Step step, Candidate before, Machine machine, Change[] between, int changesLeft, StockNeed need, MetalWindow entering, ToolUse use)
    {
        if (!entering.IsOpen)
        {
            Miss(step, before.Process.Name, entering.Least - entering.Most);
            return;
        }

        SizeWindow sizes = entering.Sizes(_job.IsInternal);
        Step? best = null;
        long nearest = long.MaxValue;
        foreach (Tool tool in ToolsFor(use, step, sizes))
        {
            SizeWindow cut = SizedCut.Predict(tool, _job.Group, IsCareful(before, Effort.Routine)).Sizes;
            MetalWindow leaving = MetalWindow.Of(cut, _job.IsInternal);
            if (!entering.Holds(leaving))
            {
                nearest = Math.Min(nearest, Math.Max(entering.Least - leaving.Least, leaving.Most - entering.Most));
                continue;
            }

            Step candidate = Before(step, before, machine, tool, leaving, between, changesLeft, need);
            if (use != ToolUse.Drill)
            {
                Push(candidate);
                best = candidate;
                continue;
            }

            // A drill ends the way back (alone, or with its pilot): of all sizes only the cheapest can belong to a best route.
            Step? drilled = Drilled(candidate);
            if (drilled is not null && (best is null || drilled.Cost < best.Cost))
            {
                best = drilled;
            }
        }

        if (best is null)
        {
            Miss(step, before.Process.Name, nearest);
        }
        else if (use == ToolUse.Drill)
        {
            Push(best);
        }
    }

    /// <summary>A drill in solid metal, with a pilot where it needs one.</summary>
    private Step? Drilled(Step drill)
    {
        if (drill.ChangesLeft > 0 || _job.Start.Kind != StartKind.Solid || (_job.AsksForPosition && !drill.Places))
        {
            return null;
        }

        if (drill.Tool!.Stamped <= LargestSingleDrill)
        {
            return Settled(drill, null, new Blank("solid metal", null));
        }

        Tool? pilot = NearestTool(ToolUse.Drill, new Length((long)(drill.Tool.Stamped.Picometres * PilotShare)));
        if (pilot is null)
        {
            return null;
        }

        MetalWindow leaving = MetalWindow.Of(SizedCut.Predict(pilot, _job.Group, false).Sizes, _job.IsInternal);
        StockNeed need = Need(drill, drill.Candidate.Process.Name, drill.Leaving.Most, new Deviation(leaving.Width), sameClamping: true, afterHeat: false);
        if (!Entering(drill, need, []).Holds(leaving))
        {
            return null;
        }

        Step first = Before(drill, drill.Candidate, drill.Machine, pilot, leaving, [], 0, need);
        return Settled(first, null, new Blank("solid metal", null));
    }

    private Tool? NearestTool(ToolUse use, Length size)
    {
        Tool? best = null;
        foreach (Tool tool in _shop.Tools(use))
        {
            if (tool.Stamped <= LargestSingleDrill && (best is null || Distance(tool) < Distance(best)))
            {
                best = tool;
            }
        }

        return best;

        long Distance(Tool tool) => Math.Abs(tool.Stamped.Picometres - size.Picometres);
    }

    /// <summary>Tools whose stamp is near enough to the window to cut inside it.</summary>
    private IEnumerable<Tool> ToolsFor(ToolUse use, Step step, SizeWindow sizes)
    {
        Deviation reach = Deviation.FromMicrometres(500);
        Length upTo = step.Tool is { } next && next.Stamped < sizes.Max ? next.Stamped : sizes.Max;
        foreach (Tool tool in _shop.Tools(use))
        {
            if (tool.Stamped > upTo)
            {
                yield break;
            }

            if (tool.Stamped >= sizes.Min - reach)
            {
                yield return tool;
            }
        }
    }

    private StockNeed Need(Step step, string before, long metal, Deviation tolerance, bool sameClamping, bool afterHeat) =>
        StockNeed.Between(step.Candidate.Process, before, _job, MetalWindow.Size(metal), tolerance, sameClamping, afterHeat);

    /// <summary>The window that must be left by the operation before, with the changes between taken off at their extremes; may be closed.</summary>
    private static MetalWindow Entering(Step step, StockNeed need, Change[] between)
    {
        Stock most = step.Candidate.Process.MostStockAt(MetalWindow.Size(step.Leaving.Least));
        MetalWindow window = new(step.Leaving.Most + need.Least.Picometres, step.Leaving.Least + most.Picometres);
        for (int i = between.Length - 1; i >= 0; i--)
        {
            window = between[i].Before(window);
        }

        return window;
    }

    private Step Before(Step step, Candidate before, Machine machine, Tool? tool, MetalWindow leaving, Change[] between, int changesLeft, StockNeed need)
    {
        Step settled = Settle(step, Grown(leaving, between), machine, between.Length > 0);
        return new Step
        {
            Candidate = before,
            Machine = machine,
            Tool = tool,
            Effort = Effort.Routine,
            Leaving = leaving,
            ChangesLeft = changesLeft,
            ChangesAfter = between,
            Yield = tool is null ? Yield(before, null, Effort.Routine, leaving) : 1,
            Places = step.Places || !before.Process.Follows,
            Cost = settled.Cost + ChangeCost(between),
            NeedOfNext = need,
        }.Chained(settled);
    }

    private static MetalWindow Grown(MetalWindow window, Change[] changes)
    {
        foreach (Change change in changes)
        {
            window = new MetalWindow(window.Least + change.LeastGrowth.Picometres, window.Most + change.MostGrowth.Picometres);
        }

        return window;
    }

    private Step Settled(Step step, MetalWindow? blank, Blank start, StockNeed? need = null) =>
        Settle(step, blank, null, false) with { Start = start, NeedFromBlank = need };

    /// <summary>Adds what this step itself costs, now that the sizes it starts from are known.</summary>
    private Step Settle(Step step, MetalWindow? entering, Machine? machineBefore, bool wasAway)
    {
        bool arrives = wasAway || machineBefore != step.Machine;
        StepCost cost = CostOf(step, entering, arrives);
        return step with { Entering = entering, Arrives = arrives, Own = cost, Cost = step.Cost + cost.PerGoodPiece };
    }

    private StepCost CostOf(Step step, MetalWindow? entering, bool arrives)
    {
        Cut cut = CutOf(step, entering);
        CutTime time = CutTime.For(cut);
        SizeWindow leaving = step.Leaving.Sizes(_job.IsInternal);
        (Instrument instrument, _) = Instrument.For(_job.IsInternal, leaving.Max, leaving.Width);
        double checking = instrument.MinutesPerCheck * (step.Effort == Effort.Special ? 1 : RoutineChecks);
        double handling = arrives ? step.Machine.HandlingMinutes : 0;
        double minutes = time.Minutes + step.Machine.ToolChangeMinutes + checking + handling;
        double setUp = arrives ? step.Machine.SetUpMinutes : 0;
        double rate = step.Machine.RatePerMinute;
        return new StepCost(time, minutes, setUp, checking, handling, rate * minutes / step.YieldToEnd, rate * setUp / _job.Quantity);
    }

    public Cut CutOf(Step step, MetalWindow? entering)
    {
        Process process = step.Candidate.Process;
        Stock? stock = entering is { } from ? new Stock(from.Most - step.Leaving.Least) : null;
        Length diameter = step.Tool?.Stamped
            ?? (_job.IsInternal ? MetalWindow.Size(step.Leaving.Least) : MetalWindow.Size(entering?.Most ?? step.Leaving.Most));
        Roughness ra = step.IsLast ? process.Ra(step.Effort) : process.LeftRa;
        return new Cut(process, _data, diameter, _job.Extent, stock, ra, step.Effort);
    }

    private void Miss(Step step, string before, long shortBy)
    {
        if (shortBy > 0 && (NearestMiss is null || shortBy < NearestMiss.ShortBy.Picometres))
        {
            NearestMiss = new Closure(step.Candidate.Process.Name, before, new Deviation(shortBy));
        }
    }
}

/// <summary>What a route starts from.</summary>
/// <param name="Name">In words.</param>
/// <param name="Limits">Its limits at the feature; null for solid metal.</param>
internal sealed record Blank(string Name, SizeWindow? Limits);

/// <summary>A joint that could not be closed.</summary>
/// <param name="Process">The operation.</param>
/// <param name="Before">The operation or blank before it.</param>
/// <param name="ShortBy">By how much the window is too narrow.</param>
internal sealed record Closure(string Process, string Before, Deviation ShortBy);

/// <summary>What one step costs.</summary>
/// <param name="Cutting">The cut itself.</param>
/// <param name="Minutes">Run time of a piece.</param>
/// <param name="SetUp">Minutes once a lot.</param>
/// <param name="Checking">Of the minutes, for measuring.</param>
/// <param name="Handling">Of the minutes, for loading.</param>
/// <param name="Run">Money for a good piece, run time.</param>
/// <param name="Share">Money for a good piece, its share of the set-up.</param>
internal readonly record struct StepCost(CutTime Cutting, double Minutes, double SetUp, double Checking, double Handling, double Run, double Share)
{
    public double PerGoodPiece => Run + Share;
}

/// <summary>One step of a chain that grows backwards from the drawing.</summary>
internal sealed record Step
{
    public required Candidate Candidate { get; init; }

    public required Machine Machine { get; init; }

    public Tool? Tool { get; init; }

    public Effort Effort { get; init; }

    public required MetalWindow Leaving { get; init; }

    /// <summary>Sizes that it starts from; null in solid metal, or while nothing stands before it.</summary>
    public MetalWindow? Entering { get; init; }

    public bool IsLast { get; init; }

    /// <summary>Changes that still have to come before this step.</summary>
    public int ChangesLeft { get; init; }

    /// <summary>Changes between this step and the next.</summary>
    public IReadOnlyList<Change> ChangesAfter { get; init; } = [];

    public double Yield { get; init; }

    /// <summary>Share of good pieces of this and all later steps.</summary>
    public double YieldToEnd { get; private init; }

    /// <summary>Whether this or a later step puts the axis right.</summary>
    public bool Places { get; init; }

    /// <summary>Cost of a good piece of all that is settled: the later steps, and this one once its start is known.</summary>
    public double Cost { get; init; }

    public StepCost Own { get; init; }

    /// <summary>The part comes onto the machine for this step.</summary>
    public bool Arrives { get; init; }

    /// <summary>Why the next step removes at least what it does.</summary>
    public StockNeed? NeedOfNext { get; init; }

    public StockNeed? NeedFromBlank { get; init; }

    public Step? Next { get; private init; }

    /// <summary>The blank, once the chain reaches it.</summary>
    public Blank? Start { get; init; }

    public Step Chained(Step? next) => this with { Next = next, YieldToEnd = Yield * (next?.YieldToEnd ?? 1) };

    /// <summary>The operations in words, by which two routes are the same or truly different.</summary>
    public string Sequence()
    {
        System.Text.StringBuilder text = new();
        for (Step? step = this; step is not null; step = step.Next)
        {
            text.Append(step.Candidate.Process.Name).Append('|');
        }

        return text.ToString();
    }
}
