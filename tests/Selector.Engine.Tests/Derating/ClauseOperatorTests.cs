using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using Selector.Engine.Derating;

namespace Selector.Engine.Tests.Derating;

public class ClauseOperatorTests
{
    [Theory]
    [InlineData("factor 0.8", 50, 25, 40)]
    [InlineData("falling 0.6 70 94", 1, 70, 0.6)]
    [InlineData("falling 0.6 70 94", 1, 82, 0.3)]
    [InlineData("falling 0.6 70 94", 1, 120, 0)]
    [InlineData("cap 125", 150, 25, 125)]
    [InlineData("cap 125", 110, 25, 110)]
    [InlineData("offset 25", 150, 25, 125)]
    [InlineData("reciprocal 1.25", 5, 25, 4)]
    [InlineData("least(offset 25; cap 125)", 175, 25, 125)]
    [InlineData("refused", 100, 25, 0)]
    public void Each_operator_allows_what_it_says(string text, double rating, double temperature, double allowed) =>
        Assert.Equal(allowed, PolicyReader.Operator(text).Allowed(rating, temperature), 12);

    [Property(MaxTest = 10_000)]
    public Property The_least_rating_just_carries_the_stress(PositiveInt stress, int which)
    {
        string[] texts = ["factor 0.8", "falling 0.6 70 94", "offset 25", "reciprocal 1.25", "least(factor 0.5; offset 3)"];
        var op = PolicyReader.Operator(texts[(int)(Math.Abs((long)which) % texts.Length)]);
        var s = stress.Get / 7.0;
        var least = op.LeastRating(s, 80)!.Value;

        return (Math.Abs(op.Allowed(least, 80) - s) <= 1e-9 * s).ToProperty();
    }

    [Theory]
    [InlineData("")]
    [InlineData("factor")]
    [InlineData("factor x")]
    [InlineData("least(nothing)")]
    [InlineData("multiply 2")]
    public void Anything_else_is_refused_in_words(string text) =>
        Assert.Throws<FormatException>(() => PolicyReader.Operator(text));
}
