using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core;

/// <summary>Says why the search found nothing.</summary>
internal static class RefusalWriter
{
    public static Refusal Write(Job job, ShopFloor shop, IReadOnlyList<Candidate> candidates, RouteSearch search)
    {
        string asked = Asked(job);
        if (search.ClosedChange is { } change)
        {
            string[] ways = change.Covers
                ? ["Ask the designer: limits before the coating, a closer thickness, or masking.", "Coat over size and grind to the drawing."]
                : ["A process that cuts the hard metal to size after it: grinding, hard turning, wire cutting.", "Ask the designer whether a wider tolerance serves."];
            return new Refusal(asked,
                $"No window exists before {change.Process}: it moves the size by {change.LeastGrowth} to {change.MostGrowth}, the tolerance is {job.Feature.Limits.Width.Format()} µm.",
                Best(job, candidates),
                ways);
        }

        List<Candidate> finishing = [.. candidates.Where(static candidate => candidate.Finishes is not null)];
        if (finishing.Count == 0)
        {
            return new Refusal(asked, $"No process of this shop finishes {asked}.", Best(job, candidates), WouldOpen(job, shop, candidates));
        }

        string finishers = string.Join(", ", finishing.Select(static candidate => candidate.Process.Name));
        string message = search.BlankMiss is { } blank
            ? $"{finishers} could finish it, but no first cut suits the blank: {blank.Before} is {blank.ShortBy.Format()} µm out of what {blank.Process} can start from."
            : job.Hrc > Job.HardFromHrc && !candidates.Any(static candidate => candidate.NoAtAll is null && candidate.CutsSoft && candidate.Process.StartsRough)
            ? $"The metal has {job.Hrc:0} HRC as delivered: nothing of this shop opens it from the blank."
            : job.AsksForPosition && !candidates.Any(PutsTheAxisRight)
            ? $"{finishers} could finish it, but nothing before puts the axis right."
            : search.NearestMiss is { } miss
                ? $"{finishers} could finish it, but the window between {miss.Before} and {miss.Process} is too narrow by {miss.ShortBy.Format()} µm at the nearest."
                : $"{finishers} could finish it, but nothing of this shop can come before, or the tool of its size is missing.";
        return new Refusal(asked, message, Best(job, candidates), WouldOpen(job, shop, candidates));
    }

    private static bool PutsTheAxisRight(Candidate candidate) => candidate.NoAtAll is null && !candidate.Process.Follows;

    private static string Asked(Job job)
    {
        string size = job.Feature.Class is { } toleranceClass
            ? $"{job.Nominal.Format()} {toleranceClass}"
            : $"{job.Feature.Limits.Min.Format(3)} to {job.Feature.Limits.Max.Format(3)}";
        return job.Feature.Finish is { } finish ? $"{size} with {finish}" : size;
    }

    /// <summary>The finest tolerance and the finest roughness, each with its process.</summary>
    private static string Best(Job job, IReadOnlyList<Candidate> candidates)
    {
        Candidate? finest = null;
        Candidate? smoothest = null;
        foreach (Candidate candidate in candidates)
        {
            if (candidate.NoAtAll is not null || job.Nominal > candidate.Process.Largest)
            {
                continue;
            }

            finest = finest is null || candidate.HeldWidth(Effort.Special) < finest.HeldWidth(Effort.Special) ? candidate : finest;
            smoothest = smoothest is null || candidate.Process.SpecialRa.Nanometres < smoothest.Process.SpecialRa.Nanometres ? candidate : smoothest;
        }

        if (finest is null || smoothest is null)
        {
            return $"nothing of this shop makes a {job.Kind.Word()} like this";
        }

        Deviation width = finest.HeldWidth(Effort.Special);
        string grade = Iso286.NearestGrade(job.Nominal, width)?.ToString() ?? "";
        return $"{grade} ({width.Format()} µm) by {finest.Process.Name}; {smoothest.Process.SpecialRa} by {smoothest.Process.Name}, both with special effort";
    }

    private static List<string> WouldOpen(Job job, ShopFloor shop, IReadOnlyList<Candidate> candidates)
    {
        List<string> open = [];
        SizeWindow hole = job.Feature.Limits;
        if (candidates.Any(static candidate => candidate is { Finishes: not null, Process.SizedBy: ToolUse.Ream })
            && shop.Tools(ToolUse.Ream).All(tool => !ReamerChoice.Suits(tool, hole, out _)))
        {
            SizeWindow reamer = Din1420.ReamerFor(hole);
            open.Add($"a reamer whose own size is {reamer.Min.Format(3)} to {reamer.Max.Format(3)} mm (DIN 1420)");
        }

        foreach (Candidate candidate in candidates)
        {
            Deviation? special = candidate.SpecialWidth ?? candidate.RoutineWidth;
            bool wouldHold = special <= job.Feature.Limits.Width && (job.Ra is not { } ra || candidate.Process.SpecialRa.Nanometres <= ra.Nanometres);
            if (wouldHold && candidate.NotSuited is null && candidate.NoMachine is { } noMachine)
            {
                open.Add($"{candidate.Process.Name} by another machine or an outside supplier ({noMachine})");
            }
            else if (wouldHold && candidate.NoMachine is null && candidate.MissingRoom is { } room)
            {
                open.Add($"{candidate.Process.Name}, if the blind hole may be {room} deeper below full size or gets a relief: ask the designer");
            }
        }

        if (job.AsksForPosition && !candidates.Any(PutsTheAxisRight))
        {
            open.Add("a machine that bores or grinds this size, or the position held by a jig or bush: ask the designer whether 0.05 mm or more serves");
        }

        open.Add("Ask the designer whether a wider tolerance or a coarser finish serves.");
        return open;
    }
}
