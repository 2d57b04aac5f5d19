using ProcessPlan.Core.Values;
using static ProcessPlan.Core.Standards.FundamentalDeviation;

namespace ProcessPlan.Core.Standards;

/// <summary>
/// ISO 286-1:2010: limit deviations of tolerance classes and widths of tolerance grades, for nominal sizes over 0 up to and
/// including 3150 mm. A size at the end of a range belongs to the lower range. All values are exact; nothing is rounded.
/// </summary>
public static class Iso286
{
    private const long OneMillimetre = Length.PicometresPerMillimetre;
    private const long ThreeMillimetres = 3 * OneMillimetre;
    private const long HalfMetre = 500 * OneMillimetre;

    // M6 over 250 to 315 mm: the standard sets ES = −9 µm where its rule would give −11.
    private const long M6Exception = -9 * Length.PicometresPerMicrometre;

    private static readonly ToleranceGrade IT3 = ToleranceGrade.It(3);
    private static readonly ToleranceGrade IT4 = ToleranceGrade.It(4);
    private static readonly ToleranceGrade IT6 = ToleranceGrade.It(6);
    private static readonly ToleranceGrade IT7 = ToleranceGrade.It(7);
    private static readonly ToleranceGrade IT8 = ToleranceGrade.It(8);
    private static readonly ToleranceGrade IT14 = ToleranceGrade.It(14);

    /// <summary>The limit deviations of a class at a nominal size, or why there are none. Allocates nothing.</summary>
    public static ClassLookup Find(Length nominal, ToleranceClass c)
    {
        long size = nominal.Picometres;
        int sub = Iso286Tables.StepOf(Iso286Tables.SubEnds, size);
        if (sub < 0)
        {
            return ClassLookup.Refused(ClassGap.SizeOutside);
        }

        long width = Width(size, Iso286Tables.MainOfSub[sub], c.Grade);
        if (width == Iso286Tables.NotGiven)
        {
            return ClassLookup.Refused(ClassGap.GradeNotAtSize);
        }

        if (c.Letter is JS)
        {
            return ClassLookup.FromUpper(width / 2, width);
        }

        long shaft = Iso286Tables.Shafts[(int)c.Letter][sub];
        if (shaft == Iso286Tables.NotGiven || (c.Letter is A or B && size <= OneMillimetre))
        {
            return ClassLookup.Refused(ClassGap.LetterNotAtSize);
        }

        return c.Letter is J ? FindJ(sub, c, width)
            : c.IsInternal ? FindHole(size, sub, c, width, -shaft)
            : FindShaft(c, width, shaft);
    }

    /// <summary>The width of a grade at a nominal size; false, and zero, where the standard gives none.</summary>
    public static bool TryWidth(Length nominal, ToleranceGrade grade, out Deviation width)
    {
        int main = Iso286Tables.StepOf(Iso286Tables.MainEnds, nominal.Picometres);
        long cell = main < 0 ? Iso286Tables.NotGiven : Width(nominal.Picometres, main, grade);
        bool given = cell != Iso286Tables.NotGiven;
        width = new Deviation(given ? cell : 0);
        return given;
    }

    /// <summary>
    /// The finest grade at the size whose width is not smaller than <paramref name="width"/>: the coarser side where it lies between
    /// two. Null where every grade is smaller, or the size is outside the standard.
    /// </summary>
    public static ToleranceGrade? NearestGrade(Length nominal, Deviation width)
    {
        for (ToleranceGrade? next = ToleranceGrade.IT01; next is { } grade; next = grade.Coarser)
        {
            if (TryWidth(nominal, grade, out Deviation given) && given >= width)
            {
                return grade;
            }
        }

        return null;
    }

    /// <summary>The main step of <paramref name="nominal"/>, which its tolerances are taken from; null outside the standard.</summary>
    public static SizeStep? Step(Length nominal) => Step(Iso286Tables.MainEnds, nominal);

    /// <summary>The step of <paramref name="nominal"/> that its fundamental deviations are taken from; null outside the standard.</summary>
    public static SizeStep? DeviationStep(Length nominal) => Step(Iso286Tables.SubEnds, nominal);

    /// <summary>Where the width of a grade stands, as "ISO 286-1:2010, Table 1, over 18 to 30 mm, IT7".</summary>
    /// <exception cref="ArgumentOutOfRangeException">The standard gives no such width.</exception>
    public static Citation Cite(Length nominal, ToleranceGrade grade) => TryWidth(nominal, grade, out _)
        ? Iso286Tables.Grades.Cite($"{Step(nominal)}, {grade.Text}")
        : throw new ArgumentOutOfRangeException(nameof(nominal), nominal, $"The standard gives no {grade.Text} at this size.");

