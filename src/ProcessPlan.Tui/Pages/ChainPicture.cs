using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <summary>
/// The chain of size windows: how much metal each operation still leaves on, against the least-metal size of the route. Each main mark of the ruler
/// is ten times the next one, so that roughing and finishing can both be seen; the last micrometre runs out evenly to zero.
/// </summary>
internal static class ChainPicture
{
    private const int NameWidth = 4;

    /// <summary>The part of a decade below which the ruler turns from tens to even: 1 µm, or a ten-thousandth of an inch.</summary>
    private static double Even(Ruler ruler) => ruler.IsInch ? 2_540_000 : Length.PicometresPerMicrometre;

    /// <summary>Draws a ruler and under it one bar an operation, the last ones where there are too many, and what it is where a row is left.</summary>
    public static void Draw(Sheet sheet, int x, int y, int width, int rows, Route route, bool isInternal, Operation? lookedAt, Ruler ruler)
    {
        List<Operation> sized = [.. route.Operations.Where(static operation => operation.Size is not null)];
        int from = x + NameWidth;
        int columns = width - NameWidth;
        if (sized.Count == 0 || columns < 20 || rows < 2)
        {
            return;
        }

        long Metal(Length size) => isInternal ? -size.Picometres : size.Picometres;
        long none = sized.Min(operation => Metal(isInternal ? operation.Size!.Value.Max : operation.Size!.Value.Min));
        long most = sized.Max(operation => Metal(isInternal ? operation.Size!.Value.Min : operation.Size!.Value.Max)) - none;
        double even = Even(ruler);
        double full = Math.Log10(1 + most / even);
        int Column(long metal) => from + (int)Math.Round((columns - 1) * (1 - Math.Log10(1 + metal / even) / Math.Max(full, 1e-9)));

        DrawRuler(sheet, x, y, from + columns, most, Column, ruler);
        foreach (Operation operation in sized.TakeLast(rows - 1))
        {
            y++;
            SizeWindow size = operation.Size!.Value;
            int start = Column(Metal(isInternal ? size.Min : size.Max) - none);
            int end = Math.Max(start, Column(Metal(isInternal ? size.Max : size.Min) - none));
            bool looked = operation == lookedAt;
            sheet.WriteBefore(from - 1, y, $"{operation.Number}", looked ? Ink.Strong : Ink.Plain);
            bool finish = operation == sized[^1];
            for (int column = start; column <= end; column++)
            {
                sheet.Put(column, y, finish ? sheet.Pen.Zone : sheet.Pen.Metal, finish ? Ink.Zone : Ink.Metal);
            }

            if (looked)
            {
                sheet.Put(x, y, sheet.Pen.Pointer, Ink.Strong);
            }
        }

        if (sized.Count + 1 < rows)
        {
            sheet.WriteBefore(from + columns, y + 1, $"{ruler.Name} of metal left on, in tenfold steps", Ink.Faint);
        }
    }

    private static void DrawRuler(Sheet sheet, int x, int y, int end, long most, Func<long, int> column, Ruler ruler)
    {
        sheet.WriteBefore(end, y, "0", Ink.Faint);
        int free = end - 2;
        long unit = ruler.IsInch ? Length.PicometresPerInch : Length.PicometresPerMillimetre;
        for (long mark = unit / (ruler.IsInch ? 1000 : 100); mark <= most; mark *= 10)
        {
            int at = column(mark);
            string text = ruler.Plain(new Length(mark));
            if (at + text.Length < free && at >= x)
            {
                sheet.Write(at, y, text, Ink.Faint);
                free = at - 1;
            }
        }
    }
}
