namespace Selector.Storage;

/// <summary>Greatest lengths in characters. What is longer is refused before it reaches the store, in words.</summary>
public static class Limits
{
    /// <summary>Text of one field of a supply; a typed-in part with all its ratings needs about 1,000.</summary>
    public const int Text = 4096;

    /// <summary>Key of a field.</summary>
    public const int Field = 100;

    /// <summary>Name of a supply or of a person.</summary>
    public const int Name = 120;

    /// <summary>A text cell of the catalogue.</summary>
    public const int Cell = 400;

    /// <summary>A word of the product's own: family, technology, lifecycle.</summary>
    public const int Word = 60;
}
