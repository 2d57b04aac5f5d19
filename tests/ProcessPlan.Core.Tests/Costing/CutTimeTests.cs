using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Tests.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Costing;

public class CutTimeTests
{
    private static readonly CuttingData Steel = CuttingData.For("P2");

    // f = √(32·Ra·r/1000) = 0.202 mm for Ra 1.6 µm and a nose of 0.8 mm; real over ideal roughness 1.25 (Groover; from memory) makes it 0.181.
    [Fact]
    public void For_TurningToRa1Point6_FeedsByTheNoseRadius()
    {
        CutTime time = CutTime.For(Cut("finish turning", 30, 60, 500, Roughness.Ra(1600)));
        (time.Feed * Math.Sqrt(1.25)).Should().BeApproximately(0.202, 0.0005);
        time.Feed.Should().BeApproximately(0.181, 0.0005);
    }

    // Textbook relation A = ½·D/tan(σ/2), 118°: 0.300·D; then 2 mm overrun (common practice, no source).
    [Theory]
    [InlineData(5)]
    [InlineData(10)]
    [InlineData(20)]
    public void For_Drilling_TravelsTheDepthTheTipAndTheOverrun(int diameter)
    {
        CutTime time = CutTime.For(Cut("twist drilling", diameter, 40, null, Roughness.Ra(6300)));
        (time.Travel - 40 - 2).Should().BeApproximately(diameter / 2.0 / Math.Tan(59 * Math.PI / 180), 0.002 * diameter);
    }

    // t = (L + A + overrun)/(f·n), n = 1000·v/(π·D): 20 m/min and 0.18 mm at 10 mm (drill makers' feed, from memory).
    [Fact]
    public void For_Drilling10MmInC45_IsTheTextbookTime()
    {
        CutTime time = CutTime.For(Cut("twist drilling", 10, 40, null, Roughness.Ra(6300)));
        double revolutions = 1000 * 20 / (Math.PI * 10);
        time.Minutes.Should().BeApproximately((40 + 3 + 2) / (0.18 * revolutions), 1e-9);
        time.Speed.Should().BeApproximately(20, 1e-9);
    }

    // HSS twist drills in steel, mm/rev (from memory): printed sizes take their own feed.
    [Theory]
    [InlineData(2, 0.04)]
    [InlineData(5, 0.10)]
    [InlineData(9.9, 0.10)]
    [InlineData(10, 0.18)]
    [InlineData(15, 0.23)]
    [InlineData(20, 0.28)]
    [InlineData(30, 0.35)]
    public void DrillFeed_APrintedSize_IsThePrintedFeed(double diameter, double feed) =>
        CuttingData.DrillFeed(Length.FromMillimetres((decimal)diameter)).Should().Be(feed);

    // t = 2·L_t·i/(n_w·s): work 20 m/min, an infeed a double stroke of 0.01 mm rough with two of spark-out, 0.004 fine with four, and 0.3 min for
    // approach and dressing (common practice, no source).
    [Theory]
    [InlineData("rough cylindrical grinding", 200, 24, 24)]
    [InlineData("cylindrical grinding", 100, 34, 13.2)]
    public void For_TraverseGrinding_CountsTheStrokesOfTheStock(string process, int micrometres, int strokes, double advance)
    {
        CutTime time = CutTime.For(Cut(process, 40, 100, micrometres, Roughness.Ra(800)));
        time.Passes.Should().Be(strokes);
        time.Feed.Should().BeApproximately(advance, 1e-9);
        time.Minutes.Should().BeApproximately((100 + 40 / 3.0) * strokes / (1000 * 20 / (Math.PI * 40) * advance) + 0.3, 1e-9);
    }

    // Honing in steel 0.01 to 0.05 mm/min on diameter to finish (from memory): 0.08 mm in 1.6 min at 0.05.
    [Fact]
    public void For_Honing_IsTheStockOverTheRate() =>
        CutTime.For(Cut("honing", 40, 60, 80, Roughness.Ra(200))).Minutes.Should().BeApproximately(1.6, 1e-9);

    [Fact]
    public void For_SpecialEffort_TakesHalfAsLongAgain()
    {
        Cut cut = Cut("finish boring", 40, 60, 500, Roughness.Ra(1600));
        CutTime.For(cut with { Effort = Effort.Special }).Minutes.Should().BeApproximately(1.5 * CutTime.For(cut).Minutes, 1e-9);
    }

    [Fact]
    public void For_MoreStock_NeverTakesLess()
    {
        foreach (Process process in ProcessCatalogue.Handbook)
        {
            double last = 0;
            for (int stock = 1; stock < 4000; stock += 7)
            {
                double minutes = CutTime.For(new Cut(process, Steel, Length.FromMillimetres(40), Length.FromMillimetres(40), Stock.FromMicrometres(stock),
                    process.RoutineRa, Effort.Routine)).Minutes;
                minutes.Should().BeGreaterThanOrEqualTo(last, process.Name);
                last = minutes;
            }
        }
    }

    // A maker's printed speeds; the head of the file names the pages. A built-in speed lies within the rows of its group or below them, never above.
    [Fact]
    public void For_EveryGroupWithPrintedRows_IsNeverFasterThanTheMakers()
    {
        List<string> slower = [];
        foreach (IGrouping<string, PrintedRow> group in new PrintedSource("hss-speeds.csv").Rows.GroupBy(row => row["group"]))
        {
            CuttingData own = CuttingData.For(group.Key);
            own.Drill.Should().BeLessThanOrEqualTo(group.Max(row => MetresPerMinute(row, "drill")), group.Key);
            own.Ream.Should().BeLessThanOrEqualTo(group.Max(row => MetresPerMinute(row, "ream")), group.Key);
            Note(group, "drill", own.Drill);
            Note(group, "ream", own.Ream);
        }

        // Listed openly: the lower end of the European ranges lies below the American table for reaming, and for aluminium.
        slower.Should().Equal("P1 ream", "P2 ream", "P3 ream", "K1 ream", "K2 ream", "N1 drill", "N1 ream");

        void Note(IGrouping<string, PrintedRow> group, string column, double own)
        {
            if (own < group.Min(row => MetresPerMinute(row, column)))
            {
                slower.Add($"{group.Key} {column}");
            }
        }
    }

    private static double MetresPerMinute(PrintedRow row, string column) => (double)row.Number(column)!.Value * 0.3048;

    private static Cut Cut(string process, decimal diameter, int extent, int? micrometres, Roughness ra) => new(
        ProcessCatalogue.Handbook.First(row => row.Name == process), Steel,
        Length.FromMillimetres(diameter), Length.FromMillimetres(extent), micrometres is { } stock ? Stock.FromMicrometres(stock) : null, ra, Effort.Routine);
}
