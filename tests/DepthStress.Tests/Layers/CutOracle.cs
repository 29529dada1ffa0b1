using DepthStress.Core.Layers;

namespace DepthStress.Tests.Layers;

/// <summary>The plain way to cut: every start is tried, every cost is summed anew or taken as given.</summary>
internal static class CutOracle
{
    public static double[] Edges(int cells) => [.. Enumerable.Range(0, cells + 1).Select(i => (double)i)];

    public static double[] Middles(int cells) => [.. Enumerable.Range(0, cells).Select(i => i + 0.5)];

    /// <summary>Optimal partitioning without any pruning; the cost holds the penalty of every boundary.</summary>
    public static (double Cost, int[] Ends) Unpruned(SegmentCosts costs, double[] edges, double penalty, ThicknessLimits limits)
    {
        var best = new double[edges.Length];
        var from = new int[edges.Length];
        best[0] = -penalty;
        for (var to = 1; to < edges.Length; to++)
        {
            best[to] = double.PositiveInfinity;
            for (var s = 0; s < to; s++)
            {
                if (!Allowed(edges, s, to, limits)) continue;
                var cost = best[s] + costs.Of(s, to) + penalty;
                if (cost < best[to]) (best[to], from[to]) = (cost, s);
            }
        }

        var ends = new List<int>();
        for (var to = edges.Length - 1; to > 0; to = from[to]) ends.Insert(0, to);
        return (best[^1], [.. ends]);
    }

    /// <summary>The least cost of so many segments, over every way to place them.</summary>
    public static double Every(SegmentCosts costs, double[] edges, int segments, ThicknessLimits limits, int start = 0)
    {
        var n = edges.Length - 1;
        if (segments == 1) return start < n && Allowed(edges, start, n, limits) ? costs.Of(start, n) : double.PositiveInfinity;
        var least = double.PositiveInfinity;
        for (var to = start + 1; to < n; to++)
        {
            if (Allowed(edges, start, to, limits)) least = Math.Min(least, costs.Of(start, to) + Every(costs, edges, segments - 1, limits, to));
        }

        return least;
    }

    public static double Total(SegmentCosts costs, IReadOnlyList<int> ends, double penalty) =>
        ends.Select((to, k) => costs.Of(k == 0 ? 0 : ends[k - 1], to)).Sum() + (penalty * (ends.Count - 1));

    public static bool Allowed(double[] edges, int from, int to, ThicknessLimits limits) =>
        limits.IsThickEnough(edges[to] - edges[from]) && (limits.IsThinEnough(edges[to] - edges[from]) || to - from == 1);

    /// <summary>The misfit of one curve over the cells [from, to), summed from its own mean or line.</summary>
    public static double Misfit(double[] depths, CutCurve curve, int from, int to)
    {
        var cells = Enumerable.Range(from, to - from).Where(i => !double.IsNaN(curve.Values[i]) && curve.Weights[i] > 0).ToList();
        if (cells.Count == 0) return 0;
        double Mean(Func<int, double> of) => cells.Sum(i => curve.Weights[i] * of(i)) / cells.Sum(i => curve.Weights[i]);
        var (depth, value) = (Mean(i => depths[i]), Mean(i => curve.Values[i]));
        var spread = Mean(i => (depths[i] - depth) * (depths[i] - depth));
        var slope = curve.Trend && spread > 0 ? Mean(i => (depths[i] - depth) * (curve.Values[i] - value)) / spread : 0;
        return cells.Sum(i => curve.Weights[i] * Math.Pow(curve.Values[i] - value - (slope * (depths[i] - depth)), 2));
    }
}
