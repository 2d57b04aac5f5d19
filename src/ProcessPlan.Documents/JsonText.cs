using System.Buffers;
using System.Text.Encodings.Web;
using System.Text.Json;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Documents;

/// <summary>How this program writes JSON: exact decimals, and signs of the trade such as Ø and µ as they are.</summary>
public static class JsonText
{
    private const int LongestNumber = 24;

    private static readonly JsonWriterOptions Options = new()
    {
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        SkipValidation = true,
    };

    public static Utf8JsonWriter Writer(IBufferWriter<byte> target) => new(target, Options);

    /// <summary>A length in millimetres, exact.</summary>
    public static void WriteMillimetres(this Utf8JsonWriter json, JsonEncodedText name, Length length)
    {
        Span<byte> number = stackalloc byte[LongestNumber];
        json.WritePropertyName(name);
        json.WriteRawValue(number[..length.WriteMillimetres(number)], skipInputValidation: true);
    }

    /// <summary>A length in millimetres, exact; nothing where there is none.</summary>
    public static void WriteMillimetresIfGiven(this Utf8JsonWriter json, JsonEncodedText name, Length? length)
    {
        if (length is { } given)
        {
            json.WriteMillimetres(name, given);
        }
    }

    /// <summary>A difference in micrometres, exact; a half stays a half.</summary>
    public static void WriteMicrometres(this Utf8JsonWriter json, JsonEncodedText name, Deviation deviation)
    {
        Span<byte> number = stackalloc byte[LongestNumber];
        json.WritePropertyName(name);
        json.WriteRawValue(number[..deviation.WriteMicrometres(number)], skipInputValidation: true);
    }

    /// <summary>A decimal, exact.</summary>
    public static void WriteDecimal(this Utf8JsonWriter json, JsonEncodedText name, long units, int places)
    {
        Span<byte> number = stackalloc byte[LongestNumber];
        json.WritePropertyName(name);
        json.WriteRawValue(number[..DecimalText.Write(number, units, places)], skipInputValidation: true);
    }
}
