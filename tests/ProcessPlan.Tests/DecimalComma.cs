using System.Globalization;

namespace ProcessPlan.Tests;

/// <summary>A culture that writes 1.234,5 and a minus of its own, as many shops' machines have it; for as long as it is not disposed.</summary>
internal sealed class DecimalComma : IDisposable
{
    private readonly CultureInfo _before = CultureInfo.CurrentCulture;

    public DecimalComma()
    {
        CultureInfo culture = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        culture.NumberFormat.NumberDecimalSeparator = ",";
        culture.NumberFormat.NumberGroupSeparator = ".";
        culture.NumberFormat.NegativeSign = "−";
        CultureInfo.CurrentCulture = culture;
    }

    public void Dispose() => CultureInfo.CurrentCulture = _before;
}
