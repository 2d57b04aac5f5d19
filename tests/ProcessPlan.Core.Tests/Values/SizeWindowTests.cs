using CsCheck;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Values;

public sealed class SizeWindowTests
{
    private static readonly Gen<SizeWindow> Windows =
        Gen.Select(Gen.Int[1, 1000], Gen.Int[0, 100]).Select(static (min, width) => new SizeWindow(new Length(min), new Length(min + width)));

    [Fact]
    public void New_MinAboveMax_Throws()
    {
        Action turned = static () => _ = new SizeWindow(Length.FromMillimetres(2), Length.FromMillimetres(1));
        turned.Should().Throw<ArgumentException>().WithMessage("The lower limit 2 mm is above the upper limit 1 mm.*");
    }

    [Fact]
    public void Default_IsTheSizeZero() => default(SizeWindow).Should().Be(new SizeWindow(Length.Zero, Length.Zero));

    [Fact]
    public void Contains_TheLimitsThemselves_IsTrue()
    {
        SizeWindow window = new(Length.FromMillimetres(25), Length.FromMillimetres(25.021m));
        window.Contains(window.Min).Should().BeTrue();
        window.Contains(window.Max).Should().BeTrue();
        window.Contains(window).Should().BeTrue();
        window.Contains(new Length(window.Max.Picometres + 1)).Should().BeFalse();
        window.Contains(new Length(window.Min.Picometres - 1)).Should().BeFalse();
        window.Width.Should().Be(Deviation.FromMicrometres(21));
        window.Middle.Should().Be(Length.FromMillimetres(25.0105m));
        window.ToString().Should().Be("25.000 to 25.021 mm");
    }

    [Fact]
    public void Contains_Window_IsContainsOfBothLimits() => Gen.Select(Windows, Windows).Sample(static (a, b) =>
    {
        a.Contains(b).Should().Be(a.Contains(b.Min) && a.Contains(b.Max));
        a.Contains(a.Middle).Should().BeTrue();
        (a == b).Should().Be(a.Contains(b) && b.Contains(a));
    });

    [Fact]
    public void Middle_HalfAPicometre_RoundsDown() => new SizeWindow(new Length(1), new Length(2)).Middle.Should().Be(new Length(1));
}
