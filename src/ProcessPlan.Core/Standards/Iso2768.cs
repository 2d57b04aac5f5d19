using ProcessPlan.Core.Values;
namespace ProcessPlan.Core.Standards;
public enum GeneralTolerance { Fine, Medium, Coarse, VeryCoarse }
public static class GeneralTolerances
{
    public static GeneralTolerance[] All { get; } = [GeneralTolerance.Fine, GeneralTolerance.Medium, GeneralTolerance.Coarse, GeneralTolerance.VeryCoarse];
    public static GeneralTolerance FromLetter(char c) => All["fmcv".IndexOf(c)];
    public static string Name(this GeneralTolerance g) => "ISO 2768-" + "fmcv"[(int)g];
}
public static class Iso2768
{
    public static Deviation? Linear(Length nominal, GeneralTolerance g) => nominal.Picometres > 0 ? Deviation.FromMicrometres(200 * ((int)g + 1)) : null;
}
public static class RoughnessPairs { public static bool TryFromRz(long pm, out Roughness r) => Roughness.TryFromRa(pm / 6, out r); }
