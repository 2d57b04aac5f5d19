using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Standards;

public class RoughnessPairsTests
{
    // Source of the pairs: Ceratizit, Surface quality, catalogue p. E31 (Rz 4-6.3 beside Ra 0.8, 16-25 beside Ra 3.2).
    [Theory]
    [InlineData(250, 25)]
    [InlineData(630, 50)]
    [InlineData(1_000, 100)]
    [InlineData(1_600, 200)]
    [InlineData(2_500, 400)]
    [InlineData(4_000, 400)]
    [InlineData(6_299, 400)]
    [InlineData(6_300, 800)]
    [InlineData(10_000, 1_600)]
    [InlineData(16_000, 1_600)]
    [InlineData(25_000, 3_200)]
    [InlineData(40_000, 6_300)]
    [InlineData(63_000, 12_500)]
    [InlineData(100_000, 25_000)]
    [InlineData(160_000, 50_000)]
    [InlineData(500_000, 50_000)]
    public void ToRa_AnRz_IsTheLargestRaThatHoldsIt(long rz, long ra) =>
        RoughnessPairs.ToRa(Roughness.Rz(rz)).Should().Be(Roughness.Ra(ra));

    [Fact]
    public void ToRa_AnRzFinerThanTheTable_IsNone() => RoughnessPairs.ToRa(Roughness.Rz(249)).Should().BeNull();

    [Fact]
    public void ToRa_AnRaOrANumber_IsItself()
    {
        RoughnessPairs.ToRa(Roughness.Ra(810)).Should().Be(Roughness.Ra(810));
        RoughnessPairs.ToRa(Roughness.N(6)).Should().Be(Roughness.N(6));
    }

    [Fact]
    public void Pairs_OfTheClasses_AreTheRaOfISO1302()
    {
        foreach (TableRow row in PublishedTable.Load("ra-rz-pairs.txt").Rows)
        {
            Roughness.TryRead(row["class"], out Roughness number, out _).Should().BeTrue();
            number.ToMicrometres().Should().Be(row.Double("ra"));
            row.Double("rz").Should().BeLessThanOrEqualTo(row.Double("rz-to"));
        }
    }

    // Source: Dandong Foundry, comparison of surface roughness values by DIN ISO 1302 and DIN 4768: the band of Rz beside each Ra.
    [Theory]
    [InlineData(25, 100, 800)]
    [InlineData(50, 250, 1_600)]
    [InlineData(100, 400, 2_500)]
    [InlineData(200, 800, 4_000)]
    [InlineData(400, 1_600, 6_300)]
    [InlineData(800, 3_150, 12_500)]
    [InlineData(1_600, 6_300, 20_000)]
    [InlineData(3_200, 12_500, 31_500)]
    [InlineData(6_300, 25_000, 63_000)]
    [InlineData(12_500, 40_000, 100_000)]
    [InlineData(25_000, 80_000, 160_000)]
    [InlineData(50_000, 160_000, 250_000)]
    public void ToRa_AnyRz_LiesInTheBandOfASecondSource(long ra, long least, long most)
    {
        TableRow row = PublishedTable.Load("ra-rz-pairs.txt").Rows.Single(row => (long)(row.Decimal("ra") * 1000) == ra);
        ((long)(row.Decimal("rz") * 1000)).Should().BeInRange(least, most);
        ((long)(row.Decimal("rz-to") * 1000)).Should().BeInRange(least, most);
    }

    [Fact]
    public void Remark_OnTheConversion_SaysThatItIsNoLaw()
    {
        RoughnessPairs.Remark.Should().Be(
            "There is no exact law between Ra and Rz: the pairs are a maker's table, so measure the one that the drawing asks for.");
        RoughnessPairs.Citation.ToString().Should().Be("Ceratizit, Surface quality, catalogue p. E31");
    }
}
