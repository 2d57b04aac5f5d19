using ProcessPlan.Core.Features;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Shop;

/// <summary>All that one shop owns and charges, whole and unchangeable: what a plan is made from.</summary>
public sealed class ShopFloor
{
    private const long HalfMillimetre = Length.PicometresPerMillimetre / 2;

    private readonly Dictionary<string, Material> _materials;
    private readonly Dictionary<ToolUse, Tool[]> _tools = [];

    public ShopFloor(string name, string currency, IReadOnlyList<Machine> machines, IEnumerable<Tool> tools, IReadOnlyList<Material> materials, IReadOnlyList<BarSeries> bars,
        IReadOnlyList<Supplier> suppliers)
    {
        Name = name;
        Currency = currency;
        Machines = machines;
        Materials = materials;
        Bars = bars;
        Suppliers = suppliers;
        _materials = materials.ToDictionary(static material => material.Designation);
        foreach (IGrouping<ToolUse, Tool> use in tools.GroupBy(static tool => tool.Use))
        {
            Tool[] sorted = [.. use.OrderBy(static tool => tool.Stamped).ThenBy(static tool => tool.Name, StringComparer.Ordinal)];
            _tools[use.Key] = sorted;
        }

        Names = NamesOf(materials);
    }

    public string Name { get; }

    /// <summary>Three letters; all rates are in it.</summary>
    public string Currency { get; }

    public IReadOnlyList<Machine> Machines { get; }

    public IReadOnlyList<Material> Materials { get; }

    public IReadOnlyList<BarSeries> Bars { get; }

    public IReadOnlyList<Supplier> Suppliers { get; }

    /// <summary>The names under which a feature line may call the materials.</summary>
    public MaterialNames Names { get; }

    /// <summary>The material of a line that names none: C45 where the shop has it, else its first one.</summary>
    /// <exception cref="InvalidOperationException">The shop has no material at all.</exception>
    public Material UsualMaterial => _materials.TryGetValue(HandbookShop.DefaultMaterial, out Material? usual) ? usual
        : Materials.Count > 0 ? Materials[0]
        : throw new InvalidOperationException($"The shop '{Name}' has no materials; nothing can be planned in it.");

    /// <summary>The names of materials, for reading a line without planning it.</summary>
    public static MaterialNames NamesOf(IEnumerable<Material> materials) =>
        new(materials.Select(static material => (IReadOnlyList<string>)[material.Designation, .. material.Aliases]));

    /// <exception cref="KeyNotFoundException">The shop has no such material.</exception>
    public Material Material(string designation) => _materials[designation];

    /// <summary>The tools for one use, by size.</summary>
    public IReadOnlyList<Tool> Tools(ToolUse use) => _tools.TryGetValue(use, out Tool[]? tools) ? tools : [];

    /// <summary>The tools for one use whose stamp lies in a range of sizes or at most half a millimetre below it, by size.</summary>
    public ReadOnlySpan<Tool> ToolsNear(ToolUse use, SizeWindow sizes)
    {
        if (!_tools.TryGetValue(use, out Tool[]? tools))
        {
            return [];
        }

        int from = FirstAbove(tools, new Length(sizes.Min.Picometres - HalfMillimetre));
        return tools.AsSpan(from, Math.Max(0, FirstAbove(tools, sizes.Max) - from));
    }

    private static int FirstAbove(Tool[] tools, Length size)
    {
        int low = 0;
        int high = tools.Length;
        while (low < high)
        {
            int middle = (low + high) / 2;
            (low, high) = tools[middle].Stamped <= size ? (middle + 1, high) : (low, middle);
        }

        return low;
    }

    /// <summary>The smallest stocked bar whose smallest diameter is not below <paramref name="least"/>; null beyond the series.</summary>
    public Bar? BarFor(Length least)
    {
        foreach (BarSeries series in Bars)
        {
            foreach (Length size in series.Sizes)
            {
                if (size - series.Deviation >= least)
                {
                    return new Bar(size, new SizeWindow(size - series.Deviation, size + series.Deviation));
                }
            }
        }

        return null;
    }
}

/// <summary>Stocked round bars of one range of sizes.</summary>
/// <param name="Over">Sizes over this,</param>
/// <param name="UpTo">up to and including this,</param>
/// <param name="Sizes">in these diameters, by size,</param>
/// <param name="Deviation">with this permissible deviation either way.</param>
/// <param name="Origin">Where the figures come from.</param>
public sealed record BarSeries(Length Over, Length UpTo, ValueList<Length> Sizes, Deviation Deviation, Citation Origin);

/// <param name="Size">Nominal diameter.</param>
/// <param name="Limits">Smallest and largest diameter as delivered.</param>
public sealed record Bar(Length Size, SizeWindow Limits);
