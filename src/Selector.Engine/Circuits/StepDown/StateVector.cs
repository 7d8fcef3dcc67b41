namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// State of the power circuit: coil current (A), voltage on the ideal capacitor behind ESR and ESL (V) and, only where ESL and a
/// resistive load make it a state of its own, the terminal voltage (V); zero otherwise.
/// </summary>
internal readonly record struct StateVector(double Coil, double Capacitor, double Terminal)
{
    public static StateVector operator +(in StateVector a, in StateVector b) =>
        new(a.Coil + b.Coil, a.Capacitor + b.Capacitor, a.Terminal + b.Terminal);

    public static StateVector operator -(in StateVector a, in StateVector b) =>
        new(a.Coil - b.Coil, a.Capacitor - b.Capacitor, a.Terminal - b.Terminal);

    public static StateVector operator *(double factor, in StateVector a) =>
        new(factor * a.Coil, factor * a.Capacitor, factor * a.Terminal);

    public double Dot(in StateVector other) =>
        Coil * other.Coil + Capacitor * other.Capacitor + Terminal * other.Terminal;
}
