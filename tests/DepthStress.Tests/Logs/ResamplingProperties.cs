using CsCheck;
using DepthStress.Core.Logs;

namespace DepthStress.Tests.Logs;

/// <summary>What holds for any curve on any depths brought onto any step.</summary>
public sealed class ResamplingProperties
{
    /// <summary>Depths in uneven steps, values with gaps, and a rule.</summary>
    private static readonly Gen<(double[] Depths, double[] Values, Resampling Rule)> Cases = Gen.Select(
        Gen.Double[0.05, 0.8].Array[2, 60], Gen.Double[100, 5000].Array[60], Gen.Int[0, 4].Array[60], Gen.Double[0.1, 3], Gen.Double[0.3, 3], Gen.Bool,
        (steps, values, holes, step, gap, mean) =>
        {
            var depths = new double[steps.Length];
            var depth = 1000.0;
            for (var i = 0; i < depths.Length; i++) depths[i] = depth += steps[i];
            var curve = depths.Select((_, i) => holes[i] == 0 ? double.NaN : values[i]).ToArray();
            return (depths, curve, new Resampling(step, mean ? ResampleMethod.Mean : ResampleMethod.Linear, gap));
        });

    private static readonly Gen<CurveShape> Shapes = Gen.Int[0, 2].Select(i => (CurveShape)i);

    [Fact]
    public void A_straight_line_is_reproduced() => Cases.Sample(c =>
    {
        var line = c.Depths.Select((d, i) => double.IsNaN(c.Values[i]) ? double.NaN : 5 + (0.3 * d)).ToArray();
        var wanted = Wanted(c);
        var made = c.Rule.Bring(c.Depths, line, wanted, CurveShape.Line);
        for (var i = 0; i < wanted.Length; i++)
        {
            // A depth may be off by a millionth of the step.
            if (!double.IsNaN(made.Values[i])) Assert.Equal(5 + (0.3 * wanted[i]), made.Values[i], (0.3 * Resampling.Coincidence * c.Rule.Step) + 1e-9);
        }
    });

    [Fact]
    public void No_value_lies_outside_the_range_of_those_within_reach() => Gen.Select(Cases, Shapes).Sample((c, shape) =>
    {
        var wanted = Wanted(c);
        var made = c.Rule.Bring(c.Depths, c.Values, wanted, shape);
        for (var i = 0; i < wanted.Length; i++)
        {
            if (double.IsNaN(made.Values[i])) continue;
            var known = Enumerable.Range(0, c.Depths.Length).Where(k => !double.IsNaN(c.Values[k])).ToArray();
            var reach = c.Rule.Step / 2;
            var first = known.Last(k => k == known[0] || c.Depths[k] <= wanted[i] - reach);
            var last = known.First(k => k == known[^1] || c.Depths[k] >= wanted[i] + reach);
            var near = known.Where(k => k >= first && k <= last).Select(k => c.Values[k]).ToArray();
            Assert.InRange(made.Values[i], near.Min() * (1 - 1e-12), near.Max() * (1 + 1e-12)); // two roundings of a reciprocal
        }
    });

    [Fact]
    public void Nothing_stands_inside_a_long_gap_or_beyond_the_ends() => Gen.Select(Cases, Shapes).Sample((c, shape) =>
    {
        var wanted = Wanted(c);
        var made = c.Rule.Bring(c.Depths, c.Values, wanted, shape);
        var known = Enumerable.Range(0, c.Depths.Length).Where(k => !double.IsNaN(c.Values[k])).Select(k => c.Depths[k]).ToArray();
        var slack = Resampling.Coincidence * c.Rule.Step;
        for (var i = 0; i < wanted.Length; i++)
        {
            var (above, below) = (known.LastOrDefault(d => d <= wanted[i] + slack, double.NaN), known.FirstOrDefault(d => d >= wanted[i] - slack, double.NaN));
            var joined = below - above <= c.Rule.MaxGap + DepthGrid.Tolerance; // false at the ends, where one of them is not there
            Assert.Equal(joined, !double.IsNaN(made.Values[i]));
        }
    });

    [Fact]
    public void A_second_time_on_the_same_step_changes_nothing() => Gen.Select(Cases, Shapes).Sample((c, shape) =>
    {
        var wanted = Wanted(c);
        if (wanted.Length == 0) return;
        var once = c.Rule.Bring(c.Depths, c.Values, wanted, shape);
        var twice = c.Rule.Bring(wanted, once.Values, c.Rule.Depths(wanted[0], wanted[^1]), shape);
        Assert.Equal(once.Values, twice.Values);
        Assert.All(twice.Changes, change => Assert.Equal(SampleOrigin.None, change));
    });

    private static double[] Wanted((double[] Depths, double[] Values, Resampling Rule) c) => c.Rule.Depths(c.Depths[0], c.Depths[^1]);
}
