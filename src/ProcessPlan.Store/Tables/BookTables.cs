using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Store.Tables;

/// <summary>The tables of the shop book.</summary>
public static class BookTables
{
    private static readonly (string Word, ToolUse Use)[] Uses =
        [("drill", ToolUse.Drill), ("core-drill", ToolUse.CoreDrill), ("rough-ream", ToolUse.RoughReam), ("ream", ToolUse.Ream)];

    private static readonly (string Word, Standing Standing)[] Standings =
    [
        ("published", Standing.Published), ("derived", Standing.Derived), ("from memory", Standing.FromMemory), ("common practice", Standing.CommonPractice),
    ];

    public static BookTable<Machine> Machines { get; } = new(
        "machines",
        "machine",
        [
            new("name", CellKind.Name, static machine => machine.Name),
            new("abilities", CellKind.Words, static machine => machine.Abilities),
            new("ratePerHour", CellKind.Amount, static machine => machine.RatePerHour),
            new("setUpMinutes", CellKind.Number, static machine => machine.SetUpMinutes),
            new("handlingMinutes", CellKind.Number, static machine => machine.HandlingMinutes),
            new("toolChangeMinutes", CellKind.Number, static machine => machine.ToolChangeMinutes),
            new("smallest", CellKind.Size, static machine => machine.Smallest),
            new("largest", CellKind.Size, static machine => machine.Largest),
            new("powerKw", CellKind.Number, static machine => machine.PowerKw),
        ],
        static row => new Machine(row.Take<string>(), row.Take<ValueList<string>>(), row.Take<decimal>(), row.Take<double>(), row.Take<double>(), row.Take<double>(),
            row.Take<Length>(), row.Take<Length>(), row.Take<double>()),
        static (table, cells) => Above(table, cells, "smallest", "largest") ?? NotAboveZero(table, cells, "powerKw"),
        key: ["name"],
        isKeyUnique: true,
        shown: ["name", "abilities", "ratePerHour", "largest"]);

    /// <summary>Two tools may be alike in everything: the crib can hold several.</summary>
    public static BookTable<Tool> Tools { get; } = new(
        "tools",
        "tool",
        [
            new("name", CellKind.Name, static tool => tool.Name),
            new("use", CellKind.OneOf([.. Uses.Select(static use => use.Word)]), static tool => WordOf(Uses, tool.Use)),
            new("stamped", CellKind.Size, static tool => tool.Stamped),
            new("ownMin", CellKind.Size, static tool => tool.Own.Min),
            new("ownMax", CellKind.Size, static tool => tool.Own.Max),
            new("made", CellKind.Text, static tool => tool.Made),
            new("material", CellKind.Text, static tool => tool.Material),
            new("price", CellKind.Amount, static tool => tool.Price),
            new("lifeMetres", CellKind.Number, static tool => tool.LifeMetres),
        ],
        static row => new Tool(row.Take<string>(), Meaning(Uses, row.Take<string>()), row.Take<Length>(), new SizeWindow(row.Take<Length>(), row.Take<Length>()),
            row.Take<string>(), row.Take<string>(), row.Take<decimal>(), row.Take<double>()),
        static (table, cells) => Above(table, cells, "ownMin", "ownMax") ?? NotAboveZero(table, cells, "lifeMetres")
            ?? (table.Cell<Length>(cells, "stamped") is var stamped && (stamped <= Length.Zero || stamped > LargestTool) ? $"stamped {stamped} is not above 0 and up to {LargestTool}" : null),
        key: ["name", "use", "stamped", "made", "material"],
        isKeyUnique: false,
        shown: ["name", "use", "stamped", "ownMin", "ownMax", "made", "price"]);

