using ProcessPlan.Core.Values;

namespace ProcessPlan.Tui.Tests;

/// <summary>What a person sees, character by character.</summary>
public class SnapshotTests
{
    private const string Fit = "40 H7/k6 C45";
    private const string LongFit = "40 H7/k6 x30 Ra0.8 42CrMo4 28HRC interrupted cyl 0.01 200 off";
    private const string Refused = "hole 25H3 Ra0.1 C45";
    private const string Wrong = "hole 25H7 x40 thrugh Ra0.8 C45 2O0off";

    public static TheoryData<int, int> Sizes => new() { { 80, 24 }, { 120, 40 }, { 200, 60 }, { 60, 16 } };

    private static Terminal Open(int width, int height, string line = ScreenOptions.FirstLine, bool ascii = false, LengthUnit unit = LengthUnit.Millimetre) =>
        new(new ScreenOptions { Line = line, Ascii = ascii, Unit = unit }, width, height, SamplePlan.For);

    private static void Looks(Terminal terminal, string name) => Snapshot.Matches(terminal.Text.TrimEnd('\n'), $"{name} {terminal.Width}x{terminal.Height}");

    [Theory]
    [MemberData(nameof(Sizes))]
    public void The_bench_answers_the_first_line(int width, int height)
    {
        using Terminal terminal = Open(width, height);
        Looks(terminal, "bench");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void A_fit_shows_both_zones(int width, int height)
    {
        using Terminal terminal = Open(width, height, Fit);
        Looks(terminal.Press("F9"), "fit");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Problems_are_marked_and_the_old_answer_is_called_old(int width, int height)
    {
        using Terminal terminal = Open(width, height);
        Looks(terminal.Retype(Wrong), "problems");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void A_refusal_says_what_would_open_it(int width, int height)
    {
        using Terminal terminal = Open(width, height, Refused);
        Looks(terminal, "refusal");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void A_refusal_is_seen_above_the_notes_too(int width, int height)
    {
        using Terminal terminal = Open(width, height, Refused);
        Looks(terminal.Press("F6"), "refusal notes");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void A_long_fit_is_read_back_whole(int width, int height)
    {
        using Terminal terminal = Open(width, height, LongFit);
        Looks(terminal, "long fit");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Inches_are_shown_for_the_whole_screen(int width, int height)
    {
        using Terminal terminal = Open(width, height);
        Looks(terminal.Press("F2"), "inch");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void The_second_route_shows_its_price_gap_and_the_chosen_operation(int width, int height)
    {
        using Terminal terminal = Open(width, height);
        Looks(terminal.Press("F4", "Tab", "Down", "Down"), "second route");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void The_notes_stand_below_the_route(int width, int height)
    {
        using Terminal terminal = Open(width, height, Fit);
        Looks(terminal.Press("F6"), "notes");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Big_digits_fill_the_screen(int width, int height)
    {
        using Terminal terminal = Open(width, height);
        Looks(terminal.Press("F3"), "big");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void The_help_lists_words_and_keys(int width, int height)
    {
        using Terminal terminal = Open(width, height);
        Looks(terminal.Press("F1"), "help");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void The_words_of_the_line_are_one_key_away(int width, int height)
    {
        using Terminal terminal = Open(width, height);
        Looks(terminal.Press("F1", "Tab"), "words");
    }

    [Theory]
    [MemberData(nameof(Sizes))]
    public void Plain_characters_draw_the_same_bench(int width, int height)
    {
        using Terminal terminal = Open(width, height, Fit, ascii: true);
        Looks(terminal, "ascii");
    }

    [Fact]
    public void An_inch_line_keeps_its_own_figures()
    {
        using Terminal terminal = Open(80, 24, "hole .2500 +.0005 -.0000 in x .5 6061 blind", unit: LengthUnit.Inch);
        Looks(terminal, "inch line");
    }

    [Fact]
    public void A_window_too_small_says_so()
    {
        using Terminal terminal = Open(50, 12);
        Looks(terminal, "too small");
    }

    [Fact]
    public void An_empty_line_asks_for_a_feature()
    {
        using Terminal terminal = Open(80, 24, "");
        Looks(terminal, "empty");
    }
}
