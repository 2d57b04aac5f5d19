using System.Text.Json;
using ProcessPlan.Core;
using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Documents;

/// <summary>A plan as properties of the JSON object that is open: one for a feature, for a fit the routes of both, each with its feature's place.</summary>
public static class PlanJson
{
    private const int MoneyPlaces = 2;
    private const int MinutePlaces = 3;
    private const int YieldPlaces = 4;

    private static readonly JsonEncodedText Routes = JsonEncodedText.Encode("routes");
    private static readonly JsonEncodedText Feature = JsonEncodedText.Encode("feature");
    private static readonly JsonEncodedText Rank = JsonEncodedText.Encode("rank");
    private static readonly JsonEncodedText CostPerPiece = JsonEncodedText.Encode("costPerPiece");
    private static readonly JsonEncodedText Currency = JsonEncodedText.Encode("currency");
    private static readonly JsonEncodedText MinutesPerPiece = JsonEncodedText.Encode("minutesPerPiece");
    private static readonly JsonEncodedText SetupMinutes = JsonEncodedText.Encode("setupMinutes");
    private static readonly JsonEncodedText Yield = JsonEncodedText.Encode("yield");
    private static readonly JsonEncodedText Blanks = JsonEncodedText.Encode("piecesToStart");
    private static readonly JsonEncodedText From = JsonEncodedText.Encode("from");
    private static readonly JsonEncodedText Operations = JsonEncodedText.Encode("operations");
    private static readonly JsonEncodedText Number = JsonEncodedText.Encode("number");
    private static readonly JsonEncodedText Process = JsonEncodedText.Encode("process");
    private static readonly JsonEncodedText Machine = JsonEncodedText.Encode("machine");
    private static readonly JsonEncodedText Condition = JsonEncodedText.Encode("condition");
    private static readonly JsonEncodedText EffortName = JsonEncodedText.Encode("effort");
    private static readonly JsonEncodedText ToolName = JsonEncodedText.Encode("tool");
    private static readonly JsonEncodedText Name = JsonEncodedText.Encode("name");
    private static readonly JsonEncodedText Diameter = JsonEncodedText.Encode("diameter");
    private static readonly JsonEncodedText Size = JsonEncodedText.Encode("size");
    private static readonly JsonEncodedText Max = JsonEncodedText.Encode("max");
    private static readonly JsonEncodedText Min = JsonEncodedText.Encode("min");
    private static readonly JsonEncodedText Aim = JsonEncodedText.Encode("aim");
    private static readonly JsonEncodedText Grade = JsonEncodedText.Encode("grade");
    private static readonly JsonEncodedText RaUm = JsonEncodedText.Encode("raUm");
    private static readonly JsonEncodedText StockMin = JsonEncodedText.Encode("stockMin");
    private static readonly JsonEncodedText StockMax = JsonEncodedText.Encode("stockMax");
    private static readonly JsonEncodedText MinutesName = JsonEncodedText.Encode("minutes");
    private static readonly JsonEncodedText Cost = JsonEncodedText.Encode("cost");
    private static readonly JsonEncodedText Inspection = JsonEncodedText.Encode("inspection");
    private static readonly JsonEncodedText Because = JsonEncodedText.Encode("because");
    private static readonly JsonEncodedText Cautions = JsonEncodedText.Encode("cautions");
    private static readonly JsonEncodedText Why = JsonEncodedText.Encode("why");
    private static readonly JsonEncodedText About = JsonEncodedText.Encode("about");
    private static readonly JsonEncodedText Text = JsonEncodedText.Encode("text");
    private static readonly JsonEncodedText RefusalName = JsonEncodedText.Encode("refusal");
    private static readonly JsonEncodedText Requirement = JsonEncodedText.Encode("requirement");
    private static readonly JsonEncodedText Message = JsonEncodedText.Encode("message");
    private static readonly JsonEncodedText Best = JsonEncodedText.Encode("best");
    private static readonly JsonEncodedText WouldOpen = JsonEncodedText.Encode("wouldOpen");
    private static readonly JsonEncodedText Rejected = JsonEncodedText.Encode("rejected");
    private static readonly JsonEncodedText Queries = JsonEncodedText.Encode("queries");
    private static readonly JsonEncodedText Assumptions = JsonEncodedText.Encode("assumptions");

