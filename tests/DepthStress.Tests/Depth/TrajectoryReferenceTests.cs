using static DepthStress.Tests.Depth.Surveys;

namespace DepthStress.Tests.Depth;

public class TrajectoryReferenceTests
{
    /// <summary>
    /// A drilling-formula reference page prints for 3500 to 3600 ft, inclination 15 to 25 deg, azimuth 20 to 45 deg: dogleg
    /// 0.22605 rad, N 27.22, E 19.45, TVD 94.01. It prints 1.00408 for the ratio factor, a misprint: its own N, E and TVD
    /// need 1.00428 (1.00408 would give 27.213, 19.447, 93.994).
    /// </summary>
    [Fact]
    public void The_published_minimum_curvature_example_is_met()
    {
        var path = Path(Station(3500, 15, 20), Station(3600, 25, 45));
        var end = path.At(3600);
        Assert.Equal(27.22, end.North, 0.005); // half a unit of the last digit printed
        Assert.Equal(19.45, end.East, 0.005);
        Assert.Equal(94.01, end.TrueVerticalDepth - 3500, 0.005);

        // Self-computed from the same formula in full precision; half a unit of the last digit.
        Assert.Equal(27.218329, end.North, 5e-7);
        Assert.Equal(19.450774, end.East, 5e-7);
        Assert.Equal(94.012343, end.TrueVerticalDepth - 3500, 5e-7);
    }

    [Fact]
    public void The_ratio_factor_of_that_example_is_the_one_its_results_need()
    {
        var end = Path(Station(3500, 15, 20), Station(3600, 25, 45)).At(3600);
        var straight = 50 * (Math.Cos(15 * Math.PI / 180) + Math.Cos(25 * Math.PI / 180));
        var ratio = (end.TrueVerticalDepth - 3500) / straight;
        Assert.Equal(1.004280049, ratio, 5e-10); // self-computed, (2/b) tan(b/2) at b = 0.226048949
        Assert.NotEqual(1.00408, ratio, 1e-4); // the misprint is twice as far away
    }

    // The same page's average-angle example, 7482 to 7782, 4 to 8 deg, 10 to 35 deg, prints N 28.97, E 12.0, TVD 298.35: another
    // method, so it must not match. The values that must are self-computed by the minimum-curvature formula.
    [Fact]
    public void The_average_angle_example_is_not_met_because_it_is_another_method()
    {
        var end = Path(Station(7482, 4, 10), Station(7782, 8, 35)).At(7782);
        Assert.NotEqual(28.97, end.North, 1.0);
        Assert.NotEqual(12.0, end.East, 1.0);
        Assert.NotEqual(298.356569, end.TrueVerticalDepth - 7482, 0.01);
        Assert.Equal(27.420397, end.North, 5e-7); // half a unit of the last digit
        Assert.Equal(13.798623, end.East, 5e-7);
        Assert.Equal(298.341281, end.TrueVerticalDepth - 7482, 5e-7);
    }

    // Geometry, not a source: on a circle of radius R the point at angle a is R sin a down and R (1 - cos a) out.
    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(300)]
    [InlineData(500)]
    [InlineData(999.9)]
    [InlineData(1000)]
    public void A_quarter_circle_is_followed_at_every_point(double md)
    {
        var point = Path(Station(0, 0, 0), Station(1000, 90, 0)).At(md);
        var (radius, angle) = (2000 / Math.PI, md / 1000 * Math.PI / 2);
        Assert.Equal(radius * Math.Sin(angle), point.TrueVerticalDepth, 1e-10); // rounding at 1000 m
        Assert.Equal(radius * (1 - Math.Cos(angle)), point.North, 1e-10);
        Assert.Equal(0, point.East, 1e-10);
        Assert.Equal(angle, point.Inclination, 1e-14);
    }

    [Fact]
    public void The_end_of_a_quarter_circle_is_its_radius_down_and_out()
    {
        var end = Path(Station(0, 0, 0), Station(1000, 90, 0)).At(1000);
        Assert.Equal(636.619772, end.TrueVerticalDepth, 5e-7); // 2000/pi; half a unit of the last digit
        Assert.Equal(636.619772, end.North, 5e-7);
    }

    // Geometry: an arc of length L from vertical over the angle b ends L sin(b) / b down. Both sides of where the ratio factor
    // turns into its series.
    [Theory]
    [InlineData(9.9e-5)]
    [InlineData(1.01e-4)]
    public void Gentle_arcs_keep_their_small_loss_of_depth(double dogleg)
    {
        var end = Path(new(0, 0, 0), new(1000, dogleg, 0)).At(1000);
        Assert.Equal(1000 * Math.Sin(dogleg) / dogleg, end.TrueVerticalDepth, 1e-11); // the loss is 1.6e-6; rounding at 1000 m
    }

    // Geometry: a level quarter circle from north to east.
    [Fact]
    public void A_level_turn_stays_level()
    {
        var path = Path(Station(0, 90, 0), Station(1000, 90, 90));
        var middle = path.At(500);
        Assert.Equal(Math.PI / 4, middle.Azimuth, 1e-14); // rounding
        Assert.Equal(2000 / Math.PI * Math.Sin(Math.PI / 4), middle.North, 1e-10); // rounding at 1000 m
        Assert.Equal(2000 / Math.PI * (1 - Math.Cos(Math.PI / 4)), middle.East, 1e-10);
        Assert.Equal(0, path.At(1000).TrueVerticalDepth, 1e-10);
    }
}
