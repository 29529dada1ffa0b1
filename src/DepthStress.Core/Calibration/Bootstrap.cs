using MathNet.Numerics.Distributions;
using MathNet.Numerics.Statistics;

namespace DepthStress.Core.Calibration;

/// <summary>Fills residuals as <see cref="ResidualFunction"/> does, with an error added to each before it is made one-sided.</summary>
/// <param name="parameters">The parameters.</param>
/// <param name="errors">What is added to each observation, in its standard deviations.</param>
/// <param name="residuals">Gets the residuals: with no errors those of the fit; a one-sided one is max(0, x + error).</param>
public delegate void DisturbedResiduals(ReadOnlySpan<double> parameters, ReadOnlySpan<double> errors, Span<double> residuals);

/// <summary>Where the errors of a bootstrap come from.</summary>
public enum BootstrapErrors
{
    /// <summary>Normal, as wide as the stated standard deviations.</summary>
    Normal,

    /// <summary>The residuals of the fit, centred, widened for the fitted parameters, drawn with replacement: needs many two-sided ones.</summary>
    Resampled,
}

/// <summary>
/// Estimates from many disturbed copies of the observations: an interval that holds with active bounds. Source: Efron and
/// Tibshirani 1993, An Introduction to the Bootstrap. The same seed gives the same draws, in any order of work.
/// </summary>
public sealed class Bootstrap
{
    private readonly double[][] _draws;

    private Bootstrap(double[][] draws) => _draws = draws;

    /// <summary>The estimates of each draw that converged.</summary>
    public IReadOnlyList<IReadOnlyList<double>> Draws => _draws;

    /// <summary>Refits disturbed observations.</summary>
    /// <param name="problem">The problem; its own residual function is not called, its derivatives are taken by differences.</param>
    /// <param name="disturbed">The residuals with errors added.</param>
    /// <param name="best">The solution without errors, where each draw begins.</param>
    /// <param name="draws">How many, at least one.</param>
    /// <param name="seed">Decides the draws.</param>
    /// <param name="errors">Where the errors come from.</param>
    public static Bootstrap Run(FitProblem problem, DisturbedResiduals disturbed, FitResult best, int draws, int seed, BootstrapErrors errors = BootstrapErrors.Normal)
    {
        ArgumentNullException.ThrowIfNull(problem);
        ArgumentNullException.ThrowIfNull(disturbed);
        ArgumentNullException.ThrowIfNull(best);
        ArgumentOutOfRangeException.ThrowIfLessThan(draws, 1);
        var pool = best.Residuals.ToArray();
        var mean = pool.Mean();
        var widening = Math.Sqrt((double)problem.Count / Math.Max(1, best.DegreesOfFreedom));
        var estimates = new List<double[]>(draws);
        for (var k = 0; k < draws; k++)
        {
            var random = new Random(HashCode(seed, k));
            var added = new double[problem.Count];
            for (var i = 0; i < added.Length; i++)
            {
                added[i] = errors == BootstrapErrors.Normal
                    ? Normal.InvCDF(0, 1, (random.Next(1 << 24) + 0.5) / (1 << 24))
                    : (pool[random.Next(pool.Length)] - mean) * widening;
            }

            var copy = problem.From(best.Estimates) with { Residuals = (p, r) => disturbed(p, added, r), Jacobian = null };
            if (BoundedFit.Solve(copy) is { Converged: true } fit) estimates.Add([.. fit.Estimates]);
        }

        return new([.. estimates]);
    }

    /// <summary>A percentile of one parameter over the draws, 0 to 100; NaN without draws.</summary>
    public double Percentile(int parameter, double percent)
    {
        var values = _draws.Select(d => d[parameter]).Order().ToArray();
        return SortedArrayStatistics.QuantileCustom(values, percent / 100, QuantileDefinition.R7);
    }

    // Spreads neighbouring draws of neighbouring seeds apart (the constants of Knuth's multiplicative hashing).
    private static int HashCode(int seed, int draw) => unchecked((int)(((uint)seed * 2654435761u) ^ ((uint)(draw + 1) * 2246822519u)));
}
