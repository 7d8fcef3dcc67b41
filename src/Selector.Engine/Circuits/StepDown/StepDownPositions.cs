using System.Collections.Immutable;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.StepDown;

/// <summary>Positions of the converter with their hand-book starting values, and what is left open.</summary>
internal static class StepDownPositions
{
    public const string U1 = "U1";
    public const string D5 = "D5";
    public const string L1 = "L1";
    public const string C2 = "C2";
    public const string C3 = "C3";

    private const double Frequency = 100e3;
    private const double RippleShare = 0.3;
    private const double TypicalDuty = 0.4;

    public static ImmutableArray<PositionSpec> List(RequirementValues r)
    {
        var (volts, amperes) = (r[CommonFields.OutputVoltage], r[CommonFields.LoadFull]);
        return
        [
            new(U1, "step-down regulator", RegulatorFamily.Id, 1, Ratings(
                (RegulatorFamily.Frequency, Frequency), (RegulatorFamily.Drop, 0), (RegulatorFamily.InputMin, 4.5), (RegulatorFamily.Resistance, 0.15 / Math.Max(1, amperes / 2)),
                (RegulatorFamily.LimitMax, 2 * amperes), (RegulatorFamily.OnTimeMin, 200e-9), (RegulatorFamily.Cooling, 35), (RegulatorFamily.CaseCooling, 3)))
            {
                StandInReason = "100 kHz, limit at twice the full load",
            },
            new(D5, "catch diode", DiodeFamily.Id, 1, Ratings(
                (RectifierRatings.Threshold, 0.4), (RectifierRatings.Slope, 0.1 / amperes), (RectifierRatings.Cooling, 30), (RectifierRatings.CaseCooling, 3)))
            {
                StandInReason = "0.5 V at full load",
            },
            new(L1, "coil", InductorFamily.Id, 1, Ratings(
                (InductorFamily.Inductance, volts * (1 - TypicalDuty) / (RippleShare * amperes * Frequency)),
                (InductorFamily.Resistance, 0.02 * volts / amperes)))
            {
                StandInReason = "ripple of 30 % of full load at 100 kHz",
            },
            new(C2, "output capacitor", CapacitorFamily.Id, 1, Ratings(
                (CapacitorFamily.Capacitance, 200e-6 * Math.Max(0.5, amperes)),
                (CapacitorFamily.EsrHigh, r[CommonFields.OutputRipple] / (RippleShare * amperes) / 4)))
            {
                StandInReason = "a quarter of the ripple allowed, by its ESR",
            },
            new(C3, "bypass at U1", FilmCapacitorFamily.Id, 1, Ratings((FilmCapacitorFamily.Capacitance, 1e-6), (FilmCapacitorFamily.Esr, 0.02)))
            {
                StandInReason = "1 µF",
            },
        ];
    }

    public static ImmutableArray<NotAssessed> OpenPoints { get; } =
    [
        new("R2", "feedback divider with R3: output error"),
    ];

    private static ImmutableDictionary<string, double> Ratings(params (string Key, double Value)[] ratings) =>
        ratings.ToImmutableDictionary(r => r.Key, r => r.Value, StringComparer.Ordinal);
}
