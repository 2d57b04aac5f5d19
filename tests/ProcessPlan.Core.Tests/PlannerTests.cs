using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests;

/// <summary>Features that every shop knows. What the route must hold and must not hold is common practice, no source, where no other is named.</summary>
public class PlannerTests
{
    private static readonly ShopFloor Shop = GeneratedFeatures.Shop;

    // Standard routes (process textbooks; from memory): IT7 over 12 mm by drill, core drill or bore, ream; a lathe part stays on the lathe.
    [Theory]
    [InlineData("hole 25H7 x40 thru Ra0.8 42CrMo4 28HRC 200off", "twist drilling, finish boring, finish reaming")]
    [InlineData("hole 10H7 x20 thru Ra0.8 C45 50off", "twist drilling, reaming")]
    [InlineData("hole 3H7 x6 Ra0.8 C45 20off", "twist drilling, reaming")]
    [InlineData("hole 12H8 x25 Ra1.6 6082 100off", "twist drilling, reaming")]
    [InlineData("hole 40H7 x60 Ra0.8 C45 20off", "twist drilling, twist drilling, core drilling, reaming")]
    [InlineData("hole 8H12 x20 C45 100off", "twist drilling")]
    [InlineData("hole 180H8 x60 C45 4off", "twist drilling, twist drilling, rough boring, finish boring")]
    [InlineData("hole 30H7 x30 Ra0.4 C45 hardened 58HRC 40off", "twist drilling, rough boring, semi-finish boring, hardening, rough internal grinding, internal grinding")]
    [InlineData("shaft 30 f7 x60 Ra1.6 C45 20off", "rough turning, finish turning, fine turning")]
    [InlineData("shaft 35 k6 x28 Ra0.8 C45 hardened 58HRC 40off", "rough turning, semi-finish turning, hardening, rough cylindrical grinding, cylindrical grinding")]
    [InlineData("shaft 60 m5 x50 Ra0.4 42CrMo4 10off", "rough turning, semi-finish turning, rough cylindrical grinding, cylindrical grinding, fine cylindrical grinding")]
    [InlineData("keyway 8 P9 x40 C45 1off", "rough milling, finish milling")]
    [InlineData("tongue 20 h6 x50 Ra0.4 C45 10off", "rough milling, finish milling, rough surface grinding, surface grinding")]
    public void Plan_AKnownFeature_IsTheUsualRoute(string line, string operations) =>
        string.Join(", ", Cheapest(line).Operations.Select(operation => operation.Process)).Should().Be(operations);

    // Drill before a reamer, trade courses: up to 5 mm 0.1 to 0.2 of stock, 5 to 20 mm 0.2 to 0.3; at the extremes of the drill half a tenth more.
    [Theory]
    [InlineData("hole 3H7 x6 C45 20off", 0.1, 0.25)]
    [InlineData("hole 4H8 x8 brass 20off", 0.09, 0.25)]
    [InlineData("hole 5H7 x10 C45 20off", 0.1, 0.25)]
    [InlineData("hole 8H7 x16 C45 20off", 0.15, 0.35)]
    [InlineData("hole 10H7 x20 C45 20off", 0.15, 0.35)]
    [InlineData("hole 12H7 x20 GG25 20off", 0.15, 0.4)]
    public void Plan_AReamedHole_LeavesTheReamerItsUsualStock(string line, double least, double most)
    {
        Operation ream = Cheapest(line).Operations[^1];
        ream.Process.Should().EndWith("reaming");
        ream.StockMin!.Value.ToMillimetres().Should().BeGreaterThanOrEqualTo(least);
        ream.StockMax!.Value.ToMillimetres().Should().BeLessThanOrEqualTo(most);
    }

    // The reamer follows the hole: a trade article for the fact, common practice for the limit of 0.05 mm.
    [Theory]
    [InlineData("hole 16H7 x30 pos 0.02 C45 10off")]
    [InlineData("hole 20H8 x30 coax 0.05 6082 50off")]
    public void Plan_APositionedHole_IsBoredBeforeItIsReamed(string line)
    {
        Route route = Cheapest(line);
        route.Operations.Should().Contain(operation => operation.Process.EndsWith("boring") && operation.Because.Any(text => text.Contains("axis right")));
    }

    [Fact]
    public void Plan_APositionedSmallHole_IsRefusedBecauseNothingPutsTheAxisRight() =>
        Refused("hole 4H7 x8 pos 0.02 C45 10off").Message.Should().EndWith("nothing before puts the axis right.");

