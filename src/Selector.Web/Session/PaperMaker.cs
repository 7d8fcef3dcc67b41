using Selector.Application.Supplies;
using Selector.Documents.Sheets;
using Selector.Web.Words;

namespace Selector.Web.Session;

/// <summary>What the papers of a supply are made from, for page, PDF and files alike.</summary>
public sealed class PaperMaker(SupplyDesk supplies, SheetWork work, TimeProvider time)
{
    /// <summary>Null when there is no such supply.</summary>
    public async Task<PaperInput?> Input(int number, CancellationToken cancel)
    {
        if (await supplies.Open(number, cancel) is not { } state)
        {
            return null;
        }

        var assessment = await work.Assess(state, cancel);
        return new PaperInput(
            state.Name, number, Shown.Moment(state.EditedUtc, time), assessment.Requirement, assessment.Design, assessment.Ledger)
        {
            PolicyStanding = assessment.Policy.Standing,
        };
    }
}
