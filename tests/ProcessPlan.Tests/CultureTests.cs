namespace ProcessPlan.Tests;

public class CultureTests
{
    [Theory]
    [InlineData("limits", "40 H7/k6")]
    [InlineData("limits", "hole .2500 +.0005 -.0000 in", "--unit", "in")]
    [InlineData("limits", "shaft 25,5 -0,020/-0,041 Ra0,8", "--json")]
    [InlineData("limits", "25 H77 frobnicate")]
    [InlineData("limits", "-")]
    public void A_machine_that_writes_a_decimal_comma_gets_the_same_answer(params string[] words)
    {
        Answer plain = Answer.ToInput("25.5H7\n25,5h7\n", words);
        using DecimalComma culture = new();
        1.5.ToString(System.Globalization.CultureInfo.CurrentCulture).Should().Be("1,5", "the culture of this test writes a comma");

        Answer.ToInput("25.5H7\n25,5h7\n", words).Should().Be(plain);
    }
}
