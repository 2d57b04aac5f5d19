namespace ProcessPlan;

/// <summary>The reader of a pipe has gone, as with <c>| head</c>.</summary>
internal static class ClosedPipe
{
    private const int LinuxAndMacBrokenPipe = 32;
    private const int WindowsBrokenPipe = unchecked((int)0x8007006D);
    private const int WindowsNoData = unchecked((int)0x800700E8);

    public static bool Is(IOException failure) => failure.HResult is LinuxAndMacBrokenPipe or WindowsBrokenPipe or WindowsNoData;
}
