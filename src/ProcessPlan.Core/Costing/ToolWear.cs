using System.Globalization;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;

namespace ProcessPlan.Core.Costing;

/// <summary>What a cut wears off its tool: common practice, no source.</summary>
public static class ToolWear
{
    /// <summary>A carbide edge, in the shop's currency.</summary>
    private const double EdgePrice = 3;

    /// <summary>Minutes that a carbide edge cuts.</summary>
    private const double EdgeMinutes = 15;

    public static Citation Citation { get; } = new("common practice", "tool life in metres of hole; a carbide edge cuts 15 minutes", Standing.CommonPractice);

    /// <summary>Cost of the wear on one piece, in the shop's currency.</summary>
    /// <param name="cut">The cut.</param>
    /// <param name="tool">The tool of fixed size, or null where inserts or wheels cut.</param>
    /// <param name="minutes">Time under the tool.</param>
    public static double Of(in Cut cut, Tool? tool, double minutes)
    {
        if (tool is not null)
        {
            return (double)tool.Price / (tool.LifeMetres * 1000) * cut.Extent.ToMillimetres() * StockShare(cut);
        }

        return cut.Process.Ability is "turn" or "diamond" or "bore" or "fine-bore" or "mill" ? minutes * EdgePrice / EdgeMinutes : 0;
    }

    public static string Explain(in Cut cut, Tool? tool, double minutes) => tool is not null
        ? string.Create(CultureInfo.InvariantCulture, $"{tool.Price:0.##} / {tool.LifeMetres:0} m of hole · {cut.Extent} · {StockShare(cut):0.##} for the stock = {Of(cut, tool, minutes):0.000}")
        : string.Create(CultureInfo.InvariantCulture, $"{minutes:0.00} min of an edge of {EdgePrice:0.##} that cuts {EdgeMinutes:0} min = {Of(cut, tool, minutes):0.000}");

    /// <summary>Twice the stock wears a reamer or core drill more: half for being there, half and more for what it removes.</summary>
    private static double StockShare(in Cut cut) =>
        cut.Stock is { } stock && cut.Process.SizedBy is not ToolUse.Drill ? 0.5 + stock.Picometres / (double)cut.Process.MostStockAt(cut.Diameter).Picometres : 1;
}
