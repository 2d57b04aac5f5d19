using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Features;

/// <summary>The feature line: a feature as it is spoken, in any order, read whole or not at all.</summary>
public static class FeatureLine
{
    /// <summary>Longest line that is read.</summary>
    public const int MostCharacters = 1000;

    /// <summary>Reads one line.</summary>
    /// <param name="line">The line; letter case matters in a tolerance class only.</param>
    /// <param name="materials">The materials that may be named.</param>
    /// <returns>One feature, or two for a fit; or every problem of the line, in the order of their places.</returns>
    public static Parsed<FeatureRequest> Parse(ReadOnlySpan<char> line, MaterialNames materials)
    {
        if (line.IsWhiteSpace())
        {
            return Parsed<FeatureRequest>.Failed([new Problem("The line is empty.", 0, line.Length, "a feature, such as hole 25H7 x40 thru")]);
        }

        if (line.Length > MostCharacters)
        {
            return Parsed<FeatureRequest>.Failed([new Problem(
                $"The line has {line.Length} characters.", MostCharacters, line.Length - MostCharacters, $"at most {MostCharacters} characters")]);
        }

        FeatureLineReader reader = new(line, materials);
        reader.Read();
        return reader.Build();
    }
}