    /// <param name="json">The writer, inside an object.</param>
    /// <param name="request">What was asked.</param>
    /// <param name="plans">One plan for each feature of the request, in its order.</param>
    public static void Write(Utf8JsonWriter json, FeatureRequest request, IReadOnlyList<Plan> plans)
    {
        LimitsJson.Write(json, request);
        json.WriteStartArray(Routes);
        for (int i = 0; i < plans.Count; i++)
        {
            foreach (Route route in plans[i].Routes)
            {
                Write(json, route, i);
            }
        }

        json.WriteEndArray();
        Write(json, plans.Select(static plan => plan.Refusal).FirstOrDefault(static refusal => refusal is not null));
        json.WriteStartArray(Rejected);
        foreach (Rejection rejection in plans.SelectMany(static plan => plan.Rejected))
        {
            json.WriteStartObject();
            json.WriteString(Process, rejection.Process);
            json.WriteString(Because, rejection.Because);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        Write(json, Queries, plans.SelectMany(static plan => plan.Queries).Distinct());
        Write(json, Cautions, plans.SelectMany(static plan => plan.Cautions).Distinct());
        Write(json, Assumptions, plans.SelectMany(static plan => plan.Assumptions).Distinct());
    }

    private static void Write(Utf8JsonWriter json, Route route, int feature)
    {
        json.WriteStartObject();
        json.WriteNumber(Feature, feature);
        json.WriteNumber(Rank, route.Rank);
        json.WriteNumber(CostPerPiece, route.ShownCost.Rounded);
        json.WriteString(Currency, route.CostPerPiece.Currency);
        json.WriteNumber(MinutesPerPiece, Math.Round(route.MinutesPerPiece.Value, MinutePlaces));
        json.WriteNumber(SetupMinutes, Math.Round(route.SetUp.Value, MinutePlaces));
        json.WriteNumber(Yield, Math.Round(route.Yield, YieldPlaces));
        json.WriteNumber(Blanks, route.Blanks);
        json.WriteString(From, route.From);
        json.WriteStartArray(Operations);
        foreach (Operation operation in route.Operations)
        {
            Write(json, operation);
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, Operation operation)
    {
        json.WriteStartObject();
        json.WriteNumber(Number, operation.Number);
        json.WriteString(Process, operation.Process);
        json.WriteString(Machine, operation.Machine);
        json.WriteString(Condition, Word(operation.Condition));
        json.WriteString(EffortName, operation.Effort == Effort.Special ? "special" : "routine");
        WriteTool(json, operation);
        WriteSize(json, operation);
        json.WriteString(Grade, operation.Grade?.Text);
        if (operation.Ra is { } ra)
        {
            json.WriteNumber(RaUm, ra.Nanometres / 1000m);
        }
        else
        {
            json.WriteNull(RaUm);
        }

        WriteStock(json, StockMin, operation.StockMin);
        WriteStock(json, StockMax, operation.StockMax);
        json.WriteNumber(MinutesName, Math.Round(operation.Minutes.Value, MinutePlaces));
        json.WriteNumber(SetupMinutes, Math.Round(operation.SetUp.Value, MinutePlaces));
        json.WriteNumber(Cost, Math.Round(operation.Cost.Amount, MoneyPlaces, MidpointRounding.AwayFromZero));
        json.WriteString(Inspection, operation.Inspection);
        Write(json, Because, operation.Because);
        Write(json, Cautions, operation.Cautions);
        json.WriteStartArray(Why);
        foreach (Reason reason in operation.Why)
        {
            json.WriteStartObject();
            json.WriteString(About, reason.About);
            json.WriteString(Text, reason.Text);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteTool(Utf8JsonWriter json, Operation operation)
    {
        if (operation.Tool is not { } tool)
        {
            json.WriteNull(ToolName);
            return;
        }

        json.WriteStartObject(ToolName);
        json.WriteString(Name, tool.Label);
        json.WriteMillimetres(Diameter, tool.Stamped);
        json.WriteEndObject();
    }

    private static void WriteSize(Utf8JsonWriter json, Operation operation)
    {
        if (operation.Size is not { } size)
        {
            json.WriteNull(Size);
            return;
        }

        json.WriteStartObject(Size);
        json.WriteMillimetres(Max, size.Max);
        json.WriteMillimetres(Min, size.Min);
        json.WriteMillimetres(Aim, operation.Aim ?? size.Middle);
        json.WriteEndObject();
    }

    private static void WriteStock(Utf8JsonWriter json, JsonEncodedText name, Stock? stock)
    {
        if (stock is { } removed)
        {
            json.WriteMillimetres(name, new Length(removed.Picometres));
        }
        else
        {
            json.WriteNull(name);
        }
    }

    private static void Write(Utf8JsonWriter json, Refusal? refusal)
    {
        if (refusal is null)
        {
            json.WriteNull(RefusalName);
            return;
        }

        json.WriteStartObject(RefusalName);
        json.WriteString(Requirement, refusal.Requirement);
        json.WriteString(Message, refusal.Message);
        json.WriteString(Best, refusal.Best);
        Write(json, WouldOpen, refusal.WouldOpen);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, JsonEncodedText name, IEnumerable<string> texts)
    {
        json.WriteStartArray(name);
        foreach (string text in texts)
        {
            json.WriteStringValue(text);
        }

        json.WriteEndArray();
    }

    private static string Word(Condition condition) => condition switch
    {
        Core.Routing.Condition.Soft => "soft",
        Core.Routing.Condition.Hard => "hard",
        Core.Routing.Condition.Coated => "coated",
        _ => throw new ArgumentOutOfRangeException(nameof(condition), condition, "Soft, hard or coated."),
    };
}
