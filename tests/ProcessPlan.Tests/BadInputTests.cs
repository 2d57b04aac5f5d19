using System.Text.Json;

namespace ProcessPlan.Tests;

public class BadInputTests
{
    [Fact]
    public void A_line_that_is_not_understood_is_shown_with_the_place_marked()
    {
        Answer answer = Answer.To("limits", "25 H7 thruu x40");

        answer.Should().Be(new Answer(2, "", """
              25 H7 thruu x40
                    ^^^^^
              'thruu' is not understood.
              expected: perhaps 'thru'

            """));
    }

    [Fact]
    public void All_problems_of_a_line_are_told_at_once()
    {
        Answer answer = Answer.To("limits", "--json", "25 H7 frobnicate wobble");

        answer.Exit.Should().Be(2);
        answer.Error.Should().BeEmpty();
        using JsonDocument document = JsonDocument.Parse(answer.Output);
        JsonElement problems = document.RootElement.GetProperty("problems");
        problems.EnumerateArray().Select(problem => (problem.GetProperty("at").GetInt32(), problem.GetProperty("length").GetInt32())).Should().Equal((6, 10), (17, 6));
        document.RootElement.EnumerateObject().Should().ContainSingle();
    }

    [Fact]
    public void A_long_line_is_shown_around_the_place()
    {
        string filler = string.Concat(Enumerable.Repeat("; ", 60));
        Answer answer = Answer.To("limits", $"25 H7 {filler} frobnicate {filler}");

        string[] lines = answer.Error.Split('\n');
        int shown = Array.FindIndex(lines, line => line.Contains("frobnicate", StringComparison.Ordinal) && line.StartsWith("  ...", StringComparison.Ordinal));
        lines.Should().OnlyContain(line => line.Length <= 80);
        lines[shown].Should().EndWith("...");
        lines[shown + 1].Should().Be(new string(' ', lines[shown].IndexOf("frobnicate", StringComparison.Ordinal)) + "^^^^^^^^^^");
    }

    [Theory]
    [InlineData("25\tH7\tfrobnicate")]
    [InlineData("25 H7 \u0007 frobnicate")]
    [InlineData("25 H7 鋼 frobnicate")]
    [InlineData("25 H7 \U0001F529 frobnicate")]
    [InlineData("25 H7 o\u0308 frobnicate")]
    public void The_mark_stands_under_its_place_whatever_characters_come_before(string line)
    {
        string[] lines = Answer.To("limits", line).Error.Split('\n');

        int marks = Array.FindLastIndex(lines, text => text.Contains('^', StringComparison.Ordinal));
        lines[marks - 1].Length.Should().Be(line.Length + 2);
        lines[marks - 1][lines[marks].IndexOf('^', StringComparison.Ordinal)..].Should().Be("frobnicate");
        lines[marks - 1].Should().MatchRegex("^[ -~]+$");
    }

    [Fact]
    public void An_empty_line_is_not_understood()
    {
        Answer answer = Answer.To("limits", "");

        answer.Exit.Should().Be(2);
        answer.Error.Should().StartWith("  \n  ^\n").And.Contain("\n  expected: ");
    }

    [Theory]
    [InlineData("'lmits' is no command; expected limits, plan, shop or --help.", "lmits", "25H7")]
    [InlineData("limits found no feature; expected one such as 25H7, or - for standard input.", "limits")]
    [InlineData("limits found no feature; expected one such as 25H7, or - for standard input.", "limits", "--json")]
    [InlineData("--unit found 'cm'; expected mm or in.", "limits", "25H7", "--unit", "cm")]
    [InlineData("--unit found nothing; expected mm or in.", "limits", "25H7", "--unit")]
    [InlineData("'--jsn' is no option of limits; expected --json, --unit, --ascii, --shop.", "limits", "25H7", "--jsn")]
    public void A_call_that_is_not_understood_is_answered_in_one_sentence(string sentence, params string[] words)
    {
        Answer.To(words).Should().Be(new Answer(2, "", $"processplan: {sentence}\n"));
    }

    [Fact]
    public void A_response_file_is_no_feature()
    {
        Answer.To("limits", "@lines.txt").Exit.Should().Be(2);
    }

    [Fact]
    public void Help_names_the_command_and_its_options()
    {
        Answer answer = Answer.To("limits", "--help");

        answer.Exit.Should().Be(0);
        answer.Output.Should().Contain("--unit <mm|in>").And.Contain("--json").And.Contain("--ascii");
        answer.Output.Split('\n').Should().OnlyContain(line => line.Length <= 80);
        Answer.To("--help").Output.Should().Contain("limits");
    }
}
