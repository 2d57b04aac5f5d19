namespace ProcessPlan.Core.Features;

/// <summary>Finds what a mistyped word was probably meant to be.</summary>
internal static class Spelling
{
    private const int Longest = 40;

    /// <summary>The known word with the fewest changed letters, if there are at most two and fewer than half of the word, two exchanged
    /// neighbours counting once; of equals the first.</summary>
    public static string? Nearest(ReadOnlySpan<char> text, params ReadOnlySpan<IReadOnlyCollection<string>> lists)
    {
        string? best = null;
        int limit = Math.Min(2, (text.Length - 1) / 2) + 1;
        foreach (IReadOnlyCollection<string> list in lists)
        {
            foreach (string known in list)
            {
                int changes = IsExchange(text, known) ? Math.Min(1, limit) : Changes(text, known, limit);
                if (changes < limit)
                {
                    (best, limit) = (known, changes);
                }
            }
        }

        return best;
    }

    /// <summary>Levenshtein distance without regard to case, or <paramref name="limit"/> where it is not below that.</summary>
    private static int Changes(ReadOnlySpan<char> a, ReadOnlySpan<char> b, int limit)
    {
        if (a.Length > Longest || b.Length > Longest || Math.Abs(a.Length - b.Length) >= limit)
        {
            return limit;
        }

        Span<int> row = stackalloc int[Longest + 1];
        for (int j = 0; j <= b.Length; j++)
        {
            row[j] = j;
        }

        for (int i = 1; i <= a.Length; i++)
        {
            // Cells further from the diagonal than the limit cannot come below it.
            int from = Math.Max(1, i - limit + 1);
            int to = Math.Min(b.Length, i + limit - 1);
            int diagonal = row[from - 1];
            int left = from == 1 ? i : limit;
            int least = left;
            row[from - 1] = left;
            for (int j = from; j <= to; j++)
            {
                int above = row[j];
                left = Math.Min(Math.Min(above, left) + 1, diagonal + (IsSame(a[i - 1], b[j - 1]) ? 0 : 1));
                (diagonal, row[j]) = (above, left);
                least = Math.Min(least, left);
            }

            if (least >= limit)
            {
                return limit;
            }
        }

        return Math.Min(row[b.Length], limit);
    }

    /// <summary>Whether the words differ in two neighbouring letters that have changed places: "hoel".</summary>
    private static bool IsExchange(ReadOnlySpan<char> a, ReadOnlySpan<char> b)
    {
        int at = 0;
        while (at < a.Length && at < b.Length && IsSame(a[at], b[at]))
        {
            at++;
        }

        return a.Length == b.Length && at + 1 < a.Length && IsSame(a[at], b[at + 1]) && IsSame(a[at + 1], b[at])
            && a[(at + 2)..].Equals(b[(at + 2)..], StringComparison.OrdinalIgnoreCase);
    }

    private static bool IsSame(char a, char b) => a == b || ((a ^ b) == ('a' ^ 'A') && char.IsAsciiLetter(a));
}
