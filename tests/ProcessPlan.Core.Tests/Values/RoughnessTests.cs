using CsCheck;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public class RoughnessTests
{
    [Theory]
    [InlineData("Ra0.8", 800, RoughnessParameter.Ra, 5)]
    [InlineData("Ra 0,8 C45", 800, RoughnessParameter.Ra, 6)]
    [InlineData("ra .8", 800, RoughnessParameter.Ra, 5)]
    [InlineData("RA3.2,", 3_200, RoughnessParameter.Ra, 5)]
    [InlineData("Ra 0.012", 12, RoughnessParameter.Ra, 8)]
    [InlineData("Rz 6.3", 6_300, RoughnessParameter.Rz, 6)]
    [InlineData("rz25", 25_000, RoughnessParameter.Rz, 4)]
    [InlineData("N6", 800, RoughnessParameter.Number, 2)]
    [InlineData("N12 40 off", 50_000, RoughnessParameter.Number, 3)]
    public void TryRead_Roughness_ReadsValueAndParameter(string text, long nanometres, RoughnessParameter parameter, int length)
    {
        Roughness.TryRead(text, out Roughness value, out int read).Should().BeTrue();
        value.Nanometres.Should().Be(nanometres);
        value.Parameter.Should().Be(parameter);
        read.Should().Be(length);
    }

    [Theory]
    [InlineData("")]
    [InlineData("Ra")]
    [InlineData("Ra x")]
    [InlineData("Ra 0")]
    [InlineData("Ra -1")]
    [InlineData("Ra 0.0001")]
    [InlineData("Ra0.8x")]
    [InlineData("Rq 0.8")]
    [InlineData("0.8")]
    [InlineData("N")]
    [InlineData("N0")]
    [InlineData("N06")]
    [InlineData("N13")]
    [InlineData("N6.5")]
    [InlineData("N7x")]
    [InlineData("n6")]
    public void TryRead_NoRoughness_ReadsNothing(string text)
    {
        Roughness.TryRead(text, out Roughness value, out int read).Should().BeFalse();
        value.Should().Be(default(Roughness));
        read.Should().Be(0);
    }

    // Source: ISO 1302, as printed by Ceratizit, Surface quality, catalogue p. E31.
    [Fact]
    public void N_EveryClass_HasTheRaOfISO1302()
    {
        double[] printed = [0.025, 0.05, 0.1, 0.2, 0.4, 0.8, 1.6, 3.2, 6.3, 12.5, 25, 50];
        for (int number = 1; number <= printed.Length; number++)
        {
            Roughness.N(number).ToMicrometres().Should().Be(printed[number - 1]);
            Roughness.N(number).IsRa.Should().BeTrue();
            Roughness.N(number).ToString().Should().Be("N" + number);
        }
    }

    [Theory]
    [InlineData(0)]
    [InlineData(13)]
    public void N_NoSuchClass_SaysTheRange(int number) => FluentActions.Invoking(() => Roughness.N(number))
        .Should().Throw<ArgumentOutOfRangeException>().WithMessage("ISO 1302 has the roughness numbers N1 to N12.*");

    [Fact]
    public void Ra_ZeroOrLess_IsTheProgrammersMistake()
    {
        FluentActions.Invoking(() => Roughness.Ra(0)).Should().Throw<ArgumentOutOfRangeException>();
        FluentActions.Invoking(() => Roughness.Rz(-1)).Should().Throw<ArgumentOutOfRangeException>();
    }

    [Fact]
    public void ToString_AnyRoughness_IsReadBackWhole() => Gen.Select(Gen.Long[1, 1_000_000], Gen.Bool).Sample((nanometres, isRa) =>
    {
        Roughness stated = isRa ? Roughness.Ra(nanometres) : Roughness.Rz(nanometres);
        string text = stated.ToString();
        Roughness.TryRead(text, out Roughness value, out int read).Should().BeTrue();
        value.Should().Be(stated);
        read.Should().Be(text.Length);
        stated.IsRa.Should().Be(isRa);
    });

    [Fact]
    public void ToString_AsStated_KeepsParameterAndExactValue()
    {
        Roughness.Ra(800).ToString().Should().Be("Ra 0.8");
        Roughness.Rz(6_300).ToString().Should().Be("Rz 6.3");
        Roughness.N(9).ToString().Should().Be("N9");
        Roughness.Ra(800).Should().NotBe(Roughness.N(6));
    }
}
