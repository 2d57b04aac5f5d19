namespace ProcessPlan.Core.Text;

/// <summary>A decimal number as it was typed: <paramref name="Units"/> · 10^-<paramref name="Places"/>, places 0 to 18.</summary>
public readonly record struct ExactDecimal(long Units, int Places)
{
    /// <summary>10^<paramref name="exponent"/> for 0 to 19.</summary>
    public static ulong PowerOfTen(int exponent)
    {
        ulong power = 1;
        for (int i = 0; i < exponent; i++)
        {
            power *= 10;
        }

        return power;
    }

    public double ToDouble() => Units / (double)PowerOfTen(Places);

    /// <summary>The number without trailing zeros, with a point.</summary>
    public override string ToString() => DecimalText.Format(Units, Places);

    /// <summary>This number times <paramref name="factor"/>, where that is a whole number within the range of <see cref="long"/>.</summary>
    /// <param name="factor">Above zero.</param>
    /// <param name="whole">The product; zero where there is none.</param>
    public bool TryScale(long factor, out long whole)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(factor);

        // With the common part of factor and scale taken out, the rest of the scale must divide the units. Not Int128: it starts slowly.
        long scale = (long)PowerOfTen(Places);
        long common = GreatestCommonDivisor(factor, scale);
        (factor, scale) = (factor / common, scale / common);
        (long quotient, long rest) = Math.DivRem(Units, scale);
        bool exact = rest == 0 && Math.Abs(quotient) <= long.MaxValue / factor;
        whole = exact ? quotient * factor : 0;
        return exact;
    }

    private static long GreatestCommonDivisor(long a, long b)
    {
        while (b != 0)
        {
            (a, b) = (b, a % b);
        }

        return a;
    }
}
