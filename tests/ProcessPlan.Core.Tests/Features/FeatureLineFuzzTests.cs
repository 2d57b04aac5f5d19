using System.Text;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Features;

/// <summary>A million lines that nobody should write: each is read whole or refused with problems that point into it, and none throws.</summary>
public sealed class FeatureLineFuzzTests
{
    private const int Batches = 1_000;
    private const int LinesOfABatch = 1_000;
    private const int LongestLine = 160;

    private static readonly string[] Valid =
    [
        "hole 25H7 x40 thru Ra0.8 42CrMo4 28HRC 200off",
        "shaft 35 k6 x28 Ra 0.8 C45 hardened 58HRC runout 0.01 40 off",
        "bore 60 +0.030/0 x 50 wall 2 C45 cyl 0.01 12 off",
        "bore 60.000-60.030 blind bottom 5 interrupted Rz 6,3",
        "keyway 8 JS9 x 40 C45 1 off",
        "shaft 30 f7 34CrNiMo6 38HRC coat zinc-nickel 8-12um before 60 off",
        "hole .2500 +.0005 -.0000 in x .5 6061 blind",
        "40 H7/k6 C45",
        "25 N7/h6 N6 EN AW 6061",
        "kind=hole size=25 tol=x6 depth=40 end=thru ra=0.8 mat=C45 hardness=HRC28 case=0.8 60HRC start=cored 20 qty=12 unit=mm",
        "hole 1-1/2H7\" x 3/4 finish=N7 cast 1 D2",
        "Ø25±.5thou od 30 pos 0,1 perp 10um nitrided 0.3 700HV ISO 2768-m",
        "hole 58-62HRC 304 316 60 to 61 limits=after coating hard chrome 8..12 µm",
    ];

    private static readonly string[] Awkward =
    [
        "0", "-0", "3150.001", "3150", "NaN", "Infinity", "1e5", "1E-5", "0x1F", "99999999999999999999", "999999999999999999", "9223372036854775808",
        "9223372036.854775807", "0.000000001", "0.0000000001", "0.000000000000000001", "25.000.000", "25,5,5", "1.000,5", ".", ",", "..", "...", "…", "-", "−",
        "–", "—", "‐", "‑", "﹣", "－", "+", "＋", "±", "+/-", "/", "//", "=", "==", "x", "X", "×", "*", "Ø", "⌀", "\"", "″", "µ", "μ", "um", "uin", "mm", "in",
        "thou", "<", "≤", ">", "max", "yes", "no", "Н7", "Η7", "Js7", "H19", "h70", "JS", "ZC18", "za6", "2768-m", "ISO", "1/3", "1/0", "0/0", "129/128",
        "127/128", "9223372036854775807-127/128in", "\0", "\u0007", "\u200B", "\uFEFF", "\u202E", "\u2028", "\uD83D", "\uDD29", "\uD83D\uDD29", "e\u0301", "٢٥", "２５", "日本", "\r\n", "\t",
        ";", ";;", ":", "(", ")", "'", "%", "°", "∅25", "coat", "tol=", "mat=", "kind=", "size=", "size=size=", "limits=", "off", "hardened", "case", "N13", "N99999999999", "Ra99999999999",
    ];

    private static readonly string[] Words =
        [.. Valid.SelectMany(static line => line.Split(' ')), .. FeatureWords.All, .. Line.Materials.Designations, .. Awkward, .. Awkward];

    [Fact]
    public void Parse_AMillionBadLines_AreReadWholeOrRefusedInTheirPlaces()
    {
        int read = 0;
        Parallel.For(0, Batches, seed =>
        {
            Random random = new(seed);
            int readHere = 0;
            for (int i = 0; i < LinesOfABatch; i++)
            {
                string line = Make(random);
                string? broken = Broken(line, out bool isRead);
                if (broken is not null)
                {
                    Assert.Fail($"seed {seed}, line {i}: {broken}\n{Escaped(line)}");
                }

                readHere += isRead ? 1 : 0;
            }

            Interlocked.Add(ref read, readHere);
        });

        // Both outcomes are exercised, or the lines are badly made.
        read.Should().BeInRange(Batches * LinesOfABatch / 100, Batches * LinesOfABatch / 2);
    }

    [Theory]
    [InlineData("q")]
    [InlineData(" ")]
    [InlineData("25")]
    [InlineData("9")]
    [InlineData("x=")]
    [InlineData("kind=")]
    [InlineData("N7 ")]
    [InlineData("\u200B")]
    [InlineData("coat ")]
    [InlineData("1/2-")]
    [InlineData("C45 ")]
    public void Parse_ThousandsOfCharacters_AreReadOrRefused(string piece)
    {
        foreach (int length in new[] { FeatureLine.MostCharacters, 10_000 })
        {
            string line = string.Concat(Enumerable.Repeat(piece, length / piece.Length + 1))[..length];
            Broken(line, out bool isRead).Should().BeNull();
            isRead.Should().BeFalse();
        }
    }

    private static string Make(Random random) => random.Next(8) switch
    {
        0 => Characters(random, random.Next(40)),
        1 => FromWords(random, random.Next(1, 9)),
        2 => Valid[random.Next(Valid.Length)].ToUpperInvariant(),
        _ => Mutated(random),
    };

