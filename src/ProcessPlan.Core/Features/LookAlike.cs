namespace ProcessPlan.Core.Features;

/// <summary>Letters of other scripts that look like Latin ones and slip in by copy or keyboard.</summary>
internal static class LookAlike
{
    private const string Cyrillic = "АВЕЗКМНОРСТХавезкмнорстх";
    private const string CyrillicTwins = "ABE3KMHOPCTXabe3kmhopctx";
    private const string Greek = "ΑΒΕΖΗΙΚΜΝΟΡΤΧακορτυχ";
    private const string GreekTwins = "ABEZHIKMNOPTXakoptux";

    /// <summary>The first such letter of the word.</summary>
    public static (string Script, char Letter, char Latin)? Find(ReadOnlySpan<char> word)
    {
        foreach (char c in word)
        {
            if (Cyrillic.IndexOf(c) is >= 0 and int cyrillic)
            {
                return ("Cyrillic", c, CyrillicTwins[cyrillic]);
            }

            if (Greek.IndexOf(c) is >= 0 and int greek)
            {
                return ("Greek", c, GreekTwins[greek]);
            }
        }

        return null;
    }
}
