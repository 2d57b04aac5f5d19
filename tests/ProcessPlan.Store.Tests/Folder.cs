using ProcessPlan.Core.Shop;

namespace ProcessPlan.Store.Tests;

/// <summary>A folder of its own for one test, gone with it.</summary>
internal sealed class Folder : IDisposable
{
    private readonly string _path = Directory.CreateTempSubdirectory("shop-book-").FullName;

    public string Book => this["shop.db"];

    public string this[string name] => Path.Combine(_path, name);

    /// <summary>A book made from the built-in shop.</summary>
    public ShopBook HandbookBook()
    {
        ShopBook book = new(Book, TimeProvider.System);
        book.Create(HandbookShop.Load());
        return book;
    }

    public string[] Files() => [.. Directory.GetFileSystemEntries(_path).Select(static file => Path.GetFileName(file)).Order(StringComparer.Ordinal)];

    public void Dispose() => Directory.Delete(_path, recursive: true);
}