    private static string Characters(Random random, int count)
    {
        StringBuilder line = new();
        for (int i = 0; i < count; i++)
        {
            line.Append(Character(random));
        }

        return line.ToString();
    }

    private static char Character(Random random) => random.Next(6) switch
    {
        0 => (char)random.Next(0x10000),
        1 => (char)random.Next(0x20),
        2 => (char)random.Next('0', '9' + 1),
        3 => " .,-+/=x±Øµ"[random.Next(11)],
        _ => (char)random.Next(0x20, 0x7F),
    };

    private static string FromWords(Random random, int count)
    {
        StringBuilder line = new();
        for (int i = 0; i < count; i++)
        {
            line.Append(Words[random.Next(Words.Length)]).Append(random.Next(4) == 0 ? "" : " ");
        }

        return line.ToString();
    }

    private static string Mutated(Random random)
    {
        StringBuilder line = new(Valid[random.Next(Valid.Length)]);
        for (int changes = random.Next(1, 5); changes > 0 && line.Length > 0; changes--)
        {
            int at = random.Next(line.Length);
            int length = random.Next(Math.Min(8, line.Length - at) + 1);
            switch (random.Next(7))
            {
                case 0:
                    line.Remove(at, length);
                    break;
                case 1 when line.Length < LongestLine:
                    line.Insert(random.Next(line.Length), line.ToString(at, length));
                    break;
                case 2:
                    int other = random.Next(line.Length);
                    (line[at], line[other]) = (line[other], line[at]);
                    break;
                case 3:
                    line.Insert(at, Character(random));
                    break;
                case 4:
                    line[at] = Character(random);
                    break;
                case 5 when line.Length < LongestLine:
                    line.Insert(at, Words[random.Next(Words.Length)]);
                    break;
                default:
                    line = new StringBuilder(WordsShuffledOnce(random, line.ToString()));
                    break;
            }
        }

        return line.ToString();
    }

    /// <summary>One word dropped, doubled, or exchanged for another.</summary>
    private static string WordsShuffledOnce(Random random, string line)
    {
        List<string> words = [.. line.Split(' ')];
        int at = random.Next(words.Count);
        switch (random.Next(4))
        {
            case 0:
                words.RemoveAt(at);
                break;
            case 1:
                words.Insert(random.Next(words.Count), words[at]);
                break;
            case 2:
                int other = random.Next(words.Count);
                (words[at], words[other]) = (words[other], words[at]);
                break;
            default:
                words[at] = Words[random.Next(Words.Length)];
                break;
        }

        return string.Join(' ', words);
    }

    /// <summary>What is wrong with the answer to this line; null where nothing is.</summary>
    private static string? Broken(string line, out bool isRead)
    {
        isRead = false;
        Parsed<FeatureRequest> parsed;
        try
        {
            parsed = Line.Parse(line);
        }
        catch (Exception exception) when (exception is not OutOfMemoryException)
        {
            return exception.ToString();
        }

        isRead = parsed.IsRead;
        if (isRead)
        {
            return parsed.Problems.Count > 0 ? "a value and problems" : parsed.Value!.Features.Select(Broken).FirstOrDefault(static broken => broken is not null);
        }

        if (parsed.Problems.Count == 0)
        {
            return "neither a value nor a problem";
        }

        int last = 0;
        foreach (Problem problem in parsed.Problems)
        {
            if (problem.At < last || problem.Length < 0 || problem.At + problem.Length > line.Length || (problem.Length == 0 && line.Length > 0))
            {
                return $"out of place or order: {problem}";
            }

            if (!IsPrintable(problem.Message) || !IsPrintable(problem.Expected) || problem.Message[^1] is not '.' and not '?')
            {
                return $"badly written: {Escaped(problem.ToString())}";
            }

            last = problem.At;
        }

        return null;
    }

    private static string? Broken(Feature feature)
    {
        SizeWindow limits = feature.Limits;
        return limits.Min <= Length.Zero || limits.Min >= limits.Max ? $"limits {limits}"
            : feature.Nominal <= Length.Zero ? $"nominal {feature.Nominal}"
            : feature.Class is { } c && c.IsInternal != feature.IsInternal ? $"{c} for a {feature.Kind}"
            : feature.Class is not null && feature.General is not null ? "two tolerances"
            : feature.Quantity is < 1 ? $"{feature.Quantity} pieces"
            : new[] { feature.Extent, feature.Wall, feature.Start?.Size, feature.Coating?.Least, feature.Treatment?.Depth }
                .Any(static length => length <= Length.Zero) ? "a length of zero or less"
            : feature.BottomRoom < Length.Zero ? "a bottom below zero"
            : feature.Coating is { } coating && coating.Least > coating.Most ? $"{coating}"
            : feature.Geometry.DistinctBy(static requirement => requirement.Kind).Count() != feature.Geometry.Count ? "one form twice"
            : null;
    }

    private static bool IsPrintable(string text)
    {
        foreach (char c in text)
        {
            if (char.IsControl(c) || char.IsSurrogate(c))
            {
                return false;
            }
        }

        return text.Length > 0;
    }

    private static string Escaped(string line) =>
        string.Concat(line.Select(static c => c is >= ' ' and < '\u007F' ? c.ToString() : $"\\u{(int)c:X4}"));
}
