using DepthStress.Core.Rock;
using DepthStress.Core.Stress;
using SampleWell.Hidden;

namespace DepthStress.Tests.Recovery;

/// <summary>
/// The kernels of layered rock against the hidden truth of the sample well, whose elastic constants and stresses were written
/// apart from them: other code, the same laws of nature. Rounding alone is allowed.
/// </summary>
public sealed class LayeredTruthTests
{
    private static readonly Truth Truth = new(WellPlans.Quillback4);

    /// <summary>The truth scales its parameters by the square of shale volume.</summary>
    private static VtiConstants Constants(int i)
    {
        var layered = Truth.Rock.ShaleVolume[i] * Truth.Rock.ShaleVolume[i];
        var (epsilon, gamma, delta) = Truth.Plan.Anisotropy;
        var (vp, vs, density) = (Truth.Rock.Vp[i], Truth.Rock.Vs[i], Truth.Rock.Density[i]);
        return VtiConstants.Of(VtiClosure.Thomsen(new(layered * epsilon, layered * gamma, layered * delta)).Of(density * vp * vp, density * vs * vs));
    }

    [Fact]
    public void The_constants_are_those_of_the_truth()
    {
        for (var i = 0; i < Truth.Tvd.Length; i++)
        {
            var constants = Constants(i);
            Assert.Equal(1, constants.Vertical / (1e9 * Truth.DynamicVertical[i]), 1e-12);
            Assert.Equal(Truth.PoissonVertical[i], constants.PoissonVertical, 1e-12);
            Assert.Equal(Truth.PoissonHorizontal[i], constants.PoissonHorizontal, 1e-12);
        }
    }

    [Fact]
    public void The_stresses_are_those_of_the_truth()
    {
        var (least, great) = (Truth.Plan.StrainMin, Truth.Plan.StrainMax);
        for (var i = 0; i < Truth.Tvd.Length; i++)
        {
            double Stress(double along, double across) => VtiStrainModel.Of(
                1e3 * Truth.StaticVertical[i], 1e3 * Truth.StaticHorizontal[i], Truth.PoissonVertical[i], Truth.PoissonHorizontal[i],
                Truth.Biot[i], Truth.Biot[i], Truth.Sv[i], Truth.Pore[i], along, across);
            Assert.Equal(Truth.Shmin[i], Stress(least, great), 1e-9); // MPa
            Assert.Equal(Truth.Shmax[i], Stress(great, least), 1e-9);
        }
    }
}
