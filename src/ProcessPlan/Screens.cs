using System.CommandLine;
using System.Runtime.CompilerServices;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui;

namespace ProcessPlan;

/// <summary>
/// The way to the screens, which open without a command. Nothing that a command runs through may come into <see cref="Open"/>: loading the
/// screens takes longer than answering.
/// </summary>
internal static class Screens
{
    /// <summary>Lets the call without a command open the screens.</summary>
    public static void AddTo(RootCommand root)
    {
        Flag ascii = FeatureQuestion.PlainLettersFlag();
        UnitChoice unit = new("mm");
        root.Options.Add(ascii.Option);
        root.Options.Add(unit.Option);
        root.SetAction(parsed => Open(ascii.In(parsed), unit.In(parsed)));
    }

    [MethodImpl(MethodImplOptions.NoInlining)]
    private static int Open(bool ascii, LengthUnit? unit) => Screen.Run(HandbookShop.Load, new ScreenOptions
    {
        Ascii = ascii,
        Unit = unit ?? LengthUnit.Millimetre,
        NoColour = Environment.GetEnvironmentVariable("NO_COLOR") is { Length: > 0 },
    });
}
