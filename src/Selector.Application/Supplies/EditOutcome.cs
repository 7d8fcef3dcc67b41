namespace Selector.Application.Supplies;

/// <summary>What became of an edit.</summary>
public abstract record EditOutcome
{
    private EditOutcome()
    {
    }

    /// <summary>It stands, and the store has acknowledged it.</summary>
    public sealed record Applied(SupplyState State) : EditOutcome;

    /// <summary>Somebody else was there first; nothing was changed.</summary>
    /// <param name="Field">Which field.</param>
    /// <param name="Wanted">The text that was not applied.</param>
    /// <param name="Stands">The text that stands now.</param>
    /// <param name="By">Who wrote it; empty when nobody did and it is the default.</param>
    /// <param name="AtUtc">When.</param>
    /// <param name="State">The supply as it is now.</param>
    public sealed record Conflict(string Field, string Wanted, string Stands, string By, DateTime AtUtc, SupplyState State) : EditOutcome
    {
        /// <summary>In a sentence, for page and terminal.</summary>
        public string Words => By.Length == 0
            ? $"Not changed: it reads \u201c{PlainText.Short(Stands)}\u201d now."
            : $"Not changed: {By} wrote \u201c{PlainText.Short(Stands)}\u201d in the meantime.";
    }

    /// <summary>There is no such supply.</summary>
    public sealed record NotFound(int Number) : EditOutcome;

    /// <summary>It cannot be done; the reason says what to do instead.</summary>
    public sealed record Refused(string Reason) : EditOutcome;
}
