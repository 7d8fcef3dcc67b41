using Selector.Engine.Circuits.Inlet;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Circuits.StepDown;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Derating;

namespace Selector.Reference.Facts;

/// <summary>Handbook formulas and worked examples of fuses, life, heat and transformers.</summary>
public class HandbookTests
{
    // Practice case 10: MIL-STD-975M derates a fuse to half at 25 °C and by half a per cent more for each kelvin above (second-hand): 0.65 A.
    [Fact]
    public void A_two_ampere_fuse_at_60_degrees() =>
        Assert.Equal(0.65, new ClauseOperator.FallingFactor(0.5, 25, 125).Allowed(2, 60), 9);

    // Practice case 10b: half sine of 30 A and 10 ms is 4.5 A²s; a link of 10 A²s keeps 6.25 % at 100 pulses and lacks 55 % at 10 000,
    // by a maker's table of pulse withstand (second-hand).
    [Theory]
    [InlineData(100, 0.0625)]
    [InlineData(10_000, -0.5517)]
    public void Pulses_tire_a_fuse(double pulses, double margin)
    {
        var integral = 30 * 30 * 0.01 / 2;

        Assert.Equal(4.5, integral);
        Assert.Equal(margin, 1 - integral / PulseWithstand.Share(pulses) / 10, 4);
    }

    [Fact]
    public void Pulse_withstand_is_never_extrapolated_upwards()
    {
        Assert.Equal(0.48, PulseWithstand.Share(1));
        Assert.Equal(0.22, PulseWithstand.Share(1e6));
        Assert.InRange(PulseWithstand.Share(3000), 0.29, 0.38);
    }

    // Ten-degree rule (application notes of two makers, second-hand): 2000 h at 105 °C is 16 000 h at 75 °C and rated ripple; 5000 h at
    // 105 °C is 80 000 h at 65 °C. Practice case 12: 2000 h, 5 K, 65 °C: 32 000 h, and 14 720 h at 1.8 times the ripple.
    [Theory]
    [InlineData(2000, 105, 75, 1, 16_000)]
    [InlineData(5000, 105, 65, 1, 80_000)]
    [InlineData(5000, 105, 85, 1, 20_000)]
    [InlineData(1000, 85, 55, 1, 8_000)]
    [InlineData(2000, 105, 45, 1, 128_000)]
    [InlineData(2000, 105, 65, 1, 32_000)]
    [InlineData(2000, 105, 65, 1.8, 14_720)]
    public void Life_doubles_for_every_ten_kelvins(double rated, double upper, double air, double ripple, double hours) =>
        Assert.Equal(hours, ElectrolyticLife.Hours(rated, upper, 5, air, ripple), 10.0);

    [Fact]
    public void No_life_beyond_fifteen_years_is_claimed() => Assert.Equal(131_400, ElectrolyticLife.Hours(10_000, 125, 5, 25, 0.2));

    // Simplified natural convection of an upright plate and grey radiation, computed by hand from the handbook's coefficients (second-hand):
    // 100 x 100 mm at 65 °C in 25 °C, emissivity 0.9, both sides: 3.86 K/W.
    [Fact]
    public void A_plate_of_a_hundred_millimetres()
    {
        var plate = new Enclosure(0.1, 0.1, 1e-9, 0.9, 1);

        Assert.Equal(3.86, 40 / plate.Outside(40, 25), 0.01);
    }

    [Fact]
    public void The_air_in_a_case_stands_above_its_walls_and_the_walls_above_the_room()
    {
        var box = new Enclosure(0.25, 0.1, 0.2, 0.9, 1);
        var rise = box.Rise(20, 40);
        var film = Math.Pow(20 / box.Convection(1), 0.8);

        Assert.Equal(20, box.Outside(rise - film, 40), 1e-6);
        Assert.True(rise > box.Rise(10, 40) && rise < new Enclosure(0.25, 0.1, 0.2, 0.1, 1).Rise(20, 40));
        Assert.True(new Enclosure(0.25, 0.1, 0.2, 0.9, Altitude.Pressure(3000)).Rise(20, 40) > rise);
    }

    // ISO 2533, from memory: 540.2 hPa at 5000 m over 1013.25 hPa.
    [Fact]
    public void Thin_air() => Assert.Equal(0.533, Altitude.Pressure(5000), 0.001);

    // A sink carries away with the 1.25th power of its rise: at the stated rise it is as stated.
    [Fact]
    public void A_sink_is_as_stated_at_the_stated_rise()
    {
        Assert.Equal(50, SinkLaw.Rise(10, 5, 50, 1), 9);
        Assert.True(SinkLaw.Rise(2, 5, 50, 1) > 2 * 5);
    }

    // The identity R_s = regulation x V / I, and a short-circuit voltage that is all resistance leaves no leakage.
    [Fact]
    public void Regulation_gives_the_resistance()
    {
        var t = new Transformer(230, 1, 0, 0, 20, 0, 12, 60, 0, 0.15, 0, 0, 50);

        Assert.Equal(13.8, t.Voltage, 9);
        Assert.Equal(0.15 * 12 / 5, t.SeriesResistance, 9);
        Assert.Equal(0, (t with { ShortCircuitVoltage = 0.1 }).HalfLeakage);

        // |Z|² = R² + X²: 20 % of 13.8 V at 5 A is 0.552 ohm.
        var x = Math.Sqrt(0.552 * 0.552 - 0.36 * 0.36);
        Assert.Equal(x / (2 * Math.PI * 50), (t with { ShortCircuitVoltage = 0.2 }).HalfLeakage, 1e-9);
    }

    // By the law of turns: one of two equal halves, primary and secondary wound for equal loss, sees three eighths of the whole resistance.
    [Fact]
    public void One_half_of_a_centre_tap_sees_less_than_half_the_resistance()
    {
        var t = new Transformer(230, 2, 0, 0, 20, 0, 12, 48, 0, 0.2, 0, 0, 50);

        Assert.Equal(0.2 * 24 / 2, t.SeriesResistance, 9);
        Assert.Equal(0.375 * t.SeriesResistance, t.HalfResistance, 9);
    }

    // Common practice, no source: with the output shorted the catch diode carries nearly the whole limit current.
    [Fact]
    public void In_a_short_the_catch_diode_carries_nearly_all()
    {
        var c = new ShortCircuitCase(150e3, 24, 0, 0.1, 0.4, 0.03, 47e-6, 0.05, 0.05, 4, 150e-9, false);

        Assert.Equal(Engine.Circuits.SolveStatus.Solved, ShortCircuit.Solve(c, Engine.Circuits.Budget.Standard, out var s));

        Assert.InRange(s.DiodeMean / s.CoilMean, 0.9, 1);
    }

    // Common practice, no source: a bridge drops two diodes, a centre tap one.
    [Fact]
    public void A_bridge_drops_two_diodes()
    {
        var bridge = new RectifierCase(RectifierArrangement.Bridge, 50, 20, 1e-3, 0, 0.8, 1e-4, 0.1, 0, LoadKind.Current, 1e-3);
        RectifierSolver.Solve(bridge, Engine.Circuits.Budget.Standard, out var two);
        RectifierSolver.Solve(bridge with { Arrangement = RectifierArrangement.CentreTap }, Engine.Circuits.Budget.Standard, out var one);

        Assert.Equal(20 * Math.Sqrt(2) - 1.6, two.BusMax, 0.01);
        Assert.Equal(20 * Math.Sqrt(2) - 0.8, one.BusMax, 0.01);
    }
}
