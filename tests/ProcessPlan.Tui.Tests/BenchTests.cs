using ProcessPlan.Core;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Tui.Tests;

/// <summary>The bench without its screen.</summary>
public class BenchTests
{
    private const string Line = "hole 25H7 x40 thru Ra0.8 C45 200off";

    private static Bench Answered(string line = Line)
    {
        Bench bench = new(Terminal.Shop.Names);
        Answer(bench, line);
        return bench;
    }

    private static void Answer(Bench bench, string line)
    {
        bench.Type(line);
        FeatureRequest request = bench.Waiting!;
        bench.Take(new Answer(line, request, [.. request.Features.Select(SamplePlan.For)]));
    }

    [Fact]
    public void A_line_that_was_read_waits_for_its_answer()
    {
        Bench bench = new(Terminal.Shop.Names);
        bench.Type(Line);
        bench.Waiting!.First.Nominal.Should().Be(Length.FromMillimetres(25));
        bench.Answer.Should().BeNull();
        bench.IsCurrent.Should().BeFalse();
    }

    [Fact]
    public void The_first_line_stands_there_before_it_is_read()
    {
        Bench bench = new(Terminal.Shop.Names, Line);
        (bench.Text, bench.IsRead).Should().Be((Line, false));
        bench.Type(Line);
        bench.IsRead.Should().BeTrue();
        bench.Waiting.Should().NotBeNull();
    }

    [Fact]
    public void A_half_typed_line_keeps_the_last_answer_and_calls_it_old()
    {
        Bench bench = Answered();
        bench.Type(Line + " hardend");
        bench.Waiting.Should().BeNull();
        bench.Problems.Should().ContainSingle().Which.Message.Should().Contain("hardend");
        bench.Answer!.Line.Should().Be(Line);
        bench.IsCurrent.Should().BeFalse();
    }

    [Fact]
    public void A_line_typed_back_needs_no_new_answer()
    {
        Bench bench = Answered();
        bench.Type(Line + "x");
        bench.Type(Line);
        bench.IsCurrent.Should().BeTrue();
        bench.Waiting.Should().BeNull();
    }

    [Fact]
    public void An_answer_to_an_older_line_is_dropped()
    {
        Bench bench = new(Terminal.Shop.Names);
        bench.Type(Line);
        FeatureRequest older = bench.Waiting!;
        bench.Type("shaft 30 f7 C45");
        bench.Take(new Answer(Line, older, [SamplePlan.For(older.First)]));
        bench.Answer.Should().BeNull();
    }

    [Theory]
    [InlineData(0, "fooo")]
    [InlineData(5, "fooo")]
    [InlineData(11, "fooo")]
    [InlineData(14, "baar")]
    [InlineData(17, "baar")]
    [InlineData(18, "fooo")]
    public void The_problem_in_which_the_caret_stands_is_told_else_the_first(int caret, string word)
    {
        Bench bench = new(Terminal.Shop.Names);
        bench.Type("25H7 fooo x40 baar");
        bench.Problems.Should().HaveCount(2);
        bench.ProblemTold(caret)!.Message.Should().Contain(word);
    }

    [Fact]
    public void Problems_stand_in_the_order_of_the_line()
    {
        Bench bench = new(Terminal.Shop.Names);
        bench.Type("Ra0 25H7 fooo x0 baar cyl 99");
        bench.Problems.Count.Should().BeGreaterThan(2);
        bench.Problems.Should().BeInAscendingOrder(static problem => problem.At);
    }

    [Fact]
    public void Without_a_problem_there_is_none_to_tell() => Answered().ProblemTold(3).Should().BeNull();

    [Fact]
    public void Kept_lines_come_back_and_the_one_being_typed_is_not_lost()
    {
        Bench bench = Answered();
        bench.Enter();
        Answer(bench, "shaft 30 f7 C45");
        bench.Enter();
        bench.Type("40 H7/k");
        bench.Earlier();
        bench.Text.Should().Be("shaft 30 f7 C45");
        bench.Earlier();
        bench.Text.Should().Be(Line);
        bench.Earlier();
        bench.Text.Should().Be(Line);
        bench.Later();
        bench.Later();
        bench.Text.Should().Be("40 H7/k");
        bench.Later();
        bench.Text.Should().Be("40 H7/k");
    }

