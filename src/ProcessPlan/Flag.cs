using System.CommandLine;

namespace ProcessPlan;

/// <summary>
/// A choice that is there or not. An option without a value: the library's options of truth values are generic code that would be compiled at every start.
/// </summary>
internal sealed class Flag(string name, string description)
{
    public Option<string> Option { get; } = new(name) { Description = description, Arity = ArgumentArity.Zero };

    public bool In(ParseResult parsed) => parsed.GetResult(Option) is not null;
}
