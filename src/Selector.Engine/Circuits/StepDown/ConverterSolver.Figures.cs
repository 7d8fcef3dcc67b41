namespace Selector.Engine.Circuits.StepDown;

// How the integrals and extremes of the three intervals become the figures of the solution.
public static partial class ConverterSolver
{
    // Conventions of the reference: a current counts as idle below this share of its peak ...
    private const double IdleLevel = 1e-3;

    // ... and the mode as discontinuous above this share of the period.
    private const double DiscontinuousFrom = 5e-3;

    private static ConverterSolution SolutionOf(
        in ConverterCase c, in ConverterPhases phases, in PeriodicOrbit orbit,
        in IntervalFigures on, in IntervalFigures diode, in IntervalFigures idle)
    {
        var f = c.Frequency;
        var idles = orbit.IdleTime > 0;
        var diodeConducts = orbit.DiodeTime > 0;
        var highest = Math.Max(on.TerminalMaximum, Math.Max(diode.TerminalMaximum, idle.TerminalMaximum));
        var lowest = Math.Min(on.TerminalMinimum, Math.Min(diode.TerminalMinimum, idle.TerminalMinimum));
        var peak = Math.Max(on.CoilMaximum, diode.CoilMaximum);
        var valley = idles ? 0 : Math.Min(on.CoilMinimum, diode.CoilMinimum);
        var mean = f * (on.Terminal + diode.Terminal + idle.Terminal);
        var switchMean = f * on.Coil;
        var switchSquare = f * on.CoilSquare;
        var diodeMean = f * diode.Coil;
        var diodeSquare = f * diode.CoilSquare;
        var capacitorSquare = f * (on.CapacitorSquare + diode.CapacitorSquare + idle.CapacitorSquare);
        var resistive = c.LoadKind == OutputLoad.Resistance;
        var loadPower = resistive
            ? f * (on.TerminalSquare + diode.TerminalSquare + idle.TerminalSquare) / c.Load
            : mean * c.Load;
        var inputPower = c.InputVoltage * switchMean;
        var idleFraction = f * (orbit.IdleTime + IdleCrossing.TimeBelow(phases, orbit, IdleLevel * peak));
        var switchNodeOn = phases.OnSource - c.SwitchResistance * on.CoilMinimum;
        return new()
        {
            Mode = idleFraction > DiscontinuousFrom ? ConductionMode.Discontinuous : ConductionMode.Continuous,
            IdleFraction = idleFraction,
            OutputMean = mean,
            OutputMaximum = highest,
            OutputMinimum = lowest,
            OutputRipple = highest - lowest,
            LoadCurrentMean = resistive ? mean / c.Load : c.Load,
            CoilMean = switchMean + diodeMean,
            CoilPeak = peak,
            CoilValley = valley,
            CoilRms = Math.Sqrt(switchSquare + diodeSquare),
            CoilRipple = peak - valley,
            DiodeMean = diodeMean,
            DiodeRms = Math.Sqrt(diodeSquare),
            DiodePeak = diodeConducts ? diode.CoilMaximum : 0,
            DiodeReverseMaximum = idles ? Math.Max(switchNodeOn, idle.TerminalMaximum) : switchNodeOn,
            SwitchMean = switchMean,
            SwitchRms = Math.Sqrt(switchSquare),
            SwitchPeak = on.CoilMaximum,
            SwitchOffMaximum = diodeConducts
                ? c.InputVoltage + c.DiodeThreshold + c.DiodeSlope * diode.CoilMaximum
                : c.SwitchDrop + c.SwitchResistance * on.CoilMaximum,
            OutputCapacitorRms = Math.Sqrt(capacitorSquare),
            // Rounding may leave the difference below zero where the current does not vary at all.
            InputCapacitorRms = Math.Sqrt(Math.Max(0, switchSquare - switchMean * switchMean)),
            SwitchLoss = c.SwitchDrop * switchMean + c.SwitchResistance * switchSquare,
            DiodeLoss = c.DiodeThreshold * diodeMean + c.DiodeSlope * diodeSquare,
            CoilLoss = c.CoilResistance * (switchSquare + diodeSquare),
            EsrLoss = c.Esr * capacitorSquare,
            LoadPower = loadPower,
            InputPower = inputPower,
            // Without any loss rounding alone may lift the quotient above 1.
            Efficiency = inputPower > 0 ? Math.Min(1, loadPower / inputPower) : 0,
        };
    }
}
