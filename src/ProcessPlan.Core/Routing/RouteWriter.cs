using System.Globalization;
using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Inspection;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>Turns a chain of the search into the operations of a route, each number with its origin.</summary>
internal sealed class RouteWriter(Job job, ShopFloor shop, RouteSearch search)
{
    private int _number;

    /// <param name="blank">The chain, from its blank.</param>
    /// <param name="rank">1 for the cheapest.</param>
    public Route Write(Step blank, int rank)
    {
        _number = 0;
        List<Operation> operations = [];
        double yield = blank.YieldToEnd;
        bool hard = false;
        for (Step before = blank; before.Next is { } step; before = step)
        {
            operations.Add(Write(step, before, hard));
            foreach (Change change in step.ChangesAfter)
            {
                operations.Add(Write(change, step));
                hard |= change.Hardens;
            }
        }

        Money cost = Sum(operations);
        return new Route(rank, operations, cost, new Minutes(operations.Sum(static operation => operation.Minutes.Value)),
            new Minutes(operations.Sum(static operation => operation.SetUp.Value)), yield, StartQuantity.For(job.Quantity, Math.Round(yield, 6)), blank.BlankName!);
    }

    private Money Sum(List<Operation> operations)
    {
        decimal sum = 0;
        foreach (Operation operation in operations)
        {
            sum += operation.Cost.Amount;
        }

        return new Money(sum, shop.Currency);
    }

    private Money Price(double amount) => new((decimal)amount, shop.Currency);

    private Operation Write(Step step, Step before, bool hard)
    {
        Process process = step.Process;
        StepCost cost = search.CostOf(step, before.NextEntering, before.NextArrives);
        SizeWindow held = step.Window.Sizes(job.IsInternal);
        ToleranceGrade? grade = step.IsLast ? Iso286.NearestGrade(job.Nominal, held.Width) : step.Candidate!.LeftGrade;
        (Stock? least, Stock? most) = before.NextEntering is { } from
            ? (new Stock(from.Least - step.Window.Most), new Stock(from.Most - step.Window.Least))
            : ((Stock?)null, (Stock?)null);
        Length aim = held.Middle;
        (Instrument instrument, bool good) = Instrument.For(job.IsInternal, job.Nominal, held.Width);
        Roughness ra = step.IsLast ? job.Ra ?? process.Ra(step.Effort) : process.LeftRa;
        return new Operation
        {
            Number = _number += 10,
            Process = process.Name,
            Machine = step.Machine!.Name,
            Condition = hard ? Condition.Hard : Condition.Soft,
            Effort = step.Effort,
            Tool = step.Tool,
            Size = held,
            Aim = aim,
            Grade = grade,
            Ra = ra,
            StockMin = least,
            StockMax = most,
            Minutes = new Minutes(cost.Minutes),
            SetUp = new Minutes(cost.SetUp),
            Cost = Price(cost.PerGoodPiece(step.YieldToEnd, job.Quantity)),
            Inspection = Inspect(step, instrument, good, held),
            Because = Because(step, most),
            Cautions = Cautions(step, instrument, good, held),
            Why = [.. Why(step, before, cost, held, aim, instrument)],
        };
    }

    private Operation Write(Change change, Step step)
    {
        Supplier? supplier = change.Supplier;
        decimal share = supplier is null ? 0 : supplier.ChargeFor(job.Quantity) / job.Quantity;
        string days = supplier is null ? "price and days to be asked" : $"{supplier.Days} days away";
        SizeWindow after = new MetalWindow(step.Window.Least + change.LeastGrowth.Picometres, step.Window.Most + change.MostGrowth.Picometres).Sizes(job.IsInternal);
        return new Operation
        {
            Number = _number += 10,
            Process = change.Process,
            Machine = "outside",
            Condition = change.Covers ? Condition.Coated : Condition.Hard,
            Size = step.IsLast && change == step.ChangesAfter[^1] && job.Feature.Coating is not { Limits: CoatingLimits.Before } ? job.Feature.Limits : after,
            Minutes = default,
            SetUp = default,
            Cost = new Money(share, shop.Currency),
            Inspection = change.Hardens ? "hardness by the treater's certificate; size and run-out on return" : "thickness by the coater's certificate; size on return",
            Because = [$"{change.Detail}; {days}"],
            Cautions = ChangeCautions(change),
            Why =
            [
                new Reason("size", $"the size moves by {change.LeastGrowth} to {change.MostGrowth} on {Across} [{change.Origin}]"),
                new Reason("cost", supplier is null
                    ? "this shop knows no supplier: not in the price"
                    : string.Create(CultureInfo.InvariantCulture, $"the larger of the lot charge {supplier.LotCharge} and {job.Quantity} · {supplier.PiecePrice}, over {job.Quantity} pieces")),
            ],
        };
    }

