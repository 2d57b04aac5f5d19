using CsCheck;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public sealed class DeviationTests
{
    [Fact]
    public void Contract_ThreeDeviations_Holds() => OrderedValues.ShouldHoldTheContract(
        new Deviation(0), static () => [Deviation.FromMicrometres(-25), new(-1), new(0), Deviation.FromMicrometres(1)]);

    [Theory]
    [InlineData(25_000_000, "25", "+25", "+25 µm")]
    [InlineData(-18_000_000, "-18", "-18", "-18 µm")]
    [InlineData(0, "0", "0", "0 µm")]
    [InlineData(10_500_000, "10.5", "+10.5", "+10.5 µm")]
    [InlineData(-254_000, "-0.254", "-0.254", "-0.254 µm")]
    public void Format_Micrometres_IsExact(long picometres, string plain, string signed, string text)
    {
        Deviation deviation = new(picometres);
        deviation.Format().Should().Be(plain);
        deviation.FormatSigned().Should().Be(signed);
        deviation.ToString().Should().Be(text);
    }

    [Fact]
    public void WriteMicrometres_AnyDeviation_EqualsFormat() => Gen.Long.Sample(static picometres =>
    {
        Span<byte> buffer = stackalloc byte[24];
        int length = new Deviation(picometres).WriteMicrometres(buffer);
        System.Text.Encoding.ASCII.GetString(buffer[..length]).Should().Be(new Deviation(picometres).Format());
    });

    [Fact]
    public void Arithmetic_SumAndDifference_AreInverse() => Gen.Select(Gen.Int, Gen.Int).Sample(static (a, b) =>
    {
        (new Deviation(a) + new Deviation(b) - new Deviation(b)).Should().Be(new Deviation(a));
        (-new Deviation(a) + new Deviation(a)).Should().Be(default(Deviation));
    });

    [Fact]
    public void ToMicrometres_HalfAMicrometre_IsAHalf() => new Deviation(500_000).ToMicrometres().Should().Be(0.5);
}
