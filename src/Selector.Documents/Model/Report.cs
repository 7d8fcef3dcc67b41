using System.Collections.Immutable;

namespace Selector.Documents.Model;

/// <summary>
/// A paper before it takes a form. Page, PDF and CSV are drawn from this one model, so that none can say what another does not.
/// </summary>
/// <param name="Title">Which paper it is: "Derating sheet".</param>
/// <param name="Cover">What identifies it; printed at its head and, in short, on every sheet.</param>
/// <param name="Sections">In reading order.</param>
public sealed record Report(string Title, Cover Cover, ImmutableArray<Section> Sections)
{
    /// <summary>Every table, for the tests and for files.</summary>
    public IEnumerable<Table> Tables => Sections.SelectMany(s => s.Blocks).OfType<Table>();
}

/// <summary>What tells this paper from every other.</summary>
/// <param name="Number">Number of the supply as printed: "Supply 0007".</param>
/// <param name="Name">Name of the supply.</param>
/// <param name="Issue">Issue letter or "not issued".</param>
/// <param name="Facts">Issue, dates, policy, engine: what the sheet rests on.</param>
/// <param name="Signatures">Who drew, checked and approved; blank values leave a line to sign on.</param>
public sealed record Cover(
    string Number, string Name, string Issue, ImmutableArray<Fact> Facts, ImmutableArray<Fact> Signatures)
{
    /// <summary>In words on every sheet: "issue B", "not issued".</summary>
    public string Standing => Issue.StartsWith("not", StringComparison.Ordinal) ? Issue : $"issue {Issue}";

    /// <summary>What the finding rests on, in words on every sheet.</summary>
    public ImmutableArray<string> Rests { get; init; } = [];
}

/// <summary>A labelled value.</summary>
/// <param name="Label">Above it.</param>
/// <param name="Value">As given.</param>
/// <param name="Note">Beneath it in small print, such as how a typed value was understood.</param>
/// <param name="Fault">What is wrong with it; empty when nothing is.</param>
public sealed record Fact(string Label, string Value, string Note = "", string Fault = "");

/// <summary>A part of a paper under its own heading.</summary>
/// <param name="Heading">Empty for none.</param>
/// <param name="Blocks">In reading order.</param>
public sealed record Section(string Heading, ImmutableArray<Block> Blocks);
