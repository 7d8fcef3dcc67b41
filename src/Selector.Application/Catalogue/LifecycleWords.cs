using Selector.Engine.Parts;

namespace Selector.Application.Catalogue;

/// <summary>Lifecycle as written in files.</summary>
internal static class LifecycleWords
{
    private static readonly string[] Words = ["active", "not for new designs", "last buy", "obsolete"];

    public static IReadOnlyList<string> All => Words;

    public static string Of(Lifecycle lifecycle) => Words[(int)lifecycle];

    public static Lifecycle? Read(string word) => Array.IndexOf(Words, word) is >= 0 and var at ? (Lifecycle)at : null;
}
