using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>Plausible converters from a seed: continuous, boundary and discontinuous, both loads, with and without ESR and ESL.</summary>
internal struct CaseMaker(ulong seed)
{
    private ulong state = seed;

    /// <summary>
    /// A converter designed backwards from its output, so that it has an operating point. The output ripple of the capacitor
    /// alone is at most 2/<paramref name="filter"/> of the output in continuous conduction.
    /// </summary>
    public ConverterCase Case(double filter = 10)
    {
        var f = Log(2e4, 1e6);
        var vin = Log(6, 80);
        var vout = vin * Even(0.06, 0.85);
        var current = Log(0.02, 6);
        var sat = Chance(0.3) ? 0 : Even(0, 0.06) * vin;
        var ron = Chance(0.2) ? 0 : Log(1e-3, 0.02) * vout / current;
        var vf = Chance(0.1) ? 0 : Even(0.2, 1.0);
        var rd = Chance(0.2) ? 0 : Log(1e-3, 0.05) * vout / current;
        var dcr = Chance(0.2) ? 0 : Log(1e-3, 0.05) * vout / current;
        var duty = Math.Min(0.97, (vout + vf) / (vin - sat + vf) * Even(1, 1.05));
        // Half the coil ripple over the current: below 1 continuous, above it discontinuous.
        var ratio = Chance(0.15) ? Even(0.9, 1.1) : Log(0.05, 8);
        var l = vout * (1 - duty) / (2 * ratio * current * f);
        var esr = Chance(0.25) ? 0 : Log(1e-3, 0.1) * vout / current;
        var c = Log(filter, 5000) * ratio * current / (8 * f * vout);
        var esl = Chance(0.5) ? 0 : Log(1e-9, 4e-8);
        var resistive = Chance(0.5);
        return new(
            f, vin, duty, sat, ron, vf, rd, l, dcr, c, esr, esl,
            resistive ? OutputLoad.Resistance : OutputLoad.Current, resistive ? vout / current : current);
    }

    public bool Chance(double share) => Next() < share;

    public double Even(double low, double high) => low + (high - low) * Next();

    public double Log(double low, double high) => low * Math.Pow(high / low, Next());

    public int Pick(int count) => (int)(Next() * count);

    // SplitMix64: a counter through a mixing function, the same on every machine.
    private double Next()
    {
        unchecked
        {
            state += 0x9E3779B97F4A7C15;
            var z = state;
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
            return ((z ^ (z >> 31)) >> 11) * (1.0 / (1UL << 53));
        }
    }
}
