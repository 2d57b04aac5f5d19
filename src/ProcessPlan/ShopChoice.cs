using System.CommandLine;
using System.Runtime.CompilerServices;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Store;

namespace ProcessPlan;

/// <summary>Which shop a command works with: the book that is named, else the user's own book if there is one, else the built-in shop.</summary>
internal sealed class ShopChoice
{
    public Option<string> Shop { get; } = new("--shop")
    {
        Description = "The shop book; without it the user's own if there is one, else the built-in handbook shop",
        HelpName = "FILE",
    };

    public ShopFloor Floor(ParseResult parsed) => BookPath(parsed) is { } path ? Read(path) : HandbookShop.Load();

    /// <summary>The names of the shop's materials, for reading a line without planning it.</summary>
    public MaterialNames Materials(ParseResult parsed) => MaterialsIn(BookPath(parsed));

    /// <summary>The same where no book is named.</summary>
    public static MaterialNames UsualMaterials() => MaterialsIn(OwnBookPath);

    private static MaterialNames MaterialsIn(string? path) => path is not null ? Read(path).Names : ShopFloor.NamesOf(HandbookShop.Materials());

    /// <summary>The book that is named, or the user's own if it exists.</summary>
    public string? BookPath(ParseResult parsed) => parsed.GetValue(Shop) ?? OwnBookPath;

    private static string? OwnBookPath => OwnBook.Path is { } own && File.Exists(own) ? own : null;

    /// <remarks>Kept apart, so that a command without a book does not load what reads one: that takes longer than answering.</remarks>
    [MethodImpl(MethodImplOptions.NoInlining)]
    private static ShopFloor Read(string path) => new ShopBook(path, TimeProvider.System).Read().Floor;
}
