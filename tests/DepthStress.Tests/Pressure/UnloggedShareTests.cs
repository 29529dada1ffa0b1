using CsCheck;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Pressure;

/// <summary>The share of Sv that no density log stands for.</summary>
public class UnloggedShareTests
{
    private static OverburdenSettings Mean(double density) => new()
    {
        AboveLog = Chosen(ShallowDensity.Mean(density)),
        Gaps = Chosen(new DensityFill(DensityFillKind.Linear)),
    };

    // Constant density: everything down to 100 m of z metres is unlogged.
    [Fact]
    public void Of_constant_density_it_is_depth_over_depth()
    {
        var model = Run(Setup with { Overburden = Mean(2400) }, Table([100, 200, 400, 800], Curve(Property.Density, Same(2400, 4))));
        Assert.Equal([1, 0.5, 0.25, 0.125], model.Column(Property.UnloggedShare), (a, b) => Math.Abs(a - b) < 1e-12);
    }

    // The steps that end on a filled sample count: 100 m above, and 200 to 300 m of 500 m.
    [Fact]
    public void Fills_count()
    {
        var model = Run(
            Setup with { Overburden = Mean(2400) }, Table([100, 200, 300, 400, 500], Curve(Property.Density, 2400, 2400, double.NaN, 2400, 2400)));
        Assert.Equal([1, 1 / 2.0, 2 / 3.0, 2 / 4.0, 2 / 5.0], model.Column(Property.UnloggedShare), (a, b) => Math.Abs(a - b) < 1e-12);
    }

    // Datum 25 m above the sea, 100 m of water: the mudline lies at 125 m. Water weighs, but nobody needs to log it.
    [Fact]
    public void Water_is_known_without_a_log()
    {
        var model = Run(Setup with { Frame = Sea, Overburden = Mean(2000) }, Table([225, 325], Curve(Property.Density, 2000, 2000)));
        Assert.Equal(2000 * 100 / (103000.0 + 200000), model.Column(Property.UnloggedShare)[0], 1e-12);
        Assert.Equal(2000 * 100 / (103000.0 + 400000), model.Column(Property.UnloggedShare)[1], 1e-12);
    }

    [Fact]
    public void A_log_from_the_ground_leaves_nothing_unlogged()
    {
        var share = Run().Column(Property.UnloggedShare);
        Assert.True(double.IsNaN(share[0])); // no stress at the ground, so no share of it
        Assert.All(share[1..], s => Assert.Equal(0, s));
    }

    [Fact]
    public void It_falls_on_logged_steps_and_rises_on_others_within_0_and_1() =>
        Gen.Select(Gen.Double[0.1, 30].Array[2, 40], Gen.Bool.Array[40], Gen.Double[0, 20]).Sample((steps, logged, above) =>
        {
            var (stress, sum) = (new double[steps.Length], above);
            for (var i = 0; i < steps.Length; i++) stress[i] = sum += steps[i];
            var share = new double[steps.Length];
            Overburden.FillUnloggedShare(stress, logged.AsSpan(0, steps.Length), above, share);
            for (var i = 0; i < share.Length; i++)
            {
                Assert.InRange(share[i], 0, 1);
                if (i > 0) Assert.True(logged[i] ? share[i] <= share[i - 1] : share[i] >= share[i - 1]);
            }
        });

    [Fact]
    public void A_sample_without_stress_has_no_share_and_the_sum_goes_on()
    {
        var share = new double[3];
        Overburden.FillUnloggedShare([10, double.NaN, 40], [true, false, false], 10, share);
        Assert.Equal([1, double.NaN, 1], share);
        Assert.Throws<ArgumentException>(() => Overburden.FillUnloggedShare([1], [true, true], 0, new double[1]));
    }
}
