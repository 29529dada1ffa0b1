using DepthStress.Core.Calibration;

namespace DepthStress.Tests.Calibration;

/// <summary>What a fit says of itself: bounds, errors, separability, robust weights, intervals.</summary>
public sealed class BoundedFitTests
{
    /// <summary>Two parameters seen through rows (a, b, value), each with a standard deviation of 1.</summary>
    private static FitProblem Rows(FitParameter first, FitParameter second, params (double A, double B, double Value)[] rows) => new(
        [first, second],
        rows.Length,
        (p, r) =>
        {
            for (var i = 0; i < rows.Length; i++) r[i] = (rows[i].A * p[0]) + (rows[i].B * p[1]) - rows[i].Value;
        });

    private static FitParameter Between(double low, double high) => new(0, low, high, 1);

    private static FitProblem Mean(FitParameter parameter, params double[] values) => new(
        [parameter],
        values.Length,
        (p, r) =>
        {
            for (var i = 0; i < values.Length; i++) r[i] = p[0] - values[i];
        });

    [Fact]
    public void A_bound_is_kept_and_named_and_has_no_standard_error()
    {
        // Free optimum (2, -1); held at b >= 0 the best a is 2.
        var fit = BoundedFit.Solve(Rows(Between(-9, 9), Between(0, 9), (1, 0, 2), (0, 1, -1)));
        Assert.Equal([BoundState.Free, BoundState.AtLower], fit.Bounds);
        Assert.Equal(2, fit.Estimates[0], 1e-9); // one linear step
        Assert.Equal(0, fit.Estimates[1]);
        Assert.Equal(1, fit.StandardErrors[0], 1e-9); // one observation of deviation 1
        Assert.Equal(double.NaN, fit.StandardErrors[1]);
        Assert.Equal(1, fit.ChiSquare, 1e-9);
    }

    [Fact]
    public void Parameters_seen_only_together_are_said_to_be_inseparable()
    {
        var fit = BoundedFit.Solve(Rows(Between(-9, 9), Between(-9, 9), (1, 1, 2), (2, 2, 4), (1, 1, 2.1)));
        Assert.Equal(2, fit.SingularValues.Count);
        Assert.Equal(0, fit.SingularValues[1], 1e-9); // equal columns
        Assert.Equal(double.PositiveInfinity, fit.StandardErrors[0]);
        Assert.Equal((2 + (2 * 4) + 2.1) / 6, fit.Estimates[0] + fit.Estimates[1], 1e-6); // by hand: the optimum of their sum
    }

    [Fact]
    public void Correlation_and_singular_values_are_those_of_two_columns_at_an_angle()
    {
        // Columns (1, 0) and (0.8, 0.6): cosine 0.8, so the estimates correlate by -0.8 and the singular values are sqrt(1 +- 0.8).
        var fit = BoundedFit.Solve(Rows(Between(-9, 9), Between(-9, 9), (1, 0.8, 1), (0, 0.6, 2)));
        Assert.Equal(-0.8, fit.Correlation(0, 1), 1e-9); // closed form
        Assert.Equal(Math.Sqrt(1.8), fit.SingularValues[0], 1e-9);
        Assert.Equal(Math.Sqrt(0.2), fit.SingularValues[1], 1e-9);
        Assert.Equal(3, fit.Condition, 1e-8); // sqrt(1.8 / 0.2)
    }

    [Fact]
    public void A_one_sided_bound_pulls_only_when_it_is_broken()
    {
        // A value 10, and an upper bound at 8 of equal weight: the least of (p - 10)^2 + (p - 8)^2 is at 9. With the bound at 12 it is 10.
        static FitProblem With(double upper) => new([Between(-99, 99)], 2, (p, r) => (r[0], r[1]) = (p[0] - 10, Math.Max(0, p[0] - upper)));
        Assert.Equal(9, BoundedFit.Solve(With(8)).Estimates[0], 1e-8);
        Assert.Equal(10, BoundedFit.Solve(With(12)).Estimates[0], 1e-8);
        // The optimum on the kink itself.
        Assert.Equal(10, BoundedFit.Solve(With(10)).Estimates[0], 1e-8);
    }

