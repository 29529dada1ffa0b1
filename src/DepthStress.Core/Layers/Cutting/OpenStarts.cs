using System.Numerics;

namespace DepthStress.Core.Layers;

/// <summary>
/// The starts from which a further segment of least cost may still begin. A start whose best way to a later edge is no cheaper
/// than the best way to that edge is outdone by it, but only for segments that are thick enough to begin there: it goes one
/// least thickness later.
/// </summary>
internal sealed class OpenStarts
{
    /// <summary>Outdone starts do no harm; they are swept when an eighth of all is outdone, and at least this many.</summary>
    private const int Sweep = 64;

    private readonly SegmentCosts _costs;
    private readonly double[] _edges;
    private readonly ThicknessLimits _limits;
    private readonly double[][] _sums;
    private readonly int[] _starts;
    private readonly double[] _best;
    private readonly double[] _outdoneAt;
    private readonly double[] _cost;
    private int _first;
    private int _count;
    private int _outdone;

    /// <summary>Makes room for every start.</summary>
    public OpenStarts(SegmentCosts costs, double[] edges, ThicknessLimits limits)
    {
        (_costs, _edges, _limits) = (costs, edges, limits);
        _sums = [.. costs.Sums.Select(s => new double[s.Length])];
        (_starts, _best, _outdoneAt, _cost) = (new int[edges.Length], new double[edges.Length], new double[edges.Length], new double[edges.Length]);
    }

    /// <summary>Adds a start below all others.</summary>
    /// <param name="start">The first cell of its segment.</param>
    /// <param name="best">The least cost of everything above.</param>
    public void Add(int start, double best)
    {
        for (var s = 0; s < _sums.Length; s++) _sums[s][_count] = _costs.Sums[s][start];
        (_starts[_count], _best[_count], _outdoneAt[_count]) = (start, best, double.PositiveInfinity);
        _count++;
    }

    /// <summary>The least cost of everything down to an edge, and where its last segment starts; infinite when no segment keeps the limits.</summary>
    public (double Cost, int Start) Lowest(int to)
    {
        while (_first < _count && _starts[_first] < to - 1 && !_limits.IsThinEnough(_edges[to] - _edges[_starts[_first]])) _first++;
        var costs = _cost.AsSpan(0, _count - _first);
        _costs.Fill(_sums, _first, to, costs);
        var thick = costs.Length;
        while (thick > 0 && !_limits.IsThickEnough(_edges[to] - _edges[_starts[_first + thick - 1]])) thick--;
        var (value, at) = Minimum.OfSum(_best.AsSpan(_first, thick), costs[..thick]);
        return (value, at < 0 ? 0 : _starts[_first + at]);
    }

    /// <summary>Marks the starts that an edge outdoes, after <see cref="Lowest"/> of that edge, and sweeps those that can go.</summary>
    public void Prune(int to, double best)
    {
        var costs = _cost.AsSpan(0, _count - _first);
        var above = _best.AsSpan(_first, costs.Length);
        var i = 0;
        for (; i <= costs.Length - Vector<double>.Count; i += Vector<double>.Count)
        {
            if (!Vector.GreaterThanOrEqualAny(new Vector<double>(costs[i..]) + new Vector<double>(above[i..]), new Vector<double>(best))) continue;
            for (var lane = 0; lane < Vector<double>.Count; lane++) Mark(i + lane);
        }

        for (; i < costs.Length; i++) Mark(i);
        if (_outdone + _first >= Math.Max(Sweep, _count / 8)) Compact(_edges[to]);

        void Mark(int k)
        {
            if (_cost[k] + _best[_first + k] < best || _outdoneAt[_first + k] <= _edges[to]) return;
            _outdoneAt[_first + k] = _edges[to];
            _outdone++;
        }
    }

    private void Compact(double edge)
    {
        var kept = 0;
        _outdone = 0;
        for (var k = _first; k < _count; k++)
        {
            if (_limits.IsThickEnough(edge - _outdoneAt[k])) continue;
            foreach (var sum in _sums) sum[kept] = sum[k];
            (_starts[kept], _best[kept], _outdoneAt[kept]) = (_starts[k], _best[k], _outdoneAt[k]);
            if (double.IsFinite(_outdoneAt[k])) _outdone++;
            kept++;
        }

        (_first, _count) = (0, kept);
    }
}
