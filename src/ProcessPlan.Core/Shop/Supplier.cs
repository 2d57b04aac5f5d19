namespace ProcessPlan.Core.Shop;

/// <summary>What an outside supplier charges for a process.</summary>
/// <param name="Process">The process, in the trade's word.</param>
/// <param name="LotCharge">Charged at least for a lot.</param>
/// <param name="PiecePrice">Price of a piece.</param>
/// <param name="Days">Days away.</param>
public sealed record Supplier(string Process, decimal LotCharge, decimal PiecePrice, int Days)
{
    /// <summary>What the lot costs: the pieces, or the lot charge where that is more.</summary>
    public decimal ChargeFor(int pieces) => Math.Max(LotCharge, PiecePrice * pieces);
}
