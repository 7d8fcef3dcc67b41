namespace Selector.Engine.Circuits.Inlet;

/// <summary>How much of its melting integral a fuse link may see as a pulse, by how often the pulse comes.</summary>
public static class PulseWithstand
{
    // Shares of the nominal melting I²t, ten seconds between pulses: a maker's general table (second-hand); another maker's own
    // figures differ, so that the table is generic only.
    private static readonly (double Pulses, double Share)[] Table = [(100, 0.48), (1_000, 0.38), (10_000, 0.29), (100_000, 0.22)];

    /// <summary>Share for a number of pulses: a straight line over its logarithm between the points, never more than the first, the last one beyond.</summary>
    public static double Share(double pulses)
    {
        for (var i = 1; i < Table.Length; i++)
        {
            if (pulses <= Table[i].Pulses)
            {
                var (from, to) = (Table[i - 1], Table[i]);
                var way = Math.Max(0, Math.Log(pulses / from.Pulses) / Math.Log(to.Pulses / from.Pulses));
                return from.Share + (to.Share - from.Share) * way;
            }
        }

        return Table[^1].Share;
    }
}
