using System.Globalization;
using CsCheck;

namespace ProcessPlan.Tests;

/// <summary>Feature lines as users type them, by chance.</summary>
internal static class Requests
{
    private static readonly Gen<string> Size = Gen.Int[1_000, 3_150_000].Select(micrometres => Text(micrometres, 1000));

    /// <summary>A hole or shaft in millimetres with typed deviations that differ by 2 µm at least.</summary>
    public static readonly Gen<string> Millimetres =
        from kind in Gen.OneOf("hole", "shaft", "slot", "tongue")
        from size in Size
        from lower in Gen.Int[-400, 400]
        from width in Gen.Int[2, 300]
        select $"{kind} {size} {Signed(lower, 1000)}/{Signed(lower + width, 1000)}";

    private static readonly Gen<string> Classes =
        from size in Size
        from letter in Gen.OneOf("D", "F", "G", "H", "JS", "K", "M", "N", "P", "R", "S", "U", "ZC", "d", "f", "g", "h", "js", "k", "m", "n", "p", "zc")
        from grade in Gen.Int[1, 18]
        select $"{size} {letter}{grade}";

    private static readonly Gen<string> Fits =
        from word in Gen.OneOf("", "keyway ")
        from size in Size
        from hole in Gen.OneOf("H", "JS", "N", "P", "F")
        from shaft in Gen.OneOf("g", "h", "js", "k", "n", "s")
        from grade in Gen.Int[4, 11]
        select $"{word}{size} {hole}{grade}/{shaft}{grade - 1}";

    private static readonly Gen<string> Inches =
        from kind in Gen.OneOf("hole", "shaft")
        from size in Gen.Int[1_000, 1_000_000]
        from lower in Gen.Int[-100, 100]
        from width in Gen.Int[1, 100]
        select $"{kind} {Text(size, 10_000)} {Signed(lower, 100_000)}/{Signed(lower + width, 100_000)} in";

    private static readonly Gen<string> InchFits =
        from size in Gen.Int[1, 200]
        from fit in Gen.OneOf("H7/g6", "H7/k6", "P7/h6")
        select $"{size}/64 in {fit}";

    public static readonly Gen<string> Any = Gen.OneOf(Millimetres, Classes, Fits, Inches, InchFits);

    private static string Text(int units, decimal scale) => (units / scale).ToString(CultureInfo.InvariantCulture);

    private static string Signed(int units, decimal scale) => (units < 0 ? "" : "+") + Text(units, scale);
}
