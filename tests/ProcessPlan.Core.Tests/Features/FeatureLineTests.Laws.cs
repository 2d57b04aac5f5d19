using CsCheck;
using ProcessPlan.Core.Features;
using static ProcessPlan.Core.Tests.Features.Line;

namespace ProcessPlan.Core.Tests.Features;

public sealed partial class FeatureLineTests
{
    /// <summary>Something that a line can say, spoken and named.</summary>
    /// <param name="Spoken">As it is spoken; a tilde stands where a space may be or not.</param>
    /// <param name="Named">As key=value.</param>
    /// <param name="KeepsCase">Whether it holds a tolerance class, whose case matters.</param>
    private sealed record Part(string Spoken, string Named, bool KeepsCase = false)
    {
        public string Plain => Spoken.Replace("~", "", StringComparison.Ordinal);

        public string Locked => KeepsCase ? Plain : Plain.ToUpperInvariant();
    }

    private static readonly Gen<string> Thousandths = Gen.Int[11_000, 199_999].Select(static n => $"{n / 1000}.{n % 1000:000}");

    private static readonly Gen<string> Wholes = Gen.Int[11, 199].Select(static n => $"{n}");

    private static Gen<Part?> Maybe(params Gen<Part>[] parts) => Gen.Select(Gen.Bool, Gen.OneOf(parts), static (said, part) => said ? part : null);

    private static Gen<Part> Word(string spoken, string named) => Gen.Const(new Part(spoken, named));

    private static Gen<Part> WithNumber(Gen<string> number, string spoken, string named) =>
        number.Select(n => new Part(spoken.Replace("#", n, StringComparison.Ordinal), named.Replace("#", n, StringComparison.Ordinal)));

    private static Gen<Part[]> SizeAndClass(Gen<string> size, params string[] classes) =>
        Gen.Select(size, Gen.OneOf(classes), static (n, c) => new[] { new Part($"{n}~{c}", $"size={n} tol={c}", KeepsCase: true) });

    private static readonly Gen<Part[]> TypedTolerance = Gen.Select(Gen.OneOf(Thousandths, Wholes), Gen.Int[1, 99], Gen.Int[0, 99], Gen.Int[0, 3],
        static (n, a, b, form) => form switch
        {
            0 => [new Part(n, $"size={n}"), new Part($"±~0.{a:00}", $"tol=±0.{a:00}")],
            1 => [new Part(n, $"size={n}"), new Part($"+0.{a:00}/-0.{b:00}", $"tol=+0.{a:00}/-0.{b:00}")],
            2 => [new Part(n, $"size={n}"), new Part($"0/-0.{a:00}", $"tol=0/-0.{a:00}")],
            _ => new[] { new Part($"{n}~+0.{a:00}~-0.{b:00}", $"size={n} tol=+0.{a:00}/-0.{b:00}") },
        });

    private static readonly Gen<Part[]> Limited = Gen.Select(Gen.Int[11, 199], Gen.Int[1, 999], Gen.OneOf("-", "/", " to ", ".."),
        static (n, thousandths, mark) => new[] { new Part($"{n}{mark}{n}.{thousandths:000}", $"limits={n}{mark}{n}.{thousandths:000}") });

    private static readonly Gen<Part[]> General = Gen.Select(Wholes, Gen.OneOf("f", "m", "c"),
        static (n, c) => new[] { new Part(n, $"size={n}"), new Part($"2768-{c}", $"tol=2768-{c}") });

    private static readonly Gen<string> Microns = Gen.OneOf("0.01", "0.025", "5um", "0,1");

    private static Gen<Part> Kind(params string[] words) => Gen.OneOf(words).Select(static word => new Part(word, $"kind={word}"));

