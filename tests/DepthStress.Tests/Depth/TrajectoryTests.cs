using DepthStress.Core.Depth;
using static DepthStress.Tests.Depth.Surveys;

namespace DepthStress.Tests.Depth;

public class TrajectoryTests
{
    [Fact]
    public void A_vertical_hole_has_equal_depths_and_is_never_extrapolated()
    {
        Assert.Equal(new TrajectoryPoint(2500, 2500, 0, 0, 0, 0, false), Trajectory.Vertical.At(2500));
        Assert.Equal(1234.5, Trajectory.Vertical.MeasuredDepthAt(1234.5), 0); // the same number
        Assert.Equal(double.PositiveInfinity, Trajectory.Vertical.LastStation);
    }

    [Fact]
    public void The_hole_is_vertical_down_to_the_first_station()
    {
        var path = Path(Station(100, 30, 90), Station(200, 30, 90));
        Assert.Equal(new TrajectoryPoint(60, 60, 0, 0, 0, 0, false), path.At(60));
        Assert.Equal(new TrajectoryPoint(100, 100, 0, 0, Math.PI / 6, Math.PI / 2, false), path.At(100));
        Assert.Equal(-5, path.At(-5).TrueVerticalDepth, 0); // the same number
    }

    [Fact]
    public void Below_the_last_station_the_hole_goes_straight_on_and_says_so()
    {
        var path = Path(Station(0, 0, 0), Station(100, 60, 90));
        var (end, beyond) = (path.At(100), path.At(140));
        Assert.False(end.Extrapolated);
        Assert.True(beyond.Extrapolated);
        Assert.Equal(100, path.LastStation, 0); // as given
        Assert.Equal(end.TrueVerticalDepth + 20, beyond.TrueVerticalDepth, 1e-12); // 40 cos 60 deg, rounding
        Assert.Equal(end.East + (40 * Math.Sqrt(0.75)), beyond.East, 1e-12);
        Assert.Equal(Math.PI / 3, beyond.Inclination, 1e-15);
    }

    [Fact]
    public void A_straight_slanted_hole_is_a_straight_line()
    {
        var path = Path(Station(0, 60, 0), Station(100, 60, 0), Station(300, 60, 0));
        Assert.Equal(75, path.At(150).TrueVerticalDepth, 1e-12); // cos 60 deg = 1/2, rounding
        Assert.Equal(150, path.MeasuredDepthAt(75), 1e-12);
    }

    // An arc cosine loses the angle below about 1e-8 rad; the arc tangent does not. Over 100 m the end is 50 b m out.
    [Theory]
    [InlineData(1e-3)]
    [InlineData(1e-5)]
    [InlineData(1e-9)]
    [InlineData(1e-12)]
    public void A_tiny_dogleg_is_not_lost(double dogleg)
    {
        var end = Path(new(0, 0, 0), new(100, dogleg, 0)).At(100);
        Assert.Equal(1, end.North / (50 * dogleg), 1e-6); // next term: b^2/12
        Assert.Equal(1, Path(new(0, 0, 0), new(100, dogleg, 0)).At(50).Inclination / (dogleg / 2), 1e-9); // rounding over b
    }

    [Theory]
    [InlineData(-90, 270)]
    [InlineData(450, 90)]
    [InlineData(360, 0)]
    [InlineData(-1e-18, 0)]
    public void Azimuth_is_brought_into_one_turn(double azimuth, double expected) =>
        Assert.Equal(expected * Math.PI / 180, Path(Station(10, 5, azimuth)).At(10).Azimuth, 1e-14); // rounding

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void A_depth_that_is_not_finite_has_no_place(double md)
    {
        var path = Path(Station(0, 0, 0), Station(100, 60, 90));
        Assert.True(double.IsNaN(path.At(md).TrueVerticalDepth));
        Assert.True(double.IsNaN(path.At(md).Inclination));
        Assert.False(path.At(md).Extrapolated);
        Assert.True(double.IsNaN(path.MeasuredDepthAt(md)));
        double[] tvd = [1], inclination = [1], azimuth = [1];
        path.Fill([md], tvd, inclination, azimuth);
        Assert.All([tvd[0], inclination[0], azimuth[0]], v => Assert.True(double.IsNaN(v)));
    }

    [Fact]
    public void Depths_in_any_order_fill_as_they_do_one_by_one()
    {
        var path = Path(Station(50, 0, 0), Station(100, 60, 90), Station(180, 95, 100), Station(260, 40, 20));
        double[] md = [300, 20, 100, 260, double.NaN, 180, 70, 70, -3, 50, 259];
        Surveys.FillEqualsAt(path, md);
    }

    [Fact]
    public void Spans_of_unequal_length_are_refused_before_anything_is_written()
    {
        double[] tvd = [7, 7];
        Assert.Throws<ArgumentException>("tvd", () => Trajectory.Vertical.Fill([1], tvd, new double[1], new double[1]));
        Assert.Throws<ArgumentException>("inclination", () => Trajectory.Vertical.Fill([1, 2], tvd, new double[1], new double[2]));
        Assert.Throws<ArgumentException>("azimuth", () => Trajectory.Vertical.Fill([1, 2], tvd, new double[2], new double[1]));
        Assert.Equal([7, 7], tvd);
    }

    [Fact]
    public void The_first_of_several_places_at_one_depth_is_found()
    {
        // Down 0-500, a half circle through level that climbs, then over the top and down again.
        var path = Path(Station(0, 0, 0), Station(500, 80, 0), Station(900, 110, 0), Station(1500, 20, 0));
        var deepest = Enumerable.Range(0, 4001).Select(i => 500 + (i * 0.1)).MaxBy(md => path.At(md).TrueVerticalDepth);
        var tvd = path.At(deepest + 50).TrueVerticalDepth;
        var first = path.MeasuredDepthAt(tvd);
        Assert.InRange(first, 500, deepest);
        Assert.Equal(tvd, path.At(first).TrueVerticalDepth, 1e-9); // rounding at 500 m
    }

    [Fact]
    public void A_depth_the_hole_never_reaches_is_missing()
    {
        Assert.True(double.IsNaN(Path(Station(0, 0, 0), Station(1000, 90, 0)).MeasuredDepthAt(700)));
        Assert.True(double.IsNaN(Path(Station(0, 0, 0), Station(1000, 120, 0)).MeasuredDepthAt(700)));
        var building = Path(Station(0, 0, 0), Station(1000, 60, 0));
        var end = building.At(1000).TrueVerticalDepth;
        Assert.Equal(1000, building.MeasuredDepthAt(end), 1e-9); // rounding
        Assert.Equal(1200, building.MeasuredDepthAt(end + 100), 1e-9); // straight on at 60 deg
        Assert.Equal(-10, building.MeasuredDepthAt(-10), 0); // above the datum: vertical
    }

    // Sums of rounded numbers: without care the depth of a station may lie a last digit below the arc that leads there.
    [Fact]
    public void The_depth_of_a_level_last_station_is_always_reached()
    {
        for (var top = 0.1; top < 500; top += 1.7)
        {
            var path = Path(Station(top, 0, 0), Station(top + 333.3, 45, 0), Station(top + 777.7, 90, 0));
            var found = path.MeasuredDepthAt(path.At(path.LastStation).TrueVerticalDepth);
            Assert.Equal(path.LastStation, found, 1e-3); // depth is flat there: 1e-13 m down is 1e-5 m along
        }
    }
}
