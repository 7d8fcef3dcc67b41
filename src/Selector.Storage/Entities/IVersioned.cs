namespace Selector.Storage.Entities;

/// <summary>
/// A row with its own version column. SQLite has no row version and PostgreSQL's is of another type, so the count is ours on
/// both: the context raises it with every change and refuses a change made from an older one.
/// </summary>
public interface IVersioned
{
    long Version { get; set; }
}
