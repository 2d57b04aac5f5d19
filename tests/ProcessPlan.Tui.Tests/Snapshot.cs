using System.Runtime.CompilerServices;

namespace ProcessPlan.Tui.Tests;

/// <summary>
/// Screens kept as files. With SNAPSHOTS=write in the environment they are written anew, to be looked at and committed; such a run does not pass.
/// </summary>
internal static class Snapshot
{
    public static void Matches(string screen, string name, [CallerFilePath] string caller = "")
    {
        string file = Path.Combine(Path.GetDirectoryName(caller)!, "Snapshots", name + ".txt");
        if (Environment.GetEnvironmentVariable("SNAPSHOTS") == "write")
        {
            File.WriteAllText(file, screen + "\n");
            Assert.Fail($"Written, not compared: {name}");
        }

        screen.Should().Be(File.ReadAllText(file).ReplaceLineEndings("\n").TrimEnd('\n'), $"the screen is to look like {name}.txt");
    }
}
