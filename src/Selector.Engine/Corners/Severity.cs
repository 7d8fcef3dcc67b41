using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Engine.Corners;

/// <summary>
/// How bad a condition is for one stress: one minus the margin, so that 1 is the limit and more lacks. Without a bound to
/// compare with, the stress itself orders the conditions.
/// </summary>
public sealed class Severity
{
    private readonly StressSpec _spec;
    private readonly int _stress;
    private readonly int _ambient;
    private readonly int _temperatureLink;

    public Severity(SupplyModel model, int stress, Fitting? fitting, Policy policy)
    {
        _stress = stress;
        _spec = model.Stresses[stress].Spec;
        _ambient = model.AmbientAxis;
        _temperatureLink = model.Links.FindIndex(l => l.Name == (_spec.TemperatureLink ?? Circuits.Thermal.Surroundings.AirLink));
        Part = fitting?.Part;
        var family = model.Registry.Family(model.Positions[model.PositionOrdinal(_spec.Position)].Family);
        var technology = Part?.Technology is { Length: > 0 } named ? named : family.Technologies[0];
        switch (_spec.Bound)
        {
            case Bound.Rating rating:
                Clause = policy.Find(family.Id, technology, _spec.Kind);
                RatingSpec = family.Rating(rating.Key);
                Rating = fitting?.Rating(rating.Key) ?? double.NaN;
                Fall = RatingSpec.Fall;
                break;
            case Bound.Limit limit:
                RatingSpec = family.Rating(limit.Key);
                Rating = Part is null ? double.NaN : Part[limit.Key];
                break;
            case Bound.Required required:
                Rating = required.Value;
                break;
        }
    }

    public Part? Part { get; }

    public Clause? Clause { get; }

    /// <summary>The rating that bounds the stress; null for a figure of the requirement.</summary>
    public RatingSpec? RatingSpec { get; }

    /// <summary>Rating, limit or requirement; NaN when the part does not say or there is none.</summary>
    public double Rating { get; }

    private TemperatureFall? Fall { get; }

    /// <summary>Whether the allowed value falls as the place gets hotter.</summary>
    public bool FallsWithTemperature =>
        (Fall is not null && Clause?.Basis == RatingBasis.AtTemperature) || Clause?.Operator is ClauseOperator.FallingFactor;

    /// <summary>A column of the rating's own temperature curve that the part does not give; null when nothing is missing.</summary>
    public string? MissingOfCurve =>
        Part is null || Fall is null || Clause?.Basis != RatingBasis.AtTemperature ? null
        : !Part.Has(Fall.KneeKey) ? Fall.KneeKey
        : !Part.Has(Fall.ZeroKey) ? Fall.ZeroKey
        : null;

    /// <summary>Link with the temperature at which the rating is read; -1 when it is the ambient.</summary>
    public int TemperatureLink => _temperatureLink;

    /// <summary>Temperature at which the rating is read, °C.</summary>
    public double Temperature(Condition at) =>
        _temperatureLink >= 0 ? at.Links[_temperatureLink] : _ambient >= 0 ? at.Axes[_ambient] : 25;

    /// <summary>What the rating carries at a condition; NaN when it is not known.</summary>
    public double Allowed(Condition at)
    {
        if (_spec.Bound is not Bound.Rating)
        {
            return Rating;
        }

        return Clause is null || MissingOfCurve is not null
            ? double.NaN
            : Clause.Operator.Allowed(Clause.Basis == RatingBasis.AtTemperature ? RatingAt(at) : Rating, Temperature(at));
    }

    /// <summary>The rating that the maker's own curve leaves at a condition.</summary>
    public double RatingAt(Condition at)
    {
        if (Fall is null || Part is null || !Part.Has(Fall.KneeKey) || !Part.Has(Fall.ZeroKey))
        {
            return Rating;
        }

        var (knee, zero) = (Part[Fall.KneeKey], Part[Fall.ZeroKey]);
        var t = Temperature(at);
        return t <= knee ? Rating : t >= zero ? 0 : Rating * (zero - t) / (zero - knee);
    }

    /// <summary>Whether there is a bound at a condition, so that severity is a share of what is allowed.</summary>
    public bool IsBounded(Condition at) => !double.IsNaN(Allowed(at));

    /// <summary>Larger is worse; finite, or positive infinity where nothing is allowed.</summary>
    public double Of(Condition at) => Of(at, Allowed(at));

    /// <summary>The same against a given bound.</summary>
    public double Of(Condition at, double allowed)
    {
        var stress = at.Stresses[_stress];
        if (!double.IsFinite(stress))
        {
            // Of a stage that is solved on demand, and was not asked here or has no solution.
            return double.NegativeInfinity;
        }

        if (double.IsNaN(allowed))
        {
            return _spec.Side == Side.Floor ? -stress : stress;
        }

        var ambient = _ambient >= 0 ? at.Axes[_ambient] : 25;
        return _spec.Side switch
        {
            Side.Ceiling => allowed > 0 ? stress / allowed : double.PositiveInfinity,
            Side.Floor => allowed <= 0 ? 0 : stress > 0 ? allowed / stress : double.PositiveInfinity,
            _ => allowed > ambient ? (stress - ambient) / (allowed - ambient) : double.PositiveInfinity,
        };
    }
}
