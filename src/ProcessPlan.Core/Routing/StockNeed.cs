using System.Globalization;
using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>
/// The least stock of an operation by the analytical method (Kovan): twice the roughness and damaged layer that the operation before leaves, and the
/// root of its spatial error and the setting error of this one; beside it the handbook's figure. All on diameter or width, in micrometres.
/// </summary>
internal readonly record struct StockNeed
{
    /// <summary>Up to this lot the handbook's larger stock is kept, above it the analytical minimum.</summary>
    public const int SmallLot = 50;

    private const double SameClampingShare = 0.06;
    private const double TurretIndex = 50;

    /// <summary>Setting error on a magnetic table (up to 10 in Kosilova and Meshcheryakov; from memory).</summary>
    private const double MagneticTable = 10;

    /// <summary>The handbook leaves so much more for grinding hardened metal.</summary>
    private const long GrindingAfterHeat = 100;
    private const double BarBendPerMm = 1.0;
    private const double CentresFromRatio = 4;
    private const double HeatBendPerMm = 0.5;

    private static readonly PublishedTable ChuckTable = PublishedTable.Load("chuck-error.txt");
    private static readonly SizeRanges<(double Hot, double Pre, double Finish)> Chuck = new(ChuckTable, static row =>
        (row.Double("hotRolled"), row.Double("preMachined"), row.Double("finishMachined")));

    private static readonly PublishedTable AxisTable = PublishedTable.Load("drill-axis.txt");
    private static readonly SizeRanges<(double Shift, double RunOut)> DrillAxis = new(AxisTable, static row => (row.Double("shift"), row.Double("runout")));

    private static readonly PublishedTable StockTable = PublishedTable.Load("stock-table.txt");
    private static readonly Dictionary<(string Process, string After), SizeRanges<(Length Stock, Citation Origin)>> Handbook =
        StockTable.Rows.GroupBy(static row => (row["process"].Replace('_', ' '), row["after"].Replace('_', ' '))).ToDictionary(
            static group => group.Key,
            static group => new SizeRanges<(Length, Citation)>(StockTable, group, row =>
                (Length.FromMillimetres(row.Decimal("stock")), StockTable.Cite($"{group.Key.Item1}, over {row["over"]} to {row["upto"]} mm"))));

    private double Rz { get; init; }

    private double Layer { get; init; }

    private double Error { get; init; }

    private double Setting { get; init; }

    private bool Flat { get; init; }

    private SurfaceState Surface { get; init; }

    /// <summary>The analytical minimum, rounded up to the micrometre.</summary>
    public Stock Analytical { get; private init; }

    /// <summary>The handbook's basic stock, or null where it gives none.</summary>
    public Stock? Table { get; private init; }

    private Citation? TableOrigin { get; init; }

    /// <summary>Least stock that the handbook's figure comes to, once the tolerance of the operation before is taken off.</summary>
    private Stock? TableLeast { get; init; }

    private bool ByHandbook { get; init; }

    /// <summary>The least stock that is planned with.</summary>
    public Stock Least
    {
        get
        {
            Stock computed = ByHandbook && TableLeast is { } table && table > Analytical ? table : Analytical;
            return computed > Rubbing ? computed : Rubbing;
        }
    }

    /// <summary>Below this the tool rubs instead of cutting.</summary>
    private Stock Rubbing { get; init; }

    /// <summary>What <paramref name="process"/> must at least remove after <paramref name="before"/>.</summary>
    /// <param name="process">The operation.</param>
    /// <param name="before">The operation or blank before, as the surface table calls it.</param>
    /// <param name="job">The job.</param>
    /// <param name="size">Size at the joint.</param>
    /// <param name="toleranceBefore">Tolerance that the operation before leaves.</param>
    /// <param name="sameClamping">Both on one machine, without taking the part off.</param>
    /// <param name="afterHeat">A heat treatment lies between: what it does to a part cannot be computed finely, so the handbook's figure holds for any lot.</param>
    /// <param name="byHandbook">The handbook's stock is kept where it is larger.</param>
    public static StockNeed Between(Process process, string before, Job job, Length size, Deviation toleranceBefore, bool sameClamping, bool afterHeat, bool byHandbook)
    {
        SurfaceState state = SurfaceState.After(before, size);
        bool blank = before is "bar" or "casting";
        bool keepLayer = !afterHeat && (blank || job.Material.KeepsSkin);
        double blankError = BlankError(job, size);
        double error = process.SelfGuided ? 0 : state.ErrorShare * blankError;
        if (afterHeat && !process.SelfGuided)
        {
            error = Math.Sqrt(error * error + HeatError(job) * HeatError(job));
        }

        double setting = process.SelfGuided || process.Ability == "drill" ? 0 : SettingError(process, job, size, sameClamping, blank);
        double layer = keepLayer ? state.LayerMicrometres : 0;
        bool flat = !job.Feature.IsRound;
        (Stock? table, Citation? origin) = HandbookStock(process.Name, before, job.Nominal);
        bool grinds = process.Ability.StartsWith("grind", StringComparison.Ordinal);
        table = afterHeat && grinds ? table + Stock.FromMicrometres(GrindingAfterHeat) : table;
        return new StockNeed
        {
            Rz = state.RzMicrometres,
            Layer = layer,
            Error = error,
            Setting = setting,
            Flat = flat,
            Surface = state,
            Analytical = Twice(state.RzMicrometres, layer, error, setting, flat).RoundUp(new Length(Length.PicometresPerMicrometre)),
            Table = table,
            TableOrigin = origin,
            TableLeast = table is { } basic && basic.Picometres > toleranceBefore.Picometres ? new Stock(basic.Picometres - toleranceBefore.Picometres) : null,
            ByHandbook = byHandbook || afterHeat,
            Rubbing = process.LeastStock,
        };
    }

    /// <summary>2·(Rz + h + √(ρ² + ε²)) on a round feature; on a flat one the errors lie in one line, 2·(Rz + h + ρ + ε).</summary>
    internal static Estimate Twice(double rz, double layer, double error, double setting, bool flat) =>
        new(2 * (rz + layer + (flat ? error + setting : Math.Sqrt(error * error + setting * setting))));

    /// <summary>The sum with its figures and where they come from.</summary>
    public IEnumerable<string> Explain()
    {
        string spatial = Error == 0 && Setting == 0 ? ""
            : Flat ? $" + ρ {Text(Error)} + ε {Text(Setting)}"
            : $" + √(ρ {Text(Error)}² + ε {Text(Setting)}²)";
        yield return $"least stock, analytical: 2·(Rz {Text(Rz)} + h {Text(Layer)}{spatial}) = {Analytical.Picometres / Length.PicometresPerMicrometre} µm [{Surface.Origin}]";
        if (Table is { } table)
        {
            string used = TableLeast is not { } least || Least != least ? "not used" : $"{least} once the tolerance before it is taken off, used for lots up to {SmallLot}, after heat treatment, and where it is cheaper";
            yield return $"handbook stock {table}, {used} [{TableOrigin}]";
        }

        if (Least == Rubbing)
        {
            yield return $"never less than {Rubbing}: below that the tool rubs";
        }
    }

    private static string Text(double value) => value.ToString("0.#", CultureInfo.InvariantCulture);

    private static (Stock? Stock, Citation? Origin) HandbookStock(string process, string before, Length size)
    {
        foreach (string after in (ReadOnlySpan<string>)[before, "*"])
        {
            if (Handbook.TryGetValue((process, after), out SizeRanges<(Length Stock, Citation Origin)>? ranges)
                && ranges.TryFind(size, out (Length Stock, Citation Origin) row))
            {
                return (new Stock(row.Stock.Picometres), row.Origin);
            }
        }

        return (null, null);
    }

    /// <summary>Spatial error of the blank: the drilled axis of a hole, the bend and centring of a bar, both in micrometres.</summary>
    private static double BlankError(Job job, Length size)
    {
        double length = job.Extent.ToMillimetres();
        if (job.Kind == FeatureKind.Hole)
        {
            return DrillAxis.TryFind(size, out (double Shift, double RunOut) axis)
                ? Math.Sqrt(axis.Shift * axis.Shift + axis.RunOut * length * axis.RunOut * length)
                : 0;
        }

        double bend = BarBendPerMm * (IsOnCentres(job) ? length / 2 : length);
        // Centring error 0.25·√(T² + 1) mm, T the tolerance of the bar: taken for 2 mm.
        double centring = IsOnCentres(job) ? 250 * Math.Sqrt(2 * 2 + 1) : 0;
        return Math.Sqrt(bend * bend + centring * centring);
    }

    private static double HeatError(Job job) => HeatBendPerMm * job.Extent.ToMillimetres();

    private static bool IsOnCentres(Job job) => job.Kind == FeatureKind.Shaft && job.LengthRatio > CentresFromRatio;

    private static double SettingError(Process process, Job job, Length size, bool sameClamping, bool blank)
    {
        // Cylindrical grinding runs on dead centres whatever the length: no radial error.
        if (IsOnCentres(job) || process.Ability == "grind-round")
        {
            return 0;
        }

        if (process.Ability == "grind-flat")
        {
            return MagneticTable;
        }

        (double Hot, double Pre, double Finish) row = Chuck.TryFind(size, out (double Hot, double Pre, double Finish) found) ? found : (600, 140, 70);
        double fresh = blank ? row.Hot : process.RoutineGrade <= ToleranceGrade.It(8) ? row.Finish : row.Pre;
        return sameClamping ? SameClampingShare * row.Pre + (process.Ability == "grind-hole" ? 0 : TurretIndex) : fresh;
    }
}
