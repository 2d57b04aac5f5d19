using System.Text;
using BenchmarkDotNet.Attributes;

namespace ProcessPlan.Benchmarks;

/// <summary><c>limits -</c> from bytes to bytes; the time is that of one line.</summary>
[MemoryDiagnoser]
public class StreamOfLimits
{
    private const int Lines = 100_000;

    private byte[] _input = [];

    [ParamsAllValues]
    public Mix Mix { get; set; }

    [GlobalSetup]
    public void WriteInput()
    {
        string pair = Mix switch
        {
            Mix.Usual => "hole 25H7 x40 thru Ra0.8 C45 200off\n40 H7/k6\n",
            Mix.HalfBad => "hole 25H7 x40 thru Ra0.8 C45 200off\n25 H7 thruu\n",
            _ => throw new InvalidOperationException($"There is no input for {Mix}."),
        };
        _input = Encoding.ASCII.GetBytes(string.Concat(Enumerable.Repeat(pair, Lines / 2)));
    }

    [Benchmark(OperationsPerInvoke = Lines)]
    public int Answer()
    {
        using MemoryStream input = new(_input);
        return ProcessPlan.Program.Run(["limits", "-"], new Streams(() => input, () => Stream.Null, () => TextWriter.Null, () => false));
    }
}

public enum Mix
{
    Usual,
    HalfBad,
}
