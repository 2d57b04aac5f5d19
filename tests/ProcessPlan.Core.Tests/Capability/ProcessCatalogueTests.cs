using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Tests.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Capability;

/// <summary>
/// The process table against the publications side by side (<c>Sources/capability-*.csv</c>): routine lies within what at least one of them prints,
/// special is not finer than the finest of them. Whatever departs is listed here, openly.
/// </summary>
public class ProcessCatalogueTests
{
    /// <summary>Row of the side-by-side tables for grade and for roughness; null where the publications have none.</summary>
    private static readonly Dictionary<string, (string? Grade, string? Ra)> Rows = new()
    {
        ["twist drilling"] = ("drilling", "drilling"),
        ["core drilling"] = ("core drilling", "core drilling"),
        ["rough boring"] = ("boring rough", "boring rough"),
        ["semi-finish boring"] = ("boring finish", "boring semi-finish"),
        ["finish boring"] = ("boring finish", "boring finish"),
        ["fine boring"] = ("boring fine", "boring fine"),
        ["rough reaming"] = ("reaming rough", "reaming"),
        ["reaming"] = ("reaming finish", "reaming"),
        ["finish reaming"] = ("reaming fine", "reaming"),
        ["broaching"] = ("broaching", "broaching"),
        ["rough internal grinding"] = ("internal grinding rough", "grinding"),
        ["internal grinding"] = ("internal grinding", "grinding"),
        ["honing"] = ("honing", "honing"),
        ["lapping"] = ("lapping", "lapping"),
        ["rough turning"] = ("turning rough", "boring rough"),
        ["semi-finish turning"] = ("turning semi-finish", "boring semi-finish"),
        ["finish turning"] = ("turning finish", "boring finish"),
        ["fine turning"] = ("turning fine", "boring fine"),
        ["diamond turning"] = ("turning fine", "diamond"),
        ["rough cylindrical grinding"] = ("cylindrical grinding rough", "grinding"),
        ["cylindrical grinding"] = ("cylindrical grinding", "grinding"),
        ["fine cylindrical grinding"] = ("cylindrical grinding fine", "grinding fine"),
        ["centreless grinding"] = ("cylindrical grinding", "grinding"),
        ["superfinishing"] = ("superfinishing", "superfinishing"),
        ["rough milling"] = ("milling rough", "milling rough"),
        ["finish milling"] = ("milling finish", "milling finish"),
        ["rough surface grinding"] = ("surface grinding rough", "grinding"),
        ["surface grinding"] = ("surface grinding", "grinding"),
        ["wire cutting"] = (null, null),
    };

    private static readonly Length[] Sizes = [.. new decimal[] { 1, 3, 6, 6.001m, 10, 18, 18.5m, 30, 50, 79.9m, 120, 180, 250, 399 }.Select(Length.FromMillimetres)];

    [Fact]
    public void Handbook_EveryProcess_HasItsRowInTheComparison() =>
        ProcessCatalogue.Handbook.Select(process => process.Name).Distinct().Should().BeEquivalentTo(Rows.Keys);

    [Fact]
    public void RoutineGrade_EveryProcess_LiesWithinAPublishedBand()
    {
        PrintedSource source = new("capability-it.csv");
        List<string> departures = [];
        foreach (Process process in ProcessCatalogue.Handbook)
        {
            if (Rows[process.Name].Grade is not { } row)
            {
                continue;
            }

            PrintedRow[] bands = [.. source.Rows.Where(band => band["row"] == row)];
            bands.Should().NotBeEmpty("{0}", process.Name);
            int routine = Number(process.RoutineGrade);
            if (!bands.Any(band => band.Number("finest") <= routine && routine <= band.Number("coarsest")))
            {
                departures.Add($"{process.Name} routine IT{routine}");
            }

            if (process.SpecialGrade is { } special && bands.Min(band => band.Number("finest")) > Number(special))
            {
                departures.Add($"{process.Name} special IT{Number(special)}");
            }
        }

        departures.Distinct().Should().BeEmpty();
    }

