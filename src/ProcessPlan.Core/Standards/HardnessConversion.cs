using ProcessPlan.Core.Values;
namespace ProcessPlan.Core.Standards;
public static class HardnessConversion { public static double? ToHrc(Hardness h) => h.Scale == HardnessScale.Hrc ? h.Value.ToDouble() : h.Scale == HardnessScale.Hv ? h.Value.ToDouble() / 12 : null; }
