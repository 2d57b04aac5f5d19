using System.Globalization;
using CsCheck;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Standards;

public class Iso286Tests
{
    private const long Many = 5_000;

    private static readonly Gen<Length> Sizes = Gen.Frequency(
        (3, Gen.Long[1, 500_000_000].Select(nm => new Length(nm * 1000))),
        (1, Gen.Long[500_000_001, 3_150_000_000].Select(nm => new Length(nm * 1000))),
        (1, Gen.Long[1, 10_000_000].Select(nm => new Length(nm * 1000))));

    private static readonly Gen<ToleranceClass> Classes = Gen.Select(
        Gen.Enum<FundamentalDeviation>(),
        Gen.Bool,
        Gen.Int[0, 19],
        (letter, isInternal, grade) => new ToleranceClass(letter, isInternal, ToleranceGrade.At(grade)));

    // Rules and their ends. Sources: Narayana, Kannaiah, Venkata Reddy, Machine Drawing, pp. 213 to 221; Machinery's Handbook, 31st ed.,
    // Table 6a (BS 4500); EN ISO 286-1, fundamental deviations N to ZC; DME, Technical Reference, Table 5 (over 500 mm).
    [Theory]
    [InlineData("18", "H7", "+18", "0")]
    [InlineData("18.000000001", "H7", "+21", "0")]
    [InlineData("3150", "h7", "0", "-210")]
    [InlineData("0.000000001", "h6", "0", "-6")]
    [InlineData("24", "u6", "+54", "+41")]
    [InlineData("24.001", "u6", "+61", "+48")]
    [InlineData("24.001", "H7", "+21", "0")]
    [InlineData("500", "h01", "0", "-4")]
    [InlineData("500", "h0", "0", "-6")]
    [InlineData("1.001", "a11", "-270", "-330")]
    [InlineData("1.001", "N9", "-4", "-29")]
    [InlineData("1", "h13", "0", "-140")]
    [InlineData("1.001", "h14", "0", "-250")]
    [InlineData("10", "cd7", "-56", "-71")]
    [InlineData("10", "EF7", "+33", "+18")]
    [InlineData("10", "fg6", "-8", "-17")]
    [InlineData("14.001", "v5", "+47", "+39")]
    [InlineData("18.001", "y7", "+84", "+63")]
    [InlineData("24.001", "t6", "+54", "+41")]
    [InlineData("500", "zc8", "+2697", "+2600")]
    [InlineData("2", "j8", "+8", "-6")]
    [InlineData("500", "j5", "+7", "-20")]
    [InlineData("500", "J8", "+66", "-31")]
    [InlineData("5", "J7", "+6", "-6")]
    [InlineData("8", "js7", "+7.5", "-7.5")]
    [InlineData("25", "JS7", "+10.5", "-10.5")]
    [InlineData("25", "js01", "+0.3", "-0.3")]
    [InlineData("3000", "js18", "+16500", "-16500")]
    [InlineData("40", "k6", "+18", "+2")]
    [InlineData("40", "k3", "+4", "0")]
    [InlineData("40", "k8", "+39", "0")]
    [InlineData("600", "k6", "+44", "0")]
    [InlineData("40", "K7", "+7", "-18")]
    [InlineData("40", "K8", "+12", "-27")]
    [InlineData("40", "K3", "-0.5", "-4.5")]
    [InlineData("3", "K9", "0", "-25")]
    [InlineData("600", "K7", "0", "-70")]
    [InlineData("600", "K9", "0", "-175")]
    [InlineData("40", "M8", "+5", "-34")]
    [InlineData("40", "M9", "-9", "-71")]
    [InlineData("280", "M6", "-9", "-41")]
    [InlineData("250", "M6", "-8", "-37")]
    [InlineData("316", "M6", "-10", "-46")]
    [InlineData("280", "M7", "0", "-52")]
    [InlineData("600", "M7", "-26", "-96")]
    [InlineData("40", "N8", "-3", "-42")]
    [InlineData("40", "N9", "0", "-62")]
    [InlineData("3", "N9", "-4", "-29")]
    [InlineData("600", "N7", "-44", "-114")]
    [InlineData("20", "P7", "-14", "-35")]
    [InlineData("20", "P8", "-22", "-55")]
    [InlineData("2", "P7", "-6", "-16")]
    [InlineData("2", "P2", "-6", "-7.2")]
    [InlineData("600", "P7", "-78", "-148")]
    [InlineData("600", "U8", "-660", "-770")]
    public void Find_DefinedClass_HasTheLimitsOfTheStandard(string size, string c, string upper, string lower)
    {
        ClassLookup found = Iso286.Find(Size(size), Class(c));
        found.IsDefined.Should().BeTrue();
        found.Upper.FormatSigned().Should().Be(upper);
        found.Lower.FormatSigned().Should().Be(lower);
    }

