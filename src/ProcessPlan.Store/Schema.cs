using LiteDB;

namespace ProcessPlan.Store;

/// <summary>
/// The form of the book, numbered. The number stands in the book's head and not in the library's own version field, because only there it changes in
/// the same transaction as what it numbers.
/// </summary>
internal static class Schema
{
    public const int Current = 1;

    public static int Of(BsonDocument head) => head["schema"].AsInt32;

    /// <exception cref="ShopBookException">A newer version of the program wrote the book.</exception>
    public static void RefuseNewer(BsonDocument head)
    {
        int schema = Of(head);
        if (schema > Current)
        {
            throw new ShopBookException($"This shop book was written by a newer version of this program (schema {schema}; this one knows {Current}).");
        }
    }
}
