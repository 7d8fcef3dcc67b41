using BenchmarkDotNet.Attributes;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Benchmarks;

/// <summary>Step-down converter, every figure; beside it an ngspice run of the first case: 500 periods, step at most a two-hundredth.</summary>
[ShortRunJob]
[MemoryDiagnoser(false)]
public class ConverterBenchmarks
{
    private static readonly ConverterCase Circuit = new(
        120e3, 28, 0.45, 0.4, 0.03, 0.5, 0.02, 60e-6, 0.08, 100e-6, 0.05, 0, OutputLoad.Current, 1.7);

    private NgspiceRun? _ngspice;

    [GlobalSetup(Target = nameof(Ngspice))]
    public void Write() => _ngspice = new NgspiceRun("""
        step-down converter, everyday settings
        .options reltol=1e-3
        Vin in 0 28
        Vg g 0 PULSE(0 1 0 1n 1n 3.75u 8.3333u)
        Vs in a 0.4
        S1 a sw g 0 sm
        .model sm SW(Ron=0.03 Roff=1e9 Vt=0.5 Vh=0)
        Bd 0 sw I = V(0,sw) > 0.5 ? (V(0,sw)-0.5)/0.02 : 0
        Rl 0 sw 1e9
        L1 sw b 60u IC=1.7
        Rd b out 0.08
        Re out e 0.05
        C1 e 0 100u IC=12
        Iload out 0 1.7
        .tran 0.0416u 4.1667m 4.15m 0.0416u uic
        .meas tran vmean AVG v(out) from=4.15m to=4.1667m
        .end

        """);

    [GlobalCleanup(Target = nameof(Ngspice))]
    public void Delete() => _ngspice?.Dispose();

    [Benchmark(Baseline = true)]
    public double Continuous() => Solve(Circuit);

    [Benchmark]
    public double Discontinuous() => Solve(Circuit with { Load = 0.1 });

    [Benchmark]
    public double DutyForOutput()
    {
        ConverterSolver.SolveForOutput(Circuit, 12, Budget.Standard, out var duty, out _);
        return duty;
    }

    [Benchmark]
    public int Ngspice() => _ngspice!.Run();

    private static double Solve(in ConverterCase c)
    {
        ConverterSolver.Solve(c, Budget.Standard, out var s);
        return s.OutputMean;
    }
}
