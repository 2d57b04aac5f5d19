using System.Diagnostics;
using System.Text;

namespace ProcessPlan.Tests;

/// <summary>The program as it is built, in a process of its own.</summary>
public class ExecutableTests
{
    [Fact]
    public async Task It_writes_UTF8_without_a_byte_order_mark()
    {
        using Process program = Executable.Start("limits", "25H7");
        using MemoryStream output = new();
        await program.StandardOutput.BaseStream.CopyToAsync(output);
        await program.WaitForExitAsync();

        program.ExitCode.Should().Be(0);
        output.ToArray().Should().StartWith("hole Ø25 H7, IT7"u8.ToArray());
    }

    [Fact]
    public async Task It_answers_a_stream_and_says_by_its_exit_code_that_a_line_was_bad()
    {
        using Process program = Executable.Start("limits", "-");
        await program.StandardInput.WriteAsync("25H7\nnonsense\n");
        program.StandardInput.Close();
        string output = await program.StandardOutput.ReadToEndAsync();
        await program.WaitForExitAsync();

        program.ExitCode.Should().Be(2);
        output.Split('\n').Select(line => line.Length > 0 ? line[..10] : "").Should().Equal("{\"line\":1,", "{\"line\":2,", "");
        (await program.StandardError.ReadToEndAsync()).Should().BeEmpty();
    }

    [Fact]
    public async Task It_ends_when_nobody_reads_any_more()
    {
        using Process program = Executable.Start("limits", "-");
        Task feeding = Task.Run(() =>
        {
            byte[] lines = Encoding.ASCII.GetBytes(string.Concat(Enumerable.Repeat("25H7\n", 1000)));
            while (true)
            {
                program.StandardInput.BaseStream.Write(lines);
            }
        });
        (await program.StandardOutput.ReadLineAsync()).Should().StartWith("{\"line\":1,");
        program.StandardOutput.Close();

        // An endless input ends only because the program stops reading it.
        await feeding.Invoking(async task => await task).Should().ThrowAsync<IOException>();
        await program.WaitForExitAsync();
        program.ExitCode.Should().Be(3);
        (await program.StandardError.ReadToEndAsync()).Should().BeEmpty();
    }

    [Fact]
    public async Task Two_answers_in_one_file_follow_each_other()
    {
        if (OperatingSystem.IsWindows())
        {
            return;
        }

        string file = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName());
        try
        {
            ProcessStartInfo shell = new("/bin/sh", ["-c", "(\"$0\" \"$1\" limits 25H7 --json; \"$0\" \"$1\" limits 40h6 --json) > \"$2\"", Executable.Dotnet, Executable.Program, file]);
            using Process program = Process.Start(shell)!;
            await program.WaitForExitAsync();

            (await File.ReadAllLinesAsync(file)).Select(line => line[..26]).Should().Equal("{\"features\":[{\"kind\":\"hole", "{\"features\":[{\"kind\":\"shaf");
        }
        finally
        {
            File.Delete(file);
        }
    }

    [Fact]
    public async Task It_answers_alike_where_the_machine_speaks_another_language()
    {
        using Process program = Executable.Start(["limits", "--json", "25,5H7"], ("LANG", "de_DE.UTF-8"), ("LC_ALL", "de_DE.UTF-8"));
        string output = await program.StandardOutput.ReadToEndAsync();
        await program.WaitForExitAsync();

        output.Should().Be(Answer.To("limits", "--json", "25.5H7").Output);
    }

    [Fact]
    public async Task Without_a_command_and_without_a_terminal_it_says_that_the_screen_needs_one()
    {
        using Process program = Executable.Start([], ("TERM", "dumb"));
        string error = await program.StandardError.ReadToEndAsync();
        await program.WaitForExitAsync();

        program.ExitCode.Should().Be(3);
        error.Should().Be("This terminal cannot show a screen (TERM is not set, or dumb); the commands work without one: see --help.\n");
    }
}
