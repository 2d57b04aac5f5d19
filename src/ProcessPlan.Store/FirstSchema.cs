using LiteDB;
using ProcessPlan.Core.Values;
using ProcessPlan.Store.Tables;

namespace ProcessPlan.Store;

/// <summary>A book of the first schema, as it was written until its rows went into pages: one document a row, one field a cell.</summary>
internal static class FirstSchema
{
    public static ShopRow Row(BookTable table, BsonDocument row) => new(
        row["_id"].AsInt64, [.. table.Columns.Select(column => Cell(row[column.Name], column.Kind))], row["retired"].IsNull ? null : row["retired"].AsString);

    private static object? Cell(BsonValue value, CellKind kind) => value.Type switch
    {
        BsonType.Null => null,
        BsonType.Int64 => new Length(value.AsInt64),
        BsonType.Array when kind == CellKind.Sizes => (ValueList<Length>)[.. value.AsArray.Select(static size => new Length(size.AsInt64))],
        BsonType.Array => (ValueList<string>)[.. value.AsArray.Select(static word => word.AsString)],
        _ => value.RawValue,
    };
}
