using System.Globalization;

namespace ProcessPlan.Core.Values;

/// <summary>Working time in minutes, an estimate.</summary>
/// <param name="Value">Minutes, zero or more.</param>
public readonly record struct Minutes(double Value)
{
    public static Minutes operator +(Minutes left, Minutes right) => new(left.Value + right.Value);

    public static Minutes operator *(Minutes minutes, double factor) => new(minutes.Value * factor);

    /// <summary>Three digits: two decimals below ten minutes, one below a hundred, whole minutes above, by the value as it is shown.</summary>
    public string Format() => Value.ToString(Value < 9.995 ? "0.00" : Value < 99.95 ? "0.0" : "0", CultureInfo.InvariantCulture);

    public override string ToString() => Format() + " min";
}
