namespace ProcessPlan.Core.Standards;

/// <summary>How far a figure may be trusted, by where it was taken from.</summary>
public enum Standing
{
    /// <summary>Read from the publication that is named.</summary>
    Published,

    /// <summary>Computed by a formula or rule that is named.</summary>
    Derived,

    /// <summary>The publication is named, but its figures come from memory and were not compared with it.</summary>
    FromMemory,

    /// <summary>What shops commonly do; there is no single source.</summary>
    CommonPractice,
}

/// <summary>Where a figure comes from, so that the card can say it.</summary>
/// <param name="Source">Standard or handbook with its edition.</param>
/// <param name="Place">Table, row or formula in it; may be empty.</param>
/// <param name="Standing">How far it may be trusted.</param>
public sealed record Citation(string Source, string Place, Standing Standing)
{
    /// <summary>One line for the card, with the remark that the standing asks for.</summary>
    public override string ToString()
    {
        string text = Place.Length > 0 ? $"{Source}, {Place}" : Source;
        return Standing switch
        {
            Standing.FromMemory => text + " (from memory, not verified)",
            Standing.CommonPractice => text + " (shop practice, not a standard)",
            _ => text,
        };
    }
}
