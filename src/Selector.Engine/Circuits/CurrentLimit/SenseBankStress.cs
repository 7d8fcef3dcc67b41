namespace Selector.Engine.Circuits.CurrentLimit;

/// <summary>Worst cases of equal resistors in parallel within their tolerance, SI units. Each figure has its own worst corner.</summary>
public struct SenseBankStress
{
    /// <summary>Power in each resistor with all at nominal, W.</summary>
    public double OneNominalPower;

    /// <summary>Greatest power in any single resistor, W.</summary>
    public double OneWorstPower;

    /// <summary>Greatest power in the whole bank, W.</summary>
    public double TotalWorstPower;

    /// <summary>Least and greatest resistance of the bank, ohm.</summary>
    public double ParallelMinimum, ParallelMaximum;

    /// <summary>Current of the single resistor in the corner of <see cref="OneWorstPower"/>, A.</summary>
    public double OneWorstPowerCurrent;

    /// <summary>Greatest current in any single resistor, in whichever corner, A.</summary>
    public double OneGreatestCurrent;
}
