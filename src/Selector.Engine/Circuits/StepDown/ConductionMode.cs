namespace Selector.Engine.Circuits.StepDown;

/// <summary>Whether the coil current rests at zero for part of each period.</summary>
public enum ConductionMode
{
    /// <summary>It does not, or for at most 0.5 % of the period.</summary>
    Continuous,

    /// <summary>It does, for more than 0.5 % of the period.</summary>
    Discontinuous,
}
