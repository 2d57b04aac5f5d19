using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public sealed class MinutesTests
{
    [Theory]
    [InlineData(0, "0.00")]
    [InlineData(0.8, "0.80")]
    [InlineData(9.994, "9.99")]
    [InlineData(9.996, "10.0")]
    [InlineData(10, "10.0")]
    [InlineData(99.94, "99.9")]
    [InlineData(99.96, "100")]
    [InlineData(1234.4, "1234")]
    public void Format_Minutes_ShowsThreeDigits(double minutes, string text)
    {
        new Minutes(minutes).Format().Should().Be(text);
        new Minutes(minutes).ToString().Should().Be(text + " min");
    }

    [Fact]
    public void Arithmetic_SumAndMultiple_AreThoseOfTheValues()
    {
        (new Minutes(1.5) + new Minutes(2)).Should().Be(new Minutes(3.5));
        (new Minutes(1.5) * 4).Should().Be(new Minutes(6));
    }
}
