using DepthStress.Core.Borehole;

namespace DepthStress.Tests.Borehole;

/// <summary>
/// Stresses at the wall. Inputs: Zoback 2007, Reservoir Geomechanics, Fig. 6.2 (SHmax 90, Sv 88.2, Shmin 51.5, Pp = Pw = 31.5 MPa).
/// The book shows curves; 1.5 and 155.5 MPa follow by hand from 3 x 20 - 58.5 - 0 and 3 x 58.5 - 20, the other numbers are
/// self-computed from the formulas.
/// </summary>
public sealed class HoleWallReferenceTests
{
    private const double Mega = 1e6;

    private static readonly FarField Far = new(88.2e6, 90e6, 51.5e6, 0);

    /// <summary>The numbers are given with so many decimals of a MPa.</summary>
    private const double Printed = 5.1e-5 * Mega, SixDigits = 5.1e-7 * Mega;

    private static double Rad(double degrees) => degrees * Math.PI / 180;

    private static HoleWall Wall(double inclination, double azimuth, double support = 0) =>
        HoleWall.Of(Far, 31.5e6, 31.5e6 + support, 0.25, Rad(inclination), Rad(azimuth));

    [Theory]
    [InlineData(1, 0, 0, 1.5, 37.45, 0)]
    [InlineData(1, 90, 0, 155.5, 75.95, 0)]
    [InlineData(1, 0, 6, -4.5, 37.45, 6)]
    [InlineData(1, 90, 6, 149.5, 75.95, 6)]
    [InlineData(1.5, 0, 0, 26.037037, double.NaN, 18.240741)]
    [InlineData(1.5, 90, 0, 87.351852, double.NaN, 25.370370)]
    [InlineData(2, 0, 0, 26.203125, double.NaN, double.NaN)]
    [InlineData(2, 90, 0, 71.921875, double.NaN, double.NaN)]
    public void Around_a_vertical_hole(double distance, double angle, double support, double hoop, double axial, double radial)
    {
        var at = Kirsch.At(56.7e6, 58.5e6, 20e6, 0.25, support * Mega, Rad(angle), distance);
        Assert.Equal(hoop * Mega, at.Hoop, SixDigits);
        if (double.IsFinite(axial)) Assert.Equal(axial * Mega, at.Axial, SixDigits);
        if (double.IsFinite(radial)) Assert.Equal(radial * Mega, at.Radial, SixDigits);
    }

    [Fact]
    public void The_wall_of_a_vertical_hole_is_Kirschs_at_its_radius_and_far_away_the_stress_is_undisturbed()
    {
        var wall = Wall(0, 0, 4e6);
        foreach (var angle in Enumerable.Range(0, 24).Select(k => k * Math.PI / 12))
        {
            var (at, kirsch) = (wall.At(angle), Kirsch.At(56.7e6, 58.5e6, 20e6, 0.25, 4e6, angle, 1));
            Assert.Equal(kirsch.Hoop, at.Hoop, 1e-6); // the same sums in another order
            Assert.Equal(kirsch.Axial, at.Axial, 1e-6);
            Assert.Equal(kirsch.Radial, at.Radial, 1e-6);
            Assert.Equal(0, kirsch.Shear, 1e-6);
            Assert.Equal(0, at.Shear, 1e-6);
        }

        Assert.Equal(58.5e6, Kirsch.At(56.7e6, 58.5e6, 20e6, 0.25, 4e6, 0, 1e5).Radial, 1.0); // disturbed by 1e-10
    }

    // Self-computed table; theta from the high side.
    [Theory]
    [InlineData(0, 0, 1.5, 37.45, 0, 40, 47.075, 0, 155.5, 90, 1.5, 0)]
    [InlineData(30, 0, 1.95, 38.125, 0, 40, 47.6375, -.7794, 154.1812, 90, 1.95, 0)]
    [InlineData(45, 30, 36.0875, 41.2063, -23.5763, 100.0854, 57.2057, -16.5052, 148.5623, 66.97, -.4216, 157.70)]
    [InlineData(60, 90, 127.975, 34.6625, 0, 117, 31.9188, 15.8916, 127.975, 0, 10.0426, 90)]
    [InlineData(90, 0, 3.3, 40.15, 0, 40, 49.325, 0, 150.1, 90, 3.3, 0)]
    [InlineData(90, 90, 118.8, 20.9, 0, 117, 20.45, 0, 118.8, 0, 19.1, 90)]
    public void Around_a_hole_of_any_direction(
        double inclination, double azimuth, double hoop0, double axial0, double shear0, double hoop30, double axial30, double shear30,
        double greatest, double atGreatest, double least, double atLeast)
    {
        var wall = Wall(inclination, azimuth);
        var (at0, at30) = (wall.At(0), wall.At(Rad(30)));
        double[] expected = [hoop0, axial0, shear0, hoop30, axial30, shear30];
        double[] found = [at0.Hoop, at0.Axial, at0.Shear, at30.Hoop, at30.Axial, at30.Shear];
        for (var k = 0; k < expected.Length; k++) Assert.Equal(expected[k] * Mega, found[k], Printed);

        // Every hundredth of a degree.
        var angles = Enumerable.Range(0, 18000).Select(k => k / 100.0).ToArray();
        var (high, low) = (angles.MaxBy(a => wall.At(Rad(a)).GreaterInWall), angles.MinBy(a => wall.At(Rad(a)).LesserInWall));
        Assert.Equal(greatest * Mega, wall.At(Rad(high)).GreaterInWall, Printed);
        Assert.Equal(least * Mega, wall.At(Rad(low)).LesserInWall, Printed);
        Assert.Equal(atGreatest, high, 0.011); // printed in hundredths, looked for in hundredths
        Assert.Equal(atLeast, low, 0.011);
    }

    [Fact]
    public void Only_the_angle_between_hole_and_SHmax_counts()
    {
        var turned = HoleWall.Of(Far with { ShmaxAzimuth = Rad(100) }, 31.5e6, 31.5e6, 0.25, Rad(45), Rad(130));
        Assert.Equal(Wall(45, 30).At(1).Hoop, turned.At(1).Hoop, 1e-6); // rounding of angles
    }

    [Fact]
    public void Warming_presses_the_wall_and_cooling_relieves_it()
    {
        // Zhang 2019, eq. 1.44: 20 GPa, 1e-5 /K, 25 K, nu 0.2 give 6.25 MPa (self-computed).
        var warm = HoleWall.ThermalStress(20e9, 1e-5, 25, 0.2);
        Assert.Equal(6.25e6, warm, 1e-6);
        Assert.Equal(6.25e6, (Wall(0, 0) with { Thermal = warm }).At(0).Hoop - Wall(0, 0).At(0).Hoop, 1e-6);
        Assert.True(BreakdownPressure.NonPenetrating(35e6, 45e6, 20e6, 5e6, 0, -warm).Value < BreakdownPressure.NonPenetrating(35e6, 45e6, 20e6, 5e6, 0).Value);
    }

    [Fact]
    public void Principal_stresses_come_in_order_with_the_sum_of_the_components()
    {
        var stress = Wall(45, 30, 90e6).At(1);
        var (greatest, middle, least) = stress.Principal;
        Assert.True(greatest >= middle && middle >= least);
        Assert.Equal(stress.Hoop + stress.Axial + stress.Radial, greatest + middle + least, 1e-6); // the trace does not change
    }
}
