using ProcessPlan.Core.Features;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Features;

/// <summary>Reads lines with a small shop book whose names have everything that makes names hard: numbers, points, spaces, and tolerance classes.</summary>
internal static class Line
{
    public static readonly MaterialNames Materials = new(
    [
        ["C15", "1.0401", "1015"],
        ["C45", "1.0503", "1045"],
        ["42CrMo4", "1.7225", "4140"],
        ["34CrNiMo6", "4340"],
        ["X5CrNi18-10", "1.4301", "304"],
        ["X2CrNiMo17-12-2", "1.4404", "316L", "316"],
        ["X40CrMoV5-1", "1.2344", "H13"],
        ["X153CrMoV12", "1.2379", "D2"],
        ["EN-AW-6061", "6061", "AW6061"],
        ["EN-GJL-250", "GG25"],
        ["PA6.6", "PA66"],
    ]);

    public static Parsed<FeatureRequest> Parse(string line) => FeatureLine.Parse(line, Materials);

    /// <summary>What the line asks for; fails with its problems where it cannot be read.</summary>
    public static FeatureRequest Read(string line)
    {
        Parsed<FeatureRequest> parsed = Parse(line);
        parsed.Problems.Should().BeEmpty("'{0}' is a good line", line);
        return parsed.Value!;
    }

    /// <summary>The one feature that the line asks for.</summary>
    public static Feature One(string line)
    {
        FeatureRequest request = Read(line);
        request.Mate.Should().BeNull();
        request.Features.Should().Equal(request.First);
        return request.First;
    }

    /// <summary>The problems of the line, each with the characters that it points at.</summary>
    public static (string At, string Message, string Expected)[] Problems(string line)
    {
        Parsed<FeatureRequest> parsed = Parse(line);
        $"{parsed.Value}".Should().BeEmpty("'{0}' is a bad line", line);
        return [.. parsed.Problems.Select(problem => (line.Substring(problem.At, problem.Length), problem.Message, problem.Expected))];
    }

    /// <summary>Equality of records, with both as one line of text where they differ.</summary>
    public static void ShouldBe<T>(this T actual, T expected)
        where T : class => (actual.Equals(expected) ? "equal" : $"{actual}").Should().Be(actual.Equals(expected) ? "equal" : $"{expected}");

    public static Length Mm(decimal millimetres) => Length.FromMillimetres(millimetres);

    public static Length Inch(decimal inches) => Length.FromMillimetres(inches * 25.4m);

    public static SizeWindow Limits(decimal min, decimal max) => new(Mm(min), Mm(max));

    /// <summary>The limits that the tables of ISO 286 give for the class, which have tests of their own.</summary>
    public static SizeWindow Limits(decimal nominal, string toleranceClass) => Iso286.Find(Mm(nominal), Class(toleranceClass)).LimitsAt(Mm(nominal));

    public static ToleranceClass Class(string text) =>
        ToleranceClass.TryRead(text, out ToleranceClass value, out int read) && read == text.Length ? value : throw new FormatException(text);

    public static Hardness Hrc(int points) => Hard(points, HardnessScale.HRC);

    public static Hardness Hard(int points, HardnessScale scale) => Hardness.TryCreate(new ExactDecimal(points, 0), scale, out Hardness hardness)
        ? hardness
        : throw new ArgumentOutOfRangeException(nameof(points), points, "no hardness of the scale");

    public static Roughness Ra(decimal micrometres) => Roughness.Ra((long)(micrometres * 1000));
}
