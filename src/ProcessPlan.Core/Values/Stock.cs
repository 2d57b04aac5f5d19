using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Values;

/// <summary>Metal that an operation removes, always on diameter (round features) or on width (slots and tongues), never per side.</summary>
/// <param name="Picometres">The metal in picometres, on diameter or width.</param>
public readonly record struct Stock(long Picometres) : IComparable<Stock>
{
    public static Stock FromMicrometres(long micrometres) => new(micrometres * Length.PicometresPerMicrometre);

    public double ToMillimetres() => Picometres / (double)Length.PicometresPerMillimetre;

    public static Stock operator +(Stock left, Stock right) => new(left.Picometres + right.Picometres);

    public static Stock operator -(Stock left, Stock right) => new(left.Picometres - right.Picometres);

    public static bool operator <(Stock left, Stock right) => left.Picometres < right.Picometres;

    public static bool operator >(Stock left, Stock right) => left.Picometres > right.Picometres;

    public static bool operator <=(Stock left, Stock right) => left.Picometres <= right.Picometres;

    public static bool operator >=(Stock left, Stock right) => left.Picometres >= right.Picometres;

    public int CompareTo(Stock other) => Picometres.CompareTo(other.Picometres);

    /// <summary>Exact millimetres on diameter or width, at least <paramref name="least"/> decimal places, no unit.</summary>
    public string Format(int least = 0) => DecimalText.Format(Picometres, Length.MillimetrePlaces, least);

    public override string ToString() => Format() + " mm";
}
