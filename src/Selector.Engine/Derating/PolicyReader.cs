using System.Collections.Immutable;
using System.Globalization;

namespace Selector.Engine.Derating;

/// <summary>Reads the operator column of a policy file: "factor 0.8", "offset 25", "least(offset 25; cap 125)".</summary>
public static class PolicyReader
{
    /// <summary>Reads one operator.</summary>
    /// <exception cref="FormatException">The text is none of the closed list; the message says what is allowed.</exception>
    public static ClauseOperator Operator(string text)
    {
        var trimmed = text.Trim();
        if (trimmed.StartsWith("least(", StringComparison.Ordinal) && trimmed.EndsWith(')'))
        {
            return new ClauseOperator.Least([.. trimmed[6..^1].Split(';').Select(Operator)]);
        }

        var words = trimmed.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        return words switch
        {
            ["factor", var f] => new ClauseOperator.Factor(Number(f)),
            ["falling", var f, var knee, var zero] => new ClauseOperator.FallingFactor(Number(f), Number(knee), Number(zero)),
            ["cap", var most] => new ClauseOperator.Cap(Number(most)),
            ["offset", var below] => new ClauseOperator.Offset(Number(below)),
            ["reciprocal", var times] => new ClauseOperator.Reciprocal(Number(times)),
            ["refused"] => new ClauseOperator.Refused(),
            _ => throw new FormatException(
                $"'{text}' is no operator. Write factor f, falling f knee zero, cap most, offset below, reciprocal times, refused, or least(a; b)."),
        };
    }

    public static RatingBasis Basis(string text) => text.Trim() switch
    {
        "nominal" => RatingBasis.Nominal,
        "at-temperature" => RatingBasis.AtTemperature,
        _ => throw new FormatException($"'{text}' is no basis. Write nominal or at-temperature."),
    };

    public static Certainty Certainty(string text) => text.Trim() switch
    {
        "seen-at-issuer" => Derating.Certainty.SeenAtIssuer,
        "second-hand" => Derating.Certainty.SecondHand,
        "from-memory" => Derating.Certainty.FromMemory,
        "common-practice" => Derating.Certainty.CommonPractice,
        _ => throw new FormatException($"'{text}' is no certainty. Write seen-at-issuer, second-hand, from-memory or common-practice."),
    };

    private static double Number(string text) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && double.IsFinite(value)
            ? value : throw new FormatException($"'{text}' is no number.");
}
