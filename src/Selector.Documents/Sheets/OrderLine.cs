using System.Collections.Immutable;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>
/// One line of the order: a part with every position that it fills. A part that serves several positions is ordered once, so
/// that least order, multiple and price break are those of the whole quantity.
/// </summary>
/// <param name="Part">What is ordered.</param>
/// <param name="Positions">Where it goes, in the order of the ledger.</param>
/// <param name="PerSupply">Pieces in one supply.</param>
/// <param name="Quantity">Needed, ordered and the price at that quantity.</param>
public sealed record OrderLine(Part Part, ImmutableArray<string> Positions, int PerSupply, OrderQuantity Quantity)
{
    public string Currency => Part.Prices.Currency;

    /// <summary>Pieces of one supply at the price of the ordered quantity, ten-thousandths; null when unknown.</summary>
    public long? OneSupply => Quantity.Unit is { } unit ? checked(unit * PerSupply) : null;

    /// <summary>Lines of an order for the parts fitted, in the order in which the ledger first meets each.</summary>
    public static ImmutableArray<OrderLine> Of(Ledger ledger, BuildSize build) =>
    [
        .. ledger.Positions
            .Where(p => p.Fitting is not null)
            .GroupBy(p => Key(p.Fitting!.Part))
            .Select(g => Make([.. g], build)),
    ];

    /// <summary>Whether this line orders the part.</summary>
    public bool IsFor(Part part) => Key(Part) == Key(part);

    private static OrderLine Make(ImmutableArray<LedgerPosition> positions, BuildSize build)
    {
        var part = positions[0].Fitting!.Part;
        var perSupply = positions.Sum(Pieces);
        return new OrderLine(
            part,
            [.. positions.Select(p => p.Spec.Id)],
            perSupply,
            OrderQuantity.Of(part, perSupply, build.Units, build.Spares));
    }

    /// <summary>Pieces that a position takes in one supply.</summary>
    public static int Pieces(LedgerPosition position) => position.Spec.Quantity * (position.Fitting?.Count ?? 1);

    /// <summary>A catalogue part is itself; typed-in parts are the same when maker and ordering code are.</summary>
    private static (int Id, string Maker, string Code) Key(Part part) =>
        part.Id != 0 ? (part.Id, "", "") : (0, part.Maker, part.OrderingCode);
}
