using System.Globalization;
using ProcessPlan.Core;
using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Documents;

/// <summary>Which numbers of a card say where they come from.</summary>
/// <param name="Operation">The operation's number; null for all.</param>
/// <param name="About">The number, such as stock or minutes; null for all.</param>
public sealed record WhyAsked(int? Operation, string? About)
{
    public bool Covers(int operation, string about) =>
        (Operation is null || Operation == operation) && (About is null || string.Equals(About, about, StringComparison.OrdinalIgnoreCase));
}

/// <summary>The route card as text of eighty columns: the three sizes first, then the operations, then questions, cautions and assumptions.</summary>
public sealed class PlanText(TextWriter target, LengthUnit? unit, WhyAsked? why)
{
    private const int Indent = 5;
    private const int Deep = 8;
    private static readonly string Rule = new('-', TextLines.Width);

    /// <param name="request">What was asked.</param>
    /// <param name="plans">One plan for each feature of the request, in its order.</param>
    public void Write(FeatureRequest request, IReadOnlyList<Plan> plans)
    {
        for (int i = 0; i < plans.Count; i++)
        {
            if (i > 0)
            {
                target.WriteLine();
            }

            Write(plans[i]);
        }

        if (request.Mate is { } mate)
        {
            LimitsText.WriteFit(target, request.First, mate, new UnitScale(unit ?? request.First.Unit));
        }
    }

    private void Write(Plan plan)
    {
        if (plan.Refusal is null && why?.Operation is { } asked && !plan.Routes[0].Operations.Any(operation => operation.Number == asked))
        {
            TextLines.Write(target, $"(--why {asked}: this route has no operation {asked}.)", 0);
        }

        UnitScale scale = new(unit ?? plan.Job.Feature.Unit);
        TextLines.Write(target, "ROUTE CARD  " + FeatureText.Line(plan.Job.Feature), 0);
        target.WriteLine(Rule);
        WriteSizes(plan.Job.Feature, scale);
        target.WriteLine(Rule);
        if (plan.Refusal is { } refusal)
        {
            Write(refusal);
        }
        else
        {
            Write(plan.Routes[0], plan.Job, scale);
            WriteOthers(plan.Routes);
        }

        WriteList("No to finish it", plan.Rejected.Select(static rejection => $"{rejection.Process}: {rejection.Because}"), plan.Refusal is not null || why is not null);
        WriteList("Ask before cutting", plan.Queries, true);
        WriteList("Cautions", plan.Cautions, true);
        WriteList("Taken for granted", plan.Assumptions, true);
        if (why is null && plan.Refusal is null)
        {
            target.WriteLine();
            TextLines.Write(target, "Where a number comes from: --why, --why 20, --why stock.", 0);
        }
    }

    private void WriteSizes(Feature feature, UnitScale scale)
    {
        ShownLimits shown = new(feature, scale);
        string across = feature.IsRound ? "diameter" : "width";
        target.WriteLine($"     MAX  {shown.Max}     AIM  {shown.Middle}     MIN  {shown.Min}     {scale.Symbol} on {across}");
        ShownLimits other = new(feature, scale.Other);
        target.WriteLine($"          {other.Max}          {other.Middle}          {other.Min}     {scale.Other.Symbol}{(other.IsExact ? "" : ", rounded inwards")}");
    }

    private void Write(Route route, Job job, UnitScale scale)
    {
        target.WriteLine(string.Create(CultureInfo.InvariantCulture,
            $"{route.ShownCost} a piece, {route.ShownMinutes} a piece, set-up {route.SetUp.Value:0} min a lot of {job.Quantity}"));
        target.WriteLine(string.Create(CultureInfo.InvariantCulture,
            $"yield {route.Yield:0.0 %} by the spread of the handbook: start {route.Blanks}, from {route.From}"));
        foreach (Operation operation in route.Operations)
        {
            target.WriteLine();
            Write(operation, scale);
        }
    }

    private void Write(Operation operation, UnitScale scale)
    {
        string condition = operation.Condition == Condition.Soft ? "" : operation.Condition == Condition.Hard ? ", hard" : ", coated";
        target.WriteLine($"{operation.Number,3}  {operation.Process,-26}{operation.Machine + condition,-22}{operation.Tool?.Label}".TrimEnd());
        if (operation.Size is { } size)
        {
            int places = scale.PlacesOf(size.Max, size.Min) ?? scale.UsualPlaces + 1;
            SizeWindow inside = size.RoundInward(scale.Step(places)) ?? size;
            Length aim = operation.Aim ?? size.Middle;
            target.WriteLine($"     max {scale.Format(inside.Max, places)}   aim {scale.Format(aim, scale.PlacesOf(aim) ?? places)}   min {scale.Format(inside.Min, places)} {scale.Symbol}   {operation.Grade}   {operation.Ra}".TrimEnd());
        }

        if (operation.StockMin is { } least && operation.StockMax is { } most)
        {
            target.WriteLine($"     takes off {scale.Format(new Length(least.Picometres), scale.UsualPlaces)} to {scale.Format(new Length(most.Picometres), scale.UsualPlaces)} {scale.Symbol}");
        }

        string setUp = operation.SetUp.Value > 0 ? string.Create(CultureInfo.InvariantCulture, $", set-up {operation.SetUp.Value:0} min a lot") : "";
        target.WriteLine($"     {operation.Minutes}{setUp}; {operation.Cost}");
        TextLines.Write(target, "check: " + operation.Inspection, Indent);
        foreach (string because in operation.Because)
        {
            TextLines.Write(target, because, Indent);
        }

        foreach (string caution in operation.Cautions)
        {
            TextLines.Write(target, "! " + caution, Indent);
        }

        foreach (Reason reason in operation.Why)
        {
            if (why?.Covers(operation.Number, reason.About) == true)
            {
                TextLines.Write(target, $"{reason.About}: {reason.Text}", Deep);
            }
        }
    }

    private void WriteOthers(IReadOnlyList<Route> routes)
    {
        if (routes.Count < 2)
        {
            return;
        }

        target.WriteLine();
        target.WriteLine("Other ways");
        foreach (Route route in routes.Skip(1))
        {
            Money dearer = new(route.ShownCost.Rounded - routes[0].ShownCost.Rounded, route.CostPerPiece.Currency);
            TextLines.Write(target, $"{route.Rank}  +{dearer} a piece: {string.Join(", ", route.Operations.Select(static operation => operation.Process))}", 2);
        }
    }

    private void Write(Refusal refusal)
    {
        TextLines.Write(target, "NO ROUTE in this shop for " + refusal.Requirement, 0);
        TextLines.Write(target, refusal.Message, Indent);
        TextLines.Write(target, "best here: " + refusal.Best, Indent);
        foreach (string open in refusal.WouldOpen)
        {
            TextLines.Write(target, "would open it: " + open, Indent);
        }
    }

    private void WriteList(string title, IEnumerable<string> lines, bool shown)
    {
        string[] all = [.. lines];
        if (!shown || all.Length == 0)
        {
            return;
        }

        target.WriteLine();
        target.WriteLine(title);
        foreach (string line in all)
        {
            TextLines.Write(target, line, 2);
        }
    }
}
