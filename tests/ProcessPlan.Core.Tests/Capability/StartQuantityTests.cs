using ProcessPlan.Core.Capability;

namespace ProcessPlan.Core.Tests.Capability;

public class StartQuantityTests
{
    // The definition itself, summed the other way round: P(X ≥ q) for X binomial with n pieces and the yield.
    [Theory]
    [InlineData(1, 0.9987)]
    [InlineData(1, 0.9)]
    [InlineData(50, 0.9987)]
    [InlineData(200, 0.9986)]
    [InlineData(40, 0.95)]
    [InlineData(1000, 0.9946)]
    [InlineData(12, 0.5)]
    public void For_AYield_IsTheFewestPiecesThatSufficeInNinetyFiveOfAHundredLots(int quantity, double yield)
    {
        int start = StartQuantity.For(quantity, yield);

        AtLeast(quantity, start, yield).Should().BeGreaterThanOrEqualTo(0.95);
        if (start > quantity)
        {
            AtLeast(quantity, start - 1, yield).Should().BeLessThan(0.95);
        }
    }

    [Fact]
    public void For_AOneOffOfARoutineRoute_StartsOne() => StartQuantity.For(1, 0.9986).Should().Be(1);

    [Fact]
    public void For_NoScrap_StartsTheQuantity() => StartQuantity.For(1000, 1).Should().Be(1000);

    private static double AtLeast(int good, int started, double yield)
    {
        double sum = 0;
        double logChoose = 0;
        for (int bad = 0; bad <= started - good; bad++)
        {
            sum += Math.Exp(logChoose + bad * Math.Log(1 - yield) + (started - bad) * Math.Log(yield));
            logChoose += Math.Log(started - bad) - Math.Log(bad + 1);
        }

        return sum;
    }
}
