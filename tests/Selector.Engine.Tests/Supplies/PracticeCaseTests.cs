using Selector.Engine.Circuits;
using Selector.Engine.Corners;
using Selector.Engine.Derating;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;
using Selector.Engine.Tests.Support;

namespace Selector.Engine.Tests.Supplies;

/// <summary>Small cases computed by hand from the laws named; each exposes a usual wrong implementation.</summary>
public class PracticeCaseTests
{
    // Computed by hand: 0.5 x 0.6 W x (155 - 100) / (155 - 70); common practice for film resistors (IEC 60115-1 curve, from memory).
    [Fact]
    public void A_film_resistor_is_derated_from_what_its_own_curve_leaves_at_temperature()
    {
        var row = Only(new ToyStress(ResistorFamily.Id, "power", ResistorFamily.Power, 0.1, 100), TestPart.Of(ResistorFamily.Spec, "R",
            (ResistorFamily.Resistance, 100), (ResistorFamily.Power, 0.6), (ResistorFamily.Knee, 70), (ResistorFamily.Zero, 155)));

        Assert.Equal(0.194, row.Allowed!.Value, 3);
    }

    // Computed by hand: 36 V mean and half of 4 V peak to peak are 38 V; 0.8 x 50 V are 40 V; 1 - 38/40.
    [Fact]
    public void A_capacitor_is_held_against_mean_plus_ripple_peak()
    {
        var row = Only(new ToyStress(CapacitorFamily.Id, "voltage", CapacitorFamily.Voltage, 36 + 4 / 2.0, 25), TestPart.Of(CapacitorFamily.Spec, "C",
            (CapacitorFamily.Capacitance, 1e-3), (CapacitorFamily.Voltage, 50)));

        Assert.Equal(0.05, row.Margin!.Value, 12);
    }

    // Computed by hand: 3 A against 0.7 x 4 A; a bridge that is rated for its DC output is not rated for a leg.
    [Fact]
    public void A_bridge_rated_for_its_dc_output_is_held_against_the_dc_output()
    {
        var row = Only(new ToyStress(BridgeFamily.Id, "average-current", RectifierRatings.Average, 3, 25), TestPart.Of(BridgeFamily.Spec, "B",
            (RectifierRatings.Average, 4), (RectifierRatings.Knee, 50), (RectifierRatings.JunctionMax, 150)));

        Assert.Equal(-0.0714, row.Margin!.Value, 4);
        Assert.Equal(Verdict.Lacks, row.Verdict);
    }

    // Computed by hand: (125 - 100) / (125 - 40); 25 K.
    [Fact]
    public void The_margin_of_a_temperature_is_measured_from_the_ambient()
    {
        var stress = new ToyStress(RegulatorFamily.Id, "junction-temperature", RegulatorFamily.JunctionMax, 100, 40) { Side = Side.Temperature };

        var row = Only(stress, TestPart.Of(RegulatorFamily.Spec, "U", (RegulatorFamily.JunctionMax, 150)));

        Assert.Equal(0.294, row.Margin!.Value, 3);
        Assert.Equal(25, row.KelvinLeft!.Value, 9);
    }

    // Common practice, no source: what a data sheet does not say cannot pass.
    [Fact]
    public void A_blank_ripple_rating_is_not_rated_and_there_is_no_pass()
    {
        var ledger = ToyStress.Assess(new ToyStress(CapacitorFamily.Id, "ripple-current", CapacitorFamily.Ripple, 1, 25),
            TestPart.Of(CapacitorFamily.Spec, "C", (CapacitorFamily.Capacitance, 1e-3), (CapacitorFamily.Voltage, 50)), TestPolicy.Industrial);

        var row = Assert.Single(ledger.Rows);
        Assert.Equal(Verdict.NotRated, row.Verdict);
        Assert.Contains("ripple current", row.Reason, StringComparison.Ordinal);
        Assert.False(ledger.Counts.Passes);
    }

    // MIL-STD-975M Appendix A has no row for aluminium electrolytics (second-hand): a policy without a clause does not cover.
    [Fact]
    public void A_family_without_a_clause_is_not_covered_and_there_is_no_pass()
    {
        var silent = new Policy("silent", "Silent", 1, "", []);

        var ledger = ToyStress.Assess(new ToyStress(CapacitorFamily.Id, "voltage", CapacitorFamily.Voltage, 1, 25),
            TestPart.Of(CapacitorFamily.Spec, "C", (CapacitorFamily.Voltage, 50)), silent);

        Assert.Equal(Verdict.NotCovered, Assert.Single(ledger.Rows).Verdict);
        Assert.False(ledger.Counts.Passes);
    }

    [Fact]
    public void Nothing_left_of_a_rating_is_not_usable_rather_than_infinite()
    {
        var row = Only(new ToyStress(ResistorFamily.Id, "power", ResistorFamily.Power, 0.1, 160), TestPart.Of(ResistorFamily.Spec, "R",
            (ResistorFamily.Power, 0.6), (ResistorFamily.Knee, 70), (ResistorFamily.Zero, 155)));

        Assert.Equal(Verdict.NotUsable, row.Verdict);
        Assert.Null(row.Margin);
    }

    private static LedgerRow Only(ToyStress stress, Engine.Parts.Part part) =>
        Assert.Single(ToyStress.Assess(stress, part, TestPolicy.Industrial).Rows);
}
