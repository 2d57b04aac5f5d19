namespace ProcessPlan.Core.Standards;

/// <summary>A standard tolerance grade of ISO 286-1: IT01 (the finest, and the default), IT0, IT1 … IT18. IT01 is not IT1.</summary>
public readonly record struct ToleranceGrade : IComparable<ToleranceGrade>
{
    public const int Count = 20;

    private static readonly string[] Symbols =
        ["01", "0", "1", "2", "3", "4", "5", "6", "7", "8", "9", "10", "11", "12", "13", "14", "15", "16", "17", "18"];

    private static readonly string[] Texts = Array.ConvertAll(Symbols, symbol => "IT" + symbol);

    private ToleranceGrade(int ordinal) => Ordinal = ordinal;

    public static ToleranceGrade IT01 => default;

    public static ToleranceGrade IT0 => new(1);

    /// <summary>Place in the row of grades: 0 is IT01, 1 is IT0, 2 is IT1 … 19 is IT18.</summary>
    public int Ordinal { get; }

    /// <summary>The grade as a tolerance class writes it: "7", "01".</summary>
    public string Symbol => Symbols[Ordinal];

    /// <summary>The grade by itself: "IT7", "IT01".</summary>
    public string Text => Texts[Ordinal];

    /// <summary>The next grade with a smaller tolerance; null for IT01.</summary>
    public ToleranceGrade? Finer => Ordinal > 0 ? new ToleranceGrade(Ordinal - 1) : null;

    /// <summary>The next grade with a larger tolerance; null for IT18.</summary>
    public ToleranceGrade? Coarser => Ordinal < Count - 1 ? new ToleranceGrade(Ordinal + 1) : null;

    /// <param name="number">1 to 18, both included; IT01 and IT0 have names of their own.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="number"/> is not 1 to 18.</exception>
    public static ToleranceGrade It(int number) => number is >= 1 and <= Count - 2
        ? new ToleranceGrade(number + 1)
        : throw new ArgumentOutOfRangeException(nameof(number), number, "The grades with a number of their own are IT1 to IT18.");

    /// <param name="ordinal">0 to 19, both included.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="ordinal"/> is not 0 to 19.</exception>
    public static ToleranceGrade At(int ordinal) => ordinal is >= 0 and < Count
        ? new ToleranceGrade(ordinal)
        : throw new ArgumentOutOfRangeException(nameof(ordinal), ordinal, "There are twenty grades, 0 (IT01) to 19 (IT18).");

    /// <summary>Reads a grade such as <c>IT7</c> or <c>it01</c> from the start of <paramref name="text"/>.</summary>
    /// <param name="text">The text; a digit behind the grade makes it no grade.</param>
    /// <param name="grade">The grade read.</param>
    /// <param name="read">Characters read; 0 where no grade stands there.</param>
    public static bool TryRead(ReadOnlySpan<char> text, out ToleranceGrade grade, out int read)
    {
        const int Prefix = 2;
        grade = default;
        read = 0;
        if (text.StartsWith("IT", StringComparison.OrdinalIgnoreCase) && TryReadSymbol(text[Prefix..], out grade, out int digits))
        {
            read = Prefix + digits;
        }

        return read > 0;
    }

    /// <summary>Reads the digits of a grade, 01, 0 or 1 to 18, from the start of <paramref name="text"/>.</summary>
    internal static bool TryReadSymbol(ReadOnlySpan<char> text, out ToleranceGrade grade, out int read)
    {
        int digits = 0;
        while (digits < text.Length && char.IsAsciiDigit(text[digits]))
        {
            digits++;
        }

        ReadOnlySpan<char> symbol = text[..digits];
        for (int ordinal = 0; ordinal < Count; ordinal++)
        {
            if (symbol.SequenceEqual(Symbols[ordinal]))
            {
                grade = new ToleranceGrade(ordinal);
                read = symbol.Length;
                return true;
            }
        }

        grade = default;
        read = 0;
        return false;
    }

    public static bool operator <(ToleranceGrade left, ToleranceGrade right) => left.Ordinal < right.Ordinal;

    public static bool operator >(ToleranceGrade left, ToleranceGrade right) => left.Ordinal > right.Ordinal;

    public static bool operator <=(ToleranceGrade left, ToleranceGrade right) => left.Ordinal <= right.Ordinal;

    public static bool operator >=(ToleranceGrade left, ToleranceGrade right) => left.Ordinal >= right.Ordinal;

    public int CompareTo(ToleranceGrade other) => Ordinal.CompareTo(other.Ordinal);

    public override string ToString() => Text;
}
