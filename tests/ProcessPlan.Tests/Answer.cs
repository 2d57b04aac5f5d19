using System.Globalization;
using System.Text;

namespace ProcessPlan.Tests;

/// <summary>What a command said, and how it ended.</summary>
internal sealed record Answer(int Exit, string Output, string Error)
{
    /// <summary>Asks the program as a shell would, within this process.</summary>
    public static Answer To(params string[] words) => ToInput("", words);

    /// <summary>The same, with text on standard input.</summary>
    public static Answer ToInput(string input, params string[] words)
    {
        using MemoryStream source = new(Encoding.UTF8.GetBytes(input));
        return ToStream(source, words);
    }

    public static Answer ToStream(Stream input, params string[] words)
    {
        using MemoryStream output = new();
        using StringWriter error = new(CultureInfo.InvariantCulture) { NewLine = "\n" };
        int exit = Program.Run(words, new Streams(() => input, () => output, () => error, () => false));
        return new Answer(exit, Encoding.UTF8.GetString(output.ToArray()), error.ToString());
    }
}
