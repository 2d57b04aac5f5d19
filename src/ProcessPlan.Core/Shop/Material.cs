using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Shop;

/// <summary>A material as the shop buys it.</summary>
/// <param name="Designation">Its standard designation.</param>
/// <param name="Aliases">Other names that a line may use: number, old name, AISI.</param>
/// <param name="Group">Row of the cutting tables.</param>
/// <param name="Iso513">Group of ISO 513: P, M, K, N, S, H; O for plastics.</param>
/// <param name="HbFrom">Lower end of the usual Brinell hardness as delivered, or null.</param>
/// <param name="HbTo">Upper end, or null for plastics.</param>
/// <param name="Expansion">Linear expansion in 10^-6/K.</param>
/// <param name="KeepsSkin">Whether the damaged layer counts after the first cut; not for cast iron and non-ferrous metals.</param>
/// <param name="Condition">Condition and remarks, as the card prints them.</param>
/// <param name="Origin">Where the figures come from.</param>
public sealed record Material(
    string Designation,
    ValueList<string> Aliases,
    string Group,
    string Iso513,
    double? HbFrom,
    double? HbTo,
    double Expansion,
    bool KeepsSkin,
    string Condition,
    Citation Origin);
