using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Layers;

public class StressMisfitTests
{
    private static readonly double[] Depths4 = [10, 20, 30, 40];

    // Best line through 1, 3, 2, 4 at equal weights: 1.3, 2.1, 2.9, 3.7 (slope 0.8 a step), so distances 0.3, 0.9, 0.9, 0.3. Rounding only.
    [Fact]
    public void The_misfit_is_that_of_the_best_straight_line()
    {
        var misfit = StressMisfit.Of(Depths4, [1, 3, 2, 4], [1, 1, 1, 1]);
        Assert.Equal(0.6, misfit.Mean, 1e-12);
        Assert.Equal(0.9, misfit.Greatest, 1e-12);
    }

    [Fact]
    public void A_straight_line_fits_itself_across_a_gap()
    {
        var misfit = StressMisfit.Of(Depths4, [1, 2, double.NaN, 4], [1, 2, 1, 1]);
        Assert.Equal(0, misfit.Greatest, 1e-12); // rounding only
        Assert.Equal(0, misfit.Mean, 1e-12);
    }

    [Fact]
    public void Nothing_gives_nothing()
    {
        Assert.Equal(StressMisfit.None, StressMisfit.Of(Depths4, Same(double.NaN, 4), Same(1, 4)));
        Assert.Equal(StressMisfit.None, StressMisfit.Of([1], [5], [0]));
    }

    [Fact]
    public void Every_layer_carries_its_misfit_and_the_barriers_around_it()
    {
        var logs = LogsWith(Curve(Property.Vs, 2400, 2400, 2100, 2400, 2400));
        var strained = Layered(Run(Setup with { Settings = Settings with { HorizontalStress = Strains } }, logs), AtMost(150)).Layers;
        Assert.All(strained, l => Assert.False(double.IsNaN(l.Misfit(Property.MaxHorizontalStress).Mean)));
        var layers = Layered(Run(Setup, logs), AtMost(1) with { BarrierContrast = Chosen(0.2e6) }).Layers;
        Assert.Equal([50, 100, 100, 100, 50], layers.Select(l => l.BaseTvd - l.TopTvd));
        Assert.All(layers, l => Assert.Equal(0, l.Misfit(Property.MinHorizontalStress).Greatest, 1e-6)); // one sample each, to 1e-6 Pa

        // Poisson's ratio is 0.31 in the soft layer and 0.22 around it, so it bears half a MPa more at equal depth.
        Assert.Equal(100, layers[1].BarrierBelow, 1e-9);
        Assert.Equal(100, layers[3].BarrierAbove, 1e-9);
        Assert.True(double.IsNaN(layers[2].BarrierBelow));
    }
}
