using DepthStress.Core.Quantities;
using static DepthStress.Tests.Catalogue.Laws;

namespace DepthStress.Tests.Catalogue;

public class StrengthReferenceTests
{
    // Zoback 2007 p. 118, Gulf of Mexico shale: printed mean strengths 1484 psi (Horsrud's form) and 1053 psi (the Gulf form). The
    // first gives a velocity of 2.41788 km/s (self-computed), and the second must follow from it; the means are over samples, so
    // the printed pair agrees to about 2 psi.
    [Fact]
    public void The_printed_strengths_of_the_Gulf_shale_agree_with_each_other()
    {
        Assert.Equal(1484, Units.Psi.FromSi(Apply("horsrud-2001-shale", 2417.88)), 0.5);
        Assert.Equal(1053, Units.Psi.FromSi(Apply("gulf-pliocene-shale-slowness", 1 / 2417.88)), 2.0);
    }

    // Zoback 2007 p. 118: porosity form 1878 psi, porosity from density with matrix 2.65 and fluid 1.1 g/cm3. The porosity that
    // gives it is 0.2121 and the density 2.321 (self-computed): a density a wet shale has. Tolerance: the last digit of these.
    [Fact]
    public void The_printed_porosity_strength_of_the_Gulf_shale_means_a_credible_density()
    {
        Assert.Equal(1878, Units.Psi.FromSi(Apply("horsrud-2001-shale-porosity", 0.2121)), 1.0);
        Assert.Equal(0.2121, Apply("density-porosity", 2321, 2650, 1100), 3e-4);
    }

    // Zoback 2007 pp. 116 and 118: friction coefficients of the gamma-ray law from 0.7 to 0.84. The gamma rays, 84.0 and 71.9 API,
    // are self-computed to that digit: 0.1 API moves the coefficient by 0.0013.
    [Theory]
    [InlineData(84.0, 0.70)]
    [InlineData(71.9, 0.84)]
    public void The_gamma_ray_friction_law_meets_the_printed_range(double gammaRay, double friction) =>
        Assert.Equal(friction, Math.Tan(Apply("shaly-rock-gamma-ray-friction", gammaRay)), 1.3e-3);

    // Zhang 2019 pp. 101-102 prints the laws with g/cm3 and km/s: 1.745 rho Vp^2 - 21 and 42.1 exp(1.9e-2 rho Vp^2). The catalogue
    // has kg/m3 and m/s. Tolerance: rounding.
    [Fact]
    public void Laws_on_density_and_velocity_agree_in_both_printed_units()
    {
        Assert.Equal((1.745 * 2.5 * 16) - 21, Apply("moos-1999-sandstone", 2500, 4000) / 1e6, 1e-9);
        Assert.Equal(42.1 * Math.Exp(1.9e-2 * 2.5 * 20.25), Apply("australia-sandstone-modulus", 2500, 4500) / 1e6, 1e-9);
        Assert.Equal(3.87 * Math.Exp(0.114 * 2.3 * 9), Apply("gulf-of-mexico-sandstone-modulus", 2300, 3000) / 1e6, 1e-9);
    }

    // The percent twins of the shale laws, 193.4 and 243.6 (from memory), agree with the fraction forms to 0.03 and 0.3 percent:
    // 30.728 and 13.731 against 30.726 and 13.699 MPa (self-computed; half the last digit).
    [Fact]
    public void Porosity_in_percent_and_as_a_fraction_give_the_same_strength()
    {
        Assert.Equal(30.728, 193.4 * Math.Pow(5, -1.143), 5e-4);
        Assert.Equal(30.728, Apply("lashkaripour-1993-shale", 0.05) / 1e6, 0.01);
        Assert.Equal(13.731, 243.6 * Math.Pow(20, -0.96), 5e-4);
        Assert.Equal(13.731, Apply("horsrud-2001-shale-porosity", 0.20) / 1e6, 0.05);
        Assert.Equal(86.586, Apply("haynesville-shale-porosity", 0.06) / 1e6, 5e-4);
    }

