using System.Runtime.CompilerServices;

namespace ProcessPlan.Tests;

/// <summary>The tests do not see the shop book of who runs them.</summary>
internal static class NoBookOfTheUser
{
    [ModuleInitializer]
    internal static void Look()
    {
        string nowhere = Path.Combine(AppContext.BaseDirectory, "no-books");
        Environment.SetEnvironmentVariable("XDG_DATA_HOME", nowhere);
        Environment.SetEnvironmentVariable("APPDATA", nowhere);
    }
}
