using Microsoft.EntityFrameworkCore.Storage.ValueConversion;

namespace Selector.Storage;

/// <summary>Times are UTC in every store and come back marked so; a local time is a programming error and is refused.</summary>
internal sealed class UtcConverter() : ValueConverter<DateTime, DateTime>(t => Checked(t), t => DateTime.SpecifyKind(t, DateTimeKind.Utc))
{
    private static DateTime Checked(DateTime time) => time.Kind == DateTimeKind.Utc
        ? time
        : throw new ArgumentException($"A time to be stored must be UTC, not {time.Kind}.", nameof(time));
}
