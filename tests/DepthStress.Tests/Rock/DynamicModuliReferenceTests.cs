using CsCheck;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;

namespace DepthStress.Tests.Rock;

public class DynamicModuliReferenceTests
{
    // Mavko, Mukerji and Dvorkin 2009, The Rock Physics Handbook, 2nd ed., Appendix A.4: K and G in GPa, density in g/cm3, Vp and Vs
    // in km/s, Poisson's ratio. From memory to the last digit; quartz, feldspar, plagioclase, calcite, dolomite, siderite and pyrite
    // round to the list read in a public note on Gassmann's equation. Some rows are rounded, so 1 % on velocities.
    public static TheoryData<string, double, double, double, double, double, double> Minerals => new()
    {
        { "quartz (row a)", 37.0, 44.0, 2.65, 6.05, 4.09, 0.08 },
        { "quartz (row b)", 36.6, 45.0, 2.65, 6.04, 4.12, 0.06 },
        { "quartz with clay (Han)", 39.0, 33.0, 2.65, 5.59, 3.52, 0.17 },
        { "feldspar, average", 37.5, 15.0, 2.62, 4.68, 2.39, 0.32 },
        { "plagioclase (albite)", 75.6, 25.6, 2.63, 6.46, 3.12, 0.35 },
        { "calcite", 76.8, 32.0, 2.71, 6.64, 3.44, 0.32 },
        { "dolomite", 94.9, 45.0, 2.87, 7.34, 3.96, 0.30 },
        { "anhydrite (the row that prints K 56.1)", 56.1, 29.1, 2.98, 5.64, 3.13, 0.28 },
        { "siderite", 123.7, 51.0, 3.96, 6.96, 3.59, 0.32 },
        { "pyrite", 147.4, 132.5, 4.93, 8.10, 5.18, 0.15 },
        { "Gulf clays (Han)", 25.0, 9.0, 2.55, 3.81, 1.88, 0.34 },
        { "Gulf clays (Tosaya)", 21.0, 7.0, 2.60, 3.41, 1.64, 0.35 },
        { "kerogen", 2.9, 2.7, 1.30, 2.25, 1.45, 0.14 },
    };

    // Rows of the same table whose velocities do not follow from their own K, G and density within 1 %.
    public static TheoryData<string, double, double, double, double, double> Inconsistent => new()
    {
        { "halite (about 1 % off)", 24.8, 14.9, 2.16, 4.50, 2.59 },
        { "hematite (printed Vs does not match its own G)", 100.2, 95.2, 5.24, 6.58, 4.51 },
        { "kaolinite (K and G of two digits)", 1.5, 1.4, 1.58, 1.44, 0.93 },
    };

    [Theory]
    [MemberData(nameof(Minerals))]
    public void Minerals_agree_with_the_handbook_both_ways(string mineral, double k, double g, double rho, double vp, double vs, double nu)
    {
        // From K and G: the velocities that have those constants, against the printed ones, and back through the kernel.
        var (p, s) = Velocities(k, g, rho);
        Assert.True(Math.Abs((p / vp) - 1) <= 0.01, $"{mineral}: Vp");
        Assert.True(Math.Abs((s / vs) - 1) <= 0.01, $"{mineral}: Vs");
        var (youngs, poisson) = (DynamicModuli.Youngs(p, s, rho), DynamicModuli.Poisson(p, s));
        Assert.Equal(9 * k * g / ((3 * k) + g), youngs, 1e-10 * youngs); // identity; rounding
        Assert.Equal(k, ElasticConstants.Bulk(youngs, poisson), 1e-10 * k);
        Assert.Equal(g, ElasticConstants.Shear(youngs, poisson), 1e-10 * g);
        Assert.Equal(nu, poisson, 0.0105); // printed to 0.01, and 0.7 % of velocity moves it by half of that

        // From the printed velocities: 1 % of velocity is 2 % of G.
        Assert.Equal(g, DynamicModuli.Shear(vs, rho), 0.02 * g);
        Assert.Equal(nu, DynamicModuli.Poisson(vp, vs), 0.0105);
    }

