using ProcessPlan.Tui.Pages;
using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Tests.Pages;

public class BlockDigitsTests
{
    private static string Draw(string text, int scale)
    {
        int width = BlockDigits.Width(text, scale);
        Sheet sheet = new(width + 3, BlockDigits.Height * scale + 1, Pen.Ascii);
        BlockDigits.Write(sheet, 0, 0, text, scale, Ink.Plain);
        for (int y = 0; y < sheet.Height; y++)
        {
            sheet.Row(y)[width..].ToString().Should().BeEquivalentTo("   ", "nothing is drawn beyond the width that was told");
        }

        sheet.Row(sheet.Height - 1).Trim(' ').Length.Should().Be(0, "nor below the height");
        return string.Join('\n', Enumerable.Range(0, sheet.Height - 1).Select(y => sheet.Row(y)[..width].TrimEnd().ToString()));
    }

    [Fact]
    public void Every_digit_differs_from_every_other()
    {
        "0123456789".Select(static digit => Draw(digit.ToString(), 1)).Should().OnlyHaveUniqueItems();
    }

    [Fact]
    public void A_size_reads_as_it_is_drawn()
    {
        Draw("41.7", 1).Should().Be(
            """
            #  #   #     ####
            #  #  ##        #
            ####   #       #
               #   #      #
               #  ### ##  #
            """.ReplaceLineEndings("\n"));
    }

    [Fact]
    public void A_larger_scale_makes_each_cell_larger()
    {
        BlockDigits.Width("8", 3).Should().Be(12);
        Draw("1", 2).Split('\n').Should().HaveCount(10).And.Contain("  ######");
    }

    [Fact]
    public void Anything_but_digits_is_a_mistake()
    {
        Action letter = static () => Draw("x", 1);
        letter.Should().Throw<ArgumentException>().WithMessage("*'x' is no digit.*");
    }
}
