using ProcessPlan.Core.Standards;

namespace ProcessPlan.Core.Tests.Standards;

public class ToleranceGradeTests
{
    [Fact]
    public void Order_OfAllGrades_RunsFromIT01OverIT0AndIT1ToIT18()
    {
        List<string> grades = [];
        for (ToleranceGrade? grade = ToleranceGrade.IT01; grade is { } it; grade = it.Coarser)
        {
            it.Ordinal.Should().Be(grades.Count);
            ToleranceGrade.At(it.Ordinal).Should().Be(it);
            grades.Add(it.Text);
        }

        grades.Should().Equal(
            "IT01", "IT0", "IT1", "IT2", "IT3", "IT4", "IT5", "IT6", "IT7", "IT8",
            "IT9", "IT10", "IT11", "IT12", "IT13", "IT14", "IT15", "IT16", "IT17", "IT18");
    }

    [Fact]
    public void IT01_BesideIT1_IsAnotherGrade()
    {
        ToleranceGrade.IT01.Should().NotBe(ToleranceGrade.It(1));
        (ToleranceGrade.IT01 < ToleranceGrade.IT0).Should().BeTrue();
        (ToleranceGrade.IT0 < ToleranceGrade.It(1)).Should().BeTrue();
        ToleranceGrade.It(1).Ordinal.Should().Be(2);
    }

    [Fact]
    public void Finer_AtTheEnds_IsNull()
    {
        ToleranceGrade.IT01.Finer.Should().BeNull();
        ToleranceGrade.It(18).Coarser.Should().BeNull();
        ToleranceGrade.It(1).Finer.Should().Be(ToleranceGrade.IT0);
        ToleranceGrade.It(7).Coarser.Should().Be(ToleranceGrade.It(8));
    }

    [Fact]
    public void Default_IsIT01() => default(ToleranceGrade).Should().Be(ToleranceGrade.IT01);

    [Theory]
    [InlineData(0)]
    [InlineData(19)]
    [InlineData(-1)]
    public void It_NoSuchNumber_SaysTheRange(int number) => FluentActions.Invoking(() => ToleranceGrade.It(number))
        .Should().Throw<ArgumentOutOfRangeException>().WithMessage("The grades with a number of their own are IT1 to IT18.*");

    [Theory]
    [InlineData(-1)]
    [InlineData(20)]
    public void At_NoSuchOrdinal_SaysTheRange(int ordinal) => FluentActions.Invoking(() => ToleranceGrade.At(ordinal))
        .Should().Throw<ArgumentOutOfRangeException>().WithMessage("There are twenty grades, 0 (IT01) to 19 (IT18).*");

    [Fact]
    public void TryRead_EveryText_ReadsItsGradeWhole()
    {
        for (int ordinal = 0; ordinal < ToleranceGrade.Count; ordinal++)
        {
            ToleranceGrade grade = ToleranceGrade.At(ordinal);
            ToleranceGrade.TryRead(grade.Text + " x", out ToleranceGrade value, out int read).Should().BeTrue();
            value.Should().Be(grade);
            read.Should().Be(grade.Text.Length);
            grade.ToString().Should().Be("IT" + grade.Symbol);
        }

        ToleranceGrade.TryRead("it7", out ToleranceGrade small, out _).Should().BeTrue();
        small.Should().Be(ToleranceGrade.It(7));
    }

    [Theory]
    [InlineData("")]
    [InlineData("7")]
    [InlineData("IT")]
    [InlineData("IT 7")]
    [InlineData("IT19")]
    [InlineData("IT00")]
    [InlineData("IT02")]
    [InlineData("IT010")]
    [InlineData("IT70")]
    public void TryRead_NoGrade_ReadsNothing(string text)
    {
        ToleranceGrade.TryRead(text, out ToleranceGrade value, out int read).Should().BeFalse();
        value.Should().Be(ToleranceGrade.IT01);
        read.Should().Be(0);
    }
}
