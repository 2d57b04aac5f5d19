using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Capability;

/// <summary>A feature with every default taken and named: what the capability tables, the search and the cost are asked with.</summary>
public sealed class Job
{
    /// <summary>Above this only grinding, honing, lapping, hard cutting and erosion cut steel.</summary>
    public const double HardFromHrc = 45;

    /// <summary>Steel of this hardness is planned with the figures of quenched and tempered steel.</summary>
    private const double TemperedFromHrc = 27;

    /// <summary>Hardness of a case whose hardness the line does not give.</summary>
    private const double UsualCaseHrc = 60;

    /// <summary>An Rz below the finest pair of the table: no process leaves this Ra, so it is refused and not forgotten.</summary>
    private static readonly Roughness FinerThanAny = Roughness.Ra(1);

    /// <summary>HB or HV from which ISO 18265 gives an HRC at all; what it cannot convert above is harder than its last row, 68 HRC.</summary>
    private const double SoftestPointsOnTable = 250;
    private const double HardestHrcOnTable = 68;

    private readonly List<string> _assumptions = [];
    private readonly List<string> _queries = [];

    public Job(Feature feature, ShopFloor shop)
    {
        Feature = feature;
        Material = feature.Material is { } named ? shop.Material(named) : shop.UsualMaterial;
        Assume(feature.Material is null, $"material {Material.Designation}, {Material.Condition}");
        Quantity = feature.Quantity ?? 1;
        Assume(feature.Quantity is null, "1 piece");
        Extent = feature.Extent ?? feature.Nominal;
        Assume(feature.Extent is null, $"{(feature.Kind == FeatureKind.Hole ? "depth" : "length")} {Extent}, once the {(feature.IsRound ? "diameter" : "width")}");
        End = feature.End ?? HoleEnd.Through;
        Assume(feature.End is null && feature.Kind == FeatureKind.Hole, "the hole goes through");
        Assume(feature.Finish is null, "no roughness is asked for");
        Ra = feature.Finish is { } finish ? RoughnessPairs.ToRa(finish) ?? FinerThanAny : null;
        Assume(feature.Finish is { IsRa: false }, $"{feature.Finish} is held as {Ra} µm. {RoughnessPairs.Remark}");
        Hrc = feature.Hardness is { } delivered ? ToHrc(delivered) : null;
        Assume(feature.Hardness is null && Material.HbTo is not null, $"hardness as delivered {HbRange(Material)}");
        HrcAfterTreatment = feature.Treatment?.Hardness is { } treated ? ToHrc(treated) ?? HardFromHrc : feature.Treatment is null ? null : UsualCaseHrc;
        if (feature.Coating is { Limits: null } coating)
        {
            _assumptions.Add($"the drawing's limits are meant after the coating {coating.Name}");
            _queries.Add($"Are the limits meant before or after the coating {coating.Name}? Planned: after.");
        }

        Start = feature.Start ?? new StartForm(feature.Kind == FeatureKind.Shaft ? StartKind.Bar : StartKind.Solid, null);
        Assume(feature.Start is null, feature.Kind is FeatureKind.Shaft ? "turned from bar" : feature.Kind == FeatureKind.Tongue ? "milled from bar or plate" : "cut in solid metal");
        Group = Material.Group is "P1" or "P2" && Hrc >= TemperedFromHrc ? "P3" : Material.Group;
        BottomRoom = feature.BottomRoom;
    }

    public Feature Feature { get; }

    public Material Material { get; }

    /// <summary>Row of the cutting tables, after the hardness as delivered.</summary>
    public string Group { get; }

    public int Quantity { get; }

    public Length Extent { get; }

    public HoleEnd End { get; }

    /// <summary>Room below full size in a blind hole; null where nothing was said.</summary>
    public Length? BottomRoom { get; }

    public StartForm Start { get; }

    /// <summary>The Ra to hold; null where no roughness is asked for.</summary>
    public Roughness? Ra { get; }

    /// <summary>Hardness as delivered, where it is in the range of HRC.</summary>
    public double? Hrc { get; }

    /// <summary>Hardness after the treatment on the way.</summary>
    public double? HrcAfterTreatment { get; }

    public FeatureKind Kind => Feature.Kind;

    public bool IsInternal => Feature.IsInternal;

    public Length Nominal => Feature.Nominal;

    /// <summary>Length over size, the ratio that depth rules are written in.</summary>
    public double LengthRatio => Extent.Picometres / (double)Nominal.Picometres;

    /// <summary>Every default that was taken, in words.</summary>
    public IReadOnlyList<string> Assumptions => _assumptions;

    /// <summary>Questions to put to the drawing's owner.</summary>
    public IReadOnlyList<string> Queries => _queries;

    /// <summary>The closer of roundness and cylindricity, or null where neither is asked for.</summary>
    public Deviation? AskedForm
    {
        get
        {
            Length? round = Feature.Asked(GeometryKind.Roundness);
            Length? cylindric = Feature.Asked(GeometryKind.Cylindricity);
            Length? closer = round is { } r && cylindric is { } c ? (r < c ? r : c) : round ?? cylindric;
            return closer is { } zone ? zone - Length.Zero : null;
        }
    }

    /// <summary>Position or coaxiality that a tool which follows the drilled hole cannot give.</summary>
    public bool AsksForPosition
    {
        get
        {
            Length limit = Length.FromMicrometres(50);
            return Feature.Asked(GeometryKind.Position) <= limit || Feature.Asked(GeometryKind.Coaxiality) <= limit;
        }
    }

    /// <summary>Null below the range of HRC; above the conversion table the hardest that it knows.</summary>
    private static double? ToHrc(Hardness hardness) => HardnessConversion.Convert(hardness, HardnessScale.HRC)?.Points
        ?? (hardness.Points > SoftestPointsOnTable ? HardestHrcOnTable : null);

    private static string HbRange(Material material) => material.HbFrom is { } from ? $"{from:0} to {material.HbTo:0} HB" : $"up to {material.HbTo:0} HB";

    private void Assume(bool taken, string text)
    {
        if (taken)
        {
            _assumptions.Add(text);
        }
    }
}
