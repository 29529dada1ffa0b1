namespace DepthStress.Core.Layers;

/// <summary>
/// Cuts cells into a wanted number of segments of least total cost, exactly, for every number up to a greatest one: dynamic
/// programming over the number of segments (Hawkins and Merriam 1973, Math. Geol. 5, 389-395).
/// </summary>
public sealed class CountedCut
{
    private readonly double[][] _best;
    private readonly int[][] _from;

    /// <summary>Finds the cuts.</summary>
    /// <param name="costs">What segments cost.</param>
    /// <param name="edges">Depths of the edges of the cells, one more than cells, rising, m.</param>
    /// <param name="limits">How thick a segment may be.</param>
    /// <param name="most">The greatest number of segments.</param>
    public CountedCut(SegmentCosts costs, double[] edges, ThicknessLimits limits, int most)
    {
        ArgumentNullException.ThrowIfNull(costs);
        ArgumentNullException.ThrowIfNull(edges);
        ArgumentOutOfRangeException.ThrowIfLessThan(most, 1);
        if (edges.Length != costs.Count + 1) throw new ArgumentException("There is one more edge than cells.", nameof(edges));
        Most = most;
        _best = new double[most + 1][];
        _from = new int[most + 1][];
        for (var k = 0; k <= most; k++)
        {
            Array.Fill(_best[k] = new double[edges.Length], double.PositiveInfinity);
            _from[k] = new int[edges.Length];
        }

        _best[0][0] = 0;
        var buffer = new double[edges.Length];
        int first = 0, end = 0;
        for (var to = 1; to < edges.Length; to++)
        {
            while (first < to - 1 && !limits.IsThinEnough(edges[to] - edges[first])) first++;
            while (end < to && limits.IsThickEnough(edges[to] - edges[end])) end++;
            if (end <= first) continue;
            var last = buffer.AsSpan(0, end - first);
            costs.Fill(costs.Sums, first, to, last);
            for (var k = 1; k <= most; k++)
            {
                (_best[k][to], var at) = Minimum.OfSum(_best[k - 1].AsSpan(first, last.Length), last);
                _from[k][to] = first + at;
            }
        }
    }

    /// <summary>The greatest number of segments that was asked for.</summary>
    public int Most { get; }

    /// <summary>The least total cost of a number of segments; infinite when none keeps the limits.</summary>
    public double Cost(int segments) => _best[segments][^1];

    /// <summary>One past the last cell of each segment, from top to bottom; null when no cut into so many keeps the limits.</summary>
    public int[]? Ends(int segments)
    {
        if (!double.IsFinite(Cost(segments))) return null;
        var ends = new int[segments];
        var to = _best[0].Length - 1;
        for (var k = segments; k > 0; to = _from[k--][to]) ends[k - 1] = to;
        return ends;
    }
}
