using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using static DepthStress.Tests.Model.PressureWell;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>Normal trends and methods of shale through the whole chain, on an invented well whose truth is known.</summary>
public class PorePressureStageTests
{
    [Fact]
    public void A_fitted_trend_finds_the_truth_and_says_what_it_rests_on()
    {
        var model = Computed(Eaton);
        var trend = Assert.Single(model.Trends);
        // Logs without scatter: six digits, the valley of three parameters is flat.
        Assert.Equal(190 * Unit, trend.Trend.Surface, 190e-6 * Unit);
        Assert.Equal(1700, trend.Trend.Length, 1700e-6);
        Assert.Equal((600.0, 2000.0, -1), (trend.Top, trend.Base, trend.Zone));
        Assert.Equal(Md.Count(z => z is >= 600 and <= 2000 && !IsSand(z)), trend.Samples);
        Assert.Contains(model.Texts(), t => t.StartsWith("normal trend of slowness: surface_slowness 190.0 us/ft +- 0.0 us/ft, matrix_slowness 65.0 us/ft", StringComparison.Ordinal));
        var picked = model.Column(Property.PickedSlowness);
        Assert.Equal(trend.Samples, picked.Count(p => !double.IsNaN(p)));
        Assert.Equal(Normal(2850), model.Column(Property.NormalSlowness)[At(2850)], 1e-6 * Normal(2850));
    }

    // Eaton by hand; the trend is met to six digits, the cube of it to some kPa.
    [Fact]
    public void Shale_on_its_trend_is_normal_and_slower_shale_is_overpressured()
    {
        var pp = Computed(Eaton).Column(Property.PorePressure);
        Assert.Equal(Hydrostatic(1050), pp[At(1050)], 1e3);
        var expected = Weight(2850) - ((Weight(2850) - Hydrostatic(2850)) * Math.Pow(Normal(2850) / Slowness(2850), 3));
        Assert.Equal(expected, pp[At(2850)], 1e3);
        Assert.True(expected > 1.1 * Hydrostatic(2850));
    }

    [Fact]
    public void A_given_trend_is_not_fitted()
    {
        var pore = Eaton with { NormalTrend = new() { SurfaceSlowness = Chosen(190 * Unit), MatrixSlowness = Chosen(65 * Unit), ScaleLength = Chosen(1700.0) } };
        var model = Computed(pore);
        Assert.Equal(0, Assert.Single(model.Trends).Samples);
        Assert.All(model.Column(Property.PickedSlowness), p => Assert.True(double.IsNaN(p)));
        Assert.Contains(model.Texts(), t => t.EndsWith("scale_length 1700.0 m (given); given, not fitted", StringComparison.Ordinal));
        Assert.Equal(Hydrostatic(1050), model.Column(Property.PorePressure)[At(1050)], 1e-3);
    }

    // Shale on its trend has the normal pressure by every method that has a trend (identity); below 2000 m all see overpressure.
    [Theory]
    [InlineData(PorePressureMethod.EatonSonic)]
    [InlineData(PorePressureMethod.EatonResistivity)]
    [InlineData(PorePressureMethod.ZhangSonic)]
    [InlineData(PorePressureMethod.ZhangPorosity)]
    [InlineData(PorePressureMethod.EquivalentDepth)]
    public void Every_trend_method_gives_normal_pressure_on_the_trend(PorePressureMethod method)
    {
        var logs = LogsOf(porosity: z => IsSand(z) ? 0.25 : 0.46 * Math.Exp(-z * 0.001118) * (z > 2000 ? 1.2 : 1));
        var pp = Run(With(Eaton with { Method = Chosen(method) }), logs).Column(Property.PorePressure);
        Assert.Equal(Hydrostatic(1050), pp[At(1050)], 2e3);
        Assert.True(pp[At(2850)] > 1.05 * Hydrostatic(2850));
        Assert.True(pp[At(2850)] < Weight(2850));
    }

    // Equivalent depth by hand: 2850 m has the slowness of a depth on the trend; there the stress is normal. A kilopascal for the fitted trend.
    [Fact]
    public void Equivalent_depth_is_found_on_the_trend()
    {
        var depth = -1700 * Math.Log(((Slowness(2850) / Unit) - 65) / 125);
        Assert.InRange(depth, 1500, 2500);
        var expected = Weight(2850) - (Weight(depth) - Hydrostatic(depth));
        Assert.Equal(expected, Computed(Eaton with { Method = Chosen(PorePressureMethod.EquivalentDepth) }).Column(Property.PorePressure)[At(2850)], 2e3);
    }

    [Fact]
    public void Equivalent_depth_above_the_log_uses_what_is_assumed_there()
    {
        // 150 us/ft is the trend's at 656 m; 170 us/ft at 297 m, above the log.
        var depth = -1700 * Math.Log((170.0 - 65) / 125);
        Assert.InRange(depth, 100, 499);
        var given = new NormalTrendSettings { SurfaceSlowness = Chosen(190 * Unit), MatrixSlowness = Chosen(65 * Unit), ScaleLength = Chosen(1700.0) };
        var pp = Run(With(Eaton with { Method = Chosen(PorePressureMethod.EquivalentDepth), NormalTrend = given }), LogsOf(z => 170 * Unit)).Column(Property.PorePressure);
        Assert.Equal(Weight(1050) - (G * (2200 - Water) * depth), pp[At(1050)], 1.0); // rounding
    }

    // The exponential trend of a zone is its own when the zone decides about it, and is picked on the zone alone.
    [Fact]
    public void A_zone_with_its_own_trend_settings_has_its_own_trend()
    {
        var own = new StageSettings
        {
            PorePressure = new() { NormalTrend = new() { Top = Chosen(600.0, 40, SettingKind.Zone), Base = Chosen(2000.0, 41, SettingKind.Zone), MatrixSlowness = Chosen(60 * Unit, 42, SettingKind.Zone) } },
        };
        var setup = With(Eaton) with
        {
            Zones = [Zone("upper", 500, new()), Zone("lower", 1300, own)],
        };
        var trends = Run(setup, LogsOf()).Trends;
        Assert.Equal([0, 1], trends.Select(t => (int)t.Zone));
        Assert.True(trends[0].Base < 1300);
        Assert.True(trends[1].Top >= 1300);
        Assert.Equal(60 * Unit, trends[1].Trend.Limit);

        static Zone Zone(string name, double top, StageSettings overrides) => new(name, top, null, Core.Depth.DepthKind.Measured, overrides, WellFile);
    }

    [Fact]
    public void A_median_passes_over_single_bad_samples()
    {
        var spoilt = LogsOf(z => !IsSand(z) && z % 40 == 0 ? 3 * Slowness(z) : Slowness(z));
        NormalTrendSettings Smoothed(Smoothing smoothing) => Interval with { Smoothing = Chosen(smoothing), Window = Chosen(20.0), MatrixSlowness = Chosen(65 * Unit) };
        double Length(NormalTrendSettings trend) => Run(With(Eaton with { NormalTrend = trend }), spoilt).Trends[0].Trend.Length;
        // The median of nine or so samples of a smooth curve is its middle one, within a part in a hundred.
        Assert.Equal(1700, Length(Smoothed(Smoothing.Median)), 17.0);
        Assert.True(Math.Abs(Length(Smoothed(Smoothing.Mean)) - 1700) > 100);
    }

    [Fact]
    public void Settings_alone_decide_so_a_second_run_is_the_same()
    {
        var (first, second) = (Computed(Eaton), Computed(Eaton));
        Assert.Equal(first.Column(Property.PorePressure), second.Column(Property.PorePressure));
    }
}
