using System.Text.Json;
using ProcessPlan.Core.Text;

namespace ProcessPlan.Documents;

/// <summary>The problems of one line as a property of the JSON object that is open.</summary>
public static class ProblemJson
{
    private static readonly JsonEncodedText Problems = JsonEncodedText.Encode("problems");
    private static readonly JsonEncodedText Message = JsonEncodedText.Encode("message");
    private static readonly JsonEncodedText At = JsonEncodedText.Encode("at");
    private static readonly JsonEncodedText Length = JsonEncodedText.Encode("length");
    private static readonly JsonEncodedText Expected = JsonEncodedText.Encode("expected");

    public static void Write(Utf8JsonWriter json, IReadOnlyList<Problem> problems)
    {
        json.WriteStartArray(Problems);
        foreach (Problem problem in problems)
        {
            json.WriteStartObject();
            json.WriteString(Message, problem.Message);
            json.WriteNumber(At, problem.At);
            json.WriteNumber(Length, problem.Length);
            json.WriteString(Expected, problem.Expected);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
