namespace DepthStress.Core.Pressure;

/// <summary>A point of a normal compaction trend.</summary>
/// <param name="Depth">Depth below the ground or mudline, m.</param>
/// <param name="Slowness">Compressional slowness of normally compacted shale there, s/m.</param>
public readonly record struct TrendPoint(double Depth, double Slowness);

/// <summary>
/// A normal trend of slowness against depth: straight lines of the logarithm of slowness between the given points, the first
/// and last of them carried on beyond the points (common practice: a straight line on a semilogarithmic plot).
/// </summary>
public sealed class TrendLine
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

    /// <summary>Slowness of the trend at a depth below the ground or mudline, s/m; NaN for NaN.</summary>
    public double At(double depth)
    {
        if (double.IsNaN(depth)) return double.NaN;
        var k = Array.BinarySearch(_depths, depth);
        if (k < 0) k = ~k;
        k = Math.Clamp(k, 1, _depths.Length - 1);
        var share = (depth - _depths[k - 1]) / (_depths[k] - _depths[k - 1]);
        return Math.Exp(_logs[k - 1] + (share * (_logs[k] - _logs[k - 1])));
    }

    /// <summary>Fills the trend for every sample.</summary>
    /// <param name="tvd">True vertical depth, m.</param>
    /// <param name="solidTop">True vertical depth of the ground or mudline, m.</param>
    /// <param name="slowness">Gets the slowness, s/m.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public void Fill(ReadOnlySpan<double> tvd, double solidTop, Span<double> slowness)
    {
        if (slowness.Length != tvd.Length) throw new ArgumentException("Lengths differ.", nameof(slowness));
        for (var i = 0; i < tvd.Length; i++) slowness[i] = At(tvd[i] - solidTop);
    }
}
