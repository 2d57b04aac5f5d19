using CsCheck;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public sealed class LengthTests
{
    private static readonly Length TenthThou = new(Length.PicometresPerInch / 10_000);

    private static readonly Length HundredthThou = new(Length.PicometresPerInch / 100_000);

    [Fact]
    public void Contract_ThreeSizes_Holds() => OrderedValues.ShouldHoldTheContract(
        Length.Zero, static () => [new(long.MinValue), new(-1), new(0), new(1), Length.FromMillimetres(25), new(long.MaxValue)]);

    // The inch is 25.4 mm exactly: international yard and pound agreement of 1959; ISO 31-1:1992, annex A.
    [Theory]
    [InlineData(1, 0, 25_400_000_000)]
    [InlineData(1, 3, 25_400_000)]
    [InlineData(1, 4, 2_540_000)]
    [InlineData(1, 6, 25_400)]
    [InlineData(2500, 4, 6_350_000_000)]
    public void TryFrom_Inch_IsExact(long units, int places, long picometres)
    {
        Length.TryFrom(new ExactDecimal(units, places), LengthUnit.Inch, out Length length).Should().BeTrue();
        length.Picometres.Should().Be(picometres);
    }

    [Fact]
    public void TryFrom_Every64thOfAnInch_IsExact()
    {
        for (int n = 1; n <= 64; n++)
        {
            // n/64 in = n · 15 625 millionths of an inch
            Length.TryFrom(new ExactDecimal(n * 15_625, 6), LengthUnit.Inch, out Length length).Should().BeTrue();
            length.Picometres.Should().Be(n * 396_875_000L);
            length.Millimetres.Should().Be(n * 25.4m / 64);
        }
    }

    [Fact]
    public void TryFrom_NineDecimals_IsExactAndTenAreRefused()
    {
        Length.TryFrom(new ExactDecimal(25_123_456_789, 9), LengthUnit.Millimetre, out Length exact).Should().BeTrue();
        exact.Picometres.Should().Be(25_123_456_789);
        Length.TryFrom(new ExactDecimal(251_234_567_891, 10), LengthUnit.Millimetre, out _).Should().BeFalse();
        Length.TryFrom(new ExactDecimal(1, 7), LengthUnit.Inch, out Length tenthMicroinch).Should().BeTrue();
        tenthMicroinch.Picometres.Should().Be(2_540);
    }

    [Fact]
    public void TryFrom_BeyondTheRange_IsRefused()
    {
        Length.TryFrom(new ExactDecimal(9_223_372_036, 0), LengthUnit.Millimetre, out _).Should().BeTrue();
        Length.TryFrom(new ExactDecimal(9_223_372_037, 0), LengthUnit.Millimetre, out _).Should().BeFalse();
        Length.TryFrom(new ExactDecimal(999_999_999_999_999_999, 0), LengthUnit.Inch, out _).Should().BeFalse();
    }

    [Fact]
    public void FromMillimetres_TenDecimals_Throws()
    {
        Length.FromMillimetres(40.025m).Should().Be(new Length(40_025_000_000));
        Action finer = static () => Length.FromMillimetres(0.0000000001m);
        finer.Should().Throw<ArgumentOutOfRangeException>().WithMessage("A length holds nine decimal places of a millimetre.*");
        Action larger = static () => Length.FromMillimetres(9_223_372_037m);
        larger.Should().Throw<ArgumentOutOfRangeException>();
        Action largest = static () => Length.FromMillimetres(decimal.MaxValue);
        largest.Should().Throw<ArgumentOutOfRangeException>();
    }

    [Theory]
    [InlineData(40_025_000_000, 0, "40.025")]
    [InlineData(40_000_000_000, 0, "40")]
    [InlineData(40_000_000_000, 3, "40.000")]
    [InlineData(40_025_400_000, 3, "40.0254")]
    [InlineData(-15_000_000, 0, "-0.015")]
    [InlineData(1, 0, "0.000000001")]
    [InlineData(long.MaxValue, 0, "9223372036.854775807")]
    [InlineData(long.MinValue, 0, "-9223372036.854775808")]
    public void Format_ExactMillimetres_HasNoNoise(long picometres, int least, string text)
    {
        new Length(picometres).Format(least).Should().Be(text);
    }

    [Fact]
    public void ToString_WithUnit_SaysMillimetres() => Length.FromMillimetres(6.35m).ToString().Should().Be("6.35 mm");

    [Fact]
    public void Format_ReadAgain_IsTheSameLength() => Gen.Long.Where(static value => value is >= 0 and < 1_000_000_000_000_000_000).Sample(static picometres =>
    {
        string text = new Length(picometres).Format();
        DecimalText.TryRead(text, out ExactDecimal number, out int read).Should().BeTrue();
        read.Should().Be(text.Length);
        Length.TryFrom(number, LengthUnit.Millimetre, out Length back).Should().BeTrue();
        back.Picometres.Should().Be(picometres);
    });

    [Fact]
    public void WriteMillimetres_AnyLength_EqualsFormat() => Gen.Long.Sample(static picometres =>
    {
        Span<byte> buffer = stackalloc byte[24];
        int length = new Length(picometres).WriteMillimetres(buffer);
        System.Text.Encoding.ASCII.GetString(buffer[..length]).Should().Be(new Length(picometres).Format());
    });

    [Theory]
    [InlineData(7, 5, 5, 10, 5)]
    [InlineData(8, 5, 5, 10, 10)]
    [InlineData(10, 5, 10, 10, 10)]
    [InlineData(-7, 5, -10, -5, -5)]
    [InlineData(3, 6, 0, 6, 6)]
    [InlineData(-3, 6, -6, 0, 0)]
    public void Round_ToAStep_GoesWhereItsNameSays(long value, long step, long down, long up, long nearest)
    {
        Length length = new(value);
        length.RoundDown(new Length(step)).Picometres.Should().Be(down);
        length.RoundUp(new Length(step)).Picometres.Should().Be(up);
        length.RoundNearest(new Length(step)).Picometres.Should().Be(nearest);
    }

    [Fact]
    public void RoundDown_StepOfZero_Throws()
    {
        Action zero = static () => Length.FromMillimetres(1).RoundDown(Length.Zero);
        zero.Should().Throw<ArgumentOutOfRangeException>();
    }

    [Fact]
    public void Arithmetic_BeyondTheRange_Throws()
    {
        Action add = static () => _ = new Length(long.MaxValue) + new Deviation(1);
        add.Should().Throw<OverflowException>();
    }

    [Fact]
    public void Arithmetic_SizeDeviationStock_AddsUp() =>
        Gen.Select(Gen.Int, Gen.Int).Sample(static (size, change) =>
        {
            Length length = new(size);
            (length + new Deviation(change) - length).Should().Be(new Deviation(change));
            (length - new Deviation(change) + new Deviation(change)).Should().Be(length);
            (length + new Stock(change) - new Stock(change)).Should().Be(length);
        });

    [Fact]
    public void RoundInward_ToInch_AlwaysLiesInside()
    {
        Gen<(Length Min, Length Width)> windows = Gen.Select(Gen.Long[1, 3_150_000_000_000], Gen.Long[0, 2_000_000_000])
            .Select(static (min, width) => (new Length(min), new Length(width)));
        Gen.Select(windows, Gen.OneOf(TenthThou, HundredthThou)).Sample(static (window, step) =>
        {
            SizeWindow drawing = new(window.Min, new Length(window.Min.Picometres + window.Width.Picometres));
            if (drawing.RoundInward(step) is { } converted)
            {
                drawing.Contains(converted).Should().BeTrue();
                (converted.Min.Picometres % step.Picometres).Should().Be(0);
                (converted.Max.Picometres % step.Picometres).Should().Be(0);
                // The widest one: a step further out on either side is outside.
                (converted.Min.Picometres - step.Picometres).Should().BeLessThan(drawing.Min.Picometres);
                (converted.Max.Picometres + step.Picometres).Should().BeGreaterThan(drawing.Max.Picometres);
            }
            else
            {
                drawing.Width.Picometres.Should().BeLessThan(step.Picometres);
            }
        });
    }

    [Fact]
    public void RoundInward_25H7ToTenthThou_KeepsInside()
    {
        // 25.000 to 25.021 mm is 0.984251… to 0.985078… in
        SizeWindow h7 = new(Length.FromMillimetres(25m), Length.FromMillimetres(25.021m));
        h7.RoundInward(TenthThou).Should().Be(new SizeWindow(new Length(9843 * TenthThou.Picometres), new Length(9850 * TenthThou.Picometres)));
    }

    [Fact]
    public void RoundInward_NoMultipleInside_IsNull() =>
        new SizeWindow(new Length(1), new Length(2)).RoundInward(TenthThou).Should().BeNull();
}
