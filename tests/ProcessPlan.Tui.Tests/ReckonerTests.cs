using ProcessPlan.Core.Features;

namespace ProcessPlan.Tui.Tests;

/// <summary>Planning beside the screen, with the work in the test's own hands.</summary>
public class ReckonerTests
{
    private readonly Queue<Action> _aside = [];
    private readonly List<string> _planned = [];
    private readonly List<string> _delivered = [];

    private Reckoner Make(Action<Feature>? before = null) => new(
        feature =>
        {
            before?.Invoke(feature);
            _planned.Add(feature.Nominal.Format());
            return SamplePlan.For(feature);
        },
        _aside.Enqueue, static work => work(), answer => _delivered.Add(answer.Line));

    private static FeatureRequest Read(string line) => FeatureLine.Parse(line, Terminal.Shop.Names).Value!;

    private static void Ask(Reckoner reckoner, string line) => reckoner.Ask(line, Read(line));

    [Fact]
    public void The_newest_line_is_planned_next_and_those_between_never()
    {
        Reckoner reckoner = Make();
        Ask(reckoner, "hole 20H7");
        Ask(reckoner, "hole 21H7");
        Ask(reckoner, "hole 22H7");
        Ask(reckoner, "hole 23H7");
        _aside.Should().ContainSingle("one line is planned at a time");
        while (_aside.TryDequeue(out Action? work))
        {
            work();
        }

        _planned.Should().Equal("20", "23");
        _delivered.Should().Equal("hole 20H7", "hole 23H7");
    }

    [Fact]
    public void A_fit_is_planned_for_both_features()
    {
        Ask(Make(), "40 H7/k6 C45");
        _aside.Dequeue()();
        _planned.Should().Equal("40", "40");
    }

    [Fact]
    public void A_fault_of_the_planner_is_told_with_the_line_and_not_swallowed()
    {
        Ask(Make(static _ => throw new InvalidOperationException("no such row")), "hole 20H7");
        Action work = _aside.Dequeue();
        work.Should().Throw<InvalidOperationException>().WithMessage("'hole 20H7' cannot be planned: no such row");
    }
}
