using ProcessPlan.Core.Features;
using ProcessPlan.Core.Values;
using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <summary>Tolerance zones to scale, side by side on one ruler with the zero line, as wide as the room allows.</summary>
internal static class ZonePicture
{
    private const int NameWidth = 5;

    /// <param name="sheet">Where to draw.</param>
    /// <param name="x">First column.</param>
    /// <param name="y">First row; one row for the zero mark, then one a zone.</param>
    /// <param name="width">Columns.</param>
    /// <param name="zones">The features, all of one nominal size.</param>
    /// <param name="aim">The size aimed at in the zone looked at.</param>
    /// <param name="lookedAt">Which of the zones has the aim.</param>
    /// <param name="ruler">The unit.</param>
    /// <param name="titleEnd">Column behind what stands already in the row of the zero mark.</param>
    public static void Draw(Sheet sheet, int x, int y, int width, IReadOnlyList<Feature> zones, Length aim, int lookedAt, Ruler ruler, int titleEnd)
    {
        int left = zones.Max(zone => ruler.Lower(zone.Lower).Length) + 2;
        int right = zones.Max(zone => ruler.Upper(zone.Upper).Length) + 2;
        int from = x + NameWidth + left;
        int columns = width - NameWidth - left - right;
        if (columns < 8)
        {
            return;
        }

        long low = Math.Min(0, zones.Min(static zone => zone.Lower.Picometres));
        long high = Math.Max(0, zones.Max(static zone => zone.Upper.Picometres));
        int Column(Deviation deviation) => from + (int)((double)(deviation.Picometres - low) / Math.Max(1, high - low) * (columns - 1) + 0.5);

        int zero = Column(default);
        if (zero > titleEnd)
        {
            sheet.Write(zero, y, "0", Ink.Faint);
        }

        for (int row = 0; row < zones.Count; row++)
        {
            Feature zone = zones[row];
            int at = y + 1 + row;
            int first = Column(zone.Lower);
            int last = Math.Max(Column(zone.Upper), first);
            sheet.Write(x, at, zone.Class?.ToString() ?? zone.Kind.Word());
            sheet.Put(zero, at, sheet.Pen.ZeroLine, Ink.Faint);
            for (int column = first; column <= last; column++)
            {
                sheet.Put(column, at, sheet.Pen.Zone, Ink.Zone);
            }

            sheet.WriteBefore((zero < first && zero > first - left ? zero : first) - 1, at, ruler.Lower(zone.Lower));
            sheet.Write((zero > last && zero < last + right ? zero : last) + 2, at, ruler.Upper(zone.Upper));
            if (row == lookedAt)
            {
                if (zones.Count > 1)
                {
                    sheet.Put(x - 1, at, sheet.Pen.Pointer, Ink.Strong);
                }

                sheet.Put(Column(aim - zone.Nominal), at, sheet.Pen.Aim, Ink.Strong);
            }
        }
    }
}
