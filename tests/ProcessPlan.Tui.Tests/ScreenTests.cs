namespace ProcessPlan.Tui.Tests;

/// <summary>These change the process around them, so nothing else runs beside them.</summary>
[CollectionDefinition(nameof(Alone), DisableParallelization = true)]
public class Alone;

[Collection(nameof(Alone))]
public class ScreenTests
{
    private static (int Code, string Error) Run(string? term)
    {
        string? before = Environment.GetEnvironmentVariable("TERM");
        TextWriter console = Console.Error;
        using StringWriter error = new();
        try
        {
            Environment.SetEnvironmentVariable("TERM", term);
            Console.SetError(error);
            return (Screen.Run(static () => Terminal.Shop, new ScreenOptions()), error.ToString());
        }
        finally
        {
            Console.SetError(console);
            Environment.SetEnvironmentVariable("TERM", before);
        }
    }

    [Fact]
    public void Without_a_terminal_there_is_one_sentence_and_code_3() =>
        Run("xterm").Should().Be((3, "The screen needs a terminal, and there is none here; the commands work without one: see --help." + Environment.NewLine));

    [Theory]
    [InlineData(null)]
    [InlineData("")]
    [InlineData("dumb")]
    public void On_a_terminal_that_can_show_no_screen_there_is_one_sentence_and_code_3(string? term) =>
        Run(term).Should().Be((3, "This terminal cannot show a screen (TERM is not set, or dumb); the commands work without one: see --help." + Environment.NewLine));
}
