using DepthStress.Core.Catalogue;
using DepthStress.Core.Prediction;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>
/// Fits a normal trend to picked shale: slowness and porosity by bounded least squares of the exponential, resistivity by the straight
/// line of its logarithm, since its scatter is a share of its value. Standard errors are those of independent samples times the root of
/// the number of samples over their effective number.
/// </summary>
public static class TrendFitter
{
    /// <summary>Fewer shale samples do not make a trend.</summary>
    public const int LeastSamples = 30;

    private const double Foot = 0.3048;

    // Bounds are from memory: mud at the sea floor is little faster than water (about 190 to 200 us/ft); minerals of shale 45 to 70 us/ft.
    private static readonly Interval SurfaceSlowness = new(100e-6 / Foot, 250e-6 / Foot);

    private static readonly Interval MatrixSlowness = new(40e-6 / Foot, 95e-6 / Foot);

    private static readonly Interval SurfacePorosity = new(0.2, 0.9);

    private static readonly Interval Lengths = new(200, 20_000);

    /// <summary>Fits what the settings leave open.</summary>
    /// <param name="quantity">What it is a trend of.</param>
    /// <param name="given">The parameters that are given.</param>
    /// <param name="depth">Depths below the ground or mudline, m, none NaN, at least <see cref="LeastSamples"/>.</param>
    /// <param name="values">Values of shale there, SI, none NaN.</param>
    /// <param name="problem">Why there is no trend, else null.</param>
    /// <exception cref="ArgumentException">Lengths differ or samples are too few.</exception>
    public static FittedTrend? Fit(TrendQuantity quantity, NormalTrendSettings given, double[] depth, double[] values, out FormattableString? problem)
    {
        ArgumentNullException.ThrowIfNull(given);
        ArgumentNullException.ThrowIfNull(depth);
        ArgumentNullException.ThrowIfNull(values);
        if (values.Length != depth.Length || values.Length < LeastSamples) throw new ArgumentException("Lengths differ or samples are too few.", nameof(values));
        problem = WrongWay(quantity, depth, values);
        if (problem is not null) return null;
        var fitted = quantity == TrendQuantity.Resistivity ? Line(given, depth, values) : Exponential(quantity, given, depth, values);
        if (fitted.Trend.Length > 0) return fitted;
        problem = $"the shale is less resistive than surface_resistivity, expected it to grow from there";
        return null;
    }

    /// <summary>A straight line through the samples tells whether they go the way of compaction.</summary>
    private static FormattableString? WrongWay(TrendQuantity quantity, double[] depth, double[] values)
    {
        if (LinearRegression.Fit([depth], values) is not { } line) return $"the shale lies at one depth, expected an interval to fit a trend to";
        var grows = line.Slopes[0] > 0;
        if (grows == (quantity == TrendQuantity.Resistivity)) return null;
        return quantity switch
        {
            TrendQuantity.Slowness => $"the shale gets slower with depth, expected normally compacted shale that gets faster",
            TrendQuantity.Resistivity => $"the shale gets less resistive with depth, expected normally compacted shale that gets more resistive",
            _ => $"the shale gets more porous with depth, expected normally compacted shale that gets less porous",
        };
    }

    private static FittedTrend Exponential(TrendQuantity quantity, NormalTrendSettings given, double[] depth, double[] values)
    {
        var slowness = quantity == TrendQuantity.Slowness;
        var limit = !slowness ? new Interval(0, 0) : given.MatrixSlowness.IsSet ? Just(given.MatrixSlowness.Value) : MatrixSlowness;
        var surface = given.Surface(quantity) is { IsSet: true } s ? Just(s.Value) : slowness ? SurfaceSlowness : SurfacePorosity;
        var fit = ExponentialFit.Of(depth, values, surface, limit, given.ScaleLength.IsSet ? Just(given.ScaleLength.Value) : Lengths);
        var trend = new ExponentialTrend(quantity, fit.Surface, fit.Limit, fit.Length);
        double[] residuals = [.. depth.Select((z, i) => values[i] - trend.At(z))];
        var effective = EffectiveCount.Of(residuals);
        var widened = Math.Sqrt(values.Length / effective);
        var dimension = slowness ? Dimension.Slowness : Dimension.Fraction;
        return new FittedTrend
        {
            Trend = trend,
            Parameters =
            [
                Parameter(slowness ? "surface_slowness" : "surface_porosity", fit.Surface, fit.SurfaceError * widened, dimension, given.Surface(quantity).IsSet),
                .. slowness ? [Parameter("matrix_slowness", fit.Limit, fit.LimitError * widened, dimension, given.MatrixSlowness.IsSet)] : (TrendParameter[])[],
                Parameter("scale_length", fit.Length, fit.LengthError * widened, Dimension.Length, given.ScaleLength.IsSet),
            ],
            Samples = values.Length,
            Effective = effective,
            Scatter = Math.Sqrt(fit.ResidualSquares / (values.Length - fit.Free)),
        };
    }

    /// <summary>The line <c>ln R = ln R_0 + z / length</c> with what is given of it.</summary>
    private static FittedTrend Line(NormalTrendSettings given, double[] depth, double[] values)
    {
        double[] logs = [.. values.Select(v => Math.Log(v))];
        var (surface, length) = (given.SurfaceResistivity, given.ScaleLength);
        double start, slope, startError = 0, slopeError = 0;
        if (!surface.IsSet && !length.IsSet)
        {
            var line = LinearRegression.Fit([depth], logs)!;
            (start, slope, startError, slopeError) = (line.Intercept, line.Slopes[0], line.InterceptDeviation, line.SlopeDeviations[0]);
        }
        else if (surface.IsSet)
        {
            start = Math.Log(surface.Value);
            var squares = depth.Sum(z => z * z);
            slope = length.IsSet ? 1 / length.Value : depth.Select((z, i) => z * (logs[i] - start)).Sum() / squares;
            if (!length.IsSet) slopeError = Deviation(1) / Math.Sqrt(squares);
        }
        else
        {
            slope = 1 / length.Value;
            start = depth.Select((z, i) => logs[i] - (slope * z)).Average();
            startError = Deviation(1) / Math.Sqrt(logs.Length);
        }

        double Deviation(int free) => Math.Sqrt(depth.Select((z, i) => Math.Pow(logs[i] - start - (slope * z), 2)).Sum() / (logs.Length - free));
        var trend = new ExponentialTrend(TrendQuantity.Resistivity, Math.Exp(start), 0, 1 / slope);
        var effective = EffectiveCount.Of([.. depth.Select((z, i) => logs[i] - start - (slope * z))]);
        var widened = Math.Sqrt(logs.Length / effective);
        return new FittedTrend
        {
            Trend = trend,
            Parameters =
            [
                // Errors of the logarithm and of the slope, carried over to first order.
                Parameter("surface_resistivity", trend.Surface, trend.Surface * startError * widened, Dimension.Resistivity, surface.IsSet),
                Parameter("scale_length", trend.Length, slopeError * widened * trend.Length * trend.Length, Dimension.Length, length.IsSet),
            ],
            Samples = logs.Length,
            Effective = effective,
            Scatter = Deviation((surface.IsSet ? 0 : 1) + (length.IsSet ? 0 : 1)),
        };
    }

    private static Interval Just(double value) => new(value, value);

    private static TrendParameter Parameter(string key, double value, double error, Dimension dimension, bool given) => new(
        key, value, error, dimension, given ? TrendParameterKind.Given : error > 0 ? TrendParameterKind.Estimated : TrendParameterKind.AtBound);
}