    /// <summary>Where the deviation of a class stands, as "ISO 286-1:2010, Table 5, over 18 to 24 mm, k".</summary>
    /// <exception cref="ArgumentOutOfRangeException">The standard does not define the class at this size.</exception>
    public static Citation Cite(Length nominal, ToleranceClass c)
    {
        if (!Find(nominal, c).IsDefined)
        {
            throw new ArgumentOutOfRangeException(nameof(nominal), nominal, $"The standard gives no {c} at this size.");
        }

        int table = c.IsInternal ? (c.Letter <= M ? 2 : 3) : (c.Letter <= J ? 4 : 5);
        return Iso286Tables.Grades.Cite() with { Place = $"Table {table}, {DeviationStep(nominal)}, {c.LetterText}" };
    }

    /// <summary>Says why <paramref name="c"/> does not exist at <paramref name="nominal"/>, and which classes do.</summary>
    /// <exception cref="ArgumentException">The class is defined there.</exception>
    public static ClassRefusal Explain(Length nominal, ToleranceClass c) => ClassRefusal.For(nominal, c);

    /// <summary>The sizes that a letter is given for, in whatever grade.</summary>
    internal static SizeStep LetterRange(FundamentalDeviation letter)
    {
        long[] column = Iso286Tables.Shafts[(int)letter];
        int first = Array.FindIndex(column, cell => cell != Iso286Tables.NotGiven);
        int last = Array.FindLastIndex(column, cell => cell != Iso286Tables.NotGiven);
        long over = letter is A or B ? OneMillimetre : first == 0 ? 0 : Iso286Tables.SubEnds[first - 1];
        return new SizeStep(new Length(over), new Length(Iso286Tables.SubEnds[last]));
    }

    private static ClassLookup FindJ(int sub, ToleranceClass c, long width)
    {
        long deviation = (c.IsInternal ? Iso286Tables.HolesJ : Iso286Tables.ShaftsJ)[c.Grade.Ordinal]?[sub] ?? Iso286Tables.NotGiven;
        return deviation == Iso286Tables.NotGiven ? ClassLookup.Refused(ClassGap.LetterNotInGrade)
            : c.IsInternal ? ClassLookup.FromUpper(deviation, width)
            : ClassLookup.FromLower(deviation, width);
    }

    private static ClassLookup FindShaft(ToleranceClass c, long width, long shaft) => c.Letter switch
    {
        <= H => ClassLookup.FromUpper(shaft, width),
        K when c.Grade < IT4 || c.Grade > IT7 => ClassLookup.FromLower(0, width),
        _ => ClassLookup.FromLower(shaft, width),
    };

    /// <remarks><paramref name="mirrored"/> is the deviation of the shaft of the same letter with the opposite sign.</remarks>
    private static ClassLookup FindHole(long size, int sub, ToleranceClass c, long width, long mirrored)
    {
        if (c.Letter <= H)
        {
            return ClassLookup.FromLower(mirrored, width);
        }

        // Over 3 up to 500 mm the special rule adds Δ to the finer holes; outside these sizes every hole mirrors its shaft.
        bool special = size > ThreeMillimetres && size <= HalfMetre;
        if (c.Grade > IT8)
        {
            switch (c.Letter)
            {
                case K when special:
                case N when size <= OneMillimetre:
                    return ClassLookup.Refused(ClassGap.LetterNotInGrade);
                case N when special:
                    return ClassLookup.FromUpper(0, width);
            }
        }

        if (!special || c.Grade > (c.Letter <= N ? IT8 : IT7))
        {
            return ClassLookup.FromUpper(mirrored, width);
        }

        if (c.Grade < IT3)
        {
            return ClassLookup.Refused(ClassGap.NoDelta);
        }

        long delta = width - Iso286Tables.Widths[c.Grade.Ordinal - 1][Iso286Tables.MainOfSub[sub]];
        return ClassLookup.FromUpper(IsM6Exception(size, c) ? M6Exception : mirrored + delta, width);
    }

    private static bool IsM6Exception(long size, ToleranceClass c) =>
        c.Letter is M && c.Grade == IT6 && size > 250 * OneMillimetre && size <= 315 * OneMillimetre;

    private static long Width(long size, int main, ToleranceGrade grade) =>
        grade >= IT14 && size <= OneMillimetre ? Iso286Tables.NotGiven : Iso286Tables.Widths[grade.Ordinal][main];

    private static SizeStep? Step(long[] ends, Length nominal)
    {
        int step = Iso286Tables.StepOf(ends, nominal.Picometres);
        return step < 0 ? null : new SizeStep(new Length(step == 0 ? 0 : ends[step - 1]), new Length(ends[step]));
    }
}
