using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Values;

/// <summary>
/// An exact length, a size or a distance, counted in whole picometres: holds every decimal millimetre to nine places,
/// every microinch (25 400 pm) and every 1/64 in (396 875 000 pm). Range ± 9 223 km; arithmetic is checked.
/// </summary>
/// <param name="Picometres">The length in picometres, 10^-12 m.</param>
public readonly record struct Length(long Picometres) : IComparable<Length>
{
    public const long PicometresPerMicrometre = 1_000_000;
    public const long PicometresPerMillimetre = 1_000_000_000;
    public const long PicometresPerInch = 25_400_000_000;
    public const long PicometresPerMicroinch = 25_400;

    /// <summary>Decimal places of a picometre counted in millimetres and in micrometres.</summary>
    public const int MillimetrePlaces = 9;

    public static readonly Length Zero;

    public static Length FromMicrometres(long micrometres) => new(micrometres * PicometresPerMicrometre);

    /// <param name="millimetres">Exact, of at most nine decimal places.</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is finer than a picometre or out of range.</exception>
    public static Length FromMillimetres(decimal millimetres)
    {
        const decimal Most = (decimal)long.MaxValue / PicometresPerMillimetre;
        return Math.Abs(millimetres) <= Most && decimal.IsInteger(millimetres * PicometresPerMillimetre)
            ? new Length((long)(millimetres * PicometresPerMillimetre))
            : throw new ArgumentOutOfRangeException(nameof(millimetres), millimetres, "A length holds nine decimal places of a millimetre.");
    }

    /// <summary>The length that <paramref name="number"/> means in <paramref name="unit"/>, where it is exact to the picometre.</summary>
    public static bool TryFrom(ExactDecimal number, LengthUnit unit, out Length length)
    {
        bool exact = number.TryScale(unit == LengthUnit.Inch ? PicometresPerInch : PicometresPerMillimetre, out long picometres);
        length = new Length(picometres);
        return exact;
    }

    public decimal Millimetres => (decimal)Picometres / PicometresPerMillimetre;

    public double ToMillimetres() => Picometres / (double)PicometresPerMillimetre;

    public static Length operator +(Length size, Deviation deviation) => new(size.Picometres + deviation.Picometres);

    public static Length operator -(Length size, Deviation deviation) => new(size.Picometres - deviation.Picometres);

    public static Deviation operator -(Length size, Length from) => new(size.Picometres - from.Picometres);

    public static Length operator +(Length size, Stock stock) => new(size.Picometres + stock.Picometres);

    public static Length operator -(Length size, Stock stock) => new(size.Picometres - stock.Picometres);

    public static bool operator <(Length left, Length right) => left.Picometres < right.Picometres;

    public static bool operator >(Length left, Length right) => left.Picometres > right.Picometres;

    public static bool operator <=(Length left, Length right) => left.Picometres <= right.Picometres;

    public static bool operator >=(Length left, Length right) => left.Picometres >= right.Picometres;

    public int CompareTo(Length other) => Picometres.CompareTo(other.Picometres);

    /// <summary>The largest multiple of <paramref name="step"/> that is not above this length.</summary>
    public Length RoundDown(Length step) => new(Picometres - Modulo(Picometres, step.Picometres));

    /// <summary>The smallest multiple of <paramref name="step"/> that is not below this length.</summary>
    public Length RoundUp(Length step) => new(Picometres + Modulo(-Picometres, step.Picometres));

    /// <summary>The nearest multiple of <paramref name="step"/>; a tie goes up.</summary>
    public Length RoundNearest(Length step) => new Length(Picometres + step.Picometres / 2).RoundDown(step);

    /// <summary>Writes the exact millimetres, no trailing zeros.</summary>
    /// <returns>The number of bytes written, at most 24.</returns>
    public int WriteMillimetres(Span<byte> target) => DecimalText.Write(target, Picometres, MillimetrePlaces);

    /// <summary>Exact millimetres with at least <paramref name="least"/> decimal places and no unit.</summary>
    public string Format(int least = 0) => DecimalText.Format(Picometres, MillimetrePlaces, least);

    public override string ToString() => Format() + " mm";

    private static long Modulo(long value, long step)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(step);
        long rest = value % step;
        return rest < 0 ? rest + step : rest;
    }
}
