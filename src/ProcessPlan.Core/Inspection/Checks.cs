using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Standards;

namespace ProcessPlan.Core.Inspection;

/// <summary>How often a size is checked: common practice, no source.</summary>
public static class Checks
{
    private const double ToolGivesSize = 0.1;
    private const double ToolGivesSizeSpecial = 0.2;
    private const double SetCoarse = 0.2;
    private const double SetFine = 0.5;

    /// <summary>Cut, measure, cut again, measure: twice for every piece.</summary>
    private const double SetSpecial = 2;

    private static readonly ToleranceGrade FineFrom = ToleranceGrade.It(8);

    /// <summary>Checks for one piece.</summary>
    public static double PerPiece(Process process, Effort effort) => (process.SizedBy is not null, effort) switch
    {
        (true, Effort.Routine) => ToolGivesSize,
        (true, _) => ToolGivesSizeSpecial,
        (false, Effort.Routine) => process.RoutineGrade <= FineFrom ? SetFine : SetCoarse,
        _ => SetSpecial,
    };

    /// <summary>The same in words for the card.</summary>
    public static string Words(Process process, Effort effort) => PerPiece(process, effort) switch
    {
        ToolGivesSize => "first piece, then 1 in 10",
        SetCoarse => "first piece, then 1 in 5",
        SetFine => "first piece, then every second",
        _ => "every piece before and after the last cut",
    };
}