    private string Across => job.Feature.IsRound ? "diameter" : "width";

    private static List<string> ChangeCautions(Change change) => change.Covers
        ? ["Plating of high-strength steel: embrittlement relief as the plating specification requires.", "Only by a qualified shop, to the specification on the drawing."]
        : ["Heat treatment only by a qualified shop, to the specification on the drawing. Ask it for the size change to expect."];

    private static string Inspect(Step step, Instrument instrument, bool good, SizeWindow held)
    {
        string how = Checks.Words(step.Process, step.Effort);
        string ratio = instrument.RatioTo(held.Width).ToString("0.#", CultureInfo.InvariantCulture);
        string verdict = good ? "" : $", NOT GOOD ENOUGH (needs 1 : {Instrument.LeastRatio})";
        return $"{instrument.Name}, U {instrument.Uncertainty.Format()} µm = 1 : {ratio} of the tolerance{verdict}; {how}";
    }

    private List<string> Because(Step step, Stock? most)
    {
        Candidate candidate = step.Candidate!;
        List<string> because = [];
        if (step.IsLast)
        {
            string effort = step.Effort == Effort.Routine ? "with routine effort" : "with special effort";
            string lost = candidate.GradesLost > 0 ? $" ({candidate.LossReason}: {candidate.GradesLost} grade worse)" : "";
            if (step.IsHeldInside)
            {
                because.Add("held inside the drawing's limits, so that it never has to take more than it can");
            }

            because.Add($"holds {candidate.HeldGrade(step.Effort)} {effort}{lost}, leaves {step.Process.Ra(step.Effort)}");
        }
        else if (most is null)
        {
            because.Add($"opens the {job.Kind.Word()} in solid metal");
        }
        else
        {
            because.Add($"leaves {candidate.LeftGrade}, which {step.Next!.Process.Name} can start from");
        }

        if (job.AsksForPosition && !step.Process.Follows)
        {
            because.Add("puts the axis right; drills and reamers only follow");
        }

        return because;
    }

    private static List<string> Cautions(Step step, Instrument instrument, bool good, SizeWindow held)
    {
        List<string> cautions = [];
        if (step.Process.Ability == "ream")
        {
            cautions.Add("Never turn a reamer backwards. Make a trial hole with a reamer that is new to this material.");
        }

        if (step.Process.Ability.StartsWith("grind", StringComparison.Ordinal))
        {
            cautions.Add("Guard, wheel rating and ring test; coolant on. Look for burn and cracks on hardened steel.");
        }

        if (!good)
        {
            cautions.Add($"No instrument of this shop is good enough for {held.Width.Format()} µm: the {instrument.Name} is the nearest.");
        }

        if (step.Effort == Effort.Special)
        {
            cautions.Add(step.Tool is null
                ? "Special effort: slow cut, careful set-up, every piece measured before the last cut and after it."
                : "Special effort: cutting oil, run-out of the reamer below 5 µm, slow cut, trial hole.");
        }

        return cautions;
    }

