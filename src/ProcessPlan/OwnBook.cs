namespace ProcessPlan;

/// <summary>Where the user's own shop book is kept.</summary>
internal static class OwnBook
{
    /// <summary>The file, which need not exist; null where the system names no place for it.</summary>
    public static string? Path => Folder is { } folder ? System.IO.Path.Combine(folder, "processplan", "shop.db") : null;

    private static string? Folder => OperatingSystem.IsWindows()
        ? Absolute("APPDATA")
        : Absolute("XDG_DATA_HOME") ?? (Absolute("HOME") is { } home ? System.IO.Path.Combine(home, ".local", "share") : null);

    private static string? Absolute(string variable) => Environment.GetEnvironmentVariable(variable) is { } path && System.IO.Path.IsPathFullyQualified(path) ? path : null;
}
