using System.Globalization;
using ProcessPlan.Core.Text;

namespace ProcessPlan.Documents;

/// <summary>The problems of one line for a person: the line with <c>^</c> under the place, then what was read and what was expected.</summary>
public static class ProblemText
{
    private const int Indent = 2;
    private const int Shown = TextLines.Width - Indent;
    private const string Cut = "...";

    public static void Write(TextWriter target, string line, IReadOnlyList<Problem> problems)
    {
        string shown = OneCellEach(line);
        foreach (Problem problem in problems)
        {
            WritePlace(target, shown, problem);
            TextLines.Write(target, problem.Message, Indent);
            TextLines.Write(target, "expected: " + problem.Expected, Indent);
        }
    }

    private static void WritePlace(TextWriter target, string line, Problem problem)
    {
        int at = Math.Clamp(problem.At, 0, line.Length);
        (int from, string head, string tail) = Window(line.Length, at);
        int room = Shown - head.Length - tail.Length;
        ReadOnlySpan<char> part = line.AsSpan(from, Math.Min(room, line.Length - from));
        int marks = Math.Clamp(Math.Min(problem.Length, from + part.Length - at), 1, Shown);
        target.Write(new string(' ', Indent));
        target.Write(head);
        target.Write(part);
        target.WriteLine(tail);
        target.Write(new string(' ', Indent + head.Length + at - from));
        target.WriteLine(new string('^', marks));
    }

    /// <summary>Where a long line is cut so that the place stands in the left half of what is shown.</summary>
    private static (int From, string Head, string Tail) Window(int length, int at)
    {
        if (length <= Shown)
        {
            return (0, "", "");
        }

        int room = Shown - 2 * Cut.Length;
        int from = Math.Clamp(at - room / 3, 0, length - room);
        return (from, from > 0 ? Cut : "", from + room < length ? Cut : "");
    }

    /// <summary>One character cell for every character that a place counts, so that the marks stand under their place.</summary>
    private static string OneCellEach(string line) => string.Create(line.Length, line, static (cells, text) =>
    {
        for (int i = 0; i < cells.Length; i++)
        {
            cells[i] = text[i] == '\t' ? ' ' : TakesOneCell(text[i]) ? text[i] : '?';
        }
    });

    private static bool TakesOneCell(char c)
    {
        const char FirstWide = '\u1100';
        return c < FirstWide
            ? char.GetUnicodeCategory(c) is not (UnicodeCategory.Control or UnicodeCategory.Format or UnicodeCategory.NonSpacingMark or UnicodeCategory.EnclosingMark)
            : char.GetUnicodeCategory(c) is UnicodeCategory.DashPunctuation or UnicodeCategory.MathSymbol or UnicodeCategory.InitialQuotePunctuation
                or UnicodeCategory.FinalQuotePunctuation or UnicodeCategory.SpaceSeparator;
    }
}
