using Bunit;
using Selector.Web.Tests.Support;

namespace Selector.Web.Tests;

public sealed class TypedPartTests : Shop
{
    private const string Row = "tr[data-position=C1][data-kind=voltage]";

    [Fact]
    public async Task A_part_typed_in_as_people_write_it_is_fitted_and_rated()
    {
        var sheet = Opened(await Supply());
        Type(sheet, "maker", "Ownmake");
        Type(sheet, "code", "Z-100");
        Type(sheet, "capacitance", "470u");
        Type(sheet, "voltage", "63");

        sheet.Find(".part-form").Submit();

        sheet.WaitForAssertion(() => Assert.Contains("Ownmake Z-100", sheet.Find("tr[data-position=C1] .part").TextContent, StringComparison.Ordinal), Patience);
        sheet.WaitForAssertion(() => Assert.Equal("63", sheet.Find($"{Row} [data-cell=rating]").GetAttribute("data-value")), Patience);
        Assert.Contains("needs", sheet.Find("tr[data-position=C1][data-kind=ripple-current] [data-cell=verdict]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_is_wrong_is_said_at_its_field_and_nothing_typed_is_lost()
    {
        var sheet = Opened(await Supply());
        Type(sheet, "maker", "Ownmake");
        Type(sheet, "capacitance", "lots");

        sheet.Find(".part-form").Submit();

        sheet.WaitForElement(".part-form .fault", Patience);
        Assert.Contains("No number", sheet.Find(".part-form [data-field=capacitance] .fault").TextContent, StringComparison.Ordinal);
        Assert.Contains("ordering code is missing", sheet.Find(".part-form [data-field=code] .fault").TextContent, StringComparison.Ordinal);
        Assert.Contains("voltage", sheet.Find(".part-form [data-field=voltage] .fault").TextContent, StringComparison.Ordinal);
        Assert.Equal("lots", sheet.Find(".part-form [data-field=capacitance] input").GetAttribute("value"));
        Assert.Equal("Ownmake", sheet.Find(".part-form [data-field=maker] input").GetAttribute("value"));
    }

    private IRenderedComponent<Components.Pages.SheetPage> Opened(int number)
    {
        var sheet = Sheet(number);
        sheet.Find($"{Row} button").Click();

        // Once the candidates are there nothing draws the row anew while its boxes are being filled.
        sheet.WaitForElement("[data-count=candidates]", Patience);
        sheet.WaitForElement(".part-form", Patience);
        return sheet;
    }

    private static void Type(IRenderedComponent<Components.Pages.SheetPage> sheet, string field, string text) =>
        sheet.Find($".part-form [data-field={field}] input").Change(text);
}
