namespace ProcessPlan.Core.Standards;

/// <summary>The twenty-eight letters of ISO 286-1 for where a tolerance lies against the nominal size, in the standard's order.</summary>
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
