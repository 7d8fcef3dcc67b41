using System.Globalization;
using Selector.Application.Tests.Support;
using Selector.Engine.Parts;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Application.Tests.Examples;

/// <summary>
/// The list of positions and stresses that the design promises for the power path: each is in the ledger of a supply, finite, with its
/// corner and its equation, and a tenth more of the input named beside it moves it.
/// </summary>
public class StressListTests
{
    private const string Mains = "bench-9v";
    private const string Linear = "instrument-12v";
    private const string Direct = "fixture-5v";

    /// <summary>Row, supply, changed requirement ("field=text;..."), and what is raised by a tenth: "T1.column", or a field.</summary>
    public static TheoryData<string, string, string, string> Stresses => new()
    {
        // S1, J1 mains switch and inlet; F1 with its holder.
        { "S1.current", Mains, "", "load.full" },
        { "S1.inrush-current", Mains, "", "mains.voltage" },
        { "J1.current", Mains, "", "load.full" },
        { "F1.current", Mains, "", "T1.no_load_voltage" },
        { "F1.melting-integral", Mains, "", "C1.capacitance" },
        { "F1.core-inrush", Mains, "", "T1.primary_resistance" },
        { "F1.fault-current", Mains, "", "T1.resistance" },
        { "F1.breaking-current", Mains, "", "mains.impedance" },
        { "F1.voltage", Mains, "", "mains.voltage" },
        { "T1.fuse", Mains, "", "F1.current" },
        { "XF1.power", Mains, "", "F1.power_loss" },
        { "F1.voltage", Direct, "", "dc.high" },
        { "F1.breaking-current", Direct, "", "dc.resistance" },
        { "F1.melting-integral", Direct, "", "C1.capacitance" },

        // F2 in the secondary or on the bus.
        { "F2.current", Mains, "fuse.second=bus", "load.full" },
        { "F2.voltage", Mains, "fuse.second=bus", "T1.no_load_voltage" },
        { "F2.breaking-current", Mains, "fuse.second=bus", "C1.esr_low" },
        { "F2.fault-current", Mains, "fuse.second=secondary", "T1.resistance" },

        // RT1 NTC: steady heat, joules into the reservoir, hot restart; RV1 varistor.
        { "RT1.steady-current", Mains, "inlet.limiter=ntc", "load.full" },
        { "RT1.energy", Mains, "inlet.limiter=ntc", "C1.capacitance" },
        { "S1.inrush-current", Mains, "inlet.limiter=ntc", "mains.voltage" },
        { "RV1.voltage", Mains, "inlet.varistor=yes", "mains.voltage" },

        // T1.
        { "T1.secondary-current", Mains, "", "load.full" },
        { "T1.winding-temperature", Mains, "", "load.full" },
        { "T1.volt-seconds", Mains, "", "mains.voltage" },
        { "T1.direct-current", Mains, "front-end=half-wave", "load.full" },

        // Rectifier.
        { "BR1.reverse-voltage", Mains, "", "T1.no_load_voltage" },
        { "BR1.average-current", Mains, "", "load.full" },
        { "BR1.repetitive-peak", Mains, "", "T1.resistance" },
        { "BR1.surge-current", Mains, "", "T1.resistance" },
        { "BR1.surge-integral", Mains, "", "C1.capacitance" },
        { "BR1.junction-temperature", Mains, "", "BR1.junction_to_air" },

        // C1, C3, R1.
        { "C1.voltage", Mains, "", "T1.no_load_voltage" },
        { "C1.ripple-current", Mains, "", "load.full" },
        { "C1.life", Mains, "life.ambient=44;C1.life=900;C1.temperature_max=85", "C1.life" },
        { "C1.hold-up", Mains, "hold-up=half", "C1.capacitance" },
        { "C1.temperature", Mains, "", "ambient.high" },
        { "U1.input-least", Mains, "", "C1.capacitance" },
        { "C3.ripple-current", Mains, "", "load.full" },
        { "C3.voltage", Mains, "", "T1.no_load_voltage" },
        { "R1.power", Mains, "", "R1.resistance" },
        { "R1.voltage", Mains, "", "T1.no_load_voltage" },
        { "R1.discharge-time", Mains, "", "C1.capacitance" },

        // U1 step-down.
        { "U1.input-voltage", Mains, "", "T1.no_load_voltage" },
        { "U1.duty", Mains, "", "output.voltage" },
        { "U1.on-time", Mains, "", "output.voltage" },
        { "U1.start-voltage", Mains, "", "T1.no_load_voltage" },
        { "U1.switch-current", Mains, "", "L1.inductance" },
        { "L1.saturation-current-short", Mains, "", "U1.limit_max" },
        { "U1.load-least", Mains, "load.least=10 mA", "load.least" },
        { "U1.junction-temperature", Mains, "", "U1.transition_time" },
        { "U1.output-high", Mains, "", "output.voltage" },
        { "U1.thermal-gain", Mains, "", "U1.junction_to_air" },

        // U1 series.
        { "U1.input-voltage", Linear, "", "T1.no_load_voltage" },
        { "U1.differential-voltage", Linear, "", "T1.no_load_voltage" },
        { "U1.drop-out", Linear, "", "U1.dropout_voltage" },
        { "U1.junction-temperature", Linear, "", "load.full" },
        { "U1.load-least", Linear, "", "R10.resistance" },
        { "U1.start-up", Linear, "", "load.full" },
        { "U1.output-ripple", Linear, "", "U1.ripple_rejection" },

        // L1, D5, C2.
        { "L1.saturation-current", Mains, "", "L1.inductance" },
        { "L1.rms-current", Mains, "", "U1.limit_max" },
        { "L1.temperature", Mains, "", "L1.core_loss" },
        { "D5.reverse-voltage", Mains, "", "T1.no_load_voltage" },
        { "D5.average-current", Mains, "", "U1.limit_max" },
        { "D5.repetitive-peak", Mains, "", "U1.limit_max" },
        { "D5.junction-temperature", Mains, "", "D5.junction_to_air" },
        { "D5.thermal-gain", Mains, "", "D5.reverse_current_hot" },
        { "C2.voltage", Mains, "", "output.voltage" },
        { "C2.ripple-current", Mains, "", "L1.inductance" },
        { "C2.output-ripple", Mains, "", "C2.esr_high" },
        { "C2.life", Mains, "life.ambient=44;C2.life=300;C2.temperature_max=85", "C2.life" },
        { "U1.window-inductance-least", Mains, "", "L1.inductance" },
        { "U1.window-capacitance", Mains, "", "C2.capacitance" },
        { "U1.window-esr", Mains, "", "C2.esr_high" },

        // Sense bank.
        { "R4.power", Mains, "", "U1.limit_max" },
        { "R4.pulse-energy", Mains, "", "C2.capacitance" },
        { "R4.resistance-error", Mains, "", "R4.tolerance" },

        // D7, D8, HS1, J2.
        { "D7.reverse-voltage", Direct, "", "dc.high" },
        { "D7.surge-current", Direct, "", "dc.resistance" },
        { "D8.reverse-voltage", Linear, "", "T1.no_load_voltage" },
        { "D8.surge-current", Linear, "", "C2.esr_high" },
        { "HS1.surface-temperature", Linear, "", "HS1.cooling" },
        { "J2.current", Mains, "", "U1.limit_max" },
    };

