using System.Globalization;
using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;

namespace ProcessPlan.Core;

/// <summary>What a careful planner says beside the route: questions, cautions, and what the figures rest on.</summary>
internal static class Advice
{
    /// <summary>A wall of less than a tenth of the diameter gives way in the chuck.</summary>
    private const double ThinWall = 10;

    public static IEnumerable<string> Queries(Job job)
    {
        Feature feature = job.Feature;
        if (job.Ra is { } ra && ra.Nanometres * 20 > feature.Limits.Width.Picometres / 1000)
        {
            // Ra ≤ 0.05·T: Yakushev's textbook, from memory.
            yield return $"{feature.Finish} is rough for a tolerance of {feature.Limits.Width.Format()} µm (usual: Ra at most 0.05·T). Is a finer finish meant?";
        }

        if (feature.Finish is null)
        {
            yield return "No roughness is given. Which one is needed?";
        }

        if (feature.Treatment is { Hardness: null } treatment)
        {
            yield return $"Which hardness is asked after {(treatment.Kind == TreatmentKind.Nitrided ? "nitriding" : "case hardening")}?";
        }

        if (feature.Geometry.Count > 0)
        {
            yield return "Which rule for form does the drawing use, independency or envelope?";
        }

        if (feature.Coating is { } coating)
        {
            yield return $"Is the build-up of {coating.Name} per surface, as planned, or on {(feature.IsRound ? "diameter" : "width")}?";
        }
    }

    public static IEnumerable<string> Cautions(Job job)
    {
        Feature feature = job.Feature;
        if (feature.Wall is { } wall && feature.Nominal.Picometres > ThinWall * wall.Picometres)
        {
            yield return string.Create(CultureInfo.InvariantCulture, $"Thin wall (D/t {feature.Nominal.Picometres / (double)wall.Picometres:0.#}): rough, release, finish; clamp lightly and measure it free.");
        }

        if (feature.Interrupted)
        {
            yield return "Interrupted surface: deburr before the finish, use a tool and a gauge that bridge the gap, no straight-fluted reamer.";
        }

        if (job.Kind == FeatureKind.Hole && job.End == HoleEnd.Blind)
        {
            yield return "Blind hole: drill deeper by 3 to 5 mm for the lead of the reamer and for chips, if the drawing leaves room.";
        }

        if (job.Group is "S1")
        {
            yield return "Titanium chips burn: keep the cutter sharp and flooded, clear chips, class D extinguisher at hand.";
        }

        yield return "Typical values: prove them on the first part. No gloves or loose sleeves at rotating machines; eye protection; stop the spindle to gauge.";
        yield return "Drawing, order and named specifications win. This plan proposes; a competent person releases.";
    }

    public static IEnumerable<string> Assumptions(Job job, ShopFloor shop)
    {
        yield return $"machines, rates and tools of the {shop.Name}, in {shop.Currency}; capability from the handbook, not proven here";
        yield return "sizes at 20 °C; stock and sizes on " + (job.Feature.IsRound ? "diameter" : "width");
        yield return "price without material and overhead outside the machine rates";
        yield return job.Quantity <= 50
            ? "small lot (up to 50): the handbook's stock where it is larger than the analytical one"
            : "lot over 50: least stock by the analytical method";
    }
}
