using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Shop;

namespace ProcessPlan.Core.Routing;

/// <summary>
/// A bound from below for the operations that must at least stand before a step: each on its cheapest machine, without handling, set-up or stock,
/// at the smallest size it could have. Never more than the true cost, so best first stays exact.
/// </summary>
internal sealed class CostBound
{
    private readonly Dictionary<Candidate, double> _before = new(ReferenceEqualityComparer.Instance);

    /// <param name="job">The job.</param>
    /// <param name="data">Speeds and feeds of its material.</param>
    /// <param name="drills">The shop's drills for it.</param>
    /// <param name="candidates">All processes for it.</param>
    /// <param name="mayStart">Whether a process can begin a route.</param>
    /// <param name="mayPrecede">Whether the first may stand before the second.</param>
    public CostBound(
        Job job, CuttingData data, Drills drills, IReadOnlyList<Candidate> candidates, Predicate<Candidate> mayStart, Func<Candidate, Candidate, bool> mayPrecede)
    {
        Dictionary<Candidate, double> own = new(ReferenceEqualityComparer.Instance);
        foreach (Candidate candidate in candidates)
        {
            _before[candidate] = mayStart(candidate) ? 0 : double.PositiveInfinity;
            own[candidate] = candidate.NoAtAll is null ? LeastOf(candidate, job, data, drills) : double.PositiveInfinity;
        }

        // The ladder from coarse to fine is short: after a few rounds nothing changes any more.
        for (bool changed = true; changed;)
        {
            changed = false;
            foreach (Candidate after in candidates)
            {
                foreach (Candidate before in candidates)
                {
                    double least = own[before] + _before[before];
                    if (least < _before[after] && mayPrecede(before, after))
                    {
                        _before[after] = least;
                        changed = true;
                    }
                }
            }
        }
    }

    /// <summary>At least this much comes before the step for a good piece; infinite where no chain can reach the blank.</summary>
    public double Before(Candidate candidate) => _before[candidate];

    private static double LeastOf(Candidate candidate, Job job, CuttingData data, Drills drills)
    {
        Process process = candidate.Process;
        double least = double.PositiveInfinity;
        foreach (Machine machine in candidate.Machines)
        {
            double cutting = process.SizedBy switch
            {
                ToolUse.Drill => drills.LeastCost(machine),
                null => machine.RatePerMinute * CutTime.For(new Cut(
                    process, data, job.IsInternal ? process.Smallest : job.Feature.Limits.Min, job.Extent, new Values.Stock(0), process.LeftRa, Effort.Routine)).Minutes,
                _ => 0,
            };
            least = Math.Min(least, machine.RatePerMinute * machine.ToolChangeMinutes + cutting);
        }

        return least;
    }
}
