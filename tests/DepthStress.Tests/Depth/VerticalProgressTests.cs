using DepthStress.Core.Depth;

namespace DepthStress.Tests.Depth;

public class VerticalProgressTests
{
    [Fact]
    public void A_sample_counts_when_it_is_deeper_than_all_before_and_not_too_flat()
    {
        double[] tvd = [100, 101, 101, 100.5, 103, 102, 104, 105];
        double[] inclination = [0, 0.1, 0.2, 1.8, 1.5, 0.3, 1.2, 0];
        var usable = new bool[tvd.Length];
        Assert.Equal(3, VerticalProgress.Mask(tvd, inclination, VerticalProgress.DefaultMaxInclination, usable));

        // 102 counts although 103 lies before it: 103 was too flat to count.
        Assert.Equal([true, true, false, false, false, true, true, true], usable);
    }

    [Fact]
    public void The_limit_itself_still_counts()
    {
        var usable = new bool[2];
        Assert.Equal(1, VerticalProgress.Mask([1, 2], [1.0, Math.BitIncrement(1.0)], 1.0, usable));
        Assert.Equal([true, false], usable);
    }

    [Fact]
    public void A_missing_value_does_not_count_and_does_not_stop_what_follows()
    {
        var usable = new bool[4];
        Assert.Equal(2, VerticalProgress.Mask([1, double.NaN, 3, 4], [0, 0, double.NaN, 0], 1, usable));
        Assert.Equal([true, false, false, true], usable);
    }

    [Fact]
    public void The_usual_limit_is_80_degrees() =>
        Assert.Equal(1.3962634, VerticalProgress.DefaultMaxInclination, 5e-8); // 80 pi / 180; half a unit of the last digit

    [Fact]
    public void Spans_of_unequal_length_are_refused()
    {
        Assert.Throws<ArgumentException>("inclination", () => VerticalProgress.Mask([1, 2], [0], 1, new bool[2]));
        Assert.Throws<ArgumentException>("usable", () => VerticalProgress.Mask([1, 2], [0, 0], 1, new bool[1]));
    }

    [Fact]
    public void No_samples_leave_none_out() => Assert.Equal(0, VerticalProgress.Mask([], [], 1, []));
}
