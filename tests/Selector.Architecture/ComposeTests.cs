using System.Text.RegularExpressions;

namespace Selector.Architecture;

/// <summary>
/// The compose file is checked by its structure, since no container engine runs where the tests do. Its form is plain enough
/// to be read by indentation.
/// </summary>
public class ComposeTests
{
    private static readonly string[] Lines = File.ReadAllLines(Path.Combine(Repository.Root, "docker-compose.yml"));

    [Fact]
    public void It_has_one_service() => Assert.Equal(["selector"], Under("services"));

    [Fact]
    public void Its_store_lies_on_a_named_volume_that_is_declared()
    {
        Assert.Equal(["selector-store"], Under("volumes"));
        Assert.Contains(Lines, l => l.Trim() == "- selector-store:/var/lib/selector");
        Assert.Contains(Lines, l => l.Trim() == "SELECTOR_STORE: /var/lib/selector/selector.db");
    }

    [Fact]
    public void It_listens_on_loopback_only() =>
        Assert.All(Lines.Where(l => l.Contains("ASPNETCORE_URLS", StringComparison.Ordinal)), l => Assert.Matches(@"http://127\.0\.0\.1:\d+$", l));

    [Fact]
    public void Its_container_file_exists_and_does_not_run_as_root()
    {
        var name = Lines.Select(l => Regex.Match(l, @"dockerfile:\s*(\S+)")).Single(m => m.Success).Groups[1].Value;
        var file = File.ReadAllText(Path.Combine(Repository.Root, name));

        Assert.Contains("USER selector", file, StringComparison.Ordinal);
        Assert.Contains("src/Selector.Web", file, StringComparison.Ordinal);
    }

    /// <summary>Keys one level under a top-level key.</summary>
    private static IEnumerable<string> Under(string key) => Lines
        .SkipWhile(l => l != key + ":").Skip(1)
        .TakeWhile(l => l.Length == 0 || char.IsWhiteSpace(l[0]))
        .Where(l => Regex.IsMatch(l, @"^  \S.*:"))
        .Select(l => l.Trim().TrimEnd(':'));
}
