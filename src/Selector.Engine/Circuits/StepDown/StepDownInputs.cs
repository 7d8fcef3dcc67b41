using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.StepDown.StepDownPositions;

namespace Selector.Engine.Circuits.StepDown;

/// <summary>What the converter reads, and the circuit that it makes of it at a condition.</summary>
internal sealed class StepDownInputs
{
    /// <summary>Temperature at which coils are rated, °C.</summary>
    private const double CoilRatedAt = 20;

    private readonly int _frequency, _drop, _resistance, _resistanceDrift, _transition, _quiescent, _limit, _onTime, _shortFrequency, _skips;
    private readonly int _threshold, _thresholdDrift, _slope;
    private readonly int _inductance, _inductanceTolerance, _coil, _coilRms, _coilRise, _inductancePlace;
    private readonly int _capacitance, _capacitanceTolerance, _esr, _capacitancePlace, _esrPlace, _firstMultiplier;
    private readonly int _busMean, _busMin, _busMax, _series, _switchTemperature, _diodeTemperature, _coilTemperature;
    private readonly int _load, _short, _air;

    public StepDownInputs(Func<InputId, double?, int> read, RequirementValues r)
    {
        int Column(string position, string key, double? fallback = null) => read(InputId.Column(position, key), fallback);
        int Link(string name) => read(InputId.Link(name), null);
        int Axis(string name) => read(InputId.Axis(name), null);

        _frequency = Column(U1, RegulatorFamily.Frequency);
        _drop = Column(U1, RegulatorFamily.Drop, 0);
        _resistance = Column(U1, RegulatorFamily.Resistance);
        _resistanceDrift = Column(U1, RegulatorFamily.ResistanceDrift, 0);
        _transition = Column(U1, RegulatorFamily.Transition, 0);
        _quiescent = Column(U1, RegulatorFamily.Quiescent, 0);
        _limit = Column(U1, RegulatorFamily.LimitMax);
        _onTime = Column(U1, RegulatorFamily.OnTimeMin);
        _shortFrequency = Column(U1, RegulatorFamily.ShortFrequency, 0);
        _skips = Column(U1, RegulatorFamily.Skips, 0);
        _threshold = Column(D5, RectifierRatings.Threshold);
        _thresholdDrift = Column(D5, RectifierRatings.ThresholdDrift, 0);
        _slope = Column(D5, RectifierRatings.Slope);
        _inductance = Column(L1, InductorFamily.Inductance);
        _inductanceTolerance = Column(L1, InductorFamily.Tolerance, 0.2);
        _coil = Column(L1, InductorFamily.Resistance);
        _coilRms = Column(L1, InductorFamily.Rms, 0);
        _coilRise = Column(L1, InductorFamily.Rise, 40);
        _inductancePlace = Axis(StepDownStage.InductanceAxis);
        _capacitance = Column(C2, CapacitorFamily.Capacitance);
        _capacitanceTolerance = Column(C2, CapacitorFamily.Tolerance, 0.2);
        _esr = Column(C2, CapacitorFamily.EsrHigh);
        _capacitancePlace = Axis(ReservoirCapacitor.CapacitanceAxis(C2));
        _esrPlace = Axis(ReservoirCapacitor.EsrAxis(C2));
        _firstMultiplier = read(InputId.Column(C2, FrequencyMultiplier.Keys[0]), 0);
        foreach (var key in FrequencyMultiplier.Keys.Skip(1))
        {
            Column(C2, key, 0);
        }

        _busMean = Link(LinkNames.BusMean);
        _busMin = Link(LinkNames.BusMin);
        _busMax = Link(LinkNames.BusMax);
        _series = Link(LinkNames.SeriesResistance);
        _switchTemperature = Link(LinkNames.Temperature(U1));
        _diodeTemperature = Link(LinkNames.Temperature(D5));
        _coilTemperature = Link(LinkNames.Temperature(L1));
        _load = Axis(CommonFields.LoadAxis);
        _short = Axis(CommonFields.ShortAxis);
        _air = read(Surroundings.Air(r), null);
    }

    public double BusMean(ReadOnlySpan<double> x) => x[_busMean];

    public double BusMin(ReadOnlySpan<double> x) => x[_busMin];

    public double BusMax(ReadOnlySpan<double> x) => x[_busMax];

    public double Load(ReadOnlySpan<double> x) => x[_load];

    public double Air(ReadOnlySpan<double> x) => x[_air];

    public bool Shorted(ReadOnlySpan<double> x) => x[_short] > 0.5;

    public double Series(ReadOnlySpan<double> x) => x[_series];

    public double Frequency(ReadOnlySpan<double> x) => x[_frequency];

    public double TransitionTime(ReadOnlySpan<double> x) => x[_transition];

    public double Quiescent(ReadOnlySpan<double> x) => x[_quiescent];

    /// <summary>The converter at one input voltage and load, duty left open.</summary>
    public ConverterCase Circuit(ReadOnlySpan<double> x, double bus, double load) => new(
        x[_frequency],
        bus,
        0.5,
        x[_drop],
        Math.Max(0, x[_resistance] * (1 + x[_resistanceDrift] * (x[_switchTemperature] - 25))),
        Math.Max(0, x[_threshold] + x[_thresholdDrift] * (x[_diodeTemperature] - 25)),
        x[_slope],
        x[_inductance] * (1 + x[_inductanceTolerance] * x[_inductancePlace]),
        Copper.At(x[_coil], CoilRatedAt, x[_coilTemperature]),
        ReservoirCapacitor.Capacitance(x[_capacitance], x[_capacitanceTolerance], x[_capacitancePlace]),
        ReservoirCapacitor.Esr(x[_esr], x[_esrPlace]),
        0,
        OutputLoad.Current,
        load);

    /// <summary>The output shorted, U1 at its greatest limit and least on-time.</summary>
    public ShortCircuitCase Short(ReadOnlySpan<double> x, double bus)
    {
        var c = Circuit(x, bus, 0);
        return new ShortCircuitCase(
            x[_shortFrequency] > 0 ? x[_shortFrequency] : x[_frequency],
            bus, c.SwitchDrop, c.SwitchResistance, c.DiodeThreshold, c.DiodeSlope, c.Inductance, c.CoilResistance,
            x[_series], x[_limit], x[_onTime], x[_skips] > 0.5);
    }

    /// <summary>Coil temperature by the maker's rise at rated current: the rise goes with the square of the current, °C.</summary>
    public double CoilTemperature(ReadOnlySpan<double> x, double rms) =>
        x[_air] + (x[_coilRms] > 0 ? x[_coilRise] * rms * rms / (x[_coilRms] * x[_coilRms]) : 0);

    /// <summary>Ripple current of C2 as one at the frequency of its rating, A.</summary>
    public double WeightedRipple(ReadOnlySpan<double> x, double rms) =>
        RippleWeight.Equivalent(x.Slice(_firstMultiplier, FrequencyMultiplier.Keys.Length), 0, 0, rms, x[_frequency]);
}
