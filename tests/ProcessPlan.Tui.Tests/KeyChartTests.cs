using ProcessPlan.Core.Values;

namespace ProcessPlan.Tui.Tests;

/// <summary>Every key that the help prints does on the screen what the help says.</summary>
public class KeyChartTests
{
    /// <summary>For each key everywhere: what has changed after it. A key of the chart that is missing here fails its test.</summary>
    private static readonly Dictionary<string, Func<Terminal, bool>> Everywhere = new()
    {
        ["F1"] = static terminal => terminal.Row(0).StartsWith("── help", StringComparison.Ordinal),
        ["F2"] = static terminal => terminal.Bench.Unit == LengthUnit.Inch && terminal.Row(0).EndsWith("in", StringComparison.Ordinal),
        ["F3"] = static terminal => terminal.Text.Contains("████", StringComparison.Ordinal) && terminal.Text.Contains("aim", StringComparison.Ordinal),
        ["F4"] = static terminal => terminal.Text.Contains("route 2 of 2, 0.26 dearer", StringComparison.Ordinal),
        ["F5"] = static terminal => terminal.Bench is { Text: "", Page: Page.Bench, Hand: Hand.Line } && terminal.Row(1).StartsWith("Type a feature", StringComparison.Ordinal),
        ["F6"] = static terminal => terminal.Text.Contains("── notes", StringComparison.Ordinal),
        ["F7"] = static terminal => terminal.Bench.OperationAt == 0,
        ["F8"] = static terminal => terminal.Bench.OperationAt == 2,
        ["F9"] = static terminal => terminal.Text.Contains("── shaft 40 mm k6", StringComparison.Ordinal),
        ["PageUp"] = static terminal => terminal.Bench.Scroll == 0,
        ["PageDown"] = static terminal => terminal.Bench.Scroll > 1,
        ["Esc"] = static terminal => terminal.Bench is { Page: Page.Bench, Hand: Hand.Line },
        ["Ctrl+Q"] = static terminal => !terminal.IsRunning,
    };

    public static TheoryData<string> EverywhereKeys => [.. KeyChart.Everywhere.Select(static stroke => stroke.Key)];

    public static TheoryData<string> Letters => [.. KeyChart.Everywhere.Where(static stroke => stroke.Letter is not null).Select(static stroke => stroke.Key)];

    /// <summary>A fit, its second operation looked at, a lower text that is longer than its room, scrolled by one line.</summary>
    private static Terminal Begin()
    {
        Terminal terminal = new(new ScreenOptions { Line = "40 H7/k6 C45" }, 60, 17, SamplePlan.For);
        terminal.Press("F8");
        terminal.Bench.ScrollBy(1);
        return terminal.Settle();
    }

    [Theory]
    [MemberData(nameof(EverywhereKeys))]
    public void A_key_everywhere_works_on_the_line(string key)
    {
        using Terminal terminal = Begin();
        if (key is "F3")
        {
            terminal.Resize(80, 24);
        }

        terminal.Press(key);
        Everywhere[key](terminal).Should().BeTrue($"{key} is there for: {KeyChart.Everywhere.Single(stroke => stroke.Key == key).Does}");
    }

    [Theory]
    [MemberData(nameof(EverywhereKeys))]
    public void A_key_everywhere_works_on_the_route(string key)
    {
        using Terminal terminal = Begin();
        terminal.Resize(80, key is "F3" ? 24 : 17).Press("Tab");
        terminal.Bench.ScrollBy(1);
        terminal.Settle().Press(key);
        Everywhere[key](terminal).Should().BeTrue();
    }

    [Theory]
    [MemberData(nameof(Letters))]
    public void A_letter_does_the_same_as_its_key_on_the_route(string key)
    {
        using Terminal byKey = Begin();
        using Terminal byLetter = Begin();
        byKey.Press("Tab", key);
        byLetter.Press("Tab", KeyChart.Everywhere.Single(stroke => stroke.Key == key).Letter!);
        byLetter.Text.Should().Be(byKey.Text);
    }

    [Theory]
    [InlineData("Enter")]
    [InlineData("Tab")]
    public void Keys_lead_from_the_line_to_the_route(string key)
    {
        using Terminal terminal = Begin();
        terminal.Press(key).Bench.Hand.Should().Be(Hand.Route);
    }

    [Fact]
    public void Up_and_down_on_the_line_bring_kept_lines()
    {
        using Terminal terminal = Begin();
        terminal.Press("Enter", "Esc").Retype("hole 20H7").Press("Up");
        terminal.Row(0).Should().Contain("40 H7/k6 C45");
        terminal.Press("Down");
        terminal.Row(0).Should().Contain("hole 20H7");
    }

