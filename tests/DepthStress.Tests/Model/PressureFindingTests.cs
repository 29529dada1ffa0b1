using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using static DepthStress.Tests.Model.PressureWell;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>Input that pore pressure cannot rest on, and results that are hardly credible: each with its depth.</summary>
public class PressureFindingTests
{
    private static PorePressureSettings Bowers(PorePressureMethod method) => Eaton with
    {
        Method = Chosen(method),
        BowersFactor = Chosen(14.0),
        BowersExponent = Chosen(0.72),
        BowersUnloading = Chosen(4.0),
        BowersMaxVelocity = Chosen(3000.0),
    };

    private static readonly NormalTrendSettings Given = new() { SurfaceSlowness = Chosen(190 * Unit), MatrixSlowness = Chosen(65 * Unit), ScaleLength = Chosen(1700.0) };

    private static Finding About(EarthModel model, string start) => Assert.Single(model.Findings, f => Shown(f).StartsWith(start, StringComparison.Ordinal));

    private static string Shown(Finding finding) => Core.Quantities.UnitSystems.Show(Core.Quantities.UnitSystem.Metric, finding.Text);

    [Fact]
    public void Too_little_shale_makes_no_trend() => Assert.Equal(
        ["well.toml(11,1): error: [pore_pressure.normal_trend]: found 26 shale samples with slowness between 600.0 m and 650.0 m true vertical depth, expected at least 30"],
        Problems(Eaton with { NormalTrend = Interval with { Base = Chosen(650.0) } }));

    [Fact]
    public void Shale_that_gets_slower_makes_no_trend() => Assert.Equal(
        ["well.toml(11,1): error: [pore_pressure.normal_trend] between 600.0 m and 2000.0 m true vertical depth: the shale gets slower with depth, expected normally compacted shale that gets faster"],
        Errors(With(Eaton), LogsOf(z => (80 + (z / 50)) * Unit)));

    [Fact]
    public void A_parameter_at_its_bound_is_a_warning()
    {
        // A straight line would have no limit within reason.
        var model = Run(With(Eaton), LogsOf(z => (190 - (0.04 * z)) * Unit));
        Assert.Contains(model.Texts(), t => t.StartsWith("normal trend of slowness: the shale does not tell ", StringComparison.Ordinal) && t.EndsWith("give it in [pore_pressure.normal_trend]", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(PorePressureMethod.BowersLoading)]
    [InlineData(PorePressureMethod.BowersUnloading)]
    public void Bowers_below_5000_ft_s_is_named_with_its_depth(PorePressureMethod method)
    {
        var model = Run(With(Bowers(method)), LogsOf(z => z is >= 900 and <= 906 ? 1 / 1500.0 : 1 / 2500.0));
        var finding = About(model, "velocity at or below 5000 ft/s, where bowers-1995-");
        Assert.Equal((4, new DepthRange(900, 906)), (finding.Samples, Assert.Single(finding.Where)));
        Assert.True(double.IsNaN(model.Column(Property.PorePressure)[At(904)]));
    }

    [Fact]
    public void Bowers_above_the_greatest_velocity_is_named_with_its_depth()
    {
        var finding = About(Run(With(Bowers(PorePressureMethod.BowersUnloading)), LogsOf(z => z is >= 900 and <= 906 ? 1 / 3100.0 : 1 / 2500.0)), "velocity above maximum_velocity");
        Assert.Equal(new DepthRange(900, 906), Assert.Single(finding.Where));
    }

    [Fact]
    public void Rock_beyond_the_ends_of_the_trend_is_named_with_its_depth()
    {
        var zhang = Eaton with { Method = Chosen(PorePressureMethod.ZhangSonic), NormalTrend = Given };
        var fast = About(Run(With(zhang), LogsOf(z => z is >= 900 and <= 906 ? 60 * Unit : Slowness(z))), "sonic at or faster than the matrix limit of the trend");
        Assert.Equal(new DepthRange(900, 906), Assert.Single(fast.Where));
        var slow = About(Run(With(zhang), LogsOf(z => z is >= 900 and <= 906 ? 195 * Unit : Slowness(z))), "sonic slower than the trend at the ground or mudline");
        Assert.Equal(new DepthRange(900, 906), Assert.Single(slow.Where));
    }

    [Fact]
    public void Pressure_below_that_of_water_is_named_by_depths()
    {
        var pore = new PorePressureSettings
        {
            Method = Chosen(PorePressureMethod.Table),
            FluidDensity = Chosen(Water),
            DepthKind = Chosen(Core.Depth.DepthKind.TrueVertical),
            Points = Chosen<IReadOnlyList<PressurePoint>>([new(0, 0), new(1000, Hydrostatic(1000) * 0.985), new(1002, Hydrostatic(1002) * 0.9), new(3000, Hydrostatic(3000) * 0.99)]),
        };
        var finding = About(Computed(pore), "pore pressure is more than 2 % below the weight of water");
        var where = Assert.Single(finding.Where);
        // By hand: 0.9 x 1002 + (0.99 x 3000 - 0.9 x 1002) / 1998 (z - 1002) = 0.98 z at 2455.7 m.
        Assert.Equal(new DepthRange(1002, 2454), where);
    }

    [Fact]
    public void A_missing_log_is_named_for_its_method()
    {
        var logs = Table(Md, [.. LogsOf().Curves.Where(c => c.Role.Property != Property.DeepResistivity)]);
        var given = new NormalTrendSettings { SurfaceResistivity = Chosen(0.9), ScaleLength = Chosen(3000.0) };
        Assert.Contains(
            "resistivity log missing: no pore pressure by eaton-1975-resistivity",
            Run(With(Eaton with { Method = Chosen(PorePressureMethod.EatonResistivity), NormalTrend = given }), logs).Texts());
    }
}
