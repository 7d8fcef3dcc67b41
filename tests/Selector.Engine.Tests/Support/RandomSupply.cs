using System.Globalization;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Tests.Support;

/// <summary>Supplies of any kind that the fields allow, with parts that vary around plausible ones.</summary>
internal static class RandomSupply
{
    public static Requirement Requirement(CounterRandom random)
    {
        var mains = random.Next() < 0.5;
        var output = random.Between(2.5, 9);
        var full = random.Between(0.2, 2);
        var r = Engine.Supplies.Requirement.Empty
            .With(CommonFields.Source, mains ? "mains" : "dc")
            .With(CommonFields.OutputVoltage, Text(output))
            .With(CommonFields.OutputRipple, "0.1")
            .With(CommonFields.LoadFull, Text(full))
            .With(CommonFields.LoadLeast, Text(random.Pick(0, 0.1, 0.4) * full))
            .With(CommonFields.AmbientLow, Text(random.Pick(-20, 0, 10)))
            .With(CommonFields.AmbientHigh, Text(random.Pick(35, 45, 55)))
            .With("short.held", random.Pick("held", "none"))
            .With("sense", random.Pick("none", "bank"))
            .With("sense.resistance", "0.1");
        return mains
            ? r.With("front-end", random.Pick("bridge", "bridge-diodes", "half-wave"))
                .With("mains.low", random.Pick("6 %", "10 %")).With("mains.high", "10 %")
            : r.With("dc.low", Text(random.Between(1.3, 2) * output + 3)).With("dc.nominal", "24").With("dc.high", Text(random.Between(24, 36)))
                .With("dc.resistance", Text(random.Between(0.005, 0.3)));
    }

    /// <summary>Varies every rating that the circuit depends on.</summary>
    public static Design Parts(Design design, CounterRandom random)
    {
        void Vary(string position, params string[] keys)
        {
            foreach (var key in keys)
            {
                var fitting = design.Fittings[position];
                design = design.Fit(position, fitting with { Part = fitting.Part.With(key, fitting.Part[key] * random.Between(0.6, 1.7)) });
            }
        }

        Vary("U1", RegulatorFamily.Frequency, RegulatorFamily.Resistance, RegulatorFamily.Transition);
        Vary("D5", RectifierRatings.Threshold, RectifierRatings.Slope);
        Vary("L1", InductorFamily.Inductance, InductorFamily.Resistance);
        Vary("C2", CapacitorFamily.Capacitance, CapacitorFamily.EsrHigh);
        Vary("C1", CapacitorFamily.Capacitance, CapacitorFamily.EsrLow);
        Vary("T1", TransformerFamily.Resistance, TransformerFamily.Leakage);
        return design;
    }

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
