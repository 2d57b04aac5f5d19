using System.Text.Json;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Standards;

namespace ProcessPlan.Documents;

/// <summary>The limits of a request, and its fit, as properties of the JSON object that is open.</summary>
public static class LimitsJson
{
    private static readonly JsonEncodedText FitOfTwo = JsonEncodedText.Encode("fit");
    private static readonly JsonEncodedText Character = JsonEncodedText.Encode("character");
    private static readonly JsonEncodedText MaxClearance = JsonEncodedText.Encode("maxClearanceUm");
    private static readonly JsonEncodedText MinClearance = JsonEncodedText.Encode("minClearanceUm");

    public static void Write(Utf8JsonWriter json, FeatureRequest request)
    {
        FeatureJson.Write(json, request);
        if (request.Mate is not { } mate)
        {
            json.WriteNull(FitOfTwo);
            return;
        }

        Fit fit = new(request.First.Limits, mate.Limits);
        json.WriteStartObject(FitOfTwo);
        json.WriteString(Character, Word(fit.Character));
        json.WriteMicrometres(MaxClearance, fit.MaxClearance);
        json.WriteMicrometres(MinClearance, fit.MinClearance);
        json.WriteEndObject();
    }

    internal static string Word(FitCharacter character) => character switch
    {
        FitCharacter.Clearance => "clearance",
        FitCharacter.Transition => "transition",
        FitCharacter.Interference => "interference",
        _ => throw new ArgumentOutOfRangeException(nameof(character), character, "Clearance, transition or interference."),
    };
}
