using CsCheck;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public sealed class EstimateTests
{
    private static readonly Length Micrometre = Length.FromMicrometres(1);

    [Theory]
    [InlineData(12.3, 12, 13)]
    [InlineData(12.0, 12, 12)]
    [InlineData(-0.5, -1, 0)]
    [InlineData(0.1 + 0.2 + 0.7, 1, 1)]
    [InlineData(3 * 1.1 - 0.3, 3, 3)]
    public void Round_ToAMicrometre_GoesDownOrUp(double estimate, long down, long up)
    {
        new Estimate(estimate).RoundDown(Micrometre).Should().Be(Stock.FromMicrometres(down));
        new Estimate(estimate).RoundUp(Micrometre).Should().Be(Stock.FromMicrometres(up));
    }

    [Fact]
    public void Round_AnyEstimate_EnclosesItWithinOneStep() => Gen.Double[-1e6, 1e6].Sample(static value =>
    {
        const double Slack = 1e-4;
        double down = new Estimate(value).RoundDown(Micrometre).Picometres / 1e6;
        double up = new Estimate(value).RoundUp(Micrometre).Picometres / 1e6;
        down.Should().BeLessThanOrEqualTo(value + Slack);
        up.Should().BeGreaterThanOrEqualTo(value - Slack);
        (up - down).Should().BeInRange(0, 1);
    });

    [Fact]
    public void RoundUp_NotANumber_Throws()
    {
        Action round = static () => new Estimate(double.NaN).RoundUp(Micrometre);
        round.Should().Throw<OverflowException>();
    }
}
