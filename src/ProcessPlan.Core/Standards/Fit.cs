using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>What two mating parts can do to each other, in the terms of ISO 286-1.</summary>
public enum FitCharacter
{
    /// <summary>The parts always go together with clearance, or at the closest just touch.</summary>
    Clearance,

    /// <summary>Clearance or interference, as the actual sizes fall.</summary>
    Transition,

    /// <summary>The shaft is always larger than the hole, or at the loosest just as large.</summary>
    Interference,
}

/// <summary>The fit of an internal and an external feature, by their limits of size.</summary>
/// <param name="Hole">Limits of the internal feature.</param>
/// <param name="Shaft">Limits of the external feature.</param>
public readonly record struct Fit(SizeWindow Hole, SizeWindow Shaft)
{
    /// <summary>The largest hole less the smallest shaft, exact; negative is interference.</summary>
    public Deviation MaxClearance => Hole.Max - Shaft.Min;

    /// <summary>The smallest hole less the largest shaft, exact; negative is interference.</summary>
    public Deviation MinClearance => Hole.Min - Shaft.Max;

    /// <summary>
    /// Clearance where the least clearance is zero or more, else interference where the greatest is zero or less, else transition.
    /// </summary>
    public FitCharacter Character => MinClearance >= default(Deviation) ? FitCharacter.Clearance
        : MaxClearance <= default(Deviation) ? FitCharacter.Interference
        : FitCharacter.Transition;
}
