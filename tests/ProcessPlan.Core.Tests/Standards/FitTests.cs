using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Standards;

public class FitTests
{
    // H7/g6, H7/k6 and H7/p6 at 40 mm: computed from the limits in SKF, Rolling bearings, and MISUMI, JIS B 0401 (25/0, -9/-25, 18/2, 42/26).
    [Theory]
    [InlineData("H7", "g6", FitCharacter.Clearance, "+50", "+9")]
    [InlineData("H7", "k6", FitCharacter.Transition, "+23", "-18")]
    [InlineData("H7", "p6", FitCharacter.Interference, "-1", "-42")]
    [InlineData("H7", "h6", FitCharacter.Clearance, "+41", "0")]
    public void Character_OfACommonFit_IsTheOneOfTheStandard(string hole, string shaft, FitCharacter character, string most, string least)
    {
        Fit fit = new(At40(hole), At40(shaft));
        fit.Character.Should().Be(character);
        fit.MaxClearance.FormatSigned().Should().Be(most);
        fit.MinClearance.FormatSigned().Should().Be(least);
    }

    // ISO 286-1, terms: an interference fit may have the hole's upper limit equal to the shaft's lower limit.
    [Fact]
    public void Character_GreatestClearanceZero_IsInterference()
    {
        Fit fit = new(Window(39_990, 40_000), Window(40_000, 40_010));
        fit.Character.Should().Be(FitCharacter.Interference);
        fit.MaxClearance.Should().Be(default(Deviation));
    }

    private static SizeWindow At40(string text)
    {
        ToleranceClass.TryRead(text, out ToleranceClass c, out _).Should().BeTrue();
        Length size = Length.FromMillimetres(40);
        return Iso286.Find(size, c).LimitsAt(size);
    }

    private static SizeWindow Window(long min, long max) => new(Length.FromMicrometres(min), Length.FromMicrometres(max));
}
