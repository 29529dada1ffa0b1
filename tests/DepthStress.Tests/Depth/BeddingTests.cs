using CsCheck;
using DepthStress.Core.Depth;

namespace DepthStress.Tests.Depth;

public class BeddingTests
{
    private const double Degree = Math.PI / 180;
    private const double Rounding = 1e-12;

    private static readonly Gen<double> Turn = Gen.Double[0, Math.Tau];

    // Computed by hand from the geometry; degrees.
    [Theory]
    [InlineData(35, 120, 0, 0, 35)] // flat beds: the inclination
    [InlineData(90, 120, 0, 77, 90)]
    [InlineData(120, 40, 0, 0, 60)] // climbing through flat beds: as steep as going down
    [InlineData(0, 0, 12, 230, 12)] // vertical hole: the dip
    [InlineData(12, 50, 12, 230, 0)] // across: the hole leans against the dip
    [InlineData(12, 230, 12, 230, 24)] // down the dip: both add up
    [InlineData(78, 230, 12, 230, 90)] // along the beds, straight down the dip
    [InlineData(90, 140, 12, 230, 90)] // along the strike
    [InlineData(90, 90, 90, 90, 0)] // level hole through upright beds
    [InlineData(60, 0, 60, 90, 75.52248781407008)] // arc cosine of cos 60 cos 60 = 1/4
    public void The_angle_is_that_of_the_geometry(double inclination, double azimuth, double dip, double dipAzimuth, double expected) =>
        Assert.Equal(expected, new Bedding(dip * Degree, dipAzimuth * Degree).Angle(inclination * Degree, azimuth * Degree) / Degree, 1e-6); // rounding where the angle nears 0

    [Fact]
    public void Turning_hole_and_beds_together_changes_nothing() =>
        Gen.Select(Gen.Double[0, Math.PI], Turn, Gen.Double[0, Math.PI / 2], Turn, Turn).Sample((inclination, azimuth, dip, dipAzimuth, turn) =>
            Assert.Equal(
                new Bedding(dip, dipAzimuth).Angle(inclination, azimuth),
                new Bedding(dip, dipAzimuth + turn).Angle(inclination, azimuth + turn), Rounding));

    [Fact]
    public void The_angle_agrees_with_the_product_of_direction_and_normal() =>
        Gen.Select(Gen.Double[0, Math.PI], Turn, Gen.Double[0, Math.PI / 2], Turn).Sample((inclination, azimuth, dip, dipAzimuth) =>
        {
            var product = (Math.Cos(inclination) * Math.Cos(dip)) - (Math.Sin(inclination) * Math.Sin(dip) * Math.Cos(azimuth - dipAzimuth));
            Assert.Equal(Math.Abs(product), Math.Cos(new Bedding(dip, dipAzimuth).Angle(inclination, azimuth)), Rounding);
        });

    [Fact]
    public void Filling_gives_the_single_angles_and_missing_stays_missing()
    {
        var bedding = new Bedding(0.2, 1);
        double[] angle = new double[3];
        bedding.Fill([0.1, double.NaN, 1.2], [3, 1, 2], angle);
        Assert.Equal([bedding.Angle(0.1, 3), double.NaN, bedding.Angle(1.2, 2)], angle);
        Assert.Throws<ArgumentException>("azimuth", () => bedding.Fill([1], [], new double[1]));
        Assert.Throws<ArgumentException>("angle", () => bedding.Fill([1], [1], []));
    }
}
