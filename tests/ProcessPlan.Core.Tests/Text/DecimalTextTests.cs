using System.Globalization;
using System.Text;
using CsCheck;
using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Tests.Text;

public sealed class DecimalTextTests
{
    [Theory]
    [InlineData("25", 25, 0, 2)]
    [InlineData("25.5", 255, 1, 4)]
    [InlineData("25,5", 255, 1, 4)]
    [InlineData(".2500", 2500, 4, 5)]
    [InlineData(",5", 5, 1, 2)]
    [InlineData("0", 0, 0, 1)]
    [InlineData("0.000", 0, 3, 5)]
    [InlineData("0007", 7, 0, 4)]
    [InlineData("00000000000000000000000000000000000025", 25, 0, 38)]
    [InlineData("000.050", 50, 3, 7)]
    [InlineData("25.", 25, 0, 2)]
    [InlineData("25,", 25, 0, 2)]
    [InlineData("25, 5", 25, 0, 2)]
    [InlineData("25..30", 25, 0, 2)]
    [InlineData("1.2.3", 12, 1, 3)]
    [InlineData("1e5", 1, 0, 1)]
    [InlineData("25H7", 25, 0, 2)]
    [InlineData("999999999999999999", 999_999_999_999_999_999, 0, 18)]
    [InlineData("0.123456789012345678", 123_456_789_012_345_678, 18, 20)]
    public void TryRead_Number_IsExact(string text, long units, int places, int read)
    {
        DecimalText.TryRead(text, out ExactDecimal number, out int length).Should().BeTrue();
        (number, length).Should().Be((new ExactDecimal(units, places), read));
    }

    [Theory]
    [InlineData("")]
    [InlineData(".")]
    [InlineData(",")]
    [InlineData("..5")]
    [InlineData("-5")]
    [InlineData("+5")]
    [InlineData(" 5")]
    [InlineData("x5")]
    [InlineData("NaN")]
    [InlineData("٢٥")]
    [InlineData("２５")]
    [InlineData("1000000000000000000")]
    [InlineData("0.0000000000000000001")]
    [InlineData("99999999999999999999")]
    public void TryRead_NoNumberOrTooManyDigits_ReadsNothing(string text)
    {
        DecimalText.TryRead(text, out ExactDecimal number, out int read).Should().BeFalse();
        (number, read).Should().Be((default, 0));
    }

    [Theory]
    [InlineData(0, 0, 0, "0")]
    [InlineData(0, 9, 0, "0")]
    [InlineData(0, 9, 3, "0.000")]
    [InlineData(2500, 2, 0, "25")]
    [InlineData(2500, 2, 1, "25.0")]
    [InlineData(2510, 2, 0, "25.1")]
    [InlineData(-5, 3, 0, "-0.005")]
    [InlineData(1, 18, 0, "0.000000000000000001")]
    [InlineData(long.MaxValue, 0, 0, "9223372036854775807")]
    [InlineData(long.MinValue, 0, 0, "-9223372036854775808")]
    [InlineData(long.MinValue, 18, 0, "-9.223372036854775808")]
    public void Format_AnyScale_HasNoTrailingZeros(long units, int places, int least, string text)
    {
        DecimalText.Format(units, places, least).Should().Be(text);
    }

    [Fact]
    public void Write_LongestNumber_FitsIntoTwentyFourBytes()
    {
        Span<byte> buffer = stackalloc byte[24];
        for (int places = 0; places <= 18; places++)
        {
            int length = DecimalText.Write(buffer, long.MinValue, places);
            decimal value = decimal.Parse(Encoding.ASCII.GetString(buffer[..length]), CultureInfo.InvariantCulture);
            value.Should().Be(long.MinValue / (decimal)ExactDecimal.PowerOfTen(places));
        }
    }

    [Fact]
    public void Format_AnyNumber_IsThatOfDecimal() => Gen.Select(Gen.Long, Gen.Int[0, 18]).Sample(static (units, places) =>
    {
        decimal value = units / (decimal)ExactDecimal.PowerOfTen(places);
        decimal.Parse(DecimalText.Format(units, places), CultureInfo.InvariantCulture).Should().Be(value);
    });

    [Fact]
    public void TryRead_FormattedNumber_IsTheSame() =>
        Gen.Select(Gen.Long[0, 999_999_999_999_999_999], Gen.Int[0, 18], Gen.Bool).Sample(static (units, places, comma) =>
        {
            string text = DecimalText.Format(units, places);
            DecimalText.TryRead(comma ? text.Replace('.', ',') : text, out ExactDecimal number, out int read).Should().BeTrue();
            read.Should().Be(text.Length);
            DecimalText.Format(number.Units, number.Places).Should().Be(text);
        });
}
