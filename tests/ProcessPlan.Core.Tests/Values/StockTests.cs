using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public sealed class StockTests
{
    [Fact]
    public void Contract_ThreeStocks_Holds() =>
        OrderedValues.ShouldHoldTheContract(new Stock(0), static () => [new(-1), new(0), Stock.FromMicrometres(120)]);

    [Fact]
    public void Format_OnDiameter_IsExactMillimetres()
    {
        Stock.FromMicrometres(120).Format(3).Should().Be("0.120");
        Stock.FromMicrometres(120).ToString().Should().Be("0.12 mm");
        Stock.FromMicrometres(1500).ToMillimetres().Should().Be(1.5);
        (Stock.FromMicrometres(120) + Stock.FromMicrometres(30) - Stock.FromMicrometres(50)).Should().Be(Stock.FromMicrometres(100));
    }
}
