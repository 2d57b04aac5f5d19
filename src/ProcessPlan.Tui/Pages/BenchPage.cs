using System.Globalization;
using ProcessPlan.Core;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <summary>Where the characters of the line stand on the screen, as its field shows them.</summary>
/// <param name="Caret">Character before which the caret stands.</param>
/// <param name="ColumnOf">Column of a character; outside the field where it is scrolled away.</param>
/// <param name="From">First column of the field.</param>
/// <param name="To">Column behind the field.</param>
internal readonly record struct LineSight(int Caret, Func<int, int> ColumnOf, int From, int To);

/// <summary>The bench: the line, its size, its route, and the reasons, from top to bottom.</summary>
internal static class BenchPage
{
    public const int FieldColumn = 9;
    public const int FieldEnd = 5;

    private const int SizeRow = 3;
    private const int NumbersWidth = 38;
    private const int LeastBelow = 4;

    public static void Draw(Sheet sheet, Bench bench, LineSight line)
    {
        Ruler ruler = new(bench.Unit);
        sheet.Write(0, 0, "Feature", Ink.Heading);
        if (bench.Hand == Hand.Line)
        {
            sheet.Put(FieldColumn - 1, 0, sheet.Pen.Pointer, Ink.Strong);
        }

        sheet.WriteBefore(sheet.Width - 1, 0, ruler.Name, Ink.Heading);
        Reading reading = Reading.Of(sheet, bench, line, ruler);
        int below = DrawAnswer(sheet, bench, reading.Rows, ruler);
        if (!bench.IsCurrent)
        {
            sheet.Fade(reading.Rows, sheet.Height - reading.Rows - 1);
        }

        DrawReading(sheet, bench, line, reading);
        DrawProblems(sheet, bench, reading, below);
        DrawKeys(sheet, bench);
    }

    /// <summary>The text below the line, and how many rows the line and its text take: as many with a problem as without, where that is possible.</summary>
    /// <param name="Told">The problem that is told.</param>
    /// <param name="Lines">The problem, or how the line was read.</param>
    /// <param name="Rows">First row of the size.</param>
    private sealed record Reading(Problem? Told, IReadOnlyList<string> Lines, int Rows)
    {
        private const int RoomyHeight = 20;
        private const int MostLines = 2;

        public static Reading Of(Sheet sheet, Bench bench, LineSight line, Ruler ruler)
        {
            List<string> said = bench.Answer is { } answer ? [.. sheet.Wrap(ReadBack.Say(answer.Request, ruler), sheet.Width)] : [];
            int rows = SizeRow + (said.Count > 1 && sheet.Height >= RoomyHeight ? 1 : 0);
            if (bench.ProblemTold(line.Caret) is { } told)
            {
                string others = bench.Problems.Count > 1 ? $" (and {bench.Problems.Count - 1} more)" : "";
                List<string> lines = [.. sheet.Wrap($"{told.Message} Expected: {told.Expected}{others}", sheet.Width)];
                return new Reading(told, lines, Math.Max(rows, SizeRow + (lines.Count > 1 ? 1 : 0)));
            }

            // Where the size cannot give a row, the row of a caution is taken: it stands in the notes too. A question keeps its own.
            int most = rows > SizeRow || bench.Plan is { Queries.Count: 0 } ? MostLines : 1;
            return new Reading(null, said, rows) { Most = most };
        }

        /// <summary>Lines that are shown.</summary>
        public int Most { get; private init; } = MostLines;

        /// <summary>Whether something of a problem is not said below the line.</summary>
        public bool HidesProblems(Bench bench) => Told is not null && (bench.Problems.Count > 1 || Lines.Count > Most);
    }

    /// <summary>The rows below the line: what is wrong with it, or how it was read and the first question or caution.</summary>
    private static void DrawReading(Sheet sheet, Bench bench, LineSight line, Reading reading)
    {
        if (reading.Told is { } told)
        {
            foreach (Problem other in bench.Problems)
            {
                DrawMarks(sheet, other, line, '~');
            }

            DrawMarks(sheet, told, line, '^');
            WriteLines(sheet, SizeRow - 1, reading, Ink.Problem);
            return;
        }

        if (bench.Answer is null || !bench.IsCurrent)
        {
            sheet.Write(0, 1, bench.Waiting is not null || !bench.IsRead ? "…" : "Type a feature, for example: " + ScreenOptions.FirstLine, Ink.Faint);
            DrawStale(sheet, bench, 2);
            return;
        }

        int row = 1 + WriteLines(sheet, 1, reading, Ink.Plain);
        if (row >= reading.Rows)
        {
            return;
        }

        if (bench.Plan!.Queries is [string query, ..])
        {
            sheet.Write(0, row, sheet.Shorten("? " + query, sheet.Width), Ink.Caution);
        }
        else if (bench.Plan.Cautions is [string caution, ..])
        {
            sheet.Write(0, row, sheet.Shorten("! " + caution, sheet.Width), Ink.Caution);
        }
    }

