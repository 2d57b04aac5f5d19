using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Shop;

/// <summary>A machine with what it is for and what it charges.</summary>
/// <param name="Name">As the shop calls it.</param>
/// <param name="Abilities">What it can do, in the words of the process tables: drill, ream, bore, turn …</param>
/// <param name="RatePerHour">Machine and man, in the shop's currency.</param>
/// <param name="SetUpMinutes">Once a lot.</param>
/// <param name="HandlingMinutes">Load and unload, once a piece.</param>
/// <param name="ToolChangeMinutes">Once a piece and tool.</param>
/// <param name="Smallest">Smallest diameter or width that it cuts.</param>
/// <param name="Largest">Largest diameter or width that it cuts.</param>
/// <param name="PowerKw">Power at the spindle.</param>
public sealed record Machine(
    string Name,
    ValueList<string> Abilities,
    decimal RatePerHour,
    double SetUpMinutes,
    double HandlingMinutes,
    double ToolChangeMinutes,
    Length Smallest,
    Length Largest,
    double PowerKw)
{
    public double RatePerMinute => (double)RatePerHour / 60;
}
