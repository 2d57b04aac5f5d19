using ProcessPlan.Core.Text;

namespace ProcessPlan.Core.Tests.Text;

public sealed class ParsedTests
{
    [Fact]
    public void Of_Value_HasNoProblems()
    {
        Parsed<string> parsed = Parsed<string>.Of("read");
        (parsed.IsRead, parsed.Value).Should().Be((true, "read"));
        parsed.Problems.Should().BeEmpty();
    }

    [Fact]
    public void Failed_Problems_HasNoValue()
    {
        Problem problem = new("It is not understood.", 0, 1, "something else");
        Parsed<string> parsed = Parsed<string>.Failed([problem]);
        (parsed.IsRead, parsed.Value).Should().Be((false, null));
        parsed.Problems.Should().Equal(problem);
    }

    [Fact]
    public void Failed_WithoutAProblem_Throws()
    {
        Action failed = static () => Parsed<string>.Failed([]);
        failed.Should().Throw<ArgumentException>().WithMessage("A failure needs at least one problem.*");
    }
}
