using System.Collections.Immutable;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Mains;

/// <summary>Hand-book starting values for empty positions of the front end. Only a start: the fitted parts replace them.</summary>
internal static class MainsStandIn
{
    private const double TypicalDrop = 0.8;
    private const double TypicalRegulation = 0.15;
    private const double RmsOverMean = 1.7;

    /// <summary>A bus with room for drop-out, ripple and low mains, V.</summary>
    public static double Bus(RequirementValues r) => 1.5 * r[CommonFields.OutputVoltage] + 4;

    public static PositionSpec Transformer(RequirementValues r, FrontEndTopology topology, double fullPower)
    {
        var noLoad = (Bus(r) + topology.InPath * TypicalDrop) / Math.Sqrt(2) * (1 + TypicalRegulation) / (1 - r[MainsFields.Low]);
        var current = RmsOverMean * fullPower / Bus(r);
        return new PositionSpec("T1", "mains transformer", TransformerFamily.Id, 1, ImmutableDictionary<string, double>.Empty
            .Add(TransformerFamily.Primary, r[MainsFields.Voltage])
            .Add(TransformerFamily.Halves, topology.Halves)
            .Add(TransformerFamily.NoLoad, noLoad)
            .Add(TransformerFamily.Resistance, TypicalRegulation * noLoad / current / (1 + TypicalRegulation))
            .Add(TransformerFamily.ResistanceAt, 20))
        {
            StandInReason = "bus of one and a half times the output and 4 V, regulation 15 %",
        };
    }

    public static PositionSpec Rectifier(FrontEndTopology topology) => new(
        topology.Rectifier, topology.Role, topology.Family, topology.Quantity, ImmutableDictionary<string, double>.Empty
            .Add(RectifierRatings.Threshold, TypicalDrop)
            .Add(RectifierRatings.Slope, 0.04)
            .Add(RectifierRatings.Cooling, 30)
            .Add(RectifierRatings.CaseCooling, 3)
            .Add(BridgeFamily.Basis, BridgeFamily.BasisOutput))
    {
        StandInReason = "0.8 V and 40 mΩ a diode",
    };

    /// <summary>Capacitance for a ripple of a tenth of the bus, F.</summary>
    public static double Reservoir(RequirementValues r, FrontEndTopology topology, double fullPower) =>
        fullPower / Bus(r) / (topology.PulsesPerCycle * r[MainsFields.Frequency] * 0.1 * Bus(r));
}
