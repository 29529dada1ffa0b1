namespace DepthStress.Core.Depth;

/// <summary>Joins survey stations to a path.</summary>
internal static class SurveyPath
{
    /// <summary>Gives the place of every station and the arc below it; the last arc goes straight on without end.</summary>
    public static (TrajectoryPoint[] Points, SurveyArc[] Arcs) Join(ReadOnlySpan<SurveyStation> stations)
    {
        var points = new TrajectoryPoint[stations.Length];
        var arcs = new SurveyArc[stations.Length];
        var place = new Heading(0, 0, stations[0].MeasuredDepth);
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

        return (points, arcs);
    }
}
