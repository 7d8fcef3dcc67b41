namespace Selector.Documents.Pdf;

/// <summary>Sheet of paper.</summary>
public enum PaperSize
{
    A4,
    Letter,
}

/// <summary>What a reader may choose about the file.</summary>
public sealed record PdfOptions
{
    public PaperSize Paper { get; init; } = PaperSize.A4;

    /// <summary>Printed into the file's own data; null leaves the time of making.</summary>
    public DateTime? Created { get; init; }

    /// <summary>Language of the words, for readers that speak the sheet.</summary>
    public string Language { get; init; } = "en";
}
