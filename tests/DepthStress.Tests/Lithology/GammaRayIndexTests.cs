using CsCheck;
using DepthStress.Core.Lithology;

namespace DepthStress.Tests.Lithology;

public class GammaRayIndexTests
{
    [Fact]
    public void The_index_is_held_at_its_ends_and_counted()
    {
        var index = new double[6];
        Assert.Equal(2, GammaRayIndex.Fill([20, 25, 75, 125, 130, double.NaN], 25, 125, index));
        Assert.Equal([0, 0, 0.5, 1, 1, double.NaN], index);
    }

    [Fact]
    public void The_index_of_one_sample_is_not_held() => Assert.Equal(1.05, GammaRayIndex.Of(130, 25, 125), 1e-15); // rounding

    [Theory]
    [InlineData(100, 100)]
    [InlineData(100, 20)]
    [InlineData(double.NaN, 100)]
    public void Lines_that_do_not_fit_are_refused(double clean, double shale) =>
        Assert.Throws<ArgumentException>(() => GammaRayIndex.Fill([50], clean, shale, new double[1]));

    [Fact]
    public void Lengths_are_checked() => Assert.Throws<ArgumentException>(() => GammaRayIndex.Fill([50], 0, 1, new double[2]));

    [Fact]
    public void The_count_is_that_of_the_samples_outside_the_lines() => Gen.Double[-50, 250].Array[0, 40].Sample(gammaRay =>
    {
        var index = new double[gammaRay.Length];
        var saturated = GammaRayIndex.Fill(gammaRay, 20, 120, index);
        return saturated == gammaRay.Count(v => v is < 20 or > 120) && index.All(v => v is >= 0 and <= 1);
    });
}
