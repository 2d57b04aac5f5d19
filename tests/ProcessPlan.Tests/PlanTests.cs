using System.Text.Json;

namespace ProcessPlan.Tests;

/// <summary>What a planner at the command line gets from <c>plan</c>.</summary>
public class PlanTests
{
    private const string DemoFeature = "hole 25H7 x40 thru Ra0.8 C45 200off";

    public static TheoryData<string> DemoFeatures() =>
        [.. File.ReadLines(DemoFile).Where(static line => line.Length > 0 && !line.StartsWith('#'))];

    private static string DemoFile => Path.Combine(Executable.Root, "demo-data", "features.txt");

    [Fact]
    public void The_demo_feature_is_drilled_bored_and_reamed_to_the_limits_of_the_drawing()
    {
        using JsonDocument plan = JsonDocument.Parse(Answer.To("plan", DemoFeature, "--json").Output);

        JsonElement[] operations = [.. plan.RootElement.GetProperty("routes")[0].GetProperty("operations").EnumerateArray()];
        operations.Select(static operation => operation.GetProperty("process").GetString()).Should().HaveCountGreaterThan(2)
            .And.StartWith("twist drilling").And.Subject.Last().Should().Contain("reaming");
        operations[^1].GetProperty("size").GetProperty("max").GetRawText().Should().Be("25.021");
        operations[^1].GetProperty("size").GetProperty("min").GetRawText().Should().Be("25");
        operations[^1].GetProperty("tool").GetProperty("diameter").GetRawText().Should().Be("25");
    }

    [Fact]
    public void The_document_has_every_field_that_scripts_rely_on()
    {
        using JsonDocument plan = JsonDocument.Parse(Answer.To("plan", DemoFeature, "--json").Output);

        plan.RootElement.EnumerateObject().Select(static field => field.Name)
            .Should().Contain(["features", "routes", "refusal", "rejected", "queries", "cautions", "assumptions"]);
        JsonElement route = plan.RootElement.GetProperty("routes")[0];
        route.EnumerateObject().Select(static field => field.Name)
            .Should().Contain(["rank", "costPerPiece", "currency", "minutesPerPiece", "setupMinutes", "yield", "operations"]);
        route.GetProperty("operations")[1].EnumerateObject().Select(static field => field.Name)
            .Should().Contain(["number", "process", "machine", "condition", "tool", "size", "grade", "raUm", "stockMin", "stockMax", "minutes", "cost", "inspection", "because", "cautions"]);
    }

    [Fact]
    public void The_first_cut_in_solid_metal_takes_no_stock()
    {
        using JsonDocument plan = JsonDocument.Parse(Answer.To("plan", DemoFeature, "--json").Output);

        JsonElement first = plan.RootElement.GetProperty("routes")[0].GetProperty("operations")[0];
        first.GetProperty("stockMin").ValueKind.Should().Be(JsonValueKind.Null);
        first.GetProperty("stockMax").ValueKind.Should().Be(JsonValueKind.Null);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(4)]
    public void As_many_other_ways_come_as_are_asked_for(int alternatives)
    {
        using JsonDocument plan = JsonDocument.Parse(Answer.To("plan", DemoFeature, "--json", "--alternatives", $"{alternatives}").Output);

        plan.RootElement.GetProperty("routes").GetArrayLength().Should().Be(alternatives + 1);
    }

    [Fact]
    public void A_fit_is_planned_as_two_features()
    {
        using JsonDocument plan = JsonDocument.Parse(Answer.To("plan", "40 H7/k6 C45", "--json", "--alternatives", "0").Output);

        plan.RootElement.GetProperty("routes").EnumerateArray().Select(static route => route.GetProperty("feature").GetInt32()).Should().Equal(0, 1);
        plan.RootElement.GetProperty("fit").GetProperty("character").GetString().Should().Be("transition");
    }

    [Fact]
    public void A_feature_without_a_route_is_refused_with_what_would_open_one()
    {
        Answer answer = Answer.To("plan", "hole 25H1 x 20", "--json");

        answer.Exit.Should().Be(1);
        using JsonDocument plan = JsonDocument.Parse(answer.Output);
        JsonElement refusal = plan.RootElement.GetProperty("refusal");
        refusal.GetProperty("requirement").GetString().Should().Be("25 H1");
        refusal.GetProperty("message").GetString().Should().Be("No process of this shop finishes 25 H1.");
        refusal.GetProperty("wouldOpen").GetArrayLength().Should().BePositive();
        plan.RootElement.GetProperty("routes").GetArrayLength().Should().Be(0);
    }

    [Theory]
    [InlineData("--why found 'speed'; expected an operation such as 20, one of size, aim, tool, stock, grade, minutes, cost, inspection, or both such as 20:stock.", "--why=speed")]
    [InlineData("--alternatives found '21'; expected a whole number from 0 to 20.", "--alternatives=21")]
    public void A_choice_that_does_not_exist_is_answered_in_one_sentence(string sentence, string option)
    {
        Answer.To("plan", DemoFeature, option).Should().Be(new Answer(2, "", $"processplan: {sentence}\n"));
    }

    [Theory]
    [MemberData(nameof(DemoFeatures))]
    public void The_card_of_each_demo_feature_keeps_to_eighty_columns_and_ends_with_a_route(string line)
    {
        Answer answer = Answer.To("plan", line, "--why");

        answer.Exit.Should().Be(0, answer.Output);
        answer.Output.Split('\n').Should().OnlyContain(static shown => shown.Length <= 80);
        answer.Output.Should().Contain("ROUTE CARD").And.Contain("Cautions").And.Contain("minutes: cut:");
    }

    [Fact]
    public void The_card_says_where_one_number_comes_from_when_asked()
    {
        string card = Answer.To("plan", DemoFeature, "--why", "20:stock").Output;

        card.Should().Contain("stock: least stock, analytical: 2·(Rz ").And.NotContain("minutes: cut:");
    }

    [Fact]
    public void A_file_of_features_is_planned_as_a_stream()
    {
        Answer answer = Answer.ToInput(File.ReadAllText(DemoFile), "plan", "-");

        string[] documents = answer.Output.Split('\n', StringSplitOptions.RemoveEmptyEntries);
        documents.Should().HaveCount(DemoFeatures().Count);
        answer.Exit.Should().Be(0);
    }

    [Fact]
    public void The_same_feature_gives_the_same_card_byte_for_byte()
    {
        Answer.To("plan", DemoFeature, "--json").Should().Be(Answer.To("plan", "200off C45 Ra0.8 hole thru x40 25H7", "--json"));
    }
}
