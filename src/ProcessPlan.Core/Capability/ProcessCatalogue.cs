using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Capability;

/// <summary>The processes of the handbook, in the order of the table, from coarse to fine for each kind of feature.</summary>
public static class ProcessCatalogue
{
    public static IReadOnlyList<Process> Handbook { get; } = Read(PublishedTable.Load("processes.txt"));

    private static List<Process> Read(PublishedTable table)
    {
        List<Process> processes = [];
        foreach (TableRow row in table.Rows)
        {
            string name = row["process"].Replace('_', ' ');
            processes.Add(new Process
            {
                Name = name,
                Kind = row["features"] switch
                {
                    "H" => FeatureKind.Hole,
                    "S" => FeatureKind.Shaft,
                    "W" => FeatureKind.Slot,
                    "T" => FeatureKind.Tongue,
                    string other => throw new InvalidDataException($"{table.Name}, line {row.Line}: '{other}' is none of H, S, W, T."),
                },
                SizedBy = row["size"] switch
                {
                    "set" => null,
                    "drill" => ToolUse.Drill,
                    "core-drill" => ToolUse.CoreDrill,
                    "rough-ream" => ToolUse.RoughReam,
                    "ream" => ToolUse.Ream,
                    string other => throw new InvalidDataException($"{table.Name}, line {row.Line}: '{other}' gives no size."),
                },
                Ability = row["ability"],
                RoutineGrade = Grade(row, "itR"),
                SpecialGrade = row.IsEmpty("itS") ? null : Grade(row, "itS"),
                RoutineRa = Ra(row, "raR"),
                SpecialRa = Ra(row, "raS"),
                LeftGrade = Grade(row, "itL"),
                LeftRa = Ra(row, "raL"),
                Smallest = Length.FromMillimetres(row.Decimal("from")),
                Largest = Length.FromMillimetres(row.Decimal("to")),
                LongestRatio = row.Double("ld"),
                HardestHrc = row.DoubleOrNull("hrc"),
                Follows = row["path"] == "follows",
                EnterGrade = Grade(row, "enter"),
                BottomRoom = Length.FromMillimetres(row.Decimal("room")),
                MostStock = new Stock(Length.FromMillimetres(row.Decimal("most")).Picometres),
                MostStockShare = row.Double("mostRel"),
                LeastStock = new Stock(Length.FromMillimetres(row.Decimal("least")).Picometres),
                SelfGuided = row["guide"] == "yes",
                Groups = row["groups"] == "*" ? [] : row["groups"].Split(','),
                Origin = table.Cite(name),
            });
        }

        return processes;
    }

    private static ToleranceGrade Grade(TableRow row, string column) => ToleranceGrade.It((int)row.Decimal(column));

    private static Roughness Ra(TableRow row, string column) =>
        Roughness.Ra((long)(row.Decimal(column) * 1000));
}
