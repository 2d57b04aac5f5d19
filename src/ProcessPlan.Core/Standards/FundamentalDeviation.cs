namespace ProcessPlan.Core.Standards;

/// <summary>The twenty-eight identifiers of ISO 286-1 for the place of a tolerance against the nominal size, in the order of the standard.</summary>
public enum FundamentalDeviation
{
    A,
    B,
    C,
    CD,
    D,
    E,
    EF,
    F,
    FG,
    G,
    H,
    JS,
    J,
    K,
    M,
    N,
    P,
    R,
    S,
    T,
    U,
    V,
    X,
    Y,
    Z,
    ZA,
    ZB,
    ZC,
}
