using System.CommandLine;
using System.CommandLine.Help;

namespace ProcessPlan;

/// <summary>Takes the words that the program was called with to the command that is meant.</summary>
internal static class CommandLine
{
    private const int HelpWidth = 80;

    private static readonly ParserConfiguration Reading = new()
    {
        // A feature is free text: no bundles of letters, no response files.
        EnablePosixBundling = false,
        ResponseFileTokenReplacer = null,
    };

    public static int Answer(this RootCommand root, string[] args, Streams streams)
    {
        ParseResult parsed = root.Parse(args, Reading);
        if (parsed.Errors.Count > 0)
        {
            throw new UsageException(Sentence(parsed));
        }

        if (parsed.Action is HelpAction help)
        {
            help.MaxWidth = HelpWidth;
        }

        using StreamWriter output = streams.OutputText();
        return parsed.Invoke(new InvocationConfiguration
        {
            Output = output,
            Error = streams.Error,
            EnableDefaultExceptionHandler = false,
            ProcessTerminationTimeout = null,
        });
    }

    private static string Sentence(ParseResult parsed) => parsed.UnmatchedTokens is [string first, ..]
        ? $"'{first}' is no command; expected {string.Join(", ", parsed.CommandResult.Command.Subcommands.Select(static command => command.Name))} or --help."
        : parsed.Errors[0].Message;
}
