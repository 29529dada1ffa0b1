namespace DepthStress.Core.Logs;

/// <summary>Brings curves of several files onto one set of depths.</summary>
public static class DepthGrid
{
    /// <summary>Depths closer than this are one depth, m: half of the last digit files print.</summary>
    public const double Tolerance = 1e-3;

    /// <summary>
    /// The depths of the first file, continued by the others' depths where they reach further up or down.
    /// </summary>
    /// <param name="files">Measured depths of each file, m, strictly increasing; at least one file.</param>
    public static double[] Union(IReadOnlyList<double[]> files)
    {
        ArgumentNullException.ThrowIfNull(files);
        var union = files[0];
        foreach (var depths in files.Skip(1))
        {
            if (depths.Length == 0 || ReferenceEquals(depths, union)) continue;
            if (union.Length == 0)
            {
                union = depths;
                continue;
            }

            var margin = 0.5 * Step(depths);
            var above = depths.TakeWhile(d => d < union[0] - margin).ToArray();
            var below = depths.SkipWhile(d => d <= union[^1] + margin).ToArray();
            if (above.Length > 0 || below.Length > 0) union = [.. above, .. union, .. below];
        }

        return union;
    }

    /// <summary>
    /// Brings a curve onto other depths: samples at the same depth are taken as they are, others come from a straight line
    /// between neighbours that are no further apart than one and a half steps of the curve; never across a gap.
    /// </summary>
    /// <param name="depths">The curve's depths, m, strictly increasing.</param>
    /// <param name="values">The curve.</param>
    /// <param name="grid">The wanted depths, m, strictly increasing.</param>
    /// <param name="resampled">Gets true where a value came from a straight line.</param>
    /// <returns>One value per wanted depth; NaN where there is none.</returns>
    public static double[] Bring(ReadOnlySpan<double> depths, ReadOnlySpan<double> values, ReadOnlySpan<double> grid, Span<bool> resampled)
    {
        if (values.Length != depths.Length || resampled.Length != grid.Length) throw new ArgumentException("Lengths differ.", nameof(values));
        var brought = new double[grid.Length];
        var reach = 1.5 * Step(depths);
        var next = 0;
        for (var i = 0; i < grid.Length; i++)
        {
            brought[i] = double.NaN;
            resampled[i] = false;
            while (next < depths.Length && depths[next] < grid[i] - Tolerance) next++;
            if (next == depths.Length) continue;
            if (depths[next] <= grid[i] + Tolerance)
            {
                brought[i] = values[next];
            }
            else if (next > 0 && depths[next] - depths[next - 1] <= reach)
            {
                var share = (grid[i] - depths[next - 1]) / (depths[next] - depths[next - 1]);
                brought[i] = values[next - 1] + (share * (values[next] - values[next - 1]));
                resampled[i] = !double.IsNaN(brought[i]);
            }
        }

        return brought;
    }

    /// <summary>The usual distance between samples, m: the median of the first thousand.</summary>
    private static double Step(ReadOnlySpan<double> depths)
    {
        if (depths.Length < 2) return 0;
        var steps = new double[Math.Min(1000, depths.Length - 1)];
        for (var i = 0; i < steps.Length; i++) steps[i] = depths[i + 1] - depths[i];
        return MathNet.Numerics.Statistics.ArrayStatistics.MedianInplace(steps);
    }
}