    [Theory]
    [InlineData("0", "H7", ClassGap.SizeOutside, "ISO 286-1 gives H7 for sizes over 0 up to and including 3150 mm, not for 0 mm.")]
    [InlineData("3150.001", "H7", ClassGap.SizeOutside, "ISO 286-1 gives H7 for sizes over 0 up to and including 3150 mm, not for 3150.001 mm.")]
    [InlineData("500.001", "h01", ClassGap.GradeNotAtSize, "ISO 286-1 gives no h01 at 500.001 mm: IT01 and IT0 end at 500 mm; nearest is h1.")]
    [InlineData("600", "H0", ClassGap.GradeNotAtSize, "ISO 286-1 gives no H0 at 600 mm: IT01 and IT0 end at 500 mm; nearest is H1.")]
    [InlineData("1", "h14", ClassGap.GradeNotAtSize, "ISO 286-1 gives no h14 at 1 mm: IT14 to IT18 begin over 1 mm; nearest is h13.")]
    [InlineData("1", "a11", ClassGap.LetterNotAtSize, "ISO 286-1 gives no a11 at 1 mm: a begins over 1 mm; nearest is c11.")]
    [InlineData("1", "B11", ClassGap.LetterNotAtSize, "ISO 286-1 gives no B11 at 1 mm: B begins over 1 mm; nearest is C11.")]
    [InlineData("10.001", "cd7", ClassGap.LetterNotAtSize,
        "ISO 286-1 gives no cd7 at 10.001 mm: cd ends at 10 mm; nearest are c7 and d7.")]
    [InlineData("24", "t7", ClassGap.LetterNotAtSize, "ISO 286-1 gives no t7 at 24 mm: t begins over 24 mm; nearest are s7 and u7.")]
    [InlineData("14", "V6", ClassGap.LetterNotAtSize, "ISO 286-1 gives no V6 at 14 mm: V begins over 14 mm; nearest are U6 and X6.")]
    [InlineData("18", "y6", ClassGap.LetterNotAtSize, "ISO 286-1 gives no y6 at 18 mm: y begins over 18 mm; nearest are x6 and z6.")]
    [InlineData("501", "c11", ClassGap.LetterNotAtSize, "ISO 286-1 gives no c11 at 501 mm: c ends at 500 mm; nearest is d11.")]
    [InlineData("501", "zc7", ClassGap.LetterNotAtSize, "ISO 286-1 gives no zc7 at 501 mm: zc ends at 500 mm; nearest is u7.")]
    [InlineData("501", "j6", ClassGap.LetterNotAtSize, "ISO 286-1 gives no j6 at 501 mm: j ends at 500 mm; nearest are js6 and k6.")]
    [InlineData("40", "j8", ClassGap.LetterNotInGrade,
        "ISO 286-1 gives no j8 at 40 mm: j is given in grades 5, 6 and 7, and up to 3 mm in grade 8; nearest is j7.")]
    [InlineData("2", "j4", ClassGap.LetterNotInGrade,
        "ISO 286-1 gives no j4 at 2 mm: j is given in grades 5, 6 and 7, and up to 3 mm in grade 8; nearest is j5.")]
    [InlineData("40", "J9", ClassGap.LetterNotInGrade,
        "ISO 286-1 gives no J9 at 40 mm: J is given in grades 6, 7 and 8 only; nearest is J8.")]
    [InlineData("40", "K9", ClassGap.LetterNotInGrade,
        "ISO 286-1 gives no K9 at 40 mm: K coarser than IT8 is not given over 3 to 500 mm; nearest is K8.")]
    [InlineData("1", "N9", ClassGap.LetterNotInGrade,
        "ISO 286-1 gives no N9 at 1 mm: N coarser than IT8 begins over 1 mm; nearest is N8.")]
    [InlineData("40", "P2", ClassGap.NoDelta, "ISO 286-1 gives no P2 at 40 mm: it prints no Δ for grades finer than IT3; nearest is P3.")]
    [InlineData("3.001", "K01", ClassGap.NoDelta, "ISO 286-1 gives no K01 at 3.001 mm: it prints no Δ for grades finer than IT3; nearest is K3.")]
    public void Explain_UndefinedClass_SaysTheReasonAndTheNearest(string size, string c, ClassGap gap, string message)
    {
        ClassLookup found = Iso286.Find(Size(size), Class(c));
        found.IsDefined.Should().BeFalse();
        found.Gap.Should().Be(gap);
        ClassRefusal refusal = Iso286.Explain(Size(size), Class(c));
        refusal.Gap.Should().Be(gap);
        refusal.Message.Should().Be(message);
        FluentActions.Invoking(() => found.LimitsAt(Size(size))).Should().Throw<InvalidOperationException>()
            .WithMessage($"A class that is not defined ({gap}) has no limits of size.");
    }

