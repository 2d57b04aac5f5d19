using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <param name="Title">Head of the column.</param>
/// <param name="Least">Cells that it has at least.</param>
/// <param name="Number">Numbers stand at the right of their column.</param>
/// <param name="Rank">Columns of a higher rank go first where the room is short; 0 never goes.</param>
internal sealed record Column(string Title, int Least, bool Number, int Rank);

/// <summary>A table whose columns are as wide as their texts, without those that find no room.</summary>
internal sealed class Table
{
    private readonly IReadOnlyList<Column> _columns;
    private readonly IReadOnlyList<string[]> _rows;
    private readonly int[] _widths;

    public Table(IReadOnlyList<Column> columns, IReadOnlyList<string[]> rows, int width, Pen pen)
    {
        _columns = columns;
        _rows = [.. rows.Select(row => row.Select(pen.Put).ToArray())];
        _widths = [.. columns.Select((column, at) => Math.Max(column.Least, _rows.Select(row => row[at].Length).Append(column.Title.Length).Max()))];
        while (Needed > width && columns.Select((column, at) => (column.Rank, at)).Where(item => item.Rank > 0 && _widths[item.at] > 0).ToList() is { Count: > 0 } left)
        {
            _widths[left.MaxBy(static item => item.Rank).at] = 0;
        }
    }

    private int Needed => _widths.Sum(static width => width > 0 ? width + 1 : 0) - 1;

    public void WriteHead(Sheet sheet, int x, int y) => Write(sheet, x, y, [.. _columns.Select(static column => column.Title)], Ink.Faint);

    public void WriteRow(Sheet sheet, int x, int y, int row, Ink ink)
    {
        sheet.Write(x, y, new string(' ', Needed), ink);
        Write(sheet, x, y, _rows[row], ink);
    }

    private void Write(Sheet sheet, int x, int y, string[] cells, Ink ink)
    {
        for (int at = 0; at < cells.Length; at++)
        {
            if (_widths[at] == 0)
            {
                continue;
            }

            if (_columns[at].Number)
            {
                sheet.WriteBefore(x + _widths[at], y, cells[at], ink);
            }
            else
            {
                sheet.Write(x, y, cells[at], ink);
            }

            x += _widths[at] + 1;
        }
    }
}
