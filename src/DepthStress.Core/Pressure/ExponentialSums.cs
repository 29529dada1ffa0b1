using DepthStress.Core.Catalogue;

namespace DepthStress.Core.Pressure;

/// <summary>
/// The normal equations of <c>y = limit (1 - e) + surface e</c>, <c>e = exp(-z / length)</c>, at one length, with the column of the
/// logarithm of the length; one pass over the samples. Values count from their mean, which moves both ends alike.
/// </summary>
internal readonly struct ExponentialSums
{
    private readonly double _mean, _ll, _ls, _ss, _lg, _sg, _gg, _ly, _sy, _gy, _yy;

    /// <summary>Adds up.</summary>
    public ExponentialSums(ReadOnlySpan<double> depth, ReadOnlySpan<double> values, double mean, double length)
    {
        _mean = mean;
        var rate = 1 / length;
        for (var i = 0; i < depth.Length; i++)
        {
            var x = depth[i] * rate;
            var e = Math.Exp(-x);
            var (l, g, y) = (1 - e, e * x, values[i] - mean);
            _ll += l * l;
            _ls += l * e;
            _ss += e * e;
            _lg += l * g;
            _sg += e * g;
            _gg += g * g;
            _ly += l * y;
            _sy += e * y;
            _gy += g * y;
            _yy += y * y;
        }
    }

    /// <summary>The ends that fit best inside their ranges, and their sum of squares.</summary>
    public (double Surface, double Limit, double Squares) Best(Interval surface, Interval limit)
    {
        var (s, l) = (new Interval(surface.Low - _mean, surface.High - _mean), new Interval(limit.Low - _mean, limit.High - _mean));
        var determinant = (_ll * _ss) - (_ls * _ls);
        var (freeLimit, freeSurface) = (((_ss * _ly) - (_ls * _sy)) / determinant, ((_ll * _sy) - (_ls * _ly)) / determinant);
        var best = (Surface: double.NaN, Limit: double.NaN, Squares: double.PositiveInfinity);
        if (s.Contains(freeSurface) && l.Contains(freeLimit))
        {
            best = (freeSurface, freeLimit, Squares(freeSurface, freeLimit));
        }
        else
        {
            foreach (var end in (ReadOnlySpan<double>)[s.Low, s.High]) Try(end, Math.Clamp((_ly - (_ls * end)) / _ll, l.Low, l.High), ref best);
            foreach (var end in (ReadOnlySpan<double>)[l.Low, l.High]) Try(Math.Clamp((_sy - (_ls * end)) / _ss, s.Low, s.High), end, ref best);
        }

        // What stopped at a bound is that bound to the last digit.
        return (Back(best.Surface, s, surface), Back(best.Limit, l, limit), best.Squares);
    }

    /// <summary>
    /// The matrix of the normal equations of the free parameters, in the order surface, limit, logarithm of the length; a parameter
    /// that is not free has ones on the diagonal and nothing beside.
    /// </summary>
    public double[] Matrix(double surface, double limit, bool freeSurface, bool freeLimit, bool freeLength)
    {
        var a = surface - limit;
        double[] m =
        [
            _ss, _ls, a * _sg,
            _ls, _ll, a * _lg,
            a * _sg, a * _lg, a * a * _gg,
        ];
        Hold(m, 0, freeSurface);
        Hold(m, 1, freeLimit);
        Hold(m, 2, freeLength);
        return m;
    }

    /// <summary>The gradient of half the sum of squares, downhill, by the logarithm of the length.</summary>
    public double Downhill(double surface, double limit)
    {
        var (s, l) = (surface - _mean, limit - _mean);
        return (surface - limit) * (_gy - (s * _sg) - (l * _lg));
    }

    private double Back(double value, Interval shifted, Interval range) =>
        value == shifted.Low ? range.Low : value == shifted.High ? range.High : value + _mean;

    private static void Hold(double[] m, int k, bool free)
    {
        if (free) return;
        for (var i = 0; i < 3; i++) m[(3 * i) + k] = m[(3 * k) + i] = i == k ? 1 : 0;
    }

    private void Try(double surface, double limit, ref (double Surface, double Limit, double Squares) best)
    {
        if (double.IsFinite(surface) && double.IsFinite(limit) && Squares(surface, limit) is var squares && squares < best.Squares) best = (surface, limit, squares);
    }

    private double Squares(double s, double l) =>
        Math.Max(0, _yy - (2 * ((l * _ly) + (s * _sy))) + (l * l * _ll) + (2 * l * s * _ls) + (s * s * _ss));
}
