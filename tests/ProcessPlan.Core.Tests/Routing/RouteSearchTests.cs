using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;

namespace ProcessPlan.Core.Tests.Routing;

public class RouteSearchTests
{
    /// <summary>The search compares reamers to a ten-thousandth of good holes.</summary>
    private const double Noise = 1.5e-4;

    private static readonly ShopFloor Shop = GeneratedFeatures.Shop;

    [Fact]
    public void Find_SmallShops_IsTheCheapestOfAllChains()
    {
        Random random = new(21);
        List<string> faults = [];
        int routes = 0;
        long chains = 0;
        foreach ((string[] words, Feature feature) in GeneratedFeatures.Take(900, start: 21))
        {
            ShopFloor small = Small(feature, random);
            Plan plan = Planner.Plan(feature, small);
            ExhaustiveSearch exhaustive = new(plan.Job, small);
            double cheapest = exhaustive.Cheapest();
            chains += exhaustive.Chains;
            double found = plan.Routes.Count > 0 ? (double)plan.Routes[0].CostPerPiece.Amount : double.PositiveInfinity;
            routes += plan.Routes.Count;
            bool same = double.IsPositiveInfinity(cheapest) ? double.IsPositiveInfinity(found) : found >= cheapest * (1 - 1e-9) && found <= cheapest * (1 + Noise);
            if (!same)
            {
                faults.Add($"{string.Join(' ', words)} on {string.Join(", ", small.Machines.Select(machine => machine.Name))}: {found} found, {cheapest} by all chains: "
                    + string.Join(", ", plan.Routes.SelectMany(route => route.Operations).Select(operation => $"{operation.Process} {operation.Tool?.Label} {operation.Machine} {operation.Size}")));
            }
        }

        string.Join(Environment.NewLine, faults).Should().BeEmpty();
        routes.Should().BeGreaterThan(300);
        chains.Should().BeGreaterThan(10 * routes, "else there was nothing to choose");
    }

    /// <summary>A few machines, and of each kind of tool a few near the size.</summary>
    private static ShopFloor Small(Feature feature, Random random)
    {
        Machine[] machines = [.. Shop.Machines.Where(_ => random.Next(0, 10) < 6)];
        List<Tool> tools = [];
        foreach (ToolUse use in Enum.GetValues<ToolUse>())
        {
            Tool[] near = [.. Shop.Tools(use).Where(tool => tool.Stamped <= feature.Limits.Max && tool.Stamped.Picometres > feature.Nominal.Picometres / 3)];
            int few = use == ToolUse.Drill ? 12 : 5;
            tools.AddRange(near.Where(_ => random.Next(0, Math.Max(1, near.Length)) < few));
            tools.AddRange(near.TakeLast(use is ToolUse.Ream ? 2 : 0));
        }

        return new ShopFloor("small shop", Shop.Currency, machines, tools.Distinct(), Shop.Materials, Shop.Bars, Shop.Suppliers);
    }
}