    public static BookTable<Material> Materials { get; } = new(
        "materials",
        "material",
        [
            new("designation", CellKind.Designation, static material => material.Designation),
            new("aliases", CellKind.Words, static material => material.Aliases),
            new("group", CellKind.OneOf([.. CuttingData.Groups]), static material => material.Group),
            new("iso513", CellKind.OneOf("P", "M", "K", "N", "S", "H", "O"), static material => material.Iso513),
            new("hbFrom", CellKind.NumberOrNothing, static material => material.HbFrom),
            new("hbTo", CellKind.NumberOrNothing, static material => material.HbTo),
            new("expansion", CellKind.Number, static material => material.Expansion),
            new("keepsSkin", CellKind.YesOrNo, static material => material.KeepsSkin),
            new("condition", CellKind.Text, static material => material.Condition),
            new("source", CellKind.Text, static material => material.Origin.Source),
            new("place", CellKind.Text, static material => material.Origin.Place),
            new("standing", CellKind.OneOf([.. Standings.Select(static standing => standing.Word)]), static material => WordOf(Standings, material.Origin.Standing)),
        ],
        static row => new Material(row.Take<string>(), row.Take<ValueList<string>>(), row.Take<string>(), row.Take<string>(), row.Take<double?>(), row.Take<double?>(),
            row.Take<double>(), row.Take<bool>(), row.Take<string>(), TakeCitation(ref row)),
        static (table, cells) => table.Cell<double?>(cells, "hbFrom") > table.Cell<double?>(cells, "hbTo") ? "hbFrom is above hbTo" : null,
        key: ["designation"],
        isKeyUnique: true,
        shown: ["designation", "group", "hbFrom", "hbTo", "condition"]);

    public static BookTable<BarSeries> Bars { get; } = new(
        "bars",
        "series of bars",
        [
            new("over", CellKind.Size, static bars => bars.Over),
            new("upTo", CellKind.Size, static bars => bars.UpTo),
            new("sizes", CellKind.Sizes, static bars => bars.Sizes),
            new("deviation", CellKind.Size, static bars => Length.Zero + bars.Deviation),
            new("source", CellKind.Text, static bars => bars.Origin.Source),
            new("place", CellKind.Text, static bars => bars.Origin.Place),
            new("standing", CellKind.OneOf([.. Standings.Select(static standing => standing.Word)]), static bars => WordOf(Standings, bars.Origin.Standing)),
        ],
        static row => new BarSeries(row.Take<Length>(), row.Take<Length>(), row.Take<ValueList<Length>>(), row.Take<Length>() - Length.Zero, TakeCitation(ref row)),
        static (table, cells) => BarComplaint(table.Cell<Length>(cells, "over"), table.Cell<Length>(cells, "upTo"), table.Cell<Length>(cells, "deviation"),
            table.Cell<ValueList<Length>>(cells, "sizes")),
        key: ["over"],
        isKeyUnique: true,
        shown: ["over", "upTo", "sizes", "deviation"]);

    public static BookTable<Supplier> Suppliers { get; } = new(
        "suppliers",
        "supplier",
        [
            new("process", CellKind.Name, static supplier => supplier.Process),
            new("lotCharge", CellKind.Amount, static supplier => supplier.LotCharge),
            new("piecePrice", CellKind.Amount, static supplier => supplier.PiecePrice),
            new("days", CellKind.Count, static supplier => supplier.Days),
        ],
        static row => new Supplier(row.Take<string>(), row.Take<decimal>(), row.Take<decimal>(), row.Take<int>()),
        static (_, _) => null,
        key: ["process"],
        isKeyUnique: true,
        shown: ["process", "lotCharge", "piecePrice", "days"]);

    public static IReadOnlyList<BookTable> All { get; } = [Machines, Tools, Materials, Bars, Suppliers];

    /// <summary>The tables of what a tool leaves end here.</summary>
    private static Length LargestTool => Length.FromMillimetres(80);

    public static BookTable? Find(string name) => All.FirstOrDefault(table => table.Name == name);

    private static string? BarComplaint(Length over, Length upTo, Length deviation, ValueList<Length> sizes)
    {
        Length last = over;
        foreach (Length size in sizes)
        {
            if (size <= last || size > upTo)
            {
                return $"size {size} does not lie above {last} and up to {upTo}";
            }

            last = size;
        }

        return deviation >= upTo ? $"deviation {deviation} is not below the size" : null;
    }

    private static string? Above(BookTable table, object?[] cells, string lower, string upper) =>
        table.Cell<Length>(cells, lower) > table.Cell<Length>(cells, upper) ? $"{lower} {table.Cell<Length>(cells, lower)} is above {upper} {table.Cell<Length>(cells, upper)}" : null;

    private static string? NotAboveZero(BookTable table, object?[] cells, string column) => table.Cell<double>(cells, column) > 0 ? null : $"{column} is not above 0";

    private static Citation TakeCitation(ref RowCells row) => new(row.Take<string>(), row.Take<string>(), Meaning(Standings, row.Take<string>()));

    private static string WordOf<T>((string Word, T Meaning)[] words, T meaning) => Array.Find(words, pair => Equals(pair.Meaning, meaning)).Word;

    private static T Meaning<T>((string Word, T Meaning)[] words, string word) => Array.Find(words, pair => pair.Word == word).Meaning;
}
