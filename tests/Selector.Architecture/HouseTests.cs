using System.Text.RegularExpressions;

namespace Selector.Architecture;

/// <summary>Rules of the house that a machine can hold.</summary>
public partial class HouseTests
{
    [Fact]
    public void The_root_holds_what_it_should_and_nothing_else()
    {
        string[] expected = ["DEVELOPERS.md", "LICENSE", "README.md", "Selector.sln", "db", "deploy", "docker-compose.yml", "src", "tests"];

        var found = Directory.EnumerateFileSystemEntries(Repository.Root).Select(e => Path.GetFileName(e)!)
            .Where(n => !n.StartsWith('.')).Order(StringComparer.Ordinal);

        Assert.Equal(expected.Order(StringComparer.Ordinal), found);
    }

    [Fact]
    public void The_engine_has_its_banned_symbols_and_the_analyzer_that_reads_them()
    {
        var project = File.ReadAllText(Path.Combine(Repository.Root, "src/Selector.Engine/Selector.Engine.csproj"));
        var banned = File.ReadAllText(Path.Combine(Repository.Root, "src/Selector.Engine/BannedSymbols.txt"));

        Assert.Contains("BannedApiAnalyzers", project, StringComparison.Ordinal);
        Assert.Contains("BannedSymbols.txt", project, StringComparison.Ordinal);
        Assert.All(
            new[] { "System.DateTime.UtcNow", "CurrentCulture", "System.Random", "System.Numerics.Vector`1", "System.IO.File", "System.Console" },
            symbol => Assert.Contains(symbol, banned, StringComparison.Ordinal));
    }

    [Fact]
    public void The_engine_uses_no_platform_width_vectors_and_no_threads_of_its_own()
    {
        var wrong = Repository.Sources("src/Selector.Engine", ".cs")
            .Where(f => Forbidden().IsMatch(File.ReadAllText(f)));

        Assert.Empty(wrong);
    }

    [Fact]
    public void No_stage_is_named_outside_its_folder_and_the_registry()
    {
        var stages = Directory.EnumerateFiles(Path.Combine(Repository.Root, "src/Selector.Engine/Circuits"), "*Stage.cs", SearchOption.AllDirectories)
            .Select(f => (Name: Path.GetFileNameWithoutExtension(f), Folder: Path.GetDirectoryName(f)!))
            .Where(s => s.Name != "IStage").ToList();

        // OutputStage holds the choice of source, which the two front ends read to know whether they apply.
        var wrong = from file in Repository.Sources("src", ".cs", ".razor")
                    where Path.GetFileName(file) != "Standard.cs"
                    from stage in stages
                    where !file.StartsWith(stage.Folder, StringComparison.Ordinal)
                        && !(stage.Name == "OutputStage" && file.Contains("Circuits", StringComparison.Ordinal))
                    where Regex.IsMatch(File.ReadAllText(file), $@"\b{stage.Name}\b")
                    select $"{Path.GetRelativePath(Repository.Root, file)} names {stage.Name}";

        Assert.Empty(wrong);
    }

    [Fact]
    public void The_readme_names_the_two_commands()
    {
        var readme = File.ReadAllText(Path.Combine(Repository.Root, "README.md"));

        Assert.Contains("dotnet run --project src/Selector.Web", readme, StringComparison.Ordinal);
        Assert.Contains("bash tests/run.sh", readme, StringComparison.Ordinal);
        Assert.Contains("bash tests/run.sh", File.ReadAllText(Path.Combine(Repository.Root, ".ci/run")), StringComparison.Ordinal);
    }

    [GeneratedRegex(@"\bVector<|\bnew Thread\b|Stopwatch")]
    private static partial Regex Forbidden();
}
