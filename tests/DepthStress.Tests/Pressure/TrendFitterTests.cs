using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Pressure;

/// <summary>Normal trends fitted to invented shale whose truth is known.</summary>
public class TrendFitterTests
{
    private const double Unit = 1e-6 / 0.3048; // us/ft

    private static readonly double[] Depth = [.. Enumerable.Range(0, 2000).Select(i => 800 + (0.5 * i))];

    private static double[] Values(Func<double, double> trend, double share, Func<int, double> noise) => [.. Depth.Select((z, i) => trend(z) * (1 + (share * noise(i))))];

    private static FittedTrend Fit(TrendQuantity quantity, NormalTrendSettings given, double[] values)
    {
        var fitted = TrendFitter.Fit(quantity, given, Depth, values, out var problem);
        Assert.Null(problem);
        return fitted!;
    }

    /// <summary>White noise of unit variance that is the same on every machine.</summary>
    private static double White(int i, uint seed)
    {
        double sum = 0;
        for (var k = 0u; k < 12; k++)
        {
            var x = ((uint)i * 2654435761u) + (k * 40503u) + (seed * 97u);
            x = (x ^ (x >> 16)) * 0x45D9F3Bu;
            x = (x ^ (x >> 16)) * 0x45D9F3Bu;
            sum += (x >> 8) / (double)(1 << 24);
        }

        return sum - 6;
    }

    [Fact]
    public void Slowness_without_scatter_gives_its_parameters_back()
    {
        var fitted = Fit(TrendQuantity.Slowness, new(), Values(z => (65 + (125 * Math.Exp(-z / 1700))) * Unit, 0, _ => 0));
        // Seven digits: the valley of three parameters is long and flat.
        Assert.Equal(190 * Unit, fitted.Trend.Surface, 190e-6 * Unit);
        Assert.Equal(65 * Unit, fitted.Trend.Limit, 65e-6 * Unit);
        Assert.Equal(1700, fitted.Trend.Length, 1700e-6);
        Assert.All(fitted.Parameters, p => Assert.Equal(TrendParameterKind.Estimated, p.Kind));
    }

    [Fact]
    public void Porosity_and_resistivity_give_their_parameters_back()
    {
        var porosity = Fit(TrendQuantity.Porosity, new(), Values(z => 0.46 * Math.Exp(-z * 0.001118), 0, _ => 0)); // the trend of Zhang 2019 p. 243
        Assert.Equal(0.46, porosity.Trend.Surface, 1e-9);
        Assert.Equal(1 / 0.001118, porosity.Trend.Length, 1e-6);
        var resistivity = Fit(TrendQuantity.Resistivity, new(), Values(z => 0.8 * Math.Exp(z / 2500), 0, _ => 0));
        Assert.Equal(0.8, resistivity.Trend.Surface, 1e-9);
        Assert.Equal(2500, resistivity.Trend.Length, 1e-6);
    }

    [Fact]
    public void What_is_given_is_held()
    {
        var values = Values(z => (65 + (125 * Math.Exp(-z / 1700))) * Unit, 0, _ => 0);
        var given = new NormalTrendSettings { MatrixSlowness = Chosen(65 * Unit), SurfaceSlowness = Chosen(190 * Unit) };
        var fitted = Fit(TrendQuantity.Slowness, given, values);
        Assert.Equal([TrendParameterKind.Given, TrendParameterKind.Given, TrendParameterKind.Estimated], fitted.Parameters.Select(p => p.Kind));
        Assert.Equal([0, 0], fitted.Parameters.Take(2).Select(p => p.Error));
        Assert.Equal(1700, fitted.Trend.Length, 1700e-7); // the search ends where the sum of squares is rounding
        var resistive = Values(z => 0.8 * Math.Exp(z / 2500), 0, _ => 0);
        Assert.Equal(2500, Fit(TrendQuantity.Resistivity, new() { SurfaceResistivity = Chosen(0.8) }, resistive).Trend.Length, 1e-6);
        Assert.Equal(0.8, Fit(TrendQuantity.Resistivity, new() { ScaleLength = Chosen(2500.0) }, resistive).Trend.Surface, 1e-9);
    }

