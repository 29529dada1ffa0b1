namespace DepthStress.Core.Depth;

/// <summary>Joins survey stations to a path.</summary>
internal static class SurveyPath
{
    /// <summary>Gives the place of every station and the arc below it; the last arc goes straight on without end.</summary>
    public static (TrajectoryPoint[] Points, SurveyArc[] Arcs) Join(ReadOnlySpan<SurveyStation> stations)
    {
        var points = new TrajectoryPoint[stations.Length];
        var arcs = new SurveyArc[stations.Length];
        Join(stations, new Heading(0, 0, stations[0].MeasuredDepth), points, arcs);
        return (points, arcs);
    }

    /// <summary>
    /// The same below a tie-in: a straight line from the datum to it in the direction of the first station, and where the
    /// first station lies lower, a straight line along that station's heading to it.
    /// </summary>
    public static (TrajectoryPoint[] Points, SurveyArc[] Arcs) Join(ReadOnlySpan<SurveyStation> stations, TieIn tieIn)
    {
        var first = stations[0];
        if (first.MeasuredDepth > tieIn.MeasuredDepth) stations = (SurveyStation[])[first with { MeasuredDepth = tieIn.MeasuredDepth }, .. stations];
        var points = new TrajectoryPoint[stations.Length + 1];
        var arcs = new SurveyArc[stations.Length + 1];
        var above = Heading.Of(tieIn.Inclination, first.Azimuth);
        points[0] = new(0, 0, 0, 0, tieIn.Inclination, Heading.Normalised(first.Azimuth), false);
        arcs[0] = SurveyArc.Straight(above, tieIn.MeasuredDepth);
        var place = (tieIn.MeasuredDepth * above) with { Down = tieIn.TrueVerticalDepth };
        Join(stations, place, points.AsSpan(1), arcs.AsSpan(1));
        return (points, arcs);
    }

    /// <summary>
    /// Straight lines between points of known vertical depth; the direction is unknown and taken as north. Below the last point
    /// the hole goes straight on.
    /// </summary>
    public static (TrajectoryPoint[] Points, SurveyArc[] Arcs) Follow(ReadOnlySpan<double> md, ReadOnlySpan<double> tvd)
    {
        var points = new TrajectoryPoint[md.Length + 1];
        var arcs = new SurveyArc[md.Length + 1];
        var (along, place) = (0.0, new Heading(0, 0, 0));
        for (var i = 0; i <= md.Length; i++)
        {
            if (i < md.Length)
            {
                // A little more depth than length, from rounding, is kept: the depths are the curve's.
                var slope = (tvd[i] - place.Down) / (md[i] - along);
                var heading = new Heading(Math.Sqrt(Math.Max(0, 1 - (slope * slope))), 0, slope);
                arcs[i] = SurveyArc.Straight(heading, md[i] - along);
            }
            else
            {
                arcs[i] = SurveyArc.Straight(arcs[i - 1].Start, double.PositiveInfinity);
            }

            points[i] = new(along, place.Down, place.North, 0, arcs[i].Start.Inclination, 0, false);
            if (i == md.Length) break;
            place = (place + arcs[i].Displacement(md[i] - along)) with { Down = tvd[i] };
            along = md[i];
        }

        return (points, arcs);
    }

    private static void Join(ReadOnlySpan<SurveyStation> stations, Heading place, Span<TrajectoryPoint> points, Span<SurveyArc> arcs)
    {
        for (var i = 0; i < stations.Length; i++)
        {
            var (md, inclination, azimuth) = stations[i];
            points[i] = new(md, place.Down, place.North, place.East, inclination, Heading.Normalised(azimuth), false);
            var heading = Heading.Of(inclination, azimuth);
            if (i + 1 == stations.Length)
            {
                arcs[i] = SurveyArc.Straight(heading, double.PositiveInfinity);
                break;
            }

            var next = stations[i + 1];
            arcs[i] = SurveyArc.Between(heading, Heading.Of(next.Inclination, next.Azimuth), next.MeasuredDepth - md);
            place += arcs[i].Displacement(next.MeasuredDepth - md);
        }
    }
}
