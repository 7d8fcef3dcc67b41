using Bunit;
using Microsoft.Extensions.DependencyInjection;
using Selector.Application.Assessing;
using Selector.Engine.Supplies;
using Selector.Web.Tests.Support;
using Selector.Web.Words;

namespace Selector.Web.Tests;

public sealed class LedgerTests : Shop
{
    [Fact]
    public async Task The_page_shows_every_row_of_the_ledger_with_its_figures()
    {
        var number = await Supply();
        var ledger = await Ledger(number);

        var sheet = Sheet(number);

        var expected = ledger.Rows.Select(r => (r.Position, r.Kind, r.Verdict.ToString()));
        var found = sheet.FindAll("[data-position][data-kind]")
            .Select(r => (r.GetAttribute("data-position")!, r.GetAttribute("data-kind")!, r.GetAttribute("data-verdict")!));
        Assert.Equal(expected.Order(), found.Order());
        foreach (var row in ledger.Positions.SelectMany(p => p.Rows).Where(r => r.Verdict != Verdict.NotAssessed))
        {
            var cells = $"tr[data-position='{row.Position}'][data-kind='{row.Kind}'] [data-cell=";
            Assert.Equal(Shown.Number(row.Stress, row.Spec!.Unit), sheet.Find(cells + "stress]").TextContent);
            Assert.Equal(Shown.Raw(row.Margin), sheet.Find(cells + "margin]").GetAttribute("data-value"));
        }
    }

    [Fact]
    public async Task Counts_stand_above_the_ledger()
    {
        var number = await Supply();
        var counts = (await Ledger(number)).Counts;

        var sheet = Sheet(number);

        Assert.Equal($"{counts.Empty}", sheet.Find("[data-count=empty]").GetAttribute("data-value"));
        Assert.Equal($"{counts.NotAssessed}", sheet.Find("[data-count=not-assessed]").GetAttribute("data-value"));
        Assert.Equal($"{counts.Hold}", sheet.Find("[data-count=hold]").GetAttribute("data-value"));
    }

    [Fact]
    public async Task With_a_fault_the_last_good_ledger_stays_and_is_marked_old()
    {
        var sheet = Sheet(await Supply());
        var rows = sheet.FindAll("tr[data-kind]").Count;
        Assert.Equal("false", sheet.Find("main").GetAttribute("data-old"));

        FieldTests.Box(sheet, CommonFields.LoadFull).Change("much");

        sheet.WaitForAssertion(() => Assert.Equal("true", sheet.Find("main").GetAttribute("data-old")), Patience);
        Assert.Equal(rows, sheet.FindAll("tr[data-kind]").Count);
        Assert.NotNull(sheet.Find("[data-mark=old]"));

        FieldTests.Box(sheet, CommonFields.LoadFull).Change("0.5 A");

        sheet.WaitForAssertion(() => Assert.Equal("false", sheet.Find("main").GetAttribute("data-old")), Patience);
    }

    [Fact]
    public async Task A_supply_with_a_fault_from_the_start_says_so_instead_of_a_ledger()
    {
        var sheet = Sheet(await Supply((CommonFields.LoadFull, "much")));

        Assert.Contains("mend the fields", sheet.Find(".waiting").TextContent, StringComparison.Ordinal);
        Assert.Empty(sheet.FindAll("table.ledger"));
    }

    [Fact]
    public async Task An_edit_by_somebody_else_reaches_the_open_sheet()
    {
        var number = await Supply();
        var sheet = Sheet(number);

        await Supplies.Apply(number, new Application.Supplies.Edit(CommonFields.LoadFull, null, "0.7 A", "B. Other"));

        sheet.WaitForAssertion(() => Assert.Equal("0.7 A", FieldTests.Box(sheet, CommonFields.LoadFull).GetAttribute("value")), Patience);
    }

    private async Task<Ledger> Ledger(int number) =>
        (await Services.GetRequiredService<AssessmentDesk>().Assess((await Supplies.Open(number))!)).Ledger;
}
