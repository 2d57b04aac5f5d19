namespace ProcessPlan.Core.Values;

public readonly record struct Roughness(long RaPicometres)
{
    public static bool TryFromRa(long picometres, out Roughness r) { r = new(picometres); return picometres is >= 6_000 and <= 100_000_000; }
    public static bool TryFromClass(int n, out Roughness r) { long[] ra = [25, 50, 100, 200, 400, 800, 1600, 3200, 6300, 12500, 25000, 50000]; r = n is >= 1 and <= 12 ? new(ra[n - 1] * 1000) : default; return n is >= 1 and <= 12; }
    public double RaMicrometres => RaPicometres / 1e6;
    public override string ToString() => "Ra " + RaMicrometres.ToString(System.Globalization.CultureInfo.InvariantCulture);
}
