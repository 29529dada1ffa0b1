using CsCheck;
using DepthStress.Core.Stress;

namespace DepthStress.Tests.Stress;

public sealed class VtiStrainModelReferenceTests
{
    // Zhang 2019 p. 208 prints a stress ratio of 0.56 for Eh/Ev 2, nu_v 0.2, nu_h 0.28 and 0.25 for the isotropic 0.2. Half the last digit.
    [Fact]
    public void The_stress_ratio_meets_the_printed_one()
    {
        Assert.Equal(0.56, VtiStrainModel.Of(1, 2, 0.2, 0.28, 1, 1, 1, 0, 0, 0), 5e-3);
        Assert.Equal(0.25, VtiStrainModel.Of(1, 1, 0.2, 0.2, 1, 1, 1, 0, 0, 0), 5e-3);
    }

    // Zhang 2019 p. 208 eqs 6.36-6.37, self-computed by hand: 30 + 30 x 0.555556 + 43402.78 x 3.68e-4 and x 6.56e-4, MPa. Half the last digit.
    [Fact]
    public void Strained_layered_rock_has_the_worked_stresses()
    {
        Assert.Equal(62.638889, VtiStrainModel.Of(20e3, 40e3, 0.2, 0.28, 1, 1, 60, 30, 2e-4, 6e-4), 5e-7);
        Assert.Equal(75.138889, VtiStrainModel.Of(20e3, 40e3, 0.2, 0.28, 1, 1, 60, 30, 6e-4, 2e-4), 5e-7);
    }

    [Fact]
    public void With_equal_constants_it_is_the_isotropic_formula_to_the_last_bit() =>
        Gen.Select(Gen.Double[1e9, 80e9], Gen.Double[-0.5, 0.49], Gen.Double[0, 1], Gen.Double[10e6, 100e6], Gen.Double[0, 60e6], Gen.Double[-1e-3, 1e-3], Gen.Double[-1e-3, 1e-3])
            .Sample((e, nu, biot, sv, pp, small, great) =>
                VtiStrainModel.Of(e, e, nu, nu, biot, biot, sv, pp, small, great) == StrainModel.Of(e, nu, biot, sv, pp, small, great));

    [Fact]
    public void The_kernel_equals_the_scalar_formula_and_a_missing_input_gives_missing_stresses()
    {
        double[][] columns = [.. Enumerable.Range(0, 8).Select(c => Enumerable.Range(0, 11).Select(i => Value(c, i)).ToArray())];
        for (var c = 0; c < 8; c++) columns[c][c] = double.NaN;
        var (shmin, shmax) = (new double[11], new double[11]);
        VtiStrainModel.Fill(columns[0], columns[1], columns[2], columns[3], columns[4], columns[5], columns[6], columns[7], 2e-4, 6e-4, shmin, shmax);
        for (var i = 0; i < 11; i++)
        {
            var x = Array.ConvertAll(columns, c => c[i]);
            Assert.Equal(i < 8, double.IsNaN(shmin[i]) && double.IsNaN(shmax[i]));
            Assert.Equal(VtiStrainModel.Of(x[0], x[1], x[2], x[3], x[4], x[5], x[6], x[7], 2e-4, 6e-4), shmin[i]);
            Assert.Equal(VtiStrainModel.Of(x[0], x[1], x[2], x[3], x[4], x[5], x[6], x[7], 6e-4, 2e-4), shmax[i]);
        }

        Assert.Throws<ArgumentException>(() => VtiStrainModel.Fill([1], [1], [0.2], [0.2], [1], [1], [1], [0], 0, 0, new double[1], new double[2]));

        static double Value(int column, int i) => column switch
        {
            0 or 1 => 20e9 + (1e9 * (column + i)),
            2 or 3 => 0.2 + (0.01 * i),
            4 or 5 => 0.8 + (0.01 * column),
            _ => 60e6 - (30e6 * (column - 6)) + i,
        };
    }

    // Zhang 2019 eq. 1.44, self-computed: 20 GPa, 1e-5 1/K, 25 K, nu 0.2 give 6.25 MPa; warming adds stress, cooling takes it. Rounding.
    [Fact]
    public void Warmed_rock_gains_the_worked_stress_and_cooled_rock_loses_it()
    {
        Assert.Equal(6.25e6, ThermalStress.Of(20e9, 0.2, 1e-5, 350, 325), 1e-6);
        Assert.Equal(-6.25e6, ThermalStress.Of(20e9, 0.2, 1e-5, 300, 325), 1e-6);
        var (shmin, shmax) = (new[] { 1e6, 1e6 }, new[] { 2e6, 2e6 });
        ThermalStress.Add([20e9, 20e9], [0.2, 0.2], [350, double.NaN], 1e-5, 325, shmin, shmax);
        Assert.Equal([7.25e6, double.NaN, 8.25e6, double.NaN], shmin.Concat(shmax).Select(s => Math.Round(s)));
    }

    // Hubbert and Willis 1957 as worked in the Gulf Coast exercise after Bourgoyne and others 1986: (S/D + 2 P/D)/3 with S/D 1 and P/D .735 is .823333 psi/ft. Half the last digit.
    [Fact]
    public void A_ratio_of_a_third_is_the_lower_bound_of_Hubbert_and_Willis() =>
        Assert.Equal(0.823333, EffectiveStressRatio.Of(1.0 / 3, 1, 0.735), 5e-7);
}
