using System.Diagnostics;
using System.Globalization;
using System.Text.RegularExpressions;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Mains.SwitchOn;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

/// <summary>Invented rectifiers switched on with an empty reservoir, simulated afresh.</summary>
public class NgspiceSwitchOnTests
{
    public static TheoryData<string, RectifierCase, double> Cases => new()
    {
        { "bridge, leakage, 40 degrees", new(RectifierArrangement.Bridge, 50, 15, 0.45, 0.6e-3, 0.75, 0.04, 3300e-6, 0.05, LoadKind.Resistance, 30), 40 },
        { "bridge, no leakage, 90 degrees", new(RectifierArrangement.Bridge, 60, 24, 0.8, 0, 0.7, 0.05, 1500e-6, 0.08, LoadKind.Resistance, 60), 90 },
        { "half wave, leakage, 10 degrees", new(RectifierArrangement.HalfWave, 50, 12, 0.5, 1e-3, 0.7, 0.05, 2200e-6, 0.05, LoadKind.Resistance, 50), 10 },
    };

    [NgspiceTheory]
    [MemberData(nameof(Cases))]
    public void The_simulation_agrees(string what, RectifierCase c, double degrees)
    {
        Assert.Equal(SolveStatus.Solved, SwitchOnSolver.Solve(new SwitchOnCase(c, degrees * Math.PI / 180, 0), [], Budget.Standard, out var s));
        var measured = Measure(Netlist(c, degrees));

        Near("ipeak", s.GreatestPeak, 2e-3);
        Near("i2t", s.FirstHalfIntegral, 4e-3);

        void Near(string name, double value, double tolerance) =>
            Assert.True(Math.Abs(value - measured[name]) < tolerance * measured[name], $"{what}, {name}: {value:R} against {measured[name]:R}");
    }

    private static Dictionary<string, double> Measure(string netlist)
    {
        var file = Path.GetTempFileName();
        try
        {
            File.WriteAllText(file, netlist);
            using var process = Process.Start(new ProcessStartInfo("ngspice", ["-b", file]) { RedirectStandardOutput = true, RedirectStandardError = true })!;
            var errors = process.StandardError.ReadToEndAsync();
            var output = process.StandardOutput.ReadToEnd();
            Assert.True(process.WaitForExit(60_000), "ngspice did not end");
            Assert.NotNull(errors.Result);
            return Regex.Matches(output, @"^(\w+)\s+=\s+([-+.\de]+)", RegexOptions.Multiline)
                .ToDictionary(x => x.Groups[1].Value, x => double.Parse(x.Groups[2].Value, CultureInfo.InvariantCulture));
        }
        finally
        {
            File.Delete(file);
        }
    }

    /// <summary>The conducting pair of a bridge and its other pair as one behavioural diode each; the winding's current is that of the sum.</summary>
    private static string Netlist(RectifierCase c, double degrees)
    {
        var diodes = c.Arrangement == RectifierArrangement.Bridge
            ? Diode(c, "p", "out") + Diode(c, "b", "out") + Diode(c, "0", "p") + Diode(c, "0", "b")
            : Diode(c, "p", "out");
        var low = c.Arrangement == RectifierArrangement.Bridge ? "b" : "0";
        return $"""
            switch-on
            .options method=gear maxord=2 reltol=1e-6 abstol=1e-9 vntol=1e-7
            Va a1 {low} SIN(0 {N(Math.Sqrt(2) * c.SecondaryRms)} {N(c.Frequency)} 0 0 {N(degrees)})
            Vsense a1 a2 0
            Ra a2 {(c.Leakage > 0 ? "a3" : "p")} {N(c.WindingResistance)}
            {(c.Leakage > 0 ? $"La a3 p {N(c.Leakage)} IC=0" : "Rfloat p 0 1e7")}
            {diodes}
            Resr out y {N(c.Esr)}
            Cres y 0 {N(c.Capacitance)} IC=0
            Rload out 0 {N(c.Load)}
            Bsq sq 0 V = I(Vsense)*I(Vsense)
            Babs ab 0 V = abs(I(Vsense))
            .tran {N(1 / c.Frequency / 20000)} {N(4 / c.Frequency)} 0 {N(1 / c.Frequency / 20000)} uic
            .meas tran ipeak MAX v(ab) from=0 to={N(4 / c.Frequency)}
            .meas tran i2t INTEG v(sq) from=0 to={N(0.5 / c.Frequency)}
            .end

            """;
    }

    private static string Diode(RectifierCase c, string from, string to) =>
        $"Bd{from}{to} {from} {to} I = V({from},{to}) > {N(c.DiodeThreshold)} ? (V({from},{to}) - {N(c.DiodeThreshold)})/{N(c.DiodeSlope)} : 1e-9*V({from},{to})\n";

    private static string N(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