    [Fact]
    public void A_line_that_was_not_read_is_not_kept()
    {
        Bench bench = Answered();
        bench.Enter();
        bench.Type("hole 25H7 fooo");
        bench.Enter();
        bench.Earlier();
        bench.Text.Should().Be(Line);
        bench.Hand.Should().Be(Hand.Route, "the first line was kept and led there");
    }

    [Fact]
    public void The_same_line_is_kept_once()
    {
        Bench bench = Answered();
        bench.Enter();
        bench.Enter();
        bench.Type("");
        bench.Earlier();
        bench.Earlier();
        bench.Later();
        bench.Text.Should().Be("");
    }

    [Fact]
    public void Routes_go_round_and_keep_the_operation_within_the_route()
    {
        Bench bench = Answered();
        bench.NextRoute();
        bench.ChooseOperation(99);
        bench.Operation!.Number.Should().Be(40);
        bench.NextRoute();
        bench.RouteAt.Should().Be(0);
        bench.Operation!.Number.Should().Be(30);
    }

    [Fact]
    public void A_new_answer_starts_at_its_cheapest_route()
    {
        Bench bench = Answered();
        bench.NextRoute();
        Answer(bench, Line + " interrupted");
        bench.RouteAt.Should().Be(0);
    }

    [Fact]
    public void A_fit_has_two_features_to_look_at_and_a_single_one_has_one()
    {
        Bench bench = Answered("40 H7/k6 C45");
        bench.IsFit.Should().BeTrue();
        bench.Feature!.Kind.Should().Be(FeatureKind.Hole);
        bench.OtherFeature();
        bench.Feature!.Kind.Should().Be(FeatureKind.Shaft);
        Answer(bench, Line);
        bench.Feature!.Kind.Should().Be(FeatureKind.Hole);
        bench.OtherFeature();
        bench.FeatureAt.Should().Be(0);
    }

    [Fact]
    public void A_refusal_leaves_the_hand_on_the_line()
    {
        Bench bench = Answered();
        bench.GoTo(Hand.Route);
        Answer(bench, "hole 25H3 Ra0.1 C45");
        bench.Hand.Should().Be(Hand.Line);
        bench.GoTo(Hand.Route);
        bench.Hand.Should().Be(Hand.Line);
        bench.Operation.Should().BeNull();
    }

    [Fact]
    public void Going_back_never_leaves_the_program()
    {
        Bench bench = Answered();
        bench.GoTo(Hand.Route);
        bench.Turn(Page.Help);
        bench.Back();
        (bench.Page, bench.Hand).Should().Be((Page.Bench, Hand.Route));
        bench.Back();
        bench.Hand.Should().Be(Hand.Line);
        bench.Back();
        bench.QuitAsked.Should().BeFalse();
    }

    [Fact]
    public void Big_digits_go_from_the_drawing_to_each_operation()
    {
        Bench bench = Answered();
        bench.Enlarge();
        bench.BigDrawing.Should().BeTrue();
        bench.NextBig();
        (bench.BigDrawing, bench.OperationAt).Should().Be((false, 0));
        bench.NextBig();
        bench.OperationAt.Should().Be(1);
        bench.PreviousBig();
        bench.PreviousBig();
        bench.BigDrawing.Should().BeTrue();
    }

    [Fact]
    public void An_empty_line_has_no_problem_and_asks_nothing()
    {
        Bench bench = Answered();
        bench.Type("   ");
        bench.Problems.Should().BeEmpty();
        bench.Waiting.Should().BeNull();
        bench.Enter();
        bench.Hand.Should().Be(Hand.Line);
    }

    [Fact]
    public void The_handbook_shop_answers_the_first_line()
    {
        Bench bench = new(Terminal.Shop.Names);
        bench.Type(ScreenOptions.FirstLine);
        FeatureRequest request = bench.Waiting!;
        bench.Take(new Answer(ScreenOptions.FirstLine, request, [Planner.Plan(request.First, Terminal.Shop, 5)]));
        bench.Route!.Operations.Should().NotBeEmpty();
        bench.Route.Operations[^1].Size.Should().Be(request.First.Limits);
    }
}
