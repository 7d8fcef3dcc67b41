using BenchmarkDotNet.Attributes;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;

namespace Selector.Benchmarks;

/// <summary>Rectifier, cold start, every figure; beside it an ngspice run of the first case: 40 periods, step at most a two-hundredth.</summary>
[ShortRunJob]
[MemoryDiagnoser(false)]
public class RectifierBenchmarks
{
    private static readonly RectifierCase Circuit = new(
        RectifierArrangement.Bridge, 50, 13.4, 0.29, 0.23e-3, 0.78, 0.03, 4700e-6, 0.045, LoadKind.Current, 1.2);

    private NgspiceRun? _ngspice;

    [GlobalSetup(Target = nameof(Ngspice))]
    public void Write() => _ngspice = new NgspiceRun("""
        rectifier, everyday settings
        .options reltol=1e-3
        Va a b SIN(0 18.95 50)
        Ra a a2 0.29
        La a2 p 0.23m
        B1 p out I = V(p,out) > 0.78 ? (V(p,out)-0.78)/0.03 : 1e-9*V(p,out)
        B2 b out I = V(b,out) > 0.78 ? (V(b,out)-0.78)/0.03 : 1e-9*V(b,out)
        B3 0 p I = V(0,p) > 0.78 ? (V(0,p)-0.78)/0.03 : 1e-9*V(0,p)
        B4 0 b I = V(0,b) > 0.78 ? (V(0,b)-0.78)/0.03 : 1e-9*V(0,b)
        Resr out y 0.045
        Cres y 0 4700u IC=15
        Iload out 0 1.2
        .tran 0.1m 0.8 0.76 0.1m uic
        .meas tran vmean AVG v(out) from=0.78 to=0.8
        .end

        """);

    [GlobalCleanup(Target = nameof(Ngspice))]
    public void Delete() => _ngspice?.Dispose();

    [Benchmark(Baseline = true)]
    public double Current() => Solve(Circuit);

    [Benchmark]
    public double Resistance() => Solve(Circuit with { LoadKind = LoadKind.Resistance, Load = 13 });

    [Benchmark]
    public double Power() => Solve(Circuit with { LoadKind = LoadKind.Power, Load = 15 });

    [Benchmark]
    public int Ngspice() => _ngspice!.Run();

    private static double Solve(in RectifierCase c)
    {
        RectifierSolver.Solve(c, Budget.Standard, out var s);
        return s.BusMean;
    }
}
