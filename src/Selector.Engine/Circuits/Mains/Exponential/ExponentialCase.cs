namespace Selector.Engine.Circuits.Mains.Exponential;

/// <summary>A rectifier with exponential diodes.</summary>
/// <param name="Circuit">Everything but the diodes; its threshold and slope are not read.</param>
/// <param name="Diode">Each of them.</param>
/// <param name="Damping">Resistance across the leakage, ohm; infinite for none.</param>
public readonly record struct ExponentialCase(RectifierCase Circuit, ExponentialDiode Diode, double Damping);
