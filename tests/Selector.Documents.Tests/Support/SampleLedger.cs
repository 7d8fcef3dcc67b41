using System.Collections.Immutable;
using Selector.Documents.Sheets;
using Selector.Engine.Circuits;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Tests.Support;

/// <summary>A ledger of the size of a real supply, with every verdict in it; and one with nothing.</summary>
internal static class SampleLedger
{
    private const string Full = "mains +10 %, 50 Hz, 1.500 A, 45 °C";
    private const string Shorted = "mains +10 %, output shorted for an hour, limit at its greatest, 45 °C, C1 aged, transformer 5 % above its nominal no-load voltage";

    public static Ledger Whole { get; } = Of(
        ["The current limit does not act before the auxiliary rail is up: do not connect a load that the first tens of milliseconds may harm."],
        [RowOf.NotAssessed("F1", "melting I²t against switch-on, breaking capacity"), RowOf.NotAssessed("S1", "continuous current, switched voltage")],
        At("T1", "isolates and steps down", TransformerFamily.Id, 1, new Fitting(SampleParts.Transformer),
            RowOf.Ceiling("T1", "secondary current", Units.Ampere, TransformerFamily.Current, 2.31, 4.17, Full),
            RowOf.Temperature("T1", "winding temperature", TransformerFamily.WindingMax, 88.25, 130, Full),
            RowOf.NotAssessed("T1", "core inrush, volt-seconds at lowest frequency")),
        At("D1-D4", "bridge", DiodeFamily.Id, 4, new Fitting(SampleParts.Diode),
            RowOf.Ceiling("D1-D4", "reverse voltage", Units.Volt, RectifierRatings.Reverse, 24.93, 200, "mains +10 %, no load", RowOf.Practice),
            RowOf.Ceiling("D1-D4", "average current", Units.Ampere, RectifierRatings.Average, 0.6512, 3, Full, RowOf.Hot),
            RowOf.Ceiling("D1-D4", "repetitive peak", Units.Ampere, RectifierRatings.Peak, 6.02, 30, Full),
            RowOf.Ceiling("D1-D4", "first surge", Units.Ampere, RectifierRatings.Surge, 29.4, 100, "253 V, phase 64°, cold, C1 new and empty"),
            RowOf.Open("D1-D4", "melting integral", Units.AmpereSquaredSecond, Verdict.NotRated, "needs surge integral of D1-D4", 4.2),
            RowOf.Temperature("D1-D4", "junction temperature", RectifierRatings.JunctionMax, 96.2, 150, Full)),
        At("C1", "reservoir", CapacitorFamily.Id, 1, new Fitting(SampleParts.Reservoir),
            RowOf.Ceiling("C1", "ripple current, weighted", Units.Ampere, CapacitorFamily.Ripple, 1.2801, 1.45, "mains +10 %, 1.500 A, C new"),
            RowOf.Ceiling("C1", "voltage", Units.Volt, CapacitorFamily.Voltage, 27.41, 35, "mains +10 %, no load"),
            RowOf.Floor("C1", "life", Units.Hour, "life", 31200, 20000, "load profile, 45 °C"),
            RowOf.NotAssessed("C1", "hold-up over a missed half-cycle")),
        At("U1", "step-down regulator", RegulatorFamily.Id, 1, new Fitting(SampleParts.Regulator),
            RowOf.Ceiling("U1", "input voltage", Units.Volt, RegulatorFamily.InputMax, 27.41, 40, "mains +10 %, no load"),
            RowOf.Ceiling("U1", "switch peak against its own guaranteed least limit", Units.Ampere, RegulatorFamily.LimitMin, 3.9, 3.6, Shorted),
            RowOf.Open("U1", "duty at low bus", Units.Percent, Verdict.NotCovered, "the policy has no clause for it", 0.6123),
            RowOf.Open("U1", "least on-time", Units.Second, Verdict.NotUsable, "no operating point: the source cannot give what is asked"),
            RowOf.Temperature("U1", "junction temperature", RegulatorFamily.JunctionMax, 97.8, 125, Shorted)),
        At("L1", "storage coil", InductorFamily.Id, 1, new Fitting(SampleParts.Coil),
            RowOf.Ceiling("L1", "saturation current", Units.Ampere, InductorFamily.Saturation, 1.92, 4.08, Full),
            RowOf.Ceiling("L1", "saturation current when shorted", Units.Ampere, InductorFamily.Saturation, 3.31, 4.25, Shorted, RowOf.Practice),
            RowOf.Ceiling("L1", "rms current", Units.Ampere, InductorFamily.Rms, 1.54, 2.2, Full)),
        At("D5", "catch diode", DiodeFamily.Id, 1, new Fitting(SampleParts.Diode),
            RowOf.Ceiling("D5", "reverse voltage", Units.Volt, RectifierRatings.Reverse, 27.9, 200, "mains +10 %, no load"),
            RowOf.Ceiling("D5", "average current", Units.Ampere, RectifierRatings.Average, 2.34, 3, Shorted, RowOf.Hot),
            RowOf.Temperature("D5", "junction temperature", RectifierRatings.JunctionMax, 121, 150, Shorted)),
        At("C2", "output capacitor", CapacitorFamily.Id, 1, new Fitting(SampleParts.Output, ArrangementKind.Parallel, 2),
            RowOf.Ceiling("C2", "voltage", Units.Volt, CapacitorFamily.Voltage, 9.18, 25, "output +2 %"),
            RowOf.Ceiling("C2", "ripple current", Units.Ampere, CapacitorFamily.Ripple, 0.2312, 0.76, "mains +10 %, 70 kHz −10 %"),
            RowOf.Open("C2", "stability window", Units.Ohm, Verdict.NotRated, "needs ESR at 100 kHz of C2", 0.0375),
            RowOf.Floor("C2", "ripple at the output", Units.Volt, CommonFields.OutputRipple, 0.25, 0.15, "cold")),
        At("R1", "bleeder", ResistorFamily.Id, 1, new Fitting(SampleParts.Resistor),
            RowOf.Ceiling("R1", "power", Units.Watt, ResistorFamily.Power, 0.0752, 0.4, "mains +10 %, no load", RowOf.Hot)),
        At("R4", "sense bank", ResistorFamily.Id, 1, new Fitting(SampleParts.Resistor, ArrangementKind.Parallel, 6),
            RowOf.Ceiling("R4", "power in the worst one", Units.Watt, ResistorFamily.Power, 0.117, 0.4, Shorted, RowOf.Hot),
            RowOf.Ceiling("R4", "voltage", Units.Volt, ResistorFamily.Voltage, 0, 250, "no load") with { Verdict = Verdict.NoDemand, Margin = null, MarginUnderated = null }),
        At("C3", "bypass at U1", CapacitorFamily.Id, 1, null,
            RowOf.Open("C3", "voltage", Units.Volt, Verdict.NoPart, "no part fitted", 27.41, 34.2625),
            RowOf.Open("C3", "ripple current", Units.Ampere, Verdict.NoPart, "no part fitted", 0.7512, 0.939)));

