using ProcessPlan.Core;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui.Pages;

namespace ProcessPlan.Tui.Tests;

/// <summary>A person at the keyboard.</summary>
public class BenchViewTests
{
    [Fact]
    public void The_first_line_is_answered_by_the_handbook_shop()
    {
        using Terminal terminal = new();
        Plan plan = Planner.Plan(terminal.Bench.Feature!, Terminal.Shop, 5);
        terminal.Text.Should().Contain("25.021 mm").And.Contain("25.000 mm").And.Contain("+21 µm")
            .And.Contain($"route 1 of {plan.Routes.Count}: {plan.Routes[0].CostPerPiece} a piece")
            .And.Contain($"start {plan.Routes[0].Blanks}");
        plan.Routes[0].Operations.Should().AllSatisfy(operation => terminal.Text.Should().Contain(operation.Process));
    }

    [Fact]
    public void The_first_character_typed_replaces_the_example()
    {
        using Terminal terminal = new();
        terminal.Type("hole 12H7");
        terminal.Bench.Text.Should().Be("hole 12H7");
        terminal.Bench.IsCurrent.Should().BeTrue();
        terminal.Press([.. Enumerable.Repeat("Ctrl+Z", "hole 12H7".Length)]);
        terminal.Bench.Text.Should().Be(ScreenOptions.FirstLine, "it can be taken back");
    }

    [Theory]
    [InlineData("F2")]
    [InlineData("F1", "Esc")]
    [InlineData("Tab", "Down", "Esc")]
    public void Looking_around_first_leaves_the_example_to_be_replaced(params string[] keys)
    {
        using Terminal terminal = new();
        terminal.Press(keys).Type("hole 12H7");
        terminal.Bench.Text.Should().Be("hole 12H7");
    }

    [Theory]
    [InlineData("End", ScreenOptions.FirstLine + "x")]
    [InlineData("Home", "x" + ScreenOptions.FirstLine)]
    [InlineData("Right", ScreenOptions.FirstLine + "x")]
    public void A_key_that_moves_the_caret_keeps_the_example(string key, string text)
    {
        using Terminal terminal = new();
        terminal.Press(key).Type("x");
        terminal.Bench.Text.Should().Be(text);
    }

    [Fact]
    public void Left_keeps_the_example()
    {
        using Terminal terminal = new();
        terminal.Press("Left").Type("x");
        terminal.Bench.Text.Replace("x", "", StringComparison.Ordinal).Should().Be(ScreenOptions.FirstLine.Replace("x", "", StringComparison.Ordinal));
    }

    [Fact]
    public void Enter_keeps_the_example()
    {
        using Terminal terminal = new();
        terminal.Press("Enter", "Esc").Type("x");
        terminal.Bench.Text.Should().EndWith("x").And.StartWith(ScreenOptions.FirstLine);
    }

    [Fact]
    public void A_click_into_the_line_keeps_the_example()
    {
        using Terminal terminal = new();
        terminal.Click(70, 0).Type("x");
        terminal.Bench.Text.Should().Be(ScreenOptions.FirstLine + "x");
    }

    [Fact]
    public void A_line_of_ones_own_is_gone_on_with()
    {
        using Terminal terminal = new(new ScreenOptions { Line = "hole 12H7" });
        terminal.Type(" C45");
        terminal.Bench.Text.Should().Be("hole 12H7 C45");
    }

    [Fact]
    public void A_new_line_is_empty_and_the_one_before_comes_back()
    {
        using Terminal terminal = new();
        terminal.Press("F5").Row(0).Should().Be("Feature ▸" + new string(' ', 68) + "mm");
        terminal.Type("hole 12H7").Press("Up");
        terminal.Bench.Text.Should().Be(ScreenOptions.FirstLine);
        terminal.Press("Down");
        terminal.Bench.Text.Should().Be("hole 12H7");
        terminal.Press("Tab", "c").Type("4");
        terminal.Bench.Text.Should().Be("4");
    }

    [Fact]
    public void Every_key_press_is_answered_at_once()
    {
        using Terminal terminal = new();
        terminal.Retype("shaft 30 f7");
        terminal.Text.Should().Contain("29.980 mm").And.Contain("29.959 mm");
        terminal.Press("Backspace").Type("8");
        terminal.Text.Should().Contain("29.947 mm", "f8 is wider than f7");
    }

