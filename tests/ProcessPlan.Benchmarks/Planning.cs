using BenchmarkDotNet.Attributes;
using ProcessPlan.Core;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;

namespace ProcessPlan.Benchmarks;

/// <summary>One plan with the cheapest route, by situation.</summary>
[MemoryDiagnoser]
public class Planning
{
    private readonly ShopFloor _shop = HandbookShop.Load();

    private Feature _easy = null!;
    private Feature _realistic = null!;
    private Feature _hardened = null!;
    private Feature _impossible = null!;
    private Feature _adversarial = null!;

    [GlobalSetup]
    public void ReadLines()
    {
        _easy = Read("hole 8H12 x20 C45 100off");
        _realistic = Read("hole 25H7 x40 thru Ra0.8 C45 200off");
        _hardened = Read("shaft 35 k6 x28 Ra0.8 C45 hardened 58HRC 40off");
        _impossible = Read("hole 25H1 x20 C45 1off");
        _adversarial = Read("hole 180H8 x60 C45 400off");
    }

    [Benchmark(Baseline = true)]
    public Plan Easy() => Planner.Plan(_easy, _shop);

    [Benchmark]
    public Plan Realistic() => Planner.Plan(_realistic, _shop);

    [Benchmark]
    public Plan Hardened() => Planner.Plan(_hardened, _shop);

    [Benchmark]
    public Plan Impossible() => Planner.Plan(_impossible, _shop);

    [Benchmark]
    public Plan Adversarial() => Planner.Plan(_adversarial, _shop);

    private Feature Read(string line) => FeatureLine.Parse(line, _shop.Names).Value!.First;
}
