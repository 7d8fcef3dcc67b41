namespace Selector.Engine.Circuits;

/// <summary>The bound that every solver works within: a greatest number of iterations and the caller's wish to go on.</summary>
/// <param name="Iterations">Greatest number of outer iterations, at least 1.</param>
/// <param name="Cancel">Checked once per outer iteration.</param>
public readonly record struct Budget(int Iterations, CancellationToken Cancel)
{
    /// <summary>200 iterations: ten times what the slowest case of the reference tables needs.</summary>
    public static Budget Standard { get; } = new(200, CancellationToken.None);

    /// <summary>The standard bound, cancelled by <paramref name="cancel"/>.</summary>
    public static Budget Until(CancellationToken cancel) => new(200, cancel);
}
