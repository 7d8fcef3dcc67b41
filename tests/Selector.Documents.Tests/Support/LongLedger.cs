using Selector.Documents.Sheets;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Tests.Support;

/// <summary>Thirty positions with names that no one should type, but someone will.</summary>
internal static class LongLedger
{
    private const string Word = "Unterbrechungsfreieversorgungsbaugruppe/0815-4711-ABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789";
    private static readonly string Corner = string.Join(", ", Enumerable.Range(1, 9).Select(i => $"condition number {i} at its greatest"));

    public static PaperInput Input { get; } = SampleLedger.For(
        SampleLedger.Of([Corner], [], [.. Enumerable.Range(1, 30).Select(Position)]), SampleRequirement.With("life", Word)) with
    {
        SupplyName = string.Join(' ', Enumerable.Repeat(Word, 6)), Drawn = Word, PolicyStanding = Corner,
    };

    private static LedgerPosition Position(int i)
    {
        var part = SampleParts.Reservoir with { Id = 100 + i, OrderingCode = Word + i, ShopNumber = "C-" + i, Maker = "A maker with a long name" };
        return SampleLedger.At(
            $"C{i}", "a place whose duty takes many words to say", CapacitorFamily.Id, 1, new Fitting(part),
            RowOf.Ceiling($"C{i}", "ripple current, weighted by every line of its spectrum", Units.Ampere, CapacitorFamily.Ripple, 0.9 + i / 30.0, 1.45, Corner),
            RowOf.Ceiling($"C{i}", "voltage", Units.Volt, CapacitorFamily.Voltage, 20 + i / 3.0, 35, i % 2 == 0 ? "no load" : Corner),
            RowOf.NotAssessed($"C{i}", Word));
    }
}
