namespace Selector.Engine.Circuits.StepDown;

/// <summary>One pulse of the switch in the periodic steady state: times in s, currents in A.</summary>
internal readonly record struct Pulse(
    ShortCircuitGovernor Governor, double OnTime, double Period, double Valley, double Peak)
{
    /// <summary>
    /// The pulse that repeats at a given on-time and period. Its currents are infinite where there is no resistance and the
    /// volt-seconds do not balance.
    /// </summary>
    public static Pulse Repeating(in CoilRamp rise, in CoilRamp fall, double onTime, double period)
    {
        var offTime = period - onTime;
        var fromRest = fall.After(rise.After(0, onTime), offTime);
        // The share that is lost over a period, exact also where it is tiny.
        var x = rise.Resistance * onTime / rise.Inductance + fall.Resistance * offTime / fall.Inductance;
        var lost = x * CoilRamp.Saturation(x);
        var valley = fromRest > 0 ? fromRest / lost : 0;
        return new(default, onTime, period, valley, rise.After(valley, onTime));
    }
}

/// <summary>How far a pulse passes the limit that starts where the fall from the limit has ended; rises with the on-time.</summary>
internal struct LimitOvershoot(in CoilRamp rise, in CoilRamp fall, double period, double limit) : IRootFunction
{
    private readonly CoilRamp rise = rise;
    private readonly CoilRamp fall = fall;

    public double At(double x, out double slope)
    {
        slope = double.NaN;
        return rise.After(Math.Max(0, fall.After(limit, period - x)), x) - limit;
    }
}
