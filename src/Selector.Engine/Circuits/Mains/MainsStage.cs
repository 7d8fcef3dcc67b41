using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Mains;

/// <summary>Mains through a transformer and a rectifier onto the reservoir.</summary>
public sealed class MainsStage : IStage
{
    private static readonly Func<RequirementValues, bool> Shown = r => r.Is(CommonFields.Source, OutputStage.SourceMains);

    public string Id => "mains";

    public string Name => "mains, transformer and rectifier";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(MainsFields.Voltage, "Mains", Units.Volt, new(20, 600), "230 V", "Nominal rms voltage.") { Group = "Source", Shown = Shown },
        new(MainsFields.Low, "Mains, below", Units.Percent, new(0, 0.5), "10 %", "How far the mains may fall below nominal.") { Group = "Source", Shown = Shown },
        new(MainsFields.High, "Mains, above", Units.Percent, new(0, 0.5), "10 %", "How far the mains may rise above nominal.") { Group = "Source", Shown = Shown },
        new(MainsFields.Frequency, "Frequency", Units.Hertz, new(15, 1000), "50 Hz", "Nominal mains frequency.") { Group = "Source", Shown = Shown },
        new(MainsFields.FrequencyTolerance, "Frequency, ±", Units.Percent, new(0, 0.2), "1 %", "Either way.") { Group = "Source", Shown = Shown },
        new(MainsFields.Impedance, "Mains impedance", Units.Ohm, new(0, 100), "0.5 Ω", "Of the line up to the inlet: it deepens the valley; for peaks and at switch-on it counts as none.") { Group = "Source", Shown = Shown },
        new(MainsFields.FrontEnd, "Front end", Units.One, default, MainsFields.BridgePart, "How the secondary is rectified.")
        {
            Group = "Source", Shown = Shown,
            Choices =
            [
                new(MainsFields.BridgePart, "bridge, one part"), new(MainsFields.BridgeDiodes, "bridge, four diodes"),
                new(MainsFields.CentreTap, "centre tap, two diodes"), new(MainsFields.HalfWave, "half wave, one diode"),
            ],
        },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => Shown(requirement);

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new MainsModel(requirement);
}
