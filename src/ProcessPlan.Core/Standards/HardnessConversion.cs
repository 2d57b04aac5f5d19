using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>
/// Conversion between scales of hardness by ISO 18265, Table A.1: unalloyed and low-alloy steel and cast steel only.
/// A converted hardness is an estimate.
/// </summary>
public static class HardnessConversion
{
    private static readonly PublishedTable Table = PublishedTable.Load("iso18265-table-a1.txt");

    public static Citation Citation => Table.Cite();

    /// <summary>
    /// The hardness in another scale, linear between the rows, rounded to the tenth for HRC and to the point for HB and HV, a half up.
    /// </summary>
    /// <returns>Null outside the rows that give both scales; the ends are included. The same scale gives the hardness unchanged.</returns>
    public static Hardness? Convert(Hardness from, HardnessScale to)
    {
        if (from.Scale == to)
        {
            return from;
        }

        TableRow? below = null;
        foreach (TableRow row in Table.Rows)
        {
            if (row.IsEmpty(Column(from.Scale)) || row.IsEmpty(Column(to)))
            {
                continue;
            }

            decimal points = from.Tenths / 10m;
            decimal at = row.Decimal(Column(from.Scale));
            if (points == at || (points < at && below is not null))
            {
                return new Hardness(Round(Between(below ?? row, row, points, from.Scale, to), to), to);
            }

            if (points < at)
            {
                return null;
            }

            below = row;
        }

        return null;
    }

    private static decimal Between(TableRow below, TableRow above, decimal points, HardnessScale from, HardnessScale to)
    {
        decimal low = below.Decimal(Column(from));
        decimal span = above.Decimal(Column(from)) - low;
        decimal start = below.Decimal(Column(to));
        return span == 0 ? start : start + ((above.Decimal(Column(to)) - start) * (points - low) / span);
    }

    private static long Round(decimal points, HardnessScale to) =>
        to == HardnessScale.HRC ? (long)decimal.Floor((points * 10) + 0.5m) : 10 * (long)decimal.Floor(points + 0.5m);

    private static string Column(HardnessScale scale) => scale switch
    {
        HardnessScale.HRC => "hrc",
        HardnessScale.HB => "hb",
        HardnessScale.HV => "hv",
        _ => throw new ArgumentOutOfRangeException(nameof(scale), scale, "The scales are HRC, HB and HV."),
    };
}
