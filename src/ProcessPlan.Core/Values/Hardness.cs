using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Values;

/// <summary>A scale of hardness.</summary>
public enum HardnessScale
{
    /// <summary>Rockwell C.</summary>
    HRC,

    /// <summary>Brinell; HBW, the hard-metal ball, is read as this.</summary>
    HB,

    /// <summary>Vickers.</summary>
    HV,
}

/// <summary>A hardness in points of its scale, exact to the tenth.</summary>
/// <param name="Tenths">Tenths of a point, zero or more.</param>
/// <param name="Scale">The scale that it was stated in.</param>
public readonly record struct Hardness(long Tenths, HardnessScale Scale)
{
    private const int Places = 1;

    // HBW stands before HB, which begins it.
    private static readonly (string Word, HardnessScale Scale)[] Words =
        [("HRC", HardnessScale.HRC), ("HBW", HardnessScale.HB), ("HB", HardnessScale.HB), ("HV", HardnessScale.HV)];

    public double Points => Tenths / 10.0;

    /// <summary>The hardness of so many points, where they lie on the scale and are exact to the tenth.</summary>
    public static bool TryCreate(ExactDecimal points, HardnessScale scale, out Hardness hardness)
    {
        bool exact = points.TryScale(10, out long tenths);
        hardness = new Hardness(tenths, scale);
        (int least, int most) = Range(scale);
        return exact && tenths >= 10 * least && tenths <= 10 * most;
    }

    /// <summary>The points that a scale is used for, and for HRC and HV those that convert to other scales, in words: "20 to 70 HRC".</summary>
    public static string RangeOf(HardnessScale scale) => $"{Range(scale).Least} to {Range(scale).Most} {scale}";

    private static (int Least, int Most) Range(HardnessScale scale) => scale switch
    {
        HardnessScale.HRC => (20, 68),
        HardnessScale.HB => (30, 650),
        _ => (30, 940),
    };

    /// <summary>
    /// Reads <c>58HRC</c>, <c>28,5 HRC</c>, <c>240 HB</c>, <c>240 HBW</c> or <c>700 HV</c>, in any case of letters, from the start of
    /// <paramref name="text"/>.
    /// </summary>
    /// <param name="text">The text; a letter or digit right behind the scale makes it no hardness.</param>
    /// <param name="value">The hardness read, over zero.</param>
    /// <param name="read">Characters read; 0 where no hardness stands there.</param>
    public static bool TryRead(ReadOnlySpan<char> text, out Hardness value, out int read)
    {
        value = default;
        read = 0;
        if (!DecimalText.TryRead(text, out ExactDecimal number, out int at) || !number.TryScale(10, out long tenths) || tenths == 0)
        {
            return false;
        }

        while (at < text.Length && text[at] == ' ')
        {
            at++;
        }

        foreach ((string word, HardnessScale scale) in Words)
        {
            int end = at + word.Length;
            if (text[at..].StartsWith(word, StringComparison.OrdinalIgnoreCase) && (end == text.Length || !char.IsLetterOrDigit(text[end])))
            {
                value = new Hardness(tenths, scale);
                read = end;
                return true;
            }
        }

        return false;
    }

    /// <summary>A range as it is spoken: "58-62 HRC"; one hardness where there is no greatest one.</summary>
    public static string Text(Hardness least, Hardness? most) =>
        most is { } end ? $"{DecimalText.Format(least.Tenths, Places)}-{end}" : least.ToString();

    /// <summary>As it is spoken: "58 HRC".</summary>
    public override string ToString() => $"{DecimalText.Format(Tenths, Places)} {Scale}";
}
