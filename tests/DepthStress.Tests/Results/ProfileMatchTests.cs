using DepthStress.Files.Results;

namespace DepthStress.Tests.Results;

public class ProfileMatchTests
{
    private static readonly double[] Depths = [100, 101, 102, 103, 110, 111];
    private static readonly double[] Values = [1, 3, double.NaN, 5, 6, 8];

    [Theory]
    [InlineData(100, 1)]
    [InlineData(100.25, 1.5)]
    [InlineData(101, 3)]
    [InlineData(101.5, double.NaN)]
    [InlineData(102.5, double.NaN)]
    [InlineData(103, 5)]
    [InlineData(105, double.NaN)]
    [InlineData(110.5, 7)]
    [InlineData(111, 8)]
    [InlineData(99.9, double.NaN)]
    [InlineData(111.1, double.NaN)]
    public void Values_lie_on_straight_lines_and_never_across_a_gap(double depth, double expected) =>
        Assert.Equal(expected, ProfileMatch.At(Depths, Values, [depth])[0], 1e-12); // one product of simple numbers

    [Fact]
    public void Nothing_comes_from_nothing()
    {
        Assert.Equal([double.NaN], ProfileMatch.At([], [], [5]));
        Assert.Equal([double.NaN, 7, double.NaN], ProfileMatch.At([10], [7], [9, 10, 11]));
    }

    [Fact]
    public void Layers_are_matched_by_the_depth_they_share()
    {
        var (before, after) = (Layers([0, 100, 200], [100, 200, 300]), Layers([0, 90, 400], [90, 300, 500]));
        Assert.Equal(
            [new LayerMatch(0, 0, 0.9), new LayerMatch(1, 1, 100 / 210.0), new LayerMatch(2, 1, 100 / 210.0), new LayerMatch(null, 2, 0)],
            LayerMatch.Of(before, after));
        Assert.Equal([new LayerMatch(null, 0, 0), new LayerMatch(null, 1, 0), new LayerMatch(null, 2, 0)], LayerMatch.Of(Layers([], []), after));
    }

    private static ResultCsv Layers(double[] tops, double[] bases) => new(
        Core.Quantities.UnitSystem.Metric, tops.Length, new Dictionary<string, double[]> { ["top_tvd"] = tops, ["base_tvd"] = bases }, new Dictionary<string, string[]>());
}
