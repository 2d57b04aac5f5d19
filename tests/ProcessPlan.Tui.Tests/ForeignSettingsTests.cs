using System.Reflection;
using System.Runtime.CompilerServices;
using System.Runtime.Loader;

namespace ProcessPlan.Tui.Tests;

/// <summary>Theme files of other programs, in a working folder, a home folder and the variable that the screen library reads when it is loaded.</summary>
[Collection(nameof(Alone))]
public sealed class ForeignSettingsTests : IDisposable
{
    private const string Theme = """{ "Theme": "TurboPascal 5", "Glyphs": { "HLine": "Q" }, "Application": { "DefaultKeyBindings": { "Quit": { "All": ["F2"] } } } }""";

    private readonly string _folder = Directory.CreateTempSubdirectory("settings").FullName;
    private readonly string _before = Environment.CurrentDirectory;
    private readonly string? _home = Environment.GetEnvironmentVariable("HOME");

    public ForeignSettingsTests()
    {
        Directory.CreateDirectory(Path.Combine(_folder, ".tui"));
        File.WriteAllText(Path.Combine(_folder, ".tui", "config.json"), Theme);
    }

    public void Dispose()
    {
        Environment.CurrentDirectory = _before;
        Environment.SetEnvironmentVariable("HOME", _home);
        Environment.SetEnvironmentVariable("TUI_CONFIG", null);
        Directory.Delete(_folder, recursive: true);
    }

    [Theory]
    [InlineData("folder")]
    [InlineData("home")]
    [InlineData("variable")]
    public void Settings_of_other_programs_stay_out(string place)
    {
        Set(place);
        LoadedTheme(keepOut: false).Should().Be("TurboPascal 5", "else this test would prove nothing");
        LoadedTheme(keepOut: true).Should().Be("Default");
    }

    [Fact]
    public void Afterwards_folder_and_variables_are_as_before()
    {
        Set("folder");
        Set("home");
        Set("variable");
        LoadedTheme(keepOut: true);
        Environment.CurrentDirectory.Should().Be(_folder);
        Environment.GetEnvironmentVariable("HOME").Should().Be(_folder);
        Environment.GetEnvironmentVariable("TUI_CONFIG").Should().Be(Theme);
    }

    private void Set(string place)
    {
        switch (place)
        {
            case "folder":
                Environment.CurrentDirectory = _folder;
                break;
            case "home":
                Environment.SetEnvironmentVariable("HOME", _folder);
                break;
            default:
                Environment.SetEnvironmentVariable("TUI_CONFIG", Theme);
                break;
        }
    }

    /// <summary>Loads the library once more, beside the copy that the other tests use, as a process of its own would.</summary>
    private static string LoadedTheme(bool keepOut)
    {
        AssemblyLoadContext fresh = new("fresh", isCollectible: true);
        try
        {
            Assembly library = fresh.LoadFromAssemblyPath(typeof(global::Terminal.Gui.App.IApplication).Assembly.Location);
            if (keepOut)
            {
                ForeignSettings.KeepOut(library.ManifestModule);
            }
            else
            {
                RuntimeHelpers.RunModuleConstructor(library.ManifestModule.ModuleHandle);
            }

            object settings = library.GetType("Terminal.Gui.Configuration.ThemeSettings", throwOnError: true)!.GetProperty("Defaults")!.GetValue(null)!;
            return (string)settings.GetType().GetProperty("Theme")!.GetValue(settings)!;
        }
        finally
        {
            fresh.Unload();
        }
    }
}
