using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.CurrentLimit;

/// <summary>No resistor between regulator and terminals.</summary>
internal sealed class NoSenseModel : StageModel
{
    public NoSenseModel() => Write(new LinkSpec(LinkNames.SeriesResistance, Units.Ohm, 0));

    public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
    {
        links[0] = 0;
        return SolveStatus.Solved;
    }
}
