using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Mains.Exponential;

namespace Selector.Cli.Compute;

/// <summary>Rectifier with capacitor input, reference family F1, with piecewise-linear or exponential diodes.</summary>
internal sealed class RectifierKind : ICaseKind
{
    private static readonly ImmutableArray<(string Column, Func<RectifierSolution, double> Value)> Figures =
    [
        ("vdc_mean_v", s => s.BusMean),
        ("vbus_max_v", s => s.BusMax),
        ("vbus_min_v", s => s.BusMin),
        ("ripple_pp_v", s => s.BusRipplePeakToPeak),
        ("ripple_rms_v", s => s.BusRippleRms),
        ("i_load_mean_a", s => s.LoadMean),
        ("i_diode_peak_a", s => s.DiodePeak),
        ("i_diode_avg_a", s => s.DiodeAverage),
        ("i_diode_rms_a", s => s.DiodeRms),
        ("piv_diode_v", s => s.DiodeReversePeak),
        ("i_sec_rms_a", s => s.SecondaryRms),
        ("i_cap_rms_a", s => s.CapacitorRms),
        ("i_cap_fund_rms_a", s => s.CapacitorFundamentalRms),
        ("conduction_frac_half_cycle", s => s.ConductionFraction),
        ("p_source_w", s => s.SourcePower),
        ("va_source_va", s => s.SourceApparent),
        ("pf_source", s => s.PowerFactor),
        ("p_load_w", s => s.LoadPower),
        ("p_rw_total_w", s => s.WindingLoss),
        ("p_diode_each_w", s => s.DiodeLoss),
        ("p_esr_w", s => s.EsrLoss),
    ];

    /// <summary>The reference's diodes have 1 nS in parallel; at high voltage its loss shows.</summary>
    private const double ReferenceConductance = 1e-9;

    /// <summary>The reference's exponential diodes are at 27 °C, its leakage has 2 kΩ across it.</summary>
    private const double ReferenceTemperature = 27;
    private const double ReferenceDamping = 2000;

    public string Name => "rectifier";

    public ImmutableArray<string> Computed { get; } = ["collapses", .. Figures.Select(f => f.Column)];

    public ImmutableArray<string> Solve(CaseRow row, CancellationToken cancel)
    {
        RectifierSolution s;
        var status = row.Word("diode_model", ("", false), ("pwl", false), ("shockley", true))
            ? ExponentialSolver.Solve(Exponential(row), Budget.Until(cancel), out s)
            : RectifierSolver.Solve(Circuit(row), Budget.Until(cancel), out s);
        if (status == SolveStatus.NoOperatingPoint)
        {
            return ["1", .. Figures.Select(_ => "")];
        }

        CaseRow.Check(status);
        return ["0", .. Figures.Select(f => CaseRow.Say(f.Value(s)))];
    }

    private static ExponentialCase Exponential(CaseRow row) => new(
        Circuit(row), new ExponentialDiode(row.Number("d_is_a"), row.Number("d_n"), row.Number("d_rs_ohm", 0), ReferenceTemperature), ReferenceDamping);

    internal static RectifierCase Circuit(CaseRow row) =>
        Circuit(row, row.Word("load_type", ("ci", LoadKind.Current), ("cr", LoadKind.Resistance), ("cp", LoadKind.Power)));

    internal static RectifierCase Circuit(CaseRow row, LoadKind kind)
    {
        var arrangement = row.Word(
            "arrangement", ("bridge", RectifierArrangement.Bridge), ("centretap", RectifierArrangement.CentreTap), ("halfwave", RectifierArrangement.HalfWave));
        var load = kind switch
        {
            LoadKind.Current => row.Number("load_i_a"),
            LoadKind.Resistance => row.Number("load_r_ohm"),
            _ => row.Number("load_p_w"),
        };
        return new RectifierCase(
            arrangement, row.Number("f_line_hz"), row.Number("v_sec_rms_v"), row.Number("rw_ohm", 0), row.Number("lk_henry", 0),
            row.Number("vf0_v", 0), row.Number("rd_ohm", 0), row.Number("c_farad"), row.Number("esr_ohm", 0), kind, load, ReferenceConductance);
    }
}
