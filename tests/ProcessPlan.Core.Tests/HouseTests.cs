using System.Text.RegularExpressions;

namespace ProcessPlan.Core.Tests;

/// <summary>The order of the house: which room may know which, and names that say nothing.</summary>
public partial class HouseTests
{
    /// <summary>A room may use the rooms before it. What stands in no room, the planner and its plan, may use all.</summary>
    private static readonly string[] Rooms =
        ["Text", "Values", "Standards", "Features", "Shop", "Capability", "Tooling", "Inspection", "Costing", "Routing"];

    private static readonly string[] EmptyWords = ["Helper", "Util", "Common", "Manager", "Service", "Infrastructure", "Domain", "Model"];

    private static readonly string Root = FindRoot();

    private static readonly string Core = Path.Combine(Root, "src", "ProcessPlan.Core");

    [Fact]
    public void Rooms_OfTheCore_StandInTheOrder()
    {
        Directory.GetDirectories(Core).Select(folder => Path.GetFileName(folder)).Except(["bin", "obj"]).Should().BeSubsetOf(Rooms);
    }

    [Fact]
    public void Files_OfEveryRoom_UseRoomsToTheirLeftOnly()
    {
        // A room can also be called without its full name, as in Routing.Step: any type of it behind its name counts.
        Dictionary<string, string[]> types = Rooms.ToDictionary(room => room, room => SourcesOf(room).SelectMany(file => TypesIn(Code(file))).ToArray());
        List<string> wrong = [];
        for (int i = 0; i < Rooms.Length; i++)
        {
            foreach (string file in SourcesOf(Rooms[i]))
            {
                string code = Code(file);
                wrong.AddRange(RoomNamed().Matches(code).Select(match => match.Groups[1].Value)
                    .Concat(Rooms.Where(room => types[room].Any(type => Regex.IsMatch(code, $@"(?<![.\w]){room}\.{type}\b"))))
                    .Where(room => Array.IndexOf(Rooms, room) > i)
                    .Select(room => $"{Rooms[i]}/{Path.GetFileName(file)} uses {room}"));
            }
        }

        wrong.Should().BeEmpty();
    }

    [Fact]
    public void Files_OfEveryRoom_StandInTheNamespaceOfTheirFolder()
    {
        string[] files = [.. Rooms.SelectMany(SourcesOf)];

        files.Should().NotBeEmpty();
        files.Where(file => !Code(file).Contains($"namespace {Path.GetRelativePath(Path.Combine(Root, "src"), Path.GetDirectoryName(file)!).Replace(Path.DirectorySeparatorChar, '.')};", StringComparison.Ordinal))
            .Should().BeEmpty();
    }

    [Fact]
    public void Names_OfProjectsFoldersAndTypes_SaySomething()
    {
        string[] sources = SourcesUnder(Path.Combine(Root, "src")).Concat(SourcesUnder(Path.Combine(Root, "tests"))).ToArray();
        IEnumerable<string> folders = sources.SelectMany(file => Path.GetRelativePath(Root, Path.GetDirectoryName(file)!).Split(Path.DirectorySeparatorChar)).Distinct();
        string[] names = [.. folders, .. sources.SelectMany(file => TypesIn(Code(file)))];

        names.Should().Contain("ProcessPlan.Core").And.Contain("HouseTests", "the names were looked for in the right place");
        names.Where(SaysNothing).Should().BeEmpty();
    }

    [Theory]
    [InlineData("TextHelpers")]
    [InlineData("ShopManager")]
    [InlineData("ProcessPlan.Common")]
    [InlineData("PlanModel")]
    public void Names_WithAnEmptyWord_AreFound(string name)
    {
        SaysNothing(name).Should().BeTrue();
    }

    [Fact]
    public void Types_AreFoundByTheirDeclaration()
    {
        TypesIn("internal readonly record struct Place(int At);\npublic enum End { }\n// a class of its own").Should().Equal("Place", "End");
    }

    private static bool SaysNothing(string name) =>
        WordsOf().Matches(name).Any(word => EmptyWords.Contains(word.Value) || EmptyWords.Contains(word.Value.TrimEnd('s')));

    private static IEnumerable<string> SourcesOf(string room) => Path.Combine(Core, room) is { } folder && Directory.Exists(folder) ? SourcesUnder(folder) : [];

    private static IEnumerable<string> SourcesUnder(string folder) => Directory.EnumerateFiles(folder, "*.cs", SearchOption.AllDirectories)
        .Where(static file => !file.Split(Path.DirectorySeparatorChar).Any(static part => part is "bin" or "obj"));

    /// <summary>The file without its comments, which may speak of any room.</summary>
    private static string Code(string file) => Comment().Replace(File.ReadAllText(file), "");

    private static IEnumerable<string> TypesIn(string code) => Declaration().Matches(Comment().Replace(code, "")).Select(static match => match.Groups[1].Value);

    private static string FindRoot()
    {
        for (DirectoryInfo? folder = new(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "ProcessPlan.sln")))
            {
                return folder.FullName;
            }
        }

        throw new DirectoryNotFoundException($"There is no ProcessPlan.sln above {AppContext.BaseDirectory}.");
    }

    [GeneratedRegex(@"ProcessPlan\.Core\.([A-Z]\w*)")]
    private static partial Regex RoomNamed();

    [GeneratedRegex(@"(?:^|\s)(?:class|struct|record|interface|enum)\s+(?!class\b|struct\b)([A-Z]\w*)")]
    private static partial Regex Declaration();

    [GeneratedRegex(@"//.*")]
    private static partial Regex Comment();

    [GeneratedRegex(@"[A-Z][a-z]+")]
    private static partial Regex WordsOf();
}
