using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Documents;

/// <summary>Lengths as decimals of one unit.</summary>
internal readonly record struct UnitScale(LengthUnit Unit)
{
    public static readonly UnitScale Inch = new(LengthUnit.Inch);

    /// <summary>Decimal places that a limit is always shown with.</summary>
    public int UsualPlaces => Unit == LengthUnit.Inch ? 4 : 3;

    public string Symbol => Unit == LengthUnit.Inch ? "in" : "mm";

    public UnitScale Other => Unit == LengthUnit.Inch ? new UnitScale(LengthUnit.Millimetre) : Inch;

    /// <summary>The most places whose step is a whole number of picometres.</summary>
    private int MostPlaces => Unit == LengthUnit.Inch ? 8 : Length.MillimetrePlaces;

    public Length Step(int places)
    {
        ArgumentOutOfRangeException.ThrowIfGreaterThan(places, MostPlaces);
        long unit = Unit == LengthUnit.Inch ? Length.PicometresPerInch : Length.PicometresPerMillimetre;
        return new Length(unit / (long)ExactDecimal.PowerOfTen(places));
    }

    /// <summary>The fewest places, from <see cref="UsualPlaces"/> on, that hold every one of the lengths exactly; null where none do.</summary>
    public int? PlacesOf(params Length[] lengths)
    {
        for (int places = UsualPlaces; places <= MostPlaces; places++)
        {
            long step = Step(places).Picometres;
            bool exact = true;
            foreach (Length length in lengths)
            {
                exact &= length.Picometres % step == 0;
            }

            if (exact)
            {
                return places;
            }
        }

        return null;
    }

    /// <summary>The nearest decimal of so many places.</summary>
    public string Format(Length length, int places)
    {
        Length step = Step(places);
        return DecimalText.Format(length.RoundNearest(step).Picometres / step.Picometres, places, places);
    }

    public string Format(Deviation deviation, int places) => Format(new Length(deviation.Picometres), places);

    public string FormatSigned(Deviation deviation, int places) =>
        deviation == default ? "0" : (deviation > default(Deviation) ? "+" : "") + Format(deviation, places);

    /// <summary>As few places as the length needs, none for a whole number.</summary>
    public string FormatShort(Length length)
    {
        int places = PlacesOf(length) ?? MostPlaces;
        return DecimalText.Format(length.RoundNearest(Step(places)).Picometres / Step(places).Picometres, places);
    }

    /// <summary>As many places as the length needs.</summary>
    public string FormatExact(Length length) => Format(length, PlacesOf(length) ?? MostPlaces);
}
