using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

public class QualityTests
{
    private static CurveQuality Of(EarthModel model, Property property) => CurveQuality.Of(model).Single(q => q.Role.Property == property);

    [Fact]
    public void A_whole_curve_has_no_gap_and_one_origin()
    {
        var quality = Of(Run(), Property.Vp);
        Assert.Equal((1.0, 0.0, 400.0, 4000.0, 0, 0.0), (quality.Present, quality.Top, quality.Base, quality.Median, quality.Gaps, quality.LongestGap));
        Assert.Equal([new OriginCount(SampleOrigin.Measured, "test", 5)], quality.Origins);
    }

    [Fact]
    public void Gaps_count_between_the_first_and_the_last_value_only()
    {
        var quality = Of(Run(Curve(Property.Vp, double.NaN, 4000, double.NaN, 4200, double.NaN)), Property.Vp);
        Assert.Equal((0.4, 100.0, 300.0, 4100.0, 1, 200.0), (quality.Present, quality.Top, quality.Base, quality.Median, quality.Gaps, quality.LongestGap));
    }

    [Fact]
    public void A_curve_without_values_says_so()
    {
        var quality = Of(Run(Curve(Property.Vs, Same(double.NaN))), Property.Vs);
        Assert.Equal((0.0, double.NaN, double.NaN, 0), (quality.Present, quality.Top, quality.Median, quality.Gaps));
        Assert.Empty(quality.Origins);
    }

    [Fact]
    public void Filled_density_is_told_from_logged_density()
    {
        var setup = Setup with { Overburden = new OverburdenSettings { Gaps = Chosen(new DensityFill(DensityFillKind.Linear)) } };
        var quality = Of(Run(setup, LogsWith(Curve(Property.Density, 2500, double.NaN, 2500, 2500, 2500))), Property.Density);
        Assert.Equal(1, quality.Present);
        Assert.Equal([(SampleOrigin.Measured, 4), (SampleOrigin.Filled, 1)], quality.Origins.GroupBy(o => o.Origin).Select(g => (g.Key, g.Sum(o => o.Samples))));
    }

    [Fact]
    public void Logs_that_agree_are_called_plausible() => Assert.Equal(
        [
            "Vp/Vs: median 1.67, nine tenths between 1.67 and 1.67; 0.0 % outside 1.4-3",
            "dynamic Poisson's ratio: median 0.22, nine tenths between 0.22 and 0.22; 0.0 % outside 0.05-0.45",
            // Gardner, Gardner and Gregory 1974: 0.31 x 4000^0.25 = 2.4654 g/cm3 (self-computed).
            "density against Gardner's density from velocity: median difference 0.035 g/cm3; 0.0 % further than 0.250 g/cm3 apart",
        ],
        Plausibility.Of(Run()).Select(s => UnitSystem.Metric.Show(s)));

    [Fact]
    public void Logs_that_disagree_are_counted()
    {
        var statements = Plausibility.Of(Run(
            Curve(Property.Vs, 2400, 2400, 2400, 2400, 1200), Curve(Property.Density, 2500, 2500, 2500, 2500, 2000)))
            .Select(s => UnitSystem.Metric.Show(s)).ToList();
        Assert.Contains("20.0 % outside 1.4-3", statements[0], StringComparison.Ordinal);
        Assert.Contains("20.0 % outside 0.05-0.45", statements[1], StringComparison.Ordinal);
        Assert.Contains("20.0 % further than 0.250 g/cm3 apart", statements[2], StringComparison.Ordinal);
    }

    [Fact]
    public void Nothing_is_said_about_logs_that_are_not_there() =>
        Assert.Empty(Plausibility.Of(Run(Setup, Table(Depths, Curve(Property.Density, Same(2500))))));
}
