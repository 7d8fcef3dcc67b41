namespace Selector.Engine.Circuits.StepDown;

/// <summary>What draws the output current of the converter.</summary>
public enum OutputLoad
{
    /// <summary>A constant current, in amperes; zero is legal.</summary>
    Current,

    /// <summary>A resistance, in ohms, greater than zero.</summary>
    Resistance,
}
