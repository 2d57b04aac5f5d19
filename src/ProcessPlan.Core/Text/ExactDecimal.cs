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
    public bool TryScale(long factor, out long whole)
    {
        Int128 product = (Int128)Units * factor;
        Int128 scale = PowerOfTen(Places);
        bool exact = product % scale == 0 && Int128.Abs(product / scale) <= long.MaxValue;
        whole = exact ? (long)(product / scale) : 0;
        return exact;
    }
}
