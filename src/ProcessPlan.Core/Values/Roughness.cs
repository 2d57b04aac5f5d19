using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Values;

/// <summary>How a roughness was stated.</summary>
public enum RoughnessParameter
{
    /// <summary>Arithmetical mean deviation of the profile.</summary>
    Ra,

    /// <summary>Greatest height of the profile.</summary>
    Rz,

    /// <summary>Roughness number N1 to N12 of ISO 1302, each of which means an Ra.</summary>
    Number,
}

/// <summary>A limit of surface roughness as the drawing states it, exact to the nanometre. The default, Ra 0, is none.</summary>
public readonly record struct Roughness
{
    private const long NanometresPerMicrometre = 1000;

    private const int MicrometrePlaces = 3;

    // N1 to N12 by ISO 1302: each class doubles the Ra, rounded to the preferred numbers.
    private static readonly long[] RaOfNumbers = [25, 50, 100, 200, 400, 800, 1_600, 3_200, 6_300, 12_500, 25_000, 50_000];

    private Roughness(long nanometres, RoughnessParameter parameter)
    {
        Nanometres = nanometres;
        Parameter = parameter;
    }

    /// <summary>The value of Ra or Rz in nanometres; a roughness number has the Ra that it means.</summary>
    public long Nanometres { get; }

    public RoughnessParameter Parameter { get; }

    /// <summary>Whether <see cref="Nanometres"/> is an Ra, stated as such or by its number.</summary>
    public bool IsRa => Parameter != RoughnessParameter.Rz;

    public double ToMicrometres() => Nanometres / (double)NanometresPerMicrometre;

    /// <exception cref="ArgumentOutOfRangeException"><paramref name="nanometres"/> is zero or less.</exception>
    public static Roughness Ra(long nanometres) => new(Positive(nanometres), RoughnessParameter.Ra);

    /// <exception cref="ArgumentOutOfRangeException"><paramref name="nanometres"/> is zero or less.</exception>
    public static Roughness Rz(long nanometres) => new(Positive(nanometres), RoughnessParameter.Rz);

    /// <param name="number">1 to 12, both included.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is no such class.</exception>
    public static Roughness N(int number) => number >= 1 && number <= RaOfNumbers.Length
        ? new Roughness(RaOfNumbers[number - 1], RoughnessParameter.Number)
        : throw new ArgumentOutOfRangeException(nameof(number), number, "ISO 1302 has the roughness numbers N1 to N12.");

    /// <summary>
    /// Reads <c>Ra0.8</c>, <c>Rz 6,3</c> (µm, over zero, to the nanometre; in any case of letters) or <c>N6</c> (capital: a small n
    /// begins the class of a shaft) from the start of <paramref name="text"/>.
    /// </summary>
    /// <param name="text">The text; a letter or digit right behind the roughness makes it none.</param>
    /// <param name="value">The roughness read.</param>
    /// <param name="read">Characters read; 0 where no roughness stands there.</param>
    public static bool TryRead(ReadOnlySpan<char> text, out Roughness value, out int read)
    {
        if (text.StartsWith("N", StringComparison.Ordinal))
        {
            return TryReadNumber(text, out value, out read);
        }

        bool isRa = text.StartsWith("Ra", StringComparison.OrdinalIgnoreCase);
        bool isRz = text.StartsWith("Rz", StringComparison.OrdinalIgnoreCase);
        if ((isRa || isRz) && TryReadMicrometres(text, out long nanometres, out read))
        {
            value = isRa ? Ra(nanometres) : Rz(nanometres);
            return true;
        }

        value = default;
        read = 0;
        return false;
    }

    /// <summary>As it was stated: "Ra 0.8", "Rz 6.3", "N6"; micrometres, exact.</summary>
    public override string ToString() => Parameter == RoughnessParameter.Number
        ? $"N{Array.IndexOf(RaOfNumbers, Nanometres) + 1}"
        : $"{Parameter} {DecimalText.Format(Nanometres, MicrometrePlaces)}";

    private static bool TryReadNumber(ReadOnlySpan<char> text, out Roughness value, out int read)
    {
        bool isClass = DecimalText.TryRead(text[1..], out ExactDecimal number, out int digits)
            && number.Places == 0 && number.Units >= 1 && number.Units <= RaOfNumbers.Length
            && text[1] != '0' && EndsAt(text, 1 + digits);
        value = isClass ? N((int)number.Units) : default;
        read = isClass ? 1 + digits : 0;
        return isClass;
    }

    private static bool TryReadMicrometres(ReadOnlySpan<char> text, out long nanometres, out int read)
    {
        int at = 2;
        while (at < text.Length && text[at] == ' ')
        {
            at++;
        }

        nanometres = 0;
        bool isValue = DecimalText.TryRead(text[at..], out ExactDecimal number, out int digits)
            && number.TryScale(NanometresPerMicrometre, out nanometres)
            && nanometres > 0 && EndsAt(text, at + digits);
        read = isValue ? at + digits : 0;
        return isValue;
    }

    private static bool EndsAt(ReadOnlySpan<char> text, int end) => end == text.Length || !char.IsLetterOrDigit(text[end]);

    private static long Positive(long nanometres)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(nanometres);
        return nanometres;
    }
}
