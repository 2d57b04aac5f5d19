using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Standards;

public class Iso2768Tests
{
    // Four publications print these rows alike: the head of the file names them.
    [Fact]
    public void Find_EveryPrintedRow_IsThePrintedDeviation()
    {
        PrintedSource source = new("iso2768.csv");
        source.Rows.Should().HaveCount(30);
        foreach (PrintedRow row in source.Rows)
        {
            GeneralTolerance tolerance = (GeneralTolerance)"fmcv".IndexOf(row["class"], StringComparison.Ordinal);
            foreach (Length size in row.Sizes())
            {
                Deviation printed = Deviation.FromMicrometres((long)(row.Number("plusMinusMm")!.Value * 1000));
                Iso2768.Find(size, tolerance).Should().Be(printed, "{0}", row);
            }
        }
    }

    [Theory]
    [InlineData(0.5, GeneralTolerance.Fine, 50)]
    [InlineData(0.499, GeneralTolerance.Fine, null)]
    [InlineData(3, GeneralTolerance.VeryCoarse, null)]
    [InlineData(3.001, GeneralTolerance.VeryCoarse, 500)]
    [InlineData(2000, GeneralTolerance.Fine, 500)]
    [InlineData(2000.001, GeneralTolerance.Fine, null)]
    [InlineData(4000, GeneralTolerance.Medium, 2000)]
    [InlineData(4000.001, GeneralTolerance.Medium, null)]
    [InlineData(0, GeneralTolerance.Medium, null)]
    public void Find_AtTheEnds_IncludesThem(double size, GeneralTolerance tolerance, int? micrometres)
    {
        Deviation? expected = micrometres is { } um ? Deviation.FromMicrometres(um) : null;
        Iso2768.Find(Length.FromMillimetres((decimal)size), tolerance).Should().Be(expected);
    }

    [Theory]
    [InlineData(GeneralTolerance.Fine, "ISO 2768-f")]
    [InlineData(GeneralTolerance.Medium, "ISO 2768-m")]
    [InlineData(GeneralTolerance.Coarse, "ISO 2768-c")]
    [InlineData(GeneralTolerance.VeryCoarse, "ISO 2768-v")]
    public void Name_OfAClass_IsTheOneOnTheDrawing(GeneralTolerance tolerance, string name) => Iso2768.Name(tolerance).Should().Be(name);

    [Fact]
    public void Cite_ASize_SaysTableAndRow()
    {
        Iso2768.Cite(Length.FromMillimetres(40), GeneralTolerance.Medium).ToString()
            .Should().Be("ISO 2768-1:1989, Table 1, over 30 to 120 mm, m");
        Iso2768.Cite(Length.FromMillimetres(0.5m), GeneralTolerance.Fine).ToString()
            .Should().Be("ISO 2768-1:1989, Table 1, 0.5 to 3 mm, f");
        FluentActions.Invoking(() => Iso2768.Cite(Length.FromMillimetres(2001), GeneralTolerance.Fine))
            .Should().Throw<ArgumentOutOfRangeException>().WithMessage("ISO 2768-f gives no deviation at this size.*");
    }
}
