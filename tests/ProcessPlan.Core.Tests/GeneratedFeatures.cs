using CsCheck;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Tests;

/// <summary>
/// Feature lines as a shop meets them, generated from a fixed start so that a run never flickers: the same lines in every run, new ones by another start.
/// A line that the reader or the standard refuses (a class that does not exist at its size) is passed over and the next one taken.
/// </summary>
internal static class GeneratedFeatures
{
    public static readonly ShopFloor Shop = HandbookShop.Load();

    private static readonly Gen<string> Size = Gen.Frequency(
        (6, Gen.Int[1, 60].Select(size => $"{size}")),
        (2, Gen.Int[61, 200].Select(size => $"{size}")),
        (2, Gen.Int[10, 400].Select(tenths => $"{tenths / 10}.{tenths % 10}")));

    private static readonly Gen<string> HoleClass = Gen.Frequency(
        (5, OneOf("H6", "H7", "H8", "H9", "H10", "H11", "H12")),
        (4, OneOf("JS6", "JS7", "JS9", "K6", "K7", "K8", "M7", "N7", "N9", "P7", "P9", "F7", "F8", "G6", "G7", "D9", "D10", "E8", "R7", "H5")),
        (1, OneOf("+0.030/0", "+0.1/-0.1", "+0.015/-0.005", "+0.25/+0.05", "±0.012", "-0.010/-0.035")));

    private static readonly Gen<string> ShaftClass = Gen.Frequency(
        (5, OneOf("h5", "h6", "h7", "h8", "h9", "h11")),
        (4, OneOf("js6", "js9", "k5", "k6", "k7", "m5", "m6", "n6", "p6", "r6", "g5", "g6", "f6", "f7", "f8", "e8", "d9", "d10")),
        (1, OneOf("0/-0.020", "+0.05/-0.05", "+0.025/+0.012", "±0.008", "-0.02/-0.07")));

    private static readonly Gen<string> SlotClass = OneOf("P9", "N9", "JS9", "H8", "H9", "H11", "D10", "±0.1", "+0.03/0");

    private static readonly Gen<string> TongueClass = OneOf("h6", "h8", "h9", "h11", "f7", "js9", "0/-0.05");

    private static readonly Gen<string> Finish = OneOf("", "", "Ra0.1", "Ra0.2", "Ra0.4", "Ra0.8", "Ra0.8", "Ra1.6", "Ra1.6", "Ra3.2", "Ra6.3", "Rz6.3", "N7");

    private static readonly Gen<string> Material = Gen.Frequency((3, Gen.Const("C45")), (1, Gen.Const("42CrMo4 30HRC")), (1, Gen.Const("")),
        (5, OneOf([.. Shop.Materials.Select(material => material.Designation)])));

    private static readonly Gen<string> Quantity = Gen.Frequency((3, Gen.Int[1, 12]), (3, Gen.Int[13, 60]), (2, Gen.Int[61, 2000])).Select(pieces => $"{pieces} off");

    private static readonly Gen<string> Treatment = Gen.Frequency((8, Gen.Const("")),
        (2, OneOf("hardened 58HRC", "hardened 62HRC", "hardened 42HRC", "case 0.8 60HRC", "nitrided 0.3", "coat zinc 5-8um", "coat zinc-nickel 8-12um before", "coat chrome 10-14um after")));

    private static readonly Gen<string> Geometry = Gen.Frequency((8, Gen.Const("")), (2, OneOf("pos 0.05", "pos 0.02", "coax 0.03", "pos 0.2", "runout 0.01", "cyl 0.01")));

    private static readonly Gen<double> Ratio = Gen.Frequency((6, Gen.Double[0.3, 3]), (2, Gen.Double[3, 6]), (1, Gen.Double[6, 14]));

    private static readonly Gen<string[]> Hole = Gen.Select(Size, HoleClass, Finish, Material, Quantity, Treatment, Geometry, Gen.Select(Ratio, Gen.Int[0, 19])).Select(
        (size, tolerance, finish, material, quantity, treatment, geometry, rest) => (string[])
        ["hole", $"{size} {tolerance}", Extent(size, rest.Item1), finish, material, quantity, treatment, geometry, HoleWord(size, rest.Item2)]);

    private static readonly Gen<string[]> Shaft = Gen.Select(Size, ShaftClass, Finish, Material, Quantity, Treatment, Geometry, Gen.Select(Ratio, Gen.Int[0, 9])).Select(
        (size, tolerance, finish, material, quantity, treatment, geometry, rest) => (string[])
        ["shaft", $"{size} {tolerance}", Extent(size, rest.Item1), finish, material, quantity, treatment, geometry, rest.Item2 == 0 ? $"bar {Above(size)}" : ""]);

    private static readonly Gen<string[]> Flat = Gen.Select(Gen.Bool, Gen.Int[2, 60], SlotClass, TongueClass, Finish, Material, Quantity, Ratio).Select(
        (internalSide, size, slot, tongue, finish, material, quantity, ratio) => (string[])
        [internalSide ? "slot" : "tongue", $"{size} {(internalSide ? slot : tongue)}", Extent($"{size}", ratio), finish, material, quantity]);

    /// <summary>The words of a line, each of which may stand in any place.</summary>
    public static Gen<string[]> Words { get; } = Gen.Frequency((6, Hole), (5, Shaft), (1, Flat)).Select(words => words.Where(word => word.Length > 0).ToArray());

    /// <summary>The first lines of a sequence that read as a feature.</summary>
    /// <param name="count">How many.</param>
    /// <param name="start">Where the sequence begins.</param>
    public static IEnumerable<(string[] Words, Feature Feature)> Take(int count, ulong start)
    {
        PCG random = new(1, start);
        for (int taken = 0; taken < count;)
        {
            string[] words = Words.Generate(random, null, out _);
            if (Read(string.Join(' ', words)) is { } feature)
            {
                taken++;
                yield return (words, feature);
            }
        }
    }

    public static Feature? Read(string line)
    {
        Parsed<FeatureRequest> parsed = FeatureLine.Parse(line, Shop.Names);
        return parsed.IsRead ? parsed.Value.First : null;
    }

    public static Feature ReadAll(string line) => Read(line) ?? throw new ArgumentException($"'{line}' is no feature.", nameof(line));

    private static Gen<string> OneOf(params string[] texts) => Gen.Int[0, texts.Length - 1].Select(place => texts[place]);

    private static string Extent(string size, double ratio) =>
        string.Create(System.Globalization.CultureInfo.InvariantCulture, $"x {Math.Max(1, Math.Round(Number(size) * ratio)):0}");

    private static string HoleWord(string size, int choice) => choice switch
    {
        0 => "blind",
        1 => "blind bottom 2",
        2 => "blind bottom 6",
        3 when Number(size) >= 30 => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"cored {Math.Round(Number(size) - 8):0}"),
        4 when Number(size) >= 30 => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"cast {Math.Round(Number(size) - 6):0}"),
        5 => "wall 2",
        6 => "interrupted",
        _ => "thru",
    };

    private static string Above(string size) => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{Math.Ceiling(Number(size) * 1.05) + 4:0}");

    private static double Number(string size) => double.Parse(size, System.Globalization.CultureInfo.InvariantCulture);
}
