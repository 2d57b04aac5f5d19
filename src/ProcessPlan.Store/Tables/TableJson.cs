using System.Text.Json;
using LiteDB;

namespace ProcessPlan.Store.Tables;

/// <summary>A table as a JSON array of its rows, with all columns.</summary>
public static class TableJson
{
    public static void Write(BookTable table, ShopEdition edition, Utf8JsonWriter json)
    {
        json.WriteStartArray(table.Name);
        foreach (BsonDocument row in table.Documents(edition))
        {
            json.WriteStartObject();
            json.WriteNumber("id", row[BookTable.Id].AsInt64);
            foreach (Column column in table.Columns)
            {
                column.WriteJson(json, row);
            }

            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
