using CsCheck;
using DepthStress.Core.Conditioning;
using DepthStress.Core.Logs;

namespace DepthStress.Tests.Conditioning;

/// <summary>What holds for the three steps that look for spoilt samples, on any curve.</summary>
public class ConditioningProperties
{
    /// <summary>Smooth curves on whole numbers, with gaps, spikes and constant ends: powers of two scale them without rounding.</summary>
    private static readonly Gen<double[]> Curves = Gen.Select(
        Gen.Int[0, 12].Array[20, 80],
        Gen.Select(Gen.Int[0, 79], Gen.Int[-500, 500], Gen.Bool).Array[0, 6],
        (steps, changes) =>
        {
            var curve = new double[steps.Length];
            var level = 1000;
            for (var i = 0; i < curve.Length; i++) curve[i] = level += steps[i] - 6;
            foreach (var (at, by, gap) in changes.Where(c => c.Item1 < curve.Length)) curve[at] = gap ? double.NaN : curve[at] + by;
            return curve;
        });

    private static readonly (string Name, Func<double[], bool[]> Mark)[] Steps =
    [
        ("parked", v => ParkedTool.Mark(v, OriginTrack.Of(v, SampleOrigin.Measured, "run"))),
        ("smear", v => NullSmear.Mark(v)),
        ("spike", v => SpikeFilter.Mark(Waves.Depths(v.Length), v, 3, 5)),
    ];

    [Fact]
    public void A_straight_line_is_never_edited() => Gen.Select(Gen.Int[-50, 50], Gen.Int[-9, 9], Gen.Int[1, 60]).Sample((level, slope, count) =>
        Steps.All(s => !s.Mark([.. Enumerable.Range(0, count).Select(i => (double)(level + (slope * i)))]).Contains(true)));

    [Fact]
    public void Scaling_and_shifting_the_curve_changes_no_mark() => Gen.Select(Curves, Gen.Int[-3, 3], Gen.Int[-4096, 4096]).Sample((curve, power, shift) =>
        Steps.All(s => s.Mark(curve).SequenceEqual(s.Mark(Array.ConvertAll(curve, v => (v + shift) * Math.Pow(2, power))))));

    [Fact]
    public void What_is_missing_is_never_marked() => Curves.Sample(curve =>
        Steps.All(s => !s.Mark(curve).Zip(curve).Any(p => p.First && double.IsNaN(p.Second))));

    [Fact]
    public void A_second_time_finds_nothing_more() => Curves.Sample(curve => Steps.Skip(1).All(s =>
    {
        var marks = s.Mark(curve);
        return !s.Mark([.. curve.Select((v, i) => marks[i] ? double.NaN : v)]).Contains(true);
    }));

    [Fact]
    public void A_spike_filter_finds_the_same_from_below_as_from_above_for_a_lone_spike() => Gen.Select(Gen.Int[5, 74], Gen.Int[1, 3], Gen.Double[0.5, 5]).Sample((at, length, size) =>
    {
        var curve = Waves.Curve(80);
        for (var i = at; i < Math.Min(78, at + length); i++) curve[i] += size;
        var reversed = curve.Reverse().ToArray();
        return Steps[2].Mark(curve).SequenceEqual(Steps[2].Mark(reversed).Reverse());
    });
}
