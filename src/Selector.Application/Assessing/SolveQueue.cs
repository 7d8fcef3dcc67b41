namespace Selector.Application.Assessing;

/// <summary>Too many solves are waiting; the message may be shown.</summary>
public sealed class SolverBusyException(string message) : Exception(message);

/// <summary>
/// Runs solves, as many at once as there are cores: more would only make all of them slow. Every solve is bounded in time and can
/// be cancelled while it waits and while it runs.
/// </summary>
public sealed class SolveQueue(SelectorOptions options, TimeProvider time) : IDisposable
{
    private readonly SemaphoreSlim _free = new(options.Solvers);
    private int _inside;

    /// <summary>Waits for a core and solves there.</summary>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    /// <exception cref="TimeoutException">The solve took longer than the limit.</exception>
    /// <exception cref="SolverBusyException">Too many are waiting.</exception>
    public async Task<T> Run<T>(Func<CancellationToken, T> solve, CancellationToken cancel)
    {
        try
        {
            if (Interlocked.Increment(ref _inside) > options.Solvers + options.MostWaiting)
            {
                throw new SolverBusyException("Too many supplies are being solved. Try again in a moment.");
            }

            await _free.WaitAsync(cancel).ConfigureAwait(false);
            try
            {
                return await Solve(solve, cancel).ConfigureAwait(false);
            }
            finally
            {
                _free.Release();
            }
        }
        finally
        {
            Interlocked.Decrement(ref _inside);
        }
    }

    public void Dispose() => _free.Dispose();

    private async Task<T> Solve<T>(Func<CancellationToken, T> solve, CancellationToken cancel)
    {
        using var limit = new CancellationTokenSource(options.SolveLimit, time);
        using var both = CancellationTokenSource.CreateLinkedTokenSource(cancel, limit.Token);
        try
        {
            return await Task.Run(() => solve(both.Token), both.Token).ConfigureAwait(false);
        }
        catch (OperationCanceledException e) when (!cancel.IsCancellationRequested)
        {
            throw new TimeoutException(
                string.Create(System.Globalization.CultureInfo.InvariantCulture, $"Not solved within {options.SolveLimit.TotalSeconds:0.#} s."), e);
        }
    }
}
