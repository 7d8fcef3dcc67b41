namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Periodic steady state of a step-down converter, SI units. Means and RMS values are over one switching period; RMS includes
/// DC. Output voltages are at the capacitor's terminals, ESR and ESL included.
/// </summary>
public struct ConverterSolution
{
    /// <summary>Discontinuous when <see cref="IdleFraction"/> exceeds 0.5 %.</summary>
    public ConductionMode Mode;

    /// <summary>Share of the period in which the coil current is below 0.1 % of its peak.</summary>
    public double IdleFraction;

    /// <summary>Mean output voltage, V.</summary>
    public double OutputMean;

    /// <summary>Largest output voltage, V.</summary>
    public double OutputMaximum;

    /// <summary>Smallest output voltage, V.</summary>
    public double OutputMinimum;

    /// <summary>Peak-to-peak output ripple, V.</summary>
    public double OutputRipple;

    /// <summary>Mean load current, A.</summary>
    public double LoadCurrentMean;

    /// <summary>Coil current, A.</summary>
    public double CoilMean, CoilPeak, CoilValley, CoilRms, CoilRipple;

    /// <summary>Catch-diode current, A, forwards.</summary>
    public double DiodeMean, DiodeRms, DiodePeak;

    /// <summary>Largest voltage of the switch node, which the diode blocks, V.</summary>
    public double DiodeReverseMaximum;

    /// <summary>Switch current, A; its mean is the mean input current.</summary>
    public double SwitchMean, SwitchRms, SwitchPeak;

    /// <summary>Largest voltage across the whole switch branch, V.</summary>
    public double SwitchOffMaximum;

    /// <summary>RMS current of the output capacitor, A.</summary>
    public double OutputCapacitorRms;

    /// <summary>RMS current of an input capacitor fed from a perfect current source, A.</summary>
    public double InputCapacitorRms;

    /// <summary>Conduction loss, W.</summary>
    public double SwitchLoss, DiodeLoss, CoilLoss, EsrLoss;

    /// <summary>Power into the load and from the source, W.</summary>
    public double LoadPower, InputPower;

    /// <summary>Load power over input power, conduction losses only; 0 when no power flows.</summary>
    public double Efficiency;

    /// <summary>Whether every figure is a finite number.</summary>
    internal readonly bool IsFinite
    {
        get
        {
            // A sum is finite only if all of its terms are; none is large enough to overflow within the ranges of the case.
            var sum = IdleFraction + OutputMean + OutputMaximum + OutputMinimum + OutputRipple + LoadCurrentMean
                + CoilMean + CoilPeak + CoilValley + CoilRms + CoilRipple + DiodeMean + DiodeRms + DiodePeak
                + DiodeReverseMaximum + SwitchMean + SwitchRms + SwitchPeak + SwitchOffMaximum + OutputCapacitorRms
                + InputCapacitorRms + SwitchLoss + DiodeLoss + CoilLoss + EsrLoss + LoadPower + InputPower + Efficiency;
            return double.IsFinite(sum);
        }
    }
}