    /// <returns>How many.</returns>
    private static int WriteLines(Sheet sheet, int row, Reading reading, Ink ink)
    {
        int count = Math.Min(reading.Lines.Count, reading.Most);
        for (int at = 0; at < count; at++)
        {
            string rest = at == count - 1 ? string.Join(' ', reading.Lines.Skip(at)) : reading.Lines[at];
            sheet.Write(0, row + at, sheet.Shorten(rest, sheet.Width), ink);
        }

        return count;
    }

    /// <summary>Every problem, in place of the lower text; where that has no room, over the old route: a line to be mended has none of its own.</summary>
    private static void DrawProblems(Sheet sheet, Bench bench, Reading reading, int below)
    {
        if (!reading.HidesProblems(bench))
        {
            return;
        }

        List<Said> said = [.. LowerText.Problems(bench.Text, bench.Problems)];
        int bottom = sheet.Height - 1;
        int wanted = 1 + LowerText.Lines(sheet, said).Count();
        int highest = bench.Answer is null ? reading.Rows : reading.Rows + Room.Numbers;
        int row = Math.Clamp(bottom - wanted, highest, Math.Max(highest, Math.Min(below, bottom - 1)));
        sheet.Clear(row, bottom - row);
        DrawText(sheet, row, bottom - row, bench, bench.Problems.Count == 1 ? "1 problem in the line" : $"{bench.Problems.Count} problems in the line", Ink.Problem, said);
    }

    private static void DrawStale(Sheet sheet, Bench bench, int row)
    {
        if (bench.Answer is { } answer)
        {
            sheet.Write(0, row, sheet.Shorten("answer to: " + answer.Line, sheet.Width).PadRight(sheet.Width), Ink.Strong);
        }
    }

    private static void DrawMarks(Sheet sheet, Problem problem, LineSight line, char mark)
    {
        int from = line.ColumnOf(problem.At);
        int to = Math.Max(from + 1, line.ColumnOf(problem.At + problem.Length));
        for (int column = Math.Max(from, line.From); column < Math.Min(to, line.To); column++)
        {
            sheet.Put(column, 1, mark, Ink.Problem);
        }
    }

    /// <returns>The first row of the lower text.</returns>
    private static int DrawAnswer(Sheet sheet, Bench bench, int row, Ruler ruler)
    {
        if (bench is not { Answer: { } answer, Feature: { } feature, Plan: { } plan })
        {
            return row;
        }

        Room room = Room.Of(sheet.Height - row, bench);
        DrawSize(sheet, row, room.Size, bench, answer, feature, ruler);
        row += room.Size;
        if (bench.Route is { } route)
        {
            DrawRoute(sheet, row, room.Operations, bench, plan, route, ruler);
            row += room.Operations + 3;
        }

        DrawBelow(sheet, row, sheet.Height - 1 - row, bench, plan);
        return row;
    }

    /// <summary>How the rows are shared out: the size takes its picture, the route its operations, and the text below gets the rest.</summary>
    private readonly record struct Room(int Size, int Operations)
    {
        public const int Numbers = 5;

        private const int TallHeight = 27;

        public static Room Of(int height, Bench bench)
        {
            int rows = height - 1;
            int operations = bench.Route?.Operations.Count ?? 0;
            int shown = Math.Max(2, Math.Min(operations, rows - Numbers - 3 - LeastBelow));
            int picture = 1 + 1 + bench.Answer!.Plans.Count + 1 + operations + (height > TallHeight ? 1 : 0);
            int left = rows - 3 - shown - LeastBelow - (height > TallHeight ? 4 : 0);
            return new Room(Math.Max(Numbers, Math.Min(picture, Math.Min(left, rows / 2))), operations == 0 ? 0 : shown);
        }
    }

