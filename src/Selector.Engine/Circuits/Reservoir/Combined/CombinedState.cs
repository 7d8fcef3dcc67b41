namespace Selector.Engine.Circuits.Reservoir.Combined;

/// <summary>Reservoir voltage, charging current, coil current, output capacitor voltage.</summary>
internal struct CombinedState
{
    public double Bus, Charge, Coil, Output;

    public static CombinedState operator +(in CombinedState a, in CombinedState b) =>
        new() { Bus = a.Bus + b.Bus, Charge = a.Charge + b.Charge, Coil = a.Coil + b.Coil, Output = a.Output + b.Output };

    public static CombinedState operator *(double k, in CombinedState a) =>
        new() { Bus = k * a.Bus, Charge = k * a.Charge, Coil = k * a.Coil, Output = k * a.Output };
}

/// <summary>Which way the coil current goes.</summary>
internal enum CoilPath
{
    Switch,
    Diode,
    Rests,
}
