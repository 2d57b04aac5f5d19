using ProcessPlan.Core;
using ProcessPlan.Core.Features;

namespace ProcessPlan.Tui;

/// <summary>Plans beside the screen, one line at a time: while one is being planned only the newest of those behind it is kept.</summary>
internal sealed class Reckoner
{
    private readonly Func<Feature, Plan> _plan;
    private readonly Action<Action> _aside;
    private readonly Action<Action> _onScreen;
    private readonly Action<Answer> _deliver;
    private (string Line, FeatureRequest Request)? _next;
    private bool _busy;

    /// <param name="plan">Plans one feature.</param>
    /// <param name="aside">Runs work away from the screen.</param>
    /// <param name="onScreen">Runs work on the screen's own thread, the only one that touches this object's state.</param>
    /// <param name="deliver">Takes each answer, on the screen's thread.</param>
    public Reckoner(Func<Feature, Plan> plan, Action<Action> aside, Action<Action> onScreen, Action<Answer> deliver)
    {
        (_plan, _aside, _onScreen, _deliver) = (plan, aside, onScreen, deliver);
    }

    /// <summary>Asks for the answer to a line; an older line that still waits is dropped. On the screen's thread.</summary>
    public void Ask(string line, FeatureRequest request)
    {
        _next = (line, request);
        if (!_busy)
        {
            Begin();
        }
    }

    private void Begin()
    {
        if (_next is not { } job)
        {
            return;
        }

        (_busy, _next) = (true, null);
        _aside(() =>
        {
            try
            {
                Answer answer = new(job.Line, job.Request, [.. job.Request.Features.Select(_plan)]);
                _onScreen(() => Finish(answer));
            }
            catch (Exception fault)
            {
                // A fault of the planner is the program's fault: it ends the screen in the open, on the thread that can.
                _onScreen(() => throw new InvalidOperationException($"'{job.Line}' cannot be planned: {fault.Message}", fault));
            }
        });
    }

    private void Finish(Answer answer)
    {
        _busy = false;
        _deliver(answer);
        Begin();
    }
}
