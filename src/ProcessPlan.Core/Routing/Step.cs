using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Inspection;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>One step of a chain that grows backwards from the drawing; the last to be put on is the blank.</summary>
internal sealed record Step
{
    private (MetalWindow? Window, double Minutes) _checking;

    /// <summary>The process, or null for the blank.</summary>
    public Candidate? Candidate { get; init; }

    public Machine? Machine { get; init; }

    public Tool? Tool { get; init; }

    public Effort Effort { get; init; }

    /// <summary>What it leaves; for a blank its own limits, null in solid metal.</summary>
    public MetalWindow? Leaving { get; init; }

    /// <summary>
    /// Where the cut really ends: the window itself for a step on the way; for the last one only what its tool is predicted to cut of the drawing's
    /// window, or what its process holds from the near limit, so that a wider tolerance asks for nothing more.
    /// </summary>
    public MetalWindow Reach { get; init; }

    /// <summary>Whether the chain leaves the handbook's stock where that is larger than the analytical one.</summary>
    public bool ByHandbook { get; init; }

    /// <summary>Whether the last step is held to less than the drawing allows, because it takes so little.</summary>
    public bool IsHeldInside { get; init; }

    /// <summary>The step after it; null for the last one.</summary>
    public Step? Next { get; init; }

    /// <summary>Sizes that the next step starts from, after the changes between; null where that cuts in solid metal.</summary>
    public MetalWindow? NextEntering { get; init; }

    /// <summary>The part comes onto its machine for the next step.</summary>
    public bool NextArrives { get; init; }

    /// <summary>Changes between this step and the next, or after the last one.</summary>
    public Change[] ChangesAfter { get; init; } = [];

    /// <summary>Changes that still have to come before this step.</summary>
    public int ChangesLeft { get; init; }

    /// <summary>Share of good pieces of this step.</summary>
    public double Yield { get; init; } = 1;

    /// <summary>Share of good pieces of this and all later steps.</summary>
    public double YieldToEnd { get; init; } = 1;

    /// <summary>Whether this or a later step puts the axis right.</summary>
    public bool Places { get; init; }

    /// <summary>Cost of a good piece of all later steps; what this step costs depends on what comes before it.</summary>
    public double Settled { get; init; }

    /// <summary>What a blank is, in words.</summary>
    public string? BlankName { get; init; }

    /// <summary>Minutes for measuring one piece; it depends on the step's own window only, and is asked for often.</summary>
    public double Checking(Job job)
    {
        if (_checking.Window != Leaving)
        {
            Instrument instrument = Instrument.For(job.IsInternal, job.Nominal, new Deviation(Window.Width)).Instrument;
            _checking = (Leaving, instrument.MinutesPerCheck * Checks.PerPiece(Process, Effort));
        }

        return _checking.Minutes;
    }

    public Process Process => Candidate!.Process;

    public MetalWindow Window => Leaving!.Value;

    public bool IsLast => Next is null;

    public bool IsBlank => Candidate is null;

    /// <summary>The operations in words, by which two routes are the same or truly different.</summary>
    public string Sequence()
    {
        System.Text.StringBuilder text = new();
        for (Step? step = this; step is not null; step = step.Next)
        {
            text.Append(step.Candidate?.Process.Name).Append('|');
        }

        return text.ToString();
    }
}

/// <summary>A joint that could not be closed.</summary>
/// <param name="Process">The operation.</param>
/// <param name="Before">The operation or blank before it.</param>
/// <param name="ShortBy">By how much the window is too narrow.</param>
internal sealed record Closure(string Process, string Before, Deviation ShortBy);