    private static void DrawSize(Sheet sheet, int row, int rows, Bench bench, Answer answer, Feature feature, Ruler ruler)
    {
        string grade = feature.Class is { } toleranceClass ? toleranceClass.Grade.ToString() : feature.NearestGrade is { } near ? $"as {near}" : "beyond IT18";
        string fit = answer.Request.Mate is { } mate ? FitText(new Fit(answer.Request.First.Limits, mate.Limits), ruler) : "";
        bool fitHasRow = rows > 5;
        string old = bench.Problems.Count > 0 ? $"; answer to: {answer.Line}" : "";
        int titleEnd = sheet.Rule(row, $"{ReadBack.Name(feature, ruler)}{(feature.IsRound ? "" : ", width")}{(fit.Length > 0 && !fitHasRow ? ", " + fit : "")}{old}");
        (string max, string min) = ruler.Limits(feature.Limits);
        string aim = ruler.Aim(Aim(bench, feature), feature.Limits);
        WriteSize(sheet, row + 1, "max", max, ruler, ruler.Upper(feature.Upper));
        WriteSize(sheet, row + 2, "aim", aim, ruler, "");
        WriteSize(sheet, row + 3, "min", min, ruler, ruler.Lower(feature.Lower));
        sheet.Write(1, row + 4, $"tolerance {ruler.Width(feature.Limits.Width)}, {grade}");
        if (fitHasRow)
        {
            sheet.Write(1, row + 5, fit, Ink.Strong);
        }

        int count = row + (fit.Length > 0 ? 6 : 5);
        if (count < row + rows)
        {
            sheet.Write(1, count, LowerText.Count(bench.Plan!), Ink.Caution);
        }

        int width = sheet.Width - NumbersWidth - 1;
        List<Feature> zones = [.. answer.Request.Features];
        ZonePicture.Draw(sheet, NumbersWidth, row, width, zones, Aim(bench, feature), bench.FeatureAt, ruler, titleEnd);
        if (bench.Route is { } route)
        {
            int chain = row + 1 + zones.Count;
            ChainPicture.Draw(sheet, NumbersWidth, chain, width, row + rows - chain, route, feature.IsInternal, bench.Operation, ruler);
        }
    }

    private static string FitText(Fit fit, Ruler ruler) => $"{fit.Character.ToString().ToLowerInvariant()}: {ruler.Clearances(fit)}";

    private static void WriteSize(Sheet sheet, int row, string name, string size, Ruler ruler, string deviation)
    {
        sheet.Write(1, row, name);
        sheet.Write(6, row, size, Ink.Strong);
        sheet.Write(6 + size.Length + 1, row, ruler.Name);
        sheet.WriteBefore(NumbersWidth - 2, row, deviation);
    }

    /// <summary>The aim of the operation that makes the drawing's size, or the middle where none is planned.</summary>
    internal static Length Aim(Bench bench, Feature feature) =>
        bench.Route?.Operations.LastOrDefault(operation => operation.Aim is not null && operation.Size == feature.Limits)?.Aim ?? feature.Limits.Middle;

    private static void DrawRoute(Sheet sheet, int row, int rows, Bench bench, Plan plan, Route route, Ruler ruler)
    {
        string gap = route.Rank > 1 ? $", {new Money(route.ShownCost.Amount - plan.Routes[0].ShownCost.Amount, route.ShownCost.Currency).Format()} dearer" : "";
        string currency = route.ShownCost.Currency;
        Money lot = route.ShownCost with { Amount = route.ShownCost.Amount * plan.Job.Quantity };
        sheet.Rule(row, $"route {route.Rank} of {plan.Routes.Count}{gap}: {route.ShownCost} a piece, {lot} for {plan.Job.Quantity}");
        List<string[]> cells = [.. route.Operations.Select(operation => Cells(operation, ruler))];
        Table table = new(Columns(ruler, currency), cells, sheet.Width - 2, sheet.Pen);
        table.WriteHead(sheet, 2, row + 1);
        int first = Math.Clamp(bench.OperationAt - rows / 2, 0, Math.Max(0, cells.Count - rows));
        if (bench.OperationAt - first >= rows)
        {
            first = bench.OperationAt - rows + 1;
        }

        for (int at = first; at < cells.Count && at < first + rows; at++)
        {
            bool chosen = at == bench.OperationAt;
            Ink ink = chosen ? bench.Hand == Hand.Route ? Ink.Chosen : Ink.Strong : Ink.Plain;
            table.WriteRow(sheet, 2, row + 2 + at - first, at, ink);
            sheet.Mark(row + 2 + at - first, at);
            if (chosen)
            {
                sheet.Put(0, row + 2 + at - first, sheet.Pen.Pointer, Ink.Strong);
            }
        }

        string hidden = rows < cells.Count ? $"{cells.Count} operations " : "";
        string yield = string.Create(CultureInfo.InvariantCulture, $"yield {route.Yield * 100:0.0} %");
        sheet.Write(2, row + 2 + rows,
            sheet.Shorten($"{hidden}from {route.From}: start {route.Blanks}, {yield}, {route.ShownMinutes} a piece, set-up {route.SetUp}", sheet.Width - 2), Ink.Strong);
    }

    private static Column[] Columns(Ruler ruler, string currency) =>
    [
        new("no", 2, true, 0),
        new("process", 17, false, 0),
        new("machine", 10, false, 4),
        new("tool", 12, false, 3),
        new($"size {ruler.Name}", 13, true, 0),
        new("aim", 7, true, 2),
        new("stock", 11, true, 1),
        new(ruler.IsInch ? "Ra µin" : "Ra", 4, true, 0),
        new("min", 5, true, 0),
        new(currency, 5, true, 0),
    ];

