using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>
/// A window of sizes counted as metal on the part: larger is more metal. A shaft counts its size, a hole its size with a minus, so that every cut
/// goes down and one algorithm serves internal and external features.
/// </summary>
/// <param name="Least">Least metal, in picometres.</param>
/// <param name="Most">Most metal, in picometres; not below <paramref name="Least"/> for a window that is open.</param>
internal readonly record struct MetalWindow(long Least, long Most)
{
    public static MetalWindow Of(SizeWindow sizes, bool isInternal) =>
        isInternal ? new(-sizes.Max.Picometres, -sizes.Min.Picometres) : new(sizes.Min.Picometres, sizes.Max.Picometres);

    public bool IsOpen => Least <= Most;

    public long Width => Most - Least;

    public bool Holds(MetalWindow other) => Least <= other.Least && other.Most <= Most;

    public SizeWindow Sizes(bool isInternal) =>
        isInternal ? new SizeWindow(new Length(-Most), new Length(-Least)) : new SizeWindow(new Length(Least), new Length(Most));

    /// <summary>The size at the end with the most metal, which the stock of the next cut is counted to.</summary>
    public static Length Size(long metal) => new(Math.Abs(metal));
}
