using System.Runtime.CompilerServices;

namespace ProcessPlan;

/// <summary>The way to the screens. Nothing that a command runs through may come here: loading the screens takes longer than answering.</summary>
internal static class Screens
{
    [MethodImpl(MethodImplOptions.NoInlining)]
    public static int Open(Streams streams)
    {
        streams.Error.WriteLine("processplan: a command is needed, such as limits 25H7; processplan --help shows them all.");
        return ExitCode.NotUnderstood;
    }
}
