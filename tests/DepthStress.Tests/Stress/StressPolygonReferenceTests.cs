using DepthStress.Core.Stress;

namespace DepthStress.Tests.Stress;

public class StressPolygonReferenceTests
{
    // Inputs of the first row: Zhang 2019 p. 168 fig. 5.3 (4316 m); of the third: Zoback 2007 p. 170; the second invented. Results
    // self-computed; half the last digit.
    [Theory]
    [InlineData(82.5, 69.7, 73.8033, 109.6287)]
    [InlineData(69.0, 30.0, 42.5023, 151.6577)]
    [InlineData(88.2, 31.5, 49.6764, 208.3716)]
    public void The_corners_lie_at_the_worked_values(double sv, double pp, double lowest, double highest)
    {
        var corners = new StressPolygon(sv, pp, 0.6).Corners;
        (double Shmin, double Shmax)[] expected = [(lowest, lowest), (lowest, sv), (sv, highest), (highest, highest)];
        Assert.Equal(expected.Length, corners.Count);
        foreach (var (corner, (shmin, shmax)) in corners.Zip(expected))
        {
            Assert.Equal(shmin, corner.Shmin, 5e-5);
            Assert.Equal(shmax, corner.Shmax, 5e-5);
        }
    }

    // The strike-slip edge is straight between its corners: (SHmax - Pp)/(Shmin - Pp) = q on both. Tolerance: rounding.
    [Fact]
    public void The_strike_slip_edge_has_one_ratio_of_effective_stresses()
    {
        var polygon = new StressPolygon(69, 30, 0.6);
        foreach (var corner in polygon.Corners.Skip(1).Take(2))
            Assert.Equal(FrictionalLimit.Ratio(0.6), (corner.Shmax - 30) / (corner.Shmin - 30), 1e-12);
    }

    // 88.2, 90 and 51.5 MPa at a pore pressure of 31.5 MPa lie inside, near the strike-slip edge at 93.8886 MPa (self-computed).
    [Theory]
    [InlineData(51.5, 90, true)]
    [InlineData(51.5, 93.88, true)]
    [InlineData(51.5, 93.89, false)]
    [InlineData(49.67, 60, false)]
    [InlineData(60, 59.9, false)]
    [InlineData(100, 208.3, true)]
    [InlineData(100, 208.4, false)]
    [InlineData(double.NaN, 90, false)]
    [InlineData(51.5, double.NaN, false)]
    public void A_state_is_inside_or_not(double shmin, double shmax, bool inside) =>
        Assert.Equal(inside, new StressPolygon(88.2, 31.5, 0.6).Contains(shmin, shmax));

    [Theory]
    [InlineData(60, 60, 0.6, false)]
    [InlineData(60, double.NaN, 0.6, false)]
    [InlineData(60, 30, 0, false)]
    [InlineData(60, 30, 0.6, true)]
    public void Without_effective_stress_or_friction_there_is_no_polygon(double sv, double pp, double friction, bool exists) =>
        Assert.Equal(exists, new StressPolygon(sv, pp, friction).Exists);
}
