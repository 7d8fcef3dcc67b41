using Selector.Storage.Entities;

namespace Selector.Storage.Tests.Support;

/// <summary>Rows that are good and of no further interest.</summary>
internal static class Some
{
    public static readonly DateTime Time = new(2026, 3, 31, 12, 0, 0, DateTimeKind.Utc);

    public static SupplyRecord Supply(string name = "bench") => new() { Name = name, CreatedUtc = Time, EditedUtc = Time };

    public static PartRecord Part(string code = "R-1", string maker = "Maker") =>
        new() { Family = "resistor", Maker = maker, OrderingCode = code, Ratings = "{}", Prices = "{}" };
}
