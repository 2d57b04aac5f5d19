using ProcessPlan.Core.Features;

namespace ProcessPlan.Core.Tests.Features;

public sealed class MaterialNamesTests
{
    private static readonly MaterialNames Names = new([["EN-AW-6061", "6061", "AW6061"], ["X5CrNi18-10", "1.4301", "304"], ["C45", "1.0503", "6061"]]);

    [Theory]
    [InlineData("EN-AW-6061", "EN-AW-6061")]
    [InlineData("en aw 6061", "EN-AW-6061")]
    [InlineData("EN_AW_6061", "EN-AW-6061")]
    [InlineData("aw6061", "EN-AW-6061")]
    [InlineData("1.4301", "X5CrNi18-10")]
    [InlineData("1,4301", "X5CrNi18-10")]
    [InlineData("x5crni1810", "X5CrNi18-10")]
    public void TryFind_Name_IgnoresCaseSpacesAndHyphens(string name, string designation)
    {
        Names.TryFind(name, out string found).Should().BeTrue();
        found.Should().Be(designation);
    }

    [Theory]
    [InlineData("")]
    [InlineData("-")]
    [InlineData("14301")]
    [InlineData("C46")]
    [InlineData("EN-AW-6061-EN-AW-6061-EN-AW-6061-EN-AW-6061")]
    public void TryFind_NoSuchName_IsFalse(string name) => Names.TryFind(name, out _).Should().BeFalse();

    [Theory]
    [InlineData("6061-T6")]
    [InlineData("EN AW 6061 T651")]
    [InlineData("aw6061t6")]
    public void TryFind_AluminiumWithItsTemper_IsTheAluminium(string name)
    {
        Names.TryFind(name, out string found).Should().BeTrue();
        found.Should().Be("EN-AW-6061");
    }

    [Theory]
    [InlineData("6061-T")]
    [InlineData("6061-T65111")]
    [InlineData("6061-T6x")]
    [InlineData("7075-T6")]
    [InlineData("1.0503-T6")]
    public void TryFind_TemperOfNothingKnown_IsFalse(string name) => Names.TryFind(name, out _).Should().BeFalse();

    [Theory]
    [InlineData("AW-606", "EN-AW-6061")]
    [InlineData("crni18", "X5CrNi18-10")]
    [InlineData("1.43", "X5CrNi18-10")]
    [InlineData("1.4301+2B", "X5CrNi18-10")]
    [InlineData("304L", null)]
    [InlineData("C4", null)]
    [InlineData("---", null)]
    [InlineData("C46", null)]
    [InlineData("EN-AW-6061-EN-AW-6061-EN-AW-6061-EN-AW-6061", null)]
    public void Containing_Part_IsTheFirstDesignation(string part, string? designation) => Names.Containing(part).Should().Be(designation);

    [Fact]
    public void TryFind_AliasOfTwo_IsTheFirst()
    {
        Names.TryFind("6061", out string found).Should().BeTrue();
        found.Should().Be("EN-AW-6061");
    }

    [Fact]
    public void Designations_InOrder_AreEachMaterialOnce() => Names.Designations.Should().Equal("EN-AW-6061", "X5CrNi18-10", "C45");

    [Fact]
    public void None_HasNoName() => MaterialNames.None.TryFind("C45", out _).Should().BeFalse();

    [Fact]
    public void New_NameTooLong_Throws()
    {
        Action tooLong = static () => _ = new MaterialNames([[new string('C', 41)]]);
        tooLong.Should().Throw<ArgumentException>().WithMessage("The material name 'CCCCC*' is longer than 40 characters.*");
    }
}
