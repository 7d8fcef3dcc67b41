namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// The converter into a short: with no output voltage against it the coil current falls only by the diode's drop and the
/// resistances, so that the on-time which balances it may be shorter than the regulator can make. Exact exponentials of the
/// coil with its series resistance.
/// </summary>
public static class ShortCircuit
{
    /// <summary>
    /// Solves for the steady state. BadInput: a field outside its range. NoOperatingPoint: the switch drop takes the whole
    /// input voltage, or nothing bounds the current (no resistance at all and a least on-time that exceeds the balance).
    /// With pulse skipping the pulses are spaced so that each least pulse ends at the limit; where even a single one from rest
    /// passes the limit, the least on-time governs.
    /// </summary>
    public static SolveStatus Solve(in ShortCircuitCase c, in Budget budget, out ShortCircuitSolution solution)
    {
        solution = default;
        if (!c.IsInRange)
        {
            return SolveStatus.BadInput;
        }

        if (budget.Cancel.IsCancellationRequested)
        {
            return SolveStatus.Cancelled;
        }

        if (c.InputVoltage <= c.SwitchDrop)
        {
            return SolveStatus.NoOperatingPoint;
        }

        var shared = c.CoilResistance + c.LoopResistance;
        var rise = new CoilRamp(c.InputVoltage - c.SwitchDrop, c.SwitchResistance + shared, c.Inductance);
        var fall = new CoilRamp(-c.DiodeThreshold, c.DiodeSlope + shared, c.Inductance);
        var status = FindPulse(c, rise, fall, budget, out var pulse);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        var s = FiguresOf(c, rise, fall, pulse);
        if (!s.IsFinite)
        {
            return SolveStatus.NoOperatingPoint;
        }

        solution = s;
        return SolveStatus.Solved;
    }

    private static SolveStatus FindPulse(
        in ShortCircuitCase c, in CoilRamp rise, in CoilRamp fall, in Budget budget, out Pulse pulse)
    {
        var period = 1 / c.Frequency;
        var limit = new LimitOvershoot(rise, fall, period, c.CurrentLimit);
        var longest = c.MaxDuty * period;
        pulse = default;
        if (limit.At(longest, out _) <= 0)
        {
            pulse = Pulse.Repeating(rise, fall, longest, period) with { Governor = ShortCircuitGovernor.LoopResistance };
            return SolveStatus.Solved;
        }

        if (limit.At(c.LeastOnTime, out _) <= 0)
        {
            var status = BracketedRoot.Find(
                ref limit, c.LeastOnTime, longest, -1, double.NaN, 1e-14 * period, 1e-13 * c.CurrentLimit, budget, out var on);
            var valley = Math.Max(0, fall.After(c.CurrentLimit, period - on));
            pulse = new(ShortCircuitGovernor.CurrentLimit, on, period, valley, c.CurrentLimit);
            return status;
        }

        var start = rise.Before(c.CurrentLimit, c.LeastOnTime);
        if (c.SkipsPulses && start >= 0)
        {
            var stretched = c.LeastOnTime + fall.TimeToFall(c.CurrentLimit, start);
            pulse = new(ShortCircuitGovernor.PulseSkipping, c.LeastOnTime, stretched, start, c.CurrentLimit);
            return double.IsFinite(stretched) ? SolveStatus.Solved : SolveStatus.NoOperatingPoint;
        }

        // A skipping regulator still waits for the current to come down before the next pulse.
        var wait = c.SkipsPulses ? c.LeastOnTime + fall.TimeToFall(rise.After(0, c.LeastOnTime), 0) : period;
        pulse = Pulse.Repeating(rise, fall, c.LeastOnTime, double.IsFinite(wait) ? Math.Max(wait, period) : period);
        pulse = pulse with { Governor = ShortCircuitGovernor.LeastOnTime };
        return SolveStatus.Solved;
    }

    private static ShortCircuitSolution FiguresOf(
        in ShortCircuitCase c, in CoilRamp rise, in CoilRamp fall, in Pulse pulse)
    {
        var off = pulse.Period - pulse.OnTime;
        if (fall.After(pulse.Peak, off) < 0)
        {
            off = fall.TimeToFall(pulse.Peak, 0);
        }

        rise.Integrate(pulse.Valley, pulse.OnTime, out var switchCharge, out var switchSquare);
        fall.Integrate(pulse.Peak, off, out var diodeCharge, out var diodeSquare);
        var rate = 1 / pulse.Period;
        var square = rate * (switchSquare + diodeSquare);
        return new()
        {
            Governor = pulse.Governor,
            Duty = pulse.OnTime * rate,
            PulseRate = rate,
            CoilPeak = pulse.Peak,
            CoilValley = pulse.Valley,
            CoilMean = rate * (switchCharge + diodeCharge),
            CoilRms = Math.Sqrt(square),
            DiodeMean = rate * diodeCharge,
            DiodeRms = Math.Sqrt(rate * diodeSquare),
            DiodePeak = off > 0 ? pulse.Peak : 0,
            SwitchMean = rate * switchCharge,
            SwitchRms = Math.Sqrt(rate * switchSquare),
            SwitchPeak = pulse.Peak,
            InputMean = rate * switchCharge,
            SwitchLoss = rate * (c.SwitchDrop * switchCharge + c.SwitchResistance * switchSquare),
            DiodeLoss = rate * (c.DiodeThreshold * diodeCharge + c.DiodeSlope * diodeSquare),
            CoilLoss = c.CoilResistance * square,
            LoopLoss = c.LoopResistance * square,
        };
    }
}