    private IEnumerable<Reason> Why(Step step, Step before, StepCost cost, SizeWindow held, Length aim, Instrument instrument)
    {
        Process process = step.Process;
        yield return new Reason("size", SizeOrigin(step, held));
        yield return new Reason("aim", $"middle of {held.Min.Format(3)} and {held.Max.Format(3)} = {aim}");
        if (step.Tool is { } tool)
        {
            yield return new Reason("tool", ToolOrigin(step, tool));
        }

        if (before.NextEntering is { } from)
        {
            SizeWindow entering = from.Sizes(job.IsInternal);
            yield return new Reason("stock", (job.IsInternal
                ? $"least {held.Min.Format(3)} - {entering.Max.Format(3)}, most {held.Max.Format(3)} - {entering.Min.Format(3)}"
                : $"least {entering.Min.Format(3)} - {held.Max.Format(3)}, most {entering.Max.Format(3)} - {held.Min.Format(3)}")
                + $", after {(before.IsBlank ? before.BlankName : before.Process.Name)}");
            foreach (string line in search.NeedOf(step, before).Explain())
            {
                yield return new Reason("stock", line);
            }

            if (step.Reach != step.Window)
            {
                string how = step.Tool is { } sized ? $"as {sized.Label} is predicted to cut" : $"where it holds {step.Candidate!.HeldWidth(step.Effort).Format()} µm from the near limit";
                yield return new Reason("stock", $"{new Stock(from.Least - step.Reach.Most)} to {new Stock(from.Most - step.Reach.Least)} {how}");
            }

            yield return new Reason("stock", $"{process.Name} takes at most {process.MostStockAt(MetalWindow.Size(step.Reach.Most))} here [{process.Origin}]");
        }

        yield return new Reason("grade", $"{process.Name}: routine {process.RoutineGrade}, special {process.SpecialGrade?.ToString() ?? "none"}; leaves {process.LeftRa} on the way [{process.Origin}]");
        yield return new Reason("minutes", $"cut: {cost.Cutting.Explain(cost.Cut)} [{cost.Cut.Data.Origin}]");
        yield return new Reason("minutes", string.Create(CultureInfo.InvariantCulture,
            $"cut {cost.Cutting.Minutes:0.00} + tool change {cost.Machine.ToolChangeMinutes:0.00} + checking {cost.Checking:0.00} + handling {cost.Handling:0.00} = {cost.Minutes:0.00} min"));
        yield return new Reason("cost", string.Create(CultureInfo.InvariantCulture,
            $"({cost.Machine.RatePerHour:0.##}/60 · {cost.Minutes:0.00} min + wear {cost.Wear:0.000}) / yield to the end {step.YieldToEnd:0.0000} + {cost.Machine.RatePerHour:0.##}/60 · set-up {cost.SetUp:0} min / {job.Quantity} = {cost.PerGoodPiece(step.YieldToEnd, job.Quantity):0.00} {shop.Currency}"));
        if (cost.Wear > 0)
        {
            yield return new Reason("cost", $"wear: {ToolWear.Explain(cost.Cut, step.Tool, cost.Cutting.Minutes)} {shop.Currency} [{ToolWear.Citation}]");
        }

        yield return new Reason("inspection", $"{instrument.Name}: U {instrument.Uncertainty.Format()} µm against {held.Width.Format()} µm [{instrument.Origin}]");
    }

    private string SizeOrigin(Step step, SizeWindow held)
    {
        if (step.IsLast)
        {
            string inside = step.IsHeldInside ? $"as much as it can by the greatest stock of {step.Process.Name}: " : "";
            return inside + (job.Feature.Class is { } toleranceClass && step.ChangesAfter.Length == 0
                ? $"the drawing's limits, {toleranceClass} [{Iso286.Cite(job.Nominal, toleranceClass.Grade)}; {Iso286.Cite(job.Nominal, toleranceClass)}]"
                : step.ChangesAfter.Length == 0 ? "the drawing's limits" : "the drawing's limits, less what comes after at its extremes");
        }

        if (step.Tool is { } tool)
        {
            SizedCut cut = SizedCut.Predict(tool, job.Group, RouteSearch.IsCareful(step.Candidate!, step.Effort));
            return $"what {tool.Label} is predicted to cut: {cut.Over.Least} to {cut.Over.Most} over its size [{cut.Origin}]";
        }

        return $"the next operation's limit and least stock, then the tolerance {step.Candidate!.LeftGrade} = {held.Width.Format()} µm into the metal [{Iso286.Cite(held.Max, step.Candidate!.LeftGrade)}]";
    }

    private static string ToolOrigin(Step step, Tool tool)
    {
        if (tool.Use == ToolUse.Ream && step.IsLast)
        {
            ReamerChoice.Suits(tool, step.Window.Sizes(isInternal: true), out string because);
            return $"{tool.Label}: {because} [{Din1420.Citation}]";
        }

        return $"{tool.Label}: the size of the shop's drawer that leaves the next operation its stock at the least cost";
    }
}
