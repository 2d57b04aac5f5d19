using System.Runtime.InteropServices;
using LiteDB;

namespace ProcessPlan.Store;

/// <summary>
/// A sum over a document that stands in it: the library does not notice when bytes of its file have changed, and a wrong size would be planned with.
/// </summary>
internal static class RowCheck
{
    private const string Check = "check";
    private const ulong Offset = 14695981039346656037;
    private const ulong Prime = 1099511628211;

    public static BsonDocument Stamp(this BsonDocument document)
    {
        document[Check] = Sum(document);
        return document;
    }

    public static bool IsStamped(this BsonDocument document) => document.ContainsKey(Check);

    public static bool IsIntact(this BsonDocument document) => document[Check].IsInt64 && document[Check].AsInt64 == Sum(document);

    /// <summary>The sum that stands in the document.</summary>
    public static long CheckOf(this BsonDocument document) => document[Check].AsInt64;

    /// <summary>FNV-1a, taken over words instead of bytes.</summary>
    private static long Sum(BsonDocument document)
    {
        ulong sum = Offset;
        foreach ((string name, BsonValue value) in document.GetElements())
        {
            if (name != Check)
            {
                Add(ref sum, MemoryMarshal.AsBytes(name.AsSpan()));
                Add(ref sum, value);
            }
        }

        return unchecked((long)sum);
    }

    private static void Add(ref ulong sum, BsonValue value)
    {
        AddWord(ref sum, (ulong)value.Type);
        switch (value.Type)
        {
            case BsonType.Null:
                break;
            case BsonType.Int32:
                AddWord(ref sum, (ulong)value.AsInt32);
                break;
            case BsonType.Int64:
                AddWord(ref sum, unchecked((ulong)value.AsInt64));
                break;
            case BsonType.String:
                Add(ref sum, MemoryMarshal.AsBytes(value.AsString.AsSpan()));
                break;
            case BsonType.Binary:
                Add(ref sum, value.AsBinary);
                break;
            default:
                throw new DamagedBookException($"The shop book holds a value of type {value.Type}, which no book holds; it was left as it is. Use a backup.");
        }
    }

    private static void Add(ref ulong sum, ReadOnlySpan<byte> bytes)
    {
        AddWord(ref sum, (ulong)bytes.Length);
        foreach (ulong word in MemoryMarshal.Cast<byte, ulong>(bytes))
        {
            AddWord(ref sum, word);
        }

        foreach (byte rest in bytes[(bytes.Length / sizeof(ulong) * sizeof(ulong))..])
        {
            AddWord(ref sum, rest);
        }
    }

    private static void AddWord(ref ulong sum, ulong word) => sum = unchecked((sum ^ word) * Prime);
}
