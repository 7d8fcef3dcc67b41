using Selector.Documents.Model;

namespace Selector.Documents.Tests;

public class PointerScaleTests
{
    [Fact]
    public void A_ceiling_runs_from_zero_to_the_rating() => Assert.Equal(new PointerScale(0.25, 0.8, false, false), PointerScale.Ceiling(1, 3.2, 4));

    [Fact]
    public void A_stress_past_the_rating_stands_at_the_end_and_is_said_to_be_beyond() =>
        Assert.Equal(new PointerScale(1, 0.8, false, true), PointerScale.Ceiling(5, 3.2, 4));

    [Fact]
    public void A_value_below_zero_stands_at_zero() => Assert.Equal(0, PointerScale.Ceiling(-20, 100, 125)!.Pointer);

    [Fact]
    public void A_floor_shows_a_value_that_reaches_it_right_of_the_tick()
    {
        var scale = PointerScale.Floor(11, 10)!;

        Assert.True(scale.IsFloor && scale.Pointer > scale.Tick && !scale.Beyond);
        Assert.True(PointerScale.Floor(9, 10)!.Pointer < scale.Tick);
    }

    [Theory]
    [InlineData(null, 1.0, 2.0)]
    [InlineData(1.0, null, 2.0)]
    [InlineData(1.0, 1.0, null)]
    [InlineData(1.0, 1.0, 0.0)]
    [InlineData(double.NaN, 1.0, 2.0)]
    public void Without_its_figures_there_is_no_scale(double? stress, double? allowed, double? rating) =>
        Assert.Null(PointerScale.Ceiling(stress, allowed, rating));
}