    [Fact]
    public void RoutineRa_EveryProcess_LiesWithinAPublishedBand()
    {
        PrintedSource source = new("capability-ra.csv");
        List<string> departures = [];
        foreach (Process process in ProcessCatalogue.Handbook)
        {
            if (Rows[process.Name].Ra is not { } row)
            {
                continue;
            }

            PrintedRow[] bands = [.. source.Rows.Where(band => band["row"] == row)];
            bands.Should().NotBeEmpty("{0}", process.Name);
            decimal routine = Ra(process.RoutineRa);
            if (!bands.Any(band => band.Number("finest") <= routine && routine <= band.Number("coarsest")))
            {
                departures.Add($"{process.Name} routine Ra {routine}");
            }

            if (bands.Min(band => band.Number("finest")) > Ra(process.SpecialRa))
            {
                departures.Add($"{process.Name} special Ra {Ra(process.SpecialRa)}");
            }
        }

        departures.Distinct().Should().BeEmpty();
    }

    [Fact]
    public void Handbook_EveryProcess_IsOrderedInItself()
    {
        foreach (Process process in ProcessCatalogue.Handbook)
        {
            (process.SpecialGrade is null || process.SpecialGrade < process.RoutineGrade).Should().BeTrue("special is finer than routine: {0}", process.Name);
            process.SpecialRa.Nanometres.Should().BeLessThanOrEqualTo(process.RoutineRa.Nanometres, process.Name);
            process.LeftRa.Nanometres.Should().BeGreaterThanOrEqualTo(process.RoutineRa.Nanometres, process.Name);
            process.LeftGrade.Should().BeGreaterThanOrEqualTo(process.SpecialGrade ?? process.RoutineGrade, process.Name);
            process.EnterGrade.Should().BeGreaterThanOrEqualTo(process.RoutineGrade, process.Name);
            process.Smallest.Should().BeLessThan(process.Largest, process.Name);
            process.MostStockAt(process.Smallest).Picometres.Should().BePositive(process.Name);
        }
    }

    [Fact]
    public void SurfaceState_EveryProcessAtEverySize_HasARow()
    {
        foreach (string name in ProcessCatalogue.Handbook.Select(process => process.Name).Append("bar").Append("casting").Distinct())
        {
            foreach (Length size in Sizes)
            {
                SurfaceState state = SurfaceState.After(name, size);
                state.RzMicrometres.Should().BePositive();
                state.ErrorShare.Should().BeInRange(0.001, 1);
            }
        }
    }

    // The order of the printed rows: finer work leaves a finer surface (Kosilova and Meshcheryakov; from memory).
    [Theory]
    [InlineData("casting", "rough boring", "semi-finish boring", "finish boring", "fine boring")]
    [InlineData("twist drilling", "core drilling", "reaming", "finish reaming")]
    [InlineData("rough internal grinding", "internal grinding", "honing", "lapping")]
    [InlineData("bar", "rough turning", "finish turning", "fine turning")]
    [InlineData("rough cylindrical grinding", "cylindrical grinding", "fine cylindrical grinding", "superfinishing")]
    public void SurfaceState_DownALadder_GetsFiner(params string[] ladder)
    {
        foreach (Length size in Sizes)
        {
            if (size > Length.FromMillimetres(10))
            {
                ladder.Select(name => SurfaceState.After(name, size)).Select(state => state.RzMicrometres + state.LayerMicrometres).Should().BeInDescendingOrder();
            }
        }
    }

    [Fact]
    public void CutTime_EveryProcessInEveryGroup_TakesTimeAndCanBeExplained()
    {
        foreach (Process process in ProcessCatalogue.Handbook)
        {
            string[] groups = process.Groups.Count > 0 ? [.. process.Groups.Where(group => group != "H")] : ["P1", "P2", "P3", "M", "K1", "K2", "N1", "N2", "S1", "S2", "O"];
            foreach (string group in groups)
            {
                Length size = new(Math.Min(process.Largest.Picometres, Math.Max(process.Smallest.Picometres, Length.FromMillimetres(20).Picometres)));
                Cut cut = new(process, CuttingData.For(group), size, size, Stock.FromMicrometres(100), process.RoutineRa, Effort.Routine);
                CutTime time = CutTime.For(cut);
                time.Minutes.Should().BeInRange(0.001, 120, "{0} in {1}", process.Name, group);
                time.Explain(cut).Should().Contain("min");
                CutTime.For(cut with { Effort = Effort.Special }).Minutes.Should().BeGreaterThan(time.Minutes);
            }
        }
    }

    private static int Number(ToleranceGrade grade) => int.Parse(grade.Symbol, System.Globalization.CultureInfo.InvariantCulture);

    private static decimal Ra(Roughness roughness) => roughness.Nanometres / 1000m;
}
