using MathNet.Numerics.LinearAlgebra;

namespace DepthStress.Core.Calibration;

/// <summary>Where an estimate lies.</summary>
public enum BoundState
{
    /// <summary>Between its bounds.</summary>
    Free,

    /// <summary>At the lower bound.</summary>
    AtLower,

    /// <summary>At the upper bound.</summary>
    AtUpper,

    /// <summary>Held: its bounds are equal.</summary>
    Held,
}

/// <summary>What a fit found.</summary>
public sealed record FitResult
{
    /// <summary>The share of the greatest singular value below which parameters cannot be told apart at all.</summary>
    private const double Inseparable = 1e-10;

    /// <summary>The parameters.</summary>
    public required IReadOnlyList<double> Estimates { get; init; }

    /// <summary>Where each lies. Ordinary errors do not hold when one is at a bound: see <see cref="ProfileInterval"/>.</summary>
    public required IReadOnlyList<BoundState> Bounds { get; init; }

    /// <summary>The residuals there, in standard deviations, without robust weights.</summary>
    public required IReadOnlyList<double> Residuals { get; init; }

    /// <summary>The robust weight of each residual, 0 to 1; all one in an ordinary fit.</summary>
    public required IReadOnlyList<double> Weights { get; init; }

    /// <summary>Sum of the squared residuals, weighted.</summary>
    public required double ChiSquare { get; init; }

    /// <summary>Residuals less free parameters; one-sided residuals count in full even where they are zero.</summary>
    public required int DegreesOfFreedom { get; init; }

    /// <summary>
    /// Standard errors of the estimates, given the stated standard deviations and the other bounds that are active; NaN at a bound,
    /// positive infinity where the free parameters cannot be told apart.
    /// </summary>
    public required IReadOnlyList<double> StandardErrors { get; init; }

    /// <summary>Covariance of the estimates, likewise; NaN in rows and columns of what is not free.</summary>
    public required double[,] Covariance { get; init; }

    /// <summary>
    /// Singular values of the derivatives by the free parameters, each column scaled to length one, greatest first: all are 1 where
    /// the parameters are seen apart, the last is near zero where two or more are seen only together.
    /// </summary>
    public required IReadOnlyList<double> SingularValues { get; init; }

    /// <summary>How many steps were taken.</summary>
    public required int Iterations { get; init; }

    /// <summary>True when nothing within the bounds near the estimates lowers the sum of squares.</summary>
    public required bool Converged { get; init; }

    /// <summary>Greatest over least singular value; 1 is best, infinite where parameters cannot be told apart.</summary>
    public double Condition => SingularValues.Count == 0 ? 1 : SingularValues[^1] > 0 ? SingularValues[0] / SingularValues[^1] : double.PositiveInfinity;

    /// <summary>Chi-square per degree of freedom: about 1 when the stated standard deviations are right. NaN without any.</summary>
    public double ReducedChiSquare => DegreesOfFreedom > 0 ? ChiSquare / DegreesOfFreedom : double.NaN;

    /// <summary>Correlation of two estimates, -1 to 1; NaN where one is not free.</summary>
    public double Correlation(int i, int j) => Covariance[i, j] / (StandardErrors[i] * StandardErrors[j]);

    /// <summary>Puts a result together; errors by QR, never by normal equations.</summary>
    internal static FitResult Of(FitProblem problem, double[] at, double[] residuals, double[,] jacobian, double[]? weights, int steps, bool converged)
    {
        var n = at.Length;
        var bounds = problem.Parameters.Select((p, j) => p.Lower == p.Upper ? BoundState.Held : at[j] <= p.Lower ? BoundState.AtLower : at[j] >= p.Upper ? BoundState.AtUpper : BoundState.Free).ToArray();
        var free = Enumerable.Range(0, n).Where(j => bounds[j] == BoundState.Free).ToArray();
        var covariance = new double[n, n];
        var errors = new double[n];
        Array.Fill(errors, double.NaN);
        for (var i = 0; i < n; i++)
        {
            for (var j = 0; j < n; j++) covariance[i, j] = double.NaN;
        }

        double[] singular = [];
        if (free.Length > 0)
        {
            var columns = Matrix<double>.Build.Dense(residuals.Length, free.Length, (i, k) => jacobian[i, free[k]] * Math.Sqrt(weights?[i] ?? 1));
            var lengths = columns.ColumnNorms(2).ToArray();
            var scaled = Matrix<double>.Build.Dense(residuals.Length, free.Length, (i, k) => lengths[k] > 0 ? columns[i, k] / lengths[k] : 0);
            singular = [.. scaled.Svd(computeVectors: false).S];
            if (residuals.Length < free.Length || !(singular[^1] > Inseparable * singular[0]))
            {
                foreach (var k in free) errors[k] = double.PositiveInfinity;
            }
            else
            {
                var inverse = scaled.QR().R.Inverse();
                var product = inverse * inverse.Transpose();
                for (var k = 0; k < free.Length; k++)
                {
                    for (var l = 0; l < free.Length; l++) covariance[free[k], free[l]] = product[k, l] / (lengths[k] * lengths[l]);
                    errors[free[k]] = Math.Sqrt(covariance[free[k], free[k]]);
                }
            }
        }

        var chi = 0.0;
        for (var i = 0; i < residuals.Length; i++) chi += residuals[i] * residuals[i] * (weights?[i] ?? 1);
        return new FitResult
        {
            Estimates = at,
            Bounds = bounds,
            Residuals = (double[])residuals.Clone(),
            Weights = weights ?? [.. Enumerable.Repeat(1.0, residuals.Length)],
            ChiSquare = chi,
            DegreesOfFreedom = residuals.Length - free.Length,
            StandardErrors = errors,
            Covariance = covariance,
            SingularValues = singular,
            Iterations = steps,
            Converged = converged,
        };
    }
}
