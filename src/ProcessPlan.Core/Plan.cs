using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Routing;

namespace ProcessPlan.Core;

/// <summary>A process that does not finish the feature, and the binding reason.</summary>
public sealed record Rejection(string Process, string Because);

/// <summary>The answer for one feature: its routes, cheapest first, or why there is none.</summary>
public sealed record Plan
{
    public required Job Job { get; init; }

    /// <summary>Cheapest first; empty where there is a refusal.</summary>
    public required IReadOnlyList<Route> Routes { get; init; }

    public required Refusal? Refusal { get; init; }

    public required IReadOnlyList<Rejection> Rejected { get; init; }

    /// <summary>Questions to put to the drawing's owner before cutting.</summary>
    public required IReadOnlyList<string> Queries { get; init; }

    public required IReadOnlyList<string> Cautions { get; init; }

    public required IReadOnlyList<string> Assumptions { get; init; }

    /// <summary>Steps that the search looked behind.</summary>
    public required int Expanded { get; init; }
}
