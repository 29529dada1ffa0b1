using DepthStress.Core.Logs;

namespace DepthStress.Tests.Logs;

/// <summary>Curves on one regular set of depths: made by hand from small numbers.</summary>
public sealed class ResamplingTests
{
    private static readonly Resampling Line = new(0.5, ResampleMethod.Linear, 1);
    private static readonly Resampling Mean = new(1, ResampleMethod.Mean, 1);

    [Theory]
    [InlineData(0.5, 1.2, 2.4, new[] { 1.5, 2.0 })]
    [InlineData(0.5, 1.0, 2.0, new[] { 1.0, 1.5, 2.0 })]
    [InlineData(0.1524, 1000.0488, 1000.3536, new[] { 1000.0488, 1000.2012, 1000.3536 })] // 6562 to 6564 steps
    [InlineData(0.5, -0.7, 0.2, new[] { -0.5, 0.0 })]
    [InlineData(2, 2.5, 3.5, new double[0])]
    public void Depths_are_the_whole_multiples_of_the_step(double step, double top, double bottom, double[] expected)
    {
        var depths = (Line with { Step = step }).Depths(top, bottom);
        Assert.Equal(expected.Length, depths.Length);
        for (var i = 0; i < expected.Length; i++) Assert.Equal(expected[i], depths[i], 1e-9); // one rounding
    }

    [Fact]
    public void Samples_at_a_wanted_depth_stay_and_others_are_edited()
    {
        var made = Line.Bring([1, 1.25, 1.75, 2.0000004], [10, 20, 40, 50], [1, 1.5, 2], CurveShape.Line);
        Assert.Equal([10, 30, 50], made.Values); // 0.4 um is within a millionth of the step
        Assert.Equal([SampleOrigin.None, SampleOrigin.Edited, SampleOrigin.None], made.Changes);
        Assert.Empty(made.Gaps);
    }

    [Fact]
    public void A_sample_further_than_a_millionth_of_the_step_is_not_taken_as_it_is() =>
        Assert.Equal(SampleOrigin.Edited, Line.Bring([1, 1.500001, 2], [10, 20, 30], [1.5], CurveShape.Line).Changes[0]);

    [Fact]
    public void Missing_values_are_bridged_up_to_the_longest_gap_and_marked_as_filled()
    {
        var made = Line.Bring([1, 1.5, 2, 2.5, 3, 3.5], [10, double.NaN, 30, double.NaN, double.NaN, 60], [0.5, 1, 1.5, 2, 2.5, 3, 3.5, 4], CurveShape.Line);
        Assert.Equal([double.NaN, 10, 20, 30, double.NaN, double.NaN, 60, double.NaN], made.Values);
        Assert.Equal([2], Enumerable.Range(0, 8).Where(i => made.Changes[i] == SampleOrigin.Filled));
        Assert.DoesNotContain(SampleOrigin.Edited, made.Changes);
        Assert.Equal([new DepthGap(2, 3.5)], made.Gaps);
    }

    [Fact]
    public void The_mean_runs_over_the_step_where_it_holds_two_samples_or_more()
    {
        // Around 2: the lines from 1.5 to 2.5 enclose (15 + 10) / 2 * 0.5 + (10 + 40) / 2 * 0.5 = 18.75.
        var made = Mean.Bring([1, 1.5, 2, 2.5, 3], [0, 15, 10, 40, 0], [1, 2, 3], CurveShape.Line);
        Assert.Equal([0, 18.75, 0], made.Values); // exact in binary; the ends stand for steps that are half outside
        Assert.Equal([SampleOrigin.None, SampleOrigin.Edited, SampleOrigin.None], made.Changes);
    }

    [Fact]
    public void A_mean_over_a_bridged_value_is_filled_and_over_a_long_gap_there_is_none()
    {
        double[] depths = [1, 1.25, 1.5, 1.75, 2, 2.25, 2.5, 2.75, 3, 3.25, 3.5, 4.75, 5];
        var values = depths.Select(d => d == 1.75 ? double.NaN : 10 * d).ToArray();
        var made = Mean.Bring(depths, values, [2, 3, 4], CurveShape.Line);
        Assert.Equal([20, 30, double.NaN], made.Values);
        Assert.Equal([SampleOrigin.Filled, SampleOrigin.Edited, SampleOrigin.None], made.Changes);
    }

    [Fact]
    public void A_velocity_is_resampled_as_slowness()
    {
        // Half way between 1 / 2000 and 1 / 4000 s/m lies 3 / 8000 s/m.
        var made = Line.Bring([1.25, 1.75, 2], [2000, 4000, 3003], [1.5, 2], CurveShape.Reciprocal);
        Assert.Equal(8000 / 3.0, made.Values[0], 1e-9); // three roundings
        Assert.Equal(3003, made.Values[1]); // as logged, not there and back
    }

    [Fact]
    public void Codes_take_the_nearest_sample_and_never_lie_between()
    {
        var made = (Line with { Method = ResampleMethod.Mean }).Bring([1, 1.4, 1.9, 2.3, 4], [1, 2, 7, 3, 9], [1, 1.5, 2, 2.5, 3, 4], CurveShape.Steps);
        Assert.Equal([1, 2, 7, double.NaN, double.NaN, 9], made.Values);
    }

    [Fact]
    public void Lengths_must_agree() => Assert.Throws<ArgumentException>(() => Line.Bring([1, 2], [1], [1], CurveShape.Line));
}
