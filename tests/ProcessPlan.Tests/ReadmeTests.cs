using System.Diagnostics;
using System.Text.RegularExpressions;

namespace ProcessPlan.Tests;

/// <summary>The README says what the program does: its commands are run, and what it shows under them must come out.</summary>
public partial class ReadmeTests
{
    private const string RunFromSource = "dotnet run --project src/ProcessPlan -c Release --";

    public static TheoryData<string, string?> Commands()
    {
        TheoryData<string, string?> commands = [];
        foreach (Match block in Block().Matches(File.ReadAllText(Path.Combine(Executable.Root, "README.md"))))
        {
            string command = block.Groups["command"].Value.Trim();
            if (!command.StartsWith("dotnet test ", StringComparison.Ordinal) && !command.StartsWith("alias ", StringComparison.Ordinal))
            {
                commands.Add(command, block.Groups["output"].Success ? block.Groups["output"].Value : null);
            }
        }

        return commands;
    }

    [Theory]
    [MemberData(nameof(Commands))]
    public async Task A_command_of_the_README_says_what_is_shown_under_it(string command, string? output)
    {
        if (OperatingSystem.IsWindows())
        {
            return;
        }

        // Both names of the program in the README are the one that is built already; what it tells on standard error is shown too.
        string script = $"processplan() {{ \"{Executable.Dotnet}\" \"{Executable.Program}\" \"$@\"; }}\n{command.Replace(RunFromSource, "processplan", StringComparison.Ordinal)}";
        using Process shell = Process.Start(new ProcessStartInfo("/bin/sh", ["-c", $"{{ {script}\n}} 2>&1"]) { RedirectStandardOutput = true, WorkingDirectory = Executable.Root })!;
        string said = await shell.StandardOutput.ReadToEndAsync();
        await shell.WaitForExitAsync();

        if (output is null)
        {
            shell.ExitCode.Should().Be(0, said);
        }
        else
        {
            said.Should().Be(output);
        }
    }

    [Fact]
    public void The_README_has_the_test_command_and_outputs_to_compare()
    {
        string text = File.ReadAllText(Path.Combine(Executable.Root, "README.md"));

        text.Should().Contain("\ndotnet test ProcessPlan.sln -c Release\n");
        Block().Matches(text).Count(block => block.Groups["output"].Success).Should().BeGreaterThan(3);
    }

    [GeneratedRegex(@"^```sh\n(?<command>.*?)^```\n(?:\n```text\n(?<output>.*?)^```\n)?", RegexOptions.Singleline | RegexOptions.Multiline)]
    private static partial Regex Block();
}
