using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Mains;

/// <summary>Mains through a transformer and a rectifier onto the reservoir.</summary>
public sealed class MainsStage : IStage
{
    public const string Voltage = "mains.voltage";
    public const string Low = "mains.low";
    public const string High = "mains.high";
    public const string Frequency = "mains.frequency";
    public const string FrequencyTolerance = "mains.frequency-tolerance";
    public const string Impedance = "mains.impedance";
    public const string FrontEnd = "front-end";
    public const string BridgePart = "bridge";
    public const string BridgeDiodes = "bridge-diodes";
    public const string CentreTap = "centre-tap";
    public const string HalfWave = "half-wave";
    public const string MainsAxis = "mains";
    public const string FrequencyAxis = "frequency";
    public const string WindingAxis = "T1.winding";

    private static readonly Func<RequirementValues, bool> Shown = r => r.Is(CommonFields.Source, OutputStage.SourceMains);

    public string Id => "mains";

    public string Name => "mains, transformer and rectifier";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Voltage, "Mains", Units.Volt, new(20, 600), "230 V", "Nominal rms voltage.") { Group = "Source", Shown = Shown },
        new(Low, "Mains, below", Units.Percent, new(0, 0.5), "10 %", "How far the mains may fall below nominal.") { Group = "Source", Shown = Shown },
        new(High, "Mains, above", Units.Percent, new(0, 0.5), "10 %", "How far the mains may rise above nominal.") { Group = "Source", Shown = Shown },
        new(Frequency, "Frequency", Units.Hertz, new(15, 1000), "50 Hz", "Nominal mains frequency.") { Group = "Source", Shown = Shown },
        new(FrequencyTolerance, "Frequency tolerance", Units.Percent, new(0, 0.2), "1 %", "Either way.") { Group = "Source", Shown = Shown },
        new(Impedance, "Mains impedance", Units.Ohm, new(0, 100), "0.5 Ω", "Of the line up to the inlet: it deepens the valley; for peaks and at switch-on it counts as none.") { Group = "Source", Shown = Shown },
        new(FrontEnd, "Front end", Units.One, default, BridgePart, "How the secondary is rectified.")
        {
            Group = "Source", Shown = Shown,
            Choices =
            [
                new(BridgePart, "bridge, one part"), new(BridgeDiodes, "bridge, four diodes"),
                new(CentreTap, "centre tap, two diodes"), new(HalfWave, "half wave, one diode"),
            ],
        },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => Shown(requirement);

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new MainsModel(requirement);
}
