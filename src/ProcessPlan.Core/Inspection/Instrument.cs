using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Inspection;

/// <summary>A measuring instrument of the shop.</summary>
/// <param name="Name">As the shop calls it.</param>
/// <param name="Inside">Measures holes and slots.</param>
/// <param name="Outside">Measures shafts and tongues.</param>
/// <param name="From">Smallest size.</param>
/// <param name="To">Largest size.</param>
/// <param name="Uncertainty">Expanded uncertainty U, k = 2, on the shop floor.</param>
/// <param name="MinutesPerCheck">Time for one piece.</param>
/// <param name="Origin">Where the figures come from.</param>
public sealed record Instrument(
    string Name, bool Inside, bool Outside, Length From, Length To, Deviation Uncertainty, double MinutesPerCheck, Citation Origin)
{
    /// <summary>Uncertainty may take at most this share of the tolerance: U ≤ T/5.</summary>
    public const int LeastRatio = 5;

    public static IReadOnlyList<Instrument> Handbook { get; } = Read(PublishedTable.Load("instruments.txt"));

    public double RatioTo(Deviation tolerance) => tolerance.Picometres / (double)Uncertainty.Picometres;

    /// <summary>The coarsest instrument whose uncertainty is at most a fifth of the tolerance; where there is none, the finest, and that is said.</summary>
    public static (Instrument Instrument, bool IsGood) For(bool inside, Length size, Deviation tolerance)
    {
        Instrument? best = null;
        bool bestIsGood = false;
        foreach (Instrument instrument in Handbook)
        {
            if ((inside ? !instrument.Inside : !instrument.Outside) || size < instrument.From || size > instrument.To)
            {
                continue;
            }

            bool good = instrument.RatioTo(tolerance) >= LeastRatio;
            bool better = best is null || (good && !bestIsGood) || (!good && !bestIsGood && instrument.Uncertainty < best.Uncertainty);
            if (better)
            {
                (best, bestIsGood) = (instrument, good);
            }
        }

        return best is not null ? (best, bestIsGood) : (Handbook[0], false);
    }

    private static List<Instrument> Read(PublishedTable table)
    {
        List<Instrument> instruments = [];
        foreach (TableRow row in table.Rows)
        {
            instruments.Add(new Instrument(row["name"].Replace('_', ' '), row["inside"] == "yes", row["outside"] == "yes",
                Length.FromMillimetres(row.Decimal("from")), Length.FromMillimetres(row.Decimal("to")),
                new Deviation((long)(row.Decimal("uncertainty") * Length.PicometresPerMicrometre)), row.Double("minutes"), table.Cite(row["name"].Replace('_', ' '))));
        }

        return instruments;
    }
}
