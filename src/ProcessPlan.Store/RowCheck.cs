using LiteDB;

namespace ProcessPlan.Store;

/// <summary>
/// A sum over all cells of a row that stands in the row: the library does not notice when bytes of its file have changed, and a wrong size would be planned with.
/// </summary>
internal static class RowCheck
{
    private const string Check = "check";
    private const ulong Offset = 14695981039346656037;
    private const ulong Prime = 1099511628211;

    public static BsonDocument Stamp(this BsonDocument row)
    {
        row[Check] = Sum(row);
        return row;
    }

    public static bool IsIntact(this BsonDocument row) => row[Check].IsInt64 && row[Check].AsInt64 == Sum(row);

    /// <summary>The sum that stands in the row.</summary>
    public static long Checked(this BsonDocument row) => row[Check].AsInt64;

    /// <summary>FNV-1a, taken over words instead of bytes.</summary>
    private static long Sum(BsonDocument row)
    {
        ulong sum = Offset;
        AddCells(ref sum, row);
        return unchecked((long)sum);
    }

    private static void AddCells(ref ulong sum, BsonDocument row)
    {
        foreach ((string name, BsonValue value) in row.GetElements())
        {
            if (name != Check)
            {
                AddText(ref sum, name);
                Add(ref sum, value);
            }
        }
    }

    private static void Add(ref ulong sum, BsonValue value)
    {
        AddWord(ref sum, (int)value.Type);
        switch (value.Type)
        {
            case BsonType.Null:
                break;
            case BsonType.Boolean:
                AddWord(ref sum, value.AsBoolean ? 1 : 0);
                break;
            case BsonType.Int32:
                AddWord(ref sum, value.AsInt32);
                break;
            case BsonType.Int64:
                AddWord(ref sum, value.AsInt64);
                break;
            case BsonType.Double:
                AddWord(ref sum, BitConverter.DoubleToInt64Bits(value.AsDouble));
                break;
            case BsonType.Decimal:
                Span<int> bits = stackalloc int[4];
                decimal.GetBits(value.AsDecimal, bits);
                foreach (int word in bits)
                {
                    AddWord(ref sum, word);
                }

                break;
            case BsonType.String:
                AddText(ref sum, value.AsString);
                break;
            case BsonType.Array:
                AddWord(ref sum, value.AsArray.Count);
                foreach (BsonValue item in value.AsArray)
                {
                    Add(ref sum, item);
                }

                break;
            case BsonType.Document:
                AddCells(ref sum, value.AsDocument);
                break;
            default:
                throw new ShopBookException($"A row of the shop book holds a value of type {value.Type}, which no row holds.");
        }
    }

    private static void AddText(ref ulong sum, string text)
    {
        AddWord(ref sum, text.Length);
        foreach (char c in text)
        {
            AddWord(ref sum, c);
        }
    }

    private static void AddWord(ref ulong sum, long word) => sum = unchecked((sum ^ (ulong)word) * Prime);
}
