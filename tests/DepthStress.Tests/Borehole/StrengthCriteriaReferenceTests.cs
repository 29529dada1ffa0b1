using DepthStress.Core.Borehole;
using DepthStress.Core.Prediction;

namespace DepthStress.Tests.Borehole;

/// <summary>Strength criteria: a self-computed table, properties that must hold, and a published laboratory fit.</summary>
public sealed class StrengthCriteriaReferenceTests
{
    private const double Ucs = 60e6;

    private static readonly double Angle = Math.Atan(0.6), Cohesion = StrengthCriteria.Cohesion(Ucs, Angle);

    private static readonly FailureFunction[] Criteria =
    [
        StrengthCriteria.MohrCoulomb(Ucs, Angle), StrengthCriteria.MogiCoulomb(Cohesion, Angle), StrengthCriteria.ModifiedLade(Cohesion, Angle),
        StrengthCriteria.DruckerPragerTangent(Cohesion, Angle), StrengthCriteria.DruckerPragerOuter(Cohesion, Angle), StrengthCriteria.DruckerPragerExtension(Cohesion, Angle),
    ];

    [Theory]
    [InlineData(0, 0, 60.0, 60.0, 60.0, 33.811, 60.0, 35.160)]
    [InlineData(10, 10, 91.194, 91.194, 91.194, 55.754, 91.194, 57.580)]
    [InlineData(50, 10, 91.194, 118.991, 126.270, 85.837, 144.863, 89.128)]
    [InlineData(30, 30, 153.583, 153.583, 153.583, 99.640, 153.583, 102.420)]
    [InlineData(80, 30, 153.583, 191.244, 202.122, 139.961, 222.153, 144.426)]
    public void Greatest_stress_at_failure(double middle, double least, params double[] expected)
    {
        Assert.Equal(16.985711e6, Cohesion, 0.51); // six decimals
        for (var k = 0; k < expected.Length; k++)
            Assert.Equal(expected[k] * 1e6, StrengthCriteria.GreatestAtFailure(Criteria[k], middle * 1e6, least * 1e6).Value, 510.0); // three decimals
    }

    [Theory]
    [InlineData(0, 60)]
    [InlineData(10, 107.979590)]
    [InlineData(30, 176.969385)]
    public void Hoek_Brown(double least, double expected) => Assert.Equal(
        expected * 1e6, StrengthCriteria.GreatestAtFailure(StrengthCriteria.HoekBrown(60e6, 10, 1), least * 1e6, least * 1e6).Value, 0.51); // six decimals

    [Theory]
    [InlineData(1, false)]
    [InlineData(2, true)]
    [InlineData(3, false)]
    [InlineData(5, false)]
    public void Where_two_stresses_break_the_rock_there_is_no_third(int criterion, bool known)
    {
        var answer = StrengthCriteria.GreatestAtFailure(Criteria[criterion], 100e6, 10e6);
        Assert.Equal(known, answer.IsKnown);
        if (!known) Assert.Equal("the middle and the least stress alone break the rock", answer.Reason);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(10)]
    [InlineData(45)]
    public void In_extension_Mohr_Mogi_and_the_inner_cone_agree_and_Lade_is_stronger(double least)
    {
        var s3 = least * 1e6;
        var s1 = Ucs + (VerticalHole.FrictionFactor(Angle) * s3);
        Assert.Equal(0, Criteria[1](s1, s1, s3), 1.0); // sums of 1e8 Pa
        Assert.Equal(0, Criteria[5](s1, s1, s3), 1.0);
        Assert.True(Criteria[2](s1, s1, s3) < -1e6);
    }

    // Vertical hole, wall across SHmax. Case A: hoop > axial > radial; case B: axial > hoop > radial.
    [Theory]
    [InlineData(60, 55, 40, 25, 35, 34.710085, 30.541081, 29.617568)]
    [InlineData(66, 36, 34, 24, 28, 28.808573, 25.176906, 24.478982)]
    public void Pressures_at_which_a_wall_fails(double sv, double shmax, double shmin, double pore, double ucs, params double[] expected)
    {
        var cohesion = StrengthCriteria.Cohesion(ucs * 1e6, Angle);
        FailureFunction[] criteria = [StrengthCriteria.MohrCoulomb(ucs * 1e6, Angle), StrengthCriteria.MogiCoulomb(cohesion, Angle), StrengthCriteria.ModifiedLade(cohesion, Angle)];
        var far = new FarField(sv * 1e6, shmax * 1e6, shmin * 1e6, 0);
        for (var k = 0; k < criteria.Length; k++)
        {
            var (low, high) = (pore * 1e6, 40e6);
            Assert.True(At(low) > 0 && At(high) < 0);
            while (high - low > 0.01)
            {
                if (At((low + high) / 2) > 0) low = (low + high) / 2;
                else high = (low + high) / 2;
            }

            Assert.Equal(expected[k] * 1e6, low, 0.52); // six decimals and the width of the last step

            double At(double pressure)
            {
                var (s1, s2, s3) = HoleWall.Of(far, pore * 1e6, pressure, 0.25, 0, 0).At(Math.PI / 2).Principal;
                return criteria[k](s1, s2, s3);
            }
        }
    }

    // Berea sandstone, Bernabe and Brace 1990: confining pressure, pore pressure, S1 - S3, MPa. The fit is self-computed elsewhere.
    [Fact]
    public void Berea_sandstone()
    {
        double[][] tests =
        [
            [10, 0, 116], [50, 0, 227], [20, 8, 119], [45, 8, 183], [60, 8, 206], [75, 8, 228],
            [50, 37, 120], [50, 32, 141], [90, 64, 161], [90, 55, 187], [130, 96, 186], [130, 84, 207],
        ];
        var line = LinearRegression.Fit([[.. tests.Select(t => t[0] - t[1])]], [.. tests.Select(t => t[2] + t[0] - t[1])])!;
        Assert.Equal(100.08089043605715, line.Intercept, 1e-9); // 12 digits
        Assert.Equal(3.2000732869, line.Slopes[0], 1e-9);
        var friction = (line.Slopes[0] - 1) / (2 * Math.Sqrt(line.Slopes[0]));
        Assert.Equal(0.6149321365314584, friction, 1e-9);
        Assert.Equal(line.Slopes[0], VerticalHole.FrictionFactor(Math.Atan(friction)), 1e-9);
    }
}
