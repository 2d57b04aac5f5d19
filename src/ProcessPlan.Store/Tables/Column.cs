namespace ProcessPlan.Store.Tables;

/// <summary>One column of a table.</summary>
/// <param name="Name">The same in CSV and in JSON; sizes are in mm.</param>
/// <param name="Kind">What its cells hold.</param>
internal record Column(string Name, CellKind Kind);

/// <summary>A column with the value that stands in it.</summary>
internal sealed record Column<T>(string Name, CellKind Kind, Func<T, object?> Value) : Column(Name, Kind);
