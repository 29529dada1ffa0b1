using CsCheck;
using DepthStress.Core.Rock;

namespace DepthStress.Tests.Rock;

/// <summary>Stiffnesses and constants of layered rock against worked numbers; tolerances are half the last digit given.</summary>
public sealed class VtiReferenceTests
{
    /// <summary>Two thin layers averaged after Backus 1962; the printed A, C, D, M, F recalled from The Rock Physics Handbook, the digits self-computed.</summary>
    private static readonly VtiStiffness Backus = new(45.10937, 16.67766, 34.03363, 8.27759, 12.55086);

    private static readonly Gen<VtiStiffness> Stable = Gen.Select(
        Gen.Double[10e9, 60e9], Gen.Double[0.15, 0.45], Gen.Double[-0.1, 0.4], Gen.Double[-0.1, 0.5], Gen.Double[-0.1, 0.25],
        (c33, ratio, epsilon, gamma, delta) => new ThomsenParameters(epsilon, gamma, delta).ToStiffness(c33, ratio * c33)).Where(c => c.IsStable);

    // Numbers computed apart from this code by a numerical inverse of the stiffness matrix.
    [Fact]
    public void Constants_of_the_averaged_layers_are_those_of_the_inverted_matrix()
    {
        var constants = VtiConstants.Of(Backus);
        Assert.Equal(25.49073, constants.Vertical, 2e-5); // inputs are rounded to five decimals
        Assert.Equal(33.14464, constants.Horizontal, 2e-5);
        Assert.Equal(0.256118, constants.PoissonVertical, 1e-6);
        Assert.Equal(0.320413, constants.PoissonHorizontal, 1e-6);
        Assert.Equal(0.333021, constants.PoissonCross, 1e-6);
        Assert.Equal(0.490035, constants.StressRatio, 1e-6);
        Assert.Equal(20.00765, Backus.C12, 1e-5);
    }

    // Same stack, self-computed: epsilon .162717, gamma .258123, delta -.023164.
    [Fact]
    public void Thomsens_parameters_of_the_averaged_layers_come_out()
    {
        var thomsen = ThomsenParameters.Of(Backus);
        Assert.Equal(0.162717, thomsen.Epsilon, 1e-6);
        Assert.Equal(0.258123, thomsen.Gamma, 1e-6);
        Assert.Equal(-0.023164, thomsen.Delta, 1e-6);
    }

    // A row recalled from Thomsen 1986, Table 1 (Taylor sandstone: 3368 and 1829 m/s, .110, .255, -.035, density 2500); stiffnesses self-computed.
    [Fact]
    public void A_sandstone_of_Thomsens_table_has_the_stiffnesses_worked_out()
    {
        var c = new ThomsenParameters(0.110, 0.255, -0.035).ToStiffness(2500 * 3368.0 * 3368, 2500 * 1829.0 * 1829);
        Assert.Equal(28.35856, c.C33 / 1e9, 5e-6);
        Assert.Equal(8.36310, c.C44 / 1e9, 5e-6);
        Assert.Equal(34.59744, c.C11 / 1e9, 5e-6);
        Assert.Equal(12.62828, c.C66 / 1e9, 5e-6);
        Assert.Equal(10.61387, c.C13 / 1e9, 5e-6);
    }

    // Self-computed from the constraints: C33 30, C44 9, C66 13 GPa; then z = x = 1.1.
    [Theory]
    [InlineData(1.0, 38, 12, 24.24, 31.6386, 0.24, 0.216867, 0.4)]
    [InlineData(1.1, 41.8, 14.36364, 22.8363, 32.6431, 0.249369, 0.255502, 0.478788)]
    public void The_three_parameter_shale_gives_the_worked_constants(
        double factor, double c11, double c13, double vertical, double horizontal, double poissonVertical, double poissonHorizontal, double ratio)
    {
        var c = VtiClosure.AnnieFromC66(factor, factor, 13).Of(30, 9);
        var constants = VtiConstants.Of(c);
        Assert.Equal(c11, c.C11, 5e-6);
        Assert.Equal(c13, c.C13, 5e-6);
        Assert.Equal(vertical, constants.Vertical, 5e-5);
        Assert.Equal(horizontal, constants.Horizontal, 5e-5);
        Assert.Equal(poissonVertical, constants.PoissonVertical, 5e-7);
        Assert.Equal(poissonHorizontal, constants.PoissonHorizontal, 5e-7);
        Assert.Equal(ratio, c.StressRatio, 5e-7);
    }

