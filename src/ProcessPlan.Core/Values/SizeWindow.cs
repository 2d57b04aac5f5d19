namespace ProcessPlan.Core.Values;

/// <summary>Limits of size: every size from <see cref="Min"/> to <see cref="Max"/>, both included.</summary>
public readonly record struct SizeWindow
{
    /// <exception cref="ArgumentException"><paramref name="min"/> is above <paramref name="max"/>.</exception>
    public SizeWindow(Length min, Length max)
    {
        if (min > max)
        {
            throw new ArgumentException($"The lower limit {min} is above the upper limit {max}.", nameof(min));
        }

        Min = min;
        Max = max;
    }

    public Length Min { get; }

    public Length Max { get; }

    public Deviation Width => Max - Min;

    /// <summary>The middle, exact to the picometre (a half picometre rounds down).</summary>
    public Length Middle => new(Min.Picometres + (Max.Picometres - Min.Picometres) / 2);

    public bool Contains(Length size) => Min <= size && size <= Max;

    public bool Contains(SizeWindow other) => Min <= other.Min && other.Max <= Max;

    /// <summary>
    /// The widest window of multiples of <paramref name="step"/> inside this one: what a conversion to another unit may show.
    /// Null where no multiple lies inside.
    /// </summary>
    public SizeWindow? RoundInward(Length step)
    {
        Length min = Min.RoundUp(step);
        Length max = Max.RoundDown(step);
        return min <= max ? new SizeWindow(min, max) : null;
    }

    public override string ToString() => $"{Min.Format(3)} to {Max.Format(3)} mm";
}
