namespace Selector.Engine.Circuits;

/// <summary>Resistance of copper windings over temperature.</summary>
public static class Copper
{
    /// <summary>Resistance is proportional to this plus the temperature in °C: 234.5, as the resistance method of EN 61558-1 has it (second-hand).</summary>
    private const double Zero = 234.5;

    /// <summary>Resistance at a temperature, from that at another; ohm and °C.</summary>
    public static double At(double resistance, double measuredAt, double temperature) =>
        resistance * (Zero + temperature) / (Zero + measuredAt);
}
