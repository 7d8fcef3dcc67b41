namespace Selector.Engine.Circuits.StepDown;

/// <summary>What decides the current into a shorted output.</summary>
public enum ShortCircuitGovernor
{
    /// <summary>The regulator's current limit ends each pulse.</summary>
    CurrentLimit,

    /// <summary>The limit would need pulses shorter than the least on-time; leaving pulses out holds it.</summary>
    PulseSkipping,

    /// <summary>The least on-time lets more in than the limit: the current runs away to the balance of volt-seconds.</summary>
    LeastOnTime,

    /// <summary>The resistances keep the current below the limit even at the greatest duty.</summary>
    LoopResistance,
}

/// <summary>Periodic steady state into a short, SI units; means and RMS values over one period of the pulses.</summary>
public struct ShortCircuitSolution
{
    /// <summary>Which mechanism sets the current.</summary>
    public ShortCircuitGovernor Governor;

    /// <summary>Share of the time for which the switch is on.</summary>
    public double Duty;

    /// <summary>Rate at which pulses really come, Hz; below the switching frequency where pulses are skipped.</summary>
    public double PulseRate;

    /// <summary>Coil current, A; its mean and RMS are those of the short too, the output capacitor aside.</summary>
    public double CoilPeak, CoilMean, CoilRms, CoilValley;

    /// <summary>Catch-diode current, A.</summary>
    public double DiodeMean, DiodeRms, DiodePeak;

    /// <summary>Switch current, A; its mean is the mean input current.</summary>
    public double SwitchMean, SwitchRms, SwitchPeak;

    /// <summary>Mean input current, A.</summary>
    public double InputMean;

    /// <summary>Conduction loss, W.</summary>
    public double SwitchLoss, DiodeLoss, CoilLoss, LoopLoss;

    /// <summary>Whether every figure is a finite number.</summary>
    internal readonly bool IsFinite => double.IsFinite(
        Duty + PulseRate + CoilPeak + CoilMean + CoilRms + CoilValley + DiodeMean + DiodeRms + DiodePeak + SwitchMean
        + SwitchRms + SwitchPeak + InputMean + SwitchLoss + DiodeLoss + CoilLoss + LoopLoss);
}
