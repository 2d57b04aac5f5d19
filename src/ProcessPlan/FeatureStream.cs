using System.Buffers;
using System.Text.Json;
using System.Text.Unicode;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Text;
using ProcessPlan.Documents;

namespace ProcessPlan;

/// <summary>
/// Answers feature lines from standard input with one JSON document a line, in order. Memory does not grow with the number of lines nor with
/// their length, and an answer is written as soon as nothing more waits to be read.
/// </summary>
internal sealed class FeatureStream(MaterialNames materials, Func<Utf8JsonWriter, FeatureRequest, int> answer)
{
    private const int FlushAt = 1 << 16;

    private static readonly JsonEncodedText Line = JsonEncodedText.Encode("line");

    private readonly char[] _characters = new char[LineSource.MostBytes];
    private int _exit = ExitCode.Done;

    public int Answer(Streams streams)
    {
        ArrayBufferWriter<byte> answers = new(FlushAt + FlushAt / 2);
        using Utf8JsonWriter json = JsonText.Writer(answers);
        using LineSource lines = new(streams.Input);
        long passedOver = 0;
        while (true)
        {
            if (!lines.HasBufferedLine || answers.WrittenCount >= FlushAt)
            {
                streams.Output.Write(answers.WrittenSpan);
                streams.Output.Flush();
                answers.ResetWrittenCount();
            }

            if (!lines.TryRead(out ReadOnlySpan<byte> line))
            {
                break;
            }

            if (IsPassedOver(line))
            {
                passedOver++;
                continue;
            }

            json.Reset(answers);
            json.WriteStartObject();
            json.WriteNumber(Line, lines.Number);
            AnswerLine(json, line, lines.IsTooLong);
            json.WriteEndObject();
            json.Flush();
            answers.Write("\n"u8);
        }

        if (passedOver > 0 && streams.IsErrorTerminal)
        {
            streams.Error.WriteLine($"processplan: {passedOver} of {lines.Number} lines passed over: empty, or a remark.");
        }

        return _exit;
    }

    private static bool IsPassedOver(ReadOnlySpan<byte> line)
    {
        ReadOnlySpan<byte> text = line.TrimStart(" \t"u8);
        return text.IsEmpty || text[0] == (byte)'#';
    }

    private void AnswerLine(Utf8JsonWriter json, ReadOnlySpan<byte> line, bool isTooLong)
    {
        Parsed<FeatureRequest> read = isTooLong ? TooLong() : Read(line);
        if (read.IsRead)
        {
            _exit = Math.Max(_exit, answer(json, read.Value));
        }
        else
        {
            _exit = ExitCode.NotUnderstood;
            ProblemJson.Write(json, read.Problems);
        }
    }

    private Parsed<FeatureRequest> Read(ReadOnlySpan<byte> line)
    {
        return Utf8.ToUtf16(line, _characters, out int read, out int written, replaceInvalidSequences: false) == OperationStatus.Done
            ? FeatureLine.Parse(_characters.AsSpan(0, written), materials)
            : Parsed<FeatureRequest>.Failed([new Problem($"The byte {line[read]:X2} (hexadecimal) is not UTF-8.", written, 1, "text in UTF-8")]);
    }

    private static Parsed<FeatureRequest> TooLong() => Parsed<FeatureRequest>.Failed([new Problem(
        $"The line has more than {LineSource.MostBytes} bytes.", FeatureLine.MostCharacters, 1, $"at most {FeatureLine.MostCharacters} characters")]);
}