    // A coating whose spread on diameter reaches the tolerance leaves no window (common practice, no source).
    [Fact]
    public void Plan_ACoatingWiderThanTheTolerance_IsRefusedWithTheSum()
    {
        Refusal refusal = Refused("shaft 30 f7 x40 coat zinc 8-20um");
        refusal.Message.Should().Be("No window exists before plating: it moves the size by +16 µm to +40 µm, the tolerance is 21 µm.");
        refusal.WouldOpen.Should().Contain("Ask the designer: limits before the coating, a closer thickness, or masking.");
    }

    // Shaft before plating = [min - 2·least, max - 2·most]: 29.959 + … by extremes, never by one mean thickness.
    [Fact]
    public void Plan_ACoatedShaft_IsTurnedToTheExtremesOfTheCoating()
    {
        Route route = Cheapest("shaft 30 f7 x40 34CrNiMo6 38HRC coat zinc-nickel 8-12um 60 off");
        route.Operations[^2].Size.Should().Be(new SizeWindow(Length.FromMillimetres(29.959m - 0.016m), Length.FromMillimetres(29.980m - 0.024m)));
        route.Operations[^1].Process.Should().Be("plating");
        route.Operations[^1].Size.Should().Be(new SizeWindow(Length.FromMillimetres(29.959m), Length.FromMillimetres(29.980m)));
    }

    // Handbook figures for grinding hardened work: 0.3 to 0.4 mm on 30 to 50 mm, 0.1 more than soft (from memory).
    [Theory]
    [InlineData("shaft 35 k6 x28 Ra0.8 C45 hardened 58HRC 40off", 0.25, 0.6)]
    [InlineData("hole 40H7 x40 Ra0.4 C45 hardened 58HRC 40off", 0.25, 0.6)]
    public void Plan_AHardenedPart_KeepsGrindingStock(string line, double least, double most)
    {
        Route route = Cheapest(line);
        int hardening = route.Operations.ToList().FindIndex(operation => operation.Process == "hardening");
        Operation[] grinding = [.. route.Operations.Skip(hardening + 1)];
        grinding.Should().OnlyContain(operation => operation.Condition == Condition.Hard && (operation.Process.EndsWith("grinding") || operation.Process == "honing"));
        grinding[0].Process.Should().EndWith("grinding", "a hone cannot true what hardening has bent");
        grinding[0].StockMin!.Value.ToMillimetres().Should().BeGreaterThan(0.2);
        grinding.Sum(operation => operation.StockMin!.Value.ToMillimetres()).Should().BeGreaterThan(least);
        grinding.Sum(operation => operation.StockMax!.Value.ToMillimetres()).Should().BeLessThan(most + 0.2);
    }

    [Fact]
    public void Plan_ABarDeliveredHard_NamesNoTurningAmongItsFinishers()
    {
        Plan plan = Planner.Plan(GeneratedFeatures.ReadAll("shaft 30 k6 x28 60HRC C45"), Shop);
        plan.Refusal!.Message.Should().NotContain("turning");
        plan.Rejected.Should().Contain(rejection => rejection.Process == "fine turning" && rejection.Because.StartsWith("up to 45 HRC"));
    }

    [Fact]
    public void Plan_NothingFinishesIt_SaysTheBestAndWhatWouldOpen()
    {
        Refusal refusal = Refused("hole 10H7 x20 Ra0.05 POM");
        refusal.Requirement.Should().Be("10 H7 with Ra 0.05");
        refusal.Message.Should().Be("No process of this shop finishes 10 H7 with Ra 0.05.");
        refusal.Best.Should().Be("IT6 (9 µm) by fine boring; Ra 0.4 by fine boring, both with special effort");
        refusal.WouldOpen.Should().Equal("Ask the designer whether a wider tolerance or a coarser finish serves.");
    }

    [Fact]
    public void Plan_LessThanOneRoute_IsAMistakeOfTheCaller() =>
        FluentActions.Invoking(() => Planner.Plan(GeneratedFeatures.ReadAll("hole 10H7"), Shop, routes: 0)).Should().Throw<ArgumentOutOfRangeException>();

    private static Route Cheapest(string line) => Planner.Plan(GeneratedFeatures.ReadAll(line), Shop).Routes[0];

    private static Refusal Refused(string line)
    {
        Plan plan = Planner.Plan(GeneratedFeatures.ReadAll(line), Shop);
        plan.Routes.Should().BeEmpty();
        return plan.Refusal!;
    }
}
