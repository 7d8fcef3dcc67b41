using Selector.Engine.Circuits;
using Selector.Engine.Supplies;
using Selector.Engine.Tests.Support;

namespace Selector.Engine.Tests.Supplies;

/// <summary>Whatever is typed into a field gives a message that names it, or a ledger of finite numbers; never a hang, never a throw.</summary>
public class AbsurdInputTests
{
    private static readonly string[] Texts = ["0", "-1", "1e300", "-1e300", "1e-300", "NaN", "Infinity", "", " ", "12 apples", "1,234.5", "9999999", "0.0000001"];

    /// <summary>Every combination of choices that changes which stages and positions there are.</summary>
    public static TheoryData<string, string> Variants
    {
        get
        {
            var data = new TheoryData<string, string>();
            foreach (var regulation in (string[])["step-down", "linear"])
            {
                data.Add("dc", $"regulation={regulation};protect.input=series;bleeder=resistor;sink=all;case=closed;output.adjust=adjustable;preload=resistor;protect.output=to-input;sense=bank");
                data.Add("dc", $"regulation={regulation};protect.output=across;case=given;sink=U1;sink.insulated=no");
                foreach (var frontEnd in (string[])["bridge", "bridge-diodes", "centre-tap", "half-wave"])
                {
                    data.Add("mains", $"regulation={regulation};front-end={frontEnd};inlet.limiter=ntc;inlet.varistor=yes;fuse.second={(regulation == "linear" ? "bus" : "secondary")};hold-up=half;bleeder=resistor;sink=all;case=closed;output.adjust=adjustable;preload=resistor;protect.output=to-input;sense=bank");
                }
            }

            return data;
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Every_variant_is_assessed_with_and_without_parts(string source, string choices)
    {
        var requirement = With(source, choices);
        var values = RequirementReader.Read(Standard.Registry, requirement);
        Assert.Empty(values.Faults.Select(f => f.Fault));

        foreach (var design in (Design[])[new Design(requirement, Design.Empty.Fittings), Blank(requirement, values)])
        {
            var ledger = Assessor.Assess(Standard.Registry, design, TestPolicy.Industrial, Budget.Standard);

            Assert.Null(ledger.Fault);
            Assert.NotEmpty(ledger.Rows);
            Assert.All(ledger.Rows, r => Assert.True(
                Finite(r.Stress) && Finite(r.Allowed) && Finite(r.Margin) && Finite(r.Rating) && Finite(r.LeastRating) && Finite(r.KelvinLeft), $"{r.Id} {r.Stress} {r.Allowed} {r.Margin}"));
        }
    }

    [Theory]
    [MemberData(nameof(Variants))]
    public void Every_field_takes_every_text(string source, string choices)
    {
        var requirement = With(source, choices);
        foreach (var field in RequirementReader.Read(Standard.Registry, requirement).Fields.Where(f => f.Shown && !f.Field.IsChoice))
        {
            foreach (var text in Texts)
            {
                var changed = requirement.With(field.Field.Key, text);
                var values = RequirementReader.Read(Standard.Registry, changed);
                if (!values.Ok)
                {
                    Assert.All(values.Faults, f => Assert.StartsWith(f.Field.Label, f.Fault!, StringComparison.Ordinal));
                    continue;
                }

                var ledger = Assessor.Assess(Standard.Registry, new Design(changed, Design.Empty.Fittings), TestPolicy.Industrial, Budget.Standard);
                Assert.All(ledger.Rows, r => Assert.True(Finite(r.Stress) && Finite(r.Margin), $"{field.Field.Key} = {text}: {r.Id}"));
            }
        }
    }

    /// <summary>Parts with nothing but what their family demands: the worst that a catalogue may hold.</summary>
    private static Design Blank(Requirement requirement, RequirementValues values) => SupplyModel.Build(Standard.Registry, values).Positions.Aggregate(
        new Design(requirement, Design.Empty.Fittings),
        (design, position) => design.Fit(position.Id, new Fitting(TestPart.Of(
            Standard.Registry.Family(position.Family), "BLANK",
            [.. Standard.Registry.Family(position.Family).Ratings.Where(r => r.Required).Select(r => (r.Key, r.IsChoice ? 0 : Math.Sqrt(Math.Max(r.Range.Low, 1e-9) * r.Range.High)))]))));

    private static Requirement With(string source, string choices) => choices.Split(';').Select(c => c.Split('='))
        .Aggregate(Requirement.Empty.With("source", source).With("output.voltage", "9").With("output.least", "3"), (r, c) => r.With(c[0], c[1]));

    private static bool Finite(double? value) => value is null || double.IsFinite(value.Value);
}
