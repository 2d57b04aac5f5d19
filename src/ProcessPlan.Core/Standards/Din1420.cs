using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>
/// Limits of a reamer for given limits of the hole, by DIN 1420:1992 / ISO 522:1975: the largest reamer stays 15 % of the hole's tolerance below the
/// largest hole, and its own tolerance is 35 % of it; both shares are rounded up to whole micrometres.
/// </summary>
public static class Din1420
{
    private const long HalfMicrometre = Length.PicometresPerMicrometre / 2;

    public static Citation Citation { get; } = new("DIN 1420:1992 / ISO 522:1975", "reamer max = hole max - 0.15 IT, min = max - 0.35 IT, shares rounded up", Standing.Published);

    /// <summary>The 15 % of a hole's tolerance that is kept free for oversize, rounded up to whole micrometres.</summary>
    public static Deviation Reserve(Deviation tolerance) => new(new Length(Share(tolerance.Picometres, 15)).RoundUp(new Length(Length.PicometresPerMicrometre)).Picometres);

    /// <summary>The window of the reamer's own diameter.</summary>
    /// <param name="hole">
    /// The limits of the hole. Where its upper limit ends on half a micrometre (JS classes with an odd grade), the 15 % is rounded up to the next half
    /// that makes the reamer's upper limit whole.
    /// </param>
    public static SizeWindow ReamerFor(SizeWindow hole)
    {
        Length step = new(Length.PicometresPerMicrometre);
        long width = hole.Width.Picometres;
        Length fifteen = new(Reserve(hole.Width).Picometres);
        if (hole.Max.Picometres % Length.PicometresPerMicrometre == HalfMicrometre)
        {
            // 0.15 IT up to a whole or half micrometre: the half that stands at the hole's limit.
            fifteen = new Length(Share(width, 15) + HalfMicrometre).RoundUp(step) - new Deviation(HalfMicrometre);
        }

        Length thirtyFive = new Length(Share(width, 35)).RoundUp(step);
        Length max = new(hole.Max.Picometres - fifteen.Picometres);
        return new SizeWindow(new Length(max.Picometres - thirtyFive.Picometres), max);
    }

    /// <summary>Whole picometres not below the share: 35 of 180 µm is exactly 63 µm, never 62.999…</summary>
    private static long Share(long width, int percent) => (width * percent + 99) / 100;
}
