namespace Selector.Engine.Circuits.StepDown;

/// <summary>A 3 x 3 matrix by rows, acting on <see cref="StateVector"/>.</summary>
internal readonly record struct StateMatrix(StateVector Row1, StateVector Row2, StateVector Row3)
{
    public static StateMatrix Identity { get; } = new(new(1, 0, 0), new(0, 1, 0), new(0, 0, 1));

    public static StateMatrix operator +(in StateMatrix a, in StateMatrix b) =>
        new(a.Row1 + b.Row1, a.Row2 + b.Row2, a.Row3 + b.Row3);

    public static StateMatrix operator -(in StateMatrix a, in StateMatrix b) =>
        new(a.Row1 - b.Row1, a.Row2 - b.Row2, a.Row3 - b.Row3);

    public static StateMatrix operator *(double factor, in StateMatrix a) =>
        new(factor * a.Row1, factor * a.Row2, factor * a.Row3);

    public static StateVector operator *(in StateMatrix a, in StateVector x) =>
        new(a.Row1.Dot(x), a.Row2.Dot(x), a.Row3.Dot(x));

    public static StateMatrix operator *(in StateMatrix a, in StateMatrix b) =>
        new(Combine(a.Row1, b), Combine(a.Row2, b), Combine(a.Row3, b));

    /// <summary>
    /// The fixed point x = this x + <paramref name="offset"/>, by elimination with row exchange. Not finite if there is none or
    /// more than one.
    /// </summary>
    public StateVector FixedPoint(in StateVector offset)
    {
        var a = new StateVector(1 - Row1.Coil, -Row1.Capacitor, -Row1.Terminal);
        var b = new StateVector(-Row2.Coil, 1 - Row2.Capacitor, -Row2.Terminal);
        var c = new StateVector(-Row3.Coil, -Row3.Capacitor, 1 - Row3.Terminal);
        var (ra, rb, rc) = (offset.Coil, offset.Capacitor, offset.Terminal);

        if (Math.Abs(b.Coil) > Math.Abs(a.Coil))
        {
            (a, b, ra, rb) = (b, a, rb, ra);
        }

        if (Math.Abs(c.Coil) > Math.Abs(a.Coil))
        {
            (a, c, ra, rc) = (c, a, rc, ra);
        }

        Eliminate(a, ra, a.Coil, b.Coil, ref b, ref rb);
        Eliminate(a, ra, a.Coil, c.Coil, ref c, ref rc);
        if (Math.Abs(c.Capacitor) > Math.Abs(b.Capacitor))
        {
            (b, c, rb, rc) = (c, b, rc, rb);
        }

        Eliminate(b, rb, b.Capacitor, c.Capacitor, ref c, ref rc);
        var terminal = rc / c.Terminal;
        var capacitor = (rb - b.Terminal * terminal) / b.Capacitor;
        return new((ra - a.Capacitor * capacitor - a.Terminal * terminal) / a.Coil, capacitor, terminal);
    }

    private static void Eliminate(
        in StateVector pivot, double pivotRight, double pivotLead, double lead, ref StateVector row, ref double right)
    {
        var factor = lead / pivotLead;
        row -= factor * pivot;
        right -= factor * pivotRight;
    }

    private static StateVector Combine(in StateVector row, in StateMatrix b) =>
        row.Coil * b.Row1 + row.Capacitor * b.Row2 + row.Terminal * b.Row3;
}
