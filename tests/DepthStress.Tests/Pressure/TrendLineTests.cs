using DepthStress.Core.Pressure;

namespace DepthStress.Tests.Pressure;

/// <summary>Normal trends: straight lines of the logarithm of slowness.</summary>
public class TrendLineTests
{
    private static readonly TrendLine Line = new([new(0, 800e-6), new(1000, 400e-6), new(3000, 100e-6)]);

    // Halves every 1000 m, by hand; relative rounding of exp and log.
    [Theory]
    [InlineData(-1000, 1600e-6)]
    [InlineData(0, 800e-6)]
    [InlineData(500, 565.685424949238e-6)]
    [InlineData(1000, 400e-6)]
    [InlineData(2000, 200e-6)]
    [InlineData(3000, 100e-6)]
    [InlineData(4000, 50e-6)]
    public void It_is_straight_in_the_logarithm_and_carried_on_beyond_its_points(double depth, double slowness) =>
        Assert.Equal(slowness, Line.At(depth), 1e-14 * 8);

    [Fact]
    public void A_missing_depth_has_no_trend() => Assert.True(double.IsNaN(Line.At(double.NaN)));

    [Fact]
    public void Wrong_points_and_lengths_are_refused()
    {
        Assert.Throws<ArgumentException>(() => new TrendLine([new(0, 1)]));
        Assert.Throws<ArgumentException>(() => new TrendLine([new(0, 1), new(0, 2)]));
        Assert.Throws<ArgumentException>(() => new TrendLine([new(0, 1), new(double.NaN, 2)]));
        Assert.Throws<ArgumentException>(() => Line.Fill([1, 2], 0, new double[1]));
    }
}
