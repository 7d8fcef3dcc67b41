using System.Collections.Immutable;
using Selector.Application.Supplies;
using Selector.Engine.Derating;
using Selector.Engine.Supplies;

namespace Selector.Application.Assessing;

/// <summary>A supply, solved and held against its policy.</summary>
/// <param name="State">The texts that were read; compare its version before showing the answer.</param>
/// <param name="Requirement">As understood, fault by fault.</param>
/// <param name="Design">Requirement and fittings.</param>
/// <param name="Ledger">Every stress at its worst corner; has a fault when nothing could be solved.</param>
/// <param name="Policy">The derating policy that was used.</param>
/// <param name="Faults">Fittings or a policy that could not be read.</param>
/// <param name="CatalogueVersion">The catalogue that was used.</param>
/// <param name="Took">Time in the solver, without waiting for it.</param>
/// <param name="SolvedUtc">When.</param>
public sealed record Assessment(
    SupplyState State,
    RequirementValues Requirement,
    Design Design,
    Ledger Ledger,
    Policy Policy,
    ImmutableArray<string> Faults,
    long CatalogueVersion,
    TimeSpan Took,
    DateTime SolvedUtc);
