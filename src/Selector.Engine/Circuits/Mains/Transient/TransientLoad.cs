namespace Selector.Engine.Circuits.Mains.Transient;

/// <summary>
/// The load from an empty reservoir on: below a voltage it is a resistance, so that nothing is drawn from nothing; above it what the
/// case says.
/// </summary>
internal readonly struct TransientLoad
{
    private readonly ChargingPath _above;
    private readonly ChargingPath _below;

    /// <param name="path">With the case's load.</param>
    /// <param name="from">V; for a power at least the voltage at which a collapse is sure, for a resistance without meaning.</param>
    public TransientLoad(in ChargingPath path, double from)
    {
        Threshold = path.Kind == LoadKind.Resistance || path.Load <= 0 ? double.NegativeInfinity
            : path.Kind == LoadKind.Power ? path.Collapsed
            : Math.Max(from, 1e-6 * path.Peak);
        _above = path;
        _below = path.Kind == LoadKind.Resistance || path.Load <= 0 ? path : path with
        {
            Kind = LoadKind.Resistance,
            Load = path.Kind == LoadKind.Power ? Threshold * Threshold / path.Load : Threshold / path.Load,
        };
    }

    public double Threshold { get; }

    public ChargingPath At(bool above) => above ? _above : _below;
}
