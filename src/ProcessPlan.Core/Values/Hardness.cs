using ProcessPlan.Core.Text;
namespace ProcessPlan.Core.Values;
public enum HardnessScale { Hrc, Hb, Hv }
public readonly record struct Hardness(ExactDecimal Value, HardnessScale Scale)
{
    public static bool TryCreate(ExactDecimal number, HardnessScale scale, out Hardness hardness) { hardness = new(number, scale); return number.Units > 0; }
    public static string RangeOf(HardnessScale scale) => scale.ToString();
}
