namespace Selector.Engine.Supplies;

/// <summary>Names that several stages share: they are the vocabulary between them.</summary>
public static class CommonFields
{
    public const string Source = "source";
    public const string OutputVoltage = "output.voltage";
    public const string OutputLeast = "output.least";
    public const string OutputAdjust = "output.adjust";
    public const string Regulation = "regulation";
    public const string StepDown = "step-down";
    public const string Linear = "linear";
    public const string OutputRipple = "output.ripple";
    public const string LoadLeast = "load.least";
    public const string LoadFull = "load.full";
    public const string AmbientLow = "ambient.low";
    public const string AmbientHigh = "ambient.high";
    public const string Units = "build.units";
    public const string Spares = "build.spares";
    public const string LeastMargin = "margin.least";

    public const string AmbientAxis = "ambient";
    public const string LoadAxis = "load";
    public const string OutputAxis = "output";
    public const string ShortAxis = "short";
}

/// <summary>Links between stages.</summary>
public static class LinkNames
{
    /// <summary>Mean of the bus, V.</summary>
    public const string BusMean = "bus.mean";

    /// <summary>Greatest instantaneous bus voltage, V.</summary>
    public const string BusMax = "bus.max";

    /// <summary>Least instantaneous bus voltage, V.</summary>
    public const string BusMin = "bus.min";

    /// <summary>Current from the mains, A rms.</summary>
    public const string MainsCurrent = "mains.current";

    /// <summary>Current of the working winding, A rms.</summary>
    public const string SecondaryCurrent = "secondary.current";

    /// <summary>Mean current out of the reservoir, A.</summary>
    public const string BusCurrent = "bus.current";

    /// <summary>Power that the regulator takes from the bus, W.</summary>
    public const string RegulatorPower = "regulator.input-power";

    /// <summary>Mean current that the regulator takes from the bus, A.</summary>
    public const string RegulatorCurrent = "regulator.input-current";

    /// <summary>Current of the preload at the output terminals, A.</summary>
    public const string PreloadCurrent = "preload.current";

    /// <summary>Current of the bleeder across the reservoir, A.</summary>
    public const string BleederCurrent = "bleeder.current";

    /// <summary>Mean current from a DC source, A.</summary>
    public const string SourceCurrent = "source.current";

    /// <summary>Alternating part of the regulator's input current, A rms.</summary>
    public const string RegulatorRipple = "regulator.input-ripple";

    /// <summary>Its frequency, Hz.</summary>
    public const string RegulatorFrequency = "regulator.frequency";

    /// <summary>Mean current out of the regulator, A; in a short its short-circuit current.</summary>
    public const string OutputCurrent = "output.current";

    /// <summary>Resistance between regulator and output terminals, ohm.</summary>
    public const string SeriesResistance = "series.resistance";

    /// <summary>Loss in one part of a position, W.</summary>
    public static string Loss(string position) => $"loss.{position}";

    /// <summary>How fast the loss in one part of a position grows with its junction, W/K.</summary>
    public static string LossSlope(string position) => $"loss-slope.{position}";

    /// <summary>Junction or winding temperature of a position, °C.</summary>
    public static string Temperature(string position) => $"temperature.{position}";
}
