using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Standards;

public class Din1420Tests
{
    // DIN 1420, H classes to 18 mm, as the tool makers print it: upper/lower in µm on the nominal size.
    [Theory]
    [InlineData("H6", "5/2", "6/3", "7/3", "9/5")]
    [InlineData("H7", "8/4", "10/5", "12/6", "15/8")]
    [InlineData("H8", "11/6", "15/8", "18/10", "22/12")]
    [InlineData("H9", "21/12", "25/14", "30/17", "36/20")]
    [InlineData("H10", "34/20", "40/23", "49/28", "59/34")]
    [InlineData("H11", "51/30", "63/36", "76/44", "93/54")]
    [InlineData("H12", "85/50", "102/60", "127/74", "153/90")]
    public void ReamerFor_HClassesTo18_AreThePrintedCells(string hole, params string[] cells)
    {
        int[] sizes = [2, 5, 8, 14];
        sizes.Select(size => Reamer(size, hole)).Select(reamer => $"{reamer.Upper}/{reamer.Lower}").Should().Equal(cells);
    }

    // Two makers' catalogues; the head of the file names them.
    [Fact]
    public void ReamerFor_EveryCatalogueRow_IsThePrintedOne()
    {
        PrintedSource source = new("din1420.csv");
        source.Rows.Should().HaveCount(42);
        foreach (PrintedRow row in source.Rows)
        {
            foreach (Length size in row.Sizes())
            {
                SizeWindow reamer = Din1420.ReamerFor(Hole(size, row["hole_class"]));
                (reamer.Max - size).Should().Be(row.Micrometres("reamerUpperUm")!.Value, "{0}", row);
                if (row.Micrometres("reamerLowerUm") is { } lower)
                {
                    (reamer.Min - size).Should().Be(lower, "{0}", row);
                }
            }
        }
    }

    [Theory]
    [InlineData(10, "D8", "10.058", "10.050")] // Dormer, Reaming Tolerance Limits, worked example
    [InlineData(8, "H7", "8.012", "8.006")] // DIN 1420, printed cell
    [InlineData(20, "K7", "20.002", "19.994")] // derived by the rule from ISO 286 limits +6/-15
    [InlineData(20, "JS7", "20.007", "19.999")] // derived: 0.15·21 = 3.15, up to the half 3.5 that makes 10.5 - 3.5 whole
    public void ReamerFor_TheWorkedExamples_HasTheirLimits(int size, string hole, string max, string min)
    {
        SizeWindow reamer = Din1420.ReamerFor(Hole(Length.FromMillimetres(size), hole));
        reamer.Max.Format(3).Should().Be(max);
        reamer.Min.Format(3).Should().Be(min);
    }

    [Theory]
    [InlineData(40, 6, 14)] // exactly 6 and 14: never a micrometre more
    [InlineData(180, 27, 63)] // 0.35·180 in binary floating point is 62.999…
    [InlineData(20, 3, 7)]
    [InlineData(21, 4, 8)]
    [InlineData(100, 15, 35)]
    public void ReamerFor_AWholeTolerance_RoundsTheSharesUpAsIntegers(int tolerance, int fifteen, int thirtyFive)
    {
        Length size = Length.FromMillimetres(50);
        SizeWindow hole = new(size, size + Deviation.FromMicrometres(tolerance));
        SizeWindow reamer = Din1420.ReamerFor(hole);
        (hole.Max - reamer.Max).Should().Be(Deviation.FromMicrometres(fifteen));
        reamer.Width.Should().Be(Deviation.FromMicrometres(thirtyFive));
    }

    [Fact]
    public void ReamerFor_EveryTolerance_LeavesAReserveAboveAndBelow()
    {
        for (int tolerance = 2; tolerance <= 1000; tolerance++)
        {
            Length size = Length.FromMillimetres(25);
            SizeWindow hole = new(size, size + Deviation.FromMicrometres(tolerance));
            SizeWindow reamer = Din1420.ReamerFor(hole);
            reamer.Max.Should().BeLessThan(hole.Max);
            reamer.Min.Should().BeGreaterThanOrEqualTo(hole.Min, "tolerance {0}", tolerance);
            (hole.Max - reamer.Max).Picometres.Should().BeLessThan(15 * tolerance * 10_000L + Length.PicometresPerMicrometre);
        }
    }

    private static (long Upper, long Lower) Reamer(int size, string hole)
    {
        Length nominal = Length.FromMillimetres(size);
        SizeWindow reamer = Din1420.ReamerFor(Hole(nominal, hole));
        return ((reamer.Max - nominal).Picometres / Length.PicometresPerMicrometre, (reamer.Min - nominal).Picometres / Length.PicometresPerMicrometre);
    }

    private static SizeWindow Hole(Length nominal, string hole)
    {
        ToleranceClass.TryRead(hole, out ToleranceClass toleranceClass, out _).Should().BeTrue();
        return Iso286.Find(nominal, toleranceClass).LimitsAt(nominal);
    }
}
