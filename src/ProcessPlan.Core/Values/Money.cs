using System.Globalization;

namespace ProcessPlan.Core.Values;

/// <summary>An amount of money in a named currency, rounded to the cent only where it is shown.</summary>
/// <param name="Amount">The amount, unrounded.</param>
/// <param name="Currency">Three letters, such as EUR.</param>
public readonly record struct Money(decimal Amount, string Currency)
{
    /// <summary>The amount to the cent, half away from zero.</summary>
    public decimal Rounded => Math.Round(Amount, 2, MidpointRounding.AwayFromZero);

    public string Format() => Rounded.ToString("0.00", CultureInfo.InvariantCulture);

    public override string ToString() => $"{Format()} {Currency}".TrimEnd();
}
