namespace ProcessPlan.Core.Features;

/// <summary>The words that a feature line knows, apart from materials.</summary>
internal enum FeatureWord
{
    None,
    Hole,
    Shaft,
    Slot,
    Tongue,
    Kind,
    Size,
    Diameter,
    Tolerance,
    Extent,
    Through,
    Blind,
    End,
    Bottom,
    Wall,
    OuterDiameter,
    Interrupted,
    Ra,
    Rz,
    Material,
    Hardness,
    Hardened,
    Case,
    Nitrided,
    Coat,
    Before,
    After,
    Limits,
    Cylindricity,
    Roundness,
    Runout,
    Coaxiality,
    Position,
    Perpendicularity,
    Solid,
    Cast,
    Cored,
    Bar,
    Start,
    Off,
    Millimetre,
    Inch,
    Unit,
    GeneralTolerance,
}

internal static class FeatureWords
{
    private static readonly Dictionary<string, FeatureWord> ByText = new(StringComparer.OrdinalIgnoreCase)
    {
        ["hole"] = FeatureWord.Hole,
        ["bore"] = FeatureWord.Hole,
        ["shaft"] = FeatureWord.Shaft,
        ["pin"] = FeatureWord.Shaft,
        ["slot"] = FeatureWord.Slot,
        ["keyway"] = FeatureWord.Slot,
        ["tongue"] = FeatureWord.Tongue,
        ["key"] = FeatureWord.Tongue,
        ["kind"] = FeatureWord.Kind,
        ["size"] = FeatureWord.Size,
        ["nominal"] = FeatureWord.Size,
        ["width"] = FeatureWord.Size,
        ["dia"] = FeatureWord.Diameter,
        ["diameter"] = FeatureWord.Diameter,
        ["d"] = FeatureWord.Diameter,
        ["tol"] = FeatureWord.Tolerance,
        ["tolerance"] = FeatureWord.Tolerance,
        ["class"] = FeatureWord.Tolerance,
        ["x"] = FeatureWord.Extent,
        ["×"] = FeatureWord.Extent,
        ["*"] = FeatureWord.Extent,
        ["depth"] = FeatureWord.Extent,
        ["deep"] = FeatureWord.Extent,
        ["length"] = FeatureWord.Extent,
        ["long"] = FeatureWord.Extent,
        ["thru"] = FeatureWord.Through,
        ["through"] = FeatureWord.Through,
        ["blind"] = FeatureWord.Blind,
        ["end"] = FeatureWord.End,
        ["bottom"] = FeatureWord.Bottom,
        ["wall"] = FeatureWord.Wall,
        ["od"] = FeatureWord.OuterDiameter,
        ["interrupted"] = FeatureWord.Interrupted,
        ["ra"] = FeatureWord.Ra,
        ["rz"] = FeatureWord.Rz,
        ["mat"] = FeatureWord.Material,
        ["material"] = FeatureWord.Material,
        ["hardness"] = FeatureWord.Hardness,
        ["hrc"] = FeatureWord.Hardness,
        ["hb"] = FeatureWord.Hardness,
        ["hv"] = FeatureWord.Hardness,
        ["hardened"] = FeatureWord.Hardened,
        ["case"] = FeatureWord.Case,
        ["nitrided"] = FeatureWord.Nitrided,
        ["coat"] = FeatureWord.Coat,
        ["before"] = FeatureWord.Before,
        ["after"] = FeatureWord.After,
        ["limits"] = FeatureWord.Limits,
        ["cyl"] = FeatureWord.Cylindricity,
        ["cylindricity"] = FeatureWord.Cylindricity,
        ["round"] = FeatureWord.Roundness,
        ["roundness"] = FeatureWord.Roundness,
        ["runout"] = FeatureWord.Runout,
        ["coax"] = FeatureWord.Coaxiality,
        ["coaxiality"] = FeatureWord.Coaxiality,
        ["pos"] = FeatureWord.Position,
        ["position"] = FeatureWord.Position,
        ["perp"] = FeatureWord.Perpendicularity,
        ["perpendicularity"] = FeatureWord.Perpendicularity,
        ["solid"] = FeatureWord.Solid,
        ["cast"] = FeatureWord.Cast,
        ["cored"] = FeatureWord.Cored,
        ["bar"] = FeatureWord.Bar,
        ["start"] = FeatureWord.Start,
        ["off"] = FeatureWord.Off,
        ["qty"] = FeatureWord.Off,
        ["quantity"] = FeatureWord.Off,
        ["pcs"] = FeatureWord.Off,
        ["pieces"] = FeatureWord.Off,
        ["mm"] = FeatureWord.Millimetre,
        ["in"] = FeatureWord.Inch,
        ["inch"] = FeatureWord.Inch,
        ["unit"] = FeatureWord.Unit,
        ["2768-f"] = FeatureWord.GeneralTolerance,
        ["2768-m"] = FeatureWord.GeneralTolerance,
        ["2768-c"] = FeatureWord.GeneralTolerance,
        ["2768-v"] = FeatureWord.GeneralTolerance,
    };

    private static readonly Dictionary<string, FeatureWord>.AlternateLookup<ReadOnlySpan<char>> BySpan =
        ByText.GetAlternateLookup<ReadOnlySpan<char>>();

    public static FeatureWord Find(ReadOnlySpan<char> text) => BySpan.TryGetValue(text, out FeatureWord word) ? word : FeatureWord.None;

    /// <summary>The known word or material with the fewest changed letters, if there are at most two and fewer than half of the word.</summary>
    public static string? Nearest(ReadOnlySpan<char> text, MaterialNames materials)
    {
        string? best = null;
        int least = Math.Min(2, (text.Length - 1) / 2) + 1;
        foreach (string known in ByText.Keys.Concat(materials.Designations))
        {
            int changes = Changes(text, known, least);
            if (changes < least)
            {
                (best, least) = (known, changes);
            }
        }

        return best;
    }

    /// <summary>Levenshtein distance without regard to case, or <paramref name="limit"/> where it is not below that.</summary>
    private static int Changes(ReadOnlySpan<char> a, ReadOnlySpan<char> b, int limit)
    {
        const int Longest = 40;
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
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.Length; j++)
            {
                int same = char.ToLowerInvariant(a[i - 1]) == char.ToLowerInvariant(b[j - 1]) ? 0 : 1;
                (row[j], diagonal) = (Math.Min(Math.Min(row[j] + 1, row[j - 1] + 1), diagonal + same), row[j]);
            }
        }

        return Math.Min(row[b.Length], limit);
    }
}
