using System.Globalization;
using CsCheck;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Tests.Paper;

public class RulerTests
{
    private static readonly Ruler Millimetres = new(LengthUnit.Millimetre);
    private static readonly Ruler Inches = new(LengthUnit.Inch);

    private static SizeWindow Window(decimal min, decimal max) => new(Length.FromMillimetres(min), Length.FromMillimetres(max));

    [Theory]
    [InlineData(25.000, 25.021, "25.000", "25.021", "0.9843", "0.9850")]
    [InlineData(25.000, 25.004, "25.000", "25.004", "0.9843", "0.9844")]
    [InlineData(6.35, 6.3627, "6.350", "6.3627", "0.2500", "0.2505")]
    [InlineData(25.4, 25.4, "25.400", "25.400", "1.0000", "1.0000")]
    [InlineData(25.0000, 25.0005, "25.000", "25.0005", "0.98426", "0.98427")]
    public void Limits_are_exact_or_rounded_inwards(decimal min, decimal max, string leastMm, string mostMm, string leastIn, string mostIn)
    {
        Millimetres.Limits(Window(min, max)).Should().Be((mostMm, leastMm));
        Inches.Limits(Window(min, max)).Should().Be((mostIn, leastIn));
    }

    /// <summary>The law behind the examples: no limit on the screen lets a size through that the drawing does not.</summary>
    [Fact]
    public void Limits_in_inches_lie_within_the_drawing_and_hold_the_aim()
    {
        Gen.Select(Gen.Long[1_000_000, 3_000_000_000_000], Gen.Long[100_000, 2_000_000_000], Gen.Double[0, 1]).Sample(static (min, width, share) =>
        {
            SizeWindow window = new(new Length(min), new Length(min + width));
            (string most, string least) = Inches.Limits(window);
            decimal aim = Read(Inches.Aim(new Length(min + (long)(share * width)), window));
            Read(least).Should().BeGreaterThanOrEqualTo(window.Min.Millimetres).And.BeLessThan(Read(most));
            Read(most).Should().BeLessThanOrEqualTo(window.Max.Millimetres);
            aim.Should().BeInRange(Read(least), Read(most));
        });

        static decimal Read(string inches) => decimal.Parse(inches, CultureInfo.InvariantCulture) * 25.4m;
    }

    [Fact]
    public void Deviations_carry_their_unit_and_round_into_the_tolerance()
    {
        Millimetres.Upper(Deviation.FromMicrometres(21)).Should().Be("+21 µm");
        Millimetres.Lower(Deviation.FromMicrometres(-20)).Should().Be("-20 µm");
        Inches.Upper(Deviation.FromMicrometres(21)).Should().Be("+0.00082 in");
        Inches.Lower(Deviation.FromMicrometres(21)).Should().Be("+0.00083 in");
        Inches.Lower(Deviation.FromMicrometres(-20)).Should().Be("-0.00078 in");
        Inches.Upper(Deviation.FromMicrometres(-20)).Should().Be("-0.00079 in");
        Inches.Upper(new Deviation(12_700_000)).Should().Be("+0.0005 in");
        Inches.Width(Deviation.FromMicrometres(21)).Should().Be("0.00082 in");
        Inches.Lower(default).Should().Be("0 in");
    }

    [Fact]
    public void Stock_is_widened_so_that_neither_extreme_is_left_out()
    {
        Stock least = new(99_600_000);
        Stock most = new(172_200_000);
        Millimetres.Stock(least, most).Should().Be("0.099-0.173");
        Inches.Stock(least, most).Should().Be("0.0039-0.0068");
    }

    [Fact]
    public void Clearances_of_a_fit_are_widened_in_inches()
    {
        Fit fit = new(Window(40, 40.025m), Window(40.002m, 40.018m));
        Millimetres.Clearances(fit).Should().Be("-18 to +23 µm");
        Inches.Clearances(fit).Should().Be("-0.00071 to +0.00091 in");
    }

    [Theory]
    [InlineData(25, "0.025", "1")]
    [InlineData(50, "0.05", "2")]
    [InlineData(100, "0.1", "4")]
    [InlineData(200, "0.2", "8")]
    [InlineData(400, "0.4", "16")]
    [InlineData(800, "0.8", "32")]
    [InlineData(1_600, "1.6", "63")]
    [InlineData(3_200, "3.2", "125")]
    [InlineData(6_300, "6.3", "250")]
    [InlineData(12_500, "12.5", "500")]
    [InlineData(25_000, "25", "1000")]
    [InlineData(50_000, "50", "2000")]
    public void A_preferred_roughness_is_shown_by_its_pair(long nanometres, string micrometres, string microinches) =>
        Roughness_that_is_not_preferred_rounds_downwards(nanometres, micrometres, microinches);

    [Theory]
    [InlineData(812, "0.812", "32")]
    [InlineData(3_175, "3.175", "125")]
    [InlineData(406, "0.406", "16")]
    public void Whole_microinches_are_shown_as_they_were_asked(long nanometres, string micrometres, string microinches) =>
        Roughness_that_is_not_preferred_rounds_downwards(nanometres, micrometres, microinches);

    [Fact]
    public void Rz_has_no_pairs() => Inches.Ra(Roughness.Rz(6_300)).Should().Be("248");

    [Theory]
    [InlineData(801, "0.801", "31")]
    [InlineData(799, "0.799", "31")]
    [InlineData(60, "0.06", "2.3")]
    [InlineData(12_510, "12.51", "492")]
    public void Roughness_that_is_not_preferred_rounds_downwards(long nanometres, string micrometres, string microinches)
    {
        Millimetres.Ra(Roughness.Ra(nanometres)).Should().Be(micrometres);
        Inches.Ra(Roughness.Ra(nanometres)).Should().Be(microinches);
    }

    [Fact]
    public void A_coating_is_written_from_least_to_most()
    {
        Millimetres.Coat(Length.FromMicrometres(8), Length.FromMicrometres(12)).Should().Be("8-12 µm");
        Inches.Coat(Length.FromMicrometres(8), Length.FromMicrometres(12)).Should().Be("314-473 µin");
    }

    [Fact]
    public void A_table_shows_no_more_than_four_decimals_of_a_millimetre()
    {
        Millimetres.Range(new SizeWindow(new Length(6_350_000_001), new Length(6_362_799_999))).Should().Be("6.3501-6.3627");
    }
}
