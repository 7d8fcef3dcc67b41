namespace Selector.Engine.Circuits.Mains.Transient;

/// <summary>Takes part in a run: sees every stretch as it is solved.</summary>
internal interface ITransientWatch
{
    /// <summary>A stretch of conduction.</summary>
    /// <returns>False to end the run.</returns>
    bool Conducts(in TransientPiece piece, double from, double to);

    /// <summary>A stretch in which the load alone empties the reservoir.</summary>
    /// <returns>False to end the run.</returns>
    bool Rests(in BlockedStretch rest, double from, double to);
}

/// <summary>
/// The rectifier from any state on, stretch by stretch: conduction begins, ends, overlaps and the load changes at located instants,
/// and between them everything is in closed form.
/// </summary>
internal ref struct TransientRun
{
    private const int StepsPerPeriod = 96;
    private const int MostStretches = 40_000;

    /// <summary>Way of the bus over one stretch of a constant power, as a share of the bus.</summary>
    private const double WidestSwing = 0.02;

    /// <summary>Current of a path that has just begun to conduct, A: the stretch must know of it and nothing else may.</summary>
    private const double Hair = double.Epsilon;

    private readonly ChargingPath _path;
    private readonly TransientLoad _load;
    private readonly RectifierArrangement _arrangement;
    private readonly double _half;
    private readonly double _period;
    private bool _above;

    public TransientRun(in RectifierCase c, double loadFrom, double time, double u)
    {
        _path = new ChargingPath(c);
        _load = new TransientLoad(_path, loadFrom);
        _arrangement = c.Arrangement;
        _period = 1 / c.Frequency;
        _half = _period / 2;
        Time = time;
        U = u;
        EmfOffFrom = EmfOffTo = double.PositiveInfinity;
        _above = Bus(u, 0) > _load.Threshold;
    }

    public double Time { get; private set; }

    /// <summary>Ideal capacitor, V.</summary>
    public double U { get; private set; }

    /// <summary>Currents of the positive and the negative half-wave's path, A.</summary>
    public double Positive { get; set; }

    public double Negative { get; set; }

    /// <summary>The emf is nothing between these times, s.</summary>
    public double EmfOffFrom { get; set; }

    public double EmfOffTo { get; set; }

    private readonly bool EmfIsOff => Time >= EmfOffFrom && Time < EmfOffTo;

    /// <summary>Runs until a time or until the watch has seen enough.</summary>
    public SolveStatus Run<TWatch>(double until, ref TWatch watch, in Budget budget)
        where TWatch : struct, ITransientWatch, allows ref struct
    {
        for (var i = 0; i < MostStretches; i++)
        {
            if (budget.Cancel.IsCancellationRequested)
            {
                return SolveStatus.Cancelled;
            }

            if (Time >= until)
            {
                return SolveStatus.Solved;
            }

            var end = Math.Min(until, Time < EmfOffFrom ? EmfOffFrom : Time < EmfOffTo ? EmfOffTo : double.PositiveInfinity);
            var goesOn = Positive > 0 || Negative > 0 || Begins(Resting, Time) != 0 ? Conduct(end, ref watch) : Rest(end, ref watch);
            if (!double.IsFinite(U + Positive + Negative))
            {
                return SolveStatus.BadInput;
            }

            if (!goesOn)
            {
                return SolveStatus.Solved;
            }
        }

        return SolveStatus.OutOfBudget;
    }

    private readonly BlockedStretch Resting => new(_load.At(_above), Time, U);

    private readonly double Bus(double u, double total)
    {
        var path = _load.At(_above);
        return total == 0 ? path.TerminalAtRest(u) is var v && double.IsNaN(v) ? 0 : v : u;
    }

    /// <summary>+1 or -1 where the emf of that half-wave takes over from the resting bus, 0 where none does.</summary>
    private readonly int Begins(in BlockedStretch rest, double t)
    {
        var v = rest.Terminal(t, out var slope);
        return v >= 0 ? Begins(t, v, slope) : Begins(t, 0, 0);
    }

    private readonly int Begins(double t, double bus, double slope)
    {
        if (EmfIsOff)
        {
            return 0;
        }

        var (sin, cos) = Math.SinCos(_path.Omega * t);
        return Takes(1, sin, cos, bus, slope) ? 1
            : _arrangement != RectifierArrangement.HalfWave && Takes(-1, sin, cos, bus, slope) ? -1 : 0;
    }

    /// <summary>A stretch that has just ended, its load straightened, may seem to stand a hair above the bus: there it must be rising.</summary>
    private readonly bool Takes(int sign, double sin, double cos, double bus, double slope)
    {
        var gap = sign * _path.Peak * sin - _path.Drop - bus;
        return gap > 1e-12 * _path.Peak && (gap > 1e-4 * _path.Peak || sign * _path.Peak * _path.Omega * cos > slope);
    }

    private bool Conduct<TWatch>(double until, ref TWatch watch)
        where TWatch : struct, ITransientWatch, allows ref struct
    {
        var path = _load.At(_above);
        if (EmfIsOff)
        {
            path = path with { Peak = 0 };
        }

        var both = Positive > 0 && Negative > 0;
        var begins = Positive > 0 || Negative > 0 ? 0 : Begins(Resting, Time);
        var sign = both ? 0 : Positive > 0 || begins > 0 ? 1 : -1;
        var bus = StartBus(path);
        var load = LinearLoad.About(path, Math.Max(bus, 1e-9));
        var piece = both
            ? TransientPiece.Both(path, load, Time, U, Positive, Negative)
            : TransientPiece.One(path, load, Time, sign > 0 ? 0 : _half, U, Positive + Negative);
        var step = Step(piece);
        var end = Math.Min(until, Swing(path, piece, step, bus));
        if (path.Kind == LoadKind.Power && end < until)
        {
            // Straightened about the middle of its way.
            var middle = (bus + piece.Terminal(end)) / 2;
            load = LinearLoad.About(path, middle, (piece.Terminal(end) - bus) * (piece.Terminal(end) - bus) / 12);
            piece = both
                ? TransientPiece.Both(path, load, Time, U, Positive, Negative)
                : TransientPiece.One(path, load, Time, sign > 0 ? 0 : _half, U, Positive + Negative);
        }

        var (at, what) = FirstEvent(piece, sign, step, end);
        var from = Time;
        piece.At(at, out var u, out var total);
        (Time, U) = (at, u);
        if (both)
        {
            Positive = what == TransientEvent.PositiveEnds ? 0 : Math.Max(0, piece.Positive(at));
            Negative = what == TransientEvent.NegativeEnds ? 0 : Math.Max(0, piece.Negative(at));
        }
        else
        {
            var left = what == TransientEvent.PositiveEnds ? 0 : Math.Max(0, total);
            (Positive, Negative) = sign > 0 ? (left, 0.0) : (0.0, left);
            if (what == TransientEvent.OtherBegins)
            {
                // Just enough that the next stretch knows of it.
                (Positive, Negative) = sign > 0 ? (left, Hair) : (Hair, left);
            }
        }

        _above = what == TransientEvent.LoadChanges ? !_above : _above;
        return watch.Conducts(piece, from, at);
    }

    private readonly double StartBus(in ChargingPath path)
    {
        var total = Positive + Negative;
        if (path.Inductance > 0 || total > 0)
        {
            // The terminal voltage that belongs to a state, by the load about it.
            var v = U;
            for (var i = 0; i < 20; i++)
            {
                v = U + path.Esr * (total - (v > 0 ? path.LoadCurrent(v) : 0));
            }

            return Math.Max(0, v);
        }

        return Math.Max(0, Bus(U, 0));
    }

    private readonly double Step(in TransientPiece piece)
    {
        var step = _period / StepsPerPeriod;
        if (piece.RingRate > 0)
        {
            step = Math.Min(step, 0.3 / piece.RingRate);
        }

        return step;
    }

    private readonly double Swing(in ChargingPath path, in TransientPiece piece, double step, double bus)
    {
        if (path.Kind != LoadKind.Power)
        {
            return double.PositiveInfinity;
        }

        var trial = step;
        for (var i = 0; i < 12 && Math.Abs(piece.Terminal(Time + trial) - bus) > WidestSwing * bus; i++)
        {
            trial /= 2;
        }

        return Time + trial;
    }

    private readonly (double At, TransientEvent What) FirstEvent(in TransientPiece piece, int sign, double step, double end)
    {
        var low = Time;
        var first = true;
        while (low < end)
        {
            var high = Math.Min(end, low + (first ? step / 64 : step));
            var what = Seen(piece, sign, low, high);
            if (what != TransientEvent.None)
            {
                return Locate(piece, sign, low, high);
            }

            (low, first) = (high, false);
        }

        return (end, TransientEvent.None);
    }

    /// <summary>Halves the interval until the first event in it stands alone and is located.</summary>
    private readonly (double At, TransientEvent What) Locate(in TransientPiece piece, int sign, double low, double high)
    {
        var from = low;
        for (var i = 0; i < 60 && high - low > 1e-13 * _period; i++)
        {
            var middle = (low + high) / 2;
            if (Seen(piece, sign, from, middle) != TransientEvent.None)
            {
                high = middle;
            }
            else
            {
                low = middle;
            }
        }

        return (high, Seen(piece, sign, from, high));
    }

    /// <summary>
    /// What has happened by a time. A stretch that has just begun may start a hair below nothing, its load being straightened: only
    /// what was above can end.
    /// </summary>
    private readonly TransientEvent Seen(in TransientPiece piece, int sign, double from, double t)
    {
        if (sign == 0)
        {
            if (piece.Positive(t) < 0)
            {
                return TransientEvent.PositiveEnds;
            }

            if (piece.Negative(t) < 0)
            {
                return TransientEvent.NegativeEnds;
            }
        }
        else if (piece.Total(t) <= 0 && t > from && (Positive > 0 || Negative > 0 || piece.Total(from) > 0))
        {
            return TransientEvent.PositiveEnds;
        }

        var v = piece.Terminal(t);
        if (_above ? v < _load.Threshold * (1 - 1e-12) : v > _load.Threshold)
        {
            return TransientEvent.LoadChanges;
        }

        return sign != 0 && _arrangement == RectifierArrangement.CentreTap && _path.Inductance > 0 && !EmfIsOff
            && -sign * _path.Peak * Math.Sin(_path.Omega * t) > _path.Drop + v + 1e-12 * _path.Peak
            ? TransientEvent.OtherBegins : TransientEvent.None;
    }

    private bool Rest<TWatch>(double until, ref TWatch watch)
        where TWatch : struct, ITransientWatch, allows ref struct
    {
        var rest = Resting;
        var (low, at) = (Time, until);
        while (low < until)
        {
            var high = Math.Min(until, low + _period / StepsPerPeriod);
            if (Wakes(rest, high))
            {
                for (var i = 0; i < 60 && high - low > 1e-13 * _period; i++)
                {
                    var middle = (low + high) / 2;
                    (low, high) = Wakes(rest, middle) ? (low, middle) : (middle, high);
                }

                at = high;
                break;
            }

            low = high;
        }

        var from = Time;
        var v = rest.Terminal(at, out _);
        if (!(v >= 0))
        {
            v = 0;
        }

        (U, Time) = (rest.Ideal(Math.Max(v, 1e-12)), at);
        if (_above && v < _load.Threshold)
        {
            _above = false;
        }

        return watch.Rests(rest, from, at);
    }

    private readonly bool Wakes(in BlockedStretch rest, double t)
    {
        var v = rest.Terminal(t, out _);
        return !(v >= 0) || (_above && v < _load.Threshold) || Begins(rest, t) != 0;
    }
}

/// <summary>What ends a stretch.</summary>
internal enum TransientEvent
{
    None,

    /// <summary>The current of the positive half, or the only one, has come to nothing.</summary>
    PositiveEnds,
    NegativeEnds,

    /// <summary>The other half of a centre tap takes over beside the first.</summary>
    OtherBegins,

    /// <summary>The bus has crossed the voltage at which the load changes its kind.</summary>
    LoadChanges,
}
