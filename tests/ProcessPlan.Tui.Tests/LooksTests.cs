using System.Text.RegularExpressions;
using ProcessPlan.Tui.Paper;
using Terminal.Gui.Drawing;

namespace ProcessPlan.Tui.Tests;

/// <summary>Monochrome and plain terminals, and the inks of the others.</summary>
public class LooksTests
{
    private static readonly string[][] Journeys =
    [
        [], ["F2"], ["F3"], ["F3", "Down"], ["F1"], ["F6"], ["F9"], ["Tab", "Down"], ["Tab", "?"], ["End", "x"],
    ];

    private static readonly string[] Lines =
    [
        ScreenOptions.FirstLine, "40 H7/k6 C45", "Ø30 ±0.02 日本 \u00fcnlesbar", "hole 25H3 Ra0.1 C45", "shaft 30 f7 34CrNiMo6 38HRC coat zinc-nickel 8-12um before 60 off",
    ];

    public static TheoryData<string> AllLines => [.. Lines];

    private static void Visit(ScreenOptions options, Action<Terminal> look)
    {
        foreach (string[] journey in Journeys)
        {
            using Terminal terminal = new(options, 100, 30);
            look(terminal.Press(journey));
        }
    }

    [Theory]
    [MemberData(nameof(AllLines))]
    public void In_plain_characters_no_cell_is_above_the_tilde(string line) => Visit(new ScreenOptions { Line = line, Ascii = true }, static terminal =>
        terminal.Cells.Should().OnlyContain(static cell => cell.Grapheme.All(static c => c >= ' ' && c <= '~')));

    [Fact]
    public void What_was_typed_stays_typed_where_only_its_picture_is_plain()
    {
        using Terminal terminal = new(new ScreenOptions { Line = "", Ascii = true });
        terminal.Type("Ø25H7");
        terminal.Row(0).Should().StartWith("Feature >?25H7");
        terminal.Bench.Text.Should().Be("Ø25H7");
        terminal.Bench.IsCurrent.Should().BeTrue();
    }

    [Theory]
    [MemberData(nameof(AllLines))]
    public void Without_colour_no_colour_is_sent(string line) => Visit(new ScreenOptions { Line = line, NoColour = true }, static terminal =>
    {
        terminal.Cells.Should().OnlyContain(static cell => cell.Attribute!.Value.Foreground == Color.None && cell.Attribute.Value.Background == Color.None);
        ColoursOf(terminal.Ansi).Should().BeEmpty();
    });

    [Fact]
    public void With_colour_only_the_terminals_own_sixteen_are_sent()
    {
        List<string> colours = [];
        Visit(new ScreenOptions(), terminal => colours.AddRange(ColoursOf(terminal.Ansi)));
        colours.Should().NotBeEmpty().And.OnlyContain(static code => Regex.IsMatch(code, "^(3[0-7]|9[0-7])$"), "the ground stays the terminal's own");
    }

    /// <summary>A person who sees no colour loses nothing: the characters are the same.</summary>
    [Fact]
    public void Nothing_is_told_by_colour_alone()
    {
        foreach (string line in Lines)
        {
            using Terminal colour = new(new ScreenOptions { Line = line });
            using Terminal mono = new(new ScreenOptions { Line = line, NoColour = true });
            mono.Text.Should().Be(colour.Text);
        }
    }

    /// <summary>Where an ink does mean something, a character says it too: the chosen row has a pointer, problems have their marks.</summary>
    [Fact]
    public void The_chosen_operation_has_a_pointer_beside_its_ink()
    {
        using Terminal terminal = new(plan: SamplePlan.For);
        terminal.Press("Tab", "Down");
        Enumerable.Range(10, 10).Count(y => terminal.Row(y).StartsWith(Pen.Blocks.Pointer)).Should().Be(1);
        Enumerable.Range(10, 10).Single(y => terminal.Row(y).StartsWith(Pen.Blocks.Pointer)).Should().Be(
            Enumerable.Range(10, 10).Single(y => terminal.Row(y).Contains("20 finish cutting", StringComparison.Ordinal) && !terminal.Row(y).StartsWith('─')));
    }

    /// <summary>Colour codes of SGR sequences, without the two that give the terminal's own back.</summary>
    private static List<string> ColoursOf(string ansi) =>
    [
        .. Regex.Matches(ansi, "\u001b\\[([0-9;]*)m").SelectMany(static match => match.Groups[1].Value.Split(';'))
            .Where(static code => Regex.IsMatch(code, "^(3[0-8]|4[0-8]|9[0-7]|10[0-7])$")),
    ];
}
