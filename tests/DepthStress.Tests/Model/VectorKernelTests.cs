using DepthStress.Core.Catalogue;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;
using DepthStress.Tests.Catalogue;

namespace DepthStress.Tests.Model;

/// <summary>Kernels that work on several samples at a time give what one sample at a time gives, to the last bit.</summary>
public class VectorKernelTests
{
    private const int Samples = 1003; // no multiple of any vector length or block

    [Theory]
    [InlineData("lacy-1997-combined")]
    [InlineData("lacy-1997-shale")]
    public void A_law_gives_the_same_in_blocks_and_sample_by_sample(string id)
    {
        var law = Laws.Get(id);
        var column = Fill(i => i switch { 300 => double.NaN, 400 => -5e9, 500 => double.PositiveInfinity, _ => 1e9 + (1e8 * i / 3.0) });
        var inputs = default(LawInputs);
        inputs.Add(column);
        var blocks = new double[Samples];
        var outcome = LawKernel.Apply(law, inputs, blocks);

        var (single, sum) = (new double[Samples], default(LawOutcome));
        for (var i = 0; i < Samples; i++)
        {
            var one = default(LawInputs);
            one.Add(column.AsSpan(i, 1));
            sum += LawKernel.Apply(law, one, single.AsSpan(i, 1));
        }

        Assert.Equal(single, blocks);
        Assert.Equal(sum, outcome);
        Assert.True(outcome is { InputMissing: 1, OutsideDomain: > 0, Evaluated: > 900 });
    }

    [Fact]
    public void Moduli_and_stresses_equal_their_scalar_formulas()
    {
        var (vp, vs, density) = (Fill(i => 3000 + (i / 7.0)), Fill(i => i == 500 ? double.NaN : 1600 + (i / 11.0)), Fill(i => 2300 + (i / 13.0)));
        var (youngs, poisson) = (new double[Samples], new double[Samples]);
        DynamicModuli.Fill(vp, vs, density, youngs, poisson);
        Assert.Equal(Fill(i => DynamicModuli.Youngs(vp[i], vs[i], density[i])), youngs);
        Assert.Equal(Fill(i => DynamicModuli.Poisson(vp[i], vs[i])), poisson);

        var (biot, sv, pp) = (Fill(i => 0.6 + (i / 3000.0)), Fill(i => 20e6 + (i / 0.3)), Fill(i => 9e6 + (i / 0.7)));
        var (shmin, shmax) = (new double[Samples], new double[Samples]);
        StrainModel.Fill(youngs, poisson, biot, sv, pp, 150e-6, 400e-6, shmin, shmax);
        Assert.Equal(Fill(i => StrainModel.Of(youngs[i], poisson[i], biot[i], sv[i], pp[i], 150e-6, 400e-6)), shmin);
        Assert.Equal(Fill(i => StrainModel.Of(youngs[i], poisson[i], biot[i], sv[i], pp[i], 400e-6, 150e-6)), shmax);
        Assert.True(double.IsNaN(shmin[500]) && double.IsFinite(shmin[501]));
    }

    private static double[] Fill(Func<int, double> value) => [.. Enumerable.Range(0, Samples).Select(value)];
}
