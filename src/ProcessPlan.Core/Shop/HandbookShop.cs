using System.Globalization;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Shop;

/// <summary>The shop that is built in, so that the first plan works on a fresh machine: an average jobbing shop with the usual drills and reamers.</summary>
public static class HandbookShop
{
    /// <summary>The material that a line without one is planned in.</summary>
    public const string DefaultMaterial = "C45";

    public static ShopFloor Load()
    {
        PublishedTable machines = PublishedTable.Load("shop-machines.txt");
        return new ShopFloor("handbook shop", machines.Head("currency"), ReadMachines(machines), ReadTools(PublishedTable.Load("shop-tools.txt")),
            Materials(), ReadBars(PublishedTable.Load("shop-bars.txt")),
            ReadSuppliers(PublishedTable.Load("shop-suppliers.txt")));
    }

    /// <summary>The materials alone, for reading a line without planning it.</summary>
    public static IReadOnlyList<Material> Materials()
    {
        PublishedTable table = PublishedTable.Load("shop-materials.txt");
        List<Material> materials = [];
        foreach (TableRow row in table.Rows)
        {
            string note = row["note"];
            Standing standing = note.Contains("from memory", StringComparison.Ordinal) ? Standing.FromMemory : table.Standing;
            string designation = row["designation"];
            materials.Add(new Material(designation, row.IsEmpty("aliases") ? [] : [.. row["aliases"].Split(',')], row["group"], row["iso513"],
                row.DoubleOrNull("hbFrom"), row.DoubleOrNull("hbTo"), row.Double("expansion"), row["skin"] == "yes", note,
                table.Cite(designation) with { Standing = standing }));
        }

        return materials;
    }

    private static List<Machine> ReadMachines(PublishedTable table)
    {
        List<Machine> machines = [];
        foreach (TableRow row in table.Rows)
        {
            machines.Add(new Machine(Spaced(row["name"]), [.. row["abilities"].Split(',')], row.Decimal("rate"), row.Double("setUp"), row.Double("handling"),
                row.Double("toolChange"), Length.FromMillimetres(row.Decimal("from")), Length.FromMillimetres(row.Decimal("to")), row.Double("power")));
        }

        return machines;
    }

    private static List<Tool> ReadTools(PublishedTable table)
    {
        List<Tool> tools = [];
        foreach (TableRow row in table.Rows)
        {
            ToolUse use = row["use"] switch
            {
                "drill" => ToolUse.Drill,
                "core-drill" => ToolUse.CoreDrill,
                "rough-ream" => ToolUse.RoughReam,
                "ream" => ToolUse.Ream,
                string other => throw new InvalidDataException($"{table.Name}, line {row.Line}: '{other}' is no use of a tool."),
            };
            (decimal to, decimal step) = (row.Decimal("to"), row.Decimal("step"));
            for (decimal size = row.Decimal("from"); size <= to; size += step)
            {
                Length stamped = Length.FromMillimetres(size);
                tools.Add(new Tool(Spaced(row["name"]), use, stamped, OwnSize(stamped, row["made"]), row["made"], row["material"],
                    row.Decimal("price") + row.Decimal("perMm") * size, row.Double("life")));
            }
        }

        return tools;
    }

    /// <summary>A tolerance class says how the tool is made (h8), or which holes it is made for (H7, by DIN 1420); or limits in micrometres stand there.</summary>
    private static SizeWindow OwnSize(Length stamped, string made)
    {
        if (ToleranceClass.TryRead(made, out ToleranceClass toleranceClass, out _))
        {
            SizeWindow limits = Iso286.Find(stamped, toleranceClass).LimitsAt(stamped);
            return toleranceClass.IsInternal ? Din1420.ReamerFor(limits) : limits;
        }

        string[] parts = made.Split('/');
        return new SizeWindow(stamped + Micrometres(parts[0]), stamped + Micrometres(parts[1]));
    }

    private static Deviation Micrometres(string text) => Deviation.FromMicrometres(long.Parse(text, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture));

    private static List<BarSeries> ReadBars(PublishedTable table)
    {
        List<BarSeries> bars = [];
        foreach (TableRow row in table.Rows)
        {
            bars.Add(new BarSeries(Length.FromMillimetres(row.Decimal("over")), Length.FromMillimetres(row.Decimal("upto")),
                [.. row["sizes"].Split(',').Select(static size => Length.FromMillimetres(int.Parse(size, CultureInfo.InvariantCulture)))], Length.FromMillimetres(row.Decimal("deviation")) - Length.Zero,
                table.Cite($"over {row["over"]} to {row["upto"]} mm")));
        }

        return bars;
    }

    private static List<Supplier> ReadSuppliers(PublishedTable table)
    {
        List<Supplier> suppliers = [];
        foreach (TableRow row in table.Rows)
        {
            suppliers.Add(new Supplier(Spaced(row["process"]), row.Decimal("lot"), row.Decimal("piece"), (int)row.Decimal("days")));
        }

        return suppliers;
    }

    private static string Spaced(string name) => name.Replace('_', ' ');
}
