using Selector.Documents.Sheets;

namespace Selector.Documents.Tests;

public class MoneyTests
{
    [Theory]
    [InlineData(0, "0.00")]
    [InlineData(12600, "1.26")]
    [InlineData(375, "0.0375")]
    [InlineData(370, "0.0370")]
    [InlineData(-375, "-0.0375")]
    [InlineData(-12600, "-1.26")]
    [InlineData(1234567890100, "123456789.01")]
    [InlineData(long.MaxValue, "922337203685477.5807")]
    [InlineData(long.MinValue, "-922337203685477.5808")]
    public void Ten_thousandths_are_written_exactly(long amount, string text) => Assert.Equal(text, Money.Write(amount));

    [Fact]
    public void Currencies_are_never_added_to_each_other()
    {
        var sums = Money.Sums([("USD", 1), ("EUR", 2), ("USD", 3)]);

        Assert.Equal([("EUR", 2L), ("USD", 4L)], sums);
        Assert.Equal("0.0002\u00a0EUR and 0.0004\u00a0USD", Money.Words(sums));
    }

    [Fact]
    public void A_sum_that_does_not_fit_is_refused_and_not_wrapped() =>
        Assert.Throws<OverflowException>(() => Money.Sums([("EUR", long.MaxValue), ("EUR", 1)]));
}