    private static string[] Cells(Operation operation, Ruler ruler) =>
    [
        $"{operation.Number}",
        operation.Process,
        operation.Machine,
        operation.Tool?.Label ?? "",
        operation.Size is { } size ? ruler.Range(size) : "",
        operation is { Aim: { } aim, Size: { } held } ? ruler.Aim(aim, held) : "",
        operation is { StockMin: { } least, StockMax: { } most } ? ruler.Stock(least, most) : "",
        operation.Ra is { } ra ? ruler.Ra(ra) : "",
        operation.Minutes.Format(),
        operation.Cost.Format(),
    ];

    /// <summary>The lower text with its heading; a mark says that there is more of it, and where there is room the notes stand below the reasons.</summary>
    private static void DrawBelow(Sheet sheet, int row, int rows, Bench bench, Plan plan)
    {
        if (rows < 2)
        {
            return;
        }

        if (bench.Below == Below.Notes)
        {
            if (plan.Refusal is { } refusal && bench.Route is null && rows > 2)
            {
                sheet.Rule(row++, $"no route: {refusal.Message}", Ink.Problem);
                rows--;
            }

            DrawText(sheet, row, rows, bench, "notes", Ink.Heading, LowerText.Notes(plan));
            return;
        }

        int used = bench.Operation is { } operation
            ? DrawText(sheet, row, rows, bench, OperationTitle(operation, new Ruler(bench.Unit)), Ink.Heading, LowerText.Reasons(operation, bench.Unit))
            : DrawText(sheet, row, rows, bench, "no route", Ink.Problem, LowerText.Refusal(plan.Refusal!));
        if (rows - used >= LeastBelow)
        {
            DrawText(sheet, row + used, rows - used, bench, "notes", Ink.Heading, LowerText.Notes(plan), "F6");
        }
    }

    /// <returns>The rows used.</returns>
    private static int DrawText(Sheet sheet, int row, int rows, Bench bench, string title, Ink ink, IEnumerable<Said> said, string moreBy = "PgDn")
    {
        sheet.Rule(row, sheet.Shorten(title, sheet.Width - 24), ink);
        List<(string Head, string Line, Ink Ink)> lines = [.. LowerText.Lines(sheet, said)];
        int room = rows - 1;
        bench.LimitScroll(lines.Count - room);
        for (int at = 0; at < room && bench.Scroll + at < lines.Count; at++)
        {
            (string head, string line, Ink look) = lines[bench.Scroll + at];
            sheet.Write(1, row + 1 + at, head, look);
            sheet.Write(LowerText.HeadWidth, row + 1 + at, line, look);
        }

        int hidden = lines.Count - bench.Scroll - room;
        if (hidden > 0)
        {
            sheet.WriteBefore(sheet.Width - 1, row, $" {hidden} more {sheet.Pen.More} {moreBy} ", Ink.Faint);
        }

        return 1 + Math.Min(room, lines.Count);
    }

    private static string OperationTitle(Operation operation, Ruler ruler)
    {
        string aim = operation is { Aim: { } at, Size: { } held } ? $", aim {ruler.Aim(at, held)} {ruler.Name}" : "";
        string tool = operation.Tool is { } used ? $", {used.Label}" : "";
        return $"{operation.Number} {operation.Process}: {operation.Machine}{tool}{aim}";
    }

    private static void DrawKeys(Sheet sheet, Bench bench)
    {
        string unit = bench.Unit == LengthUnit.Inch ? "mm" : "inch";
        string below = bench.Below == Below.Notes ? "why" : "notes";
        string mate = bench.IsFit ? "F9 mate" : "";
        string hand = bench.Hand == Hand.Line ? "Tab route" : "Tab line";
        string[] keys = ["F1 help", "F2 " + unit, "F3 big", "F4 route", "F5 new", "F6 " + below, mate, hand, bench.Hand == Hand.Route ? "? keys" : "", "Ctrl+Q leave"];
        List<string> named = [.. keys.Where(static key => key.Length > 0)];
        string[] ways =
        [
            string.Join("  ", named),
            string.Join(' ', named),
            string.Join(' ', [.. named.SkipLast(1), "Ctrl+Q"]),
            string.Join(' ', ["F1 help", "F2 " + unit, "F3 big", "F4 route", "F5 new", "F6 " + below, mate.Length > 0 ? "F9" : "Tab", "Ctrl+Q"]),
        ];
        sheet.Write(0, sheet.Height - 1, sheet.Shorten(ways.FirstOrDefault(way => way.Length <= sheet.Width) ?? ways[^1], sheet.Width), Ink.Faint);
    }
}
