using System.Text.Json;
using BenchmarkDotNet.Attributes;
using Selector.Application.Catalogue;
using Selector.Application.Policies;
using Selector.Engine;
using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Parts;
using Selector.Engine.Ranking;
using Selector.Engine.Supplies;

namespace Selector.Benchmarks;

/// <summary>The shipped examples with the demo catalogue: assessment of the whole supply, and the ranking of one position.</summary>
[ShortRunJob]
public class SupplyBenchmarks
{
    private readonly Policy _policy = new PolicyShelf().Standard;
    private readonly Dictionary<string, Part[]> _catalogue = [];
    private SupplyModel _model = null!;
    private Design _design = null!;

    [Params("fixture-5v", "bench-9v", "bench-3-18v", "instrument-12v")]
    public string Example { get; set; } = "";

    [GlobalSetup]
    public void Load()
    {
        foreach (var family in Standard.Registry.Families)
        {
            _catalogue[family.Id] = [.. PartCsv.Read(family, Carried($"db/catalogue/{family.Id}.csv")).Parts];
        }

        using var json = JsonDocument.Parse(Carried($"db/examples/{Example}.json"));
        _design = Design.Empty;
        foreach (var text in json.RootElement.GetProperty("texts").EnumerateObject())
        {
            _design = text.Name.StartsWith("fit.", StringComparison.Ordinal)
                ? Fit(_design, text.Name[4..], text.Value.GetString()!)
                : _design with { Requirement = _design.Requirement.With(text.Name, text.Value.GetString()!) };
        }

        _model = SupplyModel.Build(Standard.Registry, RequirementReader.Read(Standard.Registry, _design.Requirement));
    }

    [Benchmark]
    public int Assess() => Assessor.Assess(_model, _design.Fittings, _policy, Budget.Standard).Counts.Hold;

    [Benchmark]
    public int RankReservoirs() =>
        Ranker.Rank(_model, _design.Fittings, "C1", _catalogue["electrolytic-capacitor"], _policy, default).Holding;

    private Design Fit(Design design, string position, string text)
    {
        var words = text.Split(' ');
        var part = _catalogue.Values.SelectMany(p => p).Single(p => $"{p.Maker}|{p.OrderingCode}" == words[0]);
        return design.Fit(position, Fitting.Parallel(part, words.Length > 2 ? int.Parse(words[2], System.Globalization.CultureInfo.InvariantCulture) : 1));
    }

    private static string Carried(string path)
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, path)))
            {
                return File.ReadAllText(Path.Combine(folder.FullName, path));
            }
        }

        throw new FileNotFoundException(path);
    }
}
