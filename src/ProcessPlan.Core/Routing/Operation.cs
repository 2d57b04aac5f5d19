using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>The state of the metal that an operation works on.</summary>
public enum Condition
{
    Soft,
    Hard,
    Coated,
}

/// <summary>Where one number of an operation comes from.</summary>
/// <param name="About">The number: size, aim, tool, stock, minutes, cost, grade, inspection.</param>
/// <param name="Text">The sum or rule, with its source.</param>
public sealed record Reason(string About, string Text);

/// <summary>One operation of a route, with every number that the floor needs.</summary>
public sealed record Operation
{
    /// <summary>Operation numbers go in tens, so that one can be put between.</summary>
    public required int Number { get; init; }

    public required string Process { get; init; }

    /// <summary>Machine of this shop, or the kind of outside supplier.</summary>
    public required string Machine { get; init; }

    public required Condition Condition { get; init; }

    public Effort Effort { get; init; }

    /// <summary>The tool that gives the size, or null where the machinist sets it.</summary>
    public Tool? Tool { get; init; }

    /// <summary>What the operation is held to; the last one to the drawing's limits. Null where no size is made.</summary>
    public SizeWindow? Size { get; init; }

    /// <summary>The size to set the machine to, or the middle of what the tool is predicted to cut.</summary>
    public Length? Aim { get; init; }

    public ToleranceGrade? Grade { get; init; }

    public Roughness? Ra { get; init; }

    /// <summary>Least metal removed on diameter or width at the extremes; null for a first cut in solid metal and where nothing is cut.</summary>
    public Stock? StockMin { get; init; }

    public Stock? StockMax { get; init; }

    /// <summary>Run time of one piece with handling, tool change and checking.</summary>
    public required Minutes Minutes { get; init; }

    /// <summary>Once a lot, where the part comes onto this machine; else zero.</summary>
    public required Minutes SetUp { get; init; }

    /// <summary>Cost of one good piece with its share of the set-up and of later scrap.</summary>
    public required Money Cost { get; init; }

    public required string Inspection { get; init; }

    /// <summary>Why this operation, in short.</summary>
    public required IReadOnlyList<string> Because { get; init; }

    public required IReadOnlyList<string> Cautions { get; init; }

    /// <summary>Every number's origin.</summary>
    public required IReadOnlyList<Reason> Why { get; init; }
}

/// <summary>A way to make the feature, from the blank to the drawing.</summary>
/// <param name="Rank">1 is the cheapest.</param>
/// <param name="Operations">In the order of the work.</param>
/// <param name="CostPerPiece">Of a good piece; the sum of its operations.</param>
/// <param name="MinutesPerPiece">Run time of a piece.</param>
/// <param name="SetUp">Set-up time of the lot.</param>
/// <param name="Yield">Share of good pieces by the spread model.</param>
/// <param name="Blanks">Pieces to start so that the lot comes out good.</param>
/// <param name="From">What it starts from, in words.</param>
public sealed record Route(
    int Rank,
    IReadOnlyList<Operation> Operations,
    Money CostPerPiece,
    Minutes MinutesPerPiece,
    Minutes SetUp,
    double Yield,
    int Blanks,
    string From)
{
    /// <summary>The cost as it is printed: the sum of the operations' costs to the cent, so that the card adds up.</summary>
    public Money ShownCost => new(Operations.Sum(static operation => operation.Cost.Rounded), CostPerPiece.Currency);

    /// <summary>The run time as it is printed: the sum of the operations' times to the hundredth of a minute, so that the card adds up.</summary>
    public Minutes ShownMinutes => new(Operations.Sum(static operation => Math.Round(operation.Minutes.Value, 2, MidpointRounding.AwayFromZero)));
}
