using CsCheck;
using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Tests.Text;

public sealed class ExactDecimalTests
{
    [Theory]
    [InlineData(25, 1, 10, true, 25)]
    [InlineData(25, 2, 10, false, 0)]
    [InlineData(5, 1, 2, true, 1)]
    [InlineData(long.MaxValue, 0, 1, true, long.MaxValue)]
    [InlineData(long.MaxValue, 0, 2, false, 0)]
    [InlineData(long.MaxValue, 18, 1_000_000_000_000_000_000, true, long.MaxValue)]
    [InlineData(-25, 1, 10, true, -25)]
    public void TryScale_WholeOrNot_SaysWhich(long units, int places, long factor, bool whole, long value)
    {
        new ExactDecimal(units, places).TryScale(factor, out long scaled).Should().Be(whole);
        scaled.Should().Be(value);
    }

    [Fact]
    public void TryScale_AnyNumber_AgreesWithDecimal() => Gen.Select(Gen.Int, Gen.Int[0, 9], Gen.Int[1, 1_000_000_000]).Sample(static (units, places, factor) =>
    {
        decimal product = (decimal)units * factor / ExactDecimal.PowerOfTen(places);
        new ExactDecimal(units, places).TryScale(factor, out long scaled).Should().Be(product == decimal.Truncate(product));
        scaled.Should().Be(product == decimal.Truncate(product) ? (long)product : 0);
    });

    [Fact]
    public void PowerOfTen_UpToNineteen_IsExact()
    {
        ExactDecimal.PowerOfTen(0).Should().Be(1);
        ExactDecimal.PowerOfTen(19).Should().Be(10_000_000_000_000_000_000);
        Action twenty = static () => ExactDecimal.PowerOfTen(20);
        twenty.Should().Throw<OverflowException>();
    }

    [Fact]
    public void ToString_TrailingZeros_AreLeftOut()
    {
        new ExactDecimal(2500, 2).ToString().Should().Be("25");
        new ExactDecimal(255, 1).ToDouble().Should().Be(25.5);
    }
}
