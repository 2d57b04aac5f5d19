using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>
/// Finds the cheapest chains of operations by going back from the drawing: each operation asks for a window of entering sizes, and only operations
/// that can leave sizes inside it may stand before. Best first, by the cost that is settled and a bound from below for the rest, so the first chain
/// that reaches the blank is the cheapest, the next one with other operations the second, and so on. Same input, same routes.
/// </summary>
internal sealed class RouteSearch
{
    /// <summary>The largest hole drilled in solid metal with one drill; larger ones need a pilot (after the sizes of handbook table A1; from memory).</summary>
    public static readonly Length LargestSingleDrill = Length.FromMillimetres(26);

    /// <summary>Above this size a reamer is not asked to go from a drilled or rough-bored hole to IT7 in one pass (common practice, no source).</summary>
    private static readonly Length LargestReamAfterDrill = Length.FromMillimetres(12);

    /// <summary>A cut that the machinist sets gains at most this many grades (textbook rule: roughing 2 to 4, finishing 1 to 2; from memory).</summary>
    private const int MostGradesGained = 4;

    /// <summary>What drilling and rough boring leave.</summary>
    private static readonly ToleranceGrade RoughGrade = ToleranceGrade.It(12);

    private const int YieldPlaces = 4;

    /// <summary>A process that takes no more than this in all removes micrometres a minute: its greatest stock is a hard limit.</summary>
    private static readonly Stock LittleStock = Stock.FromMicrometres(200);

    /// <summary>Permissible deviation of a cast size (ISO 8062-3, DCTG 10, 25 to 63 mm: 2.8 mm in all; from memory).</summary>
    private static readonly Deviation CastTolerance = Deviation.FromMicrometres(1400);

    private static readonly Length Micrometre = new(Length.PicometresPerMicrometre);
    private static readonly Length Hundredth = Length.FromMicrometres(10);

    private readonly Job _job;
    private readonly ShopFloor _shop;
    private readonly IReadOnlyList<Candidate> _candidates;
    private readonly List<Change> _changes;
    private readonly CuttingData _data;
    private readonly CostBound _bound;
    private readonly Drills _drills;
    private readonly PriorityQueue<Step, (double Cost, int Order)> _open = new();
    private int _order;

    public RouteSearch(Job job, ShopFloor shop, IReadOnlyList<Candidate> candidates)
    {
        _job = job;
        _shop = shop;
        _candidates = candidates;
        _changes = Change.For(job, shop);
        _data = CuttingData.For(job.Group);
        _drills = new Drills(job, shop, _data);
        _bound = new CostBound(job, _data, _drills, candidates, MayStart, static (before, after) =>
            MayPrecede(before, after, null, after.LeftGrade, isLast: false)
            || MayPrecede(before, after, null, after.HeldGrade(Effort.Routine), isLast: true)
            || MayPrecede(before, after, null, after.HeldGrade(Effort.Special), isLast: true));
    }

    /// <summary>Steps whose ways back were looked through; pinned in tests.</summary>
    public int Expanded { get; private set; }

    /// <summary>The joint that closed by the least, where any did.</summary>
    public Closure? NearestMiss { get; private set; }

    /// <summary>The blank that was typed, where no first cut can start from it.</summary>
    public Closure? BlankMiss { get; private set; }

    /// <summary>The change whose window closed against the drawing itself.</summary>
    public Change? ClosedChange { get; private set; }

