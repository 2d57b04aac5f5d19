using ProcessPlan.Core.Capability;

namespace ProcessPlan.Core.Tests.Capability;

public class NormalYieldTests
{
    // Standard normal distribution, as every printed table of it has it (Abramowitz and Stegun, table 26.1).
    [Theory]
    [InlineData(1, 0.6826895)]
    [InlineData(1.96, 0.9500042)]
    [InlineData(2, 0.9544997)]
    [InlineData(2.5758293, 0.99)]
    [InlineData(3, 0.9973002)]
    public void Of_SymmetricLimits_IsThePrintedShare(double sigmas, double share) =>
        NormalYield.Of(-sigmas, sigmas, 0, 1).Should().BeApproximately(share, 2e-7);

    [Fact]
    public void Of_AShiftOf1Point5Sigma_Loses6Point7PercentAtThree() =>
        NormalYield.Of(-3, 3, 1.5, 1).Should().BeApproximately(0.9331894, 2e-6); // Φ(1.5) - Φ(-4.5)

    [Fact]
    public void Of_NoSpread_IsRefused() => FluentActions.Invoking(() => NormalYield.Of(0, 1, 0.5, 0)).Should().Throw<ArgumentOutOfRangeException>();
}
