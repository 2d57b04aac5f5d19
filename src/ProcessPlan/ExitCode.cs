namespace ProcessPlan;

/// <summary>What scripts learn from how the program ends.</summary>
internal static class ExitCode
{
    public const int Done = 0;

    /// <summary>The input was understood, but no plan exists.</summary>
    public const int Refused = 1;

    /// <summary>The feature, the file's content or the command line was not understood.</summary>
    public const int NotUnderstood = 2;

    /// <summary>A file, the shop book, the terminal or a pipe failed.</summary>
    public const int World = 3;
}
