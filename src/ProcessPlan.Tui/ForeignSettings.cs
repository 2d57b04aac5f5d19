using System.Reflection;
using System.Runtime.CompilerServices;

namespace ProcessPlan.Tui;

/// <summary>
/// The screen library reads theme and key files of other programs when it is loaded: from the home folder, from the working folder and from a variable.
/// On a shared computer they must not change this screen, so the library is loaded while none of them is in sight.
/// </summary>
internal static class ForeignSettings
{
    private const string Variable = "TUI_CONFIG";
    private const string Home = "HOME";
    private const string WindowsHome = "USERPROFILE";

    /// <summary>Loads the library. Nothing of it may have been touched before in this process.</summary>
    public static void KeepOut(Module library)
    {
        string folder = Environment.CurrentDirectory;
        string nowhere = Path.Combine(AppContext.BaseDirectory, "no-settings");
        string?[] before = [Environment.GetEnvironmentVariable(Variable), Environment.GetEnvironmentVariable(Home), Environment.GetEnvironmentVariable(WindowsHome)];
        try
        {
            Environment.SetEnvironmentVariable(Variable, null);
            Environment.SetEnvironmentVariable(Home, nowhere);
            Environment.SetEnvironmentVariable(WindowsHome, nowhere);
            Environment.CurrentDirectory = AppContext.BaseDirectory;
            RuntimeHelpers.RunModuleConstructor(library.ModuleHandle);
        }
        finally
        {
            Environment.CurrentDirectory = folder;
            Environment.SetEnvironmentVariable(Variable, before[0]);
            Environment.SetEnvironmentVariable(Home, before[1]);
            Environment.SetEnvironmentVariable(WindowsHome, before[2]);
        }
    }
}
