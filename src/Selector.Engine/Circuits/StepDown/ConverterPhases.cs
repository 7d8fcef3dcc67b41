namespace Selector.Engine.Circuits.StepDown;

/// <summary>The three linear circuits that a period runs through.</summary>
internal readonly struct ConverterPhases
{
    public readonly LinearPhase On, Diode, Idle;

    /// <summary>Voltage driving the coil and its series resistance while the switch is on, and while the diode conducts.</summary>
    public readonly double OnSource, OnResistance, DiodeSource, DiodeResistance;

    public ConverterPhases(in ConverterCase c)
    {
        OnSource = c.InputVoltage - c.SwitchDrop;
        OnResistance = c.SwitchResistance + c.CoilResistance;
        DiodeSource = -c.DiodeThreshold;
        DiodeResistance = c.DiodeSlope + c.CoilResistance;
        On = DrivenPhase.Of(c, OnSource, OnResistance);
        Diode = DrivenPhase.Of(c, DiodeSource, DiodeResistance);
        Idle = IdlePhase.Of(c);
    }
}
