using Selector.Engine.Parts;

namespace Selector.Engine.Supplies;

/// <summary>How many pieces are ordered and what they cost.</summary>
/// <param name="Needed">Pieces in all supplies of the build.</param>
/// <param name="Ordered">With spares, raised to the least order and the multiple.</param>
/// <param name="Unit">Price of one at the ordered quantity, ten-thousandths; null when unknown.</param>
public sealed record OrderQuantity(int Needed, int Ordered, long? Unit)
{
    /// <summary>Ten-thousandths for the ordered quantity; null when unknown.</summary>
    public long? Extended => Unit is { } u ? u * Ordered : null;

    /// <param name="part">The part to order.</param>
    /// <param name="perSupply">Pieces in one supply, at least 1.</param>
    /// <param name="units">Supplies to build, at least 1.</param>
    /// <param name="spares">Share of spares, 0.04 for 4 %.</param>
    public static OrderQuantity Of(Part part, int perSupply, int units, double spares)
    {
        var needed = perSupply * units;
        var wanted = Math.Max(part.LeastOrder, (int)Math.Ceiling(needed * (1 + spares) - 1e-9));
        var multiple = Math.Max(1, part.Multiple);
        var ordered = (wanted + multiple - 1) / multiple * multiple;
        return new OrderQuantity(needed, ordered, part.Prices.UnitAt(ordered));
    }
}
