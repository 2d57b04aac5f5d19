namespace ProcessPlan.Core.Standards;

/// <summary>A tolerance class of ISO 286-1 such as H7 (internal, a hole) or k6 (external, a shaft). The default is a01.</summary>
public readonly record struct ToleranceClass(FundamentalDeviation Letter, bool IsInternal, ToleranceGrade Grade)
{
    private const int MostLetters = 2;

    private static readonly string[] Capitals =
    [
        "A", "B", "C", "CD", "D", "E", "EF", "F", "FG", "G", "H", "JS", "J", "K",
        "M", "N", "P", "R", "S", "T", "U", "V", "X", "Y", "Z", "ZA", "ZB", "ZC",
    ];

    private static readonly string[] Smalls = Array.ConvertAll(Capitals, letter => letter.ToLowerInvariant());

    /// <summary>The letters of shafts in the order of <see cref="FundamentalDeviation"/>.</summary>
    internal static ReadOnlySpan<string> Letters => Smalls;

    /// <summary>The letter as the standard writes it: capital for an internal feature, small for an external one.</summary>
    public string LetterText => (IsInternal ? Capitals : Smalls)[(int)Letter];

    /// <summary>The class of the mating feature with the same letter and grade: H7 for h7, h7 for H7.</summary>
    public ToleranceClass Mirror => this with { IsInternal = !IsInternal };

    /// <summary>
    /// Reads a class from the start of <paramref name="text"/>. Case decides: all capitals are internal, all small letters external,
    /// a mixture such as <c>Js7</c> is no class. Allocates nothing.
    /// </summary>
    /// <param name="text">The text; a digit behind the grade, as in <c>H70</c>, makes it no class.</param>
    /// <param name="value">The class read; whether the standard defines it for a size is asked of <see cref="Iso286"/>.</param>
    /// <param name="read">Characters read; 0 where no class stands there.</param>
    public static bool TryRead(ReadOnlySpan<char> text, out ToleranceClass value, out int read)
    {
        value = default;
        read = 0;
        int letters = 0;
        while (letters < Math.Min(text.Length, MostLetters) && char.IsAsciiLetter(text[letters]))
        {
            letters++;
        }

        if (letters > 0
            && TryReadLetter(text[..letters], out FundamentalDeviation letter)
            && ToleranceGrade.TryReadSymbol(text[letters..], out ToleranceGrade grade, out int digits))
        {
            value = new ToleranceClass(letter, char.IsAsciiLetterUpper(text[0]), grade);
            read = letters + digits;
        }

        return read > 0;
    }

    public override string ToString() => LetterText + Grade.Symbol;

    private static bool TryReadLetter(ReadOnlySpan<char> text, out FundamentalDeviation letter)
    {
        string[] names = char.IsAsciiLetterUpper(text[0]) ? Capitals : Smalls;
        for (int i = 0; i < names.Length; i++)
        {
            if (text.SequenceEqual(names[i]))
            {
                letter = (FundamentalDeviation)i;
                return true;
            }
        }

        letter = default;
        return false;
    }
}
