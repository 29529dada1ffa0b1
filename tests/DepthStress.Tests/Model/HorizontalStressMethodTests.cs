using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>The other ways to the horizontal stresses: ratios and heat.</summary>
public sealed class HorizontalStressMethodTests
{
    private static readonly HorizontalStressSettings Ratio = new() { Method = Chosen(HorizontalStressMethod.EffectiveStressRatio), Ratio = Chosen(0.4) };

    private static readonly TemperatureSettings Line = new()
    {
        Source = Chosen(TemperatureSource.Gradient),
        Surface = Chosen(288.15),
        Gradient = Chosen(0.03),
        Reference = Chosen(300.15),
    };

    private static WellSetup With(HorizontalStressSettings stress, TemperatureSettings? temperature = null, AnisotropySettings? anisotropy = null) =>
        Setup with { Settings = SmallWell.Settings with { HorizontalStress = stress, Temperature = temperature ?? new(), Anisotropy = anisotropy ?? new() } };

    [Fact]
    public void A_ratio_gives_stresses_without_shear_logs_that_rest_on_density_alone()
    {
        var logs = LogsWith(Curve(Property.Vs, Same(double.NaN)));
        var model = Run(With(Ratio), logs);
        double sv = model.Column(Property.VerticalStress)[3], pp = model.Column(Property.PorePressure)[3];
        Assert.Equal(pp + (0.4 * (sv - pp)), model.Column(Property.MinHorizontalStress)[3], 1e-6); // Pa: rounding
        Assert.All(model.Column(Property.MaxHorizontalStress), s => Assert.True(double.IsNaN(s)));
        Assert.All(model.StressBasis, b => Assert.Equal(SampleOrigin.Measured, b));
        Assert.Contains(model.Texts(), t => t.StartsWith("SHmax is empty", StringComparison.Ordinal));

        var both = Run(With(Ratio with { RatioShmax = Chosen(0.9) }), logs);
        Assert.Equal(pp + (0.9 * (sv - pp)), both.Column(Property.MaxHorizontalStress)[3], 1e-6);
        Assert.DoesNotContain(both.Texts(), t => t.StartsWith("SHmax is empty", StringComparison.Ordinal));
    }

    [Fact]
    public void One_zone_may_go_by_ratio_and_the_next_by_strain()
    {
        var zones = new Zone[]
        {
            new("A", 0, null, DepthKind.Measured, new StageSettings { HorizontalStress = Ratio }, WellFile),
            new("B", 200, null, DepthKind.Measured, new(), WellFile),
        };
        var model = Run(With(Strains) with { Zones = zones }, LogsWith());
        var strained = Run(With(Strains), LogsWith());
        Assert.Equal(strained.Column(Property.MinHorizontalStress)[2..], model.Column(Property.MinHorizontalStress)[2..]);
        Assert.True(double.IsNaN(model.Column(Property.MaxHorizontalStress)[1]));
        Assert.Equal(0, ShminSensitivity.Of(model)[0].PoissonHigher, 1e-6); // Pa: rounding of the mean
    }

    // By hand at 400 m: 288.15 + 12 K is the reference, so no thermal stress; at 300 m 3 K less, E aT (-3) / (1 - nu).
    [Fact]
    public void Rock_cooler_than_its_reference_loses_stress_and_at_the_reference_none()
    {
        var stress = Strains with { ThermalExpansion = Chosen(1e-5) };
        var (warm, cold) = (Run(With(stress, Line), LogsWith()), Run(With(Strains), LogsWith()));
        var change = warm.Column(Property.MinHorizontalStress).Zip(cold.Column(Property.MinHorizontalStress), (a, b) => a - b).ToArray();
        var (e, nu) = (warm.Column(Property.YoungsStatic)[3], warm.Column(Property.PoissonStatic)[3]);
        Assert.Equal(0, change[4], 1e-3); // Pa: rounding of temperatures
        Assert.Equal(-3 * e * 1e-5 / (1 - nu), change[3], 1e-3);
        Assert.Equal(change[3], warm.Column(Property.MaxHorizontalStress)[3] - cold.Column(Property.MaxHorizontalStress)[3], 1e-3);
    }

    [Fact]
    public void A_temperature_log_serves_and_where_it_is_missing_there_is_no_stress()
    {
        var logs = LogsWith(Curve(Property.Temperature, 300.15, 310.15, 310.15, 310.15, double.NaN));
        var model = Run(With(Strains with { ThermalExpansion = Chosen(1e-5) }, Line with { Source = Chosen(TemperatureSource.Log) }), logs);
        var cold = Run(With(Strains), LogsWith());
        Assert.Equal(cold.Column(Property.MinHorizontalStress)[0], model.Column(Property.MinHorizontalStress)[0]);
        Assert.True(model.Column(Property.MinHorizontalStress)[1] > cold.Column(Property.MinHorizontalStress)[1]);
        Assert.True(double.IsNaN(model.Column(Property.MinHorizontalStress)[4]));
        Assert.Contains("temperature missing: no thermal stress, so no horizontal stress", model.Texts());
    }

    [Fact]
    public void A_line_leaves_the_temperature_log_as_it_was()
    {
        var logs = LogsWith(Curve(Property.Temperature, Same(350)));
        var model = Run(With(Strains with { ThermalExpansion = Chosen(1e-5) }, Line), logs);
        Assert.Equal(294.15, model.Column(Property.Temperature)[2], 1e-9);
        Assert.Equal(350, logs[Property.Temperature]!.Values[2]);
    }

    [Fact]
    public void Layered_rock_is_heated_with_its_constants_along_the_beds_and_the_choices_see_it()
    {
        var layered = new AnisotropySettings
        {
            Model = Chosen(AnisotropyModel.Thomsen),
            Epsilon = Chosen(0.1),
            Gamma = Chosen(0.15),
            Delta = Chosen(0.05),
            AlongHole = Chosen(false),
        };
        var hot = Run(With(Strains with { ThermalExpansion = Chosen(1e-5) }, Line, layered), LogsWith());
        var cold = Run(With(Strains, null, layered), LogsWith());
        var (e, nu) = (hot.Column(Property.YoungsStaticHorizontal)[3], hot.Column(Property.PoissonStaticHorizontal)[3]);
        Assert.Equal(
            -3 * e * 1e-5 / (1 - nu), hot.Column(Property.MinHorizontalStress)[3] - cold.Column(Property.MinHorizontalStress)[3], 1e-3); // Pa: rounding
        Assert.NotEqual(ShminSensitivity.Of(cold)[0].PoissonHigher, ShminSensitivity.Of(hot)[0].PoissonHigher);
    }
}
