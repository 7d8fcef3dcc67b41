using System.Collections.Immutable;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Thermal;

/// <summary>Where the heat goes: junctions to open air or to a common sink, the case and the air in it.</summary>
public sealed class ThermalStage : IStage
{
    public const string Width = "case.width";
    public const string Height = "case.height";
    public const string Depth = "case.depth";
    public const string Finish = "case.finish";
    public const string Resistance = "case.resistance";
    public const string HeightAbove = "place.altitude";
    public const string LocalRise = "case.local-rise";
    public const string Sink = "sink";
    public const string SinkPlace = "sink.place";
    public const string SinkInsulated = "sink.insulated";
    public const string Painted = "painted";
    public const string NoSink = "none";
    public const string SinkAll = "all";

    private static readonly Func<RequirementValues, bool> IsClosed = r => r.Is(Surroundings.Case, Surroundings.Closed);
    private static readonly Func<RequirementValues, bool> HasSink = r => !r.Is(Sink, NoSink);

    public string Id => "thermal";

    public string Name => "heat";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Surroundings.Case, "Case", Units.One, default, Surroundings.Open, "What stands around the parts. In an open case the ambient is the air at the parts.")
        {
            Group = "Place",
            Choices = [new(Surroundings.Open, "open"), new(Surroundings.Closed, "closed, by its size"), new(Surroundings.Given, "closed, K/W given")],
        },
        Size(Width, "Case, width", "200 mm"),
        Size(Height, "Case, height", "100 mm"),
        Size(Depth, "Case, depth", "200 mm"),
        new(Finish, "Case, finish", Units.One, default, Painted, "Outside of the walls: it decides how much they radiate.")
            { Group = "Place", Shown = IsClosed, Choices = [new(Painted, "painted"), new("bare", "bare bright metal")] },
        new(Resistance, "Case, inside to room", Units.KelvinPerWatt, new(0.001, 100), "1 K/W", "Rise of the air inside over the room, for each watt in the case.")
            { Group = "Place", Shown = r => r.Is(Surroundings.Case, Surroundings.Given) },
        new(LocalRise, "Local rise", Units.Kelvin, new(0, 100), "5 K", "How much warmer the air is at the reservoir and the sense bank than at the other parts.") { Group = "Place" },
        new(HeightAbove, "Altitude", Units.Metre, new(0, 5000), "0 m", "Above the sea: thin air cools less.") { Group = "Place" },
        new(Sink, "Heat sink", Units.One, default, NoSink, "Which parts share the heat sink HS1.")
        {
            Group = "Place",
            Choices = [new(NoSink, "none"), new("U1", "U1"), new("U1 D5", "U1 and catch diode"), new("U1 BR", "U1 and rectifier"), new(SinkAll, "all three")],
        },
        new(SinkPlace, "Heat sink, air", Units.One, default, "inside", "The air that the sink stands in.")
            { Group = "Place", Shown = HasSink, Choices = [new("inside", "in the case"), new("outside", "outside, in the room")] },
        new(SinkInsulated, "Heat sink, insulated", Units.One, default, "yes", "Whether each part is insulated from the sink: where several share it their tabs differ in voltage.")
            { Group = "Place", Shown = HasSink, Choices = [new("yes", "yes"), new("no", "no, dry contact with paste")] },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new ThermalModel(
        requirement, [.. before.SelectMany(s => s.Heats)], [.. before.SelectMany(s => s.OtherLosses)]);

    private static FieldSpec Size(string key, string label, string standard) =>
        new(key, label, Units.Millimetre, new(10, 5000), standard, "Outside, of the closed case.") { Group = "Place", Shown = IsClosed };
}
