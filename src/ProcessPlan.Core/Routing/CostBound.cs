using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Shop;

namespace ProcessPlan.Core.Routing;

/// <summary>
/// A bound from below for what a chain still costs: the set-up and handling of the machine that the step stands on, and the tool change of each
/// operation that must at least come, on the cheapest machine that does it. Never more than the true cost, so best first stays exact.
/// </summary>
internal sealed class CostBound
{
    private readonly int _quantity;
    private readonly Dictionary<Candidate, double> _restBefore = [];

    /// <param name="job">The job.</param>
    /// <param name="candidates">All processes for it.</param>
    /// <param name="mayPrecede">Whether the first may stand before the second, on the way.</param>
    public CostBound(Job job, IReadOnlyList<Candidate> candidates, Func<Candidate, Candidate, bool> mayPrecede)
    {
        _quantity = job.Quantity;
        foreach (Candidate candidate in candidates)
        {
            _restBefore[candidate] = candidate.Process.StartsRough ? 0 : double.PositiveInfinity;
        }

        // The ladder from coarse to fine is short: after as many rounds as there are processes nothing changes any more.
        for (bool changed = true; changed;)
        {
            changed = false;
            foreach (Candidate after in candidates)
            {
                foreach (Candidate before in candidates)
                {
                    if (before.NoAtAll is null && mayPrecede(before, after) && LeastOf(before) + _restBefore[before] < _restBefore[after])
                    {
                        _restBefore[after] = LeastOf(before) + _restBefore[before];
                        changed = true;
                    }
                }
            }
        }
    }

    /// <summary>At least this much is still to come for a good piece.</summary>
    public double Of(Step step)
    {
        Machine machine = step.Machine!;
        double own = machine.RatePerMinute * (machine.SetUpMinutes / _quantity + machine.HandlingMinutes + machine.ToolChangeMinutes);
        double rest = _restBefore[step.Candidate!];
        return own + (step.IsLast ? 0 : double.IsPositiveInfinity(rest) ? 0 : rest);
    }

    private static double LeastOf(Candidate candidate)
    {
        double least = double.PositiveInfinity;
        foreach (Machine machine in candidate.Machines)
        {
            least = Math.Min(least, machine.RatePerMinute * machine.ToolChangeMinutes);
        }

        return least;
    }
}
