namespace DepthStress.Core.Pressure;

/// <summary>How values are smoothed along depth.</summary>
public enum Smoothing
{
    /// <summary>By the mean of those within the window.</summary>
    Mean,

    /// <summary>By the median of those within the window.</summary>
    Median,
}

/// <summary>A window that runs along depth; at the ends it holds what there is.</summary>
public static class RunningWindow
{
    /// <summary>Smooths values; each gets the mean or median of those within half a window above and below it.</summary>
    /// <param name="depth">Depths, m, not decreasing.</param>
    /// <param name="values">Values, none NaN.</param>
    /// <param name="window">Height of the window, m.</param>
    /// <param name="smoothing">How.</param>
    /// <param name="result">Gets the smoothed values.</param>
    /// <exception cref="ArgumentException">Lengths differ.</exception>
    public static void Fill(ReadOnlySpan<double> depth, ReadOnlySpan<double> values, double window, Smoothing smoothing, Span<double> result)
    {
        if (values.Length != depth.Length || result.Length != depth.Length) throw new ArgumentException("Lengths differ.", nameof(values));
        var inside = new SortedWindow();
        double sum = 0;
        var (first, end) = (0, 0);
        for (var i = 0; i < depth.Length; i++)
        {
            for (; end < depth.Length && depth[end] <= depth[i] + (window / 2); end++)
            {
                sum += values[end];
                if (smoothing == Smoothing.Median) inside.Add(values[end]);
            }

            for (; depth[first] < depth[i] - (window / 2); first++)
            {
                sum -= values[first];
                if (smoothing == Smoothing.Median) inside.Remove(values[first]);
            }

            result[i] = smoothing == Smoothing.Median ? inside.Median : sum / (end - first);
        }
    }

    /// <summary>Values in order; adding and removing move the ones behind.</summary>
    private sealed class SortedWindow
    {
        private readonly List<double> _sorted = [];

        public double Median => 0.5 * (_sorted[(_sorted.Count - 1) / 2] + _sorted[_sorted.Count / 2]);

        public void Add(double value)
        {
            var at = _sorted.BinarySearch(value);
            _sorted.Insert(at < 0 ? ~at : at, value);
        }

        public void Remove(double value) => _sorted.RemoveAt(_sorted.BinarySearch(value));
    }
}
