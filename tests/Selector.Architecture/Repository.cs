using System.Runtime.CompilerServices;

namespace Selector.Architecture;

/// <summary>The checkout that the tests were built from.</summary>
internal static class Repository
{
    public static string Root { get; } = Find();

    public static IEnumerable<string> Sources(string under, params string[] extensions) => Directory
        .EnumerateFiles(Path.Combine(Root, under), "*", SearchOption.AllDirectories)
        .Where(f => extensions.Contains(Path.GetExtension(f)))
        .Where(f => !f.Split(Path.DirectorySeparatorChar).Any(p => p is "bin" or "obj"));

    private static string Find([CallerFilePath] string here = "")
    {
        for (var folder = new DirectoryInfo(Path.GetDirectoryName(here)!); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "Selector.sln")))
            {
                return folder.FullName;
            }
        }

        throw new InvalidOperationException("The checkout is gone; build the tests where they run.");
    }
}
