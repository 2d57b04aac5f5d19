using System.Globalization;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public sealed class MoneyTests
{
    [Theory]
    [InlineData("12.345", "12.35")]
    [InlineData("12.344999", "12.34")]
    [InlineData("-12.345", "-12.35")]
    [InlineData("0", "0.00")]
    [InlineData("1234567.8", "1234567.80")]
    [InlineData("0.005", "0.01")]
    public void Format_Amount_RoundsToTheCentHalfAwayFromZero(string amount, string text)
    {
        Money money = new(decimal.Parse(amount, CultureInfo.InvariantCulture), "EUR");
        money.Format().Should().Be(text);
        money.ToString().Should().Be(text + " EUR");
        money.Rounded.Should().Be(decimal.Parse(text, CultureInfo.InvariantCulture));
    }

    [Fact]
    public void ToString_Default_IsNothingInNoCurrency() => default(Money).ToString().Should().Be("0.00");

    [Fact]
    public void Equals_OtherCurrency_IsFalse() => new Money(1m, "EUR").Should().NotBe(new Money(1m, "USD"));
}
