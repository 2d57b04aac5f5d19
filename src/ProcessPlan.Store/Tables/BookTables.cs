using LiteDB;
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
            new("abilities", CellKind.Words, static machine => Array(machine.Abilities)),
            new("ratePerHour", CellKind.Amount, static machine => machine.RatePerHour),
            new("setUpMinutes", CellKind.Number, static machine => machine.SetUpMinutes),
            new("handlingMinutes", CellKind.Number, static machine => machine.HandlingMinutes),
            new("toolChangeMinutes", CellKind.Number, static machine => machine.ToolChangeMinutes),
            new("smallest", CellKind.Size, static machine => machine.Smallest.Picometres),
            new("largest", CellKind.Size, static machine => machine.Largest.Picometres),
            new("powerKw", CellKind.Number, static machine => machine.PowerKw),
        ],
        static row => new Machine(row.Text("name"), row.Words("abilities"), row.Amount("ratePerHour"), row.Number("setUpMinutes"), row.Number("handlingMinutes"),
            row.Number("toolChangeMinutes"), row.Size("smallest"), row.Size("largest"), row.Number("powerKw")),
        static row => row.Size("smallest") > row.Size("largest") ? $"smallest {row.Size("smallest")} is above largest {row.Size("largest")}"
            : row.Number("powerKw") <= 0 ? "powerKw is not above 0" : null,
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
            new("stamped", CellKind.Size, static tool => tool.Stamped.Picometres),
            new("ownMin", CellKind.Size, static tool => tool.Own.Min.Picometres),
            new("ownMax", CellKind.Size, static tool => tool.Own.Max.Picometres),
            new("made", CellKind.Text, static tool => tool.Made),
            new("material", CellKind.Text, static tool => tool.Material),
            new("price", CellKind.Amount, static tool => tool.Price),
            new("lifeMetres", CellKind.Number, static tool => tool.LifeMetres),
        ],
        static row => new Tool(row.Text("name"), Meaning(Uses, row.Text("use")), row.Size("stamped"), new SizeWindow(row.Size("ownMin"), row.Size("ownMax")),
            row.Text("made"), row.Text("material"), row.Amount("price"), row.Number("lifeMetres")),
        static row => row.Size("ownMin") > row.Size("ownMax") ? $"ownMin {row.Size("ownMin")} is above ownMax {row.Size("ownMax")}"
            : row.Size("stamped") <= Length.Zero || row.Size("stamped") > LargestTool ? $"stamped {row.Size("stamped")} is not above 0 and up to {LargestTool}"
            : row.Number("lifeMetres") <= 0 ? "lifeMetres is not above 0" : null,
        key: ["name", "use", "stamped", "made", "material"],
        isKeyUnique: false,
        shown: ["name", "use", "stamped", "ownMin", "ownMax", "made", "price"]);

    public static BookTable<Material> Materials { get; } = new(
        "materials",
        "material",
        [
            new("designation", CellKind.Designation, static material => material.Designation),
            new("aliases", CellKind.Words, static material => Array(material.Aliases)),
            new("group", CellKind.OneOf([.. CuttingData.Groups]), static material => material.Group),
            new("iso513", CellKind.OneOf("P", "M", "K", "N", "S", "H", "O"), static material => material.Iso513),
            new("hbFrom", CellKind.NumberOrNothing, static material => material.HbFrom is { } from ? from : BsonValue.Null),
            new("hbTo", CellKind.NumberOrNothing, static material => material.HbTo is { } to ? to : BsonValue.Null),
            new("expansion", CellKind.Number, static material => material.Expansion),
            new("keepsSkin", CellKind.YesOrNo, static material => material.KeepsSkin),
            new("condition", CellKind.Text, static material => material.Condition),
            new("source", CellKind.Text, static material => material.Origin.Source),
            new("place", CellKind.Text, static material => material.Origin.Place),
            new("standing", CellKind.OneOf([.. Standings.Select(static standing => standing.Word)]), static material => WordOf(Standings, material.Origin.Standing)),
        ],
        static row => new Material(row.Text("designation"), row.Words("aliases"), row.Text("group"), row.Text("iso513"), row.NumberOrNothing("hbFrom"),
            row.NumberOrNothing("hbTo"), row.Number("expansion"), row.IsYes("keepsSkin"), row.Text("condition"),
            new Citation(row.Text("source"), row.Text("place"), Meaning(Standings, row.Text("standing")))),
        static row => row.NumberOrNothing("hbFrom") > row.NumberOrNothing("hbTo") ? "hbFrom is above hbTo" : null,
        key: ["designation"],
        isKeyUnique: true,
        shown: ["designation", "group", "hbFrom", "hbTo", "condition"]);

    public static BookTable<BarSeries> Bars { get; } = new(
        "bars",
        "series of bars",
        [
            new("over", CellKind.Size, static bars => bars.Over.Picometres),
            new("upTo", CellKind.Size, static bars => bars.UpTo.Picometres),
            new("sizes", CellKind.Sizes, static bars => Array(bars.Sizes)),
            new("deviation", CellKind.Size, static bars => bars.Deviation.Picometres),
            new("source", CellKind.Text, static bars => bars.Origin.Source),
            new("place", CellKind.Text, static bars => bars.Origin.Place),
            new("standing", CellKind.OneOf([.. Standings.Select(static standing => standing.Word)]), static bars => WordOf(Standings, bars.Origin.Standing)),
        ],
        static row => new BarSeries(row.Size("over"), row.Size("upTo"), row.Sizes("sizes"), row.Size("deviation") - Length.Zero,
            new Citation(row.Text("source"), row.Text("place"), Meaning(Standings, row.Text("standing")))),
        static row => BarComplaint(row.Size("over"), row.Size("upTo"), row.Size("deviation"), row.Sizes("sizes")),
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
        static row => new Supplier(row.Text("process"), row.Amount("lotCharge"), row.Amount("piecePrice"), row.Count("days")),
        static _ => null,
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

    private static BsonArray Array(ValueList<string> words) => new(words.Select(static word => new BsonValue(word)));

    private static BsonArray Array(ValueList<Length> sizes) => new(sizes.Select(static size => new BsonValue(size.Picometres)));

    private static string WordOf<T>((string Word, T Meaning)[] words, T meaning) => System.Array.Find(words, pair => Equals(pair.Meaning, meaning)).Word;

    private static T Meaning<T>((string Word, T Meaning)[] words, string word) => System.Array.Find(words, pair => pair.Word == word).Meaning;
}
