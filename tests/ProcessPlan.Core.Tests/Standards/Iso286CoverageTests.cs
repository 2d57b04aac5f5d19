using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Standards;

/// <summary>Which printed cells no independent publication was read for: the heads of the tables say it, and this keeps them honest.</summary>
public class Iso286CoverageTests
{
    private static readonly string[] Limits =
    [
        "bigdaishowa-h.csv", "deepri.csv", "dme.csv", "gb-sheets.csv", "jis-keyways.csv", "korotkov-gost25347-shafts.csv",
        "mikipulley-jis-holes.csv", "misumi-jis-holes.csv", "skf.csv", "sumitomo-jis-shafts.csv",
    ];

    private static readonly string[] Tolerances =
        ["it-ganter.csv", "it-gbt1800-3-1998.csv", "it-gost25346.csv", "it-mechguru.csv", "it-narayana.csv"];

    private static readonly string[] Deviations =
        ["fd-dme-over500.csv", "fd-en286-holes-n-zc.csv", "fd-gost25346-shafts.csv", "fd-machinerys-handbook-holes.csv", "fd-narayana.csv"];

    [Fact]
    public void Tolerances_WithoutASecondSource_AreTheOnesThatTheHeadNames()
    {
        HashSet<string> read = [];
        foreach (PrintedRow row in Rows([.. Tolerances, .. Limits]))
        {
            int digits = row["class"].IndexOfAny([.. "0123456789"]);
            read.Add($"IT{row["class"][digits..]} {Iso286.Step(row.Sizes().Last())!.Value.UpTo}");
        }

        string[] missing = [.. Cells("iso286-1-table1.txt").Where(cell => !read.Contains(cell))];
        missing.Should().Equal(
            "IT2 1250 mm", "IT3 1250 mm", "IT4 1250 mm",
            "IT1 1600 mm", "IT2 1600 mm", "IT3 1600 mm", "IT4 1600 mm",
            "IT1 2000 mm", "IT2 2000 mm", "IT3 2000 mm", "IT4 2000 mm",
            "IT1 2500 mm", "IT2 2500 mm", "IT3 2500 mm", "IT4 2500 mm",
            "IT12 2500 mm", "IT13 2500 mm", "IT14 2500 mm", "IT15 2500 mm", "IT16 2500 mm", "IT17 2500 mm", "IT18 2500 mm",
            "IT1 3150 mm", "IT2 3150 mm", "IT3 3150 mm", "IT4 3150 mm",
            "IT12 3150 mm", "IT13 3150 mm", "IT14 3150 mm", "IT15 3150 mm", "IT16 3150 mm", "IT17 3150 mm", "IT18 3150 mm");
    }

    [Fact]
    public void Deviations_WithoutASecondSource_AreTheOnesThatTheHeadsName()
    {
        HashSet<string> read = [];
        foreach (PrintedRow row in Rows(Limits))
        {
            ToleranceClass.TryRead(row["class"], out ToleranceClass c, out _).Should().BeTrue();
            AddSteps(read, Column(c, row.Sizes().Last()), row);
        }

        foreach (PrintedRow row in Rows(Deviations).Where(row => row["letter"] != "DELTA"))
        {
            char grade = row["grades"] switch { "all" or "01-16" => '5', "<=8" or ">7" or "<=3 and >7" => '8', ">8" => '9', string from => from[0] };
            ToleranceClass.TryRead(row["letter"] + grade, out ToleranceClass c, out _).Should().BeTrue();
            AddSteps(read, Column(c, row.Sizes().Last()), row);
        }

        string[] tables = ["iso286-1-table2-j.txt", "iso286-1-table4.txt", "iso286-1-table5.txt"];
        string[] missing = [.. tables.SelectMany(Cells).Where(cell => cell[..2] != "h " && !read.Contains(cell))];
        missing.Should().Equal(
            "j7 65 mm", "j7 80 mm", "j7 100 mm", "j7 120 mm", "j7 140 mm", "j7 160 mm", "j7 180 mm", "x 400 mm");
    }

    private static void AddSteps(HashSet<string> read, string? column, PrintedRow row)
    {
        if (column is not null)
        {
            foreach (SizeStep step in row.Sizes().Select(size => Iso286.DeviationStep(size)!.Value))
            {
                read.Add($"{column} {step.UpTo}");
            }
        }
    }

    /// <summary>The printed column that the deviation of a class at a size rests on; null where it rests on none, as js and N9.</summary>
    private static string? Column(ToleranceClass c, Length size) => (c.LetterText, c.Grade.Symbol) switch
    {
        ("JS" or "js", _) => null,
        ("j", "5" or "6") => "j5-6",
        ("J" or "j", string grade) => c.LetterText + grade,
        ("k", "4" or "5" or "6" or "7") => "k",
        ("k", _) => null,
        ("K" or "N", _) when c.Grade > ToleranceGrade.It(8) && size.Millimetres is > 3 and <= 500 => null,
        (string letter, _) => letter.ToLowerInvariant(),
    };

    private static IEnumerable<PrintedRow> Rows(string[] files) => files.SelectMany(file => new PrintedSource(file).Rows);

    private static IEnumerable<string> Cells(string name)
    {
        PublishedTable table = PublishedTable.Load(name);
        return from row in table.Rows
               from column in table.Columns.Skip(2)
               where !row.IsEmpty(column)
               select $"{column} {row["upto"]} mm";
    }
}
