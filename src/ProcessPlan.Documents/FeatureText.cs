using ProcessPlan.Core.Features;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Documents;

/// <summary>A feature in one line, in the words in which it could be typed again.</summary>
public static class FeatureText
{
    public static string Line(Feature feature)
    {
        UnitScale scale = new(feature.Unit);
        string length(Length value) => scale.FormatShort(value);
        List<string> parts = [feature.Kind.Word(), (feature.IsRound ? "Ø" : "") + length(feature.Nominal), Tolerance(feature, scale)];
        if (feature.Unit == LengthUnit.Inch)
        {
            parts.Add("in");
        }

        AddIf(parts, feature.Extent is not null, $"x {length(feature.Extent ?? default)}");
        AddIf(parts, feature.End is not null, feature.End == HoleEnd.Blind ? "blind" : "thru");
        AddIf(parts, feature.BottomRoom is not null, $"bottom {length(feature.BottomRoom ?? default)}");
        AddIf(parts, feature.Wall is not null, $"wall {length(feature.Wall ?? default)}");
        AddIf(parts, feature.Interrupted, "interrupted");
        AddIf(parts, feature.Finish is not null, $"{feature.Finish}");
        AddIf(parts, feature.Material is not null, feature.Material ?? "");
        if (feature.Hardness is { } delivered)
        {
            parts.Add(Hardness.Text(delivered, feature.HardnessTo));
        }

        if (feature.Treatment is { } treatment)
        {
            string word = treatment.Kind switch { TreatmentKind.Hardened => "hardened", TreatmentKind.CaseHardened => "case", _ => "nitrided" };
            parts.Add($"{word} {(treatment.Depth is { } depth ? length(depth) + " " : "")}{(treatment.Hardness is { } hard ? Hardness.Text(hard, treatment.HardnessTo) : "")}".TrimEnd());
        }

        if (feature.Coating is { } coating)
        {
            string side = coating.Limits switch { null => "", CoatingLimits.Before => " before", _ => " after" };
            parts.Add($"coat {coating.Name} {Micrometres(coating.Least)}-{Micrometres(coating.Most)}um{side}");
        }

        foreach (GeometryRequirement requirement in feature.Geometry)
        {
            parts.Add($"{Word(requirement.Kind)} {length(requirement.Zone)}");
        }

        if (feature.Start is { } start)
        {
            parts.Add(start.Kind switch { StartKind.Solid => "solid", StartKind.Cast => "cast ", StartKind.Cored => "cored ", _ => "bar " } + (start.Size is { } size ? length(size) : ""));
        }

        AddIf(parts, feature.Quantity is not null, $"{feature.Quantity} off");
        return string.Join(' ', parts);
    }

    private static void AddIf(List<string> parts, bool given, string text)
    {
        if (given)
        {
            parts.Add(text);
        }
    }

    private static string Tolerance(Feature feature, UnitScale scale) =>
        feature.Class is { } toleranceClass ? toleranceClass.ToString()
        : feature.Upper == -feature.Lower ? "±" + scale.FormatShort(new Length(feature.Upper.Picometres))
        : $"{Signed(feature.Upper, scale)}/{Signed(feature.Lower, scale)}";

    private static string Signed(Deviation deviation, UnitScale scale) =>
        (deviation > default(Deviation) ? "+" : "") + scale.FormatShort(new Length(deviation.Picometres));

    private static string Micrometres(Length length) => (length - Length.Zero).Format();

    private static string Word(GeometryKind kind) => kind switch
    {
        GeometryKind.Cylindricity => "cyl",
        GeometryKind.Roundness => "round",
        GeometryKind.Runout => "runout",
        GeometryKind.Coaxiality => "coax",
        GeometryKind.Position => "pos",
        GeometryKind.Perpendicularity => "perp",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "A characteristic that a feature line can ask for."),
    };
}
