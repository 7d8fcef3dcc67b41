using System.Collections.Concurrent;

namespace Selector.Application.Supplies;

/// <summary>A supply has changed in this process.</summary>
public readonly record struct SupplyChange(int Number, long Version);

/// <summary>
/// Tells the pages of this process that a supply has changed. A notice is only a hint to look again: it carries no content and may
/// come late or out of order, so listeners compare versions.
/// </summary>
public sealed class SupplyNotices
{
    private readonly ConcurrentDictionary<long, Listener> _listeners = new();
    private long _next;

    /// <summary>Listens to one supply, or to all with a null number, until disposed. The call comes on the writer's thread: hand over and return.</summary>
    public IDisposable Subscribe(int? number, Action<SupplyChange> heard)
    {
        var key = Interlocked.Increment(ref _next);
        _listeners[key] = new Listener(number, heard);
        return new Subscription(() => _listeners.TryRemove(key, out _));
    }

    internal void Tell(SupplyChange change)
    {
        foreach (var listener in _listeners.Values)
        {
            if (listener.Number is { } only && only != change.Number)
            {
                continue;
            }

            try
            {
                listener.Heard(change);
            }
            catch (Exception e) when (e is ObjectDisposedException or InvalidOperationException)
            {
                // A page that went away between two notices must not undo the writer's success.
            }
        }
    }

    private sealed record Listener(int? Number, Action<SupplyChange> Heard);

    private sealed class Subscription(Action end) : IDisposable
    {
        public void Dispose() => end();
    }
}
