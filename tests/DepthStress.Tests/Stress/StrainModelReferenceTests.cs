using CsCheck;
using DepthStress.Core.Stress;

namespace DepthStress.Tests.Stress;

public class StrainModelReferenceTests
{
    // Uniaxial strain, Zhang 2019 eq. 6.26; MPa. Inputs and results self-computed, exact in these numbers; rounding only.
    [Theory]
    [InlineData(0.25, 60, 30, 0.8, 36.0)]
    [InlineData(0.20, 92, 40, 0.7, 44.0)]
    public void Uniaxial_strain_gives_the_worked_values(double nu, double sv, double pp, double biot, double expected) =>
        Assert.Equal(expected, StrainModel.Of(20e3, nu, biot, sv, pp, 0, 0), 1e-12);

    // Zhang 2019 p. 208 eqs 6.36-6.37, transversely isotropic form written out here: self-computed by hand,
    // 30 + 30 x 0.555556 + 43402.78 x 3.68e-4 = 62.638889 MPa and 43402.78 x 6.56e-4 for the other axis. With E_h = E_v and nu_h = nu_v it must equal the isotropic kernel. Rounding only.
    [Fact]
    public void The_isotropic_limit_of_the_layered_form_is_the_kernel()
    {
        Assert.Equal(62.638889, Layered(40e3, 20e3, 0.28, 0.2, 60, 30, 1, 2e-4, 6e-4), 5e-7);
        Assert.Equal(75.138889, Layered(40e3, 20e3, 0.28, 0.2, 60, 30, 1, 6e-4, 2e-4), 5e-7);
        Assert.Equal(Layered(40e3, 40e3, 0.28, 0.28, 60, 30, 0.7, 2e-4, 6e-4), StrainModel.Of(40e3, 0.28, 0.7, 60, 30, 2e-4, 6e-4), 1e-10);
        Assert.Equal(57.63889, StrainModel.Of(40e3, 0.28, 1, 60, 30, 2e-4, 6e-4), 5e-6); // self-computed
        Assert.Equal(70.13889, StrainModel.Of(40e3, 0.28, 1, 60, 30, 6e-4, 2e-4), 5e-6); // self-computed
    }

    // Zhang 2019 p. 208 prints K0 = 0.56 for E_h/E_v 2, nu_v 0.2, nu_h 0.28 and 0.25 for the isotropic 0.2. Half the last digit.
    [Fact]
    public void The_ratio_of_horizontal_to_vertical_stress_meets_the_printed_ones()
    {
        Assert.Equal(0.56, Layered(2, 1, 0.28, 0.2, 1, 0, 1, 0, 0), 5e-3);
        Assert.Equal(0.25, StrainModel.Of(1, 0.2, 1, 1, 0, 0, 0), 1e-15);
    }

    [Fact]
    public void The_kernel_equals_the_scalar_formula_and_swapping_the_strains_swaps_the_stresses() =>
        Gen.Select(Gen.Double[1e9, 80e9], Gen.Double[0, 0.49], Gen.Double[0, 1], Gen.Double[10e6, 100e6], Gen.Double[0, 60e6], Gen.Double[-1e-3, 1e-3], Gen.Double[-1e-3, 1e-3])
            .Sample((e, nu, biot, sv, pp, small, great) =>
            {
                var (shmin, shmax, swappedMin, swappedMax) = (new double[1], new double[1], new double[1], new double[1]);
                StrainModel.Fill([e], [nu], [biot], [sv], [pp], small, great, shmin, shmax);
                StrainModel.Fill([e], [nu], [biot], [sv], [pp], great, small, swappedMin, swappedMax);
                return shmin[0] == StrainModel.Of(e, nu, biot, sv, pp, small, great)
                    && shmax[0] == StrainModel.Of(e, nu, biot, sv, pp, great, small)
                    && shmin[0] == swappedMax[0] && shmax[0] == swappedMin[0];
            });

    // Identity: the difference of the two stresses is E/(1 + nu) times the difference of the strains.
    [Fact]
    public void The_difference_of_the_stresses_depends_on_shear_stiffness_alone()
    {
        var difference = StrainModel.Of(30e9, 0.3, 0.9, 70e6, 30e6, 7e-4, 1e-4) - StrainModel.Of(30e9, 0.3, 0.9, 70e6, 30e6, 1e-4, 7e-4);
        Assert.Equal(30e9 / 1.3 * 6e-4, difference, 1e-6); // Pa, rounding
    }

    [Fact]
    public void A_missing_input_gives_missing_stresses()
    {
        for (var missing = 0; missing < 5; missing++)
        {
            var input = Enumerable.Range(0, 5).Select(k => new[] { k == missing ? double.NaN : 0.3 }).ToArray();
            var (shmin, shmax) = (new double[1], new double[1]);
            StrainModel.Fill(input[0], input[1], input[2], input[3], input[4], 0, 0, shmin, shmax);
            Assert.True(double.IsNaN(shmin[0]) && double.IsNaN(shmax[0]));
        }
    }

    [Fact]
    public void Lengths_are_checked() =>
        Assert.Throws<ArgumentException>(() => StrainModel.Fill([1], [0.2], [1], [1], [1, 2], 0, 0, new double[1], new double[1]));

    private static double Layered(
        double eh, double ev, double nuh, double nuv, double sv, double pp, double biot, double along, double across) =>
        (eh / ev * (nuv / (1 - nuh)) * (sv - (biot * pp))) + (biot * pp) + (eh / (1 - (nuh * nuh)) * (along + (nuh * across)));
}
