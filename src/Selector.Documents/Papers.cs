using Selector.Documents.Model;
using Selector.Documents.Pdf;
using Selector.Documents.Sheets;

namespace Selector.Documents;

/// <summary>The papers that leave the desk.</summary>
public static class Papers
{
    /// <summary>Bill of materials and derating sheet, in this order, from the same ledger.</summary>
    public static IReadOnlyList<Report> Reports(PaperInput input) => [BillOfMaterials.Build(input), DeratingSheet.Build(input)];

    /// <summary>Both in one PDF, sheets counted through.</summary>
    public static byte[] Both(PaperInput input, PdfOptions? options = null) => PdfPaper.Render(Reports(input), options);
}
