namespace Selector.Engine.Circuits.Mains;

/// <summary>Keys of the mains fields, their words and axes: the vocabulary of everything that works on the mains.</summary>
public static class MainsFields
{
    public const string Voltage = "mains.voltage";
    public const string Low = "mains.low";
    public const string High = "mains.high";
    public const string Frequency = "mains.frequency";
    public const string FrequencyTolerance = "mains.frequency-tolerance";
    public const string Impedance = "mains.impedance";
    public const string FrontEnd = "front-end";
    public const string BridgePart = "bridge";
    public const string BridgeDiodes = "bridge-diodes";
    public const string CentreTap = "centre-tap";
    public const string HalfWave = "half-wave";
    public const string MainsAxis = "mains";
    public const string FrequencyAxis = "frequency";
    public const string WindingAxis = "T1.winding";
}
