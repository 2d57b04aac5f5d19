using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Capability;

/// <summary>How much care a size is held with.</summary>
public enum Effort
{
    /// <summary>Ordinary care on an ordinary machine; a part of the pieces is checked.</summary>
    Routine,

    /// <summary>Slow cuts, careful set-up, every piece checked.</summary>
    Special,
}

/// <summary>One row of the process tables: what a process holds, takes and leaves.</summary>
public sealed record Process
{
    /// <summary>The trade's name.</summary>
    public required string Name { get; init; }

    public required FeatureKind Kind { get; init; }

    /// <summary>The tool whose size the feature takes; null where the machinist sets the size.</summary>
    public ToolUse? SizedBy { get; init; }

    /// <summary>What a machine must be able to do for it.</summary>
    public required string Ability { get; init; }

    public required ToleranceGrade RoutineGrade { get; init; }

    /// <summary>Null where more effort does not make it finer.</summary>
    public ToleranceGrade? SpecialGrade { get; init; }

    public required Roughness RoutineRa { get; init; }

    public required Roughness SpecialRa { get; init; }

    /// <summary>The grade that it leaves as a step on the way.</summary>
    public required ToleranceGrade LeftGrade { get; init; }

    public required Roughness LeftRa { get; init; }

    public required Length Smallest { get; init; }

    public required Length Largest { get; init; }

    /// <summary>Longest length over size.</summary>
    public required double LongestRatio { get; init; }

    /// <summary>Hardest metal it cuts, in HRC; null where it is not meant for steel.</summary>
    public double? HardestHrc { get; init; }

    /// <summary>Whether it goes where the hole before it is, instead of putting the axis right.</summary>
    public required bool Follows { get; init; }

    /// <summary>Coarsest grade that it can start from; IT18 where it starts in the rough.</summary>
    public required ToleranceGrade EnterGrade { get; init; }

    /// <summary>Depth below full size that it needs in a blind hole.</summary>
    public required Length BottomRoom { get; init; }

    /// <summary>Greatest stock at a size: this, plus <see cref="MostStockShare"/> of the size.</summary>
    public required Stock MostStock { get; init; }

    public required double MostStockShare { get; init; }

    /// <summary>Least stock that it still cuts instead of rubbing.</summary>
    public required Stock LeastStock { get; init; }

    /// <summary>The tool guides itself on the work: no setting error.</summary>
    public required bool SelfGuided { get; init; }

    /// <summary>Groups of materials that it is for; empty for all.</summary>
    public required IReadOnlyList<string> Groups { get; init; }

    public required Citation Origin { get; init; }

    /// <summary>Whether it can start without a machined surface before it.</summary>
    public bool StartsRough => EnterGrade == ToleranceGrade.It(18);

    public Stock MostStockAt(Length size) => new Estimate((MostStock.Picometres + MostStockShare * size.Picometres) / Length.PicometresPerMicrometre)
        .RoundDown(new Length(Length.PicometresPerMicrometre));

    public ToleranceGrade Grade(Effort effort) => effort == Effort.Special && SpecialGrade is { } special ? special : RoutineGrade;

    public Roughness Ra(Effort effort) => effort == Effort.Special ? SpecialRa : RoutineRa;
}
