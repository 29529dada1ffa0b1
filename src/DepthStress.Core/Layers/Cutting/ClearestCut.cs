namespace DepthStress.Core.Layers;

/// <summary>
/// Cuts cells where the gain in misfit outweighs a penalty per boundary: optimal partitioning (Jackson et al. 2005, IEEE Signal
/// Process. Lett. 12, 105-108) with the pruning of Killick, Fearnhead and Eckley 2012 (J. Am. Stat. Assoc. 107, 1590-1598),
/// which leaves the answer exact.
/// </summary>
public static class ClearestCut
{
    /// <summary>The segments of least total cost plus penalty per boundary.</summary>
    /// <param name="costs">What segments cost.</param>
    /// <param name="edges">Depths of the edges of the cells, one more than cells, rising, m.</param>
    /// <param name="penalty">What a boundary costs, not below zero.</param>
    /// <param name="limits">How thick a segment may be.</param>
    /// <returns>One past the last cell of each segment, from top to bottom; null when no cut keeps the limits.</returns>
    public static int[]? Of(SegmentCosts costs, double[] edges, double penalty, ThicknessLimits limits)
    {
        ArgumentNullException.ThrowIfNull(costs);
        ArgumentNullException.ThrowIfNull(edges);
        ArgumentOutOfRangeException.ThrowIfNegative(penalty);
        if (edges.Length != costs.Count + 1) throw new ArgumentException("There is one more edge than cells.", nameof(edges));
        var best = new double[edges.Length];
        var from = new int[edges.Length];
        best[0] = -penalty;
        var starts = new OpenStarts(costs, edges, limits);
        for (var to = 1; to < edges.Length; to++)
        {
            if (double.IsFinite(best[to - 1])) starts.Add(to - 1, best[to - 1]);
            (var lowest, from[to]) = starts.Lowest(to);
            best[to] = lowest + penalty;
            if (double.IsFinite(best[to])) starts.Prune(to, best[to]);
        }

        return double.IsFinite(best[^1]) ? Ends(from) : null;
    }

    private static int[] Ends(int[] from)
    {
        var ends = new List<int>();
        for (var to = from.Length - 1; to > 0; to = from[to]) ends.Add(to);
        ends.Reverse();
        return [.. ends];
    }
}
