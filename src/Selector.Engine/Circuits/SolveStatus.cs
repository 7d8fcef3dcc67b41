namespace Selector.Engine.Circuits;

/// <summary>How a solver ended. Anything but <see cref="Solved"/> means that its outputs must not be read.</summary>
public enum SolveStatus
{
    /// <summary>Converged; every output is finite.</summary>
    Solved,

    /// <summary>The circuit has no steady state at these inputs, for example more power asked than the source can give.</summary>
    NoOperatingPoint,

    /// <summary>An input is missing, not finite or outside the range that the model covers.</summary>
    BadInput,

    /// <summary>The bound on work was reached before the solution was.</summary>
    OutOfBudget,

    /// <summary>The caller no longer wants the answer.</summary>
    Cancelled,

    /// <summary>Losses grow faster with temperature than the cooling can carry away.</summary>
    ThermalRunaway,
}
