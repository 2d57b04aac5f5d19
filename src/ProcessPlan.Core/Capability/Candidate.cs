using System.Globalization;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Capability;

/// <summary>What one process can do for one job in one shop, and the binding reason for every no.</summary>
public sealed class Candidate
{
    private const int FormPercent = 40;

    /// <summary>Height of a 118° point over the diameter.</summary>
    private const double DrillPointShare = 0.3;

    private const double DeepForBoring = 4;
    private const double DeepForDrilling = 5;

    /// <summary>Over this a turned shaft needs a steady and gives a grade away (common practice, no source).</summary>
    private const double SlenderForTurning = 12;

    private static readonly Length Small = Length.FromMillimetres(2);
    private static readonly Length Large = Length.FromMillimetres(250);

    private Candidate(Process process, Job job, IReadOnlyList<Machine> machines)
    {
        Process = process;
        Machines = machines;
        (GradesLost, LossReason) = Losses(process, job);
        RoutineWidth = Width(job, process.RoutineGrade);
        SpecialWidth = process.SpecialGrade is { } special ? Width(job, special) : null;
        LeftGrade = Worse(process.LeftGrade);
    }

    public Process Process { get; }

    /// <summary>The shop's machines for it, in the order of the shop.</summary>
    public IReadOnlyList<Machine> Machines { get; }

    /// <summary>Grades that depth, size or material cost it against the table.</summary>
    public int GradesLost { get; }

    public string LossReason { get; }

    /// <summary>Tolerance that it holds with routine effort at the nominal size; null beyond the grades of the standard.</summary>
    public Deviation? RoutineWidth { get; }

    public Deviation? SpecialWidth { get; }

    public ToleranceGrade LeftGrade { get; }

    /// <summary>Why it is out altogether, or null.</summary>
    public string? NoAtAll => NotSuited ?? NoMachine;

    /// <summary>Why no machine could do it here, or null.</summary>
    public string? NotSuited { get; private set; }

    /// <summary>Why no machine of this shop does it, or null.</summary>
    public string? NoMachine { get; private set; }

    /// <summary>Room that it misses below full size in a blind hole, where that is what rules it out.</summary>
    public Length? MissingRoom { get; private set; }

    /// <summary>The least effort that finishes the feature; null where it cannot.</summary>
    public Effort? Finishes { get; private set; }

    /// <summary>Why it cannot finish the feature, or null.</summary>
    public string? NoToFinish { get; private set; }

    public bool CutsSoft { get; private init; }

    public bool CutsHard { get; private init; }

    public string? WhyNot => NoAtAll ?? NoToFinish;

    /// <summary>Roundness and cylindricity that come with the tolerance held: common practice, no source.</summary>
    public Deviation FormError(Effort effort) => new(HeldWidth(effort).Picometres * FormPercent / 100);

    /// <summary>The tolerance held with an effort.</summary>
    public Deviation HeldWidth(Effort effort) => effort == Effort.Special && SpecialWidth is { } special ? special : RoutineWidth!.Value;

    /// <summary>The grade held with an effort, with the grades lost taken off.</summary>
    public ToleranceGrade HeldGrade(Effort effort) => Worse(Process.Grade(effort));

    /// <summary>Every process for the job's kind of feature, in the order of the catalogue.</summary>
    public static List<Candidate> Judge(Job job, ShopFloor shop)
    {
        List<Candidate> candidates = [];
        foreach (Process process in ProcessCatalogue.Handbook)
        {
            if (process.Kind == job.Kind)
            {
                candidates.Add(Judge(process, job, shop));
            }
        }

        return candidates;
    }

    private static Candidate Judge(Process process, Job job, ShopFloor shop)
    {
        List<Machine> machines = [];
        string? noMachine = null;
        foreach (Machine machine in shop.Machines)
        {
            if (!machine.Abilities.Contains(process.Ability))
            {
                continue;
            }

            // On the way to a large hole a small machine can still drill; its own largest size is held against the tool.
            if (machine.Smallest <= job.Nominal && (job.Nominal <= machine.Largest || process.SizedBy is not null))
            {
                machines.Add(machine);
            }
            else
            {
                noMachine = $"the {machine.Name} takes {machine.Smallest.Format()} to {machine.Largest} only";
            }
        }

        Candidate candidate = new(process, job, machines) { CutsSoft = Cuts(process, job.Hrc), CutsHard = Cuts(process, job.HrcAfterTreatment ?? job.Hrc) };
        candidate.NotSuited = OutAltogether(candidate, job);
        candidate.NoMachine = machines.Count == 0 ? noMachine ?? "no machine of this shop does it" : null;
        if (candidate.NoAtAll is null)
        {
            (candidate.Finishes, candidate.NoToFinish) = ToFinish(candidate, job);
        }

        return candidate;
    }

    private static bool Cuts(Process process, double? hrc) => hrc is not { } hardness || process.HardestHrc is not { } hardest || hardness <= hardest;

