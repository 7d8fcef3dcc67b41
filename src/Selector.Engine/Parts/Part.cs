using System.Collections.Immutable;

namespace Selector.Engine.Parts;

/// <summary>Whether a part may still be designed in.</summary>
public enum Lifecycle
{
    Active,
    NotForNewDesigns,
    LastBuy,
    Obsolete,
}

/// <summary>A catalogue entry of one family, or a part typed in for one supply.</summary>
public sealed record Part
{
    /// <summary>Identifies the part in its store; 0 for a part typed in.</summary>
    public int Id { get; init; }

    public required FamilySpec Family { get; init; }

    public required string Maker { get; init; }

    /// <summary>Full ordering code of the maker.</summary>
    public required string OrderingCode { get; init; }

    public string ShopNumber { get; init; } = "";

    public string Technology { get; init; } = "";

    public string Package { get; init; } = "";

    /// <summary>One value per rating of the family, in its order and in its unit; NaN where the data sheet says nothing.</summary>
    public required ImmutableArray<double> Ratings { get; init; }

    public PriceList Prices { get; init; } = PriceList.None;

    public int Stock { get; init; }

    public int LeastOrder { get; init; } = 1;

    public int Multiple { get; init; } = 1;

    public Lifecycle Lifecycle { get; init; }

    /// <summary>Data sheet and date from which the ratings were taken.</summary>
    public string Source { get; init; } = "";

    /// <summary>Maker and ordering code, as printed.</summary>
    public string FullName => $"{Maker} {OrderingCode}";

    public bool Has(string key) => !double.IsNaN(this[key]);

    /// <summary>A rating by key; NaN where it is not given.</summary>
    public double this[string key] => Ratings[Family.Ordinal(key)];
}
