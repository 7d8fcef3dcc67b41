namespace Selector.Storage;

/// <summary>Brings a store to the schema of this program. Each store does it in its own way.</summary>
public interface IStoreMigrator
{
    /// <summary>Safe to call from several starters at once and after one was killed in the middle.</summary>
    /// <exception cref="TimeoutException">Another starter holds the store for too long.</exception>
    Task Migrate(CancellationToken cancel);
}
