using Selector.Documents.Model;
using Selector.Engine.Circuits;
using Selector.Engine.Supplies;

namespace Selector.Web.Words;

/// <summary>Which scale shows a row; the same choice as on the derating sheet.</summary>
internal static class Pointers
{
    public static PointerScale? Of(LedgerRow row) => row.Spec?.Side == Side.Floor
        ? PointerScale.Floor(row.Stress, row.Allowed)
        : PointerScale.Ceiling(row.Stress, row.Allowed, row.Rating);
}