    [Theory]
    [InlineData("Up", 0)]
    [InlineData("Down", 2)]
    public void Up_and_down_on_the_route_change_the_operation(string key, int operation)
    {
        using Terminal terminal = Begin();
        terminal.Press("Tab", key).Bench.OperationAt.Should().Be(operation);
    }

    [Theory]
    [InlineData("Tab")]
    [InlineData("l")]
    [InlineData("Esc")]
    public void Keys_lead_from_the_route_to_the_line(string key)
    {
        using Terminal terminal = Begin();
        terminal.Press("Tab", key).Bench.Hand.Should().Be(Hand.Line);
    }

    [Fact]
    public void Enter_on_the_route_shows_the_operation_in_big_digits_and_up_and_down_go_on()
    {
        using Terminal terminal = Begin();
        terminal.Press("Tab", "Enter").Row(0).Should().StartWith("20 finish cutting");
        terminal.Press("Down").Row(0).Should().StartWith("30 sizing");
        terminal.Press("Up", "Up", "Up").Row(0).Should().StartWith("drawing: hole 40 mm H7");
        terminal.Press("Enter").Bench.Page.Should().Be(Page.Bench);
    }

    [Fact]
    public void A_question_mark_lists_the_keys_outside_the_line()
    {
        using Terminal terminal = Begin();
        terminal.Press("?").Bench.Page.Should().Be(Page.Bench, "on the line it is a character");
        terminal.Press("Ctrl+Z", "Tab", "?").Row(0).Should().StartWith("── keys");
        terminal.Press("Esc", "F3", "?").Row(0).Should().StartWith("── keys");
        terminal.Press("Enter").Bench.Page.Should().Be(Page.Bench);
    }

    [Fact]
    public void The_help_scrolls_to_its_end_and_back()
    {
        using Terminal terminal = Begin();
        terminal.Press("F1").Row(1).Should().Contain("Keys everywhere");
        terminal.Press("Down").Row(1).Should().NotContain("Keys everywhere");
        terminal.Press("Up").Row(1).Should().Contain("Keys everywhere");
        terminal.Press([.. Enumerable.Repeat("PageDown", 30)]).Text.Should().NotContain("more: Down");
        terminal.Press("PageUp").Text.Should().Contain("more: Down");
        terminal.Press("Enter").Bench.Page.Should().Be(Page.Bench);
    }

    [Fact]
    public void Tab_leads_from_the_keys_to_the_words_of_the_line_and_back()
    {
        using Terminal terminal = Begin();
        terminal.Press("F1").Text.Should().Contain("Esc back  Tab words of the line");
        terminal.Press("Tab").Row(0).Should().StartWith("── help: words of the line");
        terminal.Row(1).Should().Contain("The line takes");
        terminal.Text.Should().Contain("Esc back  Tab keys");
        terminal.Press("Tab").Row(0).Should().StartWith("── help: keys");
        terminal.Press("Tab", "Esc").Bench.Page.Should().Be(Page.Bench);
    }

    [Fact]
    public void On_eighty_columns_the_help_begins_with_the_keys_of_the_screen_and_the_line()
    {
        using Terminal terminal = Begin();
        terminal.Resize(80, 24).Press("F1");
        KeyChart.Everywhere.Concat(KeyChart.OnLine).Should().AllSatisfy(stroke => terminal.Text.Should().Contain(stroke.Does));
    }

    [Fact]
    public void The_text_field_does_what_the_help_says_of_it()
    {
        using Terminal terminal = Begin();
        terminal.Press("End").Type(" 3off").Press("Ctrl+Z");
        terminal.Bench.Text.Should().NotEndWith("3off");
        terminal.Press("Ctrl+Y");
        terminal.Bench.Text.Should().EndWith("3off");
        terminal.Press("Ctrl+A").Type("x");
        terminal.Bench.Text.Should().Be("x");
    }

    [Fact]
    public void Every_example_of_the_help_is_read_without_a_problem()
    {
        using Terminal terminal = Begin();
        foreach (string example in ProcessPlan.Tui.Pages.HelpPage.Examples)
        {
            terminal.Retype(example).Bench.Problems.Should().BeEmpty(example);
            terminal.Bench.IsCurrent.Should().BeTrue(example);
        }
    }

    /// <summary>Names and letters are each taken once in every place where they are listened to together.</summary>
    [Fact]
    public void No_key_means_two_things_in_one_place()
    {
        foreach (IReadOnlyList<Stroke> place in (IReadOnlyList<Stroke>[])[KeyChart.OnLine, KeyChart.OnRoute, KeyChart.OnBigDigits, KeyChart.OnText])
        {
            List<Stroke> heard = [.. place, .. KeyChart.Everywhere];
            heard.Select(static stroke => stroke.Key).Concat(heard.Select(static stroke => stroke.Letter).OfType<string>()).Should().OnlyHaveUniqueItems();
        }
    }
}
