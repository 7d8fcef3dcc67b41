using Selector.Engine.Circuits.Mains;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

/// <summary>Plausible rectifiers from a seed: every arrangement and load, stiff to soft sources, with and without leakage and ESR.</summary>
internal struct RectifierMaker(ulong seed)
{
    private Dice _dice = new(seed);

    public RectifierCase Case()
    {
        var arrangement = (RectifierArrangement)_dice.Pick(3);
        var kind = (LoadKind)_dice.Pick(3);
        var rms = _dice.Log(5, 250);
        var f = _dice.Chance(0.5) ? 50 : 60;
        var threshold = _dice.Even(0, 1);
        var peak = Math.Sqrt(2) * rms - 2 * threshold;
        var current = _dice.Log(0.02, 5);
        var load = peak / current;
        var source = _dice.Log(0.002, 0.3) * load;
        var omega = 2 * Math.PI * f;
        return new RectifierCase(
            arrangement, f, rms, 0.8 * source, _dice.Chance(0.4) ? 0 : _dice.Log(1e-3, 0.12) * load / omega, threshold, 0.1 * source,
            _dice.Log(1, 200) / (omega * load), _dice.Chance(0.3) ? 0 : _dice.Log(1e-3, 0.05) * load, kind,
            kind switch { LoadKind.Current => current * 0.7, LoadKind.Resistance => load, _ => 0.45 * peak * current });
    }

    /// <summary>The case with one field at a value that nobody means.</summary>
    public RectifierCase Spoiled(RectifierCase c)
    {
        double[] values = [0, -1, 1e300, -1e300, 1e-300, double.NaN, double.PositiveInfinity, 1e9, 1e-9];
        var value = values[_dice.Pick(values.Length)];
        return _dice.Pick(9) switch
        {
            0 => c with { Frequency = value },
            1 => c with { SecondaryRms = value },
            2 => c with { WindingResistance = value },
            3 => c with { Leakage = value },
            4 => c with { DiodeThreshold = value },
            5 => c with { DiodeSlope = value },
            6 => c with { Capacitance = value },
            7 => c with { Esr = value },
            _ => c with { Load = value },
        };
    }
}