    [Fact]
    public void Huber_weights_hold_an_outlier_back()
    {
        // Huber's estimate p of 0, 0, 0, 0, 100 with constant k: 4 p = k while p < k, so p = k / 4 (closed form).
        var fit = BoundedFit.SolveRobust(Mean(Between(-999, 999), 0, 0, 0, 0, 100));
        Assert.True(fit.Converged);
        Assert.Equal(BoundedFit.HuberConstant / 4, fit.Estimates[0], 1e-6); // weights are renewed until the step is 1e-8
        Assert.Equal(1, fit.Weights[0]);
        Assert.True(fit.Weights[4] < 0.02);
        Assert.Equal(20, BoundedFit.Solve(Mean(Between(-999, 999), 0, 0, 0, 0, 100)).Estimates[0], 1e-8);
    }

    [Fact]
    public void Residuals_that_vanish_end_the_search()
    {
        var fit = BoundedFit.Solve(Rows(Between(-9, 9), Between(-9, 9), (1, 0, 2), (0, 1, 3), (1, 1, 5)));
        Assert.True(fit.Converged);
        Assert.Equal(0, fit.ChiSquare, 1e-18);
    }

    [Fact]
    public void What_is_no_problem_is_refused()
    {
        Assert.Throws<ArgumentException>(() => BoundedFit.Solve(Mean(Between(1, 0), 1)));
        Assert.Throws<ArgumentException>(() => BoundedFit.Solve(Mean(new(0, 0, 1, 0), 1)));
        Assert.Throws<ArgumentException>(() => BoundedFit.Solve(Mean(Between(0, 1), double.NaN)));
    }

    [Fact]
    public void A_region_without_residuals_is_left_alone()
    {
        // The model has no value above 1; the data pull there.
        var fit = BoundedFit.Solve(new FitProblem([new(0, -9, 9, 1)], 1, (p, r) => r[0] = p[0] > 1 ? double.NaN : p[0] - 3));
        Assert.Equal(1, fit.Estimates[0], 1e-3); // crept up to the edge
        Assert.False(fit.Converged);
    }

    [Fact]
    public void The_profile_of_a_mean_is_its_standard_error()
    {
        // Four observations of deviation 1: standard error 1/2, and twice 1.96 half errors at 95 %.
        var problem = Mean(Between(-99, 99), 1, 2, 3, 4);
        var best = BoundedFit.Solve(problem);
        var interval = ProfileInterval.Of(problem, best, 0);
        Assert.Equal((2.0, 3.0), (Math.Round(interval.Low, 5), Math.Round(interval.High, 5)));
        var wide = ProfileInterval.Of(problem, best, 0, ProfileInterval.Percent95);
        Assert.Equal(2.5 + (1.959964 / 2), wide.High, 1e-5); // table of the normal distribution
        Assert.False(wide.OpenBelow || wide.OpenAbove);
    }

    [Fact]
    public void At_a_bound_the_profile_is_open_on_its_side()
    {
        // The mean is -0.5, the bound 0: chi-square above its value at 0 is 4 (p + 0.5)^2 - 1 = 1 at p = (sqrt 2 - 1) / 2.
        var problem = Mean(Between(0, 99), -0.5, -0.5, -0.5, -0.5);
        var interval = ProfileInterval.Of(problem, BoundedFit.Solve(problem), 0);
        Assert.Equal((0.0, true, false), (interval.Low, interval.OpenBelow, interval.OpenAbove));
        Assert.Equal((Math.Sqrt(2) - 1) / 2, interval.High, 1e-5); // the search ends within 1e-7 of its step
    }
}
