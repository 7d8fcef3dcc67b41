using System.Collections.Immutable;
using Selector.Engine.Circuits.CurrentLimit;

namespace Selector.Cli.Compute;

/// <summary>Bank of equal resistors with tolerance, reference family F7.</summary>
internal sealed class BankKind : ICaseKind
{
    private static readonly ImmutableArray<(string Column, Func<SenseBankStress, double> Value)> Figures =
    [
        ("p_one_nominal_w", s => s.OneNominalPower),
        ("p_one_worst_w", s => s.OneWorstPower),
        ("p_total_worst_w", s => s.TotalWorstPower),
        ("r_parallel_min_ohm", s => s.ParallelMinimum),
        ("r_parallel_max_ohm", s => s.ParallelMaximum),
        ("i_one_worst_a", s => s.OneWorstPowerCurrent),
        ("i_one_max_a", s => s.OneGreatestCurrent),
    ];

    public string Name => "bank";

    public ImmutableArray<string> Computed { get; } = [.. Figures.Select(f => f.Column)];

    public ImmutableArray<string> Solve(CaseRow row, CancellationToken cancel)
    {
        var count = row.Number("n_parallel");
        if (count != Math.Floor(count) || count is < 1 or > 10_000)
        {
            throw new CaseFault("n_parallel: type a whole number from 1 to 10000.");
        }

        var (each, tolerance) = (row.Number("r_each_ohm"), row.Number("tol_frac"));
        var status = row.Word("drive", ("current", true), ("voltage", false))
            ? SenseBank.AtCurrent((int)count, each, tolerance, row.Number("i_total_a"), out var s)
            : SenseBank.AtVoltage((int)count, each, tolerance, row.Number("v_across_v"), out s);
        CaseRow.Check(status);
        return [.. Figures.Select(f => CaseRow.Say(f.Value(s)))];
    }
}
