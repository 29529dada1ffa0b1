using DepthStress.Core.Calibration;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Calibration;

/// <summary>Strains from observations made of a model with known strains.</summary>
public sealed class StrainCalibrationTests
{
    private const double Micro = 1e-6;

    private static EarthModel Truth { get; } = CalibrationWell.Run(CalibrationWell.Setup());

    private static WellSetup Guess => CalibrationWell.Setup(0, 100 * Micro);

    [Fact]
    public void Closures_without_error_give_back_the_strains_and_say_how_badly_they_separate_them()
    {
        var result = CalibrationWell.Calibrate(Guess with { Observations = CalibrationWell.Closures(Truth, 0.5e6, _ => 0) });
        var strain = Assert.Single(result.Strains);
        Assert.Equal(CalibrationWell.AlongShmin, strain.AlongShmin.Value, 1e-3 * Micro); // the fit's own accuracy
        Assert.Equal(CalibrationWell.AlongShmax, strain.AlongShmax.Value, 1e-3 * Micro);
        Assert.Equal(0, result.ModelError);
        Assert.True(strain.Correlation < -0.95, "closures alone determine one combination of the strains (METHODS: correlation -.99)");
        Assert.False(strain.Separated);
        Assert.Contains(result.Findings, f => f.Text.Format.Contains("do not separate", StringComparison.Ordinal));
    }

    [Fact]
    public void Standard_errors_are_those_of_the_linear_problem()
    {
        var result = CalibrationWell.Calibrate(Guess with { Observations = CalibrationWell.Closures(Truth, 0.5e6, _ => 0) });
        // Straight lines: Shmin = base + M (e + nu H). The normal equations by hand, apart from the program's way.
        double a = 0, b = 0, c = 0;
        var (e, nu) = (Truth.Column(Property.YoungsStatic), Truth.Column(Property.PoissonStatic));
        for (var i = 0; i < e.Length; i++)
        {
            var plane = e[i] / (1 - (nu[i] * nu[i])) / 0.5e6;
            (a, b, c) = (a + (plane * plane), b + (plane * plane * nu[i]), c + (plane * plane * nu[i] * nu[i]));
        }

        var determinant = (a * c) - (b * b);
        var strain = result.Strains[0];
        Assert.Equal(Math.Sqrt(c / determinant), strain.AlongShmin.StandardError, 1e-6 * strain.AlongShmin.StandardError); // differences of straight lines
        Assert.Equal(Math.Sqrt(a / determinant), strain.AlongShmax.StandardError, 1e-6 * strain.AlongShmax.StandardError);
        Assert.Equal(-b / Math.Sqrt(a * c), strain.Correlation, 1e-6);
    }

    [Fact]
    public void An_error_larger_than_stated_becomes_the_models_error()
    {
        // Errors of 1 MPa under a stated 0.1 MPa.
        var result = CalibrationWell.Calibrate(Guess with { Observations = CalibrationWell.Closures(Truth, 0.1e6, i => i % 4 < 2 ? 1e6 : -1e6) });
        Assert.True(result.ReducedChiSquare > 10);
        Assert.InRange(result.ModelError, 0.5e6, 1.5e6);
        var sum = result.AfterFit.Sum(c => c.Residual * c.Residual);
        Assert.Equal(result.DegreesOfFreedom, sum, 1e-3); // what the model error is defined by
    }

    [Fact]
    public void The_difference_is_not_negative_and_its_interval_is_that_of_the_profile()
    {
        var truth = CalibrationWell.Run(CalibrationWell.Setup(300 * Micro, 100 * Micro));
        var result = CalibrationWell.Calibrate(Guess with { Observations = CalibrationWell.Closures(truth, 0.5e6, _ => 0) });
        var strain = result.Strains[0];
        Assert.Equal(0, strain.Difference.Value);
        Assert.True(strain.Difference.AtBound);
        Assert.Equal(double.NaN, strain.Difference.StandardError);
        Assert.Equal(0, strain.Difference.Low);
        Assert.True(strain.Difference.High > 0);
        Assert.InRange(strain.AlongShmin.Value, strain.AlongShmin.Low, strain.AlongShmin.High);
    }

    [Fact]
    public void A_held_strain_stays_and_the_other_is_estimated()
    {
        var setup = CalibrationWell.Setup(0, CalibrationWell.AlongShmax) with { Observations = CalibrationWell.Closures(Truth, 0.5e6, _ => 0) };
        var result = CalibrationWell.Calibrate(setup, new CalibrationSettings { Hold = SmallWell.Chosen(HeldStrain.AlongShmax) });
        Assert.Equal(CalibrationWell.AlongShmin, result.Strains[0].AlongShmin.Value, 1e-3 * Micro);
        Assert.Equal(CalibrationWell.AlongShmax, result.Strains[0].AlongShmax.Value);
        Assert.True(result.Strains[0].AlongShmax.Held);
        Assert.True(result.Strains[0].Separated);
    }

