using BenchmarkDotNet.Attributes;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Text;

namespace ProcessPlan.Benchmarks;

/// <summary>One feature line, as easy, as usual and as bad as users write it.</summary>
[MemoryDiagnoser]
public class FeatureLineReading
{
    private MaterialNames _materials = MaterialNames.None;

    [GlobalSetup]
    public void ReadMaterials() => _materials = ShopFloor.NamesOf(HandbookShop.Materials());

    [Benchmark(Baseline = true)]
    public Parsed<FeatureRequest> Easy() => FeatureLine.Parse("25H7", _materials);

    [Benchmark]
    public Parsed<FeatureRequest> Fit() => FeatureLine.Parse("40 H7/k6", _materials);

    [Benchmark]
    public Parsed<FeatureRequest> Realistic() => FeatureLine.Parse("hole 25H7 x40 thru Ra0.8 C45 200off", _materials);

    /// <summary>A misspelt word and a class that does not exist.</summary>
    [Benchmark]
    public Parsed<FeatureRequest> Bad() => FeatureLine.Parse("hole 25 J9 x40 thruu", _materials);
}
