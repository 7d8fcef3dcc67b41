using Selector.Documents.Sheets;
using Selector.Engine.Supplies;

namespace Selector.Web.Session;

/// <summary>What one supply costs when the whole build is ordered.</summary>
/// <param name="Sum">In words, one sum per currency.</param>
/// <param name="Units">Supplies in the build.</param>
/// <param name="Without">What the sum leaves out; empty when nothing.</param>
public sealed record BuildPrice(string Sum, int Units, string Without)
{
    public static BuildPrice Of(Ledger ledger, RequirementValues requirement)
    {
        var build = BuildSize.Of(requirement);
        var lines = OrderLine.Of(ledger, build);
        var sums = Money.Sums(lines.Where(l => l.OneSupply is not null).Select(l => (l.Currency, l.OneSupply!.Value)));
        var unknown = lines.Count(l => l.OneSupply is null);
        return new BuildPrice(
            sums.Count == 0 ? "\u2013" : Money.Words(sums),
            build.Units,
            unknown == 0 ? "" : $", {unknown} without price");
    }
}
