namespace ProcessPlan.Tests;

/// <summary>What lies outside the program can fail; each failure is one sentence and exit code 3.</summary>
public class WorldTests
{
    [Fact]
    public void Input_that_cannot_be_read_is_told_in_one_sentence()
    {
        using Failing input = new(new IOException("The disk was taken out."));
        Answer.ToStream(input, "limits", "-").Should().Be(new Answer(3, "", "processplan: The disk was taken out.\n"));
    }

    [Fact]
    public void Output_that_cannot_be_written_is_told_in_one_sentence()
    {
        using Failing output = new(new IOException("No space left on device."));
        using StringWriter error = new() { NewLine = "\n" };

        Program.Run(["limits", "25H7"], new Streams(() => Stream.Null, () => output, () => error, () => false)).Should().Be(3);
        error.ToString().Should().Be("processplan: No space left on device.\n");
    }

    [Theory]
    [InlineData("25H7")]
    [InlineData("25H7", "--json")]
    [InlineData("-")]
    public void A_reader_that_has_gone_is_not_worth_a_word(params string[] words)
    {
        const int BrokenPipe = 32;
        using Failing output = new(new IOException("Broken pipe", BrokenPipe));
        using StringWriter error = new();
        using MemoryStream input = new("25H7\n"u8.ToArray());

        Program.Run(["limits", .. words], new Streams(() => input, () => output, () => error, () => false)).Should().Be(3);
        error.ToString().Should().BeEmpty();
    }

    [Fact]
    public void Where_nothing_can_be_told_the_exit_code_still_says_it()
    {
        using Failing full = new(new IOException("No space left on device."));
        using StreamWriter error = new(full) { AutoFlush = true };

        Program.Run(["limits", "25 H7 thruu"], new Streams(() => Stream.Null, () => full, () => error, () => false)).Should().Be(3);
    }

    private sealed class Failing(IOException failure) : MemoryStream
    {
        public override int Read(byte[] buffer, int offset, int count) => throw failure;

        public override void Write(byte[] buffer, int offset, int count) => throw failure;

        public override void Write(ReadOnlySpan<byte> buffer) => throw failure;
    }
}
