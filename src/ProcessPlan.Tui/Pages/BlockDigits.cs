using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <summary>Digits five cells high, or a whole multiple of it, to be read from two metres.</summary>
internal static class BlockDigits
{
    public const int Height = 5;

    private const string Characters = "0123456789.-";

    // Each row holds the twelve characters in the order above; full stops are empty cells.
    private static readonly string[] Rows =
    [
        "#### ..#. #### #### #..# #### #### #### #### #### .. ....",
        "#..# .##. ...# ...# #..# #... #... ...# #..# #..# .. ....",
        "#..# ..#. #### .### #### #### #### ..#. #### #### .. ####",
        "#..# ..#. #... ...# ...# ...# #..# .#.. #..# ...# .. ....",
        "#### .### #### #### ...# #### #### .#.. #### #### ## ....",
    ];

    /// <summary>Cells across of a text of digits, with one empty column between them.</summary>
    public static int Width(string text, int scale) => (text.Sum(static c => Cell(c, 0).Length + 1) - 1) * scale;

    /// <exception cref="ArgumentException">There is no such digit.</exception>
    public static void Write(Sheet sheet, int x, int y, string text, int scale, Ink ink)
    {
        foreach (char c in text)
        {
            for (int row = 0; row < Height * scale; row++)
            {
                string cells = Cell(c, row / scale);
                for (int column = 0; column < cells.Length * scale; column++)
                {
                    if (cells[column / scale] == '#')
                    {
                        sheet.Put(x + column, y + row, sheet.Pen.Block, ink);
                    }
                }
            }

            x += (Cell(c, 0).Length + 1) * scale;
        }
    }

    private static string Cell(char c, int row)
    {
        int at = Characters.IndexOf(c, StringComparison.Ordinal);
        return at >= 0 ? Rows[row].Split(' ')[at] : throw new ArgumentException($"'{c}' is no digit.", nameof(c));
    }
}
