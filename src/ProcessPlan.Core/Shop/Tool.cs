using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Shop;

/// <summary>What a tool of fixed size is used for.</summary>
public enum ToolUse
{
    Drill,
    CoreDrill,
    RoughReam,
    Ream,
}

/// <summary>A tool that gives the hole its size.</summary>
/// <param name="Name">Kind of tool, as the crib calls it.</param>
/// <param name="Use">What it is for.</param>
/// <param name="Stamped">The size stamped on it.</param>
/// <param name="Own">Limits of the tool's own diameter: measured, or by the tolerance it is made to.</param>
/// <param name="Made">The tolerance it is made to, as text for the card.</param>
/// <param name="Material">HSS or carbide.</param>
/// <param name="Price">What a new one costs, in the shop's currency.</param>
/// <param name="LifeMetres">Metres of hole until it is worn.</param>
public sealed record Tool(string Name, ToolUse Use, Length Stamped, SizeWindow Own, string Made, string Material, decimal Price, double LifeMetres)
{
    /// <summary>Name and size, as the pick list prints it.</summary>
    public string Label => $"{Name} {Stamped.Format()}{(Made.StartsWith('H') ? " " + Made : "")}";

    public override string ToString() => Label;
}
