using DepthStress.Core.Logs;

namespace DepthStress.Tests.Ingest;

public sealed class DepthGridTests
{
    [Fact]
    public void The_first_files_depths_stand_where_they_reach() =>
        Assert.Equal([1, 2, 3], DepthGrid.Union([[1, 2, 3], [1.2, 1.7, 2.2, 2.7, 3.1]]));

    [Fact]
    public void Depths_further_up_and_down_are_added() =>
        Assert.Equal([0, 1, 2, 3, 4, 5], DepthGrid.Union([[2.0, 3.0], [0, 1, 2], [2, 3, 4, 5]]));

    [Fact]
    public void A_depth_within_half_a_step_of_the_end_is_not_added() => // it would stand beside a sample at hand
        Assert.Equal([1, 2, 3.1, 4.1], DepthGrid.Union([[1.0, 2.0], [1.1, 2.1, 3.1, 4.1]]));

    [Fact]
    public void Files_without_rows_add_nothing()
    {
        Assert.Equal([1, 2], DepthGrid.Union([[], [1, 2]]));
        Assert.Equal([1, 2], DepthGrid.Union([[1, 2], []]));
    }

    [Fact]
    public void Equal_depths_are_taken_within_the_tolerance_and_others_from_a_line()
    {
        var resampled = new bool[4];
        var brought = DepthGrid.Bring([1000, 1001, 1002], [10, 20, 40], [999.5, 1000.0005, 1000.25, 1001.5], resampled);
        Assert.Equal([double.NaN, 10, 12.5, 30], brought);
        Assert.Equal([false, false, true, true], resampled);
    }

    [Fact]
    public void No_value_is_drawn_across_a_missing_one_or_a_gap()
    {
        var resampled = new bool[5];
        var brought = DepthGrid.Bring([0, 1, 2, 3, 6, 7], [1, double.NaN, 3, 4, 5, 6], [0.5, 1.5, 2.5, 4.5, 6.5], resampled);
        Assert.Equal([double.NaN, double.NaN, 3.5, double.NaN, 5.5], brought);
        Assert.Equal([false, false, true, false, true], resampled);
    }

    [Fact]
    public void Lengths_must_agree()
    {
        Assert.Throws<ArgumentException>(() => DepthGrid.Bring([1, 2], [1], [1], new bool[1]));
        Assert.Throws<ArgumentException>(() => DepthGrid.Bring([1], [1], [1], new bool[2]));
    }
}
