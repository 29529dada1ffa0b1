using DepthStress.Core.Borehole;

namespace DepthStress.Tests.Borehole;

/// <summary>Breakdown pressures: self-computed from Hubbert and Willis 1957 and Haimson and Fairhurst 1967.</summary>
public sealed class BreakdownReferenceTests
{
    private const double SixDigits = 0.51; // MPa are given with six decimals

    [Theory]
    [InlineData(35, 45, 20, 5, 45.0, 37.045455, 32.5)]
    [InlineData(51.5, 90, 31.5, 3, 36.0, 34.568182, 33.75)]
    public void Of_a_vertical_hole(double shmin, double shmax, double pore, double tensile, double dry, double wet, double wettest)
    {
        var (h, H, p, t) = (shmin * 1e6, shmax * 1e6, pore * 1e6, tensile * 1e6);
        var eta = BreakdownPressure.Eta(0.8, 0.25);
        Assert.Equal(0.266667, eta, 5.1e-7); // printed in six decimals
        Assert.Equal(dry * 1e6, BreakdownPressure.NonPenetrating(h, H, p, t, 0).Value, SixDigits);
        Assert.Equal(wet * 1e6, BreakdownPressure.Penetrating(h, H, p, t, eta, 0).Value, SixDigits);
        Assert.Equal(wettest * 1e6, BreakdownPressure.Penetrating(h, H, p, t, 0, 0).Value, SixDigits);
        // With eta at its greatest the fluid that enters changes nothing.
        Assert.Equal(dry * 1e6, BreakdownPressure.Penetrating(h, H, p, t, 0.5, 0).Value, SixDigits);
        Assert.Equal(dry * 1e6, BreakdownPressure.AnyDirection(new(88e6, H, h, 1), p, 0.25, t, 0, 2).Value, 1.0); // the angle is found to 1e-8 rad
    }

    [Theory]
    [InlineData(30, 0)]
    [InlineData(45, 30)]
    [InlineData(60, 90)]
    [InlineData(90, 45)]
    public void Of_any_hole_leaves_one_point_of_the_wall_at_its_tensile_strength(double inclination, double azimuth)
    {
        var far = new FarField(88.2e6, 90e6, 51.5e6, 0);
        var (i, a) = (inclination * Math.PI / 180, azimuth * Math.PI / 180);
        var pressure = BreakdownPressure.AnyDirection(far, 31.5e6, 0.25, 3e6, i, a);
        Assert.True(pressure.IsKnown);
        var wall = HoleWall.Of(far, 31.5e6, pressure.Value, 0.25, i, a);
        var least = Enumerable.Range(0, 36000).Min(k => wall.At(k * Math.PI / 36000).LesserInWall);
        Assert.Equal(-3e6, least, 100.0); // the stress within half of 0.005 deg of its least value
    }

    [Fact]
    public void A_hole_that_leans_is_refused_by_the_vertical_formulas()
    {
        var refused = BreakdownPressure.NonPenetrating(35e6, 45e6, 20e6, 5e6, 16 * Math.PI / 180);
        Assert.Equal((false, "the hole leans by more than 15 deg: formulas for a vertical hole do not hold"), (refused.IsKnown, refused.Reason));
        Assert.Equal(double.NaN, refused.Value);
        Assert.True(BreakdownPressure.NonPenetrating(35e6, 45e6, 20e6, 5e6, 14.9 * Math.PI / 180).IsKnown);
        Assert.False(VerticalHole.BreakoutWidth(40e6, 55e6, 25e6, 30e6, 35e6, 0.5, 0.3).IsKnown);
        Assert.Equal("an input is missing", BreakdownPressure.NonPenetrating(double.NaN, 45e6, 20e6, 5e6, 0).Reason);
    }

    [Fact]
    public void A_wall_in_tension_along_the_hole_is_open_already()
    {
        // Effective axial stress about -10 MPa all round: no pressure in the hole closes it.
        var open = BreakdownPressure.AnyDirection(new(20e6, 40e6, 40e6, 0), 30e6, 0.25, 3e6, 0, 0);
        Assert.Equal("the wall is open across the hole at any pressure", open.Reason);
    }
}
