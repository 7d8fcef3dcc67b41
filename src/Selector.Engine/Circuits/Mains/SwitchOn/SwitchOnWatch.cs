using Selector.Engine.Circuits.Mains.Transient;

namespace Selector.Engine.Circuits.Mains.SwitchOn;

/// <summary>Follows the pulses after switch-on until the reservoir is charged and the pulses grow no more.</summary>
internal ref struct SwitchOnWatch(double start, double period, double charged, Span<SwitchOnPulse> train) : ITransientWatch
{
    private const double Nothing = 1e-9;

    private readonly Span<SwitchOnPulse> _train = train;
    private TransientPiece _lastOfFirst;
    private double _lastFrom, _lastTo;
    private double _peak, _integral;
    private bool _flows;

    public double FirstPeak, FirstPeakAt, FirstIntegral, FirstHalfIntegral, GreatestPeak, ChargedAt = double.NaN;

    public int Pulses { get; private set; }

    private readonly bool IsFirst => Pulses == 0;

    public bool Conducts(in TransientPiece piece, double from, double to)
    {
        var (at, peak) = PulseSums.Peak(piece, from, to, period);
        var integral = PulseSums.Square(piece, from, to, period);
        var half = start + period / 2;
        FirstHalfIntegral += to <= half ? integral : from < half ? PulseSums.Square(piece, from, half, period) : 0;
        _integral += integral;
        if (peak > _peak)
        {
            _peak = peak;
            FirstPeakAt = IsFirst ? at : FirstPeakAt;
        }

        GreatestPeak = Math.Max(GreatestPeak, peak);
        _flows = true;
        if (IsFirst)
        {
            (_lastOfFirst, _lastFrom, _lastTo) = (piece, from, to);
        }

        if (double.IsNaN(ChargedAt))
        {
            FindCharged(piece, from, to);
        }

        return piece.Total(to) > Nothing * GreatestPeak || EndPulse(to);
    }

    public bool Rests(in BlockedStretch rest, double from, double to) => !_flows || EndPulse(from);

    /// <summary>When the first pulse falls below a share of the largest one of all, and what the capacitor then holds.</summary>
    public readonly void FirstEnd(double share, out double at, out double voltage)
    {
        var level = share * GreatestPeak;
        var (low, high) = (_lastFrom, _lastTo);
        if (FirstPeakAt > low && FirstPeakAt < high)
        {
            low = FirstPeakAt;
        }

        for (var i = 0; i < 80 && high - low > 1e-13 * period; i++)
        {
            var middle = (low + high) / 2;
            (low, high) = _lastOfFirst.Total(middle) > level ? (middle, high) : (low, middle);
        }

        at = (low + high) / 2;
        _lastOfFirst.At(at, out voltage, out _);
    }

    private bool EndPulse(double at)
    {
        if (!_flows)
        {
            return true;
        }

        if (Pulses < _train.Length)
        {
            _train[Pulses] = new SwitchOnPulse(_peak, _integral);
        }

        if (IsFirst)
        {
            (FirstPeak, FirstIntegral) = (_peak, _integral);
        }

        Pulses++;
        var falls = _peak < GreatestPeak;
        (_peak, _integral, _flows) = (0, 0, false);
        return double.IsNaN(ChargedAt) || at < start + period / 2 || !falls;
    }

    private void FindCharged(in TransientPiece piece, double from, double to)
    {
        piece.At(to, out var u, out _);
        if (!(u >= charged))
        {
            return;
        }

        var (low, high) = (from, to);
        for (var i = 0; i < 60 && high - low > 1e-13 * period; i++)
        {
            var middle = (low + high) / 2;
            piece.At(middle, out u, out _);
            (low, high) = u >= charged ? (low, middle) : (middle, high);
        }

        ChargedAt = high;
    }
}

/// <summary>Only the largest current.</summary>
internal struct PeakWatch(double period) : ITransientWatch
{
    public double Peak;

    public bool Conducts(in TransientPiece piece, double from, double to)
    {
        Peak = Math.Max(Peak, PulseSums.Peak(piece, from, to, period).Peak);
        return true;
    }

    public readonly bool Rests(in BlockedStretch rest, double from, double to) => true;
}
