using CsCheck;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public class HardnessTests
{
    [Theory]
    [InlineData("28HRC", 280, HardnessScale.HRC, 5)]
    [InlineData("58 hrc 40 off", 580, HardnessScale.HRC, 6)]
    [InlineData("28,5 HRC", 285, HardnessScale.HRC, 8)]
    [InlineData("240 HB", 2400, HardnessScale.HB, 6)]
    [InlineData("240HBW,", 2400, HardnessScale.HB, 6)]
    [InlineData("700HV", 7000, HardnessScale.HV, 5)]
    public void TryRead_Hardness_ReadsPointsAndScale(string text, long tenths, HardnessScale scale, int length)
    {
        Hardness.TryRead(text, out Hardness value, out int read).Should().BeTrue();
        value.Should().Be(new Hardness(tenths, scale));
        read.Should().Be(length);
    }

    [Theory]
    [InlineData("")]
    [InlineData("HRC")]
    [InlineData("28")]
    [InlineData("28 HR")]
    [InlineData("28 HRB")]
    [InlineData("28 HRCx")]
    [InlineData("240 HBS")]
    [InlineData("700 HV10")]
    [InlineData("0 HRC")]
    [InlineData("28.55 HRC")]
    [InlineData("HRC 28")]
    public void TryRead_NoHardness_ReadsNothing(string text)
    {
        Hardness.TryRead(text, out Hardness value, out int read).Should().BeFalse();
        value.Should().Be(default(Hardness));
        read.Should().Be(0);
    }

    [Fact]
    public void ToString_AnyHardness_IsReadBackWhole() => Gen.Select(Gen.Long[1, 20_000], Gen.Enum<HardnessScale>()).Sample((tenths, scale) =>
    {
        Hardness stated = new(tenths, scale);
        Hardness.TryRead(stated.ToString(), out Hardness value, out int read).Should().BeTrue();
        value.Should().Be(stated);
        read.Should().Be(stated.ToString().Length);
        value.Points.Should().Be(tenths / 10.0);
    });
}
