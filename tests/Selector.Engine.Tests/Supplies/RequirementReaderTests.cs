using Selector.Engine.Supplies;

namespace Selector.Engine.Tests.Supplies;

public class RequirementReaderTests
{
    [Fact]
    public void An_empty_requirement_reads_as_its_defaults_without_fault()
    {
        var values = RequirementReader.Read(Standard.Registry, Requirement.Empty);

        Assert.Empty(values.Faults);
        Assert.Equal(24, values["dc.nominal"]);
    }

    [Theory]
    [InlineData("")]
    [InlineData("0")]
    [InlineData("-1")]
    [InlineData("1e300")]
    [InlineData("1e-300")]
    [InlineData("NaN")]
    [InlineData("Infinity")]
    [InlineData("1,234")]
    [InlineData("5 A")]
    [InlineData("five")]
    public void A_bad_text_gets_a_message_that_names_the_field_and_is_kept(string text)
    {
        var value = RequirementReader.Read(Standard.Registry, Requirement.Empty.With(CommonFields.OutputVoltage, text)).Find(CommonFields.OutputVoltage)!;

        Assert.StartsWith("Output: ", value.Fault, StringComparison.Ordinal);
        Assert.Equal(text, value.Text);
    }

    [Fact]
    public void Every_quantity_field_stands_every_absurd_text_with_a_message_or_a_finite_value()
    {
        string[] texts = ["", "0", "-5", "1e300", "-1e300", "1e-300", "NaN", "∞", new string('9', 5_000), "4k7", "1,234", "\u0000", "м"];
        var registry = Standard.Registry;
        foreach (var field in registry.Fields)
        {
            foreach (var text in texts)
            {
                var value = RequirementReader.Read(registry, Requirement.Empty.With("source", "mains").With(field.Key, text)).Find(field.Key)!;
                Assert.True(value.Fault is null ? double.IsFinite(value.Value) : value.Fault.StartsWith(field.Label + ":", StringComparison.Ordinal), $"{field.Key} '{text}'");
            }
        }
    }

    [Fact]
    public void What_contradicts_another_field_is_said_at_the_field()
    {
        var values = RequirementReader.Read(Standard.Registry, Requirement.Empty.With(CommonFields.LoadLeast, "3 A"));

        var fault = Assert.Single(values.Faults);
        Assert.Equal(CommonFields.LoadLeast, fault.Field.Key);
        Assert.Contains("full load", fault.Fault, StringComparison.Ordinal);
    }

    [Fact]
    public void A_fault_in_a_field_that_does_not_matter_now_stops_nothing()
    {
        Assert.True(RequirementReader.Read(Standard.Registry, Requirement.Empty.With("mains.voltage", "nonsense")).Ok);
        Assert.False(RequirementReader.Read(Standard.Registry, Requirement.Empty.With("source", "mains").With("mains.voltage", "nonsense")).Ok);
    }

    [Fact]
    public void A_quantity_is_understood_as_people_write_it_and_echoed()
    {
        var value = RequirementReader.Read(Standard.Registry, Requirement.Empty.With(CommonFields.LoadFull, "1A5")).Find(CommonFields.LoadFull)!;

        Assert.Equal(1.5, value.Value);
        Assert.Equal("1.5\u202fA", value.Echo);
    }
}