    [Fact]
    public void Marks_stand_under_the_word_that_is_wrong_and_follow_the_caret()
    {
        using Terminal terminal = new();
        terminal.Retype("hole 25H7 fooo x40 baar");
        string line = terminal.Row(0);
        string marks = terminal.Row(1);
        marks.IndexOf("^^^^", StringComparison.Ordinal).Should().Be(line.IndexOf("fooo", StringComparison.Ordinal));
        marks.IndexOf("~~~~", StringComparison.Ordinal).Should().Be(line.IndexOf("baar", StringComparison.Ordinal));
        terminal.Text.Should().Contain("'fooo' is not").And.Contain("and 1 more");
        terminal.Row(2).Should().StartWith("'fooo'");
        terminal.Press("Left");
        terminal.Row(2).Should().StartWith("'baar'");
        terminal.Row(1).IndexOf("^^^^", StringComparison.Ordinal).Should().Be(line.IndexOf("baar", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(80, 24)]
    [InlineData(60, 17)]
    [InlineData(120, 40)]
    public void With_problems_the_size_stays_and_every_problem_can_be_read(int width, int height)
    {
        using Terminal terminal = new(null, width, height, SamplePlan.For);
        terminal.Press("F6").Retype("hole 25H7 x40 thrugh Ra0.8 C45 2O0off");
        terminal.Text.Should().Contain("── hole 25 mm H7; answer to: hole 25H7 x40 thru ").And.Contain(" max  25.021 mm").And.Contain(" aim  25.0105 mm").And.Contain(" min  25.000 mm");
        string shown = terminal.Text;
        for (int i = 0; i < 3; i++)
        {
            shown += terminal.Press("PageDown").Text;
        }

        shown.Should().Contain("── 2 problems in the line ──").And.Contain(" thrugh     'thrugh' is not").And.Contain(" 2O0off     '2O0off' is no material");
        terminal.Retype("hole 25H7").Text.Should().Contain("── notes ──").And.NotContain("problems");
    }

    [Fact]
    public void Problems_are_listed_before_there_is_any_answer()
    {
        using Terminal terminal = new(new ScreenOptions { Line = "" });
        terminal.Type("fooo baar").Text.Should().Contain(" fooo       'fooo'").And.Contain(" baar       'baar'");
    }

    [Fact]
    public void A_click_on_a_listed_problem_chooses_no_operation()
    {
        using Terminal terminal = new(null, 60, 16, SamplePlan.For);
        terminal.Retype("hole 25H7 x40 thrugh Ra0.8 C45 2O0off");
        for (int y = Enumerable.Range(0, 16).First(row => terminal.Row(row).Contains("problems in the line", StringComparison.Ordinal)); y < 15; y++)
        {
            terminal.Click(5, y).Bench.Hand.Should().Be(Hand.Line);
        }
    }

    [Fact]
    public void A_refusal_is_told_above_the_notes()
    {
        using Terminal terminal = new(new ScreenOptions { Line = "hole 25H3 Ra0.1 C45" }, plan: SamplePlan.For);
        terminal.Press("F6").Text.Should().Contain("── no route: No process of this shop finishes 25 H3. ──").And.Contain("── notes ──").And.Contain("cut in solid metal");
    }

    [Fact]
    public void A_line_read_back_is_shown_whole_on_eighty_columns()
    {
        using Terminal terminal = new(new ScreenOptions { Line = "shaft 35 k6 x28 Ra 0.8 42CrMo4 28HRC interrupted runout 0.01 coax 0.02 bar 40 40 off" }, plan: SamplePlan.For);
        terminal.Bench.Problems.Should().BeEmpty();
        terminal.Row(1).Should().StartWith("shaft 35 mm k6, 42CrMo4, 28 HRC, 28 mm long, interrupted, Ra 0.8 µm, run-out", "it goes on below");
        terminal.Row(2).Should().EndWith("from bar 40 mm, 40 off");
        terminal.Row(3).Should().StartWith("! Typical values");
        terminal.Row(4).Should().StartWith("── shaft 35 mm k6");
        terminal.Row(5).Should().StartWith(" max  35.018 mm");
    }

    [Fact]
    public void What_both_features_of_a_fit_have_is_said_once()
    {
        using Terminal terminal = new(new ScreenOptions { Line = "40 H7/k6 x30 Ra0.8 C45 200 off" }, plan: SamplePlan.For);
        terminal.Row(1).Should().Be("hole 40 mm H7, 30 mm deep with shaft 40 mm k6, 30 mm long, both C45, Ra 0.8 µm,");
        terminal.Row(2).Should().Be("200 off");
    }

    [Fact]
    public void Marks_follow_a_line_longer_than_its_field()
    {
        using Terminal terminal = new(new ScreenOptions { Line = "" }, 60, 16);
        terminal.Type("hole 25H7 x40 thru Ra0.8 C45 200off " + "cyl 0.01 round 0.01 interrupted runout 0.01 wrongword");
        string line = terminal.Row(0);
        terminal.Row(1).IndexOf('^').Should().Be(line.IndexOf("wrongword", StringComparison.Ordinal));
        terminal.Row(1).Count(static c => c == '^').Should().Be("wrongword".Length);
    }

    [Fact]
    public void Marks_stand_right_behind_wide_letters()
    {
        using Terminal terminal = new(new ScreenOptions { Line = "" });
        terminal.Type("日本 25H7 fooo");
        terminal.Row(1).Should().Be(new string(' ', BenchPage.FieldColumn) + "^^^^" + new string(' ', 6) + "~~~~", "two letters take four cells");
    }

    [Fact]
    public void Undo_brings_the_line_back_with_its_answer()
    {
        using Terminal terminal = new();
        terminal.Press("End").Type("x");
        terminal.Bench.Problems.Should().NotBeEmpty();
        terminal.Press("Ctrl+Z");
        terminal.Bench.Text.Should().Be(ScreenOptions.FirstLine);
        terminal.Bench.IsCurrent.Should().BeTrue();
        terminal.Row(1).Should().NotContain("^");
    }

    [Fact]
    public void A_kept_line_comes_back_with_the_caret_behind_it()
    {
        using Terminal terminal = new();
        terminal.Press("Enter", "Esc").Retype("40 H7/k6").Press("Up");
        terminal.Bench.Text.Should().Be(ScreenOptions.FirstLine);
        terminal.Type(" interrupted");
        terminal.Bench.Text.Should().Be(ScreenOptions.FirstLine + " interrupted");
    }

    [Fact]
    public void Going_to_the_route_and_back_keeps_the_line_unmarked()
    {
        using Terminal terminal = new();
        terminal.Press("Home", "Tab", "Esc").Type("a");
        terminal.Bench.Text.Should().Be("a" + ScreenOptions.FirstLine);
    }

    [Fact]
    public void Letters_act_on_the_route_and_are_letters_on_the_line()
    {
        using Terminal terminal = new();
        terminal.Press("u");
        terminal.Bench.Text.Should().Be("u");
        terminal.Press("Ctrl+Z", "Tab", "U");
        terminal.Bench.Unit.Should().Be(LengthUnit.Inch);
        terminal.Press("u");
        terminal.Bench.Unit.Should().Be(LengthUnit.Millimetre);
    }

    [Fact]
    public void A_click_on_an_operation_looks_at_it_and_a_click_on_the_line_goes_back()
    {
        using Terminal terminal = new(plan: SamplePlan.For);
        int row = Enumerable.Range(0, terminal.Height).First(y => terminal.Row(y).StartsWith("  30 ", StringComparison.Ordinal));
        terminal.Click(10, row);
        (terminal.Bench.Hand, terminal.Bench.Operation!.Number).Should().Be((Hand.Route, 30));
        terminal.Click(12, 0);
        terminal.Bench.Hand.Should().Be(Hand.Line);
        terminal.Type("y");
        terminal.Bench.Text.Should().Contain("y", "the line takes letters again");
    }

    [Fact]
    public void While_a_plan_is_made_the_screen_says_so_and_takes_keys()
    {
        Queue<Action> held = [];
        using Terminal terminal = new(plan: SamplePlan.For, aside: held.Enqueue);
        terminal.Row(1).Should().Be("…");
        held.Dequeue()();
        terminal.Settle().Row(1).Should().StartWith("hole 25 mm H7");
        terminal.Retype("shaft 30 f7");
        terminal.Row(1).Should().Be("…");
        terminal.Text.Should().Contain("answer to: " + ScreenOptions.FirstLine).And.Contain("25.021 mm");
        while (held.TryDequeue(out Action? work))
        {
            work();
        }

        terminal.Settle().Text.Should().NotContain("answer to:").And.Contain("29.980 mm");
    }

    [Fact]
    public void A_fault_of_the_planner_ends_the_screen_in_the_open()
    {
        Action open = static () => new Terminal(plan: static _ => throw new InvalidOperationException("no such row")).Dispose();
        open.Should().Throw<InvalidOperationException>().WithMessage("*cannot be planned: no such row");
    }

    [Fact]
    public void Ctrl_Q_leaves_and_Esc_does_not()
    {
        using Terminal terminal = new();
        terminal.Press("Esc", "Esc", "Esc");
        terminal.IsRunning.Should().BeTrue();
        terminal.Press("Ctrl+Q");
        terminal.IsRunning.Should().BeFalse();
    }

    [Fact]
    public void A_small_window_comes_back_to_what_it_showed()
    {
        using Terminal terminal = new();
        string before = terminal.Text;
        terminal.Resize(59, 24).Text.Should().StartWith("Window too small: 59 x 24.");
        terminal.Resize(80, 15).Text.Should().StartWith("Window too small: 80 x 15.");
        terminal.Type("letters typed blind").Press("F2", "F4", "Tab").Resize(80, 24).Text.Should().Be(before, "nothing is done that is not shown");
    }

    [Fact]
    public void A_small_window_can_be_left()
    {
        using Terminal terminal = new(width: 20, height: 5);
        terminal.Press("Ctrl+Q").IsRunning.Should().BeFalse();
    }

    [Fact]
    public void Resizing_at_any_moment_keeps_every_page_whole()
    {
        using Terminal terminal = new();
        terminal.Press("End");
        Random sizes = new(7);
        string[] keys = ["F1", "Esc", "F3", "Esc", "F6", "Tab", "?", "Esc", "F4", "F2"];
        for (int i = 0; i < 300; i++)
        {
            terminal.Resize(sizes.Next(1, 200), sizes.Next(1, 60)).Press(keys[i % keys.Length]);
        }

        terminal.Press("Esc", "Esc").Resize(80, 24);
        terminal.Row(0).Should().StartWith("Feature").And.Contain(ScreenOptions.FirstLine);
    }

    [Fact]
    public void Twenty_thousand_random_keys_raise_nothing()
    {
        using Terminal terminal = new(plan: SamplePlan.For);
        Random random = new(20_261_201);
        string[] names =
        [
            .. KeyChart.Everywhere.Concat(KeyChart.OnLine).Concat(KeyChart.OnRoute).Select(static stroke => stroke.Key).Where(static key => key != "Ctrl+Q").Distinct(),
            "Left", "Right", "Home", "End", "Delete", "Backspace", "Backspace", "Ctrl+A", "Ctrl+Z", "Ctrl+Y", "Ctrl+K", "Shift+Left", "Ctrl+Left",
            "F5", "F10", "F11", "F12", "Ctrl+F5", "Shift+F10", "Shift+Tab", "Ctrl+X", "Insert",
        ];
        const string Letters = "hole shaft 25H7 k6 x40 thru Ra0.8 C45 200off ±.,/-+=Øµ日?";
        for (int i = 0; i < 20_000; i++)
        {
            switch (random.Next(40))
            {
                case 0:
                    terminal.Retype(HelpPage.Examples[random.Next(HelpPage.Examples.Count)]);
                    break;
                case < 16:
                    terminal.Inject(names[random.Next(names.Length)]);
                    break;
                default:
                    terminal.Inject(Letters[random.Next(Letters.Length)].ToString());
                    break;
            }

            if (i % 50 == 0)
            {
                terminal.Settle();
            }
        }

        terminal.IsRunning.Should().BeTrue();
        terminal.Press("Esc", "Esc", "Tab", "Esc").Retype("hole 30H7");
        terminal.Bench.Text.Should().Be("hole 30H7");
        terminal.Bench.IsCurrent.Should().BeTrue("the bench still answers");
    }
}
