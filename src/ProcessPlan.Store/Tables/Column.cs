using System.Text.Json;
using LiteDB;

namespace ProcessPlan.Store.Tables;

/// <summary>One column of a table.</summary>
/// <param name="Name">The same in the book, in CSV and in JSON; sizes are in mm.</param>
/// <param name="Kind">What its cells hold.</param>
internal sealed record Column(string Name, CellKind Kind)
{
    private readonly JsonEncodedText _json = JsonEncodedText.Encode(Name);

    public string Format(BsonDocument row) => Kind.Format(row[Name]);

    public void WriteJson(Utf8JsonWriter json, BsonDocument row)
    {
        json.WritePropertyName(_json);
        Kind.WriteJson(json, row[Name]);
    }

    /// <summary>What is wrong with the row's cell; null where it may stand in the book.</summary>
    public string? Complaint(BsonDocument row) => Kind.Holds(row[Name]) ? null : $"{Name} holds no value that it may hold; expected {Kind.Expected}";
}

/// <summary>A column with where its value stands in a row.</summary>
internal sealed record Column<T>(string Name, CellKind Kind, Func<T, BsonValue> Value);
