using System.CommandLine;
using ProcessPlan.Core.Values;

namespace ProcessPlan;

/// <summary>The choice of the unit that comes first.</summary>
internal sealed class UnitChoice(string otherwise)
{
    private const string Millimetres = "mm";
    private const string Inches = "in";

    public Option<string> Option { get; } = new("--unit")
    {
        Description = $"Unit that comes first: {Millimetres} or {Inches}; without it {otherwise}",
        HelpName = Millimetres + "|" + Inches,
        Arity = ArgumentArity.ZeroOrOne,
    };

    /// <summary>The unit that was asked for; null where none was.</summary>
    /// <exception cref="UsageException">The word behind the option is no unit.</exception>
    public LengthUnit? In(ParseResult parsed) => parsed.GetResult(Option) is null ? null : parsed.GetValue(Option) switch
    {
        Millimetres => LengthUnit.Millimetre,
        Inches => LengthUnit.Inch,
        string other => throw new UsageException($"--unit found '{other}'; expected {Millimetres} or {Inches}."),
        null => throw new UsageException($"--unit found nothing; expected {Millimetres} or {Inches}."),
    };
}
