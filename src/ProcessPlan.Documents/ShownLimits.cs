using ProcessPlan.Core.Features;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Documents;

/// <summary>
/// The limits of a feature in one unit. In the unit that was typed they are exact wherever decimals can be; in the other one they are
/// rounded inwards where the usual places cannot hold them, to more places only where those would leave no tolerance.
/// </summary>
internal sealed class ShownLimits
{
    private const int MostExtraPlaces = 3;

    public ShownLimits(Feature feature, UnitScale scale)
    {
        int? needed = scale.PlacesOf(feature.Nominal, feature.Limits.Max, feature.Limits.Min);
        int? exact = feature.Unit == scale.Unit || needed == scale.UsualPlaces ? needed : null;
        IsExact = exact is not null;
        Deviation centre = feature.Limits.Middle - feature.Nominal;
        if ((exact is { } known ? (feature.Limits, known) : Inside(feature.Limits, scale)) is (SizeWindow window, int places))
        {
            Max = scale.Format(window.Max, places);
            Min = scale.Format(window.Min, places);
            Width = scale.Format(window.Width, places);
            Middle = IsExact ? scale.FormatExact(window.Middle) : scale.Format(feature.Limits.Middle.RoundNearest(scale.Step(places)), places);
            if (IsExact && scale.Unit == LengthUnit.Inch)
            {
                DeviationUnit = "in";
                (Upper, Lower, Range) = (scale.FormatSigned(feature.Upper, places), scale.FormatSigned(feature.Lower, places), Width);
                Centre = scale.FormatSigned(centre, scale.PlacesOf(new Length(centre.Picometres)) ?? places);
            }
        }

        if (scale.Unit == LengthUnit.Millimetre)
        {
            DeviationUnit = "µm";
            (Upper, Lower, Range) = (feature.Upper.FormatSigned(), feature.Lower.FormatSigned(), feature.Limits.Width.Format());
            Centre = centre.FormatSigned();
        }
    }

    public bool IsExact { get; }

    /// <summary>The sizes; a dash where no decimal of the unit lies inside the limits.</summary>
    public string Max { get; } = "-";

    public string Min { get; } = "-";

    public string Middle { get; } = "-";

    public string Width { get; } = "-";

    /// <summary>Unit of the deviations from the nominal size; empty where none are shown, beside inches that are not exact.</summary>
    public string DeviationUnit { get; } = "";

    public string Upper { get; } = "";

    public string Lower { get; } = "";

    public string Centre { get; } = "";

    public string Range { get; } = "";

    private static (SizeWindow Window, int Places)? Inside(SizeWindow limits, UnitScale scale)
    {
        for (int places = scale.UsualPlaces; places <= scale.UsualPlaces + MostExtraPlaces; places++)
        {
            if (limits.RoundInward(scale.Step(places)) is { } inside && inside.Min < inside.Max)
            {
                return (inside, places);
            }
        }

        return null;
    }
}
