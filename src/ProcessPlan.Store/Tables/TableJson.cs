using System.Text.Json;

namespace ProcessPlan.Store.Tables;

/// <summary>A table as a JSON array of its rows, with all columns.</summary>
public static class TableJson
{
    public static void Write(BookTable table, ShopEdition edition, Utf8JsonWriter json)
    {
        json.WriteStartArray(table.Name);
        foreach (ShopRow row in table.RowsOf(edition))
        {
            json.WriteStartObject();
            json.WriteNumber("id", row.Id);
            for (int i = 0; i < row.Cells.Length; i++)
            {
                json.WritePropertyName(table.Columns[i].Name);
                table.Columns[i].Kind.WriteJson(json, row.Cells[i]);
            }

            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
