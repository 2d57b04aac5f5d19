namespace ProcessPlan.Core.Capability;

/// <summary>How many pieces to start so that enough come out good.</summary>
public static class StartQuantity
{
    private const double WantedCertainty = 0.95;

    /// <summary>The fewest pieces of which, at the yield, at least the quantity comes out good in 95 of 100 lots (binomial distribution).</summary>
    /// <param name="quantity">Good pieces wanted, 1 or more.</param>
    /// <param name="yield">Share of good pieces, over 0, up to and including 1.</param>
    public static int For(int quantity, double yield)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(quantity, 1);
        if (!(yield > 0))
        {
            throw new ArgumentOutOfRangeException(nameof(yield), yield, "A yield is above 0.");
        }

        if (yield >= 1)
        {
            return quantity;
        }

        // One more piece at a time: P(the quantity-th good piece is the n-th started) adds up, a negative binomial distribution; in logarithms, as lots can be long.
        double log = quantity * Math.Log(yield);
        double certainty = Math.Exp(log);
        int started = quantity;
        while (certainty < WantedCertainty)
        {
            started++;
            log += Math.Log(1 - yield) + Math.Log(started - 1) - Math.Log(started - quantity);
            certainty += Math.Exp(log);
        }

        return started;
    }
}
