using CsCheck;
using DepthStress.Core.Stress;

namespace DepthStress.Tests.Stress;

public class FaultingRegimeReferenceTests
{
    // Simpson 1997, J. Geophys. Res. 102, 17909-17919 (form read on a public structural-geology page); values self-computed,
    // half the last digit.
    [Theory]
    [InlineData(70, 67, 45, 0.88, FaultingRegime.Normal)]
    [InlineData(70, 105, 55, 1.7, FaultingRegime.StrikeSlip)]
    [InlineData(70, 105, 85, 2.428571, FaultingRegime.Reverse)]
    [InlineData(88.2, 90, 51.5, 1.046753, FaultingRegime.StrikeSlip)]
    [InlineData(70, 60, 60, 0, FaultingRegime.Normal)]
    [InlineData(70, 70, 50, 1.0, FaultingRegime.Normal)]
    public void The_shape_number_and_the_regime_follow_from_the_stresses(
        double vertical, double shmax, double shmin, double shape, FaultingRegime regime)
    {
        Assert.Equal(shape, FaultingRegimes.ShapeNumber(vertical, shmin, shmax), 5e-7);
        Assert.Equal(regime, FaultingRegimes.Of(vertical, shmin, shmax));
    }

    [Fact]
    public void On_a_tie_the_regime_is_one_of_the_two_neighbours()
    {
        Assert.Equal(FaultingRegime.Normal, FaultingRegimes.Of(70, 50, 70));
        Assert.Equal(FaultingRegime.Reverse, FaultingRegimes.Of(70, 70, 90));
        Assert.Equal(2.0, FaultingRegimes.ShapeNumber(70, 70, 90), 1e-12); // between strike-slip and reverse
    }

    [Theory]
    [InlineData(double.NaN, 50, 60)]
    [InlineData(70, double.NaN, 60)]
    [InlineData(70, 50, double.NaN)]
    [InlineData(70, 80, double.NaN)]
    public void A_missing_stress_gives_no_class(double vertical, double shmin, double shmax)
    {
        Assert.Equal(FaultingRegime.Unknown, FaultingRegimes.Of(vertical, shmin, shmax));
        Assert.True(double.IsNaN(FaultingRegimes.ShapeNumber(vertical, shmin, shmax)));
    }

    [Fact]
    public void Three_equal_stresses_have_no_shape_and_no_regime()
    {
        Assert.True(double.IsNaN(FaultingRegimes.ShapeNumber(70, 70, 70)));
        Assert.Equal(FaultingRegime.Unknown, FaultingRegimes.Of(70, 70, 70));
    }

    // Definition: 0-1 normal, 1-2 strike-slip, 2-3 reverse.
    [Fact]
    public void The_shape_number_lies_in_the_interval_of_its_regime() =>
        Gen.Select(Gen.Double[10, 100], Gen.Double[10, 100], Gen.Double[10, 100]).Sample((vertical, a, b) =>
        {
            var (shmin, shmax) = (Math.Min(a, b), Math.Max(a, b));
            var shape = FaultingRegimes.ShapeNumber(vertical, shmin, shmax);
            var first = (int)FaultingRegimes.Of(vertical, shmin, shmax) - 1;
            return shape >= first && shape <= first + 1;
        });

    [Fact]
    public void Regimes_have_the_names_results_use() => Assert.Equal(
        ["", "normal", "strike-slip", "reverse"], Enum.GetValues<FaultingRegime>().Select(r => r.Name()));
}
