using System.Globalization;
using ProcessPlan.Documents;

namespace ProcessPlan.Tests;

public class PlainLettersTests
{
    [Theory]
    [InlineData("hole Ø25 ±15 µm", "hole dia 25 +/-15 um")]
    [InlineData("at 20 °C", "at 20 deg C")]
    [InlineData("−9 µm … Δ ≤ 3 · 2 × 4", "-9 um ... delta <= 3 * 2 x 4")]
    [InlineData("鋼\U0001F529", "???")]
    [InlineData("plain ~ text", "plain ~ text")]
    public void Signs_of_the_trade_become_characters_that_every_terminal_has(string text, string plain)
    {
        using StringWriter target = new(CultureInfo.InvariantCulture);
        using PlainLetters letters = new(target);

        letters.Write(text);

        target.ToString().Should().Be(plain);
    }

    [Fact]
    public void Lines_end_as_those_of_the_text_behind_it()
    {
        using StringWriter target = new(CultureInfo.InvariantCulture) { NewLine = "|" };
        using PlainLetters letters = new(target);

        letters.WriteLine("µ");

        target.ToString().Should().Be("u|");
    }
}
