using System.Diagnostics;

namespace Selector.Benchmarks;

/// <summary>One run of ngspice as a whole process at everyday settings, for the ratio beside a solver.</summary>
internal sealed class NgspiceRun : IDisposable
{
    private readonly string _file = Path.GetTempFileName();

    public NgspiceRun(string netlist) => File.WriteAllText(_file, netlist);

    public int Run()
    {
        using var process = Process.Start(new ProcessStartInfo("ngspice", ["-b", _file]) { RedirectStandardOutput = true, RedirectStandardError = true })!;
        var errors = process.StandardError.ReadToEndAsync();
        process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return errors.Result.Length;
    }

    public void Dispose() => File.Delete(_file);
}
