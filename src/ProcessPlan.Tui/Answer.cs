using ProcessPlan.Core;
using ProcessPlan.Core.Features;

namespace ProcessPlan.Tui;

/// <summary>A line that was read whole, and what was planned for it.</summary>
/// <param name="Line">The text as it was typed.</param>
/// <param name="Request">What it asks for.</param>
/// <param name="Plans">One for each feature of the request, in their order.</param>
internal sealed record Answer(string Line, FeatureRequest Request, IReadOnlyList<Plan> Plans);
