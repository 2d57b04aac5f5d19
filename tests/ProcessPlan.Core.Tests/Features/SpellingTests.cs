using CsCheck;
using ProcessPlan.Core.Features;

namespace ProcessPlan.Core.Tests.Features;

public sealed class SpellingTests
{
    private static readonly string[] Known = ["thru", "through", "depth", "blind", "hardened", "42CrMo4"];

    [Theory]
    [InlineData("dpeth", "depth")]
    [InlineData("DEPTHS", "depth")]
    [InlineData("tru", "thru")]
    [InlineData("trhu", "thru")]
    [InlineData("BLNID", "blind")]
    [InlineData("rhtu", null)]
    [InlineData("throu", "thru")]
    [InlineData("hardend", "hardened")]
    [InlineData("42CrMo", "42CrMo4")]
    [InlineData("blnd", "blind")]
    [InlineData("ab", null)]
    [InlineData("t", null)]
    [InlineData("", null)]
    [InlineData("interrupted", null)]
    public void Nearest_MistypedWord_IsTheKnownOne(string text, string? nearest) => Spelling.Nearest(text, Known).Should().Be(nearest);

    [Fact]
    public void Nearest_SeveralLists_TakesTheFirstOfEquals()
    {
        Spelling.Nearest("slat", ["slot", "salt"], ["flat"]).Should().Be("slot");
        Spelling.Nearest("slat", ["xxxx"], ["flat"]).Should().Be("flat");
    }

    [Fact]
    public void Nearest_AnyTwoWords_CountsTheChangesAsTheTextbookDoes()
    {
        Gen<string> word = Gen.Char["abAB1µ"].Array[1, 8].Select(static letters => new string(letters));
        Gen.Select(word, word).Sample(static (text, known) =>
        {
            string small = text.ToLowerInvariant();
            string smallKnown = known.ToLowerInvariant();
            int changes = Math.Min(Textbook(small, smallKnown), Exchanges(small).Contains(smallKnown) ? 1 : int.MaxValue);
            bool near = changes <= Math.Min(2, (text.Length - 1) / 2);
            Spelling.Nearest(text, [known]).Should().Be(near ? known : null);
        }, iter: 20_000);
    }

    private static IEnumerable<string> Exchanges(string text) =>
        Enumerable.Range(0, text.Length - 1).Select(i => $"{text[..i]}{text[i + 1]}{text[i]}{text[(i + 2)..]}");

    /// <summary>The whole matrix, from the definition of Levenshtein's distance.</summary>
    private static int Textbook(string a, string b)
    {
        int[,] distance = new int[a.Length + 1, b.Length + 1];
        for (int i = 0; i <= a.Length; i++)
        {
            for (int j = 0; j <= b.Length; j++)
            {
                distance[i, j] = i == 0 ? j
                    : j == 0 ? i
                    : Math.Min(Math.Min(distance[i - 1, j], distance[i, j - 1]) + 1, distance[i - 1, j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1));
            }
        }

        return distance[a.Length, b.Length];
    }
}
