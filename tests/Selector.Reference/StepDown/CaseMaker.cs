using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>Plausible converters from a seed: continuous, boundary and discontinuous, both loads, with and without ESR and ESL.</summary>
internal struct CaseMaker(ulong seed)
{
    public Dice Dice = new(seed);

    /// <summary>
    /// A converter designed backwards from its output, so that it has an operating point. The output ripple of the capacitor
    /// alone is at most 2/<paramref name="filter"/> of the output in continuous conduction.
    /// </summary>
    public ConverterCase Case(double filter = 10)
    {
        var f = Dice.Log(2e4, 1e6);
        var vin = Dice.Log(6, 80);
        var vout = vin * Dice.Even(0.06, 0.85);
        var current = Dice.Log(0.02, 6);
        var sat = Dice.Chance(0.3) ? 0 : Dice.Even(0, 0.06) * vin;
        var ron = Dice.Chance(0.2) ? 0 : Dice.Log(1e-3, 0.02) * vout / current;
        var vf = Dice.Chance(0.1) ? 0 : Dice.Even(0.2, 1.0);
        var rd = Dice.Chance(0.2) ? 0 : Dice.Log(1e-3, 0.05) * vout / current;
        var dcr = Dice.Chance(0.2) ? 0 : Dice.Log(1e-3, 0.05) * vout / current;
        var duty = Math.Min(0.97, (vout + vf) / (vin - sat + vf) * Dice.Even(1, 1.05));
        // Half the coil ripple over the current: below 1 continuous, above it discontinuous.
        var ratio = Dice.Chance(0.15) ? Dice.Even(0.9, 1.1) : Dice.Log(0.05, 8);
        var l = vout * (1 - duty) / (2 * ratio * current * f);
        var esr = Dice.Chance(0.25) ? 0 : Dice.Log(1e-3, 0.1) * vout / current;
        var c = Dice.Log(filter, 5000) * ratio * current / (8 * f * vout);
        var esl = Dice.Chance(0.5) ? 0 : Dice.Log(1e-9, 4e-8);
        var resistive = Dice.Chance(0.5);
        return new(
            f, vin, duty, sat, ron, vf, rd, l, dcr, c, esr, esl,
            resistive ? OutputLoad.Resistance : OutputLoad.Current, resistive ? vout / current : current);
    }
}
