namespace ProcessPlan.Core.Features;

/// <summary>What one line asks for: a feature, or the two features of a fit.</summary>
/// <param name="First">The feature; of a fit, the internal one.</param>
/// <param name="Mate">The external feature of a fit, else null.</param>
public sealed record FeatureRequest(Feature First, Feature? Mate)
{
    public IEnumerable<Feature> Features
    {
        get
        {
            yield return First;
            if (Mate is not null)
            {
                yield return Mate;
            }
        }
    }
}
