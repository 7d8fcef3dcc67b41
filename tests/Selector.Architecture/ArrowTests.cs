using System.Xml.Linq;

namespace Selector.Architecture;

/// <summary>Which project may know which; read from the project files themselves.</summary>
public class ArrowTests
{
    private static readonly Dictionary<string, string[]> Allowed = new(StringComparer.Ordinal)
    {
        ["Selector.Engine"] = [],
        ["Selector.Documents"] = ["Selector.Engine"],
        ["Selector.Storage"] = ["Selector.Engine"],
        ["Selector.Storage.Sqlite"] = ["Selector.Storage", "Selector.Engine"],
        ["Selector.Application"] = ["Selector.Engine", "Selector.Documents", "Selector.Storage"],
        ["Selector.Web"] = ["Selector.Engine", "Selector.Documents", "Selector.Application", "Selector.Storage.Sqlite"],
        ["Selector.Cli"] = ["Selector.Engine", "Selector.Documents", "Selector.Application", "Selector.Storage.Sqlite"],
    };

    [Fact]
    public void Every_project_of_the_product_is_on_the_list()
    {
        var projects = Directory.EnumerateFiles(Path.Combine(Repository.Root, "src"), "*.csproj", SearchOption.AllDirectories)
            .Select(f => Path.GetFileNameWithoutExtension(f)!);

        Assert.Empty(projects.Except(Allowed.Keys));
    }

    [Fact]
    public void No_project_refers_to_one_that_it_may_not_know()
    {
        var wrong = Allowed
            .Select(a => (a.Key, Path: Path.Combine(Repository.Root, "src", a.Key, a.Key + ".csproj"), a.Value))
            .Where(a => File.Exists(a.Path))
            .SelectMany(a => References(a.Path).Except(a.Value).Select(r => $"{a.Key} -> {r}"));

        Assert.Empty(wrong);
    }

    [Fact]
    public void The_engine_takes_no_package_that_ships()
    {
        var engine = XDocument.Load(Path.Combine(Repository.Root, "src/Selector.Engine/Selector.Engine.csproj"));

        Assert.All(engine.Descendants("PackageReference"), p => Assert.Equal("all", p.Attribute("PrivateAssets")?.Value));
    }

    [Fact]
    public void Pages_do_not_know_the_storage()
    {
        var pages = Repository.Sources("src/Selector.Web", ".razor", ".cs")
            .Where(f => Path.GetFileName(f) != "Program.cs")
            .Where(f => File.ReadAllText(f).Contains("Selector.Storage", StringComparison.Ordinal))
            .Where(f => !f.Contains("Composition", StringComparison.Ordinal));

        Assert.Empty(pages);
    }

    private static IEnumerable<string> References(string project) => XDocument.Load(project)
        .Descendants("ProjectReference")
        .Select(r => Path.GetFileNameWithoutExtension(r.Attribute("Include")!.Value.Replace('\\', '/')));
}
