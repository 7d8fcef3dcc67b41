namespace Selector.Engine.Circuits.Mains;

/// <summary>Integrals over one cycle, by Gauss-Legendre panels: exact to some 1e-9 for the smooth pieces between edges.</summary>
internal struct CycleIntegrals
{
    private const int PanelsOfPulse = 5;
    private const int PanelsOfRest = 2;

    /// <summary>One panel more for every radian that leakage and reservoir ring in a pulse.</summary>
    private const int MostForRinging = 60;

    /// <summary>A transient that fits this often into a piece is too fast for even panels.</summary>
    private const double Stiff = 2;

    public double Bus, BusSquare, Load, Charge, ChargeSquare, CapacitorSquare, CapacitorCos, CapacitorSin, Source, LoadPower;

    /// <summary>Square of the reverse voltage, mean of all diodes, V²s.</summary>
    public double ReverseSquare;

    /// <summary>Times at which the sampled extremes lie.</summary>
    public double PeakAt, BusMaxAt, BusMinAt, ReverseAt, RestReverse;
    private double _peak, _busMax, _busMin, _reverse;

    /// <summary>Step between samples of the pulse, s.</summary>
    public double Step;

    private static ReadOnlySpan<double> NodesOfPiece => [-0.7745966692414834, 0, 0.7745966692414834];

    private static ReadOnlySpan<double> WeightsOfPiece => [0.5555555555555556, 0.8888888888888888, 0.5555555555555556];

    private static ReadOnlySpan<double> Nodes => [-0.906179845938664, -0.5384693101056831, 0, 0.5384693101056831, 0.906179845938664];

    private static ReadOnlySpan<double> Weights => [0.23692688505618908, 0.47862867049936647, 0.5688888888888889, 0.47862867049936647, 0.23692688505618908];

    public static CycleIntegrals Of(in ChargingPath path, in PulseTrain train, in PulseView pulse, ReadOnlySpan<ChargingPiece> pieces, PulseFigure reverse,
        RectifierDetail detail)
    {
        var sums = new CycleIntegrals { _busMax = double.NegativeInfinity, _busMin = double.PositiveInfinity, _peak = -1, _reverse = double.NegativeInfinity };
        var panels = pieces.Length > 1 ? 1 : PanelsOfPulse + Math.Min(MostForRinging, (int)(pieces[0].RingRate * (pulse.End - pulse.Start)));
        var nodes = pieces.Length > 1 ? NodesOfPiece : Nodes;
        var weights = pieces.Length > 1 ? WeightsOfPiece : Weights;
        for (var i = 0; i < pieces.Length; i++)
        {
            ref readonly var piece = ref pieces[i];
            var from = i == 0 ? sums.Onset(path, piece, nodes, weights, reverse, detail, pulse) : piece.Start;
            var width = (piece.End - from) / panels;
            for (var p = 0; p < panels; p++)
            {
                sums.PulsePanel(path, piece, from + p * width, width, nodes, weights, reverse, detail, pulse);
            }
        }

        if (detail == RectifierDetail.All)
        {
            sums.Step = (pulse.End - pulse.Start) / (panels * pieces.Length);
            pulse.At(pulse.Start, out var j, out var v);
            sums.Sample(pulse.Start, pulse, reverse, j, v);
        }

        var rest = new BlockedStretch(path, train.End, train.EndVoltage);
        var end = train.RunsOn ? train.End : train.NextStart + path.Cycle;
        var restWidth = (end - train.End) / PanelsOfRest;
        for (var p = 0; p < PanelsOfRest && restWidth > 0; p++)
        {
            sums.RestPanel(path, rest, train.End + p * restWidth, restWidth);
        }

        return sums;
    }

    /// <summary>
    /// The first moments of a pulse from a stiff source, in which the current springs up: panels that grow with the transient's
    /// own time. Returns where the even panels take over.
    /// </summary>
    private double Onset(
        in ChargingPath path, in ChargingPiece piece, ReadOnlySpan<double> nodes, ReadOnlySpan<double> weights, PulseFigure reverse,
        RectifierDetail detail, in PulseView pulse)
    {
        var width = piece.End - piece.Start;
        var time = 1 / piece.FastestRate;
        var from = piece.Start;
        if (!(time * Stiff < width))
        {
            return from;
        }

        foreach (var share in (ReadOnlySpan<double>)[1, 3, 7, 14])
        {
            var to = Math.Min(piece.Start + share * time, piece.Start + width / 2);
            if (to > from)
            {
                PulsePanel(path, piece, from, to - from, nodes, weights, reverse, detail, pulse);
                from = to;
            }
        }

        return from;
    }

    private void PulsePanel(
        in ChargingPath path, in ChargingPiece piece, double start, double width, ReadOnlySpan<double> nodes, ReadOnlySpan<double> weights,
        PulseFigure reverse, RectifierDetail detail, in PulseView pulse)
    {
        for (var n = 0; n < nodes.Length; n++)
        {
            var t = start + width * (1 + nodes[n]) / 2;
            var (sine, cosine) = Math.SinCos(path.Omega * t);
            piece.At(t, sine, cosine, out var u, out var j);
            var v = piece.Terminal(u, j);
            Add(path, sine, cosine, j, v, weights[n] * width / 2);
            ReverseSquare += weights[n] * width / 2 * path.ReverseSquareInPulse(v, j, path.Peak * sine);
            if (detail == RectifierDetail.All)
            {
                Sample(t, pulse, reverse, j, v);
            }
        }
    }

    private void RestPanel(in ChargingPath path, in BlockedStretch rest, double start, double width)
    {
        for (var n = 0; n < Nodes.Length; n++)
        {
            var t = start + width * (1 + Nodes[n]) / 2;
            var v = rest.Terminal(t, out _);
            var (sine, cosine) = Math.SinCos(path.Omega * t);
            Add(path, sine, cosine, 0, v, Weights[n] * width / 2);
            ReverseSquare += Weights[n] * width / 2 * path.ReverseSquareAtRest(v, path.Peak * sine);
            RestReverse = Math.Max(RestReverse, v - path.Peak * sine);
        }
    }

    private void Add(in ChargingPath path, double sin, double cos, double j, double v, double weight)
    {
        var load = path.LoadCurrent(v);
        var capacitor = j - load;

        // The ripple runs at the frequency of the pulses: the mains' own for a half wave, else twice that.
        var (rippleSin, rippleCos) = path.PulsesPerPeriod == 1 ? (sin, cos) : (2 * sin * cos, 1 - 2 * sin * sin);
        Bus += weight * v;
        BusSquare += weight * v * v;
        Load += weight * load;
        LoadPower += weight * load * v;
        Charge += weight * j;
        ChargeSquare += weight * j * j;
        CapacitorSquare += weight * capacitor * capacitor;
        CapacitorCos += weight * capacitor * rippleCos;
        CapacitorSin += weight * capacitor * rippleSin;
        Source += weight * j * path.Peak * sin;
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

        if (pulse.Of(reverse, t, j, v) is var r && r > _reverse)
        {
            (_reverse, ReverseAt) = (r, t);
        }
    }
}
