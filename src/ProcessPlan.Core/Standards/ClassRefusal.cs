using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Standards;

/// <summary>Why a tolerance class does not exist at a nominal size, and which do.</summary>
/// <param name="Gap">The reason by kind.</param>
/// <param name="Message">One sentence to the person at the machine: what is missing, why, and the nearest classes.</param>
/// <param name="Nearest">The nearest classes that exist at the size, at most two; none outside the sizes of the standard.</param>
public sealed record ClassRefusal(ClassGap Gap, string Message, IReadOnlyList<ToleranceClass> Nearest)
{
    internal static ClassRefusal For(Length nominal, ToleranceClass c)
    {
        ClassGap gap = Iso286.Find(nominal, c).Gap;
        if (gap == ClassGap.SizeOutside)
        {
            return new ClassRefusal(gap, $"ISO 286-1 gives {c} for sizes over 0 up to and including 3150 mm, not for {nominal}.", []);
        }

        List<ToleranceClass> nearest = NearestGrades(nominal, c);
        if (nearest.Count == 0)
        {
            AddNeighbour(nearest, nominal, c, -1);
            AddNeighbour(nearest, nominal, c, +1);
        }

        string others = nearest.Count == 1 ? $"nearest is {nearest[0]}" : $"nearest are {nearest[0]} and {nearest[1]}";
        return new ClassRefusal(gap, $"ISO 286-1 gives no {c} at {nominal}: {Reason(gap, nominal, c)}; {others}.", nearest);
    }

    private static string Reason(ClassGap gap, Length nominal, ToleranceClass c) => gap switch
    {
        ClassGap.GradeNotAtSize => c.Grade <= ToleranceGrade.IT0 ? "IT01 and IT0 end at 500 mm" : "IT14 to IT18 begin over 1 mm",
        ClassGap.LetterNotAtSize => Iso286.LetterRange(c.Letter) is { } range && nominal <= range.Over
            ? $"{c.LetterText} begins over {range.Over}"
            : $"{c.LetterText} ends at {Iso286.LetterRange(c.Letter).UpTo}",
        ClassGap.NoDelta => "it prints no Δ for grades finer than IT3",
        ClassGap.LetterNotInGrade => c switch
        {
            { Letter: FundamentalDeviation.K } => "K coarser than IT8 is not given over 3 to 500 mm",
            { Letter: FundamentalDeviation.N } => "N coarser than IT8 begins over 1 mm",
            { IsInternal: true } => "J is given in grades 6, 7 and 8 only",
            _ => "j is given in grades 5, 6 and 7, and up to 3 mm in grade 8",
        },
        _ => throw new ArgumentException($"{c} is defined at {nominal}.", nameof(c)),
    };

    /// <summary>The class itself, or the next finer and the next coarser grade of its letter, where they are defined.</summary>
    private static List<ToleranceClass> NearestGrades(Length nominal, ToleranceClass c)
    {
        if (Iso286.Find(nominal, c).IsDefined)
        {
            return [c];
        }

        List<ToleranceClass> found = [];
        for (ToleranceGrade? grade = c.Grade.Finer; grade is { } finer && found.Count == 0; grade = finer.Finer)
        {
            AddIfDefined(found, nominal, c with { Grade = finer });
        }

        int before = found.Count;
        for (ToleranceGrade? grade = c.Grade.Coarser; grade is { } coarser && found.Count == before; grade = coarser.Coarser)
        {
            AddIfDefined(found, nominal, c with { Grade = coarser });
        }

        return found;
    }

    private static void AddNeighbour(List<ToleranceClass> found, Length nominal, ToleranceClass c, int direction)
    {
        for (FundamentalDeviation letter = c.Letter + direction; Enum.IsDefined(letter); letter += direction)
        {
            if (NearestGrades(nominal, c with { Letter = letter }) is [ToleranceClass nearest, ..])
            {
                found.Add(nearest);
                return;
            }
        }
    }

    private static void AddIfDefined(List<ToleranceClass> found, Length nominal, ToleranceClass c)
    {
        if (Iso286.Find(nominal, c).IsDefined)
        {
            found.Add(c);
        }
    }
}
