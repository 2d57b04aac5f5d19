using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Inspection;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Inspection;

public class InstrumentTests
{
    // The default choice by grade at 25 to 50 mm with U at most T/5: common practice, no source.
    [Theory]
    [InlineData(true, 12, "caliper")]
    [InlineData(true, 8, "inside micrometer")]
    [InlineData(true, 7, "bore gauge")]
    [InlineData(true, 6, "electronic plug")]
    [InlineData(true, 5, "electronic plug")]
    [InlineData(true, 4, "length-measuring machine")]
    [InlineData(false, 12, "caliper")]
    [InlineData(false, 9, "micrometer")]
    [InlineData(false, 7, "comparator snap gauge")]
    [InlineData(false, 6, "comparator snap gauge")]
    [InlineData(false, 5, "air gauge")]
    public void For_AGradeAt40_IsTheUsualInstrument(bool inside, int grade, string name)
    {
        Iso286.TryWidth(Length.FromMillimetres(40), ToleranceGrade.It(grade), out Deviation width).Should().BeTrue();
        (Instrument instrument, bool good) = Instrument.For(inside, Length.FromMillimetres(40), width);
        instrument.Name.Should().Be(name);
        good.Should().BeTrue();
        instrument.RatioTo(width).Should().BeGreaterThanOrEqualTo(5);
    }

    [Fact]
    public void For_ATighterTolerance_IsNeverQuicker()
    {
        foreach (bool inside in (bool[])[true, false])
        {
            foreach (int size in (int[])[1, 2, 5, 8, 20, 60, 150, 180, 240])
            {
                double last = double.PositiveInfinity;
                for (int tolerance = 1; tolerance <= 400; tolerance++)
                {
                    (Instrument instrument, bool good) = Instrument.For(inside, Length.FromMillimetres(size), Deviation.FromMicrometres(tolerance));
                    good.Should().Be(instrument.RatioTo(Deviation.FromMicrometres(tolerance)) >= Instrument.LeastRatio);
                    instrument.MinutesPerCheck.Should().BeLessThanOrEqualTo(last, "{0} µm at {1}", tolerance, size);
                    last = instrument.MinutesPerCheck;
                }
            }
        }
    }

    [Fact]
    public void For_NothingGoodEnough_IsTheMostAccurateAndSaysSo()
    {
        (Instrument instrument, bool good) = Instrument.For(inside: true, Length.FromMillimetres(40), Deviation.FromMicrometres(1));
        good.Should().BeFalse();
        instrument.Uncertainty.Should().Be(Instrument.Handbook.Where(own => own.Inside && own.To.Millimetres >= 40).Min(own => own.Uncertainty));
    }

    [Theory]
    [InlineData("twist drilling", Effort.Routine, "first piece, then 1 in 10")]
    [InlineData("rough boring", Effort.Routine, "first piece, then 1 in 5")]
    [InlineData("honing", Effort.Routine, "first piece, then every second")]
    [InlineData("fine boring", Effort.Special, "every piece before and after the last cut")]
    public void Words_OfAnOperation_SayHowOften(string process, Effort effort, string words) =>
        Checks.Words(ProcessCatalogue.Handbook.First(row => row.Name == process && row.Kind == FeatureKind.Hole), effort).Should().Be(words);
}
