using System.Collections.Immutable;
using Selector.Documents.Model;

namespace Selector.Documents.Sheets;

/// <summary>The paper for the person who checks the design: every stress, what is allowed and by which clause.</summary>
public static class DeratingSheet
{
    public const string Title = "Derating sheet";

    public static Report Build(PaperInput input)
    {
        var ledger = input.Ledger;
        ImmutableArray<Block> fault = ledger.Fault is null ? [] : [new Paragraph("Not solved. " + ledger.Fault) { Strong = true }];
        return new Report(Title, Common.Cover(input),
        [
            new("", [Common.Counts(ledger), .. fault]),
            new("Requirement, as typed and as understood", [Common.Requirement(input.Requirement)]),
            new("", [Cautions.For(ledger)]),
            new("", [LedgerTable.Of(input)]),
            new("", [NotAssessedTable.Of(ledger)]),
            new("How to read it", [new Paragraph(Reading)]),
        ]);
    }

    private const string Reading =
        "Value is the stress at the worst corner named; allowed is what the clause leaves of the rating there. Margin is 1 \u2212 value/allowed; " +
        "for a value that must reach a least figure 1 \u2212 required/value; for a temperature the share of the rise from ambient that is left, with the kelvins beneath. " +
        "A rating is taken as printed unless \"at temperature\" stands under it; then the clause works on what the maker's own curve leaves there. " +
        "The scale runs from zero to the rating: the tick stands at allowed, the hatched part is what the policy takes away, the pointer stands at the value. " +
        "Where a value must reach a least figure, the tick is that figure and the pointer must stand right of it. " +
        "What has no finding does not pass.";
}
