using System.Text;
using System.Text.Json;
using CsCheck;

namespace ProcessPlan.Tests;

public class LimitsStreamTests
{
    [Fact]
    public void Every_line_is_answered_in_order_under_the_number_it_has_in_the_file()
    {
        Answer answer = Answer.ToInput("# housing 7\n\n25H7\n   \n  # shafts\n40 H7/k6\n", "limits", "-");

        answer.Exit.Should().Be(0);
        answer.Error.Should().BeEmpty();
        Lines(answer).Select(line => line.GetProperty("line").GetInt32()).Should().Equal(3, 6);
        Lines(answer)[1].GetProperty("fit").GetProperty("character").GetString().Should().Be("transition");
    }

    [Fact]
    public void Json_may_be_said_but_need_not()
    {
        Answer.ToInput("25H7\n", "limits", "-", "--json").Should().Be(Answer.ToInput("25H7\n", "limits", "-"));
    }

    [Fact]
    public void A_line_answers_as_it_would_alone()
    {
        Requests.Any.Sample(line =>
        {
            string alone = Answer.To("limits", "--json", line).Output;
            Answer.ToInput(line + "\n", "limits", "-").Output.Should().Be("{\"line\":1," + alone[1..]);
        });
    }

    [Fact]
    public void A_bad_line_is_told_and_the_rest_goes_on()
    {
        Answer answer = Answer.ToInput("25H7\n25 H7 thruu\n40h6\n", "limits", "-");

        answer.Exit.Should().Be(2);
        answer.Error.Should().BeEmpty();
        JsonElement[] lines = Lines(answer);
        lines.Should().HaveCount(3);
        JsonElement problem = lines[1].GetProperty("problems")[0];
        problem.GetProperty("at").GetInt32().Should().Be(6);
        problem.GetProperty("length").GetInt32().Should().Be(5);
        lines[2].GetProperty("features")[0].GetProperty("kind").GetString().Should().Be("shaft");
    }

    [Theory]
    [InlineData("25H7\r\n40h6\r\n")]
    [InlineData("25H7\n40h6")]
    [InlineData("\uFEFF25H7\n40h6\n")]
    public void Files_of_every_editor_are_read_alike(string text)
    {
        Answer.ToInput(text, "limits", "-").Should().Be(Answer.ToInput("25H7\n40h6\n", "limits", "-"));
    }

    [Fact]
    public void No_input_is_no_answer()
    {
        Answer.ToInput("", "limits", "-").Should().Be(new Answer(0, "", ""));
    }

    [Fact]
    public void Bytes_that_are_not_UTF8_are_a_problem_of_their_line_only()
    {
        using MemoryStream input = new([.. "Ø25H7\n"u8, .. "Ø"u8, 0xD8, .. "25H7\n"u8, .. "25H7\n"u8]);
        Answer answer = Answer.ToStream(input, "limits", "-");

        answer.Exit.Should().Be(2);
        Lines(answer).Should().HaveCount(3);
        Lines(answer)[1].GetRawText().Should().Be(
            """{"line":2,"problems":[{"message":"The byte D8 (hexadecimal) is not UTF-8.","at":1,"length":1,"expected":"text in UTF-8"}]}""");
    }

    [Fact]
    public void A_line_without_end_is_a_problem_and_the_next_one_is_read()
    {
        Answer answer = Answer.ToInput(new string('x', 300_000) + "\n25H7\n" + new string('1', 70_000), "limits", "-");

        answer.Exit.Should().Be(2);
        Lines(answer)[0].GetRawText().Should().Be(
            """{"line":1,"problems":[{"message":"The line has more than 65536 bytes.","at":1000,"length":1,"expected":"at most 1000 characters"}]}""");
        Lines(answer)[1].GetProperty("line").GetInt32().Should().Be(2);
        Lines(answer)[2].GetProperty("problems").GetArrayLength().Should().Be(1);
    }

    [Fact]
    public void However_the_bytes_arrive_the_answers_are_the_same()
    {
        string text = string.Concat(Enumerable.Range(1, 400).Select(i => $"hole {i}H7 x40 thru Ø±\n\n# {i}\r\n{new string('a', i * 5)}\n"));
        Answer whole = Answer.ToInput(text, "limits", "-");

        Gen.Int[1, 5000].Sample(
            most =>
            {
                using Slow input = new(Encoding.UTF8.GetBytes(text), most);
                Answer.ToStream(input, "limits", "-").Should().Be(whole);
            },
            iter: 20);
    }

    [Fact]
    public void An_answer_is_written_before_the_next_line_is_waited_for()
    {
        using MemoryStream output = new();
        List<long> written = [];
        using Slow input = new("25H7\n40h6\n30g6\n"u8.ToArray(), 5, () => written.Add(output.Length));

        Program.Run(["limits", "-"], new Streams(() => input, () => output, () => TextWriter.Null, () => false)).Should().Be(0);

        written.Should().HaveCount(4).And.BeInAscendingOrder().And.OnlyHaveUniqueItems();
    }

    [Fact]
    public void Lines_passed_over_are_counted_for_a_person_at_a_terminal()
    {
        using MemoryStream input = new("# a\n\n25H7\n"u8.ToArray());
        using MemoryStream output = new();
        using StringWriter error = new();

        Program.Run(["limits", "-"], new Streams(() => input, () => output, () => error, () => true)).Should().Be(0);

        error.ToString().TrimEnd().Should().Be("processplan: 2 of 3 lines passed over: empty, or a remark.");
    }

    [Fact]
    public void Reading_keeps_nothing_of_the_lines_that_it_has_read()
    {
        using Slow input = new(Encoding.ASCII.GetBytes(string.Concat(Enumerable.Repeat("hole 25H7 x40 thru Ra0.8 C45 200off\n", 200_000)) + new string('x', 9_000_000)), 50_000);
        using LineSource lines = new(input);
        lines.TryRead(out _).Should().BeTrue();

        long before = GC.GetAllocatedBytesForCurrentThread();
        while (lines.TryRead(out _))
        {
        }

        (GC.GetAllocatedBytesForCurrentThread() - before).Should().BeLessThan(10_000);
        lines.Number.Should().Be(200_001);
        lines.IsTooLong.Should().BeFalse("nothing was read after the last line");
    }

    private static JsonElement[] Lines(Answer answer) => [.. answer.Output.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(static line =>
    {
        using JsonDocument document = JsonDocument.Parse(line);
        return document.RootElement.Clone();
    })];

    /// <summary>An input that gives a few bytes at a time, as a terminal or a slow program does.</summary>
    private sealed class Slow(byte[] content, int most, Action? beforeRead = null) : MemoryStream(content)
    {
        public override int Read(byte[] buffer, int offset, int count)
        {
            beforeRead?.Invoke();
            return base.Read(buffer, offset, Math.Min(count, most));
        }
    }
}
