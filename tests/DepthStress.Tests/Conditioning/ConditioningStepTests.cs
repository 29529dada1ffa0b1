using DepthStress.Core.Conditioning;
using DepthStress.Core.Logs;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Conditioning;

/// <summary>Parked tool, smear, washout, short gaps and depth shift, each by itself.</summary>
public class ConditioningStepTests
{
    private const double Gone = double.NaN;

    [Theory]
    [InlineData(3, 0)]
    [InlineData(4, 4)]
    [InlineData(20, 20)]
    public void A_constant_end_counts_from_four_samples_on(int length, int marked)
    {
        var curve = Waves.Curve(100);
        for (var i = 100 - length; i < 100; i++) curve[i] = curve[100 - length];
        Assert.Equal(Enumerable.Range(100 - marked, marked), Parked(curve));
    }

    [Fact]
    public void Both_ends_of_every_spliced_piece_are_looked_at()
    {
        var curve = Waves.Curve(60);
        Array.Fill(curve, 9, 0, 6);
        Array.Fill(curve, 8, 25, 5);
        Array.Fill(curve, 7, 30, 7);
        var origins = OriginTrack.From([new(0, 30, SampleOrigin.Spliced, "run 1"), new(30, 60, SampleOrigin.Spliced, "run 2")]);
        var marks = ParkedTool.Mark(curve, origins);
        Assert.Equal([.. Enumerable.Range(0, 6), .. Enumerable.Range(25, 12)], Enumerable.Range(0, 60).Where(i => marks[i]));
    }

    [Fact]
    public void A_curve_that_stands_still_elsewhere_too_is_left_alone()
    {
        var curve = Waves.Curve(60);
        Array.Fill(curve, 9, 50, 10);
        Array.Fill(curve, 8, 20, 6);
        Assert.Empty(Parked(curve));
    }

    [Fact]
    public void A_gap_edge_that_falls_towards_the_missing_value_code_is_marked()
    {
        var curve = Waves.Curve(60);
        Array.Fill(curve, Gone, 20, 5);
        curve[19] = (0.99 * curve[19]) + (0.01 * -999.25);
        curve[25] = (0.4 * curve[25]) + (0.6 * -999.25);
        Assert.Equal([19, 25], Where(NullSmear.Mark(curve)));
    }

    [Fact]
    public void A_gap_edge_that_rises_or_stays_is_kept()
    {
        var curve = Waves.Curve(60);
        Array.Fill(curve, Gone, 20, 5);
        curve[19] += 5;
        Assert.Empty(Where(NullSmear.Mark(curve)));
    }

    [Theory]
    [InlineData(WashoutRule.Either, true, true, true, false)]
    [InlineData(WashoutRule.Both, false, false, true, false)]
    [InlineData(WashoutRule.None, false, false, false, false)]
    public void Caliper_and_correction_decide_by_the_rule(WashoutRule rule, params bool[] expected) => Assert.Equal(
        expected,
        Washout.Mark([0.35, 0.31, 0.35, 0.31], [0.31, 0.31, 0.31, 0.31], [0, 100, -100, 10], Limits(rule), 4));

    [Fact]
    public void A_curve_that_is_not_there_says_nothing()
    {
        Assert.Equal([true, false], Washout.Mark([], [], [100, Gone], Limits(WashoutRule.Either), 2));
        Assert.Equal([false, false], Washout.Mark([], [], [100, 100], Limits(WashoutRule.Both), 2));
    }

    [Fact]
    public void A_gap_up_to_the_limit_is_bridged_by_a_straight_line()
    {
        var (values, filled) = ShortGaps.Fill([0, 1, 2, 3, 4, 5, 6], [Gone, 1, Gone, 3, Gone, Gone, 9], [2, 2, 2, 2, 2, 2, 2]);
        Assert.Equal([Gone, 1, 2, 3, Gone, Gone, 9], values);
        Assert.Equal([2], Where(filled));
    }

    [Fact]
    public void The_smallest_limit_inside_a_gap_decides()
    {
        Assert.Empty(Where(ShortGaps.Fill([0, 1, 2, 3], [1, Gone, Gone, 4], [9, 9, 0, 9]).Filled));
        Assert.Equal([1, 2], Where(ShortGaps.Fill([0, 1, 2, 3], [1, Gone, Gone, 4], [0, 3, 3, 0]).Filled));
    }

    [Fact]
    public void A_shift_is_positive_downwards_and_never_crosses_a_gap()
    {
        Assert.Equal([Gone, 1, 2, Gone, 4], DepthShift.Move([0, 1, 2, 3, 4], [1, 2, Gone, 4, 5], 1));
        Assert.Equal([1.5, Gone, Gone, 4.5, Gone], DepthShift.Move([0, 1, 2, 3, 4], [1, 2, Gone, 4, 5], -0.5));
    }

    private static WashoutSettings Limits(WashoutRule rule) => new() { CaliperExcess = Chosen(0.025), DensityCorrection = Chosen(50.0), Rule = Chosen(rule) };

    private static IEnumerable<int> Parked(double[] curve) => Where(ParkedTool.Mark(curve, OriginTrack.Of(curve, SampleOrigin.Measured, "run")));

    private static IEnumerable<int> Where(bool[] marks) => Enumerable.Range(0, marks.Length).Where(i => marks[i]);
}
