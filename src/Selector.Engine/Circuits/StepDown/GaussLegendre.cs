namespace Selector.Engine.Circuits.StepDown;

/// <summary>Eight-point Gauss-Legendre rule on the unit interval: exact for polynomials up to the fifteenth degree.</summary>
internal static class GaussLegendre
{
    public const int Points = 8;

    private static readonly double[] nodes =
    [
        0.019855071751231884, 0.10166676129318664, 0.2372337950418355, 0.4082826787521751,
        0.5917173212478249, 0.7627662049581645, 0.8983332387068134, 0.9801449282487681,
    ];

    private static readonly double[] weights =
    [
        0.05061426814518813, 0.11119051722668724, 0.15685332293894363, 0.18134189168918100,
        0.18134189168918100, 0.15685332293894363, 0.11119051722668724, 0.05061426814518813,
    ];

    public static ReadOnlySpan<double> Nodes => nodes;

    public static ReadOnlySpan<double> Weights => weights;
}
