using System.Collections.Immutable;

namespace Selector.Engine.Derating;

/// <summary>The closed list of ways in which a clause gets from a rating to what is allowed.</summary>
public abstract record ClauseOperator
{
    private ClauseOperator()
    {
    }

    /// <summary>What the rating may carry.</summary>
    /// <param name="rating">In the rating's unit, already on the clause's basis.</param>
    /// <param name="temperature">Actual temperature in °C.</param>
    public abstract double Allowed(double rating, double temperature);

    /// <summary>The rating that would be needed to carry a stress; null when no rating would.</summary>
    public abstract double? LeastRating(double stress, double temperature);

    /// <summary>In words, for sheet and paper: "0.80 of rating".</summary>
    public abstract string Words { get; }

    private static string N(double v) => v.ToString("0.###", System.Globalization.CultureInfo.InvariantCulture);

    /// <summary>A fixed share of the rating, 0 to 1.</summary>
    public sealed record Factor(double Share) : ClauseOperator
    {
        public override double Allowed(double rating, double temperature) => Share * rating;

        public override double? LeastRating(double stress, double temperature) => stress / Share;

        public override string Words => $"{N(Share)} of rating";
    }

    /// <summary>A share up to one temperature, falling in a straight line to nothing at another.</summary>
    public sealed record FallingFactor(double Share, double Knee, double Zero) : ClauseOperator
    {
        public override double Allowed(double rating, double temperature) =>
            rating * Share * Math.Clamp((Zero - temperature) / (Zero - Knee), 0, 1);

        public override double? LeastRating(double stress, double temperature) =>
            Allowed(1, temperature) is > 0 and var share ? stress / share : null;

        public override string Words => $"{N(Share)} of rating to {N(Knee)} °C, falling to nothing at {N(Zero)} °C";
    }

    /// <summary>Never more than this, whatever the rating.</summary>
    public sealed record Cap(double Most) : ClauseOperator
    {
        public override double Allowed(double rating, double temperature) => Math.Min(rating, Most);

        public override double? LeastRating(double stress, double temperature) => stress <= Most ? stress : null;

        public override string Words => $"at most {N(Most)}";
    }

    /// <summary>So much below the maximum; kelvins for temperatures.</summary>
    public sealed record Offset(double Below) : ClauseOperator
    {
        public override double Allowed(double rating, double temperature) => rating - Below;

        public override double? LeastRating(double stress, double temperature) => stress + Below;

        public override string Words => $"{N(Below)} below the maximum";
    }

    /// <summary>The rating must be at least so many times the stress.</summary>
    public sealed record Reciprocal(double Times) : ClauseOperator
    {
        public override double Allowed(double rating, double temperature) => rating / Times;

        public override double? LeastRating(double stress, double temperature) => stress * Times;

        public override string Words => $"rating at least {N(Times)} × stress";
    }

    /// <summary>The least of several.</summary>
    public sealed record Least(ImmutableArray<ClauseOperator> Of) : ClauseOperator
    {
        public override double Allowed(double rating, double temperature) => Of.Min(o => o.Allowed(rating, temperature));

        public override double? LeastRating(double stress, double temperature) =>
            Of.Select(o => o.LeastRating(stress, temperature)).Aggregate((double?)0, (most, one) => one is null || most is null ? null : Math.Max(most.Value, one.Value));

        public override string Words => string.Join(", ", Of.Select(o => o.Words));

        public bool Equals(Least? other) => other is not null && Of.SequenceEqual(other.Of);

        public override int GetHashCode() => Of.Length;
    }

    /// <summary>The policy does not allow the part for this use.</summary>
    public sealed record Refused : ClauseOperator
    {
        public override double Allowed(double rating, double temperature) => 0;

        public override double? LeastRating(double stress, double temperature) => null;

        public override string Words => "not allowed";
    }
}
