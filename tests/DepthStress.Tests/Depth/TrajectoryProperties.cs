using CsCheck;
using DepthStress.Core.Depth;

namespace DepthStress.Tests.Depth;

public class TrajectoryProperties
{
    /// <summary>Rounding along 2 km of path; grows with the tangent of half the dogleg, which may near 180 deg here.</summary>
    private const double Rounding = 1e-7;

    private static readonly Gen<double> Share = Gen.Double[0, 1];

    [Fact]
    public void A_hole_gets_no_more_deeper_than_longer() =>
        Gen.Select(Surveys.Any, Share, Share).Sample((stations, a, b) =>
        {
            var path = Surveys.Path(stations);
            var (upper, lower) = (path.At(Depth(path, Math.Min(a, b))), path.At(Depth(path, Math.Max(a, b))));
            var (north, east, down) = (lower.North - upper.North, lower.East - upper.East, lower.TrueVerticalDepth - upper.TrueVerticalDepth);
            Assert.True(Math.Sqrt((north * north) + (east * east) + (down * down)) <= lower.MeasuredDepth - upper.MeasuredDepth + Rounding);
        });

    [Fact]
    public void At_a_station_the_path_is_the_station_from_both_sides() =>
        Surveys.Any.Sample(stations =>
        {
            var path = Surveys.Path(stations);
            foreach (var station in stations)
            {
                var (here, above) = (path.At(station.MeasuredDepth), path.At(Math.BitDecrement(station.MeasuredDepth)));
                Assert.Equal(station.Inclination, here.Inclination, 0); // as given
                Assert.Equal(station.Azimuth, here.Azimuth, 0); // as given, being within one turn
                Near(here, above);
                if (station != stations[0]) Assert.Equal(station.Inclination, above.Inclination, Rounding);
            }
        });

    [Fact]
    public void A_station_added_on_the_path_leaves_the_path_as_it_is() =>
        Gen.Select(Surveys.Any, Share, Share).Sample((stations, at, look) =>
        {
            var path = Surveys.Path(stations);
            var md = stations[0].MeasuredDepth + (at * (path.LastStation - stations[0].MeasuredDepth));
            if (stations.Any(s => Math.Abs(s.MeasuredDepth - md) < 1e-3)) return;
            var added = path.At(md);
            SurveyStation[] split = [.. stations, new(md, added.Inclination, added.Azimuth)];
            var other = Surveys.Path([.. split.OrderBy(s => s.MeasuredDepth)]);
            Near(path.At(path.LastStation), other.At(path.LastStation));
            Near(path.At(Depth(path, look)), other.At(Depth(path, look)));
        });

    [Fact]
    public void The_path_runs_along_its_own_inclination_and_azimuth() =>
        Gen.Select(Surveys.Descending, Share).Sample((stations, at) =>
        {
            const double step = 1e-3;
            var path = Surveys.Path(stations);
            var md = Depth(path, at);
            if (stations.Any(s => Math.Abs(s.MeasuredDepth - md) < 2 * step)) return;
            var (above, here, below) = (path.At(md - step), path.At(md), path.At(md + step));

            // Tolerance: rounding of 1e-12 m over the step, and step^2 times the square of a curvature of up to 5 rad/m.
            Assert.Equal(Math.Cos(here.Inclination), (below.TrueVerticalDepth - above.TrueVerticalDepth) / (2 * step), 1e-5);
            Assert.Equal(Math.Sin(here.Inclination) * Math.Cos(here.Azimuth), (below.North - above.North) / (2 * step), 1e-5);
            Assert.Equal(Math.Sin(here.Inclination) * Math.Sin(here.Azimuth), (below.East - above.East) / (2 * step), 1e-5);
        });

    [Fact]
    public void Filling_a_span_gives_the_same_numbers_as_single_points() =>
        Gen.Select(Surveys.Any, Gen.Double[-100, 3000].Array, Gen.Bool).Sample((stations, md, sorted) =>
        {
            var path = Surveys.Path(stations);
            if (sorted) Array.Sort(md);
            Surveys.FillEqualsAt(path, md);
        });

    [Fact]
    public void In_a_hole_that_goes_down_depth_leads_back_to_measured_depth() =>
        Gen.Select(Surveys.Descending, Share).Sample((stations, at) =>
        {
            var path = Surveys.Path(stations);
            var md = Depth(path, at);
            Assert.Equal(md, path.MeasuredDepthAt(path.At(md).TrueVerticalDepth), 1e-9); // rounding at 3 km over cos 75 deg
        });

    [Fact]
    public void In_any_hole_the_place_found_has_the_depth_and_no_earlier_one_has() =>
        Gen.Select(Surveys.Any, Share).Sample((stations, at) =>
        {
            var path = Surveys.Path(stations);
            var (md, tvd) = (Depth(path, at), path.At(Depth(path, at)).TrueVerticalDepth);
            var found = path.MeasuredDepthAt(tvd);
            Assert.True(found <= md + 1e-6); // where the hole is nearly level, rounding of depth weighs more along it
            Assert.Equal(tvd, path.At(found).TrueVerticalDepth, Rounding);
            var start = Math.Min(found, 0) - 10; // a hole that climbs past the datum is at depths above it
            for (var k = 0; k < 200; k++) Assert.True(path.At(start + ((found - start) * k / 200)).TrueVerticalDepth < tvd + Rounding);
        });

    /// <summary>A measured depth between the datum and 100 m below the last station.</summary>
    private static double Depth(Trajectory path, double share) => share * (path.LastStation + 100);

    private static void Near(TrajectoryPoint a, TrajectoryPoint b)
    {
        Assert.Equal(a.TrueVerticalDepth, b.TrueVerticalDepth, Rounding);
        Assert.Equal(a.North, b.North, Rounding);
        Assert.Equal(a.East, b.East, Rounding);
    }
}
