namespace ProcessPlan.Core.Features;

/// <summary>The names under which the materials of a shop book may be called in a line. Case, spaces and hyphens do not matter, nor whether
/// a number is written with a point or a comma.</summary>
public sealed class MaterialNames
{
    private const int LongestName = 40;

    private readonly Dictionary<string, string> _designations = new(StringComparer.OrdinalIgnoreCase);
    private readonly Dictionary<string, string>.AlternateLookup<ReadOnlySpan<char>> _bySpan;

    /// <param name="materials">Each material by all its names, the designation first.</param>
    public MaterialNames(IEnumerable<IReadOnlyList<string>> materials)
    {
        _bySpan = _designations.GetAlternateLookup<ReadOnlySpan<char>>();
        List<string> designations = [];
        foreach (IReadOnlyList<string> names in materials)
        {
            designations.Add(names[0]);
            foreach (string name in names)
            {
                Add(name, names[0]);
            }
        }

        Designations = designations;
    }

    public static MaterialNames None { get; } = new([]);

    /// <summary>Each material once, in the order of the shop book.</summary>
    public IReadOnlyList<string> Designations { get; }

    public bool TryFind(ReadOnlySpan<char> name, out string designation)
    {
        designation = "";
        if (name.Length is 0 or > LongestName)
        {
            return false;
        }

        Span<char> folded = stackalloc char[LongestName];
        int length = Fold(name, folded);
        bool found = _bySpan.TryGetValue(folded[..length], out string? known) || TryWithoutTemper(folded[..length], out known);
        designation = known ?? "";
        return found;
    }

    /// <summary>
    /// The first designation one of whose names has these characters in it, or begins them: "S235" and "St37-2". Null for fewer than three
    /// characters, and for names of fewer than four.
    /// </summary>
    public string? Containing(ReadOnlySpan<char> part)
    {
        const int Least = 3;
        const int LeastOfName = 4;
        if (part.Length > LongestName)
        {
            return null;
        }

        Span<char> folded = stackalloc char[LongestName];
        int length = Fold(part, folded);
        foreach ((string name, string designation) in _designations)
        {
            if (length >= Least && name.AsSpan().Contains(folded[..length], StringComparison.OrdinalIgnoreCase))
            {
                return designation;
            }
        }

        foreach ((string name, string designation) in _designations)
        {
            if (name.Length >= LeastOfName && folded[..length].StartsWith(name, StringComparison.OrdinalIgnoreCase))
            {
                return designation;
            }
        }

        return null;
    }

    /// <summary>"6061-T6", "EN AW-7075 T651": an aluminium with its temper, which the shop book does not tell apart.</summary>
    private bool TryWithoutTemper(ReadOnlySpan<char> folded, out string? designation)
    {
        const int AlloyDigits = 4;
        const int MostTemperDigits = 4;
        designation = null;
        int mark = folded.LastIndexOfAny('T', 't');
        ReadOnlySpan<char> temper = folded[(mark + 1)..];
        return mark >= AlloyDigits
            && temper.Length is > 0 and <= MostTemperDigits && temper.IndexOfAnyExceptInRange('0', '9') < 0
            && folded[(mark - AlloyDigits)..mark].IndexOfAnyExceptInRange('0', '9') < 0
            && _bySpan.TryGetValue(folded[..mark], out designation)
            && designation.StartsWith("EN-A", StringComparison.OrdinalIgnoreCase);
    }

    private void Add(string name, string designation)
    {
        Span<char> folded = stackalloc char[LongestName];
        if (name.Length > LongestName)
        {
            throw new ArgumentException($"The material name '{name}' is longer than {LongestName} characters.", nameof(name));
        }

        int length = Fold(name, folded);
        _designations.TryAdd(folded[..length].ToString(), designation);
    }

    private static int Fold(ReadOnlySpan<char> name, Span<char> folded)
    {
        int length = 0;
        foreach (char c in name)
        {
            if (c is not ' ' and not '-' and not '_')
            {
                folded[length++] = c == ',' ? '.' : c;
            }
        }

        return length;
    }
}
