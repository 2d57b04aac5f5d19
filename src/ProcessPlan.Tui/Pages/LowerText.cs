using ProcessPlan.Core;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <param name="Head">What it is about, in one word.</param>
/// <param name="Text">The sentence.</param>
/// <param name="Ink">How it is written.</param>
internal readonly record struct Said(string Head, string Text, Ink Ink = Ink.Plain);

/// <summary>The text below the route: why an operation is as it is, or what is to be asked, minded and known of the whole plan.</summary>
internal static class LowerText
{
    public const int HeadWidth = 12;

    public static IEnumerable<Said> Reasons(Operation operation, LengthUnit unit)
    {
        foreach (string caution in operation.Cautions)
        {
            yield return new Said("! mind", caution, Ink.Caution);
        }

        foreach (string because in operation.Because)
        {
            yield return new Said("because", because);
        }

        yield return new Said("check", operation.Inspection);
        if (unit == LengthUnit.Inch && operation.Why.Count > 0)
        {
            yield return new Said("unit", "the sums below are worked in millimetres");
        }

        foreach (Reason reason in operation.Why)
        {
            yield return new Said(reason.About, reason.Text);
        }
    }

    public static IEnumerable<Said> Refusal(Refusal refusal) =>
    [
        new Said("asked", refusal.Requirement, Ink.Strong),
        new Said("why", refusal.Message),
        new Said("best", refusal.Best),
        .. refusal.WouldOpen.Select(static way => new Said("would open", way)),
    ];

    /// <summary>Every problem of a line, each headed by the piece of it that is meant.</summary>
    public static IEnumerable<Said> Problems(string line, IEnumerable<Problem> problems) => problems.Select(problem =>
    {
        string piece = line.Substring(Math.Min(problem.At, line.Length), Math.Clamp(line.Length - problem.At, 0, problem.Length)).Trim();
        return new Said(piece.Length < HeadWidth - 1 ? piece : piece[..(HeadWidth - 3)] + "…", $"{problem.Message} Expected: {problem.Expected}", Ink.Problem);
    });

    public static IEnumerable<Said> Notes(Plan plan) =>
    [
        .. plan.Queries.Select(static query => new Said("? ask", query, Ink.Caution)),
        .. plan.Cautions.Select(static caution => new Said("! mind", caution, Ink.Caution)),
        .. plan.Assumptions.Select(static assumption => new Said("taken", assumption)),
        .. plan.Rejected.Select(static rejection => new Said("not used", $"{rejection.Process}: {rejection.Because}")),
    ];

    public static string Count(Plan plan) =>
        $"F6: {Several(plan.Queries.Count, "question")}, {Several(plan.Cautions.Count, "caution")}, {plan.Assumptions.Count} taken";

    /// <summary>The sentences broken to the width of the sheet, each head once.</summary>
    public static IEnumerable<(string Head, string Line, Ink Ink)> Lines(Sheet sheet, IEnumerable<Said> said)
    {
        string before = "";
        foreach ((string head, string text, Ink ink) in said)
        {
            string shown = head == before ? "" : head;
            before = head;
            foreach (string line in sheet.Wrap(text, sheet.Width - HeadWidth - 1))
            {
                yield return (shown, line, ink);
                shown = "";
            }
        }
    }

    private static string Several(int count, string what) => count == 1 ? $"1 {what}" : $"{count} {what}s";
}