    [Fact]
    public void Bounds_on_their_good_side_change_nothing()
    {
        var closures = CalibrationWell.Closures(Truth, 0.5e6, i => 0.2e6 * (i % 3));
        var shmin = Truth.Column(Property.MinHorizontalStress);
        var alone = CalibrationWell.Calibrate(Guess with { Observations = closures });
        var bounded = CalibrationWell.Calibrate(Guess with { Observations = [.. closures, CalibrationWell.At(ObservationKind.ShutIn, 4, shmin[4] + 5e6, 0.3e6)] });
        Assert.Equal(alone.Strains[0].AlongShmin.Value, bounded.Strains[0].AlongShmin.Value, 1e-6 * Micro);
        Assert.Equal(0, bounded.AfterFit[^1].Residual);
    }

    [Fact]
    public void A_bound_that_is_broken_pulls()
    {
        var closures = CalibrationWell.Closures(Truth, 0.5e6, _ => 0);
        var shmin = Truth.Column(Property.MinHorizontalStress);
        var bounded = CalibrationWell.Calibrate(Guess with { Observations = [.. closures, CalibrationWell.At(ObservationKind.ShutIn, 4, shmin[4] - 3e6, 0.3e6)] });
        Assert.True(bounded.AfterFit[4].Modelled < shmin[4], "the model went down towards the bound");
        Assert.True(bounded.AfterFit[^1].Residual > 0, "but not all the way");
    }

    [Fact]
    public void Each_observation_left_out_is_predicted_by_the_others()
    {
        // One closure is 4 MPa off: the others predict it best, so its residual left out is the largest.
        var result = CalibrationWell.Calibrate(Guess with { Observations = CalibrationWell.Closures(Truth, 0.5e6, i => i == 3 ? 4e6 : 0) });
        var worst = result.AfterFit.MaxBy(c => Math.Abs(c.LeftOut))!;
        Assert.Same(result.AfterFit[3], worst);
        Assert.True(Math.Abs(worst.LeftOut) > Math.Abs(worst.Residual));
    }

    [Fact]
    public void A_robust_fit_hardly_follows_an_observation_far_off()
    {
        var setup = Guess with { Observations = CalibrationWell.Closures(Truth, 0.5e6, i => i == 3 ? 8e6 : 0) };
        var hold = new CalibrationSettings { Hold = SmallWell.Chosen(HeldStrain.Difference) };
        var plain = CalibrationWell.Calibrate(setup, hold).Strains[0].AlongShmin.Value;
        var robust = CalibrationWell.Calibrate(setup, hold with { Robust = SmallWell.Chosen(true) }).Strains[0].AlongShmin.Value;
        var clean = CalibrationWell.Calibrate(Guess with { Observations = CalibrationWell.Closures(Truth, 0.5e6, _ => 0) }, hold).Strains[0].AlongShmin.Value;
        Assert.True(Math.Abs(robust - clean) < 0.5 * Math.Abs(plain - clean), FormattableString.Invariant($"robust {robust}, plain {plain}, clean {clean}"));
    }

    [Fact]
    public void What_is_not_determined_is_named_and_nothing_is_fixed_silently()
    {
        var shmin = Truth.Column(Property.MinHorizontalStress);
        Assert.Equal(
            "well.toml(1,1): error: found no observations, expected [observations] files: there is nothing to calibrate on",
            CalibrationWell.Refusal(Guess));
        Assert.Equal(
            "well.toml(1,1): error: found one observation that gives a value of a horizontal stress, expected two at least: one of the strains is not determined; choose with [calibration] hold what is kept as it is: \"difference\", \"strain_along_shmin\" or \"strain_along_shmax\"",
            CalibrationWell.Refusal(Guess with { Observations = [CalibrationWell.At(ObservationKind.Closure, 2, shmin[2], 0.5e6)] }));
        Assert.Equal(
            "well.toml(1,1): error: found no observation that gives a value of a horizontal stress, expected two at least: bounds alone determine no strain",
            CalibrationWell.Refusal(Guess with { Observations = [CalibrationWell.At(ObservationKind.ShutIn, 2, shmin[2], 0.5e6)] }));
    }

    [Fact]
    public void Observations_outside_the_log_are_named_not_used()
    {
        var outside = CalibrationWell.At(ObservationKind.Closure, 0, 1e6, 0.5e6) with { Top = 300, Base = 310 };
        var result = CalibrationWell.Calibrate(Guess with { Observations = [.. CalibrationWell.Closures(Truth, 0.5e6, _ => 0), outside] });
        Assert.Equal("outside the log", result.AfterFit[^1].Reading.Problem);
        Assert.Equal(double.NaN, result.AfterFit[^1].Residual);
        Assert.Equal(7, result.DegreesOfFreedom); // nine closures, two strains
    }

    [Fact]
    public void The_model_with_the_estimates_is_what_a_run_with_them_gives()
    {
        var result = CalibrationWell.Calibrate(Guess with { Observations = CalibrationWell.Closures(Truth, 0.5e6, i => 0.3e6 * (i % 2)) });
        var again = CalibrationWell.Run(result.After.Setup);
        Assert.Equal(again.Column(Property.MinHorizontalStress), result.After.Column(Property.MinHorizontalStress));
        Assert.Equal(again.Column(Property.MaxHorizontalStress), result.After.Column(Property.MaxHorizontalStress));
        Assert.NotEqual(result.Before.Column(Property.MinHorizontalStress), result.After.Column(Property.MinHorizontalStress));
    }
}
