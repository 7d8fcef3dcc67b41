using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Web.Words;

/// <summary>Why a row reads as it does, in words.</summary>
internal static class WhyWords
{
    /// <summary>The margin worked out with the row's own figures; empty when it has none.</summary>
    public static string Arithmetic(LedgerRow row)
    {
        if (row is not { Stress: { } stress, Allowed: { } allowed, Margin: { } margin, Spec: { } spec })
        {
            return "";
        }

        var (s, a) = (Shown.Number(stress, spec.Unit), Shown.Number(allowed, spec.Unit));
        var result = Shown.Share(margin);
        return spec.Side switch
        {
            Side.Floor => $"1 \u2212 required / value = 1 \u2212 {a} / {s} = {result}",
            Side.Temperature => $"({a} \u2212 {s}) / ({a} \u2212 ambient) = {result}",
            _ => $"1 \u2212 stress / allowed = 1 \u2212 {s} / {a} = {result}",
        };
    }

    /// <summary>What the stress is held against.</summary>
    public static string Basis(LedgerRow row, LedgerPosition position, RequirementValues requirement) => row.Spec?.Bound switch
    {
        Bound.Rating r when row.Clause?.Basis == RatingBasis.AtTemperature =>
            $"{RatingName(position, r.Key)}, as the maker's curve leaves it at the actual temperature",
        Bound.Rating r => $"{RatingName(position, r.Key)}, as printed",
        Bound.Limit l => $"{RatingName(position, l.Key)}: a limit of the part, not derated",
        Bound.Required r => $"{requirement.Find(r.Field)?.Field.Label ?? r.Field}, from the requirement",
        _ => Shown.Dash,
    };

    /// <summary>What the policy asks, or why no clause is needed.</summary>
    public static string Clause(LedgerRow row) => row.Clause?.Operator.Words ?? row.Spec?.Bound switch
    {
        Bound.Limit => "none needed: a limit of the part holds as it stands",
        Bound.Required => "none needed: the requirement itself",
        _ => "the policy has no clause for this stress, so it cannot pass",
    };

    /// <summary>Document, place and how sure the value is.</summary>
    public static string Source(Clause clause) => string.Join(", ", new[]
    {
        clause.Document, clause.Place is "none" ? "" : clause.Place, Certainty(clause.Certainty), clause.Note,
    }.Where(w => w.Length > 0));

    /// <summary>Which end of an axis is worse.</summary>
    public static string Direction(Push push) => push switch
    {
        Push.Rises => "worse as it rises",
        Push.Falls => "worse as it falls",
        Push.None => "does not matter",
        _ => "searched",
    };

    private static string Certainty(Certainty certainty) => certainty switch
    {
        Engine.Derating.Certainty.SeenAtIssuer => "seen at the issuer",
        Engine.Derating.Certainty.SecondHand => "second-hand",
        Engine.Derating.Certainty.FromMemory => "from memory",
        _ => "common practice",
    };

    private static string RatingName(LedgerPosition position, string key) =>
        position.Fitting?.Part.Family.Ratings.FirstOrDefault(r => r.Key == key)?.Name ?? Shown.Plain(key);
}
