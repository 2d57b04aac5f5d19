namespace ProcessPlan.Core.Values;

/// <summary>
/// A computed length that is not exact (a root, an exponential, a spread), in micrometres. It becomes an exact length only by a named rounding.
/// </summary>
/// <param name="Micrometres">The estimate in micrometres.</param>
public readonly record struct Estimate(double Micrometres)
{
    /// <summary>The largest multiple of <paramref name="step"/> not above the estimate.</summary>
    public Stock RoundDown(Length step) => Round(step, Math.Floor);

    /// <summary>The smallest multiple of <paramref name="step"/> not below the estimate.</summary>
    public Stock RoundUp(Length step) => Round(step, Math.Ceiling);

    private Stock Round(Length step, Func<double, double> whole)
    {
        // A ten-thousandth of a step of slack: 0.1 + 0.2 must not cost a whole step.
        double steps = Micrometres * Length.PicometresPerMicrometre / step.Picometres;
        double nearest = Math.Round(steps);
        return new Stock((long)(Math.Abs(steps - nearest) < 1e-4 ? nearest : whole(steps)) * step.Picometres);
    }
}