    private static readonly Gen<Part?>[] Common =
    [
        Maybe(WithNumber(Gen.OneOf(Wholes, Thousandths, Gen.Const("7")), "x~#", "depth=#")),
        Maybe(WithNumber(Gen.OneOf("0.8", "1,6", "3.2"), "Ra~#", "ra=#"), WithNumber(Gen.OneOf("6.3", "16"), "Rz~#", "rz=#"),
            WithNumber(Gen.OneOf("6", "8"), "N#", "finish=N#")),
        Maybe(WithNumber(Gen.OneOf("C45", "42CrMo4", "X5CrNi18-10", "GG25", "316L", "EN-AW-6061"), "#", "mat=#")),
        Maybe(WithNumber(Gen.OneOf("22", "28", "38.5"), "#~HRC", "hardness=#HRC"), WithNumber(Gen.Const("200"), "HB#", "hb=#")),
        Maybe(Word("hardened 58~HRC", "hardened=58HRC"), Word("case~0.8", "case=0.8"), Word("case 0.8 60~HRC", "case=0.8 60HRC"),
            Word("nitrided 0.3 700~HV", "nitrided=0.3 700HV")),
        Maybe(WithNumber(Microns, "cyl~#", "cylindricity=#"), WithNumber(Microns, "round~#", "round=#")),
        Maybe(WithNumber(Microns, "runout~#", "runout=#")),
        Maybe(WithNumber(Microns, "pos~#", "position=#"), WithNumber(Microns, "perp~#", "perp=#"), WithNumber(Microns, "coax~#", "coax=#")),
        Maybe(WithNumber(Gen.Int[1, 5000].Select(static n => $"{n}"), "#~off", "qty=#")),
        Maybe(Word("interrupted", "interrupted=yes")),
        Maybe(Word("mm", "unit=mm")),
    ];

    private static readonly Gen<Part?>[] Coated =
    [
        Maybe(Word("coat zinc-nickel 8-12~um", "coat=zinc-nickel 8-12um")),
        Maybe(Word("solid", "start=solid"), WithNumber(Gen.OneOf("250", "300.5"), "bar~#", "start=bar #")),
    ];

    private static readonly Gen<Part?>[] HoleOnly =
    [
        Maybe(Word("thru", "end=thru"), Word("blind", "end=blind")),
        Maybe(WithNumber(Gen.OneOf("2", "3.5"), "wall~#", "wall=#"), WithNumber(Gen.OneOf("220", "300"), "od~#", "od=#")),
        Maybe(WithNumber(Gen.OneOf("5", "8.5"), "cored~#", "start=cored #")),
    ];

    private static readonly Gen<Part[]> InchSize = Gen.OneOf(
        Gen.Select(Gen.Int[4100, 60_000].Select(static n => $"{n / 10_000}.{n % 10_000:0000}"), Gen.OneOf("H7", "N7", "D9", "h6", "x6", "k6"), Gen.Bool,
            static (n, c, behind) => new[] { new Part(behind ? $"{n}~{c} in" : $"{n}~in {c}", $"size={n}in tol={c}", KeepsCase: true) }),
        Gen.Select(Gen.Int[1, 63], Gen.Int[1, 9], static (n, tenths) => new[]
        {
            new Part($"{n}/64", $"size={n}/64"), new Part($"+.000{tenths}/-0", $"tol=+.000{tenths}/-0"), new Part("hole", "kind=hole"),
        }),
        Gen.Int[1, 9].Select(static tenths => new[] { new Part($".2500-.250{tenths}", $"limits=.2500-.250{tenths}"), new Part("pin", "kind=pin") }),
        Gen.Int[1, 9].Select(static tenths => new[] { new Part(".3750", "size=.3750"), new Part($"±.{tenths}~thou", $"tol=±.{tenths}thou"), new Part("bore", "kind=bore") }));

    private static readonly Gen<Part?>[] InchOthers =
    [
        Word("in", "unit=in").Select(static part => (Part?)part),
        Maybe(WithNumber(Gen.OneOf(".5", "1.25", "3/4", "1-1/2", "6"), "x~#", "depth=#")),
        Maybe(WithNumber(Gen.OneOf("32uin", "0.8", "0.8um"), "Ra~#", "ra=#"), WithNumber(Gen.Const("7"), "N#", "finish=N#")),
        Maybe(WithNumber(Gen.OneOf(".0005", ".5thou", "2um"), "cyl~#", "cyl=#")),
        Maybe(WithNumber(Gen.OneOf("C45", "316L"), "#", "mat=#")),
        Maybe(WithNumber(Gen.Int[1, 50].Select(static n => $"{n}"), "#~off", "qty=#")),
        Maybe(Word("coat chrome .0003-.0005~in", "coat=chrome .0003-.0005in")),
        Maybe(Word("case .03", "case=.03")),
    ];

