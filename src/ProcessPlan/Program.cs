using System.CommandLine;
using System.Globalization;
using System.Text;

namespace ProcessPlan;

internal static class Program
{
    private static readonly (string Name, Func<Streams, Command> Create)[] Commands =
    [
        (LimitsCommand.Name, LimitsCommand.Create),
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
            return args is [LimitsCommand.Name, _, ..] && !Array.Exists(args, IsOption)
                ? LimitsCommand.Answer(args[1..], streams)
                : CommandsFor(args.FirstOrDefault(), streams).Answer(args, streams);
        }
        catch (UsageException usage)
        {
            return Tell(streams, usage.Message, ExitCode.NotUnderstood);
        }
        catch (IOException closed) when (ClosedPipe.Is(closed))
        {
            // Who reads has seen enough; there is nobody left to tell.
            return ExitCode.World;
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException)
        {
            return Tell(streams, failure.Message, ExitCode.World);
        }
        catch (Exception defect)
        {
            return Tell(streams, $"a defect of the program, please report it: {defect.GetType().Name}, {defect.Message}", ExitCode.World);
        }
    }

    /// <summary>"-0" and "-" belong to a feature; these do not.</summary>
    private static bool IsOption(string word) => word.StartsWith("--", StringComparison.Ordinal) || word is "-h" or "-?" or "/h" or "/?";

    private static int Tell(Streams streams, string sentence, int exit)
    {
        try
        {
            streams.Error.WriteLine($"processplan: {sentence}");
            return exit;
        }
        catch (IOException)
        {
            // There is no place left to say it; the exit code still does.
            return ExitCode.World;
        }
    }

    /// <summary>The tree of commands; only the one that is meant is made, all of them where none is.</summary>
    private static RootCommand CommandsFor(string? first, Streams streams)
    {
        RootCommand root = new("Plans how a machinist makes a hole, shaft, slot or tongue to its drawing. Without a command it opens the screens.");
        Screens.AddTo(root);
        bool isMeant(string name) => name == first;
        bool any = false;
        foreach ((string name, _) in Commands)
        {
            any |= isMeant(name);
        }

        foreach ((string name, Func<Streams, Command> create) in Commands)
        {
            if (!any || isMeant(name))
            {
                root.Subcommands.Add(create(streams));
            }
        }

        return root;
    }
}
