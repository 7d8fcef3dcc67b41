using System.Diagnostics;
using System.Globalization;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>Simulates a converter with ngspice from a given state and measures its last two periods.</summary>
internal static class NgspiceConverter
{
    public static Dictionary<string, double> Measure(ConverterCase c, BruteForceConverter start, int periods)
    {
        var folder = Directory.CreateTempSubdirectory("converter");
        try
        {
            var file = Path.Combine(folder.FullName, "converter.cir");
            File.WriteAllText(file, Netlist(c, start, periods));
            using var process = Process.Start(
                new ProcessStartInfo("ngspice", ["-b", file]) { RedirectStandardOutput = true, RedirectStandardError = true })!;
            var errors = process.StandardError.ReadToEndAsync();
            var output = process.StandardOutput.ReadToEnd();
            Assert.True(process.WaitForExit(30_000), "ngspice did not end");
            _ = errors.Result;
            return Results(output);
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    private static string Netlist(ConverterCase c, BruteForceConverter start, int periods)
    {
        var period = 1 / c.Frequency;
        var window = string.Create(CultureInfo.InvariantCulture, $"from={(periods - 2) * period:R} to={periods * period:R}");
        var resistive = c.LoadKind == OutputLoad.Resistance;
        var branch = resistive ? start.BranchAtStart : start.CoilAtStart - c.Load;
        return string.Create(CultureInfo.InvariantCulture, $"""
            step-down converter
            .options method=gear maxord=2 reltol=1e-5 abstol=1e-9 vntol=1e-7 chgtol=1e-12 trtol=1
            Vin in 0 {c.InputVoltage:R}
            Vgate gate 0 PULSE(0 1 0 1e-10 1e-10 {c.Duty * period - 1e-10:R} {period:R})
            Vsat in a {c.SwitchDrop:R}
            Sw a sw gate 0 switch
            .model switch SW(Ron={c.SwitchResistance:R} Roff=1e9 Vt=0.5 Vh=0)
            Bd 0 sw I = V(0,sw) > {c.DiodeThreshold:R} ? (V(0,sw) - {c.DiodeThreshold:R})/{c.DiodeSlope:R} : 0
            Rleak 0 sw 1e9
            Lout sw b {c.Inductance:R} IC={start.CoilAtStart:R}
            Rdcr b out {c.CoilResistance:R}
            {(c.Esl > 0 ? string.Create(CultureInfo.InvariantCulture, $"Lesl out d {c.Esl:R} IC={branch:R}") : "Vesl out d 0")}
            Resr d e {c.Esr:R}
            Cout e 0 {c.Capacitance:R} IC={start.CapacitorAtStart:R}
            {(resistive ? "Rload out 0" : "Iload out 0")} {c.Load:R}
            .tran {period / 1000:R} {periods * period:R} 0 {period / 2000:R} uic
            .meas tran vmean AVG v(out) {window}
            .meas tran vripple PP v(out) {window}
            .meas tran ilmean AVG i(Lout) {window}
            .meas tran ilrms RMS i(Lout) {window}
            .meas tran ilpeak MAX i(Lout) {window}
            .meas tran iswmean AVG i(Vsat) {window}
            .meas tran iswrms RMS i(Vsat) {window}
            .end
            """);
    }

    private static Dictionary<string, double> Results(string output) =>
        output.Split('\n')
            .Select(line => line.Split('=', 2))
            .Where(parts => parts.Length == 2)
            .Select(parts => (Name: parts[0].Trim(), Value: parts[1].Trim().Split(' ')[0]))
            .Where(m => double.TryParse(m.Value, NumberStyles.Float, CultureInfo.InvariantCulture, out _))
            .GroupBy(m => m.Name)
            .ToDictionary(g => g.Key, g => double.Parse(g.Last().Value, CultureInfo.InvariantCulture));
}