    [Theory]
    [MemberData(nameof(Stresses))]
    public void A_tenth_more_of_its_input_moves_it(string id, string supply, string changes, string input)
    {
        var design = changes.Split(';', StringSplitOptions.RemoveEmptyEntries).Select(c => c.Split('=')).Aggregate(ExampleDesigns.Of(supply), (d, c) => Set(d, c[0], c[1]));
        var before = Row(design, id);
        var after = Row(Raise(design, input), id);

        Assert.NotEmpty(before.Spec!.Equation);
        Assert.True(double.IsFinite(before.Stress!.Value) && double.IsFinite(after.Stress!.Value));
        Assert.NotEmpty(before.At);
        Assert.True(Math.Abs(after.Stress!.Value - before.Stress.Value) > 1e-4 * Math.Abs(before.Stress.Value), $"{id}: {before.Stress} and still {after.Stress}");
    }

    private static LedgerRow Row(Design design, string id)
    {
        var ledger = ExampleDesigns.Assess(design);
        Assert.True(ledger.Fault is null, ledger.Fault);
        return ledger.Rows.Single(r => r.Id == id);
    }

    private static Design Set(Design design, string what, string text)
    {
        if (what.Split('.') is [var position, var key] && design.Fittings.TryGetValue(position, out var fitting))
        {
            return design.Fit(position, fitting with { Part = With(fitting.Part, key, double.Parse(text, CultureInfo.InvariantCulture)) });
        }

        return design with { Requirement = design.Requirement.With(what, text) };
    }

    private static Design Raise(Design design, string input)
    {
        if (input.Split('.') is [var position, var key] && design.Fittings.TryGetValue(position, out var fitting))
        {
            Assert.True(fitting.Part.Has(key), $"{fitting.Part.FullName} does not give {key}");
            return design.Fit(position, fitting with { Part = With(fitting.Part, key, 1.1 * fitting.Part[key]) });
        }

        var value = RequirementReader.Read(Engine.Standard.Registry, design.Requirement).Find(input)!;
        Assert.Null(value.Fault);
        return design with { Requirement = design.Requirement.With(input, QuantityWriter.Write(1.1 * value.Value, value.Field.Unit, 6)) };
    }

    private static Part With(Part part, string key, double value) => part with { Ratings = part.Ratings.SetItem(part.Family.Ordinal(key), value) };
}
