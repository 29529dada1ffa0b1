using DepthStress.Core.Calibration;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Calibration;

/// <summary>What a calibration frees beside the strains: from observations made of a model whose parameters are known.</summary>
public sealed class WellCalibrationTests
{
    private const double TrueExponent = 2.4;

    /// <summary>Eaton's method with a trend that the soft samples lie above, so that the exponent matters.</summary>
    private static WellSetup Eaton(double? exponent) => CalibrationWell.Setup() with
    {
        Settings = CalibrationWell.Setup().Settings with
        {
            PorePressure = new PorePressureSettings
            {
                Method = SmallWell.Chosen(PorePressureMethod.EatonSonic),
                FluidDensity = SmallWell.Chosen(1030.0),
                Trend = SmallWell.Chosen<IReadOnlyList<TrendPoint>>([new(0, 420e-6), new(3000, 190e-6)]),
                Exponent = exponent is { } n ? SmallWell.Chosen(n) : default,
            },
        },
    };

    private static CalibrationSettings Free(params string[] words) => new() { Free = SmallWell.Chosen<IReadOnlyList<string>>(words) };

    private static CalibrationResult Calibrate(WellSetup setup, CalibrationSettings settings)
    {
        var diagnostics = new DiagnosticBag();
        var result = WellCalibration.Run(CalibrationWell.Run(setup), settings, CalibrationWell.Run, diagnostics);
        Assert.Empty(diagnostics.Items);
        return result!;
    }

    private static string[] Refusals(WellSetup setup, CalibrationSettings settings)
    {
        var diagnostics = new DiagnosticBag();
        Assert.Null(WellCalibration.Run(CalibrationWell.Run(setup), settings, CalibrationWell.Run, diagnostics));
        return [.. diagnostics.Items.Select(d => d.ToString())];
    }

    private static IReadOnlyList<Observation> Pressures(EarthModel truth, params int[] samples) =>
        [.. samples.Select(i => CalibrationWell.At(ObservationKind.FormationPressure, i, truth.Column(Property.PorePressure)[i], 0.1e6))];

    [Fact]
    public void The_exponent_comes_back_from_formation_pressures()
    {
        var truth = CalibrationWell.Run(Eaton(TrueExponent));
        var result = Calibrate(Eaton(null) with { Observations = Pressures(truth, 0, 2, 4, 6) }, Free("pressure_exponent"));
        var estimate = Assert.Single(result.Others);
        Assert.Equal(("pore_pressure", "exponent"), (estimate.Section, estimate.Key));
        Assert.Equal(3, estimate.Estimate.Start); // the published one
        Assert.Equal(TrueExponent, estimate.Estimate.Value, 1e-6); // the fit's own accuracy
        Assert.InRange(TrueExponent, estimate.Estimate.Low, estimate.Estimate.High);
        Assert.Equal(truth.Column(Property.PorePressure)[4], result.After.Column(Property.PorePressure)[4], 10); // Pa
        Assert.Empty(result.Strains);
    }

    [Fact]
    public void Strains_rest_on_the_pressure_that_was_estimated_before_them()
    {
        var truth = CalibrationWell.Run(Eaton(TrueExponent));
        var setup = Eaton(null) with { Observations = [.. Pressures(truth, 0, 2, 4, 6), .. CalibrationWell.Closures(truth, 0.5e6, _ => 0)] };
        var strain = Assert.Single(Calibrate(setup, Free("pressure_exponent", "strains")).Strains);
        Assert.Equal(CalibrationWell.AlongShmin, strain.AlongShmin.Value, 1e-9);
        Assert.Equal(CalibrationWell.AlongShmax, strain.AlongShmax.Value, 1e-9);
    }

    [Fact]
    public void The_factor_on_static_modulus_comes_from_core_alone()
    {
        var model = CalibrationWell.Run(CalibrationWell.Setup());
        var plugs = (int[])[1, 3, 5];
        var setup = CalibrationWell.Setup() with
        {
            Core = new CoreData
            {
                Plugs = [.. plugs.Select(i => new CorePlug
                {
                    Depth = model.Column(Property.MeasuredDepth)[i],
                    Orientation = PlugOrientation.Vertical,
                    ConfiningPressure = 10e6,
                    YoungsStatic = 1.25 * model.Column(Property.YoungsStatic)[i],
                })],
            },
        };
        var result = Calibrate(setup, Free("static_modulus_factor"));
        var estimate = Assert.Single(result.Others);
        Assert.Equal(("moduli", "static_youngs_factor", "3 plugs, vertical; confined"), (estimate.Section, estimate.Key, estimate.Basis));
        Assert.Equal(1.25, estimate.Estimate.Value, 1e-12);
        Assert.Equal(1.25 * model.Column(Property.YoungsStatic)[0], result.After.Column(Property.YoungsStatic)[0], 1);
    }

    [Fact]
    public void What_cannot_be_freed_says_why()
    {
        var plain = CalibrationWell.Setup();
        Assert.Equal(
            ["well.toml(5,1): error: [calibration] free: found static_modulus_factor, expected [core] files with two plugs or more whose static modulus and depth the model has, cut and tested alike"],
            Refusals(plain, Free("static_modulus_factor")));
        Assert.Equal(
            [
                "well.toml(5,1): error: [calibration] free: found pressure_exponent, expected an Eaton method as [pore_pressure] method of the well: only those have an exponent",
                "well.toml(5,1): error: [calibration] free: found normal_trend, expected [pore_pressure.normal_trend] of the well: there is no exponential trend to change",
            ],
            Refusals(plain, Free("pressure_exponent", "normal_trend")));
        Assert.Equal(
            ["well.toml(5,1): error: [calibration] free: found 0 formation pressures within the logs, expected as many as freed parameters of the pore pressure at least, 1: exponent is not determined"],
            Refusals(Eaton(null), Free("pressure_exponent")));
    }

    [Fact]
    public void Depths_of_either_kind_give_the_same_in_a_vertical_hole()
    {
        var closures = CalibrationWell.Closures(CalibrationWell.Run(CalibrationWell.Setup()), 0.5e6, _ => 0);
        var vertical = closures.Select(o => o with { DepthKind = DepthKind.TrueVertical }).ToList();
        var measured = Calibrate(CalibrationWell.Setup(0, 0) with { Observations = closures }, new CalibrationSettings());
        var other = Calibrate(CalibrationWell.Setup(0, 0) with { Observations = vertical }, new CalibrationSettings());
        Assert.Equal(measured.Strains[0].AlongShmin.Value, other.Strains[0].AlongShmin.Value, 1e-12); // a vertical hole
    }
}
