namespace Selector.Engine.Derating;

/// <summary>How sure the value of a clause is.</summary>
public enum Certainty
{
    SeenAtIssuer,
    SecondHand,
    FromMemory,
    CommonPractice,
}

/// <summary>What a clause starts from.</summary>
public enum RatingBasis
{
    /// <summary>The rating as printed.</summary>
    Nominal,

    /// <summary>The rating that the maker's own curve leaves at the actual temperature.</summary>
    AtTemperature,
}

/// <summary>One rule of a derating policy.</summary>
/// <param name="Family">Family that it is for.</param>
/// <param name="Technology">Technology that it is for; empty for any.</param>
/// <param name="Stress">Kind of the stress, as the stages name it.</param>
/// <param name="Operator">From rating to allowed.</param>
/// <param name="Basis">What it starts from.</param>
/// <param name="Document">Where it stands.</param>
/// <param name="Place">Clause or page.</param>
/// <param name="Certainty">How sure the value is.</param>
/// <param name="Note">Anything else the checker should know.</param>
public sealed record Clause(
    string Family,
    string Technology,
    string Stress,
    ClauseOperator Operator,
    RatingBasis Basis,
    string Document,
    string Place,
    Certainty Certainty,
    string Note);
