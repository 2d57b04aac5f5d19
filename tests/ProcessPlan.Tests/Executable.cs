using System.Diagnostics;
using System.Text;

namespace ProcessPlan.Tests;

/// <summary>Starts the built program.</summary>
internal static class Executable
{
    private static readonly UTF8Encoding Utf8 = new(encoderShouldEmitUTF8Identifier: false);

    public static string Dotnet { get; } = Environment.GetEnvironmentVariable("DOTNET_HOST_PATH") ?? "dotnet";

    public static string Program { get; } = Path.Combine(AppContext.BaseDirectory, "processplan.dll");

    /// <summary>The top of the repository.</summary>
    public static string Root { get; } = FindRoot();

    public static Process Start(params string[] words) => Start(words, []);

    public static Process Start(string[] words, params ReadOnlySpan<(string Name, string Value)> environment)
    {
        ProcessStartInfo start = new(Dotnet, [Program, .. words])
        {
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardInputEncoding = Utf8,
            StandardOutputEncoding = Utf8,
            StandardErrorEncoding = Utf8,
        };
        foreach ((string name, string value) in environment)
        {
            start.Environment[name] = value;
        }

        return Process.Start(start) ?? throw new InvalidOperationException($"'{Dotnet}' did not start.");
    }

    private static string FindRoot()
    {
        for (DirectoryInfo? folder = new(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "ProcessPlan.sln")))
            {
                return folder.FullName;
            }
        }

        throw new DirectoryNotFoundException($"There is no ProcessPlan.sln above {AppContext.BaseDirectory}.");
    }
}
