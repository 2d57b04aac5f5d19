namespace ProcessPlan.Core.Features;

/// <summary>The four kinds of feature of size: internal or external, round or flat.</summary>
public enum FeatureKind
{
    Hole,
    Shaft,
    Slot,
    Tongue,
}

/// <summary>How a hole ends.</summary>
public enum HoleEnd
{
    Through,
    Blind,
}

public static class FeatureKinds
{
    /// <summary>Metal is outside the size: holes and slots grow when they are cut.</summary>
    public static bool IsInternal(this FeatureKind kind) => kind is FeatureKind.Hole or FeatureKind.Slot;

    /// <summary>Round features are measured on diameter, the others on width.</summary>
    public static bool IsRound(this FeatureKind kind) => kind is FeatureKind.Hole or FeatureKind.Shaft;

    /// <summary>The word of the trade, as it is printed and as scripts read it.</summary>
    public static string Word(this FeatureKind kind) => kind switch
    {
        FeatureKind.Hole => "hole",
        FeatureKind.Shaft => "shaft",
        FeatureKind.Slot => "slot",
        FeatureKind.Tongue => "tongue",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "Hole, shaft, slot or tongue."),
    };
}