    [Fact]
    public void Explain_DefinedClass_IsTheProgrammersMistake() => FluentActions.Invoking(() => Iso286.Explain(Size("25"), Class("H7")))
        .Should().Throw<ArgumentException>().WithMessage("H7 is defined at 25 mm.*");

    [Fact]
    public void Explain_AnyUndefinedClass_NamesOnlyDefinedOnes() => Gen.Select(Sizes, Classes).Sample((size, c) =>
    {
        if (!Iso286.Find(size, c).IsDefined)
        {
            ClassRefusal refusal = Iso286.Explain(size, c);
            refusal.Nearest.Should().HaveCountGreaterThan(0).And.HaveCountLessThan(3);
            refusal.Nearest.Should().OnlyContain(near => Iso286.Find(size, near).IsDefined && near.IsInternal == c.IsInternal);
        }
    }, iter: Many);

    [Fact]
    public void Find_AnyDefinedClass_IsAsWideAsItsGrade() => Gen.Select(Sizes, Classes).Sample((size, c) =>
    {
        ClassLookup found = Iso286.Find(size, c);
        if (found.IsDefined)
        {
            Iso286.TryWidth(size, c.Grade, out Deviation width).Should().BeTrue();
            found.Width.Should().Be(width);
            (found.Upper > found.Lower).Should().BeTrue();
            found.LimitsAt(size).Should().Be(new SizeWindow(size + found.Lower, size + found.Upper));
        }
    }, iter: Many);

    [Fact]
    public void Find_HolesAToHAndJS_MirrorTheirShafts() => Gen.Select(Sizes, Classes).Sample((size, c) =>
    {
        if (c.Letter <= FundamentalDeviation.JS)
        {
            ClassLookup one = Iso286.Find(size, c);
            ClassLookup other = Iso286.Find(size, c.Mirror);
            other.Gap.Should().Be(one.Gap);
            other.Upper.Should().Be(-one.Lower);
            other.Lower.Should().Be(-one.Upper);
        }
    }, iter: Many);

    // The special rule is made for this: a hole one grade coarser than its shaft gives the same interference in both bases, H7/p6 as P7/h6.
    [Fact]
    public void Find_SpecialRule_GivesTheSameFitInBothBases() =>
        Gen.Select(Sizes, Gen.Int[(int)FundamentalDeviation.K, (int)FundamentalDeviation.ZC], Gen.Int[5, 7]).Sample((size, letter, grade) =>
        {
            ToleranceClass hole = new((FundamentalDeviation)letter, IsInternal: true, ToleranceGrade.It(grade));
            ToleranceClass shaft = hole.Mirror with { Grade = ToleranceGrade.It(grade - 1) };
            ClassLookup shiftedHole = Iso286.Find(size, hole);
            ClassLookup shiftedShaft = Iso286.Find(size, shaft);
            bool isM6Exception = hole.ToString() == "M6" && size.Millimetres is > 250 and <= 315;
            if (size.Millimetres is > 3 and <= 500 && shiftedShaft.IsDefined && !isM6Exception)
            {
                Deviation inShaftBasis = shiftedHole.Lower - Iso286.Find(size, Class("h" + shaft.Grade.Symbol)).Upper;
                Deviation inHoleBasis = Iso286.Find(size, Class("H" + hole.Grade.Symbol)).Lower - shiftedShaft.Upper;
                inShaftBasis.Should().Be(inHoleBasis, "{0} and {1} at {2}", hole, shaft, size);
            }
        }, iter: Many);

