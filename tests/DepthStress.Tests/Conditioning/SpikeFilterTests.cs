using DepthStress.Core.Conditioning;

namespace DepthStress.Tests.Conditioning;

public class SpikeFilterTests
{
    [Theory]
    [InlineData(1, 1.0)]
    [InlineData(2, -1.0)]
    [InlineData(3, 1.0)]
    public void A_spike_of_up_to_three_samples_is_marked_and_nothing_else(int length, double size)
    {
        var curve = Waves.Curve(100);
        for (var i = 50; i < 50 + length; i++) curve[i] += size;
        Assert.Equal(Enumerable.Range(50, length), Marked(curve));
    }

    [Fact]
    public void A_longer_stretch_is_a_bed() => Assert.Empty(Marked(Waves.Curve(100, (50, 54, 1.0))));

    [Fact]
    public void A_bed_boundary_is_kept() => Assert.Empty(Marked(Waves.Curve(100, (50, 100, 1.0))));

    [Fact]
    public void A_thin_bed_that_the_tool_enters_over_several_samples_is_kept()
    {
        var curve = Waves.Curve(100);
        double[] bed = [0.25, 0.5, 0.75, 1, 0.75, 0.5, 0.25];
        for (var i = 0; i < bed.Length; i++) curve[50 + i] += bed[i];
        Assert.Empty(Marked(curve));
    }

    [Fact]
    public void The_threshold_decides()
    {
        var curve = Waves.Curve(100);
        curve[50] += 0.1;
        Assert.Equal([50], Marked(curve, threshold: 5));
        Assert.Empty(Marked(curve, threshold: 50));
    }

    [Fact]
    public void Beside_a_gap_nothing_returns_so_nothing_is_marked()
    {
        var curve = Waves.Curve(100);
        curve[50] += 1;
        curve[51] = double.NaN;
        Assert.Empty(Marked(curve));
    }

    [Fact]
    public void Lengths_must_agree() => Assert.Throws<ArgumentException>(() => SpikeFilter.Mark([1, 2], [1], 3, 5));

    private static IEnumerable<int> Marked(double[] curve, double threshold = 5)
    {
        var marks = SpikeFilter.Mark(Waves.Depths(curve.Length), curve, 3, threshold);
        return Enumerable.Range(0, curve.Length).Where(i => marks[i]);
    }
}
