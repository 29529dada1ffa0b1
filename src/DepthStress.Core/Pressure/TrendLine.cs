namespace DepthStress.Core.Pressure;

/// <summary>A point of a normal compaction trend.</summary>
/// <param name="Depth">Depth below the ground or mudline, m.</param>
/// <param name="Slowness">Compressional slowness of normally compacted shale there, s/m.</param>
public readonly record struct TrendPoint(double Depth, double Slowness);

/// <summary>
/// A normal trend of slowness against depth: straight lines of the logarithm of slowness between the given points, the first
/// and last of them carried on beyond the points (common practice: a straight line on a semilogarithmic plot).
/// </summary>
public sealed class TrendLine : NormalTrend
{
    private readonly double[] _depths;
    private readonly double[] _logs;

    /// <summary>Makes the trend.</summary>
    /// <param name="points">Two or more points, from top to bottom.</param>
    /// <exception cref="ArgumentException">Fewer than two points, or depths that do not increase.</exception>
    public TrendLine(IReadOnlyList<TrendPoint> points)
    {
        ArgumentNullException.ThrowIfNull(points);
        if (points.Count < 2) throw new ArgumentException("A trend needs two points.", nameof(points));
        _depths = [.. points.Select(p => p.Depth)];
        _logs = [.. points.Select(p => Math.Log(p.Slowness))];
        for (var k = 1; k < _depths.Length; k++)
        {
            if (!(_depths[k] > _depths[k - 1])) throw new ArgumentException("Depths must increase.", nameof(points));
        }
    }

    /// <inheritdoc/>
    public override TrendQuantity Quantity => TrendQuantity.Slowness;

    /// <inheritdoc/>
    public override double At(double depth)
    {
        if (double.IsNaN(depth)) return double.NaN;
        var k = Array.BinarySearch(_depths, depth);
        if (k < 0) k = ~k;
        k = Math.Clamp(k, 1, _depths.Length - 1);
        var share = (depth - _depths[k - 1]) / (_depths[k] - _depths[k - 1]);
        return Math.Exp(_logs[k - 1] + (share * (_logs[k] - _logs[k - 1])));
    }

    /// <inheritdoc/>
    public override double DepthOf(double value)
    {
        var log = Math.Log(value);
        for (var k = 1; k < _logs.Length; k++)
        {
            // Above the first point and below the last the outermost lines go on.
            if ((k > 1 && log > _logs[k - 1]) || (k + 1 < _logs.Length && log < _logs[k])) continue;
            var slope = (_logs[k] - _logs[k - 1]) / (_depths[k] - _depths[k - 1]);
            return slope < 0 ? _depths[k - 1] + ((log - _logs[k - 1]) / slope) : double.NaN;
        }

        return double.NaN;
    }
}
