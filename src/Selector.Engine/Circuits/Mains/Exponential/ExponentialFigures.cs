namespace Selector.Engine.Circuits.Mains.Exponential;

/// <summary>Turns a pulse on its mesh and the rest after it into the figures of the rectifier.</summary>
internal static class ExponentialFigures
{
    private const double CountedShare = 0.01;
    private const int RestPanels = 6;

    private static ReadOnlySpan<double> Nodes => [-0.906179845938664, -0.5384693101056831, 0, 0.5384693101056831, 0.906179845938664];

    private static ReadOnlySpan<double> Weights => [0.23692688505618908, 0.47862867049936647, 0.5688888888888889, 0.47862867049936647, 0.23692688505618908];

    public static RectifierSolution Of(in ExponentialCase c, in ExponentialPath path, ExponentialPulse pulse, double next)
    {
        var sums = new Sums { BusMax = double.NegativeInfinity, BusMin = double.PositiveInfinity };
        var current = pulse.Current;
        var bus = pulse.Bus;
        for (var i = 0; i < current.Length; i++)
        {
            var weight = pulse.Step * (i == 0 || i == current.Length - 1 ? 0.5 : 1);
            sums.Add(path, c.Circuit.Arrangement, pulse.Start + i * pulse.Step, current[i], bus[i], weight);
        }

        var rest = new BlockedStretch(path.Loop, pulse.End, pulse.EndVoltage);
        var width = (next - pulse.End) / RestPanels;
        for (var p = 0; p < RestPanels; p++)
        {
            for (var n = 0; n < Nodes.Length; n++)
            {
                var t = pulse.End + width * (p + (1 + Nodes[n]) / 2);
                sums.Add(path, c.Circuit.Arrangement, t, 0, rest.Terminal(t, out _), Weights[n] * width / 2);
            }
        }

        sums.BusMin = Math.Min(sums.BusMin, rest.Terminal(next, out _));
        var s = sums.Solution(c, path);
        s.ConductionFraction = Counted(current, pulse.Step, CountedShare * s.DiodePeak) * 2 * c.Circuit.Frequency;
        (s.PulseStart, s.PulseEnd) = (pulse.Start, pulse.End);
        s.Next = new RectifierStart(rest.Ideal(rest.Terminal(next, out _)), double.NaN);
        if (c.Circuit.Arrangement == RectifierArrangement.HalfWave)
        {
            s.DiodeReversePeak = HalfWaveReverse(path, rest, pulse.End);
        }

        return s;
    }

    /// <summary>Time above a level, its ends interpolated.</summary>
    private static double Counted(ReadOnlySpan<double> current, double step, double level)
    {
        var time = 0.0;
        for (var i = 1; i < current.Length; i++)
        {
            var (a, b) = (current[i - 1] - level, current[i] - level);
            time += a >= 0 && b >= 0 ? step : a < 0 && b < 0 ? 0 : step * Math.Max(a, b) / Math.Abs(a - b);
        }

        return time;
    }

    private static double HalfWaveReverse(in ExponentialPath path, in BlockedStretch rest, double end)
    {
        var best = 0.0;
        var half = Math.PI / path.Loop.Omega;
        for (var i = 0; i <= 2000; i++)
        {
            var t = half * (1 + 0.75 * i / 2000);
            if (t >= end)
            {
                best = Math.Max(best, rest.Terminal(t, out _) - path.Emf(t));
            }
        }

        return best;
    }

    private struct Sums
    {
        public double BusMax, BusMin;
        private double _bus, _busSquare, _load, _loadPower, _charge, _square, _capacitor, _cos, _sin, _source, _diode, _leak, _peak, _reverse;

        public void Add(in ExponentialPath path, RectifierArrangement arrangement, double t, double j, double v, double weight)
        {
            var load = path.Loop.LoadCurrent(v);
            var capacitor = j - load;
            var (sin, cos) = Math.SinCos(path.Loop.Omega * t);
            var (rippleSin, rippleCos) = path.Loop.PulsesPerPeriod == 1 ? (sin, cos) : (2 * sin * cos, 1 - 2 * sin * sin);
            _bus += weight * v;
            _busSquare += weight * v * v;
            _load += weight * load;
            _loadPower += weight * load * v;
            _charge += weight * j;
            _square += weight * j * j;
            _capacitor += weight * capacitor * capacitor;
            _cos += weight * capacitor * rippleCos;
            _sin += weight * capacitor * rippleSin;
            _source += weight * j * path.Loop.Peak * sin;
            var drop = path.DiodeVoltage(j);
            _diode += weight * j * drop;
            _leak += weight * Blocked(path, arrangement, path.Loop.Peak * sin, j, v, drop);
            _peak = Math.Max(_peak, j);
            BusMax = Math.Max(BusMax, v);
            BusMin = Math.Min(BusMin, v);
            _reverse = Math.Max(_reverse, arrangement == RectifierArrangement.Bridge ? v + drop : v + path.Loop.Peak * sin);
        }

        /// <summary>
        /// Power of the reverse currents, mean of all diodes, W. What they take from the bus is left out: some parts in ten thousand
        /// even of a leaky Schottky.
        /// </summary>
        private static double Blocked(in ExponentialPath path, RectifierArrangement arrangement, double emf, double j, double v, double drop) => arrangement switch
        {
            RectifierArrangement.Bridge => j > 0 ? path.ReverseLoss(v + drop) / 2 : (path.ReverseLoss((v - emf) / 2) + path.ReverseLoss((v + emf) / 2)) / 2,
            RectifierArrangement.CentreTap => ((j > 0 ? 0 : path.ReverseLoss(v - emf)) + path.ReverseLoss(v + emf)) / 2,
            _ => j > 0 ? 0 : path.ReverseLoss(v - emf),
        };

        public readonly RectifierSolution Solution(in ExponentialCase c, in ExponentialPath path)
        {
            var cycle = path.Loop.Cycle;
            var share = c.Circuit.Arrangement == RectifierArrangement.HalfWave ? 1 : 0.5;
            var windings = c.Circuit.Arrangement == RectifierArrangement.CentreTap ? 2 : 1;
            var mean = _bus / cycle;
            var secondary = Math.Sqrt((windings == 2 ? 0.5 : 1) * _square / cycle);
            var apparent = windings * c.Circuit.SecondaryRms * secondary;
            return new RectifierSolution
            {
                BusMean = mean, BusMax = BusMax, BusMin = BusMin, BusRipplePeakToPeak = BusMax - BusMin,
                BusRippleRms = Math.Sqrt(Math.Max(0, _busSquare / cycle - mean * mean)),
                LoadMean = _load / cycle,
                DiodePeak = _peak, DiodeAverage = share * _charge / cycle, DiodeRms = Math.Sqrt(share * _square / cycle),
                DiodeReversePeak = _reverse,
                SecondaryRms = secondary,
                CapacitorRms = Math.Sqrt(_capacitor / cycle),
                CapacitorFundamentalRms = Math.Sqrt(2 * (_cos * _cos + _sin * _sin)) / cycle,
                SourcePower = _source / cycle, SourceApparent = apparent, PowerFactor = apparent > 0 ? _source / cycle / apparent : 0,
                LoadPower = _loadPower / cycle,
                WindingLoss = windings * c.Circuit.WindingResistance * secondary * secondary,
                DiodeLoss = (share * _diode + _leak) / cycle,
                EsrLoss = c.Circuit.Esr * _capacitor / cycle,
            };
        }
    }
}
