namespace Selector.Storage.Entities;

/// <summary>The one row that counts the changes of the catalogue. 0 means that nothing was ever put in.</summary>
public sealed class CatalogueVersion : IVersioned
{
    public const int OnlyId = 1;

    public int Id { get; set; } = OnlyId;

    /// <summary>When the catalogue last changed.</summary>
    public DateTime ChangedUtc { get; set; }

    public long Version { get; set; }
}