    /// <summary>The parts of a valid line of at most 15.</summary>
    private static readonly Gen<Part[]> Lines = Gen.OneOf(
        LineOf(null, InchSize, InchOthers),
        LineOf(Kind("hole", "bore"), Gen.OneOf(SizeAndClass(Thousandths, "H7", "H8", "G6", "JS9", "N7", "D9", "X7"), TypedTolerance, Limited, General), [.. Common, .. HoleOnly, Coated[0]]),
        LineOf(Kind("shaft", "pin"), Gen.OneOf(SizeAndClass(Thousandths, "h6", "k6", "f7", "js7", "n6", "d9", "x6"), TypedTolerance, Limited, General), [.. Common, .. Coated]),
        LineOf(Kind("slot", "keyway"), Gen.OneOf(SizeAndClass(Wholes, "H9", "P9", "JS9", "D10"), TypedTolerance, Limited), [.. Common, .. Coated]),
        LineOf(Kind("key", "tongue"), Gen.OneOf(SizeAndClass(Wholes, "h9", "h11"), TypedTolerance, Limited), [.. Common, .. Coated]),
        LineOf(null, Gen.OneOf(SizeAndClass(Thousandths, "H7", "k6", "N7", "D9", "x6"), SizeAndClass(Thousandths, "H7~/~k6", "N7/h6", "H8/d9", "x6/H7")), Common));

    private static Gen<Part[]> LineOf(Gen<Part>? kind, Gen<Part[]> size, Gen<Part?>[] others)
    {
        Gen<List<Part>> line = size.Select(static parts => parts.ToList());
        foreach (Gen<Part?> other in kind is null ? others : [.. others, kind.Select(static part => (Part?)part)])
        {
            line = Gen.Select(line, other, static (parts, part) => part is null ? parts : [.. parts, part]);
        }

        return line.Select(static parts => parts.ToArray());
    }

    private static string Join(IEnumerable<string> parts, string separator = " ") => string.Join(separator, parts);

    [Fact]
    public void Law_PartsInAnyOrder_ReadTheSame() =>
        Lines.SelectMany(static parts => Gen.Shuffle(parts).Select(shuffled => (parts, shuffled))).Sample(static (parts, shuffled) =>
        {
            string line = Join(parts.Select(static part => part.Plain));
            string other = Join(shuffled.Select(static part => part.Plain));
            Same(Read(line), other);
        }, iter: 20_000, writeLine: null);

    [Fact]
    public void Law_SpacesAndSeparators_DoNotMatter() =>
        Gen.Select(Lines, Gen.OneOf(" ", "  ", "\t", "\u00A0", "\u202F"), Gen.OneOf(" ", "   ", ", ", ";", " ; ", "\t")).Sample(static (parts, inside, between) =>
            Same(Read(Join(parts.Select(static part => part.Plain))), between + Join(parts.Select(part => part.Spoken.Replace("~", inside, StringComparison.Ordinal)), between) + between),
            iter: 10_000);

    [Fact]
    public void Law_CapsLockOutsideTheClass_DoesNotMatter() =>
        Lines.Sample(static parts => Same(Read(Join(parts.Select(static part => part.Plain))), Join(parts.Select(static part => part.Locked))), iter: 10_000);

    [Fact]
    public void Law_NamedParts_ReadTheSame() =>
        Lines.Where(static parts => !parts[0].Spoken.Contains('/', StringComparison.Ordinal)).SelectMany(static parts => Gen.Shuffle(parts).Select(shuffled => (parts, shuffled)))
            .Sample(static (parts, shuffled) => Same(Read(Join(parts.Select(static part => part.Plain))), Join(shuffled.Select(static part => part.Named))), iter: 10_000);

    [Fact]
    public void Law_DecimalComma_DoesNotMatter() => Lines.Sample(static parts =>
    {
        string line = Join(parts.Select(static part => part.Plain));
        Same(Read(line.Replace(',', '.')), System.Text.RegularExpressions.Regex.Replace(line, @"(?<=\d)\.(?=\d)", ","));
    }, iter: 5_000);

    private static void Same(FeatureRequest expected, string line)
    {
        FeatureRequest read = Read(line);
        WithSmallCoatingName(read).ShouldBe(WithSmallCoatingName(expected));
    }

    /// <summary>The name of a coating is kept as it was typed.</summary>
    private static FeatureRequest WithSmallCoatingName(FeatureRequest request) => request.First.Coating is { } coating
        ? request with { First = request.First with { Coating = coating with { Name = coating.Name.ToLowerInvariant() } } }
        : request;
}
