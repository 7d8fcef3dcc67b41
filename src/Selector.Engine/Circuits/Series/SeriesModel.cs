using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Series;

/// <summary>The series regulator on its bus: what it dissipates, whether it still regulates in the valley, what a short does to it.</summary>
internal sealed class SeriesModel : StageModel
{
    private const string U1 = "U1";
    private const string C2 = "C2";

    /// <summary>Frequency at which nothing alternates: for the reservoir's weight only, Hz.</summary>
    private const double NoFrequency = 1e5;

    private static readonly InputId Load = InputId.Axis(CommonFields.LoadAxis);
    private static readonly InputId Output = InputId.Axis(CommonFields.OutputAxis);
    private static readonly InputId Short = InputId.Axis(CommonFields.ShortAxis);
    private static readonly InputId BusMean = InputId.Link(LinkNames.BusMean);

    private readonly int _load, _output, _short, _busMean, _busMin, _busMax, _series, _firstOfPart, _quiescent, _preload;
    private readonly int _current, _ripple, _frequency, _out, _loss;
    private readonly SeriesStresses _stress;

    public SeriesModel(RequirementValues r)
    {
        _load = Read(Load);
        _output = Read(Output);
        _short = Read(Short);
        _busMean = Read(BusMean);
        _busMin = Read(InputId.Link(LinkNames.BusMin));
        _busMax = Read(InputId.Link(LinkNames.BusMax));
        _series = Read(InputId.Link(LinkNames.SeriesResistance));
        _preload = Read(InputId.Link(LinkNames.PreloadCurrent));
        _firstOfPart = Read(InputId.Column(U1, LinearRegulatorFamily.LimitMin), 0);
        Read(InputId.Column(U1, LinearRegulatorFamily.LimitMax));
        Read(InputId.Column(U1, LinearRegulatorFamily.FoldBack), 0);
        Read(InputId.Column(U1, LinearRegulatorFamily.FoldBackCurrent), 0);
        Read(InputId.Column(U1, LinearRegulatorFamily.DifferentialMax), 0);
        Read(InputId.Column(U1, LinearRegulatorFamily.Drop));
        Read(InputId.Column(U1, LinearRegulatorFamily.DropResistance), 0);
        _quiescent = Read(InputId.Column(U1, LinearRegulatorFamily.Quiescent), 0);
        ImmutableArray<Dependence> on =
        [
            .. Rises("it is the load, with the regulator's own", Load, InputId.Link(LinkNames.PreloadCurrent), InputId.Column(U1, LinearRegulatorFamily.Quiescent)),
            new Dependence(Short, Push.Unproven, "the limit may be above or, folded back, below the load"),
            new Dependence(Output, Push.None, "a current of its own, whatever the output"),
        ];
        _current = Write(new(LinkNames.RegulatorCurrent, Units.Ampere, r[CommonFields.LoadFull], [.. on]));
        _ripple = Write(new(LinkNames.RegulatorRipple, Units.Ampere, 0) { Others = Push.None });
        _frequency = Write(new(LinkNames.RegulatorFrequency, Units.Hertz, NoFrequency) { Others = Push.None });
        _out = Write(new(LinkNames.OutputCurrent, Units.Ampere, r[CommonFields.LoadFull], [.. on]));
        _loss = Write(new(LinkNames.Loss(U1), Units.Watt, 1,
            [.. Falls("more output, less left across it", Output), .. Rises("more bus across it", BusMean)]));
        _stress = new SeriesStresses(Stress, Read, r);
        Axes = [.. ReservoirCapacitor.Axes(C2)];
        Positions = SeriesPositions.List(r);
        Heats =
        [
            new(U1, LinkNames.Loss(U1), LinkNames.Temperature(U1), LinearRegulatorFamily.Cooling, LinearRegulatorFamily.JunctionMax,
                new Need(U1, LinearRegulatorFamily.Quiescent, "without its own consumption")) { CaseKey = LinearRegulatorFamily.CaseCooling },
        ];
        NotAssessed = [new("R2", "feedback divider with R3: output error"), new(C2, "stability of the regulator with this capacitor")];
    }

    public override SolveStatus Solve(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var part = Part(x);
        var shorted = x[_short] > 0.5;
        var bus = x[_busMean];
        var current = shorted ? part.Limit(bus) : x[_load] + x[_preload];
        var output = shorted ? 0 : x[_output] + current * x[_series];
        links[_current] = current + x[_quiescent];
        links[_ripple] = 0;
        links[_frequency] = NoFrequency;
        links[_out] = current;
        links[_loss] = Math.Max(0, bus - output) * current + bus * x[_quiescent];
        if (!stresses.IsEmpty)
        {
            _stress.Write(x, stresses, new SeriesPoint(part, current, output, x[_output], shorted, x[_busMin], x[_busMax]));
        }

        return SolveStatus.Solved;
    }

    private SeriesRegulator Part(ReadOnlySpan<double> x)
    {
        var p = x[_firstOfPart..];
        return new SeriesRegulator(p[0], p[1], p[2], p[3], p[4], p[5], p[6]);
    }
}

/// <summary>Where a series regulator stands at a condition.</summary>
/// <param name="Part">The regulator.</param>
/// <param name="Current">Through it, A.</param>
/// <param name="Output">Behind it, V; 0 when shorted.</param>
/// <param name="Set">Set at the terminals, V.</param>
/// <param name="Shorted">Whether the output is shorted.</param>
/// <param name="BusMin">Valley of the bus, V.</param>
/// <param name="BusMax">Top of the bus, V.</param>
internal readonly record struct SeriesPoint(SeriesRegulator Part, double Current, double Output, double Set, bool Shorted, double BusMin, double BusMax);
