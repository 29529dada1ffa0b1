namespace DepthStress.Report.Drawing;

/// <summary>
/// Thins a curve for drawing, one sample at a time. Samples in a row that fall into the same bin of depth leave at most
/// four points: the first, the least, the greatest and the last, in their order; so no extreme is lost and neighbouring bins
/// stay joined. A missing sample between two bins ends the line; a gap inside one bin is narrower than can be drawn.
/// </summary>
/// <param name="top">Depth at which bins start.</param>
/// <param name="bin">Height of a bin, in depth.</param>
internal sealed class Decimator(double top, double bin)
{
    private readonly double _perBin = 1 / bin;
    private readonly List<List<LogPoint>> _lines = [];
    private double _current = double.NaN;
    private bool _gap = true;
    private long _order;
    private (long Order, LogPoint Point) _first, _least, _greatest, _last;

    /// <summary>Takes the next sample; a depth or value that is not finite is a missing sample.</summary>
    public void Add(double depth, double value)
    {
        _order++;
        if (!double.IsFinite(value) || !double.IsFinite(depth))
        {
            _gap = true;
            return;
        }

        var (index, here) = (Math.Floor((depth - top) * _perBin), (_order, new LogPoint(depth, value)));
        if (index == _current)
        {
            if (value < _least.Point.Value) _least = here;
            if (value > _greatest.Point.Value) _greatest = here;
            _last = here;
        }
        else
        {
            Flush();
            if (_gap) _lines.Add([]);
            (_current, _first, _least, _greatest, _last) = (index, here, here, here, here);
        }

        _gap = false;
    }

    /// <summary>Ends the curve and gives its lines, each without a gap and with at least one point.</summary>
    public IReadOnlyList<IReadOnlyList<LogPoint>> Lines()
    {
        Flush();
        _current = double.NaN;
        _gap = true;
        return _lines;
    }

    private void Flush()
    {
        if (double.IsNaN(_current)) return;
        var line = _lines[^1];
        var (low, high) = _least.Order < _greatest.Order ? (_least, _greatest) : (_greatest, _least);
        line.Add(_first.Point);
        if (low.Order > _first.Order && low.Order < _last.Order) line.Add(low.Point);
        if (high.Order > low.Order && high.Order > _first.Order && high.Order < _last.Order) line.Add(high.Point);
        if (_last.Order > _first.Order) line.Add(_last.Point);
    }
}
