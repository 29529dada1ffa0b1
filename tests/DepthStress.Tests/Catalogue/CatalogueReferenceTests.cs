using CsCheck;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Tests.Catalogue;

public class CatalogueReferenceTests
{
    private static double Apply(string id, params double[] si) => Apply(MethodCatalogue.Find(id)!, si);

    private static double Apply(Law law, params double[] si)
    {
        var inputs = default(LawInputs);
        for (var k = 0; k < si.Length; k++) inputs.Add(si.AsSpan(k, 1));
        var result = new double[1];
        LawKernel.Apply(law, inputs, result);
        return result[0];
    }

    // Coefficients: Lacy 1997, SPE 38716, read in Zhang 2019 p. 67 eqs 2.64-2.66, moduli in Mpsi. Values self-computed at 30 GPa
    // = 4.351132 Mpsi; tolerance: half the last digit.
    [Theory]
    [InlineData("lacy-1997-sandstone", 17.4236, 39.97)]
    [InlineData("lacy-1997-shale", 12.5889, 45.52)]
    [InlineData("lacy-1997-combined", 15.0096, 28.86)]
    public void Lacy_takes_moduli_in_Mpsi_and_not_in_GPa(string id, double expected, double misused)
    {
        var law = MethodCatalogue.Find(id)!;
        Assert.Equal(expected, Apply(law, 30e9) / 1e9, 5e-5);
        Assert.Equal(misused, law.Evaluate(30), 5e-3);
        Assert.True(Apply(law, 30e9) < 30e9);
    }

    // Self-computed crossings of Lacy's curves with the dynamic modulus, Mpsi: (1 - b) / a. Tolerance: half the last digit.
    [Theory]
    [InlineData("lacy-1997-sandstone", 18.659)]
    [InlineData("lacy-1997-shale", 17.911)]
    [InlineData("lacy-1997-combined", 32.111)]
    public void Lacy_reaches_the_dynamic_modulus_only_in_very_stiff_rock(string id, double mpsi) =>
        Assert.Equal(mpsi, MethodCatalogue.Find(id)!.Evaluate(mpsi), 5e-3);

    // Lal 1999: cohesion 5 (Vp - 1)/sqrt(Vp) MPa and sin(angle) = (Vp - 1)/(Vp + 1) give UCS = 10 (Vp - 1), an identity.
    // Tolerance: rounding of a few operations.
    [Fact]
    public void Lals_friction_and_cohesion_give_Lals_strength() => Gen.Double[1001, 8000].Sample(vp =>
    {
        var (velocity, angle) = (vp / 1000, Apply("lal-1999-shale-friction", vp));
        var cohesion = 5 * (velocity - 1) / Math.Sqrt(velocity);
        var strength = 2 * cohesion * Math.Cos(angle) / (1 - Math.Sin(angle));
        Assert.Equal(strength, Apply("lal-1999-shale", 1 / vp) / 1e6, 1e-9 * Math.Max(1, strength));
    });

    [Fact]
    public void Lals_strength_and_friction_end_at_one_kilometre_per_second()
    {
        Assert.Equal(0, Apply("lal-1999-shale-friction", 1000), 1e-12); // exact but for rounding
        Assert.True(double.IsNaN(Apply("lal-1999-shale-friction", 999)));
        Assert.True(double.IsNaN(Apply("lal-1999-shale", 1.0 / 999)));
    }

    // Zoback 2007 p. 118, Gulf of Mexico shale: printed mean strength 1484 psi from Horsrud's form. The velocity that gives it,
    // 2.41788 km/s, is self-computed. Tolerance: half a psi, the printed digit.
    [Fact]
    public void Horsruds_strength_gives_the_printed_mean_of_the_Gulf_shale() =>
        Assert.Equal(1484, Units.Psi.FromSi(Apply("horsrud-2001-shale", 2417.88)), 0.5);

