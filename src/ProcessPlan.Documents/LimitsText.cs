using ProcessPlan.Core.Features;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Documents;

/// <summary>The limits of a request for a person: the sizes first, then the same in the other unit, the fit in words, and where the figures stand.</summary>
public static class LimitsText
{
    /// <param name="target">Where to write; at most eighty columns.</param>
    /// <param name="request">The feature, or the two of a fit.</param>
    /// <param name="unit">The unit that comes first; null for the one that was typed.</param>
    public static void Write(TextWriter target, FeatureRequest request, LengthUnit? unit)
    {
        UnitScale first = new(unit ?? request.First.Unit);
        TextLines.Write(target, Title(request), 0);
        WriteSizes(target, request, first);
        WriteSizes(target, request, first.Other);
        if (request.Mate is { } mate)
        {
            WriteFit(target, request.First, mate, first);
        }

        WriteSources(target, request);
    }

    private static string Title(FeatureRequest request)
    {
        Feature first = request.First;
        UnitScale scale = new(first.Unit);
        string size = (first.IsRound ? "Ø" : "") + (scale.Unit == LengthUnit.Inch ? $"{scale.FormatExact(first.Nominal)} in" : first.Nominal.Format());
        string what = request.Mate is { } mate
            ? $"{first.Kind.Word()} and {mate.Kind.Word()} {size} {first.Class}/{mate.Class}, {first.Class?.Grade}/{mate.Class?.Grade}"
            : $"{first.Kind.Word()} {size} {Tolerance(first, scale)}, {Grade(first)}";
        return $"{what} ({(first.IsRound ? "on diameter" : "on width")}, at 20 °C)";
    }

    private static string Tolerance(Feature feature, UnitScale scale)
    {
        if (feature.Class is { } toleranceClass)
        {
            return toleranceClass.ToString();
        }

        if (feature.General is { } general)
        {
            return Iso2768.Name(general);
        }

        bool symmetric = feature.Upper == -feature.Lower;
        if (feature.Unit == LengthUnit.Inch && scale.PlacesOf(feature.Nominal, feature.Limits.Max, feature.Limits.Min) is { } places)
        {
            return symmetric
                ? $"±{scale.Format(feature.Upper, places)} in"
                : $"{scale.FormatSigned(feature.Upper, places)}/{scale.FormatSigned(feature.Lower, places)} in";
        }

        return symmetric ? $"±{feature.Upper.Format()} µm" : $"{feature.Upper.FormatSigned()}/{feature.Lower.FormatSigned()} µm";
    }

    private static string Grade(Feature feature) => feature.Class is { } toleranceClass ? toleranceClass.Grade.Text
        : feature.NearestGrade is { } nearest ? $"nearest grade {nearest}"
        : "coarser than any grade";

    private static void WriteSizes(TextWriter target, FeatureRequest request, UnitScale scale)
    {
        TextTable table = new("max", "min", "middle", "tolerance");
        bool exact = true;
        foreach (Feature feature in request.Features)
        {
            ShownLimits shown = new(feature, scale);
            string whose = request.Mate is null ? "" : feature.Kind.Word() + " ";
            table.Add(whose + scale.Symbol, shown.Max, shown.Min, shown.Middle, shown.Width);
            if (shown.DeviationUnit.Length > 0)
            {
                table.Add(shown.DeviationUnit, shown.Upper, shown.Lower, shown.Centre, shown.Range);
            }

            exact &= shown.IsExact;
        }

        target.WriteLine();
        table.Write(target, exact ? "" : "rounded inwards");
    }

    internal static void WriteFit(TextWriter target, Feature inside, Feature outside, UnitScale scale)
    {
        Fit fit = new(inside.Limits, outside.Limits);
        (string hole, string shaft) = (inside.Kind.Word(), outside.Kind.Word());
        (string loose, string close) = ($"largest {hole} on smallest {shaft}", $"smallest {hole} on largest {shaft}");
        target.WriteLine();
        switch (fit.Character)
        {
            case FitCharacter.Clearance:
                TextLines.Write(target, fit.MinClearance == default
                    ? $"clearance fit: the {shaft} goes in; at the closest it is size on size"
                    : $"clearance fit: the {shaft} goes in with room to spare", 0);
                WriteExtreme(target, "greatest clearance", fit.MaxClearance, loose, scale);
                WriteExtreme(target, "least clearance", fit.MinClearance, close, scale);
                break;
            case FitCharacter.Transition:
                TextLines.Write(target, "transition fit: clearance or interference, as the sizes fall", 0);
                WriteExtreme(target, "greatest clearance", fit.MaxClearance, loose, scale);
                WriteExtreme(target, "greatest interference", -fit.MinClearance, close, scale);
                break;
            default:
                TextLines.Write(target, fit.MaxClearance == default
                    ? $"interference fit: the {shaft} is the larger; at the loosest it is size on size"
                    : $"interference fit: the {shaft} is always the larger", 0);
                WriteExtreme(target, "greatest interference", -fit.MinClearance, close, scale);
                WriteExtreme(target, "least interference", -fit.MaxClearance, loose, scale);
                break;
        }
    }

    private static void WriteExtreme(TextWriter target, string name, Deviation extreme, string meeting, UnitScale scale)
    {
        const int InchPlaces = 5;
        string inches = UnitScale.Inch.Format(extreme, InchPlaces);
        string figure = scale.Unit == LengthUnit.Inch ? $"{inches} in = {extreme.Format()} µm" : $"{extreme.Format()} µm = {inches} in";
        target.WriteLine($"  {name,-21} {figure,-24} {meeting}");
    }

    private static void WriteSources(TextWriter target, FeatureRequest request)
    {
        target.WriteLine();
        List<string> sources = [];
        foreach (Feature feature in request.Features)
        {
            if (feature.General is { } general)
            {
                sources.Add(Iso2768.Cite(feature.Nominal, general).ToString());
            }

            if ((feature.Class?.Grade ?? feature.NearestGrade) is { } grade)
            {
                sources.Add(Iso286.Cite(feature.Nominal, grade).ToString());
            }

            if (feature.Class is { } toleranceClass)
            {
                sources.Add(Iso286.Cite(feature.Nominal, toleranceClass).ToString());
            }
        }

        foreach (string source in sources.Distinct())
        {
            TextLines.Write(target, source, 0);
        }
    }
}
