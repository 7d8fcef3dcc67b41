using System.Collections.Immutable;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Preload;

/// <summary>R10 across the output terminals.</summary>
internal sealed class PreloadModel : StageModel
{
    private const string R10 = "R10";

    /// <summary>Share of full load that a preload draws as a starting value.</summary>
    private const double StartShare = 0.01;

    private readonly int _output, _short, _resistance, _count, _tolerance;
    private readonly int _current, _loss;
    private readonly int _power, _voltage;

    public PreloadModel(RequirementValues r)
    {
        var (output, shorted, resistance) = (InputId.Axis(CommonFields.OutputAxis), InputId.Axis(CommonFields.ShortAxis), InputId.Column(R10, ResistorFamily.Resistance));
        _output = Read(output);
        _short = Read(shorted);
        _resistance = Read(resistance);
        _count = Read(InputId.Count(R10));
        _tolerance = Read(InputId.Column(R10, ResistorFamily.Tolerance), 0.05);
        ImmutableArray<Dependence> on = [.. Rises("I = V / R", output), .. Falls("I = V / R", resistance), .. Falls("nothing when shorted", shorted)];
        _current = Write(new(LinkNames.PreloadCurrent, Units.Ampere, StartShare * r[CommonFields.LoadFull], [.. on]) { Others = Push.None });
        _loss = Write(new(LinkNames.Loss(R10), Units.Watt, 0.1, [.. on]) { Others = Push.None });
        OtherLosses = [new(LinkNames.Loss(R10))];
        _power = Stress(new(R10, "power", "power", Units.Watt, Side.Ceiling, new Bound.Rating(ResistorFamily.Power), "P = V² / (R (1 − t))") { On = on, Others = Push.None });
        _voltage = Stress(new(R10, "voltage", "working voltage", Units.Volt, Side.Ceiling, new Bound.Rating(ResistorFamily.Voltage), "V = V_out")
            { On = [.. Rises("it is the output", output), .. Falls("nothing when shorted", shorted)], Others = Push.None });
        Positions =
        [
            new(R10, "preload", ResistorFamily.Id, 1, ImmutableDictionary<string, double>.Empty
                .Add(ResistorFamily.Resistance, r[CommonFields.OutputVoltage] / (StartShare * r[CommonFields.LoadFull]))) { StandInReason = "a hundredth of the full load" },
        ];
    }

    public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var volts = inputs[_short] > 0.5 ? 0 : inputs[_output];
        links[_current] = volts * inputs[_count] / inputs[_resistance];
        links[_loss] = volts * volts * inputs[_count] / inputs[_resistance];
        if (!stresses.IsEmpty)
        {
            stresses[_power] = volts * volts / (inputs[_resistance] * (1 - Math.Min(0.99, inputs[_tolerance])));
            stresses[_voltage] = volts;
        }

        return SolveStatus.Solved;
    }
}
