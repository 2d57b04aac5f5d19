namespace ProcessPlan.Core.Values;

/// <summary>The unit that a person typed or reads; inside, every length is exact and has none.</summary>
public enum LengthUnit
{
    Millimetre,
    Inch,
}
