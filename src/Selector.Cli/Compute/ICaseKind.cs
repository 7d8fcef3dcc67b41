using System.Collections.Immutable;

namespace Selector.Cli.Compute;

/// <summary>A kind of circuit that a table can ask for.</summary>
internal interface ICaseKind
{
    /// <summary>The word on the command line.</summary>
    string Name { get; }

    /// <summary>Columns that are written, in this order; a column of the same name in the table is replaced.</summary>
    ImmutableArray<string> Computed { get; }

    /// <summary>Solves one row.</summary>
    /// <returns>One text per computed column; empty where it does not apply.</returns>
    /// <exception cref="CaseFault">The row cannot be solved; the message names the column.</exception>
    ImmutableArray<string> Solve(CaseRow row, CancellationToken cancel);
}

/// <summary>Why a row could not be solved, in words for its error cell.</summary>
internal sealed class CaseFault(string message) : Exception(message);
