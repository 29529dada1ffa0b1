using DepthStress.Core.Prediction;
using MathNet.Numerics.Distributions;

namespace DepthStress.Core.Calibration;

/// <summary>An estimate with its standard error and the ends of its 95 % interval, by Student's t.</summary>
/// <param name="Value">The estimate.</param>
/// <param name="Error">Its standard error, for independent residuals.</param>
/// <param name="Low">Lower end.</param>
/// <param name="High">Upper end.</param>
public readonly record struct FitValue(double Value, double Error, double Low, double High)
{
    /// <summary>The estimate with the interval that so many degrees of freedom give.</summary>
    public static FitValue Of(double value, double error, int freedom)
    {
        var half = StudentT.InvCDF(0, 1, freedom, 0.975) * error;
        return new FitValue(value, error, value - half, value + half);
    }
}

/// <summary>Straight lines of one variable on another.</summary>
public static class SimpleFit
{
    /// <summary>Ordinary least squares with an intercept; null for fewer than three points or where x does not vary.</summary>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static (FitValue Intercept, FitValue Slope, double Deviation)? Line(double[] x, double[] y)
    {
        ArgumentNullException.ThrowIfNull(y);
        return LinearRegression.Fit([x], y) is { } fit
            ? (FitValue.Of(fit.Intercept, fit.InterceptDeviation, y.Length - 2), FitValue.Of(fit.Slopes[0], fit.SlopeDeviations[0], y.Length - 2), fit.ResidualDeviation)
            : null;
    }

    /// <summary>
    /// Weighted least squares of <c>y = b x</c>: <c>b = sum(w x y)/sum(w x^2)</c>, with the error from the weighted residuals over
    /// n - 1. Null for fewer than two points.
    /// </summary>
    /// <param name="x">Positive values.</param>
    /// <param name="y">What they are to give.</param>
    /// <param name="weight">The weight of a point with that x; null means equal weights.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static FitValue? ThroughOrigin(double[] x, double[] y, Func<double, double>? weight = null)
    {
        ArgumentNullException.ThrowIfNull(x);
        ArgumentNullException.ThrowIfNull(y);
        if (x.Length != y.Length) throw new ArgumentException("Lengths differ.", nameof(y));
        if (x.Length < 2) return null;
        weight ??= _ => 1;
        double cross = 0, square = 0, rest = 0;
        for (var i = 0; i < x.Length; i++)
        {
            cross += weight(x[i]) * x[i] * y[i];
            square += weight(x[i]) * x[i] * x[i];
        }

        var slope = cross / square;
        for (var i = 0; i < x.Length; i++) rest += weight(x[i]) * (y[i] - (slope * x[i])) * (y[i] - (slope * x[i]));
        return FitValue.Of(slope, Math.Sqrt(rest / (x.Length - 1) / square), x.Length - 1);
    }

    /// <summary>
    /// The factor that x must be multiplied with to give y, every point counting by its relative misfit (weights 1/x^2), so that it
    /// is the mean of y/x. Null for fewer than two points.
    /// </summary>
    public static FitValue? Factor(double[] x, double[] y) => ThroughOrigin(x, y, v => 1 / (v * v));
}
