namespace Selector.Web.Session;

/// <summary>Work of which only the last wish counts: a new one cancels the one under way, and what is overtaken gives nothing.</summary>
internal sealed class Latest : IDisposable
{
    private CancellationTokenSource? _current;

    public bool IsBusy => _current is not null;

    /// <summary>The result, or null when it was overtaken or cancelled.</summary>
    public async Task<T?> Run<T>(Func<CancellationToken, Task<T>> work)
        where T : class
    {
        _current?.Cancel();
        using var mine = new CancellationTokenSource();
        _current = mine;
        try
        {
            var result = await work(mine.Token);
            return ReferenceEquals(_current, mine) ? result : null;
        }
        catch (OperationCanceledException) when (mine.IsCancellationRequested)
        {
            return null;
        }
        finally
        {
            if (ReferenceEquals(_current, mine))
            {
                _current = null;
            }
        }
    }

    /// <summary>Ends what is under way; its caller gets null.</summary>
    public void Cancel()
    {
        _current?.Cancel();
        _current = null;
    }

    public void Dispose() => Cancel();
}
