namespace ProcessPlan.Core.Capability;

/// <summary>Share of a normal distribution between two limits.</summary>
public static class NormalYield
{
    /// <param name="lower">Lower limit.</param>
    /// <param name="upper">Upper limit, in the unit of the lower one.</param>
    /// <param name="mean">Mean.</param>
    /// <param name="sigma">Standard deviation, above 0.</param>
    /// <returns>Between 0 and 1, good to 1.5e-7.</returns>
    public static double Of(double lower, double upper, double mean, double sigma)
    {
        if (!(sigma > 0))
        {
            throw new ArgumentOutOfRangeException(nameof(sigma), sigma, "A spread is above 0.");
        }

        return Cumulative((upper - mean) / sigma) - Cumulative((lower - mean) / sigma);
    }

    private static double Cumulative(double z)
    {
        // Abramowitz and Stegun, Handbook of Mathematical Functions, 26.2.17.
        double x = Math.Abs(z);
        double t = 1 / (1 + 0.2316419 * x);
        double density = Math.Exp(-x * x / 2) / Math.Sqrt(2 * Math.PI);
        double tail = density * t * (0.319381530 + t * (-0.356563782 + t * (1.781477937 + t * (-1.821255978 + t * 1.330274429))));
        return z >= 0 ? 1 - tail : tail;
    }
}
