using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>The four classes of general tolerances of ISO 2768-1.</summary>
public enum GeneralTolerance
{
    Fine,
    Medium,
    Coarse,
    VeryCoarse,
}

/// <summary>ISO 2768-1:1989: tolerances of linear sizes that have none of their own, from 0.5 to 4000 mm, both included.</summary>
public static class Iso2768
{
    private static readonly string[] Letters = ["f", "m", "c", "v"];

    private static readonly PublishedTable Table = PublishedTable.Load("iso2768-1-table1.txt");

    /// <summary>How a drawing writes the class: "ISO 2768-m".</summary>
    public static string Name(GeneralTolerance tolerance) => "ISO 2768-" + Letters[(int)tolerance];

    /// <summary>The permissible deviation ± of <paramref name="nominal"/>, exact; null where the standard gives none.</summary>
    public static Deviation? Find(Length nominal, GeneralTolerance tolerance)
    {
        string column = Letters[(int)tolerance];
        return Row(nominal) is { } row && !row.IsEmpty(column) ? Length.FromMillimetres(row.Decimal(column)) - Length.Zero : null;
    }

    /// <summary>Where the deviation stands, as "ISO 2768-1:1989, Table 1, over 30 to 120 mm, m".</summary>
    /// <exception cref="ArgumentOutOfRangeException">The standard gives no deviation there.</exception>
    public static Citation Cite(Length nominal, GeneralTolerance tolerance)
    {
        if (Find(nominal, tolerance) is null || Row(nominal) is not { } row)
        {
            throw new ArgumentOutOfRangeException(nameof(nominal), nominal, $"{Name(tolerance)} gives no deviation at this size.");
        }

        string range = row == Table.Rows[0] ? $"{row["over"]} to {row["upto"]} mm" : $"over {row["over"]} to {row["upto"]} mm";
        return Table.Cite($"{range}, {Letters[(int)tolerance]}");
    }

    private static TableRow? Row(Length nominal)
    {
        if (nominal < Length.FromMillimetres(Table.Rows[0].Decimal("over")))
        {
            return null;
        }

        foreach (TableRow row in Table.Rows)
        {
            if (nominal <= Length.FromMillimetres(row.Decimal("upto")))
            {
                return row;
            }
        }

        return null;
    }
}
