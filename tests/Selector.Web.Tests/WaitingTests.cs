using Bunit;
using Selector.Web.Tests.Support;

namespace Selector.Web.Tests;

/// <summary>Before the page is interactive.</summary>
public sealed class WaitingTests() : Shop(interactive: false)
{
    [Fact]
    public async Task Nothing_can_be_pressed_or_typed_before_the_page_is_interactive()
    {
        var sheet = Sheet(await Supply());

        Assert.Equal("false", sheet.Find("main").GetAttribute("data-interactive"));
        Assert.All(sheet.FindAll("main button, main input, main select, main textarea"), e => Assert.True(e.HasAttribute("disabled"), e.OuterHtml));
    }

    [Fact]
    public async Task The_first_answer_already_holds_the_ledger() =>
        Assert.NotEmpty(Sheet(await Supply()).FindAll("tr[data-kind]"));
}
