namespace ProcessPlan.Documents;

/// <summary>A small table of figures: labels at the left, every column aligned at its decimal point.</summary>
internal sealed class TextTable
{
    private const string Gap = "    ";

    private readonly string[] _lines;

    public TextTable(params string[] labels)
    {
        int width = 0;
        foreach (string label in labels)
        {
            width = Math.Max(width, label.Length);
        }

        _lines = new string[labels.Length + 1];
        _lines[0] = new string(' ', width + 2);
        for (int i = 0; i < labels.Length; i++)
        {
            _lines[i + 1] = "  " + labels[i].PadRight(width);
        }
    }

    /// <summary>Adds a column with its unit above it.</summary>
    public void Add(string head, params string[] cells)
    {
        int fraction = 0;
        foreach (string cell in cells)
        {
            fraction = Math.Max(fraction, Fraction(cell));
        }

        int width = head.Length;
        foreach (string cell in cells)
        {
            width = Math.Max(width, cell.Length + fraction - Fraction(cell));
        }

        _lines[0] += Gap + head.PadLeft(width);
        for (int i = 0; i < cells.Length; i++)
        {
            _lines[i + 1] += Gap + (cells[i] + new string(' ', fraction - Fraction(cells[i]))).PadLeft(width);
        }
    }

    public void Write(TextWriter target, string remark)
    {
        target.WriteLine((_lines[0] + Gap + remark).TrimEnd());
        for (int i = 1; i < _lines.Length; i++)
        {
            target.WriteLine(_lines[i].TrimEnd());
        }
    }

    /// <summary>Length of the decimal point and what stands behind it.</summary>
    private static int Fraction(string cell) => cell.IndexOf('.', StringComparison.Ordinal) is >= 0 and int point ? cell.Length - point : 0;
}
