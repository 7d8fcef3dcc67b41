namespace Selector.Engine.Supplies;

/// <summary>
/// Broyden's method for the loops among stages, x = G(x). What it learns of the loops' gains is kept from condition to condition:
/// neighbouring conditions have nearly the same, so that the second step usually settles. A step that is not trusted falls back to
/// plain substitution. C. G. Broyden, Math. Comp. 19 (1965), from memory.
/// </summary>
/// <param name="count">Links that form the loops.</param>
internal sealed class LoopSteps(int count)
{
    /// <summary>A step that reaches further than this multiple of the plain one is not trusted.</summary>
    private const double Furthest = 5;

    private readonly double[] _inverse = Identity(count);
    private readonly double[] _residual = new double[count];
    private readonly double[] _step = new double[count];
    private readonly double[] _change = new double[count];
    private readonly double[] _row = new double[count];
    private bool _stepped;

    /// <summary>Begins a condition: the last residual belongs to another.</summary>
    public void Begin() => _stepped = false;

    /// <summary>Forgets what was learnt.</summary>
    public void Forget()
    {
        Identity(count).CopyTo(_inverse, 0);
        _stepped = false;
    }

    /// <summary>The next step from the residual G(x) - x, both relative to the size of each link.</summary>
    public ReadOnlySpan<double> Next(ReadOnlySpan<double> residual)
    {
        if (_stepped)
        {
            Learn(residual);
        }

        residual.CopyTo(_residual);
        double longest = 0, plain = 0;
        for (var i = 0; i < count; i++)
        {
            var sum = 0.0;
            for (var k = 0; k < count; k++)
            {
                sum += _inverse[i * count + k] * residual[k];
            }

            _step[i] = sum;
            longest = Math.Max(longest, Math.Abs(sum));
            plain = Math.Max(plain, Math.Abs(residual[i]));
        }

        _stepped = true;
        if (!(longest <= Furthest * plain))
        {
            Identity(count).CopyTo(_inverse, 0);
            residual.CopyTo(_step);
        }

        return _step;
    }

    /// <summary>
    /// The inverse of the loops' I - G' takes the step that was gone: H += (s - H y)(s' H) / (s' H y), where y is by how much the
    /// residual fell.
    /// </summary>
    private void Learn(ReadOnlySpan<double> residual)
    {
        var denominator = 0.0;
        Array.Clear(_row);
        for (var i = 0; i < count; i++)
        {
            var sum = 0.0;
            for (var k = 0; k < count; k++)
            {
                sum += _inverse[i * count + k] * (_residual[k] - residual[k]);
                _row[k] += _step[i] * _inverse[i * count + k];
            }

            _change[i] = _step[i] - sum;
            denominator += _step[i] * sum;
        }

        var size = 0.0;
        foreach (var s in _step)
        {
            size += s * s;
        }

        if (!(Math.Abs(denominator) > 0.05 * size))
        {
            return;
        }

        for (var i = 0; i < count; i++)
        {
            for (var k = 0; k < count; k++)
            {
                _inverse[i * count + k] += _change[i] * _row[k] / denominator;
            }
        }
    }

    private static double[] Identity(int count)
    {
        var identity = new double[count * count];
        for (var i = 0; i < count; i++)
        {
            identity[i * count + i] = 1;
        }

        return identity;
    }
}
