using System.CommandLine;
using System.CommandLine.Parsing;
using System.Globalization;
using System.Text.Json;
using ProcessPlan.Core;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Documents;

namespace ProcessPlan;

/// <summary><c>plan FEATURE</c>: the route card of a feature, or of the two features of a fit.</summary>
internal static class PlanCommand
{
    private const int UsualAlternatives = 2;
    private const int MostAlternatives = 20;
    private static readonly string[] Numbers = ["size", "aim", "tool", "stock", "grade", "minutes", "cost", "inspection"];

    public static Command Create(Streams streams)
    {
        FeatureQuestion question = new();
        Option<int> alternatives = new("--alternatives")
        {
            Description = $"How many other ways beside the cheapest, 0 to {MostAlternatives}",
            HelpName = "N",
            DefaultValueFactory = static _ => UsualAlternatives,
            CustomParser = ReadAlternatives,
        };
        Option<WhyAsked?> why = new("--why")
        {
            Description = "Says where the numbers come from: all, those of one operation (20), of one kind (stock), or both (20:stock)",
            HelpName = "WHAT",
            Arity = ArgumentArity.ZeroOrOne,
            CustomParser = ReadWhy,
        };
        Command plan = new("plan", "Plans the route of a feature: operations, sizes, stock, tools, time and cost") { alternatives, why };
        ShopChoice choice = new();
        question.AddTo(plan);
        plan.Options.Add(choice.Shop);
        plan.SetAction(parsed =>
        {
            ShopFloor shop = choice.Floor(parsed);
            int routes = parsed.GetValue(alternatives) + 1;
            WhyAsked? asked = parsed.GetResult(why) is null ? null : parsed.GetValue(why) ?? new WhyAsked(null, null);
            return FeatureQuestion.Answer(
                question.In(parsed),
                streams,
                () => shop.Names,
                (json, request) => Write(json, request, Plans(request, shop, routes)),
                (text, request, unit) => Write(new PlanText(text, unit, asked), request, Plans(request, shop, routes)));
        });
        return plan;
    }

    private static List<Plan> Plans(FeatureRequest request, ShopFloor shop, int routes) =>
        [.. request.Features.Select(feature => Planner.Plan(feature, shop, routes))];

    private static int Write(Utf8JsonWriter json, FeatureRequest request, List<Plan> plans)
    {
        PlanJson.Write(json, request, plans);
        return Exit(plans);
    }

    private static int Write(PlanText text, FeatureRequest request, List<Plan> plans)
    {
        text.Write(request, plans);
        return Exit(plans);
    }

    private static int Exit(List<Plan> plans) => plans.Exists(static plan => plan.Refusal is not null) ? ExitCode.Refused : ExitCode.Done;

    private static int ReadAlternatives(ArgumentResult result)
    {
        string word = result.Tokens is [Token only] ? only.Value : "";
        if (!int.TryParse(word, NumberStyles.None, CultureInfo.InvariantCulture, out int number) || number > MostAlternatives)
        {
            result.AddError($"--alternatives found '{word}'; expected a whole number from 0 to {MostAlternatives}.");
        }

        return number;
    }

    private static WhyAsked? ReadWhy(ArgumentResult result)
    {
        if (result.Tokens is not [Token only])
        {
            return new WhyAsked(null, null);
        }

        string[] parts = only.Value.Split(':');
        bool numbered = int.TryParse(parts[0], NumberStyles.None, CultureInfo.InvariantCulture, out int operation);
        string? about = numbered ? parts.ElementAtOrDefault(1) : parts[0];
        if (parts.Length > 2 || (!numbered && parts.Length > 1) || (about is not null && !Numbers.Contains(about, StringComparer.OrdinalIgnoreCase)))
        {
            result.AddError($"--why found '{only.Value}'; expected an operation such as 20, one of {string.Join(", ", Numbers)}, or both such as 20:stock.");
        }

        return new WhyAsked(numbered ? operation : null, about);
    }
}
