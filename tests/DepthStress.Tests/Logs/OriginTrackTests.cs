using CsCheck;
using DepthStress.Core.Logs;

namespace DepthStress.Tests.Logs;

public class OriginTrackTests
{
    private static OriginTrack Track => OriginTrack.Of([1, 2, double.NaN, 4, 5], SampleOrigin.Measured, "a.las: DT");

    [Fact]
    public void Samples_with_a_value_get_the_origin_and_the_others_none() => Assert.Equal(
        [
            new OriginRun(0, 2, SampleOrigin.Measured, "a.las: DT"),
            new OriginRun(2, 3, SampleOrigin.None, ""),
            new OriginRun(3, 5, SampleOrigin.Measured, "a.las: DT"),
        ],
        Track.Runs);

    [Fact]
    public void Marks_split_runs_and_join_equal_neighbours()
    {
        var marked = Track.Mark([false, true, true, true, false], SampleOrigin.Filled, "fill");
        Assert.Equal(
            [
                new OriginRun(0, 1, SampleOrigin.Measured, "a.las: DT"),
                new OriginRun(1, 4, SampleOrigin.Filled, "fill"),
                new OriginRun(4, 5, SampleOrigin.Measured, "a.las: DT"),
            ],
            marked.Runs);
        Assert.Equal(3, Track.Runs.Count); // the first track stays as it was
    }

    [Fact]
    public void Equal_origins_from_different_steps_stay_apart() =>
        Assert.Equal(2, OriginTrack.From([new(0, 2, SampleOrigin.Spliced, "run 1"), new(2, 4, SampleOrigin.Spliced, "run 2")]).Runs.Count);

    [Fact]
    public void Joined_parts_must_follow_each_other()
    {
        Assert.Throws<ArgumentException>(() => OriginTrack.From([new(1, 2, SampleOrigin.Measured, "")]));
        Assert.Throws<ArgumentException>(() => OriginTrack.From([new(0, 2, SampleOrigin.Measured, ""), new(3, 4, SampleOrigin.Measured, "")]));
        Assert.Throws<ArgumentException>(() => OriginTrack.From([new(0, 2, SampleOrigin.Measured, ""), new(1, 4, SampleOrigin.Measured, "")]));
        Assert.Throws<ArgumentException>(() => OriginTrack.From([new(0, -1, SampleOrigin.Measured, "")]));
        Assert.Empty(OriginTrack.From([new(0, 0, SampleOrigin.Measured, "")]).Runs);
    }

    [Fact]
    public void The_weaker_of_two_origins_wins()
    {
        SampleOrigin[] weakest = [SampleOrigin.Assumed, SampleOrigin.None, SampleOrigin.Filled, SampleOrigin.Measured, SampleOrigin.Spliced];
        Track.Weaken(weakest);
        Assert.Equal([SampleOrigin.Assumed, SampleOrigin.Measured, SampleOrigin.Filled, SampleOrigin.Measured, SampleOrigin.Spliced], weakest);
    }

    [Fact]
    public void Lengths_are_checked()
    {
        Assert.Throws<ArgumentException>(() => Track.Mark([true], SampleOrigin.Filled, ""));
        Assert.Throws<ArgumentException>(() => Track.Weaken(new SampleOrigin[4]));
    }

    [Fact]
    public void Origins_rise_from_the_strongest_to_the_weakest_and_have_names() => Assert.Equal(
        ["", "measured", "spliced", "edited", "filled", "predicted", "extrapolated", "assumed"],
        Enum.GetValues<SampleOrigin>().Order().Select(o => o.Name()));
}
