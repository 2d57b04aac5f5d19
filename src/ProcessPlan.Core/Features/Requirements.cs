using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <summary>A heat treatment that the drawing puts on the way; it is never left out.</summary>
public enum TreatmentKind
{
    Hardened,
    CaseHardened,
    Nitrided,
}

/// <param name="Kind">Which treatment.</param>
/// <param name="Hardness">Hardness asked for after it, of a range the least; null where the drawing gives only a depth.</param>
/// <param name="Depth">Case or nitriding depth of the finished part, per side; null for through hardening.</param>
public sealed record Treatment(TreatmentKind Kind, Hardness? Hardness, Length? Depth)
{
    /// <summary>The greatest hardness after it, where the drawing gives a range.</summary>
    public Hardness? HardnessTo { get; init; }
}

/// <summary>Whether the drawing's limits are meant before or after the coating.</summary>
public enum CoatingLimits
{
    After,
    Before,
}

/// <param name="Name">The coating as the drawing names it.</param>
/// <param name="Least">Least build-up per surface.</param>
/// <param name="Most">Greatest build-up per surface.</param>
/// <param name="Limits">Where the drawing's limits apply; null takes the default, after, and says so.</param>
public sealed record Coating(string Name, Length Least, Length Most, CoatingLimits? Limits);

/// <summary>Form, orientation, position and run-out that a feature line can ask for.</summary>
public enum GeometryKind
{
    Cylindricity,
    Roundness,
    Runout,
    Coaxiality,
    Position,
    Perpendicularity,
}

/// <param name="Kind">The characteristic.</param>
/// <param name="Zone">Width or diameter of the tolerance zone.</param>
public readonly record struct GeometryRequirement(GeometryKind Kind, Length Zone);

/// <summary>What the feature is made from.</summary>
public enum StartKind
{
    Solid,
    Cast,
    Cored,
    Bar,
}

/// <param name="Kind">The form of the blank.</param>
/// <param name="Size">Rough diameter or width of the blank at this feature; null for solid.</param>
public readonly record struct StartForm(StartKind Kind, Length? Size);
