using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;

namespace ProcessPlan.Core.Tests.Routing;

public class RouteSearchTests
{
    private static readonly ShopFloor Shop = GeneratedFeatures.Shop;

    [Fact]
    public void Find_SmallShops_IsTheCheapestOfAllChains()
    {
        Random random = new(21);
        List<string> faults = [];
        int routes = 0;
        long chains = 0;
        foreach ((string[] words, Feature feature) in GeneratedFeatures.Take(800, start: 21))
        {
            ShopFloor small = Small(feature, random);
            Plan plan = Planner.Plan(feature, small);
            ExhaustiveSearch exhaustive = new(plan.Job, small);
            double cheapest = exhaustive.Cheapest();
            chains += exhaustive.Chains;
            double found = plan.Routes.Count > 0 ? (double)plan.Routes[0].CostPerPiece.Amount : double.PositiveInfinity;
            routes += plan.Routes.Count;
            bool same = double.IsPositiveInfinity(cheapest) ? double.IsPositiveInfinity(found) : Math.Abs(found - cheapest) <= 1e-9 * cheapest;
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

    /// <summary>Work counts: steps whose ways back were looked through. They move with the tables; a jump is a search that lost its bound.</summary>
    [Theory]
    [InlineData("hole 8H12 x20 C45 100off", 2)]
    [InlineData("hole 10H7 x20 thru Ra0.8 C45 50off", 6)]
    [InlineData("hole 25H7 x40 thru Ra0.8 42CrMo4 28HRC 200off", 74)]
    [InlineData("hole 60H7 x50 Ra0.8 C45 12off", 47)]
    [InlineData("hole 180H8 x60 C45 4off", 163)]
    [InlineData("hole 30H6 x60 Ra0.2 C45 hardened 60HRC 400off", 35)]
    [InlineData("shaft 60 m5 x50 Ra0.4 42CrMo4 10off", 6)]
    [InlineData("shaft 30 f7 x40 coat zinc 8-20um", 0)]
    public void Expanded_ANamedFeature_IsThePinnedCount(string line, int expanded) =>
        Planner.Plan(GeneratedFeatures.ReadAll(line), Shop).Expanded.Should().Be(expanded);

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
