using CsCheck;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using static DepthStress.Tests.Catalogue.Laws;

namespace DepthStress.Tests.Catalogue;

public class ShaleVolumeReferenceTests
{
    // Clavier 1971 and Steiber 1970 as printed in public shale-volume references, the variants from memory; values self-computed
    // at I = 0.4 and 0.5 to six digits.
    [Theory]
    [InlineData("clavier-1971", 0.226908, 0.307161)]
    [InlineData("steiber-1970", 0.181818, 0.250000)]
    [InlineData("steiber-1970-gentle", 0.250000, 0.333333)]
    [InlineData("steiber-1970-steep", 0.142857, 0.200000)]
    public void Curves_lie_below_the_line(string id, double at40, double at50)
    {
        Assert.Equal(at40, Apply(id, 0.4), 5e-7);
        Assert.Equal(at50, Apply(id, 0.5), 5e-7);
    }

    // Every curve starts at 0 and ends at 1, but Larionov's two, which end at 0.995671 and 0.990000 (self-computed). A sample on
    // either line must not be lost to rounding.
    [Theory]
    [InlineData("linear-gamma-ray", 1)]
    [InlineData("clavier-1971", 1)]
    [InlineData("steiber-1970", 1)]
    [InlineData("steiber-1970-gentle", 1)]
    [InlineData("steiber-1970-steep", 1)]
    [InlineData("larionov-1969-tertiary", 0.995671)]
    [InlineData("larionov-1969-older", 0.990000)]
    public void Curves_keep_their_ends(string id, double atShale)
    {
        Assert.Equal(0, Apply(id, 0), 1e-12);
        Assert.Equal(atShale, Apply(id, 1), 5e-7);
    }

    [Fact]
    public void Every_curve_rises_within_the_line_and_loses_no_sample() => Gen.Double[0, 1].Sample(index =>
    {
        foreach (var law in MethodCatalogue.For(Property.ShaleVolume))
        {
            Assert.InRange(Apply(law.Id, index), 0, index + 1e-12);
            Assert.True(Apply(law.Id, index) >= Apply(law.Id, 0.999 * index) - 1e-12);
        }
    });
}
