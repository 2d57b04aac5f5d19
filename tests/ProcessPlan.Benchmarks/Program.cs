using System.Globalization;
using System.Runtime.CompilerServices;
using BenchmarkDotNet.Reports;
using BenchmarkDotNet.Running;

namespace ProcessPlan.Benchmarks;

/// <summary>
/// Runs what is asked for (<c>--filter '*'</c> for all, <c>--job short</c> for a quick look) and keeps each report under results, by processor.
/// </summary>
internal static class Program
{
    public static void Main(string[] args)
    {
        CultureInfo.DefaultThreadCurrentCulture = CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;
        foreach (Summary summary in BenchmarkSwitcher.FromAssembly(typeof(Program).Assembly).Run(args))
        {
            Keep(summary);
        }
    }

    private static void Keep(Summary summary)
    {
        string folder = Path.Combine(SourceFolder(), "results", summary.HostEnvironmentInfo.Cpu.Value?.ProcessorName?.Trim().Replace(' ', '-') ?? "unknown");
        Directory.CreateDirectory(folder);
        foreach (string report in Directory.EnumerateFiles(summary.ResultsDirectoryPath, "*-report-github.md"))
        {
            string situation = Path.GetFileName(report).Replace("-report-github", "", StringComparison.Ordinal).Replace("ProcessPlan.Benchmarks.", "", StringComparison.Ordinal);
            File.Copy(report, Path.Combine(folder, situation), overwrite: true);
        }
    }

    private static string SourceFolder([CallerFilePath] string file = "") => Path.GetDirectoryName(file)!;
}
