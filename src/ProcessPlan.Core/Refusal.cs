namespace ProcessPlan.Core;

/// <summary>Why no route exists, and what would open one.</summary>
/// <param name="Requirement">The requirement of the drawing that binds.</param>
/// <param name="Message">Which window closed, and by how much.</param>
/// <param name="Best">The best that this shop can do.</param>
/// <param name="WouldOpen">A machine, a tool, a supplier, or a question to the designer.</param>
public sealed record Refusal(string Requirement, string Message, string Best, IReadOnlyList<string> WouldOpen);
