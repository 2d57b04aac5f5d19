using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Standards;

public class HardnessConversionTests
{
    // Printed copies of the table itself; the heads of the files name them. Brackets mark Brinell beyond its defined range.
    [Theory]
    [InlineData("hardness-iso18265-siemens.csv", 85)]
    [InlineData("hardness-din50150-sheet2.csv", 58)]
    public void Table_EveryRowOfAPrintedCopy_IsTheSame(string file, int rows)
    {
        PrintedSource source = new(file);
        source.Rows.Should().HaveCount(rows);
        Dictionary<string, TableRow> table = PublishedTable.Load("iso18265-table-a1.txt").Rows.ToDictionary(row => row["hv"]);
        foreach (PrintedRow row in source.Rows)
        {
            TableRow ours = table[row["HV"]];
            Compare(row["HRC"], ours.DoubleOrNull("hrc"), 0);
            Compare(row["Rm"], ours.DoubleOrNull("rm"), 0);
            Compare(row["HB"].Trim('(', ')'), ours.DoubleOrNull("hb"), 0.5);
        }

        // The second copy prints Brinell in whole points.
        static void Compare(string printed, double? ours, double tolerance)
        {
            if (printed.Length > 0)
            {
                ours.Should().NotBeNull();
                ours!.Value.Should().BeApproximately(double.Parse(printed, System.Globalization.CultureInfo.InvariantCulture), tolerance);
            }
        }
    }

    // Source: NDT Resource Center, hardness conversion chart (2014): HV and HRC from 620 to 940.
    [Fact]
    public void Convert_HardSteel_IsAsInASecondChart()
    {
        PrintedSource source = new("hardness-hv-hrc-nde.csv");
        source.Rows.Should().HaveCount(21);
        foreach (PrintedRow row in source.Rows)
        {
            HardnessConversion.Convert(new Hardness((long)row.Number("HV")! * 10, HardnessScale.HV), HardnessScale.HRC)
                .Should().Be(new Hardness((long)(row.Number("HRC")! * 10), HardnessScale.HRC));
        }
    }

    // Source: SAE J417, revised 1983, as printed by Miki Pulley and by MISUMI: another relation, so only near.
    [Fact]
    public void Convert_RockwellToVickers_IsWithinOneInAHundredOfSAEJ417()
    {
        PrintedSource source = new("hardness-sae-j417.csv");
        source.Rows.Should().HaveCount(26);
        foreach (PrintedRow row in source.Rows)
        {
            double printed = (double)row.Number("HV")!;
            Hardness rockwell = new((long)row.Number("HRC")! * 10, HardnessScale.HRC);
            HardnessConversion.Convert(rockwell, HardnessScale.HV)!.Value.Points.Should().BeApproximately(printed, printed * 0.01, "{0}", row);
        }
    }

    [Theory]
    [InlineData(580, HardnessScale.HRC, HardnessScale.HV, "654 HV")]
    [InlineData(280, HardnessScale.HRC, HardnessScale.HB, "272 HB")]
    [InlineData(2400, HardnessScale.HV, HardnessScale.HRC, "20.3 HRC")]
    [InlineData(9400, HardnessScale.HV, HardnessScale.HRC, "68 HRC")]
    [InlineData(760, HardnessScale.HB, HardnessScale.HV, "80 HV")]
    [InlineData(6180, HardnessScale.HB, HardnessScale.HRC, "57.8 HRC")]
    [InlineData(2405, HardnessScale.HB, HardnessScale.HB, "240.5 HB")]
    public void Convert_WithinTheTable_InterpolatesBetweenItsRows(long tenths, HardnessScale from, HardnessScale to, string converted) =>
        HardnessConversion.Convert(new Hardness(tenths, from), to).ToString().Should().Be(converted);

    [Theory]
    [InlineData(202, HardnessScale.HRC, HardnessScale.HV)]
    [InlineData(681, HardnessScale.HRC, HardnessScale.HV)]
    [InlineData(579, HardnessScale.HRC, HardnessScale.HB)]
    [InlineData(2399, HardnessScale.HV, HardnessScale.HRC)]
    [InlineData(759, HardnessScale.HB, HardnessScale.HV)]
    [InlineData(6181, HardnessScale.HB, HardnessScale.HV)]
    public void Convert_OutsideTheTable_IsRefused(long tenths, HardnessScale from, HardnessScale to) =>
        HardnessConversion.Convert(new Hardness(tenths, from), to).Should().BeNull();

    [Fact]
    public void Table_DownItsRows_GrowsInEveryColumn()
    {
        PublishedTable table = PublishedTable.Load("iso18265-table-a1.txt");
        foreach (string column in table.Columns)
        {
            table.Rows.Where(row => !row.IsEmpty(column)).Select(row => row.Double(column))
                .Should().BeInAscendingOrder().And.OnlyHaveUniqueItems();
        }

        HardnessConversion.Citation.ToString().Should().Be("ISO 18265:2013, Table A.1");
    }

    // DIN 50150, of which ISO 18265 Table A.1 is the successor: Brinell is 0.95 of Vickers by calculation.
    [Fact]
    public void Table_Brinell_IsNineteenTwentiethsOfVickers()
    {
        foreach (TableRow row in PublishedTable.Load("iso18265-table-a1.txt").Rows.Where(row => !row.IsEmpty("hb")))
        {
            row.Double("hb").Should().BeApproximately(0.95 * row.Double("hv"), 0.8, "HV {0}", row["hv"]);
        }
    }
}
