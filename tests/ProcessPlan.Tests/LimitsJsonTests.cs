using System.Text.Json;
using CsCheck;

namespace ProcessPlan.Tests;

public class LimitsJsonTests
{
    [Fact]
    public void A_feature_gives_the_fields_that_scripts_rely_on()
    {
        Answer answer = Answer.To("limits", "25H7", "--json");

        answer.Should().Be(new Answer(0,
            """{"features":[{"kind":"hole","nominal":25,"toleranceClass":"H7","grade":"IT7","toleranceUm":21,"upperUm":21,"lowerUm":0,"max":25.021,"min":25,"middle":25.0105,"unit":"mm"}],"fit":null}"""
            + "\n", ""));
    }

    [Fact]
    public void A_fit_gives_both_features_and_its_extreme_clearances()
    {
        using JsonDocument answer = JsonDocument.Parse(Answer.To("limits", "--json", "40 H7/k6").Output);

        answer.RootElement.GetProperty("features").EnumerateArray().Select(feature => feature.GetProperty("kind").GetString()).Should().Equal("hole", "shaft");
        answer.RootElement.GetProperty("fit").GetRawText().Should().Be("""{"character":"transition","maxClearanceUm":23,"minClearanceUm":-18}""");
    }

    [Theory]
    [InlineData("hole 25H7", "hole")]
    [InlineData("bore 25H7", "hole")]
    [InlineData("shaft 25h7", "shaft")]
    [InlineData("pin 25h7", "shaft")]
    [InlineData("slot 25H7", "slot")]
    [InlineData("keyway 25H7", "slot")]
    [InlineData("key 25h7", "tongue")]
    [InlineData("tongue 25h7", "tongue")]
    public void Every_word_for_a_kind_of_feature_comes_to_one_of_four(string line, string kind)
    {
        First(line).GetProperty("kind").GetString().Should().Be(kind);
    }

    [Fact]
    public void Typed_limits_have_no_class_but_the_nearest_grade_on_the_coarser_side()
    {
        JsonElement feature = First("bore 60 +0.030/0");

        feature.GetProperty("toleranceClass").ValueKind.Should().Be(JsonValueKind.Null);
        feature.GetProperty("grade").ValueKind.Should().Be(JsonValueKind.Null);
        feature.GetProperty("nearestGrade").GetString().Should().Be("IT7");
    }

    [Theory]
    [InlineData("8 JS9", "max", "8.018")]
    [InlineData("8 JS7", "upperUm", "7.5")]
    [InlineData("8 JS7", "middle", "8")]
    [InlineData("40.005 H7", "nominal", "40.005")]
    [InlineData("hole 1/64 in +.0001/0", "min", "0.396875")]
    [InlineData("hole .2500 +.0005 -.0000 in", "max", "6.3627")]
    [InlineData("shaft 3000 h6", "lowerUm", "-135")]
    public void Numbers_are_exact_decimals_without_binary_noise_or_trailing_zeros(string line, string field, string number)
    {
        First(line).GetProperty(field).GetRawText().Should().Be(number);
    }

    [Fact]
    public void Whatever_else_was_read_is_there_too()
    {
        string feature = First(
            "hole 25H7 x40 blind bottom 3 wall 8 interrupted Ra0.8 42CrMo4 28HRC hardened 58HRC coat zinc-nickel 8-12um before cyl 0.01 perp 0.02 cored 20 200off").GetRawText();

        feature.Should().EndWith(
            """
            "unit":"mm","extent":40,"end":"blind","bottomRoom":3,"wall":8,"interrupted":true,"raUm":0.8,"geometry":[{"kind":"cylindricity","zone":0.01},{"kind":"perpendicularity","zone":0.02}],"material":"42CrMo4","hardness":{"value":28,"scale":"HRC"},"treatment":{"kind":"hardened","hardness":{"value":58,"scale":"HRC"}},"coating":{"name":"zinc-nickel","leastUm":8,"mostUm":12,"limits":"before"},"start":{"kind":"cored","size":20},"quantity":200}
            """);
    }

    [Fact]
    public void Signs_of_the_trade_are_written_as_they_are()
    {
        Answer.To("limits", "--json", "Ø25 H7 ±").Output.Should().Contain("±").And.NotContain("\\u");
    }

    [Fact]
    public void Limits_and_deviations_of_every_answer_add_up()
    {
        Requests.Any.Sample(line =>
        {
            Answer answer = Answer.To("limits", "--json", line);
            using JsonDocument document = JsonDocument.Parse(answer.Output);
            if (answer.Exit != 0)
            {
                document.RootElement.GetProperty("problems").GetArrayLength().Should().BePositive(line);
                return;
            }

            foreach (JsonElement feature in document.RootElement.GetProperty("features").EnumerateArray())
            {
                decimal nominal = Number(feature, "nominal");
                (decimal max, decimal min) = (Number(feature, "max"), Number(feature, "min"));
                max.Should().Be(nominal + Number(feature, "upperUm") / 1000, line);
                min.Should().Be(nominal + Number(feature, "lowerUm") / 1000, line);
                ((max - min) * 1000).Should().Be(Number(feature, "toleranceUm"), line);
                Number(feature, "middle").Should().BeInRange(min, max, line);
            }
        });
    }

    private static decimal Number(JsonElement feature, string field) => feature.GetProperty(field).GetDecimal();

    private static JsonElement First(string line)
    {
        using JsonDocument document = JsonDocument.Parse(Answer.To("limits", "--json", line).Output);
        return document.RootElement.GetProperty("features")[0].Clone();
    }
}
