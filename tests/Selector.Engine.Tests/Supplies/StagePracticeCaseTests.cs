using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;
using Selector.Engine.Tests.Support;

namespace Selector.Engine.Tests.Supplies;

/// <summary>Small cases computed by hand that a whole stage must meet.</summary>
public class StagePracticeCaseTests
{
    // Computed by hand: √( (1.5 / 0.5)² + (1.0 / 1.0)² ); multiplying instead of dividing would give 1.25 A.
    [Fact]
    public void Ripple_currents_are_divided_by_their_multipliers_and_added_as_squares()
    {
        double[] table = [double.NaN, 0.5, 0.8, 0.95, 1];

        Assert.Equal(3.162, RippleWeight.Equivalent(table, 1.5, 100, 1.0, 100e3), 3);
    }

    // Practice case 13 for one part alone: 55 °C + 4 W x (2.5 + 5) K/W = 85 °C. What a second part adds on one sink comes with sinks.
    [Fact]
    public void A_junction_stands_above_the_air_by_its_own_loss_and_resistance()
    {
        var stage = new ThermalStage().Build(RequirementReader.Read(Standard.Registry, Requirement.Empty), [new Heater()]);
        var (links, stresses) = (new double[1], new double[1]);

        Assert.Equal(SolveStatus.Solved, stage.Solve([55, 4, 2.5 + 5], links, stresses, Budget.Standard));

        Assert.Equal((85, 85), (links[0], stresses[0]));
    }

    // Facts of the trade, no source: the DC output of a bridge is twice the mean of one leg.
    [Fact]
    public void A_bridge_rated_per_leg_carries_half_of_what_its_dc_output_does()
    {
        var requirement = Requirement.Empty.With("source", "mains").With(CommonFields.LoadFull, "1.5 A").With(CommonFields.OutputVoltage, "9");

        var output = Average(requirement, BridgeFamily.BasisOutput);
        var leg = Average(requirement, 1 - BridgeFamily.BasisOutput);

        Assert.Equal(2, output / leg, 9);
    }

    private static double Average(Requirement requirement, double basis)
    {
        var design = DemoParts.Fitted(requirement).Fit("BR1", new(DemoParts.Bridge.With(BridgeFamily.Basis, basis)));
        var ledger = Assessor.Assess(Standard.Registry, design, TestPolicy.Industrial, Budget.Standard);
        return ledger.Rows.Single(r => r.Id == "BR1.average-current").Stress!.Value;
    }

    private sealed class Heater : StageModel
    {
        public Heater() => Heats = [new HeatSource("U1", "loss.U1", "temperature.U1", RegulatorFamily.Cooling, RegulatorFamily.JunctionMax)];

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget) => SolveStatus.Solved;
    }
}
