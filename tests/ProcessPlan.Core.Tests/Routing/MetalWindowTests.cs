using CsCheck;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Routing;

/// <summary>Hole and shaft are one arithmetic: what is true of metal on the part is true of both, mirrored.</summary>
public class MetalWindowTests
{
    private static readonly Gen<SizeWindow> Windows = Gen.Select(Gen.Long[1, 500_000_000_000], Gen.Long[0, 1_000_000_000])
        .Select((min, width) => new SizeWindow(new Length(min), new Length(min + width)));

    [Fact]
    public void Sizes_OfAWindowOfSizes_AreTheSameAgain() => Windows.Sample(sizes =>
        MetalWindow.Of(sizes, isInternal: true).Sizes(isInternal: true) == sizes && MetalWindow.Of(sizes, isInternal: false).Sizes(isInternal: false) == sizes);

    [Fact]
    public void Of_AHole_IsTheShaftTurnedRound() => Windows.Sample(sizes =>
    {
        MetalWindow hole = MetalWindow.Of(sizes, isInternal: true);
        MetalWindow shaft = MetalWindow.Of(sizes, isInternal: false);
        return hole.Least == -shaft.Most && hole.Most == -shaft.Least && hole.Width == shaft.Width && hole.IsOpen && shaft.IsOpen;
    });

    [Fact]
    public void Holds_OneWindowInAnother_IsAsSizesContainEachOther() => Gen.Select(Windows, Windows).Sample((outer, inner) =>
        MetalWindow.Of(outer, isInternal: true).Holds(MetalWindow.Of(inner, isInternal: true)) == outer.Contains(inner)
        && MetalWindow.Of(outer, isInternal: false).Holds(MetalWindow.Of(inner, isInternal: false)) == outer.Contains(inner));

    // Part B of the table method: Z_min = d_prev,min - d_max and Z_max = d_prev,max - d_min for a shaft, D_min - D_prev,max and D_max - D_prev,min for a hole.
    [Fact]
    public void Most_LessLeast_IsTheStockOfTheTableMethod() => Gen.Select(Windows, Windows).Sample((before, after) =>
    {
        (MetalWindow holeBefore, MetalWindow hole) = (MetalWindow.Of(before, isInternal: true), MetalWindow.Of(after, isInternal: true));
        (MetalWindow shaftBefore, MetalWindow shaft) = (MetalWindow.Of(before, isInternal: false), MetalWindow.Of(after, isInternal: false));
        return holeBefore.Least - hole.Most == (after.Min - before.Max).Picometres && holeBefore.Most - hole.Least == (after.Max - before.Min).Picometres
            && shaftBefore.Least - shaft.Most == (before.Min - after.Max).Picometres && shaftBefore.Most - shaft.Least == (before.Max - after.Min).Picometres;
    });
}
