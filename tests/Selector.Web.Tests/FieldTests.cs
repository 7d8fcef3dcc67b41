using AngleSharp.Dom;
using Bunit;
using Microsoft.Extensions.DependencyInjection;
using Selector.Application.Supplies;
using Selector.Engine.Supplies;
using Selector.Web.Tests.Support;

namespace Selector.Web.Tests;

public sealed class FieldTests : Shop
{
    [Fact]
    public async Task Every_field_that_matters_stands_in_the_title_block_and_no_other()
    {
        var number = await Supply();
        var state = (await Supplies.Open(number))!;
        var expected = RequirementReader.Read(Services.GetRequiredService<Registry>(), state.Requirement)
            .Fields.Where(f => f.Shown).Select(f => f.Field.Key);

        var found = Sheet(number).FindAll("[data-field]").Select(f => f.GetAttribute("data-field")!);

        Assert.Equal(expected.Order(StringComparer.Ordinal), found.Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task A_stage_that_the_page_has_never_heard_of_gets_its_fields()
    {
        var sheet = Sheet(await Supply());

        Assert.Equal("47 Ω", Box(sheet, ToyStage.Gain).GetAttribute("value"));
        Assert.Contains("Toy gain", sheet.Find($"[data-field='{ToyStage.Gain}'] label").TextContent, StringComparison.Ordinal);
        Assert.Contains("How much of the toy", sheet.Find($"[data-field='{ToyStage.Gain}'] .help").TextContent, StringComparison.Ordinal);
        Assert.Equal(["red one", "blue one"], sheet.FindAll($"[data-field='{ToyStage.Kind}'] option").Select(o => o.TextContent));
    }

    [Fact]
    public async Task A_field_appears_when_a_choice_asks_for_it()
    {
        var sheet = Sheet(await Supply());
        Assert.Empty(sheet.FindAll($"[data-field='{ToyStage.Hidden}']"));

        sheet.Find($"[data-field='{ToyStage.Kind}'] select").Change("blue");

        sheet.WaitForElement($"[data-field='{ToyStage.Hidden}']", Patience);
    }

    [Fact]
    public async Task No_box_is_a_number_box_and_every_box_has_a_label()
    {
        var sheet = Sheet(await Supply());

        Assert.Empty(sheet.FindAll("input[type=number]"));
        Assert.All(sheet.FindAll("[data-field] input, [data-field] select"), box => Assert.NotNull(sheet.Find($"label[for='{box.Id}']")));
    }

    [Fact]
    public async Task A_fault_stands_beside_its_field_and_the_text_stays_in_the_box()
    {
        var sheet = Sheet(await Supply());

        Box(sheet, CommonFields.LoadFull).Change("1,234");

        var fault = sheet.WaitForElement($"[data-field='{CommonFields.LoadFull}'] [role=alert]", Patience);
        Assert.Contains("ambiguous", fault.TextContent, StringComparison.Ordinal);
        Assert.Equal("1,234", Box(sheet, CommonFields.LoadFull).GetAttribute("value"));
        Assert.Equal("true", Box(sheet, CommonFields.LoadFull).GetAttribute("aria-invalid"));
        Assert.EndsWith("#" + Box(sheet, CommonFields.LoadFull).Id, sheet.Find("#faults a").GetAttribute("href"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_is_typed_is_saved_as_typed()
    {
        var number = await Supply();
        var sheet = Sheet(number);

        Box(sheet, CommonFields.LoadFull).Change("1A5");

        sheet.WaitForAssertion(() => Assert.Equal("1.5\u202fA", sheet.Find($"[data-field='{CommonFields.LoadFull}'] .echo").TextContent), Patience);
        Assert.Equal("1A5", (await Supplies.Open(number))!.Texts[CommonFields.LoadFull]);
    }

    [Fact]
    public async Task Who_comes_second_sees_both_values_and_keeps_what_they_typed()
    {
        var number = await Supply();
        var sheet = Sheet(number);
        Box(sheet, CommonFields.LoadFull).Focus();
        await Supplies.Apply(number, new Edit(CommonFields.LoadFull, null, "2 A", "B. Other"));

        Box(sheet, CommonFields.LoadFull).Change("1.5 A");

        sheet.WaitForAssertion(() => Assert.Contains("B. Other wrote “2 A”", sheet.Find($"[data-field='{CommonFields.LoadFull}'] .fault").TextContent, StringComparison.Ordinal), Patience);
        Assert.Equal("1.5 A", Box(sheet, CommonFields.LoadFull).GetAttribute("value"));
    }

    internal static IElement Box(IRenderedComponent<Components.Pages.SheetPage> sheet, string field) => sheet.Find($"[data-field='{field}'] input");
}