    [Fact]
    public void Find_ManyTimes_AllocatesNothing()
    {
        Length size = Size("280");
        ToleranceClass hole = Class("M6");
        Iso286.Find(size, hole);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 1000; i++)
        {
            Iso286.Find(size, hole);
            Iso286.Find(size, hole.Mirror);
            Iso286.TryWidth(size, hole.Grade, out _);
        }

        GC.GetAllocatedBytesForCurrentThread().Should().Be(before);
    }

    [Theory]
    [InlineData("25", 21, "IT7")]
    [InlineData("25", 22, "IT8")]
    [InlineData("25", 0, "IT01")]
    [InlineData("25", 3300, "IT18")]
    [InlineData("25", 3301, null)]
    [InlineData("600", 1, "IT1")]
    [InlineData("1", 140, "IT13")]
    [InlineData("1", 141, null)]
    [InlineData("0", 10, null)]
    [InlineData("3151", 10, null)]
    public void NearestGrade_OfAWidth_IsTheFinestThatIsNotSmaller(string size, int micrometres, string? grade) =>
        (Iso286.NearestGrade(Size(size), Deviation.FromMicrometres(micrometres))?.Text).Should().Be(grade);

    [Fact]
    public void NearestGrade_OfAGradesOwnWidth_IsThatGrade() => Gen.Select(Sizes, Gen.Int[0, 19]).Sample((size, ordinal) =>
    {
        ToleranceGrade grade = ToleranceGrade.At(ordinal);
        if (Iso286.TryWidth(size, grade, out Deviation width))
        {
            Iso286.NearestGrade(size, width).Should().Be(grade);
            bool hasCoarser = grade.Coarser is { } coarser && Iso286.TryWidth(size, coarser, out _);
            Iso286.NearestGrade(size, new Deviation(width.Picometres + 1)).Should().Be(hasCoarser ? grade.Coarser : null);
        }
    }, iter: Many);

    [Theory]
    [InlineData("3", "up to 3 mm", "up to 3 mm")]
    [InlineData("3.001", "over 3 to 6 mm", "over 3 to 6 mm")]
    [InlineData("24", "over 18 to 30 mm", "over 18 to 24 mm")]
    [InlineData("3150", "over 2500 to 3150 mm", "over 2800 to 3150 mm")]
    [InlineData("3150.1", null, null)]
    [InlineData("0", null, null)]
    public void Step_OfASize_HoldsItWithItsUpperEnd(string size, string? main, string? sub)
    {
        (Iso286.Step(Size(size))?.ToString()).Should().Be(main);
        (Iso286.DeviationStep(Size(size))?.ToString()).Should().Be(sub);
        (Iso286.Step(Size(size))?.Contains(Size(size)) ?? main is null).Should().BeTrue();
    }

    [Theory]
    [InlineData("k6", "ISO 286-1:2010, Table 5, over 18 to 24 mm, k")]
    [InlineData("j6", "ISO 286-1:2010, Table 4, over 18 to 24 mm, j")]
    [InlineData("M6", "ISO 286-1:2010, Table 2, over 18 to 24 mm, M")]
    [InlineData("N6", "ISO 286-1:2010, Table 3, over 18 to 24 mm, N")]
    public void Cite_Class_SaysTableAndRow(string c, string citation) => Iso286.Cite(Size("22"), Class(c)).ToString().Should().Be(citation);

    [Fact]
    public void Cite_Grade_SaysTableAndRow() =>
        Iso286.Cite(Size("22"), ToleranceGrade.It(7)).ToString().Should().Be("ISO 286-1:2010, Table 1, over 18 to 30 mm, IT7");

    [Fact]
    public void Cite_WhatIsNotGiven_IsTheProgrammersMistake()
    {
        FluentActions.Invoking(() => Iso286.Cite(Size("600"), ToleranceGrade.IT0)).Should().Throw<ArgumentOutOfRangeException>()
            .WithMessage("The standard gives no IT0 at this size.*");
        FluentActions.Invoking(() => Iso286.Cite(Size("24"), Class("t6"))).Should().Throw<ArgumentOutOfRangeException>()
            .WithMessage("The standard gives no t6 at this size.*");
    }

    private static Length Size(string millimetres) => Length.FromMillimetres(decimal.Parse(millimetres, CultureInfo.InvariantCulture));

    private static ToleranceClass Class(string text)
    {
        ToleranceClass.TryRead(text, out ToleranceClass c, out int read).Should().BeTrue();
        read.Should().Be(text.Length);
        return c;
    }
}
