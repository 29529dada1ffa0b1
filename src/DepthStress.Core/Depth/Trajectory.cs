using System.Diagnostics.CodeAnalysis;

namespace DepthStress.Core.Depth;

/// <summary>
/// The path of the hole: vertical from the datum (measured depth 0) to the first survey station, circular arcs between
/// stations (minimum curvature), straight on beyond the last. Source: Taylor &amp; Mason 1972; Sawaryn &amp; Thorogood 2005,
/// SPE Drilling &amp; Completion 20:24-36. All in m and rad.
/// </summary>
public sealed class Trajectory
{
    /// <summary>A last heading whose cosine is not above this counts as not getting deeper.</summary>
    private const double Level = 1e-9;

    private readonly TrajectoryPoint[] _stations;
    private readonly SurveyArc[] _arcs;
    private readonly double[] _md;

    private Trajectory(TrajectoryPoint[] stations, SurveyArc[] arcs)
    {
        (_stations, _arcs) = (stations, arcs);
        _md = Array.ConvertAll(stations, s => s.MeasuredDepth);
    }

    /// <summary>A vertical hole: true vertical depth is measured depth, nowhere extrapolated.</summary>
    public static Trajectory Vertical { get; } = new([], []);

    /// <summary>Measured depth of the last survey station, m; positive infinity for a vertical hole without survey.</summary>
    public double LastStation => _md.Length == 0 ? double.PositiveInfinity : _md[^1];

    /// <summary>
    /// Builds the path, or says everything that is wrong with the stations: values that are not finite, inclination outside
    /// 0 to 180 deg, measured depth that does not grow, a first one above the datum, a turn of 180 deg, no station at all.
    /// </summary>
    /// <param name="stations">The survey from top to bottom; azimuth may be any angle.</param>
    /// <param name="trajectory">The path, null when there is a problem.</param>
    /// <param name="problems">Gets what is wrong, by index of the station from 0.</param>
    /// <param name="notes">Gets what the reader should know although the path stands, likewise.</param>
    public static bool TryCreate(
        ReadOnlySpan<SurveyStation> stations,
        [NotNullWhen(true)] out Trajectory? trajectory,
        List<(int Station, string Problem)> problems,
        List<(int Station, string Note)> notes)
    {
        ArgumentNullException.ThrowIfNull(problems);
        ArgumentNullException.ThrowIfNull(notes);
        trajectory = null;
        var before = problems.Count;
        SurveyCheck.Problems(stations, problems);
        if (problems.Count > before) return false;
        SurveyCheck.Notes(stations, notes);
        var (points, arcs) = SurveyPath.Join(stations);
        trajectory = new(points, arcs);
        return true;
    }

    /// <summary>The point at a measured depth, m. A depth that is not finite gives a point that is NaN throughout.</summary>
    public TrajectoryPoint At(double md)
    {
        if (!double.IsFinite(md)) return new(double.NaN, double.NaN, double.NaN, double.NaN, double.NaN, double.NaN, false);
        var i = StationAbove(md);
        if (i < 0) return new(md, md, 0, 0, 0, 0, false);
        var station = _stations[i];
        var along = md - station.MeasuredDepth;
        if (along == 0) return station;
        var heading = _arcs[i].HeadingAt(along);
        var moved = _arcs[i].Displacement(along, heading);
        return new(
            md, station.TrueVerticalDepth + moved.Down, station.North + moved.North, station.East + moved.East,
            heading.Inclination, heading.Azimuth, i == _stations.Length - 1);
    }

    /// <summary>
    /// True vertical depth and inclination at many measured depths, equal to those of <see cref="At"/>. NaN in gives NaN out.
    /// One pass over samples and stations when the depths grow; right in any order.
    /// </summary>
    /// <param name="md">Measured depths, m.</param>
    /// <param name="tvd">Gets the true vertical depths, m.</param>
    /// <param name="inclination">Gets the inclinations, rad.</param>
    /// <exception cref="ArgumentException">The lengths differ.</exception>
    public void Fill(ReadOnlySpan<double> md, Span<double> tvd, Span<double> inclination)
    {
        if (tvd.Length != md.Length) throw new ArgumentException("its length differs from that of md", nameof(tvd));
        if (inclination.Length != md.Length) throw new ArgumentException("its length differs from that of md", nameof(inclination));
        var i = -1;
        for (var k = 0; k < md.Length; k++)
        {
            var depth = md[k];
            if (i >= 0 && depth < _md[i]) i = StationAbove(depth);
            while (i + 1 < _md.Length && _md[i + 1] <= depth) i++;
            (tvd[k], inclination[k]) = Near(i, depth);
        }
    }

    /// <summary>
    /// The first measured depth, m, at which the hole reaches a true vertical depth, m; NaN when it never does. Beyond the
    /// last station the hole goes straight on; a level or climbing one gets no deeper.
    /// </summary>
    public double MeasuredDepthAt(double tvd)
    {
        if (!double.IsFinite(tvd)) return double.NaN;
        if (_stations.Length == 0 || tvd <= _stations[0].TrueVerticalDepth) return tvd;
        for (var i = 0; i + 1 < _stations.Length; i++)
        {
            var along = _arcs[i].AlongAtDepth(tvd - _stations[i].TrueVerticalDepth);
            if (double.IsFinite(along)) return _md[i] + along;
            if (tvd <= _stations[i + 1].TrueVerticalDepth) return _md[i + 1];
        }

        var down = _arcs[^1].Start.Down;
        return down > Level ? _md[^1] + ((tvd - _stations[^1].TrueVerticalDepth) / down) : double.NaN;
    }

    private (double Tvd, double Inclination) Near(int station, double md)
    {
        if (!double.IsFinite(md)) return (double.NaN, double.NaN);
        if (station < 0) return (md, 0);
        var along = md - _md[station];
        if (along == 0) return (_stations[station].TrueVerticalDepth, _stations[station].Inclination);
        var heading = _arcs[station].HeadingAt(along);
        return (_stations[station].TrueVerticalDepth + _arcs[station].Displacement(along, heading).Down, heading.Inclination);
    }

    /// <summary>Index of the last station at or above a measured depth; -1 above the first.</summary>
    private int StationAbove(double md)
    {
        var i = Array.BinarySearch(_md, md);
        return i >= 0 ? i : ~i - 1;
    }
}
