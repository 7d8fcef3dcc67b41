using Selector.Engine.Supplies;

namespace Selector.Web.Session;

/// <summary>A ledger with what it is of.</summary>
/// <param name="Version">Version of the supply that was solved.</param>
/// <param name="Ledger">The finding.</param>
/// <param name="AtUtc">When.</param>
/// <param name="Took">How long it was in work.</param>
public sealed record Assessment(long Version, Ledger Ledger, DateTime AtUtc, TimeSpan Took);
