using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>A step that changes the size or the metal without a cut: heat treatment or coating, done outside.</summary>
/// <param name="Process">The trade's word.</param>
/// <param name="Detail">What the drawing asks of it.</param>
/// <param name="LeastGrowth">Least growth of the metal on diameter or width; negative where it shrinks.</param>
/// <param name="MostGrowth">Greatest growth of the metal.</param>
/// <param name="Hardens">Whether the metal is hard after it.</param>
/// <param name="Covers">Whether it lays on a coating, which no cut may take off again.</param>
/// <param name="Layer">Depth of a thin hard layer, which later cuts must spare; null for any other change.</param>
/// <param name="Supplier">Who does it, or null where the shop knows nobody.</param>
/// <param name="Origin">Where the growth comes from.</param>
internal sealed record Change(string Process, string Detail, Deviation LeastGrowth, Deviation MostGrowth, bool Hardens, bool Covers, Length? Layer, Supplier? Supplier, Citation Origin)
{
    /// <summary>Through and case hardening bend the part; nitriding and coatings hardly do.</summary>
    public bool Distorts => Hardens && Layer is null;

    /// <summary>Through hardening and case hardening move a size by up to a thousandth either way.</summary>
    private const long ThousandthOfSize = 1000;

    private static readonly Citation HardeningRule = new("steel makers' data and heat treaters' practice", "±0.1 % of the size", Standing.FromMemory);
    private static readonly Citation NitridingRule = new("heat treaters' practice", "growth 3 to 5 % of the nitriding depth per surface", Standing.FromMemory);
    private static readonly Citation AnodisingRule = new("trade guides to MIL-PRF-8625", "a hard layer grows half out, an ordinary one a third: on diameter once, or two thirds of, the thickness", Standing.Published);
    private static readonly Citation CoatingRule = new("geometry", "twice the build-up per surface on diameter or width", Standing.Derived);

    /// <summary>The changes that the drawing specifies, in the order in which they are done.</summary>
    public static List<Change> For(Job job, ShopFloor shop)
    {
        List<Change> changes = [];
        if (job.Feature.Treatment is { } treatment)
        {
            changes.Add(Of(treatment, job, shop));
        }

        if (job.Feature.Coating is { } coating)
        {
            // An anodised layer grows partly inwards: a hard one stands half out, an ordinary one a third.
            bool anodised = coating.Name.Contains("anodi", StringComparison.OrdinalIgnoreCase);
            bool hard = anodised && coating.Name.Contains("hard", StringComparison.OrdinalIgnoreCase);
            long growthOf(Length thickness) => coating.Limits == CoatingLimits.Before ? 0
                : hard ? thickness.Picometres
                : anodised ? thickness.Picometres * 2 / 3
                : 2 * thickness.Picometres;
            Deviation growth(Length thickness) => new(growthOf(thickness));
            string side = coating.Limits == CoatingLimits.Before ? "before" : "after";
            changes.Add(new Change(anodised ? "anodising" : "plating", $"{coating.Name} {coating.Least.Picometres / Length.PicometresPerMicrometre} to {coating.Most.Picometres / Length.PicometresPerMicrometre} µm a surface, the drawing's limits hold {side} it",
                growth(coating.Least), growth(coating.Most), false, true, null, SupplierOf(shop, "coating"), anodised ? AnodisingRule : CoatingRule));
        }

        return changes;
    }

    private static Change Of(Treatment treatment, Job job, ShopFloor shop)
    {
        string hardness = treatment.Hardness is { } asked ? $" to {Hardness.Text(asked, treatment.HardnessTo)}" : "";
        string depth = treatment.Depth is { } deep ? $", {deep} deep on the finished part" : "";
        if (treatment.Kind == TreatmentKind.Nitrided)
        {
            long layer = (treatment.Depth ?? Length.FromMillimetres(0.3m)).Picometres;
            return new Change("nitriding", hardness.TrimStart() + depth, new Deviation(2 * layer * 3 / 100), new Deviation(2 * layer * 5 / 100), true, false, new Length(layer),
                SupplierOf(shop, "nitriding"), NitridingRule);
        }

        string process = treatment.Kind == TreatmentKind.Hardened ? "hardening" : "case hardening";
        Deviation thousandth = new(job.Nominal.Picometres / ThousandthOfSize);
        return new Change(process, (hardness + depth).TrimStart(' ', ','), -thousandth, thousandth, true, false, null, SupplierOf(shop, process), HardeningRule);
    }

    private static Supplier? SupplierOf(ShopFloor shop, string process)
    {
        foreach (Supplier supplier in shop.Suppliers)
        {
            if (supplier.Process == process)
            {
                return supplier;
            }
        }

        return null;
    }

    /// <summary>Whether what a process can take spares the layer: at most a quarter of its depth per side (common practice, no source).</summary>
    public bool Spares(Stock most) => Layer is not { } layer || most.Picometres <= layer.Picometres / 2;

    /// <summary>The window that must be entered with so that <paramref name="leaving"/> is left at the extremes; may be closed.</summary>
    public MetalWindow Before(MetalWindow leaving) => new(leaving.Least - LeastGrowth.Picometres, leaving.Most - MostGrowth.Picometres);
}