    // Oyler, Mark and Molinda 2008 print both laws in psi; 12340.0 psi is 85.081 MPa and 10681.0 psi 73.643 MPa at 70 us/ft
    // (self-computed; half the last digit). McNally's law for fine sandstone is another one.
    [Fact]
    public void Coal_measure_laws_are_in_psi()
    {
        var at70 = Units.MicrosecondPerFoot.ToSi(70);
        Assert.Equal(85.081, Apply("mcnally-1987-coal-measures", at70) / 1e6, 5e-4);
        Assert.Equal(73.643, Apply("oyler-2008-coal-measures", at70) / 1e6, 5e-4);
        Assert.Equal(96.552, Apply("mcnally-1987-sandstone", at70) / 1e6, 5e-4);
    }

    // The 145 of the carbonate laws is psi in a MPa, 145.0377 to full digits: with it both are MPa. Their ratio at 60 us/ft, 2.65,
    // is self-computed (half the last digit).
    [Fact]
    public void Carbonate_laws_from_slowness_are_in_MPa_and_differ()
    {
        var (low, high) = (InUnits("militzer-stoll-1973-carbonate", 60), InUnits("golubev-rabinovich-1976-carbonate", 60));
        Assert.Equal(Math.Pow(7682.0 / 60, 1.82) / 145.0377, low, 0.02);
        Assert.Equal(2.65, high / low, 5e-3);
    }

    // Zeros and turning points, self-computed: beyond them the formulas turn up again or pass zero.
    [Theory]
    [InlineData("vernik-1993-sandstone", 0.3703, 0.3705)]
    [InlineData("rzhevsky-novik-1971-carbonate", 0.3333, 0.3334)]
    [InlineData("weingarten-perkins-1995-sandstone", 0.5504, 0.5505)]
    [InlineData("freyburg-1972-sandstone", 900.1, 899.9)]
    [InlineData("lal-1999-shale", 304.7, 304.9)]
    [InlineData("shaly-rock-gamma-ray-friction", 167.8, 167.9)]
    public void A_formula_stops_where_it_loses_its_meaning(string id, double inside, double outside)
    {
        Assert.InRange(InUnits(id, inside), 0, 0.1);
        Assert.True(double.IsNaN(InUnits(id, outside)));
    }

    // 12.03 GPa is the modulus where Moos's law passes zero (self-computed).
    [Fact]
    public void Moos_law_stops_at_its_least_modulus()
    {
        Assert.True(double.IsNaN(Apply("moos-1999-sandstone", 2000, Math.Sqrt(12.03e9 / 2000))));
        Assert.InRange(Apply("moos-1999-sandstone", 2000, Math.Sqrt(12.04e9 / 2000)), 0, 0.1e6);
    }

    // Plumb: 51.2 deg at s = 1, least value 20.87 deg at s = 0.301 (self-computed; half the last digit).
    [Fact]
    public void Plumbs_curve_stops_at_its_least_value()
    {
        Assert.Equal(51.2, InUnits("plumb-1994-clastic", 0, 0), 0.05);
        Assert.Equal(20.87, InUnits("plumb-1994-clastic", 0.3, 0.3988), 5e-3);
        Assert.True(double.IsNaN(InUnits("plumb-1994-clastic", 0.3, 0.3990)));
    }

    // Griffith's criterion (s1 - s3)^2 = 8 T0 (s1 + s3) at s3 = 0: an identity. Tolerance: rounding.
    [Fact]
    public void Griffiths_strength_meets_his_criterion()
    {
        var (strength, tensile) = (60e6, Apply("griffith-tensile", 60e6));
        Assert.Equal(strength * strength, 8 * tensile * strength, 1e-9 * strength * strength);
    }

    // Weingarten and Perkins, Lal at 3048 m/s: friction coefficients, self-computed; half the last digit.
    [Fact]
    public void Friction_angles_are_angles_in_SI()
    {
        Assert.Equal(0.58653, Math.Tan(Apply("lal-1999-shale-friction", 3048)), 5e-6);
        Assert.Equal(0.63633, Math.Tan(Apply("shaly-rock-gamma-ray-friction", 90)), 5e-6);
    }
}
