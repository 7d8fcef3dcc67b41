namespace Selector.Engine.Circuits.Mains.HoldUp;

/// <summary>The rectifier in steady state, whose mains fails at a zero crossing.</summary>
/// <param name="Circuit">As in the steady state.</param>
/// <param name="LockOut">Bus below which what follows gives up, V, above 0.</param>
public readonly record struct HoldUpCase(RectifierCase Circuit, double LockOut);

/// <summary>How the bus rides through, SI units; voltages at the terminals of the reservoir.</summary>
public struct HoldUpSolution
{
    /// <summary>Before the failure, V.</summary>
    public double BusMean, BusMax, BusMin;

    /// <summary>Ideal capacitor at the zero crossing at which the mains fails, V.</summary>
    public double VoltageAtRemoval;

    /// <summary>Least bus when half a cycle or a whole one is missed, V.</summary>
    public double LeastInHalf, LeastInWhole;

    /// <summary>Time until the lock-out when the mains stays away, from the zero crossing and from the last top of the bus, s.</summary>
    public double RideFromRemoval, RideFromTop;

    /// <summary>Time below the lock-out when half a cycle is missed, s.</summary>
    public double BelowLockOut;

    /// <summary>Largest diode current when the mains is back after half a cycle, A.</summary>
    public double RechargePeak;

    /// <summary>Whether the bus stays above the lock-out when half a cycle is missed.</summary>
    public bool Survives;

    internal readonly bool IsFinite => double.IsFinite(
        BusMean + BusMax + BusMin + VoltageAtRemoval + LeastInHalf + LeastInWhole + RideFromRemoval + RideFromTop + BelowLockOut + RechargePeak);
}
