using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Tooling;

public class ReamerChoiceTests
{
    private static readonly ShopFloor Floor = HandbookShop.Load();
    private static readonly Tool[] Near = [.. Floor.Tools(ToolUse.Ream).Where(tool => tool.Stamped.Millimetres is > 9.9m and < 10.2m)];

    // A stock H7 reamer must not be handed to an M7, N7, P7, F8 or G6 hole (common practice, no source); H7, H8 and H9 are what it is for or can serve.
    [Theory]
    [InlineData("H7", true)]
    [InlineData("H8", true)]
    [InlineData("H9", true)]
    [InlineData("H6", false)]
    [InlineData("JS7", false)]
    [InlineData("K7", false)]
    [InlineData("M7", false)]
    [InlineData("N7", false)]
    [InlineData("P7", false)]
    [InlineData("G6", false)]
    [InlineData("F8", false)]
    public void Suits_AStockH7Reamer_OnlyHolesWhoseLimitsHoldIt(string hole, bool suits)
    {
        foreach (Tool reamer in Floor.Tools(ToolUse.Ream).Where(tool => tool.Made == "H7" && tool.Stamped.Millimetres > 3))
        {
            ReamerChoice.Suits(reamer, Hole(reamer.Stamped, hole), out string because).Should().Be(suits, "{0} in {1}: {2}", reamer.Label, hole, because);
            because.Should().NotBeEmpty();
        }
    }

    // 10 D8 asks for a reamer of 10.050 to 10.058 (Dormer); the stock size 10.05 with +0/+5 covers 10.050 to 10.055.
    [Fact]
    public void Suits_TheHundredthStepReamer_For10D8Is10Point05()
    {
        SizeWindow hole = Hole(Length.FromMillimetres(10), "D8");
        Tool[] suited = [.. Floor.Tools(ToolUse.Ream).Where(tool => ReamerChoice.Suits(tool, hole, out _))];
        suited.Should().Contain(tool => tool.Stamped == Length.FromMillimetres(10.05m));
        suited.Should().OnlyContain(tool => tool.Own.Max <= Length.FromMillimetres(10.058m), "DIN 1420");
    }

    [Fact]
    public void Suited_EqualYields_BeginsWithTheReamerMadeForTheClassThenBySize()
    {
        ToleranceClass.TryRead("H7", out ToleranceClass h7, out _);
        SizeWindow wide = Hole(Length.FromMillimetres(10), "H10");
        Tool[] suited = [.. ReamerChoice.Suited(Near, wide, h7, static _ => 1)];
        suited.Should().HaveCountGreaterThan(2);
        suited[0].Label.Should().Be("machine reamer 10 H7");
        suited[1..].Select(tool => tool.Own.Max).Should().BeInAscendingOrder();
        suited.Should().BeEquivalentTo(Near.Where(tool => ReamerChoice.Suits(tool, wide, out _)));
    }

    [Fact]
    public void Suited_ABetterYield_GoesBeforeEverything()
    {
        SizeWindow hole = Hole(Length.FromMillimetres(10), "H9");
        Tool best = Near.Single(tool => tool.Stamped == Length.FromMillimetres(10.02m));
        ReamerChoice.Suited(Near, hole, null, tool => tool == best ? 0.99 : 0.98).First().Should().Be(best);
        ReamerChoice.Suited([], hole, null, static _ => 1).Should().BeEmpty();
    }

    private static SizeWindow Hole(Length nominal, string hole)
    {
        ToleranceClass.TryRead(hole, out ToleranceClass toleranceClass, out _).Should().BeTrue();
        return Iso286.Find(nominal, toleranceClass).LimitsAt(nominal);
    }
}