    // Stoneley 1300 m/s in mud of 1000 kg/m3 and 1500 m/s: 6.7902 GPa, self-computed from the recalled relation.
    [Fact]
    public void The_Stoneley_wave_gives_the_worked_shear_stiffness_and_none_when_it_is_too_fast()
    {
        Assert.Equal(6.7902e9, StoneleyShear.C66(1300, 1000, 1500), 5e4);
        Assert.True(double.IsNaN(StoneleyShear.C66(1500, 1000, 1500)));
    }

    // Identity: the constants and the stiffness turn into each other, and the stress ratio without lateral strain is C13/C33. Rounding.
    [Fact]
    public void Stiffness_constants_and_parameters_turn_into_each_other() => Stable.Sample(c =>
    {
        var constants = VtiConstants.Of(c);
        var back = constants.ToStiffness();
        var again = ThomsenParameters.Of(c).ToStiffness(c.C33, c.C44);
        Assert.True(constants.IsStable);
        Assert.Equal(c.StressRatio, constants.StressRatio, 1e-12);
        foreach (var (expected, actual) in Five(c).Zip(Five(back)).Concat(Five(c).Zip(Five(again)))) Assert.Equal(expected, actual, c.C11 * 1e-11);
    });

    [Fact]
    public void Without_anisotropy_the_constants_are_the_isotropic_ones()
    {
        foreach (var closure in (VtiClosure[])[VtiClosure.Thomsen(default), VtiClosure.AnnieFromGamma(1, 1, 0)])
        {
            var c = closure.Of(2500 * 4000.0 * 4000, 2500 * 2400.0 * 2400);
            var constants = VtiConstants.Of(c);
            var (e, nu) = (DynamicModuli.Youngs(4000, 2400, 2500), DynamicModuli.Poisson(4000, 2400));
            Assert.Equal(1, constants.Vertical / e, 1e-14); // rounding
            Assert.Equal(1, constants.Horizontal / e, 1e-14);
            Assert.Equal(nu, constants.PoissonVertical, 1e-14);
            Assert.Equal(nu, constants.PoissonHorizontal, 1e-14);
            Assert.Equal(VtiStiffness.Isotropic(e, nu).C13, c.C13, 1e-3); // Pa
        }
    }

    // By hand: (C11 + C12) C33 against 2 C13^2, at and beside equality.
    [Theory]
    [InlineData(40, 12, 30, 9, 13, true)]
    [InlineData(40, 28.46, 30, 9, 13, true)] // (40 + 14) 30 = 1620 = 2 x 28.4605^2
    [InlineData(40, 28.47, 30, 9, 13, false)]
    [InlineData(40, 12, 30, 0, 13, false)]
    [InlineData(40, 12, 30, 9, 0, false)]
    [InlineData(40, double.NaN, 30, 9, 13, false)]
    public void A_stiffness_that_would_give_energy_is_told(double c11, double c13, double c33, double c44, double c66, bool stable) =>
        Assert.Equal(stable, new VtiStiffness(c11, c13, c33, c44, c66).IsStable);

    // The two tests of stability agree wherever the constants exist.
    [Fact]
    public void Constants_are_stable_where_the_stiffness_is() =>
        Gen.Select(Gen.Double[5, 60], Gen.Double[5, 60], Gen.Double[-0.6, 0.9], Gen.Double[-0.9, 0.9]).Sample((vertical, horizontal, nu, nuh) =>
        {
            var constants = new VtiConstants(vertical, horizontal, nu, nuh, 7);
            if (Math.Abs(1 - nuh - (2 * nu * nu * horizontal / vertical)) < 1e-9) return;
            Assert.Equal(constants.IsStable, constants.ToStiffness().IsStable);
        });

    // Identity: isotropic grains and isotropic rock give 1 - K/Ks both ways (K 15, Ks 37 GPa: .59459, Biot and Willis). Half the last digit.
    [Fact]
    public void Biots_coefficient_is_the_isotropic_one_in_isotropic_rock_and_greater_across_the_beds_of_shale()
    {
        var isotropic = VtiStiffness.Isotropic(22.5, 0.25);
        Assert.Equal(0.59459, VtiBiot.Vertical(isotropic, 37), 5e-6);
        Assert.Equal(0.59459, VtiBiot.Horizontal(isotropic, 37), 5e-6);
        Assert.True(VtiBiot.Vertical(Backus, 37) > VtiBiot.Horizontal(Backus, 37));
    }

    private static double[] Five(VtiStiffness c) => [c.C11, c.C13, c.C33, c.C44, c.C66];
}
