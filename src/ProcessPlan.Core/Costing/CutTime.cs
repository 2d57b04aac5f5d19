using System.Globalization;
using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Costing;

/// <summary>What a cut is computed from.</summary>
/// <param name="Process">The process.</param>
/// <param name="Data">Speeds and feeds of the material.</param>
/// <param name="Diameter">Diameter before the cut, or the tool's where the tool gives the size; width of a slot or tongue.</param>
/// <param name="Extent">Depth or length.</param>
/// <param name="Stock">Greatest stock on diameter or width; null in solid metal.</param>
/// <param name="Ra">Roughness that the cut must leave.</param>
/// <param name="Effort">Special effort cuts at two thirds of the speed of routine.</param>
public readonly record struct Cut(Process Process, CuttingData Data, Length Diameter, Length Extent, Stock? Stock, Roughness Ra, Effort Effort);

/// <summary>Cutting time of one operation on one piece, by the usual time formulas; the formula can be printed.</summary>
/// <param name="Minutes">Minutes under the tool, one piece.</param>
/// <param name="Speed">m/min; 0 where the formula has no speed.</param>
/// <param name="Feed">mm per revolution; mm/min stock rate for honing and lapping.</param>
/// <param name="Passes">Passes or strokes.</param>
/// <param name="Travel">mm travelled in a pass.</param>
public readonly record struct CutTime(double Minutes, double Speed, double Feed, int Passes, double Travel)
{
    /// <summary>Special effort takes this much longer under the tool.</summary>
    public const double SpecialEffort = 1.5;

    private const double Overrun = 2;
    private const double ReamerOverrun = 12;
    private const double CoreDrillFeed = 1.5;

    /// <summary>Reaming over drilling feed at half of the greatest stock; more stock takes a smaller feed, less a larger one.</summary>
    private const double ReamFeed = 2.5;

    // Depth of cut per side and pass, and feed, of rough and medium cuts: common practice, no source.
    private const double RoughTurningDepth = 2.5;
    private const double RoughBoringDepth = 1.5;
    private const double MediumDepth = 1.25;
    private const double RoughTurningFeed = 0.3;
    private const double RoughBoringFeed = 0.2;

    /// <summary>Real over ideal roughness at finishing speeds in ductile metal (Groover; from memory).</summary>
    private const double RealRoughness = 1.25;

    /// <summary>A bar overhangs and chatters: boring at this share of the turning speed (common practice, no source).</summary>
    private const double BoringSpeed = 0.6;

    /// <summary>Bores of this grade and finer get a spring pass (common practice, no source).</summary>
    private static readonly ToleranceGrade SpringPassTo = ToleranceGrade.It(8);

    private const double TurningNose = 0.8;
    private const double BoringNose = 0.4;

    private const double WorkSpeed = 20;
    private const int SparkOut = 4;

    /// <summary>Minutes a piece for the approach of the wheel and its share of dressing (common practice, no source).</summary>
    private const double ApproachAndDressing = 0.3;

    private const double HoneRate = 0.05;
    private const double LapRate = 0.005;
    private const double WireRate = 60;

    public static CutTime For(in Cut cut)
    {
        CutTime time = cut.Process.Ability switch
        {
            "drill" => Drilling(cut),
            "ream" => Reaming(cut),
            "turn" or "diamond" => Turning(cut, RoughTurningDepth, RoughTurningFeed, TurningNose),
            "bore" or "fine-bore" => Turning(cut, RoughBoringDepth, RoughBoringFeed, BoringNose),
            "mill" => Milling(cut),
            "grind-round" or "centreless" => Grinding(cut, wheelWidth: 40),
            "grind-hole" => Grinding(cut, wheelWidth: 20),
            "grind-flat" => Grinding(cut, wheelWidth: 30),
            "hone" => ByRate(cut, HoneRate),
            "lap" or "superfinish" => ByRate(cut, LapRate),
            "broach" => new CutTime(0.25, 6, 0, 1, cut.Extent.ToMillimetres()),
            "wire" => new CutTime(cut.Extent.ToMillimetres() * Math.PI * cut.Diameter.ToMillimetres() / WireRate, 0, WireRate, 1, cut.Extent.ToMillimetres()),
            string other => throw new ArgumentException($"There is no time formula for '{other}'.", nameof(cut)),
        };
        return cut.Effort == Effort.Special ? time with { Minutes = time.Minutes * SpecialEffort } : time;
    }

    /// <summary>The formula with its figures, for the question why.</summary>
    public string Explain(in Cut cut)
    {
        string special = cut.Effort == Effort.Special ? $" · {Text(SpecialEffort)} (special effort)" : "";
        string minutes = Text(Minutes);
        return cut.Process.Ability switch
        {
            "hone" or "lap" or "superfinish" => $"stock {cut.Stock} / {Text(Feed)} mm/min{special} = {minutes} min",
            "broach" => $"one stroke with its return{special} = {minutes} min",
            "wire" => $"cut area / {Text(Feed)} mm²/min{special} = {minutes} min",
            "grind-round" or "centreless" or "grind-hole" or "grind-flat" =>
                $"({Passes} strokes of {Text(Travel)} mm / (feed {Text(Feed)} mm · π·D·n by {Text(Speed)} m/min) + {Text(ApproachAndDressing)} approach and dressing){special} = {minutes} min",
            _ => $"travel {Text(Travel)} mm · {Passes} / (feed {Text(Feed)} mm · π·D·n by {Text(Speed)} m/min){special} = {minutes} min",
        };
    }

    private static string Text(double value) => value.ToString(value < 10 ? "0.###" : "0.#", CultureInfo.InvariantCulture);

    private static CutTime Revolving(double diameter, double speed, double feed, int passes, double travel)
    {
        // A tool of 1 mm cannot be turned at any speed that the table prints: small machines end near 6000 revolutions a minute.
        const double FastestSpindle = 6000;
        double revolutions = Math.Min(1000 * speed / (Math.PI * diameter), FastestSpindle);
        return new CutTime(travel * passes / (feed * revolutions), Math.PI * diameter * revolutions / 1000, feed, passes, travel);
    }

    private static CutTime Drilling(in Cut cut)
    {
        double d = cut.Diameter.ToMillimetres();
        bool core = cut.Process.SizedBy == Shop.ToolUse.CoreDrill;
        double feed = CuttingData.DrillFeed(cut.Diameter) * cut.Data.FeedFactor * (core ? CoreDrillFeed : 1);
        double approach = core ? Overrun : 0.3 * d;
        return Revolving(d, cut.Data.Drill, feed, 1, cut.Extent.ToMillimetres() + approach + Overrun);
    }

    private static CutTime Reaming(in Cut cut)
    {
        double stock = cut.Stock is { } removed ? removed.Picometres / (double)cut.Process.MostStockAt(cut.Diameter).Picometres : 1;
        double feed = CuttingData.DrillFeed(cut.Diameter) * cut.Data.FeedFactor * ReamFeed / (0.75 + 0.5 * stock);
        return Revolving(cut.Diameter.ToMillimetres(), cut.Data.Ream, feed, 1, cut.Extent.ToMillimetres() + ReamerOverrun);
    }

    private static CutTime Turning(in Cut cut, double roughDepth, double roughFeed, double nose)
    {
        double perSide = (cut.Stock?.ToMillimetres() ?? 0) / 2;
        bool rough = cut.Process.StartsRough;
        double feedForRa = Math.Sqrt(32 * cut.Ra.ToMicrometres() / RealRoughness * nose / 1000);
        double feed = Math.Min(feedForRa, roughFeed);
        bool boring = nose == BoringNose;
        int passes = Math.Max(1, (int)Math.Ceiling(perSide / (rough ? roughDepth : MediumDepth) - 1e-9)) + (boring && cut.Process.RoutineGrade <= SpringPassTo ? 1 : 0);
        double speed = (rough ? cut.Data.TurnRough : cut.Data.TurnFinish) * (boring ? BoringSpeed : 1);
        return Revolving(cut.Diameter.ToMillimetres(), speed, feed, passes, cut.Extent.ToMillimetres() + 2 * Overrun);
    }

    private static CutTime Milling(in Cut cut)
    {
        const double ToothFeed = 0.06;
        const int Teeth = 3;
        double width = cut.Diameter.ToMillimetres();
        double tool = Math.Clamp(width * 0.8, 2, 32);
        int passes = cut.Process.StartsRough ? Math.Max(1, (int)Math.Ceiling(width / 2 / tool)) : 2;
        return Revolving(tool, cut.Data.Mill, ToothFeed * Teeth, passes, cut.Extent.ToMillimetres() + tool);
    }

    private static CutTime Grinding(in Cut cut, double wheelWidth)
    {
        bool rough = cut.Process.RoutineGrade >= ToleranceGrade.It(8);
        double share = rough ? 0.6 : 0.33;
        double infeed = (rough ? 0.01 : 0.004) * (cut.Process.Ability == "grind-hole" ? 0.5 : 1);
        double perSide = (cut.Stock?.ToMillimetres() ?? 0) / 2;
        // One infeed a double stroke.
        int strokes = 2 * ((int)Math.Ceiling(perSide / infeed - 1e-9) + (rough ? SparkOut / 2 : SparkOut));
        CutTime strokesOnly = Revolving(cut.Diameter.ToMillimetres(), WorkSpeed, share * wheelWidth, Math.Max(1, strokes), cut.Extent.ToMillimetres() + wheelWidth / 3);
        return strokesOnly with { Minutes = strokesOnly.Minutes + ApproachAndDressing };
    }

    private static CutTime ByRate(in Cut cut, double rate)
    {
        double stock = cut.Stock?.ToMillimetres() ?? 0;
        return new CutTime(stock / rate, 0, rate, 1, cut.Extent.ToMillimetres());
    }
}
