using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Tests.Paper;

public class SheetTests
{
    [Fact]
    public void Text_beyond_any_edge_is_cut_off()
    {
        Sheet sheet = new(5, 2, Pen.Blocks);
        sheet.Write(-2, 0, "abcdefghij");
        sheet.Write(0, 7, "below");
        sheet.Write(0, -1, "above");
        sheet.Row(0).ToString().Should().Be("cdefg");
        sheet.Row(1).ToString().Should().Be("     ");
    }

    [Theory]
    [InlineData("one two three", 7, "one two|three")]
    [InlineData("abcdefgh", 3, "abc|def|gh")]
    [InlineData("short", 80, "short")]
    [InlineData("", 10, "")]
    public void Wrapping_breaks_at_spaces_and_within_words_only_where_it_must(string text, int width, string lines) =>
        string.Join('|', new Sheet(10, 1, Pen.Blocks).Wrap(text, width)).Should().Be(lines);

    [Theory]
    [InlineData("abcdef", 6, "abcdef")]
    [InlineData("abcdef", 4, "abc…")]
    [InlineData("abcdef", 1, "")]
    public void Shortening_says_that_something_is_missing(string text, int width, string shown) =>
        new Sheet(10, 1, Pen.Blocks).Shorten(text, width).Should().Be(shown);

    [Fact]
    public void Signs_of_the_trade_have_plain_words()
    {
        Pen.Ascii.Put("Ø25 ±15 µm ≤ 2·√ρ² 20 °C").Should().Be("dia 25 +/-15 um <= 2*sqrtrho^2 20 deg C");
        Pen.Blocks.Put("Ø25 ±15 µm").Should().Be("Ø25 ±15 µm");
    }

    [Fact]
    public void Characters_of_no_sure_width_become_question_marks_of_one_cell()
    {
        Pen.Blocks.Put("a日b\U0001F600c\u0301d\te").Should().Be("a?b?c?d?e");
    }
}
