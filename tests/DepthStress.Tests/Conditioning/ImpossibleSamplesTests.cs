using CsCheck;
using DepthStress.Core.Conditioning;
using DepthStress.Core.Logs;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Conditioning;

public class ImpossibleSamplesTests
{
    private const double Gone = double.NaN;

    [Fact]
    public void Sound_logs_pass_unchanged()
    {
        var logs = LogsWith();
        var (after, removals) = ImpossibleSamples.Remove(logs);
        Assert.Same(logs, after);
        Assert.Empty(removals);
    }

    [Fact]
    public void Density_is_kept_from_one_to_four_grams_and_no_further()
    {
        var (after, removals) = ImpossibleSamples.Remove(LogsWith(Curve(Property.Density, 1000, 999, 4000, 4001, double.NaN)));
        Assert.Equal([1000, Gone, 4000, Gone, Gone], after[Property.Density]!.Values);
        var removal = Assert.Single(removals);
        Assert.Equal("bulk density outside 1-4 g/cm3", removal.Reason);
        Assert.Equal([false, true, false, true, false], removal.Samples);
    }

    [Fact]
    public void What_is_taken_out_is_marked_as_edited_and_the_log_stays_as_it_was()
    {
        var logs = LogsWith(Curve(Property.Density, 2500, 5000, 2500, 2500, 2500));
        var after = ImpossibleSamples.Remove(logs).Logs;
        Assert.Equal(
            [
                new OriginRun(0, 1, SampleOrigin.Measured, "test"),
                new OriginRun(1, 2, SampleOrigin.Edited, "taken out: bulk density outside 1-4 g/cm3"),
                new OriginRun(2, 5, SampleOrigin.Measured, "test"),
            ],
            after[Property.Density]!.Origins.Runs);
        Assert.Equal(5000, logs[Property.Density]!.Values[1]);
    }

    [Fact]
    public void Velocities_must_be_positive()
    {
        var (after, removals) = ImpossibleSamples.Remove(
            LogsWith(Curve(Property.Vp, 4000, 0, -1, 4000, 4000), Curve(Property.Vs, 2000, 2000, 2000, 0, -5)));
        Assert.Equal([4000, Gone, Gone, 4000, 4000], after[Property.Vp]!.Values);
        Assert.Equal([2000, 2000, 2000, Gone, Gone], after[Property.Vs]!.Values);
        Assert.Equal(["compressional velocity that is not positive", "shear velocity that is not positive"], removals.Select(r => r.Reason));
    }

    // Identity: a bulk modulus above zero needs Vp/Vs > sqrt(4/3) = 1.154700538.
    [Fact]
    public void Of_an_impossible_pair_both_velocities_go()
    {
        var (after, removals) = ImpossibleSamples.Remove(
            LogsWith(Curve(Property.Vp, 4000, 4000, 4000, 4000, double.NaN), Curve(Property.Vs, 3464.1, 3464.2, 4000, 5000, 5000)));
        Assert.Equal([4000, Gone, Gone, Gone, Gone], after[Property.Vp]!.Values);
        Assert.Equal([3464.1, Gone, Gone, Gone, 5000], after[Property.Vs]!.Values);
        Assert.Equal("Vp/Vs not above sqrt(4/3)", Assert.Single(removals).Reason);
    }

    [Fact]
    public void A_curve_that_is_not_there_is_not_missed()
    {
        var (after, removals) = ImpossibleSamples.Remove(Table([1, 2], Curve(Property.Vp, 3000, -3000)));
        Assert.Null(after[Property.Vs]);
        Assert.Single(removals);
    }

    [Fact]
    public void What_is_left_always_has_a_positive_bulk_modulus() =>
        Gen.Select(Gen.Double[-100, 7000].Array[5], Gen.Double[-100, 5000].Array[5]).Sample((vp, vs) =>
        {
            var after = ImpossibleSamples.Remove(LogsWith(Curve(Property.Vp, vp), Curve(Property.Vs, vs))).Logs;
            var (p, s) = (after[Property.Vp]!.Values, after[Property.Vs]!.Values);
            return Enumerable.Range(0, 5).All(i => double.IsNaN(p[i]) || double.IsNaN(s[i]) || (3 * p[i] * p[i]) - (4 * s[i] * s[i]) > 0);
        });
}
