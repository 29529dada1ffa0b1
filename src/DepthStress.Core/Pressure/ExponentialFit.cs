using DepthStress.Core.Catalogue;
using MathNet.Numerics.LinearAlgebra;

namespace DepthStress.Core.Pressure;

/// <summary>
/// Bounded non-linear least squares of <c>y = limit + (surface - limit) exp(-z / length)</c>. At a given length the model is linear, so the
/// search runs over the logarithm of the length alone (variable projection: Golub and Pereyra 1973, SIAM J. Numer. Anal. 10, 413-432, with
/// the step of Kaufman 1975): a scan of a thinned copy finds the valley, Gauss-Newton steps its floor. A range of no width holds its
/// parameter.
/// </summary>
public sealed class ExponentialFit
{
    private const int Scan = 40;
    private const int Thinned = 400;
    private const int MostSteps = 100;

    private ExponentialFit(double[] values, double[] errors, double squares, int free)
    {
        (Surface, Limit, Length) = (values[0], values[1], values[2]);
        (SurfaceError, LimitError, LengthError) = (errors[0], errors[1], errors[2]);
        (ResidualSquares, Free) = (squares, free);
    }

    /// <summary>Value at depth zero.</summary>
    public double Surface { get; }

    /// <summary>Value at great depth.</summary>
    public double Limit { get; }

    /// <summary>Depth over which the exponential falls by a factor e.</summary>
    public double Length { get; }

    /// <summary>Standard error of <see cref="Surface"/>, as for independent residuals; zero where it was held or stopped by a bound.</summary>
    public double SurfaceError { get; }

    /// <summary>Standard error of <see cref="Limit"/>, likewise.</summary>
    public double LimitError { get; }

    /// <summary>Standard error of <see cref="Length"/>, likewise.</summary>
    public double LengthError { get; }

    /// <summary>Sum of squared residuals.</summary>
    public double ResidualSquares { get; }

    /// <summary>Number of parameters that were neither held nor stopped by a bound.</summary>
    public int Free { get; }

    /// <summary>Fits the curve.</summary>
    /// <param name="depth">Depths, none NaN.</param>
    /// <param name="values">Values, none NaN, as many and more than three.</param>
    /// <param name="surface">Range of the value at depth zero.</param>
    /// <param name="limit">Range of the value at great depth.</param>
    /// <param name="length">Range of the length, above zero.</param>
    /// <exception cref="ArgumentException">Lengths differ, values are too few, or the length is not above zero.</exception>
    public static ExponentialFit Of(ReadOnlySpan<double> depth, ReadOnlySpan<double> values, Interval surface, Interval limit, Interval length)
    {
        if (values.Length != depth.Length || values.Length < 4) throw new ArgumentException("Lengths differ or values are too few.", nameof(values));
        if (!(length.Low > 0 && length.High >= length.Low)) throw new ArgumentException("The length must be above zero.", nameof(length));
        var mean = Mean(values);
        var at = length.High > length.Low ? Valley(depth, values, mean, surface, limit, length) : length.Low;
        var sums = new ExponentialSums(depth, values, mean, at);
        var best = sums.Best(surface, limit);
        var varies = length.High > length.Low;
        for (var k = 0; varies && k < MostSteps; k++)
        {
            var step = Step(sums, best, surface, limit);
            var (next, moved, found) = (at, sums, best);
            var better = false;
            // Halved until it goes downhill; at the floor no step does.
            for (var halving = 0; halving < 30 && !better; halving++, step /= 2)
            {
                next = Math.Clamp(at * Math.Exp(step), length.Low, length.High);
                if (next == at) break;
                moved = new ExponentialSums(depth, values, mean, next);
                found = moved.Best(surface, limit);
                better = found.Squares < best.Squares;
            }

            if (!better) break;
            var far = Math.Abs(next / at - 1);
            (at, sums, best) = (next, moved, found);
            if (far < 1e-11) break;
        }

        return Judge(depth, values, sums, best, at, surface, limit, length);
    }

    private static double Valley(ReadOnlySpan<double> depth, ReadOnlySpan<double> values, double mean, Interval surface, Interval limit, Interval length)
    {
        var step = Math.Max(1, depth.Length / Thinned);
        var (few, fewValues) = (new double[(depth.Length + step - 1) / step], new double[(depth.Length + step - 1) / step]);
        for (var k = 0; k < few.Length; k++) (few[k], fewValues[k]) = (depth[k * step], values[k * step]);
        var (valley, least) = (length.Low, double.PositiveInfinity);
        for (var k = 0; k <= Scan; k++)
        {
            var at = length.Low * Math.Pow(length.High / length.Low, (double)k / Scan);
            var squares = new ExponentialSums(few, fewValues, mean, at).Best(surface, limit).Squares;
            if (squares < least) (valley, least) = (at, squares);
        }

        return Math.Clamp(valley, length.Low, length.High);
    }

    /// <summary>The Gauss-Newton step of the logarithm of the length, the free ends following.</summary>
    private static double Step(in ExponentialSums sums, (double Surface, double Limit, double Squares) best, Interval surface, Interval limit)
    {
        var m = sums.Matrix(best.Surface, best.Limit, Inside(best.Surface, surface), Inside(best.Limit, limit), true);
        var solution = Matrix<double>.Build.DenseOfRowMajor(3, 3, m).Solve(Vector<double>.Build.Dense([0, 0, sums.Downhill(best.Surface, best.Limit)]));
        return double.IsFinite(solution[2]) ? Math.Clamp(solution[2], -1, 1) : 0;
    }

    private static ExponentialFit Judge(
        ReadOnlySpan<double> depth, ReadOnlySpan<double> values, in ExponentialSums sums, (double Surface, double Limit, double Squares) best, double at, Interval surface, Interval limit, Interval length)
    {
        bool[] free = [Inside(best.Surface, surface), Inside(best.Limit, limit), Inside(at, length)];
        double squares = 0;
        for (var i = 0; i < values.Length; i++)
        {
            var residual = values[i] - best.Limit - ((best.Surface - best.Limit) * Math.Exp(-depth[i] / at));
            squares += residual * residual;
        }

        var inverse = Matrix<double>.Build.DenseOfRowMajor(3, 3, sums.Matrix(best.Surface, best.Limit, free[0], free[1], free[2])).Inverse();
        var deviation = Math.Sqrt(squares / (values.Length - free.Count(f => f)));
        double[] errors = [.. free.Select((f, k) => f ? deviation * Math.Sqrt(inverse[k, k]) : 0)];
        errors[2] *= at;
        return new ExponentialFit([best.Surface, best.Limit, at], errors, squares, free.Count(f => f));
    }

    private static bool Inside(double value, Interval range) => value > range.Low && value < range.High;

    private static double Mean(ReadOnlySpan<double> values)
    {
        double sum = 0;
        foreach (var value in values) sum += value;
        return sum / values.Length;
    }
}
