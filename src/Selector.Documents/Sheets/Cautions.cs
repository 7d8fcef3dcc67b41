using System.Collections.Immutable;
using Selector.Documents.Model;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>
/// Warnings that go with every paper about a supply. Whoever holds the sheet at the bench may never have seen the page, so they
/// are printed in full on each paper and in one line on each sheet.
/// </summary>
public static class Cautions
{
    /// <summary>At the foot of every sheet.</summary>
    public const string Line =
        "Mains, stored charge and hot parts injure and kill. Isolate, discharge and prove dead before touching. Local codes and a licensed person decide; this sheet does not replace them.";

    private static readonly ImmutableArray<CautionPoint> Always =
    [
        new("Mains", "Everything up to the transformer is live while the cord is in. Unplug it or lock it off, then prove with a tested meter that it is dead; cover mains joints before power comes back."),
        new("Stored energy", "Reservoir capacitors stay charged after switching off. Discharge them through a resistor, wait, and measure that they are dead before a hand or a tool goes near."),
        new("Heat", "Heat sinks, regulators, diodes, resistors and the transformer can burn the skin, and stay hot when the supply is off. Measure their temperature in the finished case."),
        new("Protective earth", "Bond every metal part that can be touched to protective earth, at a screw that holds nothing else, and have the bond and the insulation tested before the first use."),
        new("Approvals", "Parts on the mains side need the approvals that apply where the supply is used. A margin on this sheet is not an approval, and a part marked \"no substitution\" may only be changed by the designer."),
        new("Who decides", "Local codes come first, and where they ask for it a licensed person does the mains work and signs for it. These figures are computed, not measured; this sheet does not replace either."),
    ];

    /// <summary>The general warnings, then those that the circuit itself brings.</summary>
    public static Caution For(Ledger ledger) => new(
        "Before anyone builds, opens or tests this supply",
        [.. Always, .. ledger.Cautions.Select(c => new CautionPoint("This circuit", c))]);
}
