using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>
/// The converter by small steps, independent of the product's closed form: Kirchhoff's laws for coil current, capacitor-branch
/// current and capacitor voltage, fourth-order Runge-Kutta, the diode's end located by bisection of a step, and the periodic
/// state by Newton's method on the period map with differences.
/// </summary>
internal sealed class BruteForceConverter(ConverterCase c, int steps)
{
    private double coil, branch, capacitor;
    private bool idle;

    public double OutputMean, OutputMaximum, OutputMinimum, CoilMean, CoilSquare, CoilPeak, SwitchCharge, SwitchSquare,
        CapacitorSquare, LoadEnergy, IdleTime;

    // The branch current is a state of its own only beside a resistive load.
    private bool BranchIsState => c.Esl > 0 && c.LoadKind == OutputLoad.Resistance;

    public double CoilAtStart { get; private set; }

    public double CapacitorAtStart { get; private set; }

    public double BranchAtStart { get; private set; }

    /// <summary>Iterates to the periodic state; false where it does not settle.</summary>
    public bool Settle(double output, double current)
    {
        double[] x = [current, output, 0];
        var n = BranchIsState ? 3 : 2;
        for (var round = 0; round < 30; round++)
        {
            var f = Map(x);
            var change = Enumerable.Range(0, n).Max(i => Math.Abs(f[i] - x[i]) / (i == 1 ? output : current));
            if (change < 1e-11)
            {
                (CoilAtStart, CapacitorAtStart, BranchAtStart) = (x[0], x[1], x[2]);
                return true;
            }

            var a = new double[n, n + 1];
            for (var k = 0; k < n; k++)
            {
                var h = 1e-5 * (k == 1 ? output : current);
                var y = (double[])x.Clone();
                y[k] += h;
                var g = Map(y);
                for (var i = 0; i < n; i++)
                {
                    a[i, k] = (i == k ? 1 : 0) - (g[i] - f[i]) / h;
                }
            }

            for (var i = 0; i < n; i++)
            {
                a[i, n] = f[i] - x[i];
            }

            var step = Solve(a, n);
            for (var i = 0; i < n; i++)
            {
                x[i] += step[i];
            }

            x[0] = Math.Max(x[0], 0);
        }

        return false;
    }

    private double[] Map(double[] x)
    {
        (coil, capacitor, branch, idle) = (x[0], x[1], x[2], false);
        (OutputMean, CoilMean, CoilSquare, CoilPeak, IdleTime) = (0, 0, 0, 0, 0);
        (SwitchCharge, SwitchSquare, CapacitorSquare, LoadEnergy) = (0, 0, 0, 0);
        (OutputMaximum, OutputMinimum) = (double.NegativeInfinity, double.PositiveInfinity);
        var period = 1 / c.Frequency;
        Run(c.InputVoltage - c.SwitchDrop, c.SwitchResistance, c.Duty * period, true);
        Run(-c.DiodeThreshold, c.DiodeSlope, (1 - c.Duty) * period, false);
        return [coil, capacitor, branch];
    }

    private void Run(double source, double resistance, double time, bool on)
    {
        var h = time / steps;
        for (var i = 0; i < steps; i++)
        {
            var (before, u, b) = (coil, capacitor, branch);
            Step(source, resistance, h, on);
            if (!on && !idle && coil < 0)
            {
                var (low, high) = (0.0, h);
                for (var k = 0; k < 50; k++)
                {
                    var middle = (low + high) / 2;
                    (coil, capacitor, branch) = (before, u, b);
                    Advance(source, resistance, middle);
                    (low, high) = coil > 0 ? (middle, high) : (low, middle);
                }

                Undo();
                (coil, capacitor, branch) = (before, u, b);
                Step(source, resistance, low, on);
                idle = true;
                coil = 0;
                Step(source, resistance, h - low, on);
            }
        }
    }

    private (double, double, double, double, double, double, double, double, double, double) saved;

    private void Undo() =>
        (OutputMean, CoilMean, CoilSquare, SwitchCharge, SwitchSquare, CapacitorSquare, LoadEnergy, IdleTime, OutputMaximum,
            OutputMinimum) = saved;