    [Theory]
    [MemberData(nameof(Inconsistent))]
    public void Rows_named_as_inconsistent_really_are(string mineral, double k, double g, double rho, double vp, double vs)
    {
        var (p, s) = Velocities(k, g, rho);
        Assert.True(Math.Max(Math.Abs((p / vp) - 1), Math.Abs((s / vs) - 1)) > 0.01, mineral);
    }

    // Self-computed row; tolerance: half the last digit.
    [Fact]
    public void A_worked_row_comes_out_in_SI_and_in_oilfield_units()
    {
        var (youngs, poisson) = (new double[1], new double[1]);
        DynamicModuli.Fill([4000], [2400], [2500], youngs, poisson);
        Assert.Equal(35.1000e9, youngs[0], 5e4);
        Assert.Equal(0.218750, poisson[0], 1e-12);
        Assert.Equal(14.4e9, ElasticConstants.Shear(youngs[0], poisson[0]), 1);
        Assert.Equal(20.8e9, ElasticConstants.Bulk(youngs[0], poisson[0]), 1);
        Assert.Equal(11.2e9, ElasticConstants.Lambda(youngs[0], poisson[0]), 1);
        Assert.Equal(5.090825, Units.Mpsi.FromSi(youngs[0]), 5e-7);
    }

    // r = sqrt(2), 1.5, 2, infinity: values printed in a public note on Poisson's ratio, and identities. Rounding only.
    [Theory]
    [InlineData(1.4142135623730951, 0)]
    [InlineData(1.5, 0.1)]
    [InlineData(2, 1.0 / 3)]
    [InlineData(double.PositiveInfinity, 0.5)]
    public void Poissons_ratio_follows_the_velocity_ratio(double ratio, double expected) =>
        Assert.Equal(expected, DynamicModuli.Poisson(3000, 3000 / ratio), 1e-14);

    // Zhang 2019 p. 66 eq. 2.61 prints 1.35e4; the exact constant 1.34745e4 is self-computed to six digits, hence 5e-6.
    [Theory]
    [InlineData(76.2, 127.0, 2.5)]
    [InlineData(95.0, 170.0, 2.35)]
    public void The_oilfield_slowness_form_gives_the_same_modulus(double dtc, double dts, double rho)
    {
        var (vp, vs) = (1 / Units.MicrosecondPerFoot.ToSi(dtc), 1 / Units.MicrosecondPerFoot.ToSi(dts));
        var nu = DynamicModuli.Poisson(vp, vs);
        var expected = 1.34745e4 * rho * (1 + nu) * (1 - (2 * nu)) / (dtc * dtc * (1 - nu));
        Assert.Equal(expected, Units.Mpsi.FromSi(DynamicModuli.Youngs(vp, vs, 1000 * rho)), 5e-6 * expected);
    }

    // Identity; the condition of the subtraction near the smallest ratio asks for 1e-9.
    [Fact]
    public void Youngs_modulus_equals_its_other_form() =>
        Gen.Select(Gen.Double[1500, 7000], Gen.Double[1.2, 4], Gen.Double[1500, 3000]).Sample((vp, ratio, rho) =>
        {
            var vs = vp / ratio;
            var expected = rho * vs * vs * ((3 * vp * vp) - (4 * vs * vs)) / ((vp * vp) - (vs * vs));
            return Math.Abs(DynamicModuli.Youngs(vp, vs, rho) - expected) <= 1e-9 * expected;
        });

    [Fact]
    public void A_missing_input_gives_missing_results()
    {
        var (youngs, poisson) = (new double[3], new double[3]);
        DynamicModuli.Fill([double.NaN, 4000, 4000], [2400, double.NaN, 2400], [2500, 2500, double.NaN], youngs, poisson);
        Assert.All(youngs, e => Assert.True(double.IsNaN(e)));
        Assert.Equal([true, true, false], poisson.Select(double.IsNaN)); // the ratio needs no density
        Assert.Throws<ArgumentException>(() => DynamicModuli.Fill([1], [1], [1, 2], youngs, poisson));
    }

    private static (double Vp, double Vs) Velocities(double k, double g, double rho) =>
        (Math.Sqrt((k + (4 * g / 3)) / rho), Math.Sqrt(g / rho));
}
