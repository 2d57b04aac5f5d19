using System.Text;
using Microsoft.Win32.SafeHandles;

namespace ProcessPlan;

/// <summary>The three streams of a process, UTF-8 without a byte order mark; each is opened when it is first used.</summary>
internal sealed class Streams(Func<Stream> input, Func<Stream> output, Func<TextWriter> error, Func<bool> isErrorTerminal)
{
    /// <summary>The same bytes on every machine.</summary>
    private const string NewLine = "\n";

    private static readonly UTF8Encoding Utf8 = new(encoderShouldEmitUTF8Identifier: false);

    public Stream Input => field ??= input();

    public Stream Output => field ??= output();

    public TextWriter Error => field ??= error();

    /// <summary>Whether a person sees what is written to <see cref="Error"/>.</summary>
    public bool IsErrorTerminal => isErrorTerminal();

    public static Streams OfProcess() =>
        new(Console.OpenStandardInput, OpenOutput, () => new StreamWriter(Console.OpenStandardError(), Utf8) { AutoFlush = true, NewLine = NewLine }, () => !Console.IsErrorRedirected);

    /// <summary>Text for a person; written when it is disposed.</summary>
    public StreamWriter OutputText() => new(Output, Utf8, leaveOpen: true) { NewLine = NewLine };

    /// <remarks>
    /// The console's own stream takes a closed pipe for success, and an endless input would never end. A stream over the handle reports it,
    /// but keeps a file's place for itself, so that two programs in turn would overwrite each other: it is taken where there is no place to keep.
    /// </remarks>
    private static Stream OpenOutput()
    {
        if (OperatingSystem.IsWindows())
        {
            return Console.OpenStandardOutput();
        }

        const int StandardOutput = 1;
        FileStream pipe = new(new SafeFileHandle(StandardOutput, ownsHandle: false), FileAccess.Write, bufferSize: 0);
        return pipe.CanSeek ? Console.OpenStandardOutput() : pipe;
    }
}
