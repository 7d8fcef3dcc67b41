using Microsoft.EntityFrameworkCore;

namespace Selector.Storage;

/// <summary>
/// One piece of writing as one transaction, all or nothing, on a context of its own. When somebody else was faster the whole piece
/// is done again from what then stands, so it must read what it decides by from the context that it is given.
/// </summary>
public sealed class StoreWork(IDbContextFactory<SelectorContext> contexts)
{
    /// <summary>Each round that fails means that somebody else's succeeded.</summary>
    private const int MostRounds = 50;

    /// <summary>Opens a context for reading.</summary>
    public async Task<SelectorContext> Open(CancellationToken cancel) => await contexts.CreateDbContextAsync(cancel).ConfigureAwait(false);

    /// <summary>Runs the work, saves and commits; returns only when the store has acknowledged.</summary>
    /// <exception cref="DbUpdateException">The store refuses the change for a reason of its own.</exception>
    public async Task<T> Write<T>(Func<SelectorContext, CancellationToken, Task<T>> work, CancellationToken cancel)
    {
        for (var round = 1; ; round++)
        {
            try
            {
                return await Once(work, cancel).ConfigureAwait(false);
            }
            catch (DbUpdateException) when (round < MostRounds)
            {
                // Lost to another writer: a moved version, or a row that was not there when it was looked for.
                await Task.Delay(TimeSpan.FromMilliseconds(round), cancel).ConfigureAwait(false);
            }
        }
    }

    private async Task<T> Once<T>(Func<SelectorContext, CancellationToken, Task<T>> work, CancellationToken cancel)
    {
        var first = await Open(cancel).ConfigureAwait(false);
        await using (first.ConfigureAwait(false))
        {
            return await first.Database.CreateExecutionStrategy().ExecuteAsync(
                (Work: work, This: this),
                static async (_, state, token) => await state.This.InTransaction(state.Work, token).ConfigureAwait(false),
                null,
                cancel).ConfigureAwait(false);
        }
    }

    private async Task<T> InTransaction<T>(Func<SelectorContext, CancellationToken, Task<T>> work, CancellationToken cancel)
    {
        var context = await Open(cancel).ConfigureAwait(false);
        await using (context.ConfigureAwait(false))
        {
            var transaction = await context.Database.BeginTransactionAsync(cancel).ConfigureAwait(false);
            await using (transaction.ConfigureAwait(false))
            {
                var result = await work(context, cancel).ConfigureAwait(false);
                await context.SaveChangesAsync(cancel).ConfigureAwait(false);
                await transaction.CommitAsync(CancellationToken.None).ConfigureAwait(false);
                return result;
            }
        }
    }
}
