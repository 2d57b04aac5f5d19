namespace ProcessPlan.Tui.Paper;

/// <summary>A screen of characters with their inks, drawn on before it is shown; whatever does not fit is cut off.</summary>
internal sealed class Sheet
{
    private readonly char[] _characters;
    private readonly Ink[] _inks;
    private readonly Dictionary<int, int> _operations = [];

    public Sheet(int width, int height, Pen pen)
    {
        (Width, Height, Pen) = (width, height, pen);
        _characters = new char[width * height];
        _inks = new Ink[width * height];
        Array.Fill(_characters, ' ');
    }

    public int Width { get; }

    public int Height { get; }

    public Pen Pen { get; }

    public ReadOnlySpan<char> Row(int y) => _characters.AsSpan(y * Width, Width);

    public ReadOnlySpan<Ink> Inks(int y) => _inks.AsSpan(y * Width, Width);

    /// <summary>Notes that a row shows an operation, for a click to find it.</summary>
    public void Mark(int row, int operation) => _operations[row] = operation;

    public int? OperationAt(int row) => _operations.TryGetValue(row, out int operation) ? operation : null;

    public void Put(int x, int y, char c, Ink ink = Ink.Plain)
    {
        if (x >= 0 && x < Width && y >= 0 && y < Height)
        {
            _characters[y * Width + x] = c;
            _inks[y * Width + x] = ink;
        }
    }

    /// <returns>The column behind the text.</returns>
    public int Write(int x, int y, string text, Ink ink = Ink.Plain)
    {
        string put = Pen.Put(text);
        for (int i = 0; i < put.Length; i++)
        {
            Put(x + i, y, put[i], ink);
        }

        return x + put.Length;
    }

    /// <summary>Writes so that the text ends before a column.</summary>
    public void WriteBefore(int end, int y, string text, Ink ink = Ink.Plain)
    {
        string put = Pen.Put(text);
        Write(end - put.Length, y, put, ink);
    }

    /// <summary>A line across the sheet, with a title standing in it.</summary>
    /// <returns>The column behind the title.</returns>
    public int Rule(int y, string title, Ink ink = Ink.Heading)
    {
        for (int x = 0; x < Width; x++)
        {
            Put(x, y, Pen.Line, Ink.Faint);
        }

        return title.Length > 0 ? Write(2, y, $" {Shorten(title, Width - 6)} ", ink) : 0;
    }

    /// <summary>The text, or its beginning with an ellipsis where it is longer than <paramref name="width"/>.</summary>
    public string Shorten(string text, int width)
    {
        string put = Pen.Put(text);
        string ellipsis = Pen.Put("…");
        return put.Length <= width ? put : width <= ellipsis.Length ? "" : put[..(width - ellipsis.Length)] + ellipsis;
    }

    /// <summary>Breaks a text at spaces into lines of at most <paramref name="width"/> cells.</summary>
    public IEnumerable<string> Wrap(string text, int width)
    {
        string rest = Pen.Put(text);
        width = Math.Max(width, 1);
        while (rest.Length > width)
        {
            int space = rest.LastIndexOf(' ', width);
            int cut = space > 0 ? space : width;
            yield return rest[..cut];
            rest = rest[cut..].TrimStart(' ');
        }

        yield return rest;
    }

    /// <summary>Empties whole rows.</summary>
    public void Clear(int fromRow, int rows)
    {
        for (int y = fromRow; y < fromRow + rows; y++)
        {
            Write(0, y, new string(' ', Width));
            _operations.Remove(y);
        }
    }

    /// <summary>Takes the ink from a part of the sheet, so that it reads as not valid now.</summary>
    public void Fade(int fromRow, int rows)
    {
        for (int at = fromRow * Width; at < Math.Min((fromRow + rows) * Width, _inks.Length); at++)
        {
            _inks[at] = Ink.Faint;
        }
    }
}
