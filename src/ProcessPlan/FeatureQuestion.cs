using System.Buffers;
using System.CommandLine;
using System.Text.Json;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;
using ProcessPlan.Documents;

namespace ProcessPlan;

/// <summary>The face of every command that is asked about a feature: the line, or - for many, and how the answer is written.</summary>
internal sealed class FeatureQuestion
{
    private const string StandardInput = "-";

    public Argument<string[]> Feature { get; } = new("feature")
    {
        Description = "The feature as it is spoken, such as 25H7 or \"hole 60 +0.030/0 x 50\"; - reads one a line from standard input",
        Arity = ArgumentArity.ZeroOrMore,
    };

    private Flag Json { get; } = new("--json", "Answer as one JSON document; - always answers as JSON, one document a line");

    private UnitChoice Unit { get; } = new("the one that was typed");

    private Flag Ascii { get; } = PlainLettersFlag();

    public static Flag PlainLettersFlag() => new("--ascii", "Plain characters only: um, dia, +/-");

    /// <summary>Adds the line and the choices to a command.</summary>
    public void AddTo(Command command)
    {
        command.Arguments.Add(Feature);
        command.Options.Add(Json.Option);
        command.Options.Add(Unit.Option);
        command.Options.Add(Ascii.Option);
    }

    /// <summary>What the command line asks, options and all.</summary>
    public FeatureAsked In(ParseResult parsed)
    {
        string[] words = parsed.GetValue(Feature) ?? [];
        RefuseMisuse(parsed.CommandResult.Command, words);
        return new FeatureAsked(words, Json.In(parsed), Unit.In(parsed), Ascii.In(parsed));
    }

    /// <summary>Reads the line or lines and has them answered; each answer says the exit code that it means.</summary>
    public static int Answer(
        FeatureAsked asked,
        Streams streams,
        Func<MaterialNames> materials,
        Func<Utf8JsonWriter, FeatureRequest, int> writeJson,
        Func<TextWriter, FeatureRequest, LengthUnit?, int> writeText)
    {
        if (asked.Words is [StandardInput])
        {
            return new FeatureStream(materials(), writeJson).Answer(streams);
        }

        string line = string.Join(' ', asked.Words);
        Parsed<FeatureRequest> read = FeatureLine.Parse(line, materials());
        return asked.Json
            ? AnswerAsJson(streams.Output, read, writeJson)
            : AnswerAsText(streams, line, read, asked.Unit, asked.Ascii, writeText);
    }

    private static void RefuseMisuse(Command command, string[] words)
    {
        if (words.Length == 0)
        {
            throw new UsageException($"{command.Name} found no feature; expected one such as 25H7, or - for standard input.");
        }

        // What is no option becomes part of the line: "+0.03 -0" must, "--jsn" must not.
        if (Array.Find(words, static word => word.StartsWith("--", StringComparison.Ordinal)) is { } unknown)
        {
            string options = string.Join(", ", command.Options.Select(static option => option.Name));
            throw new UsageException($"'{unknown}' is no option of {command.Name}; expected {options}.");
        }
    }

    private static int AnswerAsJson(Stream output, Parsed<FeatureRequest> read, Func<Utf8JsonWriter, FeatureRequest, int> write)
    {
        ArrayBufferWriter<byte> document = new();
        int exit = ExitCode.NotUnderstood;
        using (Utf8JsonWriter json = JsonText.Writer(document))
        {
            json.WriteStartObject();
            if (read.IsRead)
            {
                exit = write(json, read.Value);
            }
            else
            {
                ProblemJson.Write(json, read.Problems);
            }

            json.WriteEndObject();
        }

        document.Write("\n"u8);
        output.Write(document.WrittenSpan);
        return exit;
    }

    private static int AnswerAsText(
        Streams streams, string line, Parsed<FeatureRequest> read, LengthUnit? unit, bool ascii, Func<TextWriter, FeatureRequest, LengthUnit?, int> write)
    {
        if (!read.IsRead)
        {
            ProblemText.Write(Letters(streams.Error, ascii), line, read.Problems);
            return ExitCode.NotUnderstood;
        }

        using StreamWriter output = streams.OutputText();
        return write(Letters(output, ascii), read.Value, unit);
    }

    private static TextWriter Letters(TextWriter target, bool ascii) => ascii ? new PlainLetters(target) : target;
}

/// <summary>One question about features.</summary>
/// <param name="Words">The words of the line, or - for standard input.</param>
/// <param name="Json">Answer as JSON.</param>
/// <param name="Unit">The unit that comes first; null for the one that was typed.</param>
/// <param name="Ascii">Plain characters only.</param>
internal sealed record FeatureAsked(string[] Words, bool Json = false, LengthUnit? Unit = null, bool Ascii = false);
