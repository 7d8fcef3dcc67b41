using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains.SwitchOn;

namespace Selector.Cli.Compute;

/// <summary>Switch-on of a rectifier with an empty reservoir, reference family F2.</summary>
internal sealed class InrushKind : ICaseKind
{
    private const double Degree = Math.PI / 180;

    private static readonly ImmutableArray<(string Column, Func<SwitchOnSolution, double> Value)> Figures =
    [
        ("phase_deg", s => s.Phase / Degree),
        ("i_first_peak_a", s => s.FirstPeak),
        ("t_first_peak_s", s => s.FirstPeakAt),
        ("i2t_first_halfcycle_a2s", s => s.FirstHalfIntegral),
        ("i2t_to_first_zero_a2s", s => s.FirstPulseIntegral),
        ("t_first_zero_s", s => s.FirstEnd),
        ("vc_at_first_zero_v", s => s.VoltageAtFirstEnd),
        ("cycles_to_95pct", s => s.CyclesTo95),
        ("vdc_steady_v", s => s.Steady),
        ("i_peak_any_a", s => s.GreatestPeak),
    ];

    public string Name => "inrush";

    public ImmutableArray<string> Computed { get; } = [.. Figures.Select(f => f.Column)];

    public ImmutableArray<string> Solve(CaseRow row, CancellationToken cancel)
    {
        var budget = Budget.Until(cancel);
        var c = new SwitchOnCase(RectifierKind.Circuit(row), 0, row.Number("load_ramp_v", 0));
        if (row.Text("phase_kind") == "worst")
        {
            CaseRow.Check(SwitchOnSolver.WorstPhase(c, budget, out var phase));
            c = c with { Phase = phase };
        }
        else
        {
            c = c with { Phase = row.Number("phase_deg") * Degree };
        }

        CaseRow.Check(SwitchOnSolver.Solve(c, [], budget, out var s));
        return [.. Figures.Select(f => CaseRow.Say(f.Value(s)))];
    }
}
