using System.Diagnostics.CodeAnalysis;

namespace DepthStress.Core.Depth;

/// <summary>
/// The path of the hole: vertical from the datum (measured depth 0) to the first survey station, or straight to a tie-in,
/// circular arcs between stations (minimum curvature), straight on beyond the last. Source: Taylor &amp; Mason 1972; Sawaryn &amp; Thorogood 2005,
/// SPE Drilling &amp; Completion 20:24-36. All in m and rad.
/// </summary>
public sealed class Trajectory
{
    /// <summary>A last heading whose cosine is not above this counts as not getting deeper.</summary>
    private const double Level = 1e-9;

    private static readonly TrajectoryPoint Nowhere = new(double.NaN, double.NaN, double.NaN, double.NaN, double.NaN, double.NaN, false);

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
        List<(int Station, string Note)> notes) => TryCreate(stations, null, out trajectory, problems, notes);

    /// <summary>The same for a survey that counts from a tie-in; a station above the tie-in is a problem.</summary>
    /// <param name="stations">The survey from top to bottom; azimuth may be any angle.</param>
    /// <param name="tieIn">The point from which the survey counts, or null: then the hole above the first station is vertical.</param>
    /// <param name="trajectory">The path, null when there is a problem.</param>
    /// <param name="problems">Gets what is wrong, by index of the station from 0.</param>
    /// <param name="notes">Gets what the reader should know although the path stands, likewise.</param>
    /// <exception cref="ArgumentException">The tie-in is not below the datum, or deeper vertically than along the hole.</exception>
    public static bool TryCreate(
        ReadOnlySpan<SurveyStation> stations,
        TieIn? tieIn,
        [NotNullWhen(true)] out Trajectory? trajectory,
        List<(int Station, string Problem)> problems,
        List<(int Station, string Note)> notes)
    {
        if (tieIn is { IsSound: false }) throw new ArgumentException("a tie-in lies below the datum and no deeper vertically than along the hole", nameof(tieIn));
        ArgumentNullException.ThrowIfNull(problems);
        ArgumentNullException.ThrowIfNull(notes);
        trajectory = null;
        var before = problems.Count;
        SurveyCheck.Problems(stations, tieIn, problems);
        if (problems.Count > before) return false;
        if (tieIn is null) SurveyCheck.Notes(stations, notes);
        var (points, arcs) = tieIn is null ? SurveyPath.Join(stations) : SurveyPath.Join(stations, tieIn);
        trajectory = new(points, arcs);
        return true;
    }

    /// <summary>
    /// A path through points of known vertical depth, straight from the datum to the first, between them, and on below the last.
    /// Its direction is not known: azimuths are zero and mean nothing.
    /// </summary>
    /// <param name="md">Measured depths, m, increasing and above zero.</param>
    /// <param name="tvd">True vertical depths there, m.</param>
    /// <exception cref="ArgumentException">There is no point, the lengths differ, or measured depths do not increase from zero.</exception>
    public static Trajectory Follow(ReadOnlySpan<double> md, ReadOnlySpan<double> tvd)
    {
        if (md.Length == 0) throw new ArgumentException("it is empty", nameof(md));
        if (tvd.Length != md.Length) throw new ArgumentException("its length differs from that of md", nameof(tvd));
        for (var i = 0; i < md.Length; i++)
        {
            if (!(md[i] > (i == 0 ? 0 : md[i - 1]))) throw new ArgumentException("it does not increase from zero", nameof(md));
        }

        var (points, arcs) = SurveyPath.Follow(md, tvd);
        return new(points, arcs);
    }

    /// <summary>The point at a measured depth, m. A depth that is not finite gives a point that is NaN throughout.</summary>
    public TrajectoryPoint At(double md)
    {
        if (!double.IsFinite(md)) return Nowhere;
        return Near(StationAbove(md), md);
    }

    /// <summary>
    /// True vertical depth, inclination and azimuth at many measured depths, equal to those of <see cref="At"/>. NaN in gives NaN out.
    /// One pass over samples and stations when the depths grow; right in any order.
    /// </summary>
    /// <param name="md">Measured depths, m.</param>
    /// <param name="tvd">Gets the true vertical depths, m.</param>
    /// <param name="inclination">Gets the inclinations, rad.</param>
    /// <param name="azimuth">Gets the azimuths, rad.</param>
    /// <exception cref="ArgumentException">The lengths differ.</exception>
    public void Fill(ReadOnlySpan<double> md, Span<double> tvd, Span<double> inclination, Span<double> azimuth)
    {
        if (tvd.Length != md.Length) throw new ArgumentException("its length differs from that of md", nameof(tvd));
        if (inclination.Length != md.Length) throw new ArgumentException("its length differs from that of md", nameof(inclination));
        if (azimuth.Length != md.Length) throw new ArgumentException("its length differs from that of md", nameof(azimuth));
        var i = -1;
        for (var k = 0; k < md.Length; k++)
        {
            var depth = md[k];
            if (i >= 0 && depth < _md[i]) i = StationAbove(depth);
            while (i + 1 < _md.Length && _md[i + 1] <= depth) i++;
            var point = double.IsFinite(depth) ? Near(i, depth) : Nowhere;
            (tvd[k], inclination[k], azimuth[k]) = (point.TrueVerticalDepth, point.Inclination, point.Azimuth);
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

    /// <summary>The point at a finite measured depth at or below a station and above the next; -1 is above the first.</summary>
    private TrajectoryPoint Near(int station, double md)
    {
        if (station < 0) return new(md, md, 0, 0, 0, 0, false);
        var start = _stations[station];
        var along = md - start.MeasuredDepth;
        if (along == 0) return start;
        var heading = _arcs[station].HeadingAt(along);
        var moved = _arcs[station].Displacement(along, heading);
        return new(
            md, start.TrueVerticalDepth + moved.Down, start.North + moved.North, start.East + moved.East,
            heading.Inclination, heading.Azimuth, station == _stations.Length - 1);
    }

    /// <summary>Index of the last station at or above a measured depth; -1 above the first.</summary>
    private int StationAbove(double md)
    {
        var i = Array.BinarySearch(_md, md);
        return i >= 0 ? i : ~i - 1;
    }
}
