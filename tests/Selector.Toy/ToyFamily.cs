using Selector.Engine.Parts;
using Selector.Engine.Quantities;

namespace Selector.Toy;

/// <summary>A family that the product has never heard of.</summary>
internal static class ToyFamily
{
    public const string Id = "toy-lamp";

    public static FamilySpec Spec { get; } = new(Id, "toy lamp", "toy lamps",
    [
        new("filament", "filament resistance", Units.Ohm, new(0.1, 1e4), "Hot.") { Required = true, InDescription = true },
        new("brightness", "lamp power", Units.Watt, new(0.01, 100), "At which it lasts.") { InDescription = true },
    ])
    {
        Technologies = ["tungsten"],
    };

    public static Part Lamp(string code, double ohms, double watts, long price) => new()
    {
        Family = Spec,
        Maker = "Toyland",
        OrderingCode = code,
        Technology = "tungsten",
        Ratings = [ohms, watts],
        Prices = new PriceList("EUR", "2026-11-02", [new PriceBreak(1, price)]),
    };
}
