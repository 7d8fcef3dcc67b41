namespace Selector.Engine.Circuits.Mains;

/// <summary>How the secondary reaches the reservoir.</summary>
public enum RectifierArrangement
{
    /// <summary>One winding, four diodes, two in the path.</summary>
    Bridge,

    /// <summary>Two halves of opposite phase, each with its own resistance and leakage, one diode each.</summary>
    CentreTap,

    /// <summary>One winding, one diode.</summary>
    HalfWave,
}

/// <summary>What the bus feeds.</summary>
public enum LoadKind
{
    /// <summary>Constant current, A.</summary>
    Current,

    /// <summary>Resistance, ohm.</summary>
    Resistance,

    /// <summary>Constant power, W, as a switching regulator draws it.</summary>
    Power,
}

/// <summary>
/// A rectifier with capacitor input, all in SI units: sine emf behind winding resistance and leakage; diodes of threshold and
/// slope; reservoir with ESR; load at the reservoir's terminals.
/// </summary>
/// <param name="Arrangement">Bridge, centre tap or half wave.</param>
/// <param name="Frequency">Of the mains, Hz; 1e-3 to 1e6.</param>
/// <param name="SecondaryRms">Emf of one winding (of one half for the centre tap), V; 1e-3 to 1e6.</param>
/// <param name="WindingResistance">Of one winding or half, ohm; 0 to 1e6.</param>
/// <param name="Leakage">Of one winding or half, H; 0 (absent) to 1e3.</param>
/// <param name="DiodeThreshold">Of one diode, V; 0 to 1e3.</param>
/// <param name="DiodeSlope">Of one diode, ohm; 0 to 1e6.</param>
/// <param name="Capacitance">F; 1e-12 to 1e3.</param>
/// <param name="Esr">Ohm; 0 to 1e6. Resistance in the charging path must not be nothing at all.</param>
/// <param name="LoadKind">Meaning of <paramref name="Load"/>.</param>
/// <param name="Load">A or W, 0 to 1e9; or ohm, 1e-6 to 1e12.</param>
/// <param name="BlockingConductance">Of a blocking diode, S, 0 to 1e-3: only its loss is counted, its current is too small to matter.</param>
public readonly record struct RectifierCase(
    RectifierArrangement Arrangement,
    double Frequency,
    double SecondaryRms,
    double WindingResistance,
    double Leakage,
    double DiodeThreshold,
    double DiodeSlope,
    double Capacitance,
    double Esr,
    LoadKind LoadKind,
    double Load,
    double BlockingConductance = 0)
{
    internal int DiodesInPath => Arrangement == RectifierArrangement.Bridge ? 2 : 1;

    internal bool IsInRange =>
        Within(Frequency, 1e-3, 1e6) && Within(SecondaryRms, 1e-3, 1e6) && Within(WindingResistance, 0, 1e6)
        && Within(Leakage, 0, 1e3) && Within(DiodeThreshold, 0, 1e3) && Within(DiodeSlope, 0, 1e6)
        && Within(Capacitance, 1e-12, 1e3) && Within(Esr, 0, 1e6)
        && Within(BlockingConductance, 0, 1e-3)
        && WindingResistance + DiodeSlope + Esr >= 1e-9
        && (LoadKind == LoadKind.Resistance ? Within(Load, 1e-6, 1e12) : Within(Load, 0, 1e9));

    private static bool Within(double value, double low, double high) => value >= low && value <= high;
}
