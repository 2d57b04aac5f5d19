using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Shop;

namespace ProcessPlan.Core;

/// <summary>The whole job: a feature and a shop in, a plan out.</summary>
public static class Planner
{
    /// <param name="feature">What the drawing asks for.</param>
    /// <param name="shop">What the shop owns and charges.</param>
    /// <param name="routes">How many truly different routes at most, 1 or more.</param>
    public static Plan Plan(Feature feature, ShopFloor shop, int routes = 1)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(routes, 1);
        Job job = new(feature, shop);
        List<Candidate> candidates = Candidate.Judge(job, shop);
        RouteSearch search = new(job, shop, candidates);
        List<Step> chains = search.Find(routes);
        RouteWriter writer = new(job, shop, search);
        List<Route> found = [];
        foreach (Step chain in chains)
        {
            found.Add(writer.Write(chain, found.Count + 1));
        }

        return new Plan
        {
            Job = job,
            Routes = found,
            Refusal = found.Count > 0 ? null : RefusalWriter.Write(job, shop, candidates, search),
            Rejected = [.. Rejected(candidates)],
            Queries = [.. job.Queries, .. Advice.Queries(job)],
            Cautions = [.. Advice.Cautions(job)],
            Assumptions = [.. job.Assumptions, .. Advice.Assumptions(job, shop)],
            Expanded = search.Expanded,
        };
    }

    private static IEnumerable<Rejection> Rejected(List<Candidate> candidates)
    {
        foreach (Candidate candidate in candidates)
        {
            if (candidate.WhyNot is { } because)
            {
                yield return new Rejection(candidate.Process.Name, because);
            }
        }
    }
}
