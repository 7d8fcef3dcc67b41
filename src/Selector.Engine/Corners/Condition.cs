using Selector.Engine.Circuits;

namespace Selector.Engine.Corners;

/// <summary>One combination of worst-case conditions with what the solver found there.</summary>
/// <param name="Axes">A value for every axis.</param>
/// <param name="Status">Whether there was a solution.</param>
/// <param name="Links">All links; meaningless unless solved.</param>
/// <param name="Stresses">All stresses; meaningless unless solved.</param>
public sealed record Condition(double[] Axes, SolveStatus Status, double[] Links, double[] Stresses)
{
    public bool Solved => Status == SolveStatus.Solved;
}
