using MathNet.Numerics.LinearAlgebra;

namespace DepthStress.Core.Prediction;

/// <summary>
/// Linear least squares with an intercept, by QR of the centred and scaled predictors: the centring takes away most of what
/// makes a design ill-conditioned.
/// </summary>
public sealed class LinearRegression
{
    /// <summary>A diagonal of R below this share of its greatest one means that predictors repeat each other.</summary>
    private const double Dependent = 1e-9;

    private LinearRegression(double intercept, double[] slopes, double interceptDeviation, double[] slopeDeviations, double residualDeviation)
    {
        Intercept = intercept;
        Slopes = slopes;
        InterceptDeviation = interceptDeviation;
        SlopeDeviations = slopeDeviations;
        ResidualDeviation = residualDeviation;
    }

    /// <summary>The constant term.</summary>
    public double Intercept { get; }

    /// <summary>One factor per predictor.</summary>
    public IReadOnlyList<double> Slopes { get; }

    /// <summary>Standard deviation of the constant term, for independent residuals.</summary>
    public double InterceptDeviation { get; }

    /// <summary>Standard deviations of the factors, for independent residuals.</summary>
    public IReadOnlyList<double> SlopeDeviations { get; }

    /// <summary>Standard deviation of the residuals: <c>sqrt(RSS / (rows - predictors - 1))</c>.</summary>
    public double ResidualDeviation { get; }

    /// <summary>Fits the line, or gives null when rows are too few or predictors repeat each other or do not vary.</summary>
    /// <param name="predictors">One column per predictor, none NaN, all as long as the target; at least one.</param>
    /// <param name="target">What is to be met, none NaN.</param>
    /// <exception cref="ArgumentException">Lengths differ or there is no predictor.</exception>
    public static LinearRegression? Fit(IReadOnlyList<double[]> predictors, double[] target)
    {
        ArgumentNullException.ThrowIfNull(predictors);
        ArgumentNullException.ThrowIfNull(target);
        if (predictors.Count == 0 || predictors.Any(p => p.Length != target.Length)) throw new ArgumentException("Lengths differ.", nameof(predictors));
        var (rows, count) = (target.Length, predictors.Count);
        if (rows < count + 2) return null;

        var means = predictors.Select(Mean).ToArray();
        var scales = predictors.Select((p, k) => Norm(p, means[k])).ToArray();
        for (var k = 0; k < count; k++)
        {
            if (!(scales[k] > 1e-12 * Math.Sqrt(rows) * Math.Abs(means[k]))) return null;
        }

        var mean = Mean(target);
        var qr = Matrix<double>.Build.Dense(rows, count, (i, k) => (predictors[k][i] - means[k]) / scales[k]).QR();
        var r = qr.R;
        var greatest = Enumerable.Range(0, count).Max(k => Math.Abs(r[k, k]));
        if (Enumerable.Range(0, count).Any(k => !(Math.Abs(r[k, k]) > Dependent * greatest))) return null;
        var centred = Vector<double>.Build.Dense(rows, i => target[i] - mean);
        var scaled = qr.Solve(centred);
        var slopes = scaled.Select((s, k) => s / scales[k]).ToArray();

        var intercept = mean - Enumerable.Range(0, count).Sum(k => slopes[k] * means[k]);
        double rss = 0;
        for (var i = 0; i < rows; i++)
        {
            var residual = centred[i];
            for (var k = 0; k < count; k++) residual -= scaled[k] * ((predictors[k][i] - means[k]) / scales[k]);
            rss += residual * residual;
        }

        var deviation = Math.Sqrt(rss / (rows - count - 1));
        var inverse = r.Inverse();
        var slopeDeviations = Enumerable.Range(0, count).Select(k => deviation * inverse.Row(k).L2Norm() / scales[k]).ToArray();
        // The intercept is the mean less means times slopes: both parts vary, independently.
        var lever = Vector<double>.Build.Dense(count, k => means[k] / scales[k]);
        var leverage = inverse.Transpose().Multiply(lever).L2Norm();
        return new LinearRegression(intercept, slopes, deviation * Math.Sqrt((1.0 / rows) + (leverage * leverage)), slopeDeviations, deviation);
    }

    /// <summary>The line's value at one row of predictors.</summary>
    public double At(IReadOnlyList<double[]> predictors, int row)
    {
        ArgumentNullException.ThrowIfNull(predictors);
        var value = Intercept;
        for (var k = 0; k < Slopes.Count; k++) value += Slopes[k] * predictors[k][row];
        return value;
    }

    private static double Mean(double[] values)
    {
        double sum = 0;
        foreach (var value in values) sum += value;
        return sum / values.Length;
    }

    private static double Norm(double[] values, double mean)
    {
        double sum = 0;
        foreach (var value in values) sum += (value - mean) * (value - mean);
        return Math.Sqrt(sum);
    }
}
