using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using ProcessPlan.Core;
using ProcessPlan.Core.Shop;
using Terminal.Gui.App;
using Terminal.Gui.Drivers;

namespace ProcessPlan.Tui;

/// <summary>The terminal screen of the planner.</summary>
public static class Screen
{
    /// <summary>Exit code where the terminal, or the program itself, does not let the screen go on.</summary>
    public const int World = 3;

    private const int Routes = 5;

    private static readonly TimeSpan LongestLeave = TimeSpan.FromSeconds(2);

    /// <summary>Runs the screen until it is left.</summary>
    /// <param name="openShop">Opens what the plans are made from; called once, aside, while the terminal is being prepared.</param>
    /// <param name="options">How the screen looks and starts.</param>
    /// <returns>0 after a normal end, also by a signal; else 3 with one sentence on standard error.</returns>
    public static int Run(Func<ShopFloor> openShop, ScreenOptions options)
    {
        if (Environment.GetEnvironmentVariable("TERM") is null or "" or "dumb" && !OperatingSystem.IsWindows())
        {
            return Refuse("This terminal cannot show a screen (TERM is not set, or dumb); the commands work without one: see --help.");
        }

        try
        {
            ForeignSettings.KeepOut(typeof(IApplication).Module);
            return Show(Task.Run(openShop), options);
        }
        catch (Exception fault)
        {
            return Refuse($"The screen broke off: {fault.Message.ReplaceLineEndings(" ")}");
        }
    }

    private static int Refuse(string sentence)
    {
        Console.Error.WriteLine(sentence);
        return World;
    }

    /// <summary>Apart, so that the library is not touched before its settings are kept out.</summary>
    [MethodImpl(MethodImplOptions.NoInlining)]
    private static int Show(Task<ShopFloor> opening, ScreenOptions options)
    {
        if (!Driver.IsAttachedToTerminal(out _, out _))
        {
            return Refuse("The screen needs a terminal, and there is none here; the commands work without one: see --help.");
        }

        IApplication app = Application.Create();
        bool hungUp = false;
        List<PosixSignalRegistration> signals = [];
        try
        {
            app.Init();
            app.Driver!.Force16Colors = true;
            ShopFloor shop = opening.GetAwaiter().GetResult();
            using BenchView view = new(new Bench(shop.Names, options.Line, options.Unit), options, feature => Planner.Plan(feature, shop, Routes), static work => Task.Run(work));
            foreach (PosixSignal signal in (PosixSignal[])[PosixSignal.SIGTERM, PosixSignal.SIGHUP, PosixSignal.SIGINT, PosixSignal.SIGQUIT])
            {
                signals.Add(PosixSignalRegistration.Create(signal, context =>
                {
                    context.Cancel = true;
                    hungUp |= context.Signal == PosixSignal.SIGHUP;
                    app.Invoke(_ => app.RequestStop(view));
                }));
            }

            app.Run(view);
            return 0;
        }
        finally
        {
            signals.ForEach(static signal => signal.Dispose());
            Leave(app, hungUp);
        }
    }

    /// <summary>
    /// Gives the terminal back. Where it has hung up there is none to give back, and the library's reader would wait for its end for ever: only then
    /// the wait is limited.
    /// </summary>
    private static void Leave(IApplication app, bool hungUp)
    {
        if (hungUp)
        {
            Task.Run(app.Dispose).Wait(LongestLeave);
        }
        else
        {
            app.Dispose();
        }
    }
}
