using DepthStress.Core.Layers;
using static DepthStress.Tests.Layers.CutOracle;

namespace DepthStress.Tests.Layers;

/// <summary>
/// Annual flow of the Nile at Aswan, 1871-1970 (Cobb 1978, Biometrika 65, 243-251, which finds the change near 1898). The tables of
/// cuts and misfits were computed once by a plain program that enumerates every start: self-computed, but not by this code.
/// </summary>
public class CutReferenceTests
{
    private static readonly double[] Nile =
    [
        1120, 1160, 963, 1210, 1160, 1160, 813, 1230, 1370, 1140, 995, 935, 1110, 994, 1020, 960, 1180, 799, 958, 1140, 1100, 1210, 1150, 1250, 1260,
        1220, 1030, 1100, 774, 840, 874, 694, 940, 833, 701, 916, 692, 1020, 1050, 969, 831, 726, 456, 824, 702, 1120, 1100, 832, 764, 821,
        768, 845, 864, 862, 698, 845, 744, 796, 1040, 759, 781, 865, 845, 944, 984, 897, 822, 1010, 771, 676, 649, 846, 812, 742, 801,
        1040, 860, 874, 848, 890, 744, 749, 838, 1050, 918, 986, 797, 923, 975, 815, 1020, 906, 901, 1170, 912, 746, 919, 718, 714, 740,
    ];

    // The variance that the steps from year to year give; the table prints six decimals.
    private static readonly double Variance = Nile.Skip(1).Zip(Nile, (b, a) => (b - a) * (b - a)).Sum() / (2 * (Nile.Length - 1));

    [Fact]
    public void The_series_is_the_published_one() => Assert.Equal((100, 91935.0), (Nile.Length, Nile.Sum()));

    [Fact]
    public void Steps_from_year_to_year_give_the_variance_of_the_table() => Assert.Equal(13998.767677, Variance, 5e-7);

    // The table prints four decimals.
    [Theory]
    [InlineData(1, 2835156.7500, 1029.8489)]
    [InlineData(2, 1597457.1944, 981.6909, 28)]
    [InlineData(3, 1542326.6579, 987.3891, 19, 28)]
    [InlineData(4, 1438125.5364, 989.6043, 28, 83, 95)]
    [InlineData(5, 1341858.9336, 991.8862, 28, 41, 45, 47)]
    public void So_many_segments_cut_the_flow_as_in_the_table(int segments, double misfit, double criterion, params int[] cuts)
    {
        var cut = new CountedCut(Costs(Nile), Edges(Nile.Length), ThicknessLimits.None, 5);
        Assert.Equal([.. cuts, 100], cut.Ends(segments)!);
        Assert.Equal(misfit, cut.Cost(segments), 5e-5);
        Assert.Equal(criterion, (100 * Math.Log(cut.Cost(segments) / 100)) + (((2 * segments) - 1) * Math.Log(100)), 5e-5);
    }

    [Fact]
    public void The_criterion_is_least_for_one_change_after_1898()
    {
        var cut = new CountedCut(Costs(Nile), Edges(Nile.Length), ThicknessLimits.None, 5);
        Assert.Equal(2, Enumerable.Range(1, 5).MinBy(k => (100 * Math.Log(cut.Cost(k) / 100)) + (((2 * k) - 1) * Math.Log(100))));
        Assert.Equal(1097.75, Nile[..28].Average(), 1e-9);      // printed in full
        Assert.Equal(849.972222, Nile[28..].Average(), 5e-7);   // six decimals printed
    }

    // A boundary costs two numbers (a mean and a place) times the variance of the steps, or only one times that left by the best two segments.
    [Theory]
    [InlineData(2, 13998.767677, 128933.42, 28)]
    [InlineData(1, 15974.571944, 73565.62, 28, 37, 40, 45, 47, 83, 95)]
    public void A_penalty_cuts_the_flow_as_in_the_table(int numbers, double variance, double printed, params int[] cuts)
    {
        var penalty = numbers * variance * Math.Log(100);
        Assert.Equal(printed, penalty, 5e-3); // two decimals printed
        Assert.Equal([.. cuts, 100], ClearestCut.Of(Costs(Nile), Edges(Nile.Length), penalty, ThicknessLimits.None)!);
        Assert.Equal([.. cuts, 100], Unpruned(Costs(Nile), Edges(Nile.Length), penalty, ThicknessLimits.None).Ends);
    }

    private static SegmentCosts Costs(double[] values) => new(Middles(values.Length), [new CutCurve(values, [.. values.Select(_ => 1.0)], false)]);
}
