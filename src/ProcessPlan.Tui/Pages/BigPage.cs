using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <summary>Max, aim and min in digits that fill the screen.</summary>
internal static class BigPage
{
    private const int NameWidth = 6;

    public static void Draw(Sheet sheet, Bench bench)
    {
        Ruler ruler = new(bench.Unit);
        sheet.Write(0, sheet.Height - 1, sheet.Shorten("Up/Down other size  F2 unit  F9 mate  Esc back  Ctrl+Q leave", sheet.Width), Ink.Faint);
        if (bench is not { Answer: { } answer, Feature: { } feature })
        {
            sheet.Write(0, 1, "No feature has been read yet.");
            return;
        }

        Operation? operation = bench.BigDrawing ? null : bench.Operation;
        string title = operation is null ? $"drawing: {ReadBack.Name(feature, ruler)}" : $"{operation.Number} {operation.Process}, {operation.Machine}";
        sheet.Write(0, 0, sheet.Shorten(title, sheet.Width - 12), Ink.Heading);
        sheet.WriteBefore(sheet.Width, 0, ruler.Name, Ink.Heading);
        if (!bench.IsCurrent)
        {
            sheet.Write(0, 1, sheet.Shorten("answer to: " + answer.Line, sheet.Width), Ink.Strong);
        }

        if ((operation is null ? feature.Limits : operation.Size) is not { } window)
        {
            sheet.Write(0, 2, "No size is made here.");
            return;
        }

        Length aim = operation?.Aim ?? window.Middle;
        (string max, string min) = ruler.Limits(window);
        (string Name, string Size)[] sizes = [("max", max), ("aim", ruler.Aim(aim, window)), ("min", min)];
        int rows = (sheet.Height - 3) / sizes.Length;
        int widest = sizes.Max(static size => BlockDigits.Width(size.Size, 1));
        int scale = Math.Min((rows - 1) / BlockDigits.Height, (sheet.Width - NameWidth - 4) / widest);
        for (int at = 0; at < sizes.Length; at++)
        {
            (string name, string size) = sizes[at];
            int y = 2 + at * rows;
            int middle = y + Math.Max(0, scale * BlockDigits.Height / 2);
            sheet.Write(0, middle, name, Ink.Strong);
            if (scale >= 1)
            {
                BlockDigits.Write(sheet, NameWidth, y, size, scale, Ink.Strong);
                sheet.Write(NameWidth + BlockDigits.Width(size, scale) + 2, y + scale * BlockDigits.Height - 1, ruler.Name, Ink.Strong);
            }
            else
            {
                sheet.Write(NameWidth, middle, $"{size} {ruler.Name}", Ink.Strong);
            }
        }
    }
}
