using System.Collections.Immutable;
using System.Reflection;
using System.Text;

namespace Selector.Application;

/// <summary>The files of the db folder that a published build carries inside itself.</summary>
internal static class Embedded
{
    private static readonly Assembly Here = typeof(Embedded).Assembly;

    /// <summary>Files of one folder by name without ending, in order of name.</summary>
    public static ImmutableArray<(string Name, string Text)> In(string folder) =>
    [
        .. Here.GetManifestResourceNames()
            .Where(n => n.StartsWith(folder + "/", StringComparison.Ordinal))
            .Order(StringComparer.Ordinal)
            .Select(n => (Path.GetFileNameWithoutExtension(n[(folder.Length + 1)..]), Read(n))),
    ];

    private static string Read(string name)
    {
        using var reader = new StreamReader(Here.GetManifestResourceStream(name)!, Encoding.UTF8);
        return reader.ReadToEnd();
    }
}