    // Standard errors must match how far estimates of repeated draws lie apart: the ratio of the two has a standard error of 1 / sqrt(2 x 59) =
    // 9 % for 60 draws; bounds are three of those. Correlated noise (each value a mean of 20) is where a count of samples would mislead: without
    // the effective number the errors would be too small by a factor of some 4.5.
    [Theory]
    [InlineData(1)]
    [InlineData(20)]
    public void Standard_errors_are_those_of_repeated_draws(int length)
    {
        const int Draws = 60;
        var given = new NormalTrendSettings { MatrixSlowness = Chosen(65 * Unit) };
        var (lengths, errors) = (new double[Draws], new double[Draws]);
        for (var d = 0; d < Draws; d++)
        {
            var seed = (uint)d + 1;
            double[] white = [.. Enumerable.Range(0, Depth.Length + length).Select(i => White(i, seed))];
            var values = Values(
                z => (65 + (125 * Math.Exp(-z / 1700))) * Unit, 0.03, i => white.AsSpan(i, length).ToArray().Sum() / Math.Sqrt(length));
            var fitted = Fit(TrendQuantity.Slowness, given, values);
            (lengths[d], errors[d]) = (fitted.Trend.Length, fitted.Parameters[^1].Error);
        }

        var mean = lengths.Average();
        var spread = Math.Sqrt(lengths.Sum(l => (l - mean) * (l - mean)) / (Draws - 1));
        Assert.InRange(Math.Sqrt(errors.Select(e => e * e).Average()) / spread, 0.73, 1.27);
        Assert.InRange(mean, 1700 - (4 * spread / Math.Sqrt(Draws)), 1700 + (4 * spread / Math.Sqrt(Draws)));
    }

    [Theory]
    [InlineData(TrendQuantity.Slowness, 1, "the shale gets slower with depth, expected normally compacted shale that gets faster")]
    [InlineData(TrendQuantity.Porosity, 1, "the shale gets more porous with depth, expected normally compacted shale that gets less porous")]
    [InlineData(TrendQuantity.Resistivity, -1, "the shale gets less resistive with depth, expected normally compacted shale that gets more resistive")]
    public void A_trend_the_wrong_way_is_refused(TrendQuantity quantity, int sign, string expected)
    {
        Assert.Null(TrendFitter.Fit(quantity, new(), Depth, Values(z => 0.3 + (sign * z * 1e-4), 0, _ => 0), out var problem));
        Assert.Equal(expected, UnitSystem.Metric.Show(problem!));
    }

    [Fact]
    public void A_limit_that_the_shale_does_not_tell_stops_at_its_bound()
    {
        // A straight line: its exponential would have no limit within reason.
        var fitted = Fit(TrendQuantity.Slowness, new(), Values(z => (170 - (0.03 * z)) * Unit, 0, _ => 0));
        Assert.Contains(fitted.Parameters, p => p.Kind == TrendParameterKind.AtBound);
    }

    [Fact]
    public void Too_few_samples_are_the_callers_mistake() =>
        Assert.Throws<ArgumentException>(() => TrendFitter.Fit(TrendQuantity.Slowness, new(), Depth[..29], Depth[..29], out _));

    // n / (1 + 2 sum of rho): noise that is the mean of 20 has the sum of rho (20 - 1) / 2, so 1 in 20; white noise about 1 in 1. A quarter either way:
    // the estimate itself scatters.
    [Theory]
    [InlineData(1)]
    [InlineData(20)]
    public void The_effective_number_is_that_of_the_correlation(int length)
    {
        double[] white = [.. Enumerable.Range(0, 20_000 + length).Select(i => White(i, 7))];
        double[] row = [.. Enumerable.Range(0, 20_000).Select(i => white.AsSpan(i, length).ToArray().Sum())];
        Assert.InRange(EffectiveCount.Of(row) * length / 20_000, 0.75, 1.25);
    }

    [Fact]
    public void Settings_take_a_fit_in_and_mark_it()
    {
        var whole = new NormalTrendSettings { MatrixSlowness = Chosen(65 * Unit) }.With(new ExponentialTrend(TrendQuantity.Slowness, 190 * Unit, 65 * Unit, 1700));
        Assert.True(whole.IsWhole(TrendQuantity.Slowness));
        Assert.Equal((SettingKind.WellFile, SettingKind.Calibrated), (whole.MatrixSlowness.Source.Kind, whole.ScaleLength.Source.Kind));
        Assert.Equal((190 * Unit, 1700.0), (whole.SurfaceSlowness.Value, whole.ScaleLength.Value));
    }
}
