using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Tooling;

public class SizedCutTests
{
    private static readonly ShopFloor Floor = HandbookShop.Load();

    // AND10387, tolerance of drilled holes: +.004 to .125 in, +.005 to .250, +.006 to .500, +.008 to .750, +.010 to 1.000, +.012 to 2.000; all -.001.
    [Fact]
    public void Predict_EveryDrill_StaysWithinTheStandardToleranceOfDrilledHoles()
    {
        (decimal UpTo, decimal Plus)[] printed = [(.125m, .004m), (.250m, .005m), (.500m, .006m), (.750m, .008m), (1.000m, .010m), (2.000m, .012m)];
        foreach (Tool drill in Floor.Tools(ToolUse.Drill))
        {
            decimal plus = printed.First(row => drill.Stamped.Millimetres <= row.UpTo * 25.4m).Plus;
            (Deviation least, Deviation most) = SizedCut.Predict(drill, "P2", careful: false).Over;
            least.Should().BeGreaterThan(default, "a twist drill cuts oversize: {0}", drill.Label);
            most.Should().BeGreaterThan(least);
            most.ToMicrometres().Should().BeLessThanOrEqualTo((double)(plus * 25_400m), "{0}", drill.Label);
        }
    }

    // Common practice, no source: sharp reamer in steel 0 to +10 µm with emulsion, 0 to +5 with oil and little run-out; plastics close up.
    [Theory]
    [InlineData("P2", false, 0, 10)]
    [InlineData("P2", true, 0, 3)]
    [InlineData("M", false, -3, 10)]
    [InlineData("O", false, -20, -5)]
    public void Predict_A20H7Reamer_CutsOverItsOwnSizeNotItsStamp(string group, bool careful, int least, int most)
    {
        Tool reamer = Floor.Tools(ToolUse.Ream).Single(tool => tool.Label == "machine reamer 20 H7");
        SizedCut cut = SizedCut.Predict(reamer, group, careful);
        cut.Sizes.Min.Should().Be(reamer.Own.Min + Deviation.FromMicrometres(least));
        cut.Sizes.Max.Should().Be(reamer.Own.Max + Deviation.FromMicrometres(careful ? Math.Min(most + 1, 4) : most), "0.15·21 rounded up is 4");
    }

    [Fact]
    public void Predict_ACoreDrill_CutsItsOwnSizeUpToIT10Over()
    {
        Tool drill = Floor.Tools(ToolUse.CoreDrill).Single(tool => tool.Stamped == Length.FromMillimetres(15.75m));
        SizedCut.Predict(drill, "P2", careful: false).Sizes.Should().Be(new SizeWindow(Length.FromMillimetres(15.75m), Length.FromMillimetres(15.82m)));
        SizedCut.Predict(drill, "P2", careful: false).Origin.Standing.Should().Be(Standing.CommonPractice);
    }
}
