using System.Collections.Immutable;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;

namespace Selector.Documents.Tests.Support;

/// <summary>Invented parts by invented makers.</summary>
internal static class SampleParts
{
    public static Part Transformer { get; } = Of(1, TransformerFamily.Spec, "Hollin", "TR-2X12-50-EI66", Price("EUR", "2026-03-02", (1, 142500), (25, 118000))) with { ShopNumber = "T-0031", Stock = 12 };

    public static Part Diode { get; } = Of(2, DiodeFamily.Spec, "Tamsel", "R3-200-TR/AMMO", Price("EUR", "2026-03-02", (1, 1200), (100, 775)),
        (RectifierRatings.Reverse, 200), (RectifierRatings.Average, 3)) with { ShopNumber = "D-0114", Stock = 1840, LeastOrder = 50, Multiple = 10 };

    public static Part Reservoir { get; } = Of(3, CapacitorFamily.Spec, "Arden", "LE4-472-35", Price("EUR", "2026-02-11", (1, 12600)),
        (CapacitorFamily.Capacitance, 4.7e-3), (CapacitorFamily.Voltage, 35), (CapacitorFamily.Ripple, 1.45)) with { ShopNumber = "C-0220", Stock = 340 };

    public static Part Output { get; } = Of(4, CapacitorFamily.Spec, "Arden", "LX-471-25-LOW-ESR-105-20-RADIAL-AMMOPACK", Price("EUR", "2026-02-11", (1, 4300)),
        (CapacitorFamily.Capacitance, 4.7e-4), (CapacitorFamily.Voltage, 25)) with { Lifecycle = Lifecycle.NotForNewDesigns };

    public static Part Regulator { get; } = Of(5, RegulatorFamily.Spec, "Corvane", "SB-2540-ADJ", Price("USD", "2026-01-20", (1, 21500)),
        (RegulatorFamily.InputMax, 40), (RegulatorFamily.OutputCurrent, 3), (RegulatorFamily.Frequency, 70e3)) with { ShopNumber = "U-0007", Stock = 44 };

    public static Part Coil { get; } = Of(6, InductorFamily.Spec, "Corvane", "DR-680", PriceList.None) with { ShopNumber = "L-0063" };

    public static Part Resistor { get; } = Of(0, ResistorFamily.Spec, "Pellow", "=MR25-1R5-1%", Price("EUR", "", (1, 375)));

    private static Part Of(int id, FamilySpec family, string maker, string code, PriceList prices, params (string Key, double Value)[] ratings)
    {
        var values = Enumerable.Repeat(double.NaN, family.Ratings.Length).ToArray();
        foreach (var (key, value) in ratings)
        {
            values[family.Ordinal(key)] = value;
        }

        return new Part { Id = id, Family = family, Maker = maker, OrderingCode = code, Ratings = [.. values], Prices = prices, Technology = family.Technologies[0] };
    }

    private static PriceList Price(string currency, string date, params (int From, long Price)[] breaks) =>
        new(currency, date, [.. breaks.Select(b => new PriceBreak(b.From, b.Price))]);
}
