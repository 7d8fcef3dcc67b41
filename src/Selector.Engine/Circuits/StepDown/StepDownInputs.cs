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
    private readonly int _coreLoss, _coreFrequency, _coreRipple, _saturationHot, _recovery, _leakage, _leakageAt, _esl, _esrCold;
    private readonly int _life, _lifeAt, _rippleRise, _rippleRated, _preload;
    private readonly int _busMean, _busMin, _busMax, _series, _switchTemperature, _diodeTemperature, _coilTemperature;
    private readonly int _output, _load, _short, _air;

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
        _coreLoss = Column(L1, InductorFamily.CoreLoss, 0);
        _coreFrequency = Column(L1, InductorFamily.CoreFrequency, 1.5);
        _coreRipple = Column(L1, InductorFamily.CoreRipple, 2.3);
        _saturationHot = Column(L1, InductorFamily.SaturationHot, 1);
        _recovery = Column(D5, RectifierRatings.RecoveryCharge, 0);
        _leakage = Column(D5, RectifierRatings.Leakage, 0);
        _leakageAt = Column(D5, RectifierRatings.LeakageAt, 100);
        _esl = Column(C2, CapacitorFamily.Esl, 0);
        _esrCold = Column(C2, CapacitorFamily.EsrCold, ColdEsr.Usual);
        _life = Column(C2, CapacitorFamily.Life, 0);
        _lifeAt = Column(C2, CapacitorFamily.TemperatureMax, 85);
        _rippleRise = Column(C2, CapacitorFamily.RippleRise, 5);
        _rippleRated = Column(C2, CapacitorFamily.Ripple, 0);
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
        _output = Axis(CommonFields.OutputAxis);
        _preload = Link(LinkNames.PreloadCurrent);
        _load = Axis(CommonFields.LoadAxis);
        _short = Axis(CommonFields.ShortAxis);
        _air = read(Surroundings.Air(r), null);
    }

    public double BusMean(ReadOnlySpan<double> x) => x[_busMean];

    public double BusMin(ReadOnlySpan<double> x) => x[_busMin];

    public double BusMax(ReadOnlySpan<double> x) => x[_busMax];

    /// <summary>Current at the terminals, the preload's included, A.</summary>
    public double Load(ReadOnlySpan<double> x) => x[_load] + x[_preload];

    public double Preload(ReadOnlySpan<double> x) => x[_preload];

    /// <summary>Voltage set at the terminals, V.</summary>
    public double Output(ReadOnlySpan<double> x) => x[_output];

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
        Inductance(x),
        Copper.At(x[_coil], CoilRatedAt, x[_coilTemperature]),
        Capacitance(x),
        Esr(x),
        x[_esl],
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

    public double Esr(ReadOnlySpan<double> x) => ReservoirCapacitor.Esr(x[_esr], x[_esrPlace], x[_esrCold], x[_air]);

    public double Capacitance(ReadOnlySpan<double> x) => ReservoirCapacitor.Capacitance(x[_capacitance], x[_capacitanceTolerance], x[_capacitancePlace]);

    public double Inductance(ReadOnlySpan<double> x) => x[_inductance] * (1 + x[_inductanceTolerance] * x[_inductancePlace]);

    /// <summary>Share of the saturation current that is left at the coil's temperature: full at 25 °C, as stated at 100 °C.</summary>
    public double SaturationLeft(ReadOnlySpan<double> x) =>
        Math.Clamp(1 + (x[_saturationHot] - 1) * (x[_coilTemperature] - 25) / 75, 0.05, 1.5);

    /// <summary>Core loss by the maker's exponents, W.</summary>
    public double CoreLoss(ReadOnlySpan<double> x, double ripple, double frequency) => x[_coreLoss] <= 0 ? 0
        : x[_coreLoss] * Math.Pow(frequency / 1e5, x[_coreFrequency]) * Math.Pow(ripple, x[_coreRipple]);

    /// <summary>Charge that the switch clears out of the diode at every turn-on, as a power, W.</summary>
    public double RecoveryLoss(ReadOnlySpan<double> x, double bus, double frequency) => x[_recovery] * bus * frequency;

    /// <summary>
    /// Loss by reverse current while the switch is on, W: it doubles for every ten kelvins of the junction. Common practice, no source.
    /// </summary>
    public double LeakageLoss(ReadOnlySpan<double> x, double bus, double duty) =>
        x[_leakage] * Math.Pow(2, Math.Clamp((x[_diodeTemperature] - x[_leakageAt]) / 10, -30, 30)) * bus * duty;

    /// <summary>
    /// How fast the diode's loss grows with its junction, W/K: leakage by its doubling, the threshold by its drift where it rises; a
    /// falling threshold, which steadies the loop, is not counted on.
    /// </summary>
    public double DiodeLossSlope(ReadOnlySpan<double> x, double leakageLoss, double mean) =>
        leakageLoss * Math.Log(2) / 10 + Math.Max(0, x[_thresholdDrift]) * mean;

    /// <summary>How fast the switch's loss grows with its junction, W/K.</summary>
    public double SwitchLossSlope(ReadOnlySpan<double> x, double rms) => x[_resistance] * Math.Max(0, x[_resistanceDrift]) * rms * rms;

    /// <summary>
    /// Coil temperature, °C: the maker's rise at rated current tells what a watt of loss does, and the core's watts do as much.
    /// </summary>
    public double CoilTemperature(ReadOnlySpan<double> x, double copper, double core)
    {
        var rated = x[_coil] * x[_coilRms] * x[_coilRms];
        return x[_air] + (rated > 0 ? x[_coilRise] * (copper + core) / Copper.At(rated, CoilRatedAt, CoilRatedAt + x[_coilRise]) : 0);
    }

    /// <summary>Coil temperature as the loops have it, °C.</summary>
    public double CoilTemperature(ReadOnlySpan<double> x) => x[_coilTemperature];

    /// <summary>Life of C2, h.</summary>
    public double Life(ReadOnlySpan<double> x, double ripple) => ElectrolyticLife.Hours(
        x[_life], x[_lifeAt], x[_rippleRise], x[_air], x[_rippleRated] > 0 ? WeightedRipple(x, ripple) / x[_rippleRated] : 1);

    /// <summary>Ripple current of C2 as one at the frequency of its rating, A.</summary>
    public double WeightedRipple(ReadOnlySpan<double> x, double rms) =>
        RippleWeight.Equivalent(x.Slice(_firstMultiplier, FrequencyMultiplier.Keys.Length), 0, 0, rms, x[_frequency]);
}
