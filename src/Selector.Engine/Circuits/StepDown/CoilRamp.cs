namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Current of a coil behind a resistance on a constant voltage: L di/dt = Source - Resistance i, SI units. Exact, also for no
/// resistance.
/// </summary>
internal readonly record struct CoilRamp(double Source, double Resistance, double Inductance)
{
    /// <summary>Current after <paramref name="time"/> from <paramref name="start"/>.</summary>
    public double After(double start, double time)
    {
        var x = Resistance * time / Inductance;
        return start * Math.Exp(-x) + Source * time / Inductance * Saturation(x);
    }

    /// <summary>The start from which <paramref name="end"/> is reached in <paramref name="time"/>.</summary>
    public double Before(double end, double time)
    {
        var x = Resistance * time / Inductance;
        return (end - Source * time / Inductance * Saturation(x)) * Math.Exp(x);
    }

    /// <summary>Time to fall from one current to a lower one; infinite where it never gets there. For a source at most 0.</summary>
    public double TimeToFall(double from, double to)
    {
        var pull = Resistance * to - Source;
        if (pull <= 0)
        {
            return from > to ? double.PositiveInfinity : 0;
        }

        var z = Resistance * (from - to) / pull;
        // ln(1 + z)/z, by its series where the logarithm would lose digits.
        var ratio = z < 1e-4 ? 1 - z * (0.5 - z / 3) : Math.Log(1 + z) / z;
        return Inductance * (from - to) / pull * ratio;
    }

    /// <summary>Integrals of current (A s) and of its square (A² s) over <paramref name="time"/>.</summary>
    public void Integrate(double start, double time, out double charge, out double square)
    {
        var x = Resistance * time / Inductance;
        (charge, square) = (0, 0);
        if (x > 0.1)
        {
            var final = Source / Resistance;
            var gap = start - final;
            var constant = Inductance / Resistance;
            var decay = gap * constant * (1 - Math.Exp(-x));
            charge = final * time + decay;
            square = final * final * time + 2 * final * decay + gap * gap * constant / 2 * (1 - Math.Exp(-2 * x));
            return;
        }

        for (var k = 0; k < GaussLegendre.Points; k++)
        {
            var i = After(start, time * GaussLegendre.Nodes[k]);
            charge += time * GaussLegendre.Weights[k] * i;
            square += time * GaussLegendre.Weights[k] * i * i;
        }
    }

    /// <summary>(1 - exp(-x))/x, by its series where the difference would lose digits.</summary>
    public static double Saturation(double x) =>
        x < 1e-2 ? 1 - x / 2 * (1 - x / 3 * (1 - x / 4 * (1 - x / 5 * (1 - x / 6)))) : (1 - Math.Exp(-x)) / x;
}
