using ProcessPlan.Core.Features;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <summary>Says a feature back in the words of the trade, so that a slip of the line is seen.</summary>
internal static class ReadBack
{
    public static string Name(Feature feature, Ruler ruler) => feature.Class is { } toleranceClass
        ? $"{feature.Kind.Word()} {ruler.Plain(feature.Nominal)} {ruler.Name} {toleranceClass}"
        : $"{feature.Kind.Word()} {ruler.Plain(feature.Nominal)} {ruler.Name}";

    /// <summary>The whole of what was read; of a fit, what both have is said once.</summary>
    public static string Say(FeatureRequest request, Ruler ruler)
    {
        List<string> first = Parts(request.First, ruler);
        if (request.Mate is not { } mate)
        {
            return string.Join(", ", first);
        }

        List<string> second = Parts(mate, ruler);
        List<string> both = [.. first.Intersect(second)];
        string names = $"{string.Join(", ", first.Except(both))} with {string.Join(", ", second.Except(both))}";
        return both.Count == 0 ? names : $"{names}, both {string.Join(", ", both)}";
    }

    /// <summary>Its name first and what it is made of next, for these are never to be cut off.</summary>
    private static List<string> Parts(Feature feature, Ruler ruler)
    {
        List<string> said = [Name(feature, ruler)];
        void Add(string text) => said.Add(text);
        string Long(Length length) => $"{ruler.Plain(length)} {ruler.Name}";

        if (feature.Material is { } material)
        {
            Add(material);
        }

        if (feature.Hardness is { } hardness)
        {
            Add(Hardness.Text(hardness, feature.HardnessTo));
        }

        if (feature.Treatment is { } treatment)
        {
            Add(Say(treatment, ruler));
        }

        if (feature.Extent is { } extent)
        {
            Add(Long(extent) + (feature.Kind == FeatureKind.Hole ? " deep" : " long"));
        }

        if (feature.End is { } end)
        {
            Add(end == HoleEnd.Through ? "through" : "blind");
        }

        if (feature.BottomRoom is { } bottom)
        {
            Add($"{Long(bottom)} room at the bottom");
        }

        if (feature.Wall is { } wall)
        {
            Add($"wall {Long(wall)}");
        }

        if (feature.Interrupted)
        {
            Add("interrupted");
        }

        if (feature.Finish is { } finish)
        {
            Add(finish.Parameter == RoughnessParameter.Number ? finish.ToString() : $"{finish.Parameter} {ruler.Ra(finish)} {ruler.RaUnit}");
        }

        if (feature.Coating is { } coating)
        {
            Add($"{coating.Name} {ruler.Coat(coating.Least, coating.Most)} a side");
        }

        foreach (GeometryRequirement geometry in feature.Geometry)
        {
            Add($"{Word(geometry.Kind)} {Long(geometry.Zone)}");
        }

        if (feature.Start is { } start)
        {
            Add(start.Size is { } size ? $"from {Word(start.Kind)} {Long(size)}" : $"from {Word(start.Kind)}");
        }

        if (feature.Quantity is { } quantity)
        {
            Add($"{quantity} off");
        }

        return said;
    }

    private static string Say(Treatment treatment, Ruler ruler)
    {
        string word = treatment.Kind switch
        {
            TreatmentKind.Hardened => "hardened",
            TreatmentKind.CaseHardened => "case-hardened",
            _ => "nitrided",
        };
        string hardness = treatment.Hardness is { } asked ? $" {Hardness.Text(asked, treatment.HardnessTo)}" : "";
        string depth = treatment.Depth is { } deep ? $" {ruler.Plain(deep)} {ruler.Name} deep" : "";
        return word + hardness + depth;
    }

    private static string Word(GeometryKind kind) => kind switch
    {
        GeometryKind.Cylindricity => "cylindricity",
        GeometryKind.Roundness => "roundness",
        GeometryKind.Runout => "run-out",
        GeometryKind.Coaxiality => "coaxiality",
        GeometryKind.Position => "position",
        _ => "perpendicularity",
    };

    private static string Word(StartKind kind) => kind switch
    {
        StartKind.Solid => "solid",
        StartKind.Cast => "cast",
        StartKind.Cored => "cored",
        _ => "bar",
    };
}
