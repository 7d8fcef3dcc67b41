using System.Collections.Immutable;
using Selector.Engine.Corners;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;

namespace Selector.Engine.Circuits.Reservoir;

/// <summary>What an electrolytic brings into any stage that holds one: its axes, and its values at a condition.</summary>
public static class ReservoirCapacitor
{
    private static readonly double AgedCapacitance = Aged(CapacitorFamily.Capacitance);
    private static readonly double AgedEsr = Aged(CapacitorFamily.EsrLow);

    public static string CapacitanceAxis(string position) => $"{position}.capacitance";

    public static string EsrAxis(string position) => $"{position}.esr";

    /// <summary>Capacitance from aged and low to new and high; ESR from new to aged.</summary>
    public static ImmutableArray<AxisSpec> Axes(string position) =>
    [
        new(CapacitanceAxis(position), new(0, 1), 0.5, v => v <= 0 ? $"{position} low and aged" : v >= 1 ? $"{position} high and new" : ""),
        new(EsrAxis(position), new(0, 1), 0.5, v => v <= 0 ? $"{position} ESR low" : v >= 1 ? $"{position} ESR aged" : "") { Probes = 0 },
    ];

    /// <summary>Capacitance at a place of its axis.</summary>
    /// <param name="nominal">F.</param>
    /// <param name="tolerance">Symmetric share.</param>
    /// <param name="place">0 for low and aged, 1 for high and new.</param>
    public static double Capacitance(double nominal, double tolerance, double place) =>
        nominal * new Interval((1 - tolerance) * AgedCapacitance, 1 + tolerance).At(place);

    /// <summary>ESR at a place of its axis, for either column.</summary>
    /// <param name="greatest">As the data sheet limits it, ohm.</param>
    /// <param name="place">0 for new and warm, 1 for aged.</param>
    public static double Esr(double greatest, double place) =>
        greatest * new Interval(CapacitorFamily.LeastOverGreatestEsr, AgedEsr).At(place);

    /// <summary>The same at a temperature.</summary>
    /// <param name="greatest">As the data sheet limits it, ohm.</param>
    /// <param name="place">0 for new, 1 for aged.</param>
    /// <param name="cold">Factor at -10 °C.</param>
    /// <param name="temperature">°C.</param>
    public static double Esr(double greatest, double place, double cold, double temperature) =>
        Esr(greatest, place) * ColdEsr.Factor(cold, temperature);

    /// <summary>The rating's multiplier table must reach down to a frequency; it is never read below its lowest point.</summary>
    /// <param name="position">Designator.</param>
    /// <param name="key">The column that a data sheet would have to give.</param>
    /// <param name="lowest">Lowest frequency at which current flows, Hz.</param>
    public static Need RippleTable(string position, string key, double lowest) => new(position, key, "the rating does not reach down to that frequency")
    {
        Lacking = part => double.IsNaN(FrequencyMultiplier.At([.. FrequencyMultiplier.Keys.Select(k => part[k])], lowest)),
    };

    private static double Aged(string key) => CapacitorFamily.Spec.Ageing.Single(d => d.Key == key).Factor;
}
