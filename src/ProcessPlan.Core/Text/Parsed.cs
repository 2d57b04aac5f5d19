using System.Diagnostics.CodeAnalysis;

namespace ProcessPlan.Core.Text;

/// <summary>Either a value read whole, or every problem of the text; never a half-read value.</summary>
public readonly struct Parsed<T>
    where T : class
{
    private readonly IReadOnlyList<Problem>? _problems;

    private Parsed(T? value, IReadOnlyList<Problem>? problems)
    {
        Value = value;
        _problems = problems;
    }

    /// <summary>The value, or null where there are problems.</summary>
    public T? Value { get; }

    /// <summary>All problems in the order of their places; empty where the value was read.</summary>
    public IReadOnlyList<Problem> Problems => _problems ?? [];

    [MemberNotNullWhen(true, nameof(Value))]
    public bool IsRead => Value is not null;

    public static Parsed<T> Of(T value) => new(value, null);

    /// <exception cref="ArgumentException">There is no problem in the list.</exception>
    public static Parsed<T> Failed(IReadOnlyList<Problem> problems) =>
        problems.Count > 0 ? new(null, problems) : throw new ArgumentException("A failure needs at least one problem.", nameof(problems));
}
