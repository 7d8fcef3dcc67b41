namespace Selector.Engine.Circuits.Mains;

/// <summary>Turns a periodic pulse into the figures that parts are rated by.</summary>
internal static class RectifierFigures
{
    /// <summary>A pulse is counted where its current is above this share of the peak.</summary>
    private const double CountedShare = 0.01;

    /// <summary>Without load the reservoir stands at the peak and nothing flows.</summary>
    public static RectifierSolution Unloaded(in ChargingPath path, RectifierArrangement arrangement)
    {
        var bus = Math.Max(0, path.Peak - path.Drop);
        var reverse = arrangement == RectifierArrangement.Bridge ? Math.Min(path.Peak, bus + path.Drop / 2) : bus + path.Peak;
        return new RectifierSolution { BusMean = bus, BusMax = bus, BusMin = bus, DiodeReversePeak = reverse, Next = new(bus, double.NaN) };
    }

    public static RectifierSolution Of(in RectifierCase c, in ChargingPath path, in PulseTrain train, ReadOnlySpan<ChargingPiece> all, RectifierDetail detail)
    {
        var pieces = all[..train.Count];
        var pulse = new PulseView(c, path, pieces);
        var figure = c.Arrangement == RectifierArrangement.Bridge ? PulseFigure.BridgeReverse
            : c.Arrangement == RectifierArrangement.CentreTap ? PulseFigure.CentreTapReverse : PulseFigure.Bus;
        var sums = CycleIntegrals.Of(path, train, pulse, pieces, figure, detail);
        var s = new RectifierSolution { PulseStart = train.Start, PulseEnd = train.End };
        Means(ref s, c, path, sums);
        Powers(ref s, c, path, sums);
        if (detail == RectifierDetail.All)
        {
            Extremes(ref s, c, pulse, sums);
            pulse.Extreme(figure, sums.ReverseAt, sums.Step, 1, out var reverse);
            s.DiodeReversePeak = c.Arrangement == RectifierArrangement.HalfWave ? HalfWaveReverse(path, train, sums) : reverse;
        }

        return s;
    }

    private static void Means(ref RectifierSolution s, in RectifierCase c, in ChargingPath path, in CycleIntegrals sums)
    {
        s.BusMean = sums.Bus / path.Cycle;
        s.BusRippleRms = Math.Sqrt(Math.Max(0, sums.BusSquare / path.Cycle - s.BusMean * s.BusMean));
        s.LoadMean = sums.Load / path.Cycle;
        var (mean, square) = (sums.Charge / path.Cycle, sums.ChargeSquare / path.Cycle);

        // In a bridge and at a centre tap each diode carries every other pulse.
        var share = c.Arrangement == RectifierArrangement.HalfWave ? 1 : 0.5;
        s.DiodeAverage = share * mean;
        s.DiodeRms = Math.Sqrt(share * square);
        s.SecondaryRms = Math.Sqrt((c.Arrangement == RectifierArrangement.CentreTap ? 0.5 : 1) * square);
        s.CapacitorRms = Math.Sqrt(sums.CapacitorSquare / path.Cycle);
        s.CapacitorFundamentalRms = Math.Sqrt(2 * (sums.CapacitorCos * sums.CapacitorCos + sums.CapacitorSin * sums.CapacitorSin)) / path.Cycle;
    }

    private static void Extremes(ref RectifierSolution s, in RectifierCase c, in PulseView pulse, in CycleIntegrals sums)
    {
        pulse.Extreme(PulseFigure.Bus, sums.BusMaxAt, sums.Step, 1, out s.BusMax);
        pulse.Extreme(PulseFigure.Bus, sums.BusMinAt, sums.Step, -1, out s.BusMin);
        s.BusRipplePeakToPeak = s.BusMax - s.BusMin;
        var peakAt = pulse.Extreme(PulseFigure.Current, sums.PeakAt, sums.Step, 1, out s.DiodePeak);
        var level = CountedShare * s.DiodePeak;
        var counted = pulse.Crossing(level, pulse.End, peakAt) - pulse.Crossing(level, pulse.Start, peakAt);
        s.ConductionFraction = counted * 2 * c.Frequency;
    }

    private static void Powers(ref RectifierSolution s, in RectifierCase c, in ChargingPath path, in CycleIntegrals sums)
    {
        var windings = c.Arrangement == RectifierArrangement.CentreTap ? 2 : 1;
        s.SourcePower = sums.Source / path.Cycle;
        s.SourceApparent = windings * c.SecondaryRms * s.SecondaryRms;
        s.PowerFactor = s.SourceApparent > 0 ? s.SourcePower / s.SourceApparent : 0;
        s.LoadPower = sums.LoadPower / path.Cycle;
        s.WindingLoss = windings * c.WindingResistance * s.SecondaryRms * s.SecondaryRms;
        s.DiodeLoss = c.DiodeThreshold * s.DiodeAverage + c.DiodeSlope * s.DiodeRms * s.DiodeRms
            + c.BlockingConductance * sums.ReverseSquare / path.Cycle;
        s.EsrLoss = c.Esr * s.CapacitorRms * s.CapacitorRms;
    }

    /// <summary>The idle half-wave pulls against the falling bus: the greatest difference lies near its peak, closed in on by thirds.</summary>
    private static double HalfWaveReverse(in ChargingPath path, in PulseTrain train, in CycleIntegrals sums)
    {
        var rest = new BlockedStretch(path, train.End, train.EndVoltage);
        var (low, high) = (Math.Max(train.End, Math.PI / path.Omega), 1.75 * Math.PI / path.Omega);
        var best = sums.RestReverse;
        for (var i = 0; i < 40 && high > low; i++)
        {
            var (a, b) = (low + (high - low) / 3, high - (high - low) / 3);
            var (fa, fb) = (At(rest, path, a), At(rest, path, b));
            best = Math.Max(best, Math.Max(fa, fb));
            (low, high) = fa > fb ? (low, b) : (a, high);
        }

        return best;

        static double At(in BlockedStretch rest, in ChargingPath path, double t) =>
            rest.Terminal(t, out _) - path.Peak * Math.Sin(path.Omega * t);
    }
}
