using System.Numerics;

namespace DepthStress.Core.Layers;

/// <summary>
/// What a segment of neighbouring cells costs: the weighted squared misfit of every curve against its mean, or against the best
/// straight line in depth where the curve keeps a trend. Every cost comes from running sums in a fixed time; the curves are
/// centred, and trends taken off, before they are summed, so that little cancels.
/// </summary>
/// <remarks>Mean: sum w y^2 - S^2 / W. Line: the same less Szy^2 / Szz, with Szy = sum w z y - Z S / W and Szz = sum w z^2 - Z^2 / W.</remarks>
public sealed class SegmentCosts
{
    /// <summary>A segment whose spread in depth is below this share of the whole one's has no slope: rounding would decide it.</summary>
    private const double Flat = 1e-13;

    private readonly (int First, bool Trend, double Flat)[] _curves;

    /// <summary>Sums the curves.</summary>
    /// <param name="depths">Depth of the middle of each cell, rising, m.</param>
    /// <param name="curves">The curves, one value and weight per depth.</param>
    public SegmentCosts(ReadOnlySpan<double> depths, IReadOnlyList<CutCurve> curves)
    {
        ArgumentNullException.ThrowIfNull(curves);
        foreach (var curve in curves)
        {
            if (curve.Values.Length != depths.Length || curve.Weights.Length != depths.Length)
                throw new ArgumentException("Every curve has one value and one weight per depth.", nameof(curves));
        }

        Count = depths.Length;
        var squares = new double[Count + 1];
        var sums = new List<double[]> { squares };
        _curves = new (int, bool, double)[curves.Count];
        for (var c = 0; c < _curves.Length; c++)
        {
            var first = sums.Count;
            var (w, z, y) = Centred.Of(depths, curves[c]);
            sums.Add(Running(w));
            sums.Add(Running(Times(w, y)));
            if (curves[c].Trend)
            {
                var wz = Times(w, z);
                sums.AddRange([Running(wz), Running(Times(wz, z)), Running(Times(wz, y))]);
            }

            _curves[c] = (first, curves[c].Trend, curves[c].Trend ? Flat * sums[first + 3][^1] : 0);
            var own = Running(Times(Times(w, y), y));
            for (var i = 0; i < squares.Length; i++) squares[i] += own[i];
        }

        Sums = [.. sums];
    }

    /// <summary>Number of cells.</summary>
    public int Count { get; }

    /// <summary>The running sums; the one at index i counts the first i cells.</summary>
    internal double[][] Sums { get; }

    /// <summary>The cost of the cells [from, to).</summary>
    public double Of(int from, int to)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(from);
        ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(from, to);
        Span<double> cost = [0];
        Fill(Sums, from, to, cost);
        return cost[0];
    }

    /// <summary>The costs of segments that end before one cell.</summary>
    /// <param name="starts">The running sums at the starts, as in <see cref="Sums"/>.</param>
    /// <param name="first">Where in them to begin.</param>
    /// <param name="to">One past the last cell of every segment.</param>
    /// <param name="costs">Gets one cost per start.</param>
    internal void Fill(double[][] starts, int first, int to, Span<double> costs)
    {
        ReadOnlySpan<double> At(int sum, Span<double> costs) => starts[sum].AsSpan(first, costs.Length);
        Less(At(0, costs), Sums[0][to], costs);
        foreach (var (s, trend, flat) in _curves)
        {
            if (trend) LessLine(At(s, costs), At(s + 1, costs), At(s + 2, costs), At(s + 3, costs), At(s + 4, costs), s, to, flat, costs);
            else LessMean(At(s, costs), At(s + 1, costs), Sums[s][to], Sums[s + 1][to], costs);
        }
    }

    private static void Less(ReadOnlySpan<double> from, double to, Span<double> costs)
    {
        for (var i = 0; i < costs.Length; i++) costs[i] = to - from[i];
    }

    private static void LessMean(ReadOnlySpan<double> w, ReadOnlySpan<double> y, double wTo, double yTo, Span<double> costs)
    {
        var i = 0;
        for (; i <= costs.Length - Vector<double>.Count; i += Vector<double>.Count)
        {
            var weight = new Vector<double>(wTo) - new Vector<double>(w[i..]);
            var sum = new Vector<double>(yTo) - new Vector<double>(y[i..]);
            var explained = Vector.ConditionalSelect(Vector.GreaterThan(weight, Vector<double>.Zero), sum * sum / weight, Vector<double>.Zero);
            (new Vector<double>(costs[i..]) - explained).CopyTo(costs[i..]);
        }

        for (; i < costs.Length; i++)
        {
            var (weight, sum) = (wTo - w[i], yTo - y[i]);
            if (weight > 0) costs[i] -= sum * sum / weight;
        }
    }

    private void LessLine(
        ReadOnlySpan<double> w, ReadOnlySpan<double> y, ReadOnlySpan<double> z, ReadOnlySpan<double> zz, ReadOnlySpan<double> zy, int s, int to, double flat, Span<double> costs)
    {
        var (wTo, yTo, zTo, zzTo, zyTo) = (Sums[s][to], Sums[s + 1][to], Sums[s + 2][to], Sums[s + 3][to], Sums[s + 4][to]);
        var (zero, i) = (Vector<double>.Zero, 0);
        for (; i <= costs.Length - Vector<double>.Count; i += Vector<double>.Count)
        {
            var weight = new Vector<double>(wTo) - new Vector<double>(w[i..]);
            var share = Vector<double>.One / weight;
            var sum = new Vector<double>(yTo) - new Vector<double>(y[i..]);
            var depth = new Vector<double>(zTo) - new Vector<double>(z[i..]);
            var spread = new Vector<double>(zzTo) - new Vector<double>(zz[i..]) - (depth * depth * share);
            var slope = new Vector<double>(zyTo) - new Vector<double>(zy[i..]) - (depth * sum * share);
            var line = Vector.ConditionalSelect(Vector.GreaterThan(spread, new Vector<double>(flat)), slope * slope / spread, zero);
            var explained = Vector.ConditionalSelect(Vector.GreaterThan(weight, zero), (sum * sum * share) + line, zero);
            (new Vector<double>(costs[i..]) - explained).CopyTo(costs[i..]);
        }

        for (; i < costs.Length; i++)
        {
            var weight = wTo - w[i];
            if (!(weight > 0)) continue;
            var (share, sum, depth) = (1 / weight, yTo - y[i], zTo - z[i]);
            var spread = zzTo - zz[i] - (depth * depth * share);
            var slope = zyTo - zy[i] - (depth * sum * share);
            costs[i] -= (sum * sum * share) + (spread > flat ? slope * slope / spread : 0);
        }
    }

    private static double[] Times(double[] a, double[] b) => [.. a.Zip(b, (x, y) => x * y)];

    private static double[] Running(double[] values)
    {
        var sums = new double[values.Length + 1];
        for (var i = 0; i < values.Length; i++) sums[i + 1] = sums[i] + values[i];
        return sums;
    }
}
