using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>A row of a table by size: nominal sizes over <paramref name="Over"/> up to and including <paramref name="UpTo"/>.</summary>
public readonly record struct SizeStep(Length Over, Length UpTo)
{
    public bool Contains(Length nominal) => Over < nominal && nominal <= UpTo;

    public override string ToString() => Over == Length.Zero ? $"up to {UpTo.Format()} mm" : $"over {Over.Format()} to {UpTo.Format()} mm";
}
