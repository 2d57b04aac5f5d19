using ProcessPlan.Core.Standards;

namespace ProcessPlan.Core.Tests.Standards;

public class ToleranceClassTests
{
    [Fact]
    public void TryRead_EveryClass_ReadsWhatItWrites()
    {
        HashSet<string> texts = [];
        foreach (FundamentalDeviation letter in Enum.GetValues<FundamentalDeviation>())
        {
            for (int ordinal = 0; ordinal < ToleranceGrade.Count; ordinal++)
            {
                foreach (bool isInternal in new[] { true, false })
                {
                    ToleranceClass c = new(letter, isInternal, ToleranceGrade.At(ordinal));
                    string text = c.ToString();
                    texts.Add(text);
                    ToleranceClass.TryRead(text + "/x", out ToleranceClass value, out int read).Should().BeTrue("{0} is a class", text);
                    value.Should().Be(c);
                    read.Should().Be(text.Length);
                }
            }
        }

        texts.Should().HaveCount(28 * 20 * 2);
    }

    [Theory]
    [InlineData("H7", FundamentalDeviation.H, true, "IT7")]
    [InlineData("k6", FundamentalDeviation.K, false, "IT6")]
    [InlineData("JS9", FundamentalDeviation.JS, true, "IT9")]
    [InlineData("J7", FundamentalDeviation.J, true, "IT7")]
    [InlineData("zc11", FundamentalDeviation.ZC, false, "IT11")]
    [InlineData("h01", FundamentalDeviation.H, false, "IT01")]
    [InlineData("h0", FundamentalDeviation.H, false, "IT0")]
    [InlineData("fg18", FundamentalDeviation.FG, false, "IT18")]
    public void TryRead_Class_TakesTheLongestLetterAndTheCase(string text, FundamentalDeviation letter, bool isInternal, string grade)
    {
        ToleranceClass.TryRead(text, out ToleranceClass value, out int read).Should().BeTrue();
        value.Letter.Should().Be(letter);
        value.IsInternal.Should().Be(isInternal);
        value.Grade.Text.Should().Be(grade);
        read.Should().Be(text.Length);
    }

    [Theory]
    [InlineData("H7/k6", 2)]
    [InlineData("k6 x28", 2)]
    [InlineData("JS9x40", 3)]
    public void TryRead_ClassWithMoreBehind_ReadsTheClassOnly(string text, int length)
    {
        ToleranceClass.TryRead(text, out _, out int read).Should().BeTrue();
        read.Should().Be(length);
    }

    [Theory]
    [InlineData("")]
    [InlineData("H")]
    [InlineData("7")]
    [InlineData("Js7")]
    [InlineData("jS7")]
    [InlineData("hS7")]
    [InlineData("Zc9")]
    [InlineData("I7")]
    [InlineData("L7")]
    [InlineData("O7")]
    [InlineData("Q7")]
    [InlineData("W7")]
    [InlineData("ab7")]
    [InlineData("HRC58")]
    [InlineData("H 7")]
    [InlineData("H19")]
    [InlineData("H70")]
    [InlineData("H070")]
    [InlineData("H018")]
    [InlineData("H00")]
    [InlineData("Ä7")]
    public void TryRead_NoClass_ReadsNothing(string text)
    {
        ToleranceClass.TryRead(text, out ToleranceClass value, out int read).Should().BeFalse();
        value.Should().Be(default(ToleranceClass));
        read.Should().Be(0);
    }

    [Fact]
    public void TryRead_ManyTimes_AllocatesNothing()
    {
        ToleranceClass.TryRead("ZC11", out _, out _);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 1000; i++)
        {
            ToleranceClass.TryRead("ZC11", out _, out _);
            ToleranceClass.TryRead("hS7", out _, out _);
        }

        GC.GetAllocatedBytesForCurrentThread().Should().Be(before);
    }

    [Fact]
    public void Mirror_OfAClass_IsTheSameLetterOnTheOtherPart()
    {
        ToleranceClass hole = new(FundamentalDeviation.H, IsInternal: true, ToleranceGrade.It(7));
        hole.Mirror.ToString().Should().Be("h7");
        hole.Mirror.Mirror.Should().Be(hole);
        hole.Mirror.Should().NotBe(hole);
    }
}
