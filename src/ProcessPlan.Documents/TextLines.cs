namespace ProcessPlan.Documents;

/// <summary>Plain text of at most eighty columns.</summary>
internal static class TextLines
{
    public const int Width = 80;

    /// <summary>Writes words, broken at spaces, each line indented; a word longer than a line is broken where the line ends.</summary>
    public static void Write(TextWriter target, string text, int indent)
    {
        int room = Width - indent;
        ReadOnlySpan<char> rest = text;
        while (rest.Length > room)
        {
            int space = rest[..(room + 1)].LastIndexOf(' ');
            int end = space > 0 ? space : room;
            WriteLine(target, rest[..end], indent);
            rest = rest[end..].TrimStart(' ');
        }

        WriteLine(target, rest, indent);
    }

    private static void WriteLine(TextWriter target, ReadOnlySpan<char> line, int indent)
    {
        for (int i = 0; i < indent; i++)
        {
            target.Write(' ');
        }

        target.WriteLine(line);
    }
}