    /// <summary>The cheapest chain and the next ones that differ in their operations; each begins with its blank.</summary>
    /// <param name="most">How many; fewer where there are no more.</param>
    public List<Step> Find(int most)
    {
        OpenLastSteps();
        List<Step> found = [];
        HashSet<string> known = [];
        while (found.Count < most && _open.TryDequeue(out Step? step, out _))
        {
            if (step.IsBlank)
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

    public StepCost CostOf(Step step, MetalWindow? entering, bool arrives) => StepCost.Of(step, entering, arrives, _job, _data);

    /// <summary>The least stock of a step after another one, or after the blank.</summary>
    public StockNeed NeedOf(Step step, Step before) => before.IsBlank
        ? Need(step, before.BlankName!.StartsWith("bar", StringComparison.Ordinal) ? "bar" : "casting", before.Leaving!.Value.Most, new Deviation(before.Leaving.Value.Width), false, false)
        : Need(step, before.Process.Name, step.Reach.Most, LeftTolerance(before.Candidate!, step, before.Tool is null ? null : before.Leaving),
            before.ChangesAfter.Length == 0 && before.Machine == step.Machine, Array.Exists(before.ChangesAfter, static change => change.Hardens));

    private void Push(Step step)
    {
        double cost = step.Settled;
        if (!step.IsBlank)
        {
            // At least: this step with as little stock as its own window, on a machine that the part must come to once, and what must stand before it.
            MetalWindow nearest = new(step.Window.Most, step.Window.Most);
            cost += CostOf(step, nearest, arrives: true).PerGoodPiece(step.YieldToEnd, _job.Quantity);
            cost += MayStart(step.Candidate!) ? 0 : _bound.Before(step.Candidate!);
        }

        if (cost < double.PositiveInfinity)
        {
            _open.Enqueue(step, (cost, _order++));
        }
    }

    /// <summary>Operations that can finish the feature; changes that come after the last cut have moved the window already.</summary>
    private void OpenLastSteps()
    {
        MetalWindow window = MetalWindow.Of(_job.Feature.Limits, _job.IsInternal);
        Change[] after = [];
        for (int left = _changes.Count; left >= 0; left--)
        {
            bool coated = left > 0 && _changes[left - 1].Covers;
            foreach (Candidate candidate in _candidates)
            {
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
        if (candidate.Finishes is not { } least)
        {
            return;
        }

        // A change after the last cut eats tolerance, and a tool of fixed size can be worth more care than its grade asks for.
        // A large lot may be planned by either method: the handbook's larger stock on a finishing cut can save a roughing pass.
        bool[] methods = _job.Quantity <= StockNeed.SmallLot ? [true] : [false, true];
        foreach (Effort effort in (ReadOnlySpan<Effort>)[Effort.Routine, Effort.Special])
        {
            bool worthIt = effort == least || candidate.Process.SizedBy == ToolUse.Ream || candidate.HeldWidth(least).Picometres > window.Width;
            if (effort < least || !worthIt || candidate.HeldWidth(effort).Picometres > window.Width)
            {
                continue;
            }

            foreach (Tool? tool in LastTools(candidate, window, effort))
            {
                double yield = Yield(candidate, tool, effort, window, window);
                MetalWindow reach = Reach(candidate, tool, effort, window);
                foreach (Machine machine in candidate.Machines)
                {
                    if (tool is not null && tool.Stamped > machine.Largest)
                    {
                        continue;
                    }

                    foreach (bool byHandbook in methods)
                    {
                        Push(new Step
                        {
                            ByHandbook = byHandbook,
                            Candidate = candidate,
                            Machine = machine,
                            Tool = tool,
                            Effort = effort,
                            Leaving = window,
                            Reach = reach,
                            ChangesLeft = changesLeft,
                            ChangesAfter = after,
                            Yield = yield,
                            YieldToEnd = yield,
                            Places = !candidate.Process.Follows,
                            Settled = ChangeCost(after),
                        });
                    }
                }
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

    private List<Tool?> LastTools(Candidate candidate, MetalWindow window, Effort effort)
    {
        if (candidate.Process.SizedBy is not { } use)
        {
            return [null];
        }

        SizeWindow sizes = window.Sizes(_job.IsInternal);
        if (use == ToolUse.Ream)
        {
            return [.. ReamerChoice.Suited(_shop.ToolsNear(use, sizes), sizes, _job.Feature.Class, tool => Yield(candidate, tool, effort, window, window))];
        }

        List<Tool?> fitting = [];
        foreach (Tool tool in _shop.ToolsNear(use, sizes))
        {
            if (sizes.Contains(SizedCut.Predict(tool, _job.Group, IsCareful(candidate, effort)).Sizes))
            {
                fitting.Add(tool);
            }
        }

        return fitting;
    }

    /// <summary>Special effort, or a light finishing cut, keeps the oversize of a reamer small.</summary>
    public static bool IsCareful(Candidate candidate, Effort effort) => effort == Effort.Special || candidate.Process.EnterGrade <= ToleranceGrade.It(9);

    private bool Cuts(Candidate candidate, int changesBefore)
    {
        bool cuts = candidate.CutsSoft;
        for (int i = 0; i < changesBefore; i++)
        {
            cuts = _changes[i].Spares(candidate.Process.MostStockAt(_job.Nominal)) && (_changes[i].Hardens ? candidate.CutsHard : cuts);
        }

        return cuts;
    }

    /// <summary>Spread from the grade held (a sixth of it), or from the tool's predicted range; the share of it inside the window.</summary>
    /// <param name="candidate">The process.</param>
    /// <param name="tool">Its tool, or null.</param>
    /// <param name="effort">With how much care.</param>
    /// <param name="held">What the machinist aims into.</param>
    /// <param name="good">What counts as good.</param>
    private double Yield(Candidate candidate, Tool? tool, Effort effort, MetalWindow held, MetalWindow good)
    {
        MetalWindow aim = tool is null ? held : Cut(candidate, tool, effort);
        double spread = tool is null ? candidate.HeldWidth(effort).Picometres : aim.Width;
        double yield = NormalYield.Of(good.Least, good.Most, (aim.Least + aim.Most) / 2.0, spread / 6.0);

        // Two tools that differ by less than one hole in ten thousand are equally good.
        return tool is null ? yield : Math.Round(yield, YieldPlaces);
    }

    /// <summary>What a tool of fixed size is predicted to leave.</summary>
    private MetalWindow Cut(Candidate candidate, Tool tool, Effort effort) =>
        MetalWindow.Of(SizedCut.Predict(tool, _job.Group, IsCareful(candidate, effort)).Sizes, _job.IsInternal);

    /// <summary>The part of the drawing's window that the last step needs: what the tool cuts, or what the process holds from the end with the most metal.</summary>
    private MetalWindow Reach(Candidate candidate, Tool? tool, Effort effort, MetalWindow window)
    {
        MetalWindow cut = tool is null ? new MetalWindow(window.Most - candidate.HeldWidth(effort).Picometres, window.Most) : Cut(candidate, tool, effort);
        return new MetalWindow(Math.Max(window.Least, cut.Least), Math.Min(window.Most, cut.Most));
    }

    /// <summary>Whether a process can cut the blank of this job, before any size is looked at.</summary>
    private bool MayStart(Candidate candidate) => candidate.Process.StartsRough
        && (_job.Start.Kind != StartKind.Solid || _job.Kind != FeatureKind.Hole || candidate.Process.SizedBy == ToolUse.Drill);

    /// <summary>Tries to begin the route with this step.</summary>
    private void Start(Step step)
    {
        if (step.ChangesLeft > 0 || !MayStart(step.Candidate!) || (_job.AsksForPosition && !step.Places))
        {
            return;
        }

        switch (_job.Start.Kind)
        {
            case StartKind.Solid when _job.IsInternal:
                if (step.Process.SizedBy == ToolUse.Drill && _drills.Of(step.Tool!, step.Machine!) is { CanOpen: true } drill)
                {
                    PushDrilled(step, drill);
                }
                else if (_job.Kind == FeatureKind.Slot)
                {
                    Push(Blank(step, null, "solid metal"));
                }

                break;
            case StartKind.Cast or StartKind.Cored when _job.Start.Size is { } cast:
                StartFromSize(step, cast, CastTolerance, "casting", $"{(_job.Start.Kind == StartKind.Cast ? "cast" : "cored")} {cast}");
                break;
            default:
                StartFromBar(step);
                break;
        }
    }

    private void StartFromSize(Step step, Length size, Deviation tolerance, string surface, string name)
    {
        MetalWindow blank = MetalWindow.Of(new SizeWindow(size - tolerance, size + tolerance), _job.IsInternal);
        StockNeed need = Need(step, surface, blank.Most, new Deviation(blank.Width), sameClamping: false, afterHeat: false);
        MetalWindow entering = Entering(step, need.Least, []);
        if (entering.Holds(blank))
        {
            Push(Blank(step, blank, name));
        }
        else
        {
            Deviation shortBy = new(Math.Max(entering.Least - blank.Least, blank.Most - entering.Most));
            BlankMiss = BlankMiss is { } known && known.ShortBy <= shortBy ? known : new Closure(step.Process.Name, name, shortBy);
        }
    }

    private void StartFromBar(Step step)
    {
        if (_job.Start.Size is { } typed)
        {
            // A bar beside the series of the shop is taken with the tolerance of the largest, or of a cast blank.
            BarSeries? series = _shop.Bars.FirstOrDefault(series => series.Over < typed && typed <= series.UpTo) ?? (_shop.Bars.Count > 0 ? _shop.Bars[^1] : null);
            StartFromSize(step, typed, series?.Deviation ?? CastTolerance, "bar", $"bar {typed}");
            return;
        }

        // The surface of a larger bar can ask for more stock, and so for a still larger bar.
        Stock need = Need(step, "bar", step.Window.Most, default, sameClamping: false, afterHeat: false).Least;
        while (_shop.BarFor(MetalWindow.Size(step.Window.Most + need.Picometres)) is { } bar)
        {
            MetalWindow blank = MetalWindow.Of(bar.Limits, _job.IsInternal);
            need = Need(step, "bar", blank.Most, new Deviation(blank.Width), sameClamping: false, afterHeat: false).Least;
            if (Entering(step, need, []).Holds(blank))
            {
                Push(Blank(step, blank, $"bar {bar.Size}"));
                return;
            }

            if (blank.Least >= step.Window.Most + need.Picometres)
            {
                return;
            }
        }
    }

    private Step Blank(Step first, MetalWindow? sizes, string name)
    {
        first = sizes is { } entering ? Held(first, entering) : first;
        double cost = first.Settled + CostOf(first, sizes, arrives: true).PerGoodPiece(first.YieldToEnd, _job.Quantity);
        return new Step { Leaving = sizes, Next = first, NextEntering = sizes, NextArrives = true, Settled = cost, YieldToEnd = first.YieldToEnd, BlankName = name };
    }

    /// <summary>Puts every possible operation before this step.</summary>
    private void Precede(Step step)
    {
        ToleranceGrade held = step.IsLast ? step.Candidate!.HeldGrade(step.Effort) : step.Candidate!.LeftGrade;
        foreach (Candidate before in _candidates)
        {
            if (before.NoAtAll is not null || !MayPrecede(before, step.Candidate!, step.Tool, held, step.IsLast))
            {
                continue;
            }

            for (int left = step.ChangesLeft; left >= 0; left--)
            {
                if (!Cuts(before, left))
                {
                    continue;
                }

                Change[] between = left == step.ChangesLeft ? [] : [.. _changes[left..step.ChangesLeft]];
                if (step.Process.SelfGuided && Array.Exists(between, static change => change.Distorts))
                {
                    // A hone or lap follows the hole: it cannot true what hardening has bent.
                    continue;
                }

                foreach (Machine machine in before.Machines)
                {
                    Precede(step, before, machine, between, left);
                }
            }
        }
    }

    /// <summary>Whether one process makes sense before another, before any size is looked at.</summary>
    /// <param name="before">The process before.</param>
    /// <param name="after">The process after it.</param>
    /// <param name="tool">Its tool; null where the machinist sets the size, or for any tool.</param>
    /// <param name="held">The grade that it holds.</param>
    /// <param name="isLast">Whether it finishes the feature.</param>
    private static bool MayPrecede(Candidate before, Candidate after, Tool? tool, ToleranceGrade held, bool isLast)
    {
        Process process = after.Process;
        if (process.SizedBy == ToolUse.Drill)
        {
            return false;
        }

        if (before.Process == process || (before.Process.SizedBy == ToolUse.Ream && process.SizedBy == ToolUse.Ream))
        {
            return false;
        }

        bool drilled = before.Process.SizedBy == ToolUse.Drill;
        // What it can hold with care counts, so that less care never asks for another operation before.
        ToleranceGrade finest = isLast ? after.HeldGrade(Effort.Special) : held;
        bool coarser = before.LeftGrade > finest || (process.StartsRough && before.LeftGrade == finest && drilled);
        bool fineEnough = before.Process.LeftGrade <= process.EnterGrade;
        bool smallStep = process.SizedBy is not null || before.LeftGrade.Ordinal - held.Ordinal <= MostGradesGained;
        bool tooFarForOneReamer = process.SizedBy == ToolUse.Ream && before.LeftGrade >= RoughGrade && isLast && held <= ToleranceGrade.It(7)
            && tool?.Stamped > LargestReamAfterDrill;
        return coarser && fineEnough && smallStep && !tooFarForOneReamer;
    }

    private void Precede(Step step, Candidate before, Machine machine, Change[] between, int changesLeft)
    {
        bool same = between.Length == 0 && machine == step.Machine;
        bool heat = Array.Exists(between, static change => change.Hardens);
        Deviation tolerance = LeftTolerance(before, step, null);
        Stock need = Need(step, before.Process.Name, step.Reach.Most, tolerance, same, heat).Least;
        MetalWindow entering = Entering(step, need, between);
        if (before.Process.SizedBy is { } use)
        {
            PrecedeWithTools(step, before, machine, between, changesLeft, entering, use);
            return;
        }

        Length resolution = tolerance >= Deviation.FromMicrometres(50) ? Hundredth : Micrometre;
        long least = new Length(entering.Least).RoundUp(resolution).Picometres;
        MetalWindow leaving = new(least, least + tolerance.Picometres);
        if (leaving.Sizes(_job.IsInternal).Min < before.Process.Smallest)
        {
            return;
        }

        if (entering.Holds(leaving))
        {
            Push(Before(step, before, machine, null, leaving, between, changesLeft));
        }
        else
        {
            Miss(step, before.Process.Name, leaving.Most - entering.Most);
        }
    }

    /// <summary>Tolerance that the step before leaves: its grade at the size of the joint, or the range of its tool.</summary>
    private static Deviation LeftTolerance(Candidate before, Step step, MetalWindow? cut) =>
        cut is { } range ? new Deviation(range.Width)
        : Iso286.TryWidth(MetalWindow.Size(step.Reach.Most), before.LeftGrade, out Deviation width) ? width
        : before.RoutineWidth!.Value;

    private void PrecedeWithTools(Step step, Candidate before, Machine machine, Change[] between, int changesLeft, MetalWindow entering, ToolUse use)
    {
        if (!entering.IsOpen)
        {
            Miss(step, before.Process.Name, entering.Least - entering.Most);
            return;
        }

        bool fits = false;
        long nearest = long.MaxValue;
        (double Cost, Drill Drill)? cheapest = null;
        ReadOnlySpan<Tool> tools = _shop.ToolsNear(use, entering.Sizes(_job.IsInternal));
        for (int i = tools.Length - 1; i >= 0; i--)
        {
            Tool tool = tools[i];
            if (tool.Stamped > machine.Largest)
            {
                continue;
            }

            Drill? drill = use == ToolUse.Drill ? _drills.Of(tool, machine) : null;
            MetalWindow leaving = drill?.Leaving ?? Cut(before, tool, Effort.Routine);
            if (!entering.Holds(leaving))
            {
                nearest = Math.Min(nearest, Math.Max(entering.Least - leaving.Least, leaving.Most - entering.Most));
                continue;
            }

            fits = true;
            if (drill is null)
            {
                Push(Before(step, before, machine, tool, leaving, between, changesLeft));
            }
            else if (CanDrill(drill, step, between))
            {
                // A drill ends the way back, alone or with its pilot: of all sizes only the cheapest can belong to a best route.
                MetalWindow grown = Grown(leaving, between);
                Step held = Held(step, grown);
                double after = CostOf(held, grown, machine != step.Machine || between.Length > 0).PerGoodPiece(held.YieldToEnd, _job.Quantity);
                if (after >= cheapest?.Cost)
                {
                    // A smaller drill leaves this step still more to cut.
                    break;
                }

                double cost = after + drill.Cost / held.YieldToEnd;
                cheapest = cheapest is null || cost < cheapest.Value.Cost ? (cost, drill) : cheapest;
            }
        }

        if (!fits)
        {
            Miss(step, before.Process.Name, nearest);
        }
        else if (cheapest is { Drill: var chosen })
        {
            PushDrilled(Before(step, before, machine, chosen.Tool, chosen.Leaving, between, changesLeft), chosen);
        }
    }

    private bool CanDrill(Drill drill, Step step, Change[] between) =>
        step.ChangesLeft <= between.Length && _job.Start.Kind == StartKind.Solid && drill.CanOpen;

    private void PushDrilled(Step step, Drill drill)
    {
        if (_job.AsksForPosition && !step.Places)
        {
            return;
        }

        Step first = drill.Pilot is { } pilot ? Before(step, step.Candidate!, step.Machine!, pilot, _drills.Leaving(pilot), [], 0) : step;
        Push(Blank(first, null, "solid metal"));
    }

    private StockNeed Need(Step step, string before, long metal, Deviation tolerance, bool sameClamping, bool afterHeat) =>
        StockNeed.Between(step.Process, before, _job, MetalWindow.Size(metal), tolerance, sameClamping, afterHeat, step.ByHandbook);

    /// <summary>The window that must be left by the operation before, with the changes between taken off at their extremes; may be closed.</summary>
    private static MetalWindow Entering(Step step, Stock least, Change[] between)
    {
        // Counted to the drawing's own limit some stock must be left as well.
        MetalWindow window = new(Math.Max(step.Reach.Most + least.Picometres, step.Window.Most + Micrometre.Picometres), step.Reach.Least + MostStock(step));
        for (int i = between.Length - 1; i >= 0; i--)
        {
            window = between[i].Before(window);
        }

        return window;
    }

    private static long MostStock(Step step) => step.Process.MostStockAt(MetalWindow.Size(step.Reach.Most)).Picometres;

    /// <summary>
    /// A hone or lap as the last step, held so far inside the drawing's window that it never takes more than it can: it does not open a bore right
    /// through a wide tolerance. Any other step as it is: a tool of fixed size cuts what it cuts, and a cut to a setting ends at its aim.
    /// </summary>
    private Step Held(Step step, MetalWindow entering)
    {
        long least = entering.Most - MostStock(step);
        if (step.Tool is not null || MostStock(step) > LittleStock.Picometres || least <= step.Window.Least)
        {
            return step;
        }

        MetalWindow held = new(least, step.Window.Most);
        double yield = Yield(step.Candidate!, step.Tool, step.Effort, held, step.Window);
        return step with { Leaving = held, IsHeldInside = true, Yield = yield, YieldToEnd = yield };
    }

    private Step Before(Step step, Candidate before, Machine machine, Tool? tool, MetalWindow leaving, Change[] between, int changesLeft)
    {
        MetalWindow entering = Grown(leaving, between);
        step = Held(step, entering);
        bool arrives = machine != step.Machine || between.Length > 0;
        double yield = tool is null ? Yield(before, null, Effort.Routine, leaving, leaving) : 1;
        return new Step
        {
            ByHandbook = step.ByHandbook,
            Candidate = before,
            Machine = machine,
            Tool = tool,
            Leaving = leaving,
            Reach = leaving,
            Next = step,
            NextEntering = entering,
            NextArrives = arrives,
            ChangesLeft = changesLeft,
            ChangesAfter = between,
            Yield = yield,
            YieldToEnd = yield * step.YieldToEnd,
            Places = step.Places || !before.Process.Follows,
            Settled = step.Settled + ChangeCost(between) + CostOf(step, entering, arrives).PerGoodPiece(step.YieldToEnd, _job.Quantity),
        };
    }

    private static MetalWindow Grown(MetalWindow window, Change[] changes)
    {
        foreach (Change change in changes)
        {
            window = new MetalWindow(window.Least + change.LeastGrowth.Picometres, window.Most + change.MostGrowth.Picometres);
        }

        return window;
    }

    private void Miss(Step step, string before, long shortBy)
    {
        if (shortBy is > 0 and < long.MaxValue && (NearestMiss is null || shortBy < NearestMiss.ShortBy.Picometres))
        {
            NearestMiss = new Closure(step.Process.Name, before, new Deviation(shortBy));
        }
    }
}
