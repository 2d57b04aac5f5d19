using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Values;

/// <summary>A signed, exact difference of two sizes on diameter or width, such as a limit deviation from the nominal size.</summary>
/// <param name="Picometres">The difference in picometres.</param>
public readonly record struct Deviation(long Picometres) : IComparable<Deviation>
{
    public const int MicrometrePlaces = 6;

    public static Deviation FromMicrometres(long micrometres) => new(micrometres * Length.PicometresPerMicrometre);

    public double ToMicrometres() => Picometres / (double)Length.PicometresPerMicrometre;

    public static Deviation operator +(Deviation left, Deviation right) => new(left.Picometres + right.Picometres);

    public static Deviation operator -(Deviation left, Deviation right) => new(left.Picometres - right.Picometres);

    public static Deviation operator -(Deviation value) => new(-value.Picometres);

    public static bool operator <(Deviation left, Deviation right) => left.Picometres < right.Picometres;

    public static bool operator >(Deviation left, Deviation right) => left.Picometres > right.Picometres;

    public static bool operator <=(Deviation left, Deviation right) => left.Picometres <= right.Picometres;

    public static bool operator >=(Deviation left, Deviation right) => left.Picometres >= right.Picometres;

    public int CompareTo(Deviation other) => Picometres.CompareTo(other.Picometres);

    /// <summary>Writes the exact micrometres, no trailing zeros; a half stays a half.</summary>
    /// <returns>The number of bytes written, at most 24.</returns>
    public int WriteMicrometres(Span<byte> target) => DecimalText.Write(target, Picometres, MicrometrePlaces);

    /// <summary>Exact micrometres without a unit, with a plus sign where positive.</summary>
    public string FormatSigned() => (Picometres > 0 ? "+" : "") + DecimalText.Format(Picometres, MicrometrePlaces);

    /// <summary>Exact micrometres without a unit.</summary>
    public string Format() => DecimalText.Format(Picometres, MicrometrePlaces);

    public override string ToString() => FormatSigned() + " µm";
}
