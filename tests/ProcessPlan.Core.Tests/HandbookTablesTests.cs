using System.Security.Cryptography;
using System.Text;
using ProcessPlan.Core.Standards;

namespace ProcessPlan.Core.Tests;

/// <summary>
/// The handbook's tables beside the standards: the pinned hash shows that no cell moved unnoticed. Whoever changes one says why in the commit, pins it
/// anew and looks at the plans again.
/// </summary>
public class HandbookTablesTests
{
    [Theory]
    [InlineData("chuck-error.txt", "dea089302749159842a6f27a2b7529cbec4b243b29b8253b94cf99e002f1cb12")]
    [InlineData("drill-axis.txt", "a8934fa3148c168d0b17f27023c68c705967a3677a7777fdde28c25534f7eb6e")]
    [InlineData("processes.txt", "a140d0cf7a5a626436736885ed6fab9da82d47fc13f9c1ab4fae2c31599a32b9")]
    [InlineData("stock-table.txt", "87d5a8e84b8c396f69ed9427abb27dc9e30871e2d970dc3cde012ea2b643079b")]
    [InlineData("surface-left.txt", "dfc062ddf9766bdb9df0bf0ebd182d625a24f6e2e7d8cad26eb4a51ccdf336a5")]
    [InlineData("cutting-speeds.txt", "549ba8523cce1367512245c481fe7aafc965c8851f93bc4b88ee7d26ec8aa630")]
    [InlineData("drill-feeds.txt", "6f19b4af6a51023e7674b6c32aaa47ee70b291ca6f19da4fa014d06440bb9323")]
    [InlineData("instruments.txt", "efb514b26fe49358b141913e2bf8f44e956483095962a9293c14c54277bcfd2a")]
    [InlineData("shop-bars.txt", "9ae15518b4b0e05c0122c4ed39c041ed6c35691ef9882d828d79276237317acf")]
    [InlineData("shop-machines.txt", "c39834bc87294905737950ed05cf4bd47a7bfecd68cd9bf7fd0403fae2c2946c")]
    [InlineData("shop-materials.txt", "1a3840ea4b5dedc7e5772911f0d513394a55458d5f6969e6eea3e4b323475222")]
    [InlineData("shop-suppliers.txt", "2cb6fd2ae90155298dcf5fce03d5c9e05290022fd01fda4fb9e83cb9cfd78828")]
    [InlineData("shop-tools.txt", "2fce9c22bf759c5215696cf6228db5c1191fb2d386a3d8c0570c5f656053f290")]
    [InlineData("drill-overcut.txt", "9745f9163dd5461f1357d5b317650c4a052bf3e8db856d82b7f96062d97de32e")]
    [InlineData("reamer-cut.txt", "7dffe109ddccbfeb9ee0d5dcc07c75dba4b0b40973c062806777317a7be587cd")]
    public void Text_OfTheTable_IsThePinnedOne(string name, string hash) =>
        Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(PublishedTable.Text(name)))).Should().Be(hash);

    [Fact]
    public void Tables_EveryOneOfTheProgram_IsPinnedSomewhere()
    {
        IEnumerable<string> pinned = new[] { GetType(), typeof(Standards.StandardsTablesTests) }.SelectMany(type => type
            .GetMethod(nameof(Text_OfTheTable_IsThePinnedOne))!.GetCustomAttributesData().Where(data => data.AttributeType == typeof(InlineDataAttribute)))
            .Select(data => (string)((IReadOnlyCollection<System.Reflection.CustomAttributeTypedArgument>)data.ConstructorArguments[0].Value!).First().Value!);
        typeof(PublishedTable).Assembly.GetManifestResourceNames().Where(name => name.EndsWith(".txt")).Should().BeSubsetOf(pinned);
    }

    [Fact]
    public void Standing_OfEveryHandbookTable_IsSaidInItsHead()
    {
        foreach (string name in typeof(PublishedTable).Assembly.GetManifestResourceNames().Where(name => name.EndsWith(".txt")))
        {
            PublishedTable table = PublishedTable.Load(name);
            table.Title.Should().NotBeEmpty(name);
            table.Cite().ToString().Should().NotBeEmpty(name);
        }
    }
}
