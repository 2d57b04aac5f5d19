using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <summary>
/// One feature of size as the drawing asks for it. What the line did not say is null here; the planner names the default that it takes.
/// </summary>
public sealed record Feature
{
    public required FeatureKind Kind { get; init; }

    public required Length Nominal { get; init; }

    /// <summary>The tolerance class of ISO 286, or null where deviations or limits were typed.</summary>
    public ToleranceClass? Class { get; init; }

    /// <summary>The class of ISO 2768-1 asked for by name, or null.</summary>
    public GeneralTolerance? General { get; init; }

    /// <summary>The drawing's limits of size, both included.</summary>
    public required SizeWindow Limits { get; init; }

    /// <summary>The unit that was typed; it stays master, the other one is a conversion.</summary>
    public LengthUnit Unit { get; init; }

    /// <summary>Depth of a hole, length of a shaft, slot or tongue.</summary>
    public Length? Extent { get; init; }

    public HoleEnd? End { get; init; }

    /// <summary>Room below the full size in a blind hole.</summary>
    public Length? BottomRoom { get; init; }

    /// <summary>Wall around a hole, per side.</summary>
    public Length? Wall { get; init; }

    /// <summary>A keyway, cross hole or port interrupts the surface.</summary>
    public bool Interrupted { get; init; }

    public Roughness? Finish { get; init; }

    /// <summary>Designation of a material of the shop book.</summary>
    public string? Material { get; init; }

    /// <summary>Hardness as delivered; of a range, the least.</summary>
    public Hardness? Hardness { get; init; }

    /// <summary>The greatest hardness as delivered, where the line gives a range.</summary>
    public Hardness? HardnessTo { get; init; }

    public Treatment? Treatment { get; init; }

    public Coating? Coating { get; init; }

    /// <summary>Form and position asked for, in the order of <see cref="GeometryKind"/>.</summary>
    public ValueList<GeometryRequirement> Geometry { get; init; } = ValueList<GeometryRequirement>.Empty;

    public StartForm? Start { get; init; }

    public int? Quantity { get; init; }

    public Deviation Upper => Limits.Max - Nominal;

    public Deviation Lower => Limits.Min - Nominal;

    public bool IsInternal => Kind.IsInternal();

    /// <summary>Round features are measured on diameter, the others on width.</summary>
    public bool IsRound => Kind.IsRound();

    /// <summary>The nearest grade of ISO 286 on the coarser side for typed limits; null beyond IT18 or 3150 mm.</summary>
    public ToleranceGrade? NearestGrade => Iso286.NearestGrade(Nominal, Limits.Width);

    public Length? Asked(GeometryKind kind)
    {
        foreach (GeometryRequirement requirement in Geometry)
        {
            if (requirement.Kind == kind)
            {
                return requirement.Zone;
            }
        }

        return null;
    }
}
