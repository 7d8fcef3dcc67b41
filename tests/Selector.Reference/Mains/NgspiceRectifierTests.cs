using System.Diagnostics;
using System.Globalization;
using System.Text.RegularExpressions;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

/// <summary>Invented rectifiers, simulated afresh with all their diodes, from a discharged start until they repeat.</summary>
public class NgspiceRectifierTests
{
    private const int Periods = 60;

    public static TheoryData<string, RectifierCase> Cases => new()
    {
        { "bridge, power, leakage", new(RectifierArrangement.Bridge, 50, 13.4, 0.29, 0.23e-3, 0.78, 0.03, 4700e-6, 0.045, LoadKind.Power, 15) },
        { "bridge, resistance", new(RectifierArrangement.Bridge, 60, 24, 0.9, 0, 0.7, 0.05, 1000e-6, 0.12, LoadKind.Resistance, 40) },
        { "centre tap, current, leakage", new(RectifierArrangement.CentreTap, 50, 9, 0.4, 0.4e-3, 0.6, 0.04, 3300e-6, 0.05, LoadKind.Current, 1.1) },
        { "half wave, current", new(RectifierArrangement.HalfWave, 50, 15, 0.8, 0.2e-3, 0.75, 0.06, 2200e-6, 0.08, LoadKind.Current, 0.4) },
    };

    [NgspiceTheory]
    [MemberData(nameof(Cases))]
    public void The_simulation_agrees(string what, RectifierCase c)
    {
        Assert.Equal(SolveStatus.Solved, RectifierSolver.Solve(c, Budget.Standard, out var s));
        var m = Measure(c);
        Near("vmean", s.BusMean);
        Near("vmax", s.BusMax);
        Near("vmin", s.BusMin);
        Near("irms", s.SecondaryRms);
        Near("icap", s.CapacitorRms);

        void Near(string name, double value) =>
            Assert.True(Math.Abs(value - m[name]) < 1e-3 * m[name], $"{what}, {name}: {value:R} against {m[name]:R}");
    }

    private static Dictionary<string, double> Measure(RectifierCase c)
    {
        var file = Path.GetTempFileName();
        try
        {
            File.WriteAllText(file, Netlist(c));
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

    private static string Netlist(RectifierCase c)
    {
        var (end, start) = (Periods / c.Frequency, (Periods - 2) / c.Frequency);
        var window = string.Create(CultureInfo.InvariantCulture, $"from={start:R} to={end:R}");
        var branches = c.Arrangement switch
        {
            RectifierArrangement.Bridge => Winding(c, "a", "p", "b", 1) + Diode(c, "p", "out") + Diode(c, "b", "out") + Diode(c, "0", "p") + Diode(c, "0", "b"),
            RectifierArrangement.CentreTap => Winding(c, "a", "p", "0", 1) + Winding(c, "n", "q", "0", -1) + Diode(c, "p", "out") + Diode(c, "q", "out"),
            _ => Winding(c, "a", "p", "0", 1) + Diode(c, "p", "out"),
        };
        var load = c.LoadKind switch
        {
            LoadKind.Current => $"Bload out 0 I = V(out) > 1 ? {N(c.Load)} : {N(c.Load)}*V(out)",
            LoadKind.Resistance => $"Rload out 0 {N(c.Load)}",
            _ => $"Bload out 0 I = V(out) > {N(0.4 * c.SecondaryRms)} ? {N(c.Load)}/V(out) : {N(c.Load / (0.16 * c.SecondaryRms * c.SecondaryRms))}*V(out)",
        };
        return $"""
            rectifier
            .options method=gear maxord=2 reltol=1e-5 abstol=1e-9 vntol=1e-6
            {branches}
            Vcap out x 0
            Resr x y {N(Math.Max(c.Esr, 1e-6))}
            Cres y 0 {N(c.Capacitance)} IC=0
            {load}
            .tran {N(1 / c.Frequency / 4000)} {N(end)} {N(start)} {N(1 / c.Frequency / 4000)} uic
            .meas tran vmean AVG v(out) {window}
            .meas tran vmax MAX v(out) {window}
            .meas tran vmin MIN v(out) {window}
            .meas tran irms RMS i(Vsa) {window}
            .meas tran icap RMS i(Vcap) {window}
            .end

            """;
    }

    private static string Winding(RectifierCase c, string name, string to, string from, int sign) => $"""
        V{name} {name}1 {from} SIN(0 {N(sign * Math.Sqrt(2) * c.SecondaryRms)} {N(c.Frequency)})
        Vs{name} {name}1 {name}2 0
        R{name} {name}2 {(c.Leakage > 0 ? name + "3" : to)} {N(c.WindingResistance)}
        {(c.Leakage > 0 ? $"L{name} {name}3 {to} {N(c.Leakage)}" : $"Rfloat{name} {to} 0 1e7")}

        """;

    private static string Diode(RectifierCase c, string from, string to) =>
        $"Bd{from}{to} {from} {to} I = V({from},{to}) > {N(c.DiodeThreshold)} ? (V({from},{to}) - {N(c.DiodeThreshold)})/{N(c.DiodeSlope)} : 1e-9*V({from},{to})\n";

    private static string N(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
