using System.CommandLine;
using System.Globalization;
using System.Text;

namespace ProcessPlan;

internal static class Program
{
    private static readonly (string Name, Func<Streams, Command> Create)[] Commands =
    [
        ("limits", LimitsCommand.Create),
        ("plan", PlanCommand.Create),
        ("shop", ShopCommand.Create),
    ];

    public static int Main(string[] args)
    {
        // Numbers are read and written alike on every machine, whatever its language.
        CultureInfo.DefaultThreadCurrentCulture = CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;
        if (OperatingSystem.IsWindows() && !Console.IsOutputRedirected)
        {
            Console.OutputEncoding = Encoding.UTF8;
        }

        return Run(args, Streams.OfProcess());
    }

    /// <summary>The whole program but for its process. The one place that catches: whatever goes wrong ends in one sentence.</summary>
    internal static int Run(string[] args, Streams streams)
    {
        try
        {
            return args.Length == 0 ? Screens.Open(streams) : CommandsFor(args[0], streams).Answer(args, streams);
        }
        catch (UsageException usage)
        {
            streams.Error.WriteLine($"processplan: {usage.Message}");
            return ExitCode.NotUnderstood;
        }
        catch (IOException closed) when (ClosedPipe.Is(closed))
        {
            // Who reads has seen enough; there is nobody left to tell.
            return ExitCode.World;
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException)
        {
            streams.Error.WriteLine($"processplan: {failure.Message}");
            return ExitCode.World;
        }
        catch (Exception defect)
        {
            streams.Error.WriteLine($"processplan: a defect of the program, please report it: {defect.GetType().Name}, {defect.Message}");
            return ExitCode.World;
        }
    }

    /// <summary>The tree of commands; only the one that is meant is made, all of them where none is.</summary>
    private static RootCommand CommandsFor(string first, Streams streams)
    {
        RootCommand root = new("Plans how a machinist makes a hole, shaft, slot or tongue to its drawing.");
        (string Name, Func<Streams, Command> Create)[] meant = Array.FindAll(Commands, command => command.Name == first);
        foreach ((_, Func<Streams, Command> create) in meant.Length > 0 ? meant : Commands)
        {
            root.Subcommands.Add(create(streams));
        }

        return root;
    }
}
