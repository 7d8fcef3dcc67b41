using Selector.Engine.Circuits.Mains;

namespace Selector.Engine.Circuits.Reservoir.Combined;

/// <summary>Means, extremes and Fourier components over one line period, from straight pieces between the steps.</summary>
internal sealed class CombinedSums(CombinedCase c, CombinedCircuit circuit, int cycles, double period)
{
    private readonly List<(double At, double Length, double From, double To)> _capacitor = [];
    private double _bus, _capacitorSquare, _charge, _chargeSquare, _drawn, _drawnSquare, _output, _coilSquare, _source;
    private double _busMax = double.NegativeInfinity, _busMin = double.PositiveInfinity, _insideMax = double.NegativeInfinity;
    private double _insideMin = double.PositiveInfinity, _outputMax = double.NegativeInfinity, _outputMin = double.PositiveInfinity, _peak, _coilPeak;

    public void Add(in CombinedState from, in CombinedState to, double t, double h, CoilPath path)
    {
        var (e0, e1) = (circuit.Emf(t), circuit.Emf(t + h));
        var (j0, j1) = (circuit.Charge(from, e0, path), circuit.Charge(to, e1, path));
        var (v0, v1) = (circuit.Terminal(from, j0, path), circuit.Terminal(to, j1, path));
        var (d0, d1) = (CombinedCircuit.Drawn(from, path), CombinedCircuit.Drawn(to, path));
        var (o0, o1) = (circuit.OutputTerminal(from), circuit.OutputTerminal(to));
        _capacitor.Add((t, h, j0 - d0, j1 - d1));
        _bus += h * (v0 + v1) / 2;
        _capacitorSquare += Square(h, j0 - d0, j1 - d1);
        _charge += h * (j0 + j1) / 2;
        _chargeSquare += Square(h, j0, j1);
        _drawn += h * (d0 + d1) / 2;
        _drawnSquare += Square(h, d0, d1);
        _output += h * (o0 + o1) / 2;
        _coilSquare += Square(h, from.Coil, to.Coil);
        _source += h * (e0 * j0 + e1 * j1) / 2;
        (_busMax, _busMin) = (Math.Max(_busMax, Math.Max(v0, v1)), Math.Min(_busMin, Math.Min(v0, v1)));
        (_insideMax, _insideMin) = (Math.Max(_insideMax, to.Bus), Math.Min(_insideMin, to.Bus));
        (_outputMax, _outputMin) = (Math.Max(_outputMax, Math.Max(o0, o1)), Math.Min(_outputMin, Math.Min(o0, o1)));
        (_peak, _coilPeak) = (Math.Max(_peak, Math.Max(j0, j1)), Math.Max(_coilPeak, Math.Max(from.Coil, to.Coil)));
    }

    public CombinedSolution Solution()
    {
        var arrangement = c.Rectifier.Arrangement;
        var share = arrangement == RectifierArrangement.HalfWave ? 1 : 0.5;
        var ripple = arrangement == RectifierArrangement.HalfWave ? 1 : 2;
        var square = _capacitorSquare / period;
        var low = 0.0;
        for (var k = 1; 2 * k < cycles; k++)
        {
            low += Component(k);
        }

        return new CombinedSolution
        {
            BusMean = _bus / period, BusMax = _busMax, BusMin = _busMin, InsideMax = _insideMax, InsideMin = _insideMin,
            CapacitorRms = Math.Sqrt(square), CapacitorLow = Math.Sqrt(low), CapacitorHigh = Math.Sqrt(Math.Max(0, square - low)),
            CapacitorRipple = Math.Sqrt(Component(ripple)), CapacitorSwitching = Math.Sqrt(Component(cycles)),
            DiodePeak = _peak, DiodeRms = Math.Sqrt(share * _chargeSquare / period), DiodeAverage = share * _charge / period,
            SecondaryRms = Math.Sqrt((arrangement == RectifierArrangement.CentreTap ? 0.5 : 1) * _chargeSquare / period),
            InputMean = _drawn / period, SwitchRms = Math.Sqrt(_drawnSquare / period),
            OutputMean = _output / period, OutputRipple = _outputMax - _outputMin, CoilPeak = _coilPeak, CoilRms = Math.Sqrt(_coilSquare / period),
            SourcePower = _source / period, LoadPower = _output / period * c.Load,
        };
    }

    private static double Square(double h, double a, double b) => h * (a * a + a * b + b * b) / 3;

    /// <summary>Mean square of the Fourier component at a multiple of the line frequency, A²; a straight piece by two Gauss points.</summary>
    private double Component(int k)
    {
        const double Node = 0.5773502691896258;
        var omega = 2 * Math.PI * k / period;
        var (cos, sin) = (0.0, 0.0);
        foreach (var (at, length, from, to) in _capacitor)
        {
            var half = length / 2;
            var (mean, slope) = ((from + to) / 2, (to - from) / 2);
            var (s1, c1) = Math.SinCos(omega * (at + half * (1 - Node)));
            var (s2, c2) = Math.SinCos(omega * (at + half * (1 + Node)));
            cos += half * ((mean - Node * slope) * c1 + (mean + Node * slope) * c2);
            sin += half * ((mean - Node * slope) * s1 + (mean + Node * slope) * s2);
        }

        return 2 * (cos * cos + sin * sin) / (period * period);
    }
}