    private static string? OutAltogether(Candidate candidate, Job job)
    {
        Process process = candidate.Process;
        string word = job.Kind.Word();
        if (process.Groups.Count > 0 && !process.Groups.Contains(job.Group))
        {
            return $"not for {job.Material.Designation} (group {job.Group})";
        }

        if (job.Nominal < process.Smallest || (job.Nominal > process.Largest && process.SizedBy is null))
        {
            return $"for {process.Smallest.Format()} to {process.Largest}, the {word} has {job.Nominal}";
        }

        if (job.LengthRatio > process.LongestRatio)
        {
            return string.Create(CultureInfo.InvariantCulture, $"up to {process.LongestRatio:0} times the size long, the {word} is {job.LengthRatio:0.#} times");
        }

        if (!candidate.CutsSoft && !candidate.CutsHard)
        {
            return $"up to {process.HardestHrc:0} HRC, the metal has {job.Hrc:0}";
        }

        if (job.Kind == FeatureKind.Hole && job.End == HoleEnd.Blind && job.BottomRoom is { } room && room < process.BottomRoom)
        {
            candidate.MissingRoom = new Length((process.BottomRoom - room).Picometres);
            return $"needs {process.BottomRoom} below full size, the blind hole has {room}";
        }

        return candidate.RoutineWidth is null ? $"with {candidate.LossReason} it holds no grade of ISO 286" : null;
    }

    private static (Effort? Effort, string? No) ToFinish(Candidate candidate, Job job)
    {
        Process process = candidate.Process;
        Deviation asked = job.Feature.Limits.Width;
        if (job.Nominal > process.Largest)
        {
            return (null, $"for {process.Smallest.Format()} to {process.Largest}, the {job.Kind.Word()} has {job.Nominal}");
        }

        if (process.SizedBy == ToolUse.Drill && job.End == HoleEnd.Blind && job.BottomRoom is { } room && room.Picometres < DrillPointShare * job.Nominal.Picometres)
        {
            return (null, string.Create(CultureInfo.InvariantCulture, $"its point needs {DrillPointShare:0.0} times the diameter below full size, the blind hole has {room}"));
        }

        bool smoothEnough(Effort effort) => job.Ra is not { } asked || process.Ra(effort).Nanometres <= asked.Nanometres;
        foreach (Effort effort in (ReadOnlySpan<Effort>)[Effort.Routine, Effort.Special])
        {
            if (candidate.HeldWidth(effort) <= asked && smoothEnough(effort) && candidate.FormError(effort) <= (job.AskedForm ?? candidate.FormError(effort)))
            {
                return (effort, null);
            }
        }

        ToleranceGrade finest = candidate.HeldGrade(Effort.Special);
        if (candidate.HeldWidth(Effort.Special) > asked)
        {
            string lost = candidate.GradesLost > 0 ? $" ({candidate.LossReason})" : "";
            return (null, $"holds {finest}{lost}, {candidate.HeldWidth(Effort.Special).Format()} µm; asked are {asked.Format()} µm");
        }

        return smoothEnough(Effort.Special)
            ? (null, $"its form error is {candidate.FormError(Effort.Special).Format()} µm at best (0.4 of its tolerance), asked are {job.AskedForm?.Format()} µm")
            : (null, $"leaves {process.Ra(Effort.Special)} at best, asked is {job.Feature.Finish}");
    }

    private Deviation? Width(Job job, ToleranceGrade grade) =>
        Iso286.TryWidth(job.Nominal, Worse(grade), out Deviation width) ? width : null;

    private ToleranceGrade Worse(ToleranceGrade grade)
    {
        for (int i = 0; i < GradesLost; i++)
        {
            grade = grade.Coarser ?? grade;
        }

        return grade;
    }

    /// <summary>Depth, size and material, by the rules of common practice.</summary>
    private static (int Grades, string Reason) Losses(Process process, Job job)
    {
        int lost = 0;
        string reason = "";
        void lose(string why)
        {
            lost++;
            reason += reason.Length > 0 ? ", " + why : why;
        }

        bool drillsOrReams = process.Ability is "drill" or "ream";
        double deep = process.Ability == "bore" ? DeepForBoring : DeepForDrilling;
        if (job.Kind == FeatureKind.Hole && (drillsOrReams || process.Ability == "bore") && job.LengthRatio > deep)
        {
            lose(string.Create(CultureInfo.InvariantCulture, $"{job.LengthRatio:0.#} times the diameter deep"));
        }

        if (process.Ability == "turn" && job.LengthRatio > SlenderForTurning)
        {
            lose(string.Create(CultureInfo.InvariantCulture, $"{job.LengthRatio:0.#} times the diameter long"));
        }

        if (drillsOrReams && job.Group is "M" or "S1" or "S2")
        {
            lose($"in {job.Material.Designation}");
        }

        // Free-cutting metals give back the grade that a small reamer loses.
        bool free = process.Ability == "ream" && job.Group is "N1" or "N2";
        if (process.Ability is "ream" or "bore" && ((job.Nominal < Small && !free) || job.Nominal > Large))
        {
            lose(job.Nominal < Small ? "below 2 mm" : "above 250 mm");
        }

        return (lost, reason);
    }
}
