using DepthStress.Core.Stress;

namespace DepthStress.Tests.Stress;

public class FrictionalLimitReferenceTests
{
    // Jaeger and Cook, in Zoback 2007, Reservoir Geomechanics, which prints 3.1 for 0.6. Longer values self-computed; half the last digit.
    [Theory]
    [InlineData(0.6, 3.119428)]
    [InlineData(0.85, 4.676149)]
    [InlineData(1.0, 5.828427)]
    [InlineData(0.0, 1.0)]
    public void The_ratio_of_effective_stresses_follows_from_friction(double friction, double expected) =>
        Assert.Equal(expected, FrictionalLimit.Ratio(friction), 5e-7);

    [Fact]
    public void The_ratio_meets_the_printed_value() => Assert.Equal(3.1, FrictionalLimit.Ratio(0.6), 0.05);

    // Inputs of the first row: Zhang 2019 p. 168 fig. 5.3 (4316 m); the others invented. Results self-computed; half the last digit.
    [Theory]
    [InlineData(82.5, 69.7, 73.8033, 109.6287)]
    [InlineData(69.0, 30.0, 42.5023, 151.6577)]
    [InlineData(88.2, 31.5, 49.6764, 208.3716)]
    public void The_polygon_ends_at_the_worked_values(double sv, double pp, double lowest, double highest)
    {
        Assert.Equal(lowest, FrictionalLimit.LowestShmin(sv, pp, 0.6), 5e-5);
        Assert.Equal(highest, FrictionalLimit.HighestShmax(sv, sv, pp, 0.6), 5e-5);
        Assert.Equal(highest, FrictionalLimit.HighestShmax(sv, sv + 10, pp, 0.6), 5e-5); // Sv is the least stress then
    }

    // Strike-slip limit of the third row at Shmin 51.5 MPa, self-computed; an SHmax of 90 MPa is inside.
    [Fact]
    public void The_strike_slip_limit_follows_from_Shmin()
    {
        Assert.Equal(93.8886, FrictionalLimit.HighestShmax(88.2, 51.5, 31.5, 0.6), 5e-5);
        Assert.True(FrictionalLimit.HighestShmax(88.2, 51.5, 31.5, 0.6) > 90);
    }

    [Fact]
    public void A_missing_stress_gives_no_limit()
    {
        Assert.True(double.IsNaN(FrictionalLimit.HighestShmax(88, double.NaN, 31, 0.6)));
        Assert.True(double.IsNaN(FrictionalLimit.HighestShmax(double.NaN, 50, 31, 0.6)));
        Assert.True(double.IsNaN(FrictionalLimit.LowestShmin(88, double.NaN, 0.6)));
    }
}
