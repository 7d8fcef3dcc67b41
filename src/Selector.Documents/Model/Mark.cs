namespace Selector.Documents.Model;

/// <summary>Shape before a verdict: the same on page and paper, and clear in grey print.</summary>
public enum Mark
{
    None,

    /// <summary>Full circle: holds.</summary>
    Full,

    /// <summary>Half circle: holds by little.</summary>
    Half,

    /// <summary>Open circle: nothing can be said.</summary>
    Open,

    /// <summary>Cross: lacks.</summary>
    Cross,
}

/// <summary>Colour that confirms what words and shape already say.</summary>
public enum Tone
{
    Plain,

    /// <summary>Second ink, for what is less than the point.</summary>
    Quiet,

    /// <summary>Ochre: under 5 %.</summary>
    Close,

    /// <summary>Red: lacks, and nothing else.</summary>
    Lacks,
}
