namespace Selector.Engine.Circuits.CurrentLimit;

/// <summary>
/// n equal resistors in parallel that measure a current. The worst corner follows from the law of each figure, so the 2^n corners
/// need not be visited; conventions of the reference family F7.
/// </summary>
public static class SenseBank
{
    /// <summary>
    /// A fixed total current in amperes shared by <paramref name="count"/> resistors (1 to 10 000) of
    /// <paramref name="resistance"/> ohm (1e-9 to 1e12) within a relative <paramref name="tolerance"/> (0 to 0.99).
    /// BadInput outside these ranges or for a current beyond 1e9 A either way.
    /// </summary>
    public static SolveStatus AtCurrent(
        int count, double resistance, double tolerance, double current, out SenseBankStress stress)
    {
        stress = default;
        if (!IsInRange(count, resistance, tolerance) || !(Math.Abs(current) <= 1e9))
        {
            return SolveStatus.BadInput;
        }

        var i = Math.Abs(current);
        var low = resistance * (1 - tolerance);
        var high = resistance * (1 + tolerance);
        // Whatever the single resistor is, it carries most when all others are high.
        var others = count > 1 ? high / (count - 1) : double.PositiveInfinity;
        var worst = Hottest(low, high, others);
        var share = Share(worst, others);
        stress = Common(count, low, high);
        stress.OneNominalPower = i / count * (i / count) * resistance;
        stress.OneWorstPower = i * share * (i * share) * worst;
        stress.OneWorstPowerCurrent = i * share;
        stress.OneGreatestCurrent = i * Share(low, others);
        stress.TotalWorstPower = i * i * high / count;
        return SolveStatus.Solved;
    }

    /// <summary>The same bank at a fixed voltage in volts, at most 1e9 either way: only a resistor's own low value counts.</summary>
    public static SolveStatus AtVoltage(
        int count, double resistance, double tolerance, double voltage, out SenseBankStress stress)
    {
        stress = default;
        if (!IsInRange(count, resistance, tolerance) || !(Math.Abs(voltage) <= 1e9))
        {
            return SolveStatus.BadInput;
        }

        var v = Math.Abs(voltage);
        var low = resistance * (1 - tolerance);
        stress = Common(count, low, resistance * (1 + tolerance));
        stress.OneNominalPower = v * v / resistance;
        stress.OneWorstPower = v * v / low;
        stress.OneWorstPowerCurrent = v / low;
        stress.OneGreatestCurrent = v / low;
        stress.TotalWorstPower = count * stress.OneWorstPower;
        return SolveStatus.Solved;
    }

    /// <summary>
    /// Value of the single resistor at which it is hottest. Its power r/(1 + r/others)² rises up to r = others and falls beyond,
    /// so that with two resistors the high end is worst, with many the low end, and with three or more of wide tolerance the
    /// matched value in between.
    /// </summary>
    private static double Hottest(double low, double high, double others) => Math.Clamp(others, low, high);

    /// <summary>The part of the total current that goes through r beside the parallel value of the others.</summary>
    private static double Share(double r, double others) => 1 / (1 + r / others);

    private static SenseBankStress Common(int count, double low, double high) => new()
    {
        ParallelMinimum = low / count,
        ParallelMaximum = high / count,
    };

    private static bool IsInRange(int count, double resistance, double tolerance) =>
        count is >= 1 and <= 10_000 && resistance is >= 1e-9 and <= 1e12 && tolerance is >= 0 and <= 0.99;
}
