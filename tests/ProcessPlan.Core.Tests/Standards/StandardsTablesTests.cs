using System.Security.Cryptography;
using System.Text;
using ProcessPlan.Core.Standards;

namespace ProcessPlan.Core.Tests.Standards;

/// <summary>The pinned hash of each table shows that no cell moved unnoticed: whoever changes one says why, and pins it anew.</summary>
public class StandardsTablesTests
{
    [Theory]
    [InlineData("iso286-1-table1.txt", "a86bdf3d961037208e37dcbb88da1fc26db32b132a34705e4c6568518cbdfba4")]
    [InlineData("iso286-1-table2-j.txt", "d947b14c926ebc2f166987f7f0fd0b7c508873726c9068f7bd45d5443f6b3f5c")]
    [InlineData("iso286-1-table4.txt", "6c880ff5337ee3452106014f07708a8829bd03bf4d08205e21e6a1b664e01c26")]
    [InlineData("iso286-1-table5.txt", "05dba4a035244f7fa1cd62efa0f61b84fdff78e626ec1db0e6152a8a6fd29a3a")]
    [InlineData("iso2768-1-table1.txt", "d6284c65da7cedf8f2a3435b405cc6d54a8e2eb45a6e6e7b8e3266acbaf42a2f")]
    [InlineData("iso18265-table-a1.txt", "0aad9aed2f477673f82adf5207eecb6fa395f6c2558761ebc38f3e8f0b6f1022")]
    [InlineData("ra-rz-pairs.txt", "655f1e37f0366eabc906c310e3e2bd6b95fea29f44d635d2b14d6c5315da875f")]
    public void Text_OfTheTable_IsThePinnedOne(string name, string hash) =>
        Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(PublishedTable.Text(name)))).Should().Be(hash);

    [Theory]
    [InlineData("iso286-1-table1.txt", 0, 3150)]
    [InlineData("iso286-1-table2-j.txt", 0, 500)]
    [InlineData("iso286-1-table4.txt", 0, 3150)]
    [InlineData("iso286-1-table5.txt", 0, 3150)]
    [InlineData("iso2768-1-table1.txt", 0.5, 4000)]
    public void Steps_OfTheTable_HaveNoGapAndNoOverlap(string name, double first, double last)
    {
        PublishedTable table = PublishedTable.Load(name);
        double end = first;
        foreach (TableRow row in table.Rows)
        {
            row.Double("over").Should().Be(end);
            row.Double("upto").Should().BeGreaterThan(end);
            end = row.Double("upto");
        }

        end.Should().Be(last);
    }

    [Fact]
    public void Steps_OfDeviations_DivideTheStepsOfTolerances()
    {
        double[] sub = [.. PublishedTable.Load("iso286-1-table5.txt").Rows.Select(row => row.Double("upto"))];
        sub.Should().Equal(PublishedTable.Load("iso286-1-table4.txt").Rows.Select(row => row.Double("upto")));
        sub.Should().Contain(PublishedTable.Load("iso286-1-table1.txt").Rows.Select(row => row.Double("upto")));
    }

    [Theory]
    [InlineData("iso286-1-table2-j.txt")]
    [InlineData("iso286-1-table4.txt")]
    [InlineData("iso286-1-table5.txt")]
    [InlineData("iso2768-1-table1.txt")]
    public void Columns_DownTheTable_NeverComeNearerToZero(string name)
    {
        PublishedTable table = PublishedTable.Load(name);
        foreach (string column in table.Columns.Skip(2))
        {
            // k falls back to zero over 500 mm, and t and u begin anew there: each part by itself.
            foreach (IGrouping<bool, TableRow> part in table.Rows.Where(row => !row.IsEmpty(column)).GroupBy(row => row.Double("upto") > 500))
            {
                part.Select(row => Math.Abs(row.Double(column))).Should().BeInAscendingOrder("column {0} of {1}", column, name);
            }
        }
    }

    [Fact]
    public void Letters_AcrossTheTables_StandInTheOrderOfTheStandard()
    {
        PublishedTable atoh = PublishedTable.Load("iso286-1-table4.txt");
        PublishedTable ktozc = PublishedTable.Load("iso286-1-table5.txt");
        string[] clearance = ["a", "b", "c", "cd", "d", "e", "ef", "f", "fg", "g", "h"];
        for (int row = 0; row < atoh.Rows.Count; row++)
        {
            double[] es = Given(atoh.Rows[row], clearance);
            double[] ei = Given(ktozc.Rows[row], ktozc.Columns.Skip(2));
            es.Should().BeInAscendingOrder().And.OnlyHaveUniqueItems();
            ei.Should().BeInAscendingOrder().And.OnlyHaveUniqueItems();
            es[^1].Should().Be(0);
            ei[0].Should().BeGreaterThanOrEqualTo(0);
        }
    }

    [Fact]
    public void Grades_AcrossTable1_GrowWithGradeAndWithSize()
    {
        PublishedTable table = PublishedTable.Load("iso286-1-table1.txt");
        string[] inMicrometres = [.. table.Columns.Skip(2).Take(13)];
        string[] inMillimetres = [.. table.Columns.Skip(15)];
        foreach (TableRow row in table.Rows)
        {
            double[] widths = [.. Given(row, inMicrometres), .. Given(row, inMillimetres).Select(width => width * 1000)];
            widths.Should().BeInAscendingOrder().And.OnlyHaveUniqueItems();
        }

        foreach (string grade in table.Columns.Skip(2))
        {
            table.Rows.Where(row => !row.IsEmpty(grade)).Select(row => row.Double(grade)).Should().BeInAscendingOrder();
        }
    }

    private static double[] Given(TableRow row, IEnumerable<string> columns) =>
        [.. columns.Where(column => !row.IsEmpty(column)).Select(row.Double)];
}
