using Bunit;
using Selector.Application.Supplies;
using Selector.Web.Tests.Support;

namespace Selector.Web.Tests;

public sealed class CandidateTests : Shop
{
    private const string Row = "tr[data-position=C1][data-kind=voltage]";

    [Fact]
    public async Task A_closed_row_ranks_nothing()
    {
        var sheet = Sheet(await Supply());

        Assert.Empty(sheet.FindAll("[data-candidate]"));
        Assert.Equal("false", sheet.Find($"{Row} button").GetAttribute("aria-expanded"));
    }

    [Fact]
    public async Task Opening_a_row_ranks_the_catalogue_for_its_position()
    {
        var sheet = Opened(await Supply());

        Assert.Equal("true", sheet.Find($"{Row} button").GetAttribute("aria-expanded"));
        Assert.Equal(["HOLDS-50", "LACKS-25", "UNRATED-50"], sheet.FindAll("[data-candidate]").Select(c => c.GetAttribute("data-candidate")).Distinct().Order(StringComparer.Ordinal));
        Assert.Equal("HOLDS-50", sheet.Find("[data-candidate]").GetAttribute("data-candidate"));
        Assert.Contains("3 parts", sheet.Find("[data-count=candidates]").TextContent, StringComparison.Ordinal);
        Assert.Contains("2 hold", sheet.Find("[data-count=candidates]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_lacks_says_by_how_much_and_what_is_not_rated_says_why()
    {
        var sheet = Opened(await Supply());

        Assert.Contains("lacks", sheet.Find("[data-candidate='LACKS-25'] [data-cell=least-margin]").TextContent, StringComparison.Ordinal);
        Assert.Contains("needs ripple current", sheet.Find("[data-candidate='UNRATED-50'] [data-cell=reason]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task An_open_row_says_why()
    {
        var why = Opened(await Supply()).Find(".why");

        Assert.Contains("greatest bus voltage", why.TextContent, StringComparison.Ordinal);
        Assert.Contains("28.0\u202fV", why.TextContent, StringComparison.Ordinal);
        Assert.NotNull(why.QuerySelector("[data-axis=dc]"));
    }

    [Fact]
    public async Task Every_stress_of_a_candidate_is_one_press_away()
    {
        var sheet = Opened(await Supply());
        Assert.Empty(sheet.FindAll(".stresses"));

        sheet.Find("[data-candidate='HOLDS-50'] [data-tool=stresses]").Click();

        sheet.WaitForElement(".stresses tr", Patience);
    }

    [Fact]
    public async Task Fitting_a_part_is_an_edit_of_the_supply_and_can_be_undone()
    {
        var number = await Supply();
        var sheet = Opened(number);

        await sheet.Find("[data-candidate='HOLDS-50'] [data-tool=fit]").ClickAsync(new());

        sheet.WaitForElement("[data-tool=unfit]", Patience);
        var edit = (await Supplies.Log(number))[^1];
        Assert.Equal((SupplyFields.Fit("C1"), ""), (edit.Field, edit.Old));
        Assert.StartsWith("part ", edit.New, StringComparison.Ordinal);

        await sheet.Find("[data-tool=undo]").ClickAsync(new());

        sheet.WaitForAssertion(() => Assert.Empty(sheet.FindAll("[data-tool=unfit]")), Patience);
        Assert.Equal("", (await Supplies.Open(number))!.Fit("C1"));
    }

    private IRenderedComponent<Components.Pages.SheetPage> Opened(int number)
    {
        var sheet = Sheet(number);
        sheet.Find($"{Row} button").Click();
        sheet.WaitForElement("[data-candidate]", Patience);
        return sheet;
    }
}
