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
            yield return coating.Name.Contains("anodi", StringComparison.OrdinalIgnoreCase)
                ? $"Is {coating.Name} given as the thickness of the layer, as planned, or as its growth?"
                : $"Is the build-up of {coating.Name} per surface, as planned, or on {(feature.IsRound ? "diameter" : "width")}?";
        }

        foreach (string doubt in MaterialDoubts(job))
        {
            yield return doubt;
        }
    }

    /// <summary>Treatments and coatings that the material does not take, by its group and its condition in the shop book.</summary>
    private static IEnumerable<string> MaterialDoubts(Job job)
    {
        bool steel = job.Material.Iso513 is "P" || job.Material.Condition.Contains("martensitic", StringComparison.Ordinal) || job.Material.Condition.Contains("precipitation", StringComparison.Ordinal);
        bool caseSteel = job.Material.Condition.Contains("case-hardening", StringComparison.Ordinal);
        string name = job.Material.Designation;
        switch (job.Feature.Treatment?.Kind)
        {
            case TreatmentKind.Hardened when !steel:
                yield return $"{name} does not harden like a steel. Which treatment is meant?";
                break;
            case TreatmentKind.Hardened when caseSteel:
                yield return $"{name} is a case-hardening steel: through hardening leaves it soft. Is a case meant?";
                break;
            case TreatmentKind.CaseHardened when !caseSteel:
                yield return $"{name} is not listed as a case-hardening steel. Is a case meant, or hardening?";
                break;
            case TreatmentKind.Nitrided when !steel:
                yield return $"{name} is not listed as a steel that nitrides. Which treatment is meant?";
                break;
        }

        if (job.Feature.Coating is { } coating && coating.Name.Contains("anodi", StringComparison.OrdinalIgnoreCase) && job.Material.Group is not ("N1" or "S1"))
        {
            yield return $"{name} cannot be anodised like aluminium. Which coating is meant?";
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

        if (job.Kind == FeatureKind.Hole && job.End == HoleEnd.Blind && job.BottomRoom is null)
        {
            yield return "Blind hole: a reamer wants the drilled hole 3 to 5 mm deeper for its lead and for chips; ask whether the drawing leaves that room.";
        }

        foreach (GeometryRequirement requirement in feature.Geometry)
        {
            if (requirement.Kind is not (GeometryKind.Roundness or GeometryKind.Cylindricity))
            {
                yield return $"{requirement.Kind} {requirement.Zone.Format()} mm is not proven by this plan: it hangs on clamping and datum. Cut it together with its datum, and check it on the first part.";
            }
        }

        if (job.Start.Kind == StartKind.Solid && job.Kind == FeatureKind.Hole)
        {
            yield return "Spot or centre before the drill. Remove burrs and break edges before the last size is measured.";
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
        if (!job.Feature.IsRound)
        {
            yield return "depth across the width not asked for: taken as half the width";
        }

        if (job.Kind == FeatureKind.Hole && job.End == HoleEnd.Blind && job.BottomRoom is null)
        {
            yield return "room below full size not given: taken as enough for every tool";
        }

        yield return "price without material and overhead outside the machine rates";
        yield return job.Quantity <= 50
            ? "small lot (up to 50): the handbook's stock where it is larger than the analytical one"
            : "lot over 50: least stock by the analytical method";
    }
}
