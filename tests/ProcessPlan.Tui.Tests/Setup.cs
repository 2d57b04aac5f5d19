using System.Runtime.CompilerServices;

namespace ProcessPlan.Tui.Tests;

internal static class Setup
{
    /// <summary>No test looks at the terminal that it happens to run in; each application holds a thread of the pool.</summary>
    [ModuleInitializer]
    internal static void Detach()
    {
        Environment.SetEnvironmentVariable("DisableRealDriverIO", "1");
        ThreadPool.SetMinThreads(32, 32);
    }
}
