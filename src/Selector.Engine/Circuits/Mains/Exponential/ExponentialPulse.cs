namespace Selector.Engine.Circuits.Mains.Exponential;

/// <summary>One pulse on an even mesh from where the emf meets the bus to where the current has died away.</summary>
internal sealed class ExponentialPulse
{
    private const int StepsPerPeriod = 6000;
    private const int MostSteps = 3 * StepsPerPeriod;

    /// <summary>Share of the peak below which a falling current has ended.</summary>
    private const double Ended = 1e-9;

    private readonly double[] _current = new double[MostSteps + 1];
    private readonly double[] _bus = new double[MostSteps + 1];

    public int Count { get; private set; }

    public double Start { get; private set; }

    public double Step { get; private set; }

    public double End => Start + Count * Step;

    public double EndVoltage { get; private set; }

    public double EndTerminal { get; private set; }

    public ReadOnlySpan<double> Current => _current.AsSpan(0, Count + 1);

    public ReadOnlySpan<double> Bus => _bus.AsSpan(0, Count + 1);

    /// <summary>Runs a pulse. False when the bus collapses or the pulse does not end within three half-waves.</summary>
    public bool Run(in ExponentialPath path, double start, double u)
    {
        (Start, Count) = (start, 0);
        Step = 2 * Math.PI / path.Loop.Omega / StepsPerPeriod;
        var (t, inductor, j, peak) = (start, 0.0, 0.0, 0.0);
        (_current[0], _bus[0]) = (0, path.Terminal(u, 0));
        while (Count < MostSteps)
        {
            var (u1, l1, j1) = (u, inductor, j);
            var v = path.Stage(t + ExponentialPath.Gamma * Step, ExponentialPath.Gamma * Step, ref u1, ref l1, ref j1);
            var share = (1 - ExponentialPath.Gamma) / ExponentialPath.Gamma;
            var (u2, l2, j2) = (u + share * (u1 - u), inductor + share * (l1 - inductor), j1);
            v = double.IsNaN(v) ? v : path.Stage(t + Step, ExponentialPath.Gamma * Step, ref u2, ref l2, ref j2);
            if (!double.IsFinite(v + u2 + j2) || (path.Loop.Kind == LoadKind.Power && v <= path.Loop.Collapsed))
            {
                return false;
            }

            (t, u, inductor, j) = (t + Step, u2, l2, j2);
            Count++;
            (_current[Count], _bus[Count]) = (Math.Max(0, j), v);
            peak = Math.Max(peak, j);
            if (j <= Ended * peak && path.Emf(t) < v)
            {
                (EndVoltage, EndTerminal) = (u, v);
                return true;
            }
        }

        return false;
    }
}