    // Zoback 2007 pp. 116 and 118: friction angle 70 - 0.417 GR deg; printed friction coefficients 0.7 to 0.84. The gamma rays that
    // give them, 84.0 and 71.9 API, are self-computed to that digit: 0.1 API moves the coefficient by 0.0013.
    [Theory]
    [InlineData(84.0, 0.70)]
    [InlineData(71.9, 0.84)]
    public void The_gamma_ray_friction_law_given_by_hand_meets_the_printed_range(double gammaRay, double friction)
    {
        var law = UserLaw.Linear(
            Property.FrictionAngle, Units.Degree, new LawInput("GR", Property.GammaRay, Units.GammaApi), -0.417, 70);
        Assert.Equal(friction, Math.Tan(Apply(law, gammaRay)), 1.3e-3);
    }

    // McNally 1987 read in Zhang 2019 p. 100 eq. 3.17; values self-computed. Tolerance: half the last digit.
    [Theory]
    [InlineData(70, 96.552)]
    [InlineData(80, 67.362)]
    public void McNallys_strength_comes_from_slowness(double slowness, double expected) =>
        Assert.Equal(expected, Apply("mcnally-1987-sandstone", Units.MicrosecondPerFoot.ToSi(slowness)) / 1e6, 5e-4);

    // Horsrud 2001 read in Rock Physics Handbook p. 387 (strength) and Zhang 2019 p. 96 (modulus); values self-computed.
    // Tolerance: half the last digit.
    [Fact]
    public void Horsruds_laws_come_from_velocity()
    {
        Assert.Equal(20.168, Apply("horsrud-2001-shale", 3048) / 1e6, 5e-4);
        Assert.Equal(19.251, Apply("horsrud-2001-shale", 3000) / 1e6, 5e-4);
        Assert.Equal(2.6419, Apply("horsrud-2001-shale-modulus", 3000) / 1e9, 5e-5);
    }

    // Asquith and Gibson 1982, fig. 38: GR 28, clean 15, shale 128 API; printed index 0.115, 5.7 % older, 2.8 % Tertiary.
    // The printed Tertiary value is cut, not rounded (0.0285): one unit of the last digit there, half a unit elsewhere.
    [Fact]
    public void Shale_volumes_meet_the_printed_example()
    {
        var index = GammaRayIndex.Of(28, 15, 128);
        Assert.Equal(0.115, index, 5e-4);
        Assert.Equal(0.057, Apply("larionov-1969-older", index), 5e-4);
        Assert.Equal(0.028, Apply("larionov-1969-tertiary", index), 1e-3);
        Assert.Equal(index, Apply("linear-gamma-ray", index));
    }

    // Larionov 1969 as printed in public shale-volume references; values self-computed. Tolerance: half the last digit.
    [Theory]
    [InlineData(0.4, 0.148527, 0.244563)]
    [InlineData(0.5, 0.216215, 0.330000)]
    [InlineData(1.0, 0.995671, 0.990000)]
    public void Larionovs_curves_stop_short_of_one(double index, double tertiary, double older)
    {
        Assert.Equal(tertiary, Apply("larionov-1969-tertiary", index), 5e-7);
        Assert.Equal(older, Apply("larionov-1969-older", index), 5e-7);
    }

    // Rider, The Geological Interpretation of Well Logs, p. 115: densities in fresh water, two decimals. Tolerance: half a unit of
    // the density's last digit over the density range, 0.005 / 1.65 at most.
    [Theory]
    [InlineData(0.10, 2.49, 2.65)]
    [InlineData(0.10, 2.54, 2.71)]
    [InlineData(0.10, 2.68, 2.87)]
    [InlineData(0.20, 2.32, 2.65)]
    public void Density_porosity_meets_the_printed_densities(double porosity, double density, double matrix) =>
        Assert.Equal(porosity, Apply("density-porosity", 1000 * density, 1000 * matrix, 1000), 0.00501 / 1.65);

    // Krief et al. 1990, from memory; values self-computed. Tolerance: half the last digit.
    [Theory]
    [InlineData(0.1, 0.29616)]
    [InlineData(0.2, 0.56690)]
    [InlineData(0.3, 0.78316)]
    public void Kriefs_coefficient_comes_from_porosity(double porosity, double expected) =>
        Assert.Equal(expected, Apply("krief-1990-biot", porosity), 5e-6);

    // Identity: Biot's coefficient is never below porosity (Voigt bound).
    [Fact]
    public void Kriefs_coefficient_is_never_below_porosity() =>
        Gen.Double[0, 0.99].Sample(porosity => Apply("krief-1990-biot", porosity) >= porosity - 1e-12);
}
