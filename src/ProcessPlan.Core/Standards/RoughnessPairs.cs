using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>The Ra that a drawing's Rz comes to, by a published table of pairs.</summary>
public static class RoughnessPairs
{
    private static readonly PublishedTable Table = PublishedTable.Load("ra-rz-pairs.txt");

    /// <summary>What has to be said wherever an Rz was turned into an Ra.</summary>
    public static string Remark =>
        "There is no exact law between Ra and Rz: the pairs are a maker's table, so measure the one that the drawing asks for.";

    public static Citation Citation => Table.Cite();

    /// <summary>
    /// The Ra to hold for what is asked: itself where it is an Ra; for an Rz the largest Ra of the table whose Rz, the larger figure
    /// where two are printed, does not exceed the asked Rz. Null for an Rz finer than the table.
    /// </summary>
    public static Roughness? ToRa(Roughness asked)
    {
        if (asked.IsRa)
        {
            return asked;
        }

        Roughness? held = null;
        foreach (TableRow row in Table.Rows)
        {
            if (Nanometres(row, "rz-to") <= asked.Nanometres)
            {
                held = Roughness.Ra(Nanometres(row, "ra"));
            }
        }

        return held;
    }

    private static long Nanometres(TableRow row, string column) => (long)(row.Decimal(column) * 1000);
}
