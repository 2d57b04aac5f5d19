using BenchmarkDotNet.Attributes;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Benchmarks;

/// <summary>One tolerance class at one nominal size.</summary>
[MemoryDiagnoser]
public class ClassLookups
{
    private readonly Length _nominal = Length.FromMillimetres(25);
    private readonly ToleranceClass _h7 = Class("H7");
    private readonly ToleranceClass _k6 = Class("k6");
    private readonly ToleranceClass _p7 = Class("P7");
    private readonly ToleranceClass _j9 = Class("J9");

    [Benchmark(Baseline = true)]
    public ClassLookup CommonHole() => Iso286.Find(_nominal, _h7);

    [Benchmark]
    public ClassLookup Shaft() => Iso286.Find(_nominal, _k6);

    [Benchmark]
    public ClassLookup HoleWithDelta() => Iso286.Find(_nominal, _p7);

    [Benchmark]
    public ClassLookup NotInTheStandard() => Iso286.Find(_nominal, _j9);

    private static ToleranceClass Class(string text) =>
        ToleranceClass.TryRead(text, out ToleranceClass value, out _) ? value : throw new ArgumentException($"'{text}' is no class.", nameof(text));
}
