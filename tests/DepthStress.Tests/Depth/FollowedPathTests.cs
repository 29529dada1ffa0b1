using CsCheck;
using DepthStress.Core.Depth;

namespace DepthStress.Tests.Depth;

/// <summary>Paths through points of known vertical depth.</summary>
public class FollowedPathTests
{
    private const double Rounding = 1e-9; // at some kilometres

    private static readonly Gen<(double[] Md, double[] Tvd)> Curve = Gen.Select(Gen.Double[1, 50], Gen.Double[0.1, 1]).Array[1, 20].Select(steps =>
    {
        var (md, tvd) = (0.0, 0.0);
        var points = Array.ConvertAll(steps, s => (Md: md += s.Item1, Tvd: tvd += s.Item1 * s.Item2));
        return (Array.ConvertAll(points, p => p.Md), Array.ConvertAll(points, p => p.Tvd));
    });

    [Fact]
    public void The_path_goes_straight_from_the_datum_through_the_points_and_on()
    {
        var path = Trajectory.Follow([100, 200], [100, 150]);
        Assert.Equal(50, path.At(50).TrueVerticalDepth, Rounding);
        Assert.Equal(0, path.At(50).Inclination, Rounding);
        Assert.Equal(125, path.At(150).TrueVerticalDepth, Rounding);
        Assert.Equal(Math.PI / 3, path.At(150).Inclination, Rounding);
        Assert.Equal(200, path.At(300).TrueVerticalDepth, Rounding);
        Assert.True(path.At(300).Extrapolated);
        Assert.Equal(200, path.LastStation, 0); // as given
    }

    [Fact]
    public void Depth_is_that_of_the_curve_leads_back_and_fills_as_single_points() =>
        Gen.Select(Curve, Gen.Double[0, 1].Array[1, 20]).Sample((curve, shares) =>
        {
            var path = Trajectory.Follow(curve.Md, curve.Tvd);
            foreach (var (md, tvd) in curve.Md.Zip(curve.Tvd)) Assert.Equal(tvd, path.At(md).TrueVerticalDepth, 0); // as given
            var depths = Array.ConvertAll(shares, s => s * (path.LastStation + 10));
            foreach (var md in depths) Assert.Equal(md, path.MeasuredDepthAt(path.At(md).TrueVerticalDepth), 1e-8); // rounding over a slope of 0.1
            Surveys.FillEqualsAt(path, depths);
        });

    [Fact]
    public void Depths_that_no_path_can_have_are_refused()
    {
        Assert.Throws<ArgumentException>("md", () => Trajectory.Follow([], []));
        Assert.Throws<ArgumentException>("md", () => Trajectory.Follow([0], [0]));
        Assert.Throws<ArgumentException>("md", () => Trajectory.Follow([5, 5], [1, 2]));
        Assert.Throws<ArgumentException>("tvd", () => Trajectory.Follow([5], [1, 2]));
    }
}
