using CsCheck;
using DepthStress.Core.Logs;

namespace DepthStress.Tests.Logs;

public class OriginTrackProperties
{
    private static readonly Gen<bool[][]> Marks =
        Gen.Int[1, 40].SelectMany(n => Gen.Bool.Array[n].Array[1, 5]);

    private static (OriginTrack Track, SampleOrigin[] Expected) Apply(bool[][] marks)
    {
        var values = marks[0].Select(m => m ? double.NaN : 1).ToArray();
        var track = OriginTrack.Of(values, SampleOrigin.Measured, "log");
        var expected = marks[0].Select(m => m ? SampleOrigin.None : SampleOrigin.Measured).ToArray();
        foreach (var (mark, k) in marks.Skip(1).Select((m, k) => (m, k)))
        {
            var origin = (SampleOrigin)(3 + k);
            track = track.Mark(mark, origin, $"step {origin}");
            for (var i = 0; i < mark.Length; i++)
            {
                if (mark[i]) expected[i] = origin;
            }
        }

        return (track, expected);
    }

    [Fact]
    public void Runs_cover_every_sample_once_and_never_repeat_their_neighbour() => Marks.Sample(marks =>
    {
        var (track, _) = Apply(marks);
        var end = 0;
        OriginRun? before = null;
        foreach (var run in track.Runs)
        {
            Assert.Equal(end, run.Start);
            Assert.True(run.End > run.Start);
            Assert.False(before is { } b && b.Origin == run.Origin && b.Step == run.Step);
            (end, before) = (run.End, run);
        }

        Assert.Equal(track.Count, end);
    });

    [Fact]
    public void Each_sample_has_the_origin_of_the_last_mark_and_the_counts_agree() => Marks.Sample(marks =>
    {
        var (track, expected) = Apply(marks);
        var each = track.Runs.SelectMany(r => Enumerable.Repeat(r.Origin, r.End - r.Start)).ToArray();
        Assert.Equal(expected, each);
        foreach (var origin in Enum.GetValues<SampleOrigin>()) Assert.Equal(expected.Count(o => o == origin), track.CountOf(origin));
        Assert.Equal(track.Runs, OriginTrack.From(track.Runs).Runs);
    });
}
