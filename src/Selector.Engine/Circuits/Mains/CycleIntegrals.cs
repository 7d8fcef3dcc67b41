namespace Selector.Engine.Circuits.Mains;

/// <summary>Integrals over one cycle, by Gauss-Legendre panels of five points: exact to rounding for the smooth pieces between edges.</summary>
internal struct CycleIntegrals
{
    private const int PanelsOfPulse = 8;
    private const int PanelsOfRest = 5;

    public double Bus, BusSquare, Load, Charge, ChargeSquare, CapacitorSquare, CapacitorCos, CapacitorSin, Source, LoadPower;

    /// <summary>Times at which the sampled extremes lie.</summary>
    public double PeakAt, BusMaxAt, BusMinAt, ReverseAt, RestReverse;
    private double _peak, _busMax, _busMin, _reverse;

    /// <summary>Step between samples of the pulse, s.</summary>
    public double Step;

    private static ReadOnlySpan<double> Nodes => [-0.906179845938664, -0.5384693101056831, 0, 0.5384693101056831, 0.906179845938664];

    private static ReadOnlySpan<double> Weights => [0.23692688505618908, 0.47862867049936647, 0.5688888888888889, 0.47862867049936647, 0.23692688505618908];

    public static CycleIntegrals Of(in ChargingPath path, in PulseTrain train, in PulseView pulse, ReadOnlySpan<ChargingPiece> pieces, PulseFigure reverse)
    {
        var sums = new CycleIntegrals { _busMax = double.NegativeInfinity, _busMin = double.PositiveInfinity, _peak = -1, _reverse = double.NegativeInfinity };
        var panels = pieces.Length > 1 ? 1 : PanelsOfPulse;
        foreach (var piece in pieces)
        {
            var width = (piece.End - piece.Start) / panels;
            for (var p = 0; p < panels; p++)
            {
                sums.PulsePanel(path, pulse, piece.Start + p * width, width, reverse);
            }
        }

        sums.Step = (pulse.End - pulse.Start) / (panels * pieces.Length);
        sums.Sample(pulse.Start, pulse, reverse);
        var rest = new BlockedStretch(path, train.End, train.EndVoltage);
        var end = train.RunsOn ? train.End : train.NextStart + path.Cycle;
        var restWidth = (end - train.End) / PanelsOfRest;
        for (var p = 0; p < PanelsOfRest && restWidth > 0; p++)
        {
            sums.RestPanel(path, rest, train.End + p * restWidth, restWidth);
        }

        return sums;
    }

    private void PulsePanel(in ChargingPath path, in PulseView pulse, double start, double width, PulseFigure reverse)
    {
        for (var n = 0; n < Nodes.Length; n++)
        {
            var t = start + width * (1 + Nodes[n]) / 2;
            pulse.At(t, out var j, out var v);
            Add(path, t, j, v, Weights[n] * width / 2);
            Sample(t, pulse, reverse, j, v);
        }
    }

    private void RestPanel(in ChargingPath path, in BlockedStretch rest, double start, double width)
    {
        for (var n = 0; n < Nodes.Length; n++)
        {
            var t = start + width * (1 + Nodes[n]) / 2;
            var v = rest.Terminal(t, out _);
            Add(path, t, 0, v, Weights[n] * width / 2);
            RestReverse = Math.Max(RestReverse, v - path.Peak * Math.Sin(path.Omega * t));
        }
    }

    private void Add(in ChargingPath path, double t, double j, double v, double weight)
    {
        var load = path.LoadCurrent(v);
        var capacitor = j - load;
        var (sin, cos) = Math.SinCos(2 * Math.PI * t / path.Cycle);
        Bus += weight * v;
        BusSquare += weight * v * v;
        Load += weight * load;
        LoadPower += weight * load * v;
        Charge += weight * j;
        ChargeSquare += weight * j * j;
        CapacitorSquare += weight * capacitor * capacitor;
        CapacitorCos += weight * capacitor * cos;
        CapacitorSin += weight * capacitor * sin;
        Source += weight * j * path.Peak * Math.Sin(path.Omega * t);
    }

    private void Sample(double t, in PulseView pulse, PulseFigure reverse)
    {
        pulse.At(t, out var j, out var v);
        Sample(t, pulse, reverse, j, v);
    }

    private void Sample(double t, in PulseView pulse, PulseFigure reverse, double j, double v)
    {
        if (j > _peak)
        {
            (_peak, PeakAt) = (j, t);
        }

        if (v > _busMax)
        {
            (_busMax, BusMaxAt) = (v, t);
        }

        if (v < _busMin)
        {
            (_busMin, BusMinAt) = (v, t);
        }

        if (pulse.Of(reverse, t) is var r && r > _reverse)
        {
            (_reverse, ReverseAt) = (r, t);
        }
    }
}
