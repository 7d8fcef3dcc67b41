namespace Selector.Engine.Circuits.StepDown;

/// <summary>The state at the switching instants of one period that repeats itself, and the durations between them, s.</summary>
internal struct PeriodicOrbit
{
    public StateVector AtTurnOn, AtTurnOff, AtDiodeEnd;

    public double OnTime, DiodeTime, IdleTime;
}
