using Selector.Engine.Parts;

namespace Selector.Storage.Entities;

/// <summary>A catalogue entry as stored. What its family declares is one JSON text, so that a new rating needs no migration.</summary>
public sealed class PartRecord : IVersioned
{
    public int Id { get; set; }

    /// <summary>Id of the family. Family, maker and ordering code together are unique.</summary>
    public required string Family { get; set; }

    public required string Maker { get; set; }

    public required string OrderingCode { get; set; }

    public string ShopNumber { get; set; } = "";

    public string Technology { get; set; } = "";

    public string Package { get; set; } = "";

    public Lifecycle Lifecycle { get; set; }

    public int Stock { get; set; }

    public int LeastOrder { get; set; } = 1;

    public int Multiple { get; set; } = 1;

    /// <summary>Canonical JSON with family and schema version; a rating that is not given is left out.</summary>
    public required string Ratings { get; set; }

    /// <summary>JSON with version, currency, date and breaks in ten-thousandths.</summary>
    public required string Prices { get; set; }

    /// <summary>Data sheet and date.</summary>
    public string Source { get; set; } = "";

    /// <summary>Lower-case words to search in: LIKE differs between the stores, so the case is settled here.</summary>
    public string Search { get; set; } = "";

    public long Version { get; set; }
}
