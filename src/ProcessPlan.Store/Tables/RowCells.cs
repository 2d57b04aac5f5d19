using LiteDB;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Store.Tables;

/// <summary>The cells of one row that was found to hold what it may hold, by the type that they have outside.</summary>
internal readonly struct RowCells(BsonDocument row)
{
    public string Text(string column) => row[column].AsString;

    public ValueList<string> Words(string column) => [.. row[column].AsArray.Select(static word => word.AsString)];

    public Length Size(string column) => new(row[column].AsInt64);

    public ValueList<Length> Sizes(string column) => [.. row[column].AsArray.Select(static size => new Length(size.AsInt64))];

    public decimal Amount(string column) => row[column].AsDecimal;

    public double Number(string column) => row[column].AsDouble;

    public double? NumberOrNothing(string column) => row[column].IsNull ? null : row[column].AsDouble;

    public int Count(string column) => row[column].AsInt32;

    public bool IsYes(string column) => row[column].AsBoolean;
}
