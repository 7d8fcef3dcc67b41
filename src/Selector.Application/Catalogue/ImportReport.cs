using System.Collections.Immutable;

namespace Selector.Application.Catalogue;

/// <summary>What an import did, or on a dry run would do. With any fault nothing is done at all.</summary>
/// <param name="Family">Id of the family.</param>
/// <param name="Added">Parts that were not there.</param>
/// <param name="Changed">Parts of which something differed.</param>
/// <param name="Unchanged">Parts that were there just so.</param>
/// <param name="Refused">What is wrong, by row and column.</param>
/// <param name="Done">True when it was written; false for a dry run and when anything was refused.</param>
public sealed record ImportReport(string Family, int Added, int Changed, int Unchanged, ImmutableArray<RowFault> Refused, bool Done)
{
    /// <summary>Rows with at least one fault.</summary>
    public int RefusedRows => Refused.Select(r => r.Row).Distinct().Count();
}
