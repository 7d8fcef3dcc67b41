namespace Selector.Engine.Circuits.Mains;

/// <summary>
/// One cycle of the rectifier from the start of a pulse to the start of the next: the period map whose fixed point is the steady
/// state, with the pieces of the pulse kept for its figures.
/// </summary>
internal ref struct PulseTrain
{
    public const int MostPieces = 192;

    /// <summary>Pieces of a pulse under a constant power; each straightens the load about its own middle.</summary>
    private const int PiecesOfPower = 6;
    private const int MostPiecesOfPower = 80;

    /// <summary>Way of the bus over one piece, as a share of the bus, that the straightened load may go.</summary>
    private const double WidestSwing = 0.04;
    private const int Probes = 24;
    private const int MostSteps = 60;

    private readonly ChargingPath _path;
    private readonly Span<ChargingPiece> _pieces;

    public PulseTrain(in ChargingPath path, Span<ChargingPiece> pieces)
    {
        _path = path;
        _pieces = pieces;
        Length = path.Cycle * 0.4;
    }

    public int Count { get; private set; }

    public double Start { get; private set; }

    public double End { get; private set; }

    /// <summary>Voltage on the ideal capacitor at the end of the pulse.</summary>
    public double EndVoltage { get; private set; }

    /// <summary>Start of the next pulse on its own half-wave, and the capacitor's voltage there.</summary>
    public double NextStart { get; private set; }

    public double NextVoltage { get; private set; }

    /// <summary>The next half-wave takes over before the pulse has ended.</summary>
    public bool RunsOn { get; private set; }

    /// <summary>Length of the last pulse, s: where the next search for its end begins.</summary>
    public double Length { get; private set; }

    /// <summary>Where a pulse begins by itself at a capacitor voltage; NaN when the emf never reaches it.</summary>
    public readonly double NaturalStart(double u)
    {
        var sine = (_path.Drop + _path.TerminalAtRest(u)) / _path.Peak;
        return sine is >= 0 and < 1 ? Math.Asin(sine) / _path.Omega : double.NaN;
    }

    /// <summary>Runs one cycle. False when the bus collapses or no pulse can flow.</summary>
    public bool Run(double start, double u)
    {
        Start = start;
        Count = 0;
        var flowed = _path.Kind == LoadKind.Power ? PulseOfPower(u) : PulseOfLinear(u);
        if (!flowed)
        {
            return false;
        }

        Length = End - Start;
        return Rest();
    }

    private bool PulseOfLinear(double u)
    {
        var piece = new ChargingPiece(_path, LinearLoad.About(_path, 0), Start, double.PositiveInfinity, u, 0);
        var low = Start + Length * 0.93;
        var high = Start + Length * 1.07;
        if (!(piece.Current(low) > 0) || !(piece.Current(high) < 0))
        {
            (low, high) = (Start, Start);
            var step = _path.Cycle / Probes;
            for (var i = 1; i <= 3 * Probes; i++)
            {
                high = Start + i * step;
                if (piece.Current(high) < 0)
                {
                    break;
                }

                low = high;
            }

            if (low == Start)
            {
                // A pulse shorter than one probe: somewhere after the start the current is positive, if only just.
                low = Start + ShortestPulse(piece, high - Start);
            }
        }

        return Close(piece, low, high);
    }

    private static double ShortestPulse(in ChargingPiece piece, double within)
    {
        for (var share = 0.5; share > 1e-9; share /= 2)
        {
            if (piece.Current(piece.Start + share * within) > 0)
            {
                return share * within;
            }
        }

        return 0;
    }

    private bool PulseOfPower(double u)
    {
        var (t, j) = (Start, 0.0);
        var v = _path.TerminalAtRest(u);
        var (longest, shortest) = (Length / PiecesOfPower, Length / MostPiecesOfPower);
        var (step, slope, bend) = (longest / 8, double.NaN, 0.0);
        while (Count < MostPieces - 1)
        {
            if (!(v > _path.Collapsed))
            {
                return false;
            }

            if (double.IsNaN(slope))
            {
                slope = FirstSlope(t, shortest, u, j, v);
            }

            // A constant power is straight over a small way only: fast stretches are cut shorter, and so is the start.
            step = Math.Clamp(WidestSwing * v / Math.Abs(slope), shortest, Math.Max(shortest, Math.Min(longest, 2 * step)));
            var swing = (slope + bend * step / 2) * step;
            var piece = new ChargingPiece(_path, LinearLoad.About(_path, v + swing / 2, swing * swing / 12), t, t + step, u, j);
            piece.At(t + step, out var uEnd, out var jEnd);
            if (!double.IsFinite(uEnd + jEnd))
            {
                return false;
            }

            if (jEnd <= 0)
            {
                return Close(piece, t > Start ? t : t + ShortestPulse(piece, step), t + step);
            }

            _pieces[Count++] = piece;
            var end = piece.Terminal(uEnd, jEnd);
            var mean = (end - v) / step;
            bend = Count == 1 ? 0 : (mean - slope) * 2 / step;
            (t, u, j, v, slope) = (t + step, uEnd, jEnd, end, mean + (mean - slope));
        }

        return false;
    }

    /// <summary>Slope of the bus at the start of a pulse, V/s, by a short trial.</summary>
    private readonly double FirstSlope(double t, double step, double u, double j, double v)
    {
        var trial = new ChargingPiece(_path, LinearLoad.About(_path, v), t, t + step, u, j);
        trial.At(t + step, out var uEnd, out var jEnd);
        return (trial.Terminal(uEnd, jEnd) - v) / step;
    }

    /// <summary>Ends the pulse in a piece whose current is positive at low and negative at high.</summary>
    private bool Close(ChargingPiece piece, double low, double high)
    {
        if (!(high > low))
        {
            return false;
        }

        var (jLow, jHigh) = (piece.Current(low), piece.Current(high));
        for (var i = 0; i < MostSteps && high - low > 1e-11 * _path.Cycle; i++)
        {
            // The false position, with the kept end's value halved so that both ends close in.
            var t = high - jHigh * (high - low) / (jHigh - jLow);
            if (!(t > low && t < high))
            {
                t = (low + high) / 2;
            }

            var j = piece.Current(t);
            if (j > 0)
            {
                (low, jLow, jHigh) = (t, j, jHigh / 2);
            }
            else
            {
                (high, jHigh, jLow) = (t, j, jLow / 2);
            }

            if (j == 0)
            {
                low = high = t;
            }
        }

        End = (low + high) / 2;
        piece.End = End;
        piece.At(End, out var u, out _);
        _pieces[Count++] = piece;
        EndVoltage = u;
        return double.IsFinite(u) && End > Start;
    }

    /// <summary>From the end of the pulse to where the next half-wave reaches the bus.</summary>
    private bool Rest()
    {
        var cycle = _path.Cycle;
        var rest = new BlockedStretch(_path, End, EndVoltage);
        var low = End;
        var first = _path.Drive(low - cycle) - _path.TerminalAtRest(EndVoltage);
        RunsOn = low - cycle > 0 && first >= 0;
        if (RunsOn)
        {
            (NextStart, NextVoltage) = (low - cycle, EndVoltage);
            return true;
        }

        var high = cycle + Math.PI / (2 * _path.Omega);
        var t = Math.Clamp(Start + cycle, low, high);
        for (var i = 0; i < MostSteps; i++)
        {
            var v = rest.Terminal(t, out var slope);
            var error = _path.Drive(t - cycle) - v;
            if (double.IsNaN(error) || error > 0)
            {
                high = t;
            }
            else
            {
                low = t;
            }

            var newton = t - error / (_path.Peak * _path.Omega * Math.Cos(_path.Omega * (t - cycle)) - slope);
            var next = newton > low && newton < high ? newton : (low + high) / 2;
            var moved = Math.Abs(next - t);
            t = next;
            if (moved <= 1e-8 * cycle)
            {
                break;
            }
        }

        var bus = rest.Terminal(t, out _);
        (NextStart, NextVoltage) = (t - cycle, rest.Ideal(bus));
        return double.IsFinite(NextVoltage) && (_path.Kind != LoadKind.Power || bus > _path.Collapsed);
    }
}
