using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Tests.Standards;
using ProcessPlan.Core.Tooling;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Tests.Shop;

public class HandbookShopTests
{
    private static readonly ShopFloor Floor = HandbookShop.Load();

    // BS 328 as reprinted: 1.00 to 2.95 by 0.05, 3.0 to 13.9 by 0.1, 14 to 25 by 0.25. The half tenths from 3 to 10 mm are stocked by DIN 338 (from memory).
    [Fact]
    public void Tools_DrillsTo25_AreTheSeriesOfBS328()
    {
        List<decimal> printed = [];
        Add(printed, 1.00m, 2.95m, 0.05m);
        Add(printed, 3.00m, 10.00m, 0.05m);
        Add(printed, 10.1m, 13.9m, 0.1m);
        Add(printed, 14m, 25m, 0.25m);
        Floor.Tools(ToolUse.Drill).Select(drill => drill.Stamped.Millimetres).Where(size => size is >= 1 and <= 25).Should().Equal(printed);
    }

    // Hartner catalogue, diameter tolerances: h8 is the standard of DIN 1414.
    [Fact]
    public void Tools_EveryDrill_IsMadeToThePrintedH8()
    {
        PrintedSource source = new("drill-h8.csv");
        foreach (Tool drill in Floor.Tools(ToolUse.Drill).Where(drill => drill.Stamped.Millimetres > 1))
        {
            PrintedRow row = source.Rows.Single(row => row.Number("over") < drill.Stamped.Millimetres && drill.Stamped.Millimetres <= row.Number("upto"));
            drill.Own.Max.Should().Be(drill.Stamped);
            (drill.Own.Min - drill.Stamped).Should().Be(row.Micrometres("h8_lower")!.Value, "{0}", drill.Label);
        }
    }

    // DIN 1420 as printed by Guhring and Dormer.
    [Fact]
    public void Tools_EveryH7Reamer_IsMadeToThePrintedLimits()
    {
        PrintedSource source = new("din1420.csv");
        PrintedRow[] rows = [.. source.Rows.Where(row => row["hole_class"] == "H7")];
        Tool[] reamers = [.. Floor.Tools(ToolUse.Ream).Where(reamer => reamer.Made == "H7")];
        reamers.Should().HaveCountGreaterThan(60);
        foreach (Tool reamer in reamers)
        {
            decimal size = reamer.Stamped.Millimetres;
            PrintedRow row = rows.First(row => row.Number("over") < size && size <= row.Number("upto"));
            (reamer.Own.Max - reamer.Stamped).Should().Be(row.Micrometres("reamerUpperUm")!.Value, "{0}", reamer.Label);
            (reamer.Own.Min - reamer.Stamped).Should().Be(row.Micrometres("reamerLowerUm")!.Value, "{0}", reamer.Label);
        }
    }

    [Fact]
    public void Materials_EveryGroup_HasSpeedsAndAReamerRow()
    {
        Tool reamer = Floor.Tools(ToolUse.Ream)[0];
        foreach (string group in Floor.Materials.Select(material => material.Group).Append("P3").Distinct())
        {
            CuttingData.For(group).Drill.Should().BePositive();
            SizedCut.Predict(reamer, group, careful: true).Sizes.Width.Should().BeGreaterThanOrEqualTo(default);
        }
    }

    [Fact]
    public void Machines_EveryAbility_IsAskedForByAProcess()
    {
        string[] asked = [.. ProcessCatalogue.Handbook.Select(process => process.Ability).Distinct()];
        Floor.Machines.SelectMany(machine => machine.Abilities).Should().BeSubsetOf(asked);
    }

    [Fact]
    public void BarFor_AnySizeTo180_IsTheSmallestBarThatHoldsIt()
    {
        Length[] sizes = [.. Floor.Bars.SelectMany(series => series.Sizes)];
        sizes.Should().BeInAscendingOrder().And.OnlyHaveUniqueItems();
        for (int tenths = 25; tenths <= 1800; tenths++)
        {
            Length least = Length.FromMillimetres(tenths / 10m);
            Bar bar = Floor.BarFor(least)!;
            bar.Limits.Min.Should().BeGreaterThanOrEqualTo(least);
            BarSeries series = Floor.Bars.First(series => series.Over < bar.Size && bar.Size <= series.UpTo);
            (bar.Size - bar.Limits.Min).Should().Be(series.Deviation);
            int place = Array.IndexOf(sizes, bar.Size);
            if (place > 0)
            {
                BarSeries smaller = Floor.Bars.First(series => series.Over < sizes[place - 1] && sizes[place - 1] <= series.UpTo);
                (sizes[place - 1] - smaller.Deviation).Should().BeLessThan(least);
            }
        }
    }

    [Fact]
    public void ToolsNear_ARange_IsEveryToolInItAndHalfAMillimetreBelow()
    {
        SizeWindow range = new(Length.FromMillimetres(9.7m), Length.FromMillimetres(10.02m));
        foreach (ToolUse use in Enum.GetValues<ToolUse>())
        {
            Tool[] expected = [.. Floor.Tools(use).Where(tool => tool.Stamped.Millimetres is > 9.2m and <= 10.02m)];
            Floor.ToolsNear(use, range).ToArray().Should().Equal(expected);
        }
    }

    private static void Add(List<decimal> sizes, decimal from, decimal to, decimal step)
    {
        for (decimal size = from; size <= to; size += step)
        {
            sizes.Add(size);
        }
    }
}
