namespace Selector.Engine.Circuits.Mains.SwitchOn;

/// <summary>The rectifier switched on with an empty reservoir.</summary>
/// <param name="Circuit">As in the steady state.</param>
/// <param name="Phase">Of the emf when it is switched on, rad.</param>
/// <param name="LoadFrom">Bus voltage below which a current load is only in proportion, V, at least 0.</param>
public readonly record struct SwitchOnCase(RectifierCase Circuit, double Phase, double LoadFrom);

/// <summary>One pulse of the train after switch-on.</summary>
/// <param name="Peak">A.</param>
/// <param name="Integral">A²s.</param>
public readonly record struct SwitchOnPulse(double Peak, double Integral);

/// <summary>What happens at switch-on, SI units; currents of the winding, or of both halves of a centre tap together.</summary>
public struct SwitchOnSolution
{
    /// <summary>Phase of the emf at switch-on, rad.</summary>
    public double Phase;

    /// <summary>First pulse: its peak in A, when it comes and when it ends, s.</summary>
    public double FirstPeak, FirstPeakAt, FirstEnd;

    /// <summary>Voltage on the ideal capacitor at the end of the first pulse, V.</summary>
    public double VoltageAtFirstEnd;

    /// <summary>A²s: over the first half period after switch-on, and over the first pulse.</summary>
    public double FirstHalfIntegral, FirstPulseIntegral;

    /// <summary>Largest pulse at all, A.</summary>
    public double GreatestPeak;

    /// <summary>Mean bus that it settles at, V.</summary>
    public double Steady;

    /// <summary>Line cycles until the ideal capacitor holds 95 % of that.</summary>
    public double CyclesTo95;

    internal readonly bool IsFinite => double.IsFinite(
        Phase + FirstPeak + FirstPeakAt + FirstEnd + VoltageAtFirstEnd + FirstHalfIntegral + FirstPulseIntegral + GreatestPeak + Steady + CyclesTo95);
}