    public static Ledger Empty { get; } = Of([], []) with { Fault = "Output voltage: type a value. Full load: type a value." };

    public static PaperInput Input { get; } = For(Whole, SampleRequirement.Values) with
    {
        Shop = "Hollin Bench Works", PolicyStanding = "common practice, no source", Engine = "0.1.0",
    };

    public static PaperInput EmptyInput { get; } = For(Empty, SampleRequirement.None) with { SupplyName = "", Engine = "0.1.0" };

    public static PaperInput For(Ledger ledger, RequirementValues requirement) => new(
        "Fixture supply, 9 V with adjustable limit", 7, "3 March 2026, 14:02", requirement, Design.Empty, ledger, Drawn: "A. Vell");

    public static LedgerPosition At(string id, string role, string family, int quantity, Fitting? fitting, params LedgerRow[] rows) =>
        new(new PositionSpec(id, role, family, quantity, ImmutableDictionary<string, double>.Empty), fitting, [.. rows]);

    public static Ledger Of(ImmutableArray<string> cautions, ImmutableArray<LedgerRow> notAssessed, params LedgerPosition[] positions)
    {
        var rows = positions.SelectMany(p => p.Rows).Concat(notAssessed).ToList();
        int Count(Verdict v) => rows.Count(r => r.Verdict == v);
        var counts = new Counts(
            Count(Verdict.Holds) + Count(Verdict.NoDemand), Count(Verdict.Lacks), Count(Verdict.NotRated), Count(Verdict.NotAssessed),
            Count(Verdict.NotCovered), Count(Verdict.NotUsable), positions.Count(p => p.Fitting is null), 0);
        return new Ledger([.. positions], notAssessed, counts, "General industrial 2", cautions, null);
    }
}