    // One step with Simpson's rule for the integrals, over its ends and its middle.
    private void Step(double source, double resistance, double h, bool on)
    {
        saved = (
            OutputMean, CoilMean, CoilSquare, SwitchCharge, SwitchSquare, CapacitorSquare, LoadEnergy, IdleTime, OutputMaximum,
            OutputMinimum);
        Weigh(source, resistance, h / 6, on);
        Advance(source, resistance, h / 2);
        Weigh(source, resistance, 4 * h / 6, on);
        Advance(source, resistance, h / 2);
        Weigh(source, resistance, h / 6, on);
        IdleTime += idle ? h : 0;
    }

    private void Weigh(double source, double resistance, double w, bool on)
    {
        var v = Terminal(source, resistance, coil, branch, capacitor);
        var ic = Branch(coil, branch, capacitor);
        OutputMean += w * v;
        CoilMean += w * coil;
        CoilSquare += w * coil * coil;
        CapacitorSquare += w * ic * ic;
        LoadEnergy += w * v * (c.LoadKind == OutputLoad.Current ? c.Load : v / c.Load);
        SwitchCharge += on ? w * coil : 0;
        SwitchSquare += on ? w * coil * coil : 0;
        CoilPeak = Math.Max(CoilPeak, coil);
        OutputMaximum = Math.Max(OutputMaximum, v);
        OutputMinimum = Math.Min(OutputMinimum, v);
    }

    private double Branch(double i, double b, double u) =>
        idle && BranchIsState ? b
        : c.LoadKind == OutputLoad.Current ? i - c.Load
        : BranchIsState ? b
        : (i * c.Load - u) / (c.Load + c.Esr);

    private double Terminal(double source, double resistance, double i, double b, double u)
    {
        if (c.LoadKind == OutputLoad.Resistance)
        {
            return c.Load * (i - Branch(i, b, u));
        }

        var rigid = u + c.Esr * (i - c.Load);
        // Both inductances carry the same slope, and the terminal is the tap between them.
        return idle ? rigid
            : rigid + c.Esl / (c.Esl + c.Inductance) * (source - (resistance + c.CoilResistance) * i - rigid);
    }

    private (double, double, double) Slope(double source, double resistance, double i, double b, double u)
    {
        var v = Terminal(source, resistance, i, b, u);
        var ic = Branch(i, b, u);
        var di = idle ? 0 : (source - (resistance + c.CoilResistance) * i - v) / c.Inductance;
        return (di, BranchIsState ? (v - c.Esr * ic - u) / c.Esl : 0, ic / c.Capacitance);
    }

    private void Advance(double source, double resistance, double h)
    {
        var (a1, b1, c1) = Slope(source, resistance, coil, branch, capacitor);
        var (a2, b2, c2) = Slope(source, resistance, coil + h / 2 * a1, branch + h / 2 * b1, capacitor + h / 2 * c1);
        var (a3, b3, c3) = Slope(source, resistance, coil + h / 2 * a2, branch + h / 2 * b2, capacitor + h / 2 * c2);
        var (a4, b4, c4) = Slope(source, resistance, coil + h * a3, branch + h * b3, capacitor + h * c3);
        coil += h / 6 * (a1 + 2 * a2 + 2 * a3 + a4);
        branch += h / 6 * (b1 + 2 * b2 + 2 * b3 + b4);
        capacitor += h / 6 * (c1 + 2 * c2 + 2 * c3 + c4);
    }

    private static double[] Solve(double[,] a, int n)
    {
        for (var k = 0; k < n; k++)
        {
            var p = Enumerable.Range(k, n - k).MaxBy(i => Math.Abs(a[i, k]));
            for (var j = 0; j <= n; j++)
            {
                (a[k, j], a[p, j]) = (a[p, j], a[k, j]);
            }

            for (var i = 0; i < n; i++)
            {
                var factor = i == k ? 0 : a[i, k] / a[k, k];
                for (var j = k; j <= n; j++)
                {
                    a[i, j] -= factor * a[k, j];
                }
            }
        }

        return [.. Enumerable.Range(0, n).Select(i => a[i, n] / a[i, i])];
    }
}
