using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Tests.Support;

/// <summary>Rows of a ledger by hand: no solver, only the arithmetic of the clause.</summary>
internal static class RowOf
{
    private const double Ambient = 45;

    public static readonly Clause Practice = new(
        "any", "", "any", new ClauseOperator.Factor(0.8), RatingBasis.Nominal, "general industrial practice", "none", Certainty.CommonPractice, "");

    public static readonly Clause Hot = Practice with { Operator = new ClauseOperator.Factor(0.7), Basis = RatingBasis.AtTemperature, Document = "House rules for rectifiers", Place = "clause 4.2", Certainty = Certainty.SecondHand };

    public static readonly Clause Junction = Practice with { Operator = new ClauseOperator.Least([new ClauseOperator.Offset(25), new ClauseOperator.Cap(125)]) };

    /// <summary>A stress under a clause, fitted: holds or lacks.</summary>
    public static LedgerRow Ceiling(string position, string name, Unit unit, string key, double stress, double rating, string corner, Clause? clause = null)
    {
        clause ??= Practice;
        var allowed = clause.Operator.Allowed(rating, Ambient);
        var margin = 1 - stress / allowed;
        return Bare(position, name, unit, Side.Ceiling, new Bound.Rating(key)) with
        {
            Verdict = margin >= 0 ? Verdict.Holds : Verdict.Lacks,
            Stress = stress, Allowed = allowed, Rating = rating, Margin = margin, MarginUnderated = 1 - stress / rating,
            LeastRating = clause.Operator.LeastRating(stress, Ambient), Clause = clause, Corner = corner,
        };
    }

    public static LedgerRow Temperature(string position, string name, string key, double stress, double rating, string corner)
    {
        var allowed = Junction.Operator.Allowed(rating, Ambient);
        var row = Ceiling(position, name, Units.Celsius, key, stress, rating, corner, Junction);
        return row with
        {
            Spec = row.Spec! with { Side = Side.Temperature },
            Margin = (allowed - stress) / (allowed - Ambient), MarginUnderated = (rating - stress) / (rating - Ambient),
            KelvinLeft = allowed - stress, Verdict = allowed >= stress ? Verdict.Holds : Verdict.Lacks,
        };
    }

    public static LedgerRow Floor(string position, string name, Unit unit, string field, double value, double required, string corner) =>
        Bare(position, name, unit, Side.Floor, new Bound.Required(required, field)) with
        {
            Verdict = value >= required ? Verdict.Holds : Verdict.Lacks,
            Stress = value, Allowed = required, Rating = required, Margin = 1 - required / value, MarginUnderated = 1 - required / value, Corner = corner,
        };

    /// <summary>A row without a finding.</summary>
    public static LedgerRow Open(string position, string name, Unit unit, Verdict verdict, string reason, double? stress = null, double? least = null) =>
        Bare(position, name, unit, Side.Ceiling, new Bound.Rating(name.Replace(' ', '_'))) with
        {
            Verdict = verdict, Reason = reason, Stress = stress, LeastRating = least, Corner = stress is null ? "" : "mains +10 %, 1.500 A",
            Clause = verdict == Verdict.NotCovered ? null : Practice,
        };

    public static LedgerRow NotAssessed(string position, string what) => new()
    {
        Position = position, Kind = "not-assessed." + what, Name = what, Verdict = Verdict.NotAssessed, Reason = "not assessed",
    };

    private static LedgerRow Bare(string position, string name, Unit unit, Side side, Bound bound)
    {
        var kind = name.Replace(' ', '-');
        return new() { Position = position, Kind = kind, Name = name, Verdict = Verdict.NotRated, Spec = new StressSpec(position, kind, name, unit, side, bound, "") };
    }
}
