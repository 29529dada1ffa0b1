using CsCheck;
using DepthStress.Core.Layers;
using static DepthStress.Tests.Layers.CutOracle;

namespace DepthStress.Tests.Layers;

/// <summary>The fast cuts are exact: they agree with the plain way on random series with steps, trends, gaps and uneven cells.</summary>
public class CutProperties
{
    private sealed record Series(double[] Edges, double[] Middles, CutCurve[] Curves);

    private static readonly Gen<double[]> Steps = Gen.Select(Gen.Double[-3, 3].Array[6], Gen.Double[-1, 1].Array[80], Gen.Int[1, 30].Array[6]).Select((levels, noise, lengths) =>
        lengths.SelectMany((n, k) => Enumerable.Repeat(2 * levels[k], n)).Take(noise.Length).Zip(noise, (level, e) => level + e).ToArray());

    private static Gen<Series> Of(int least, int most) =>
        Gen.Select(Gen.Int[least, most], Steps, Steps, Gen.Double[0.1, 2].Array[80], Gen.Bool.Array[80], Gen.Double[-0.5, 0.5]).Select((wanted, a, b, cells, gaps, slope) =>
        {
            var n = Math.Min(wanted, Math.Min(a.Length, b.Length));
            var edges = new double[n + 1];
            for (var i = 0; i < n; i++) edges[i + 1] = edges[i] + cells[i];
            var middles = Enumerable.Range(0, n).Select(i => 0.5 * (edges[i] + edges[i + 1])).ToArray();
            var first = a[..n].Select((v, i) => gaps[i] && gaps[(i + 1) % n] && gaps[(i + 2) % n] ? double.NaN : v).ToArray();
            var second = b[..n].Select((v, i) => v + (slope * middles[i])).ToArray();
            return new Series(edges, middles, [new(first, cells[..n], false), new(second, cells[..n], true)]);
        });

    private static Gen<ThicknessLimits> Limits { get; } = Gen.Select(Gen.Int[0, 3], Gen.Double[0.5, 8], Gen.Double[2.2, 4]).Select((kind, least, times) => kind switch
    {
        0 => ThicknessLimits.None,
        1 => new ThicknessLimits(0, least * times),
        2 => new ThicknessLimits(least, double.PositiveInfinity),
        _ => new ThicknessLimits(least, least * times),
    });

    // Sums of some hundred squares up to about 1e4: rounding near 1e-10.
    [Fact]
    public void A_cost_is_the_misfit_summed_anew() => Of(1, 80).Sample(s =>
    {
        var costs = new SegmentCosts(s.Middles, s.Curves);
        for (var to = 1; to <= costs.Count; to += 3)
        {
            for (var from = 0; from < to; from += 2)
                Assert.Equal(s.Curves.Sum(c => Misfit(s.Middles, c, from, to)), costs.Of(from, to), 1e-8);
        }
    });

    // Equal costs may have several cuts: the costs are compared, to the rounding of sums near 1e4.
    [Fact]
    public void Pruning_leaves_the_answer_exact_on_a_thousand_series() => Gen.Select(Of(1, 80), Gen.Double[0, 30], Limits).Sample(
        (s, penalty, limits) =>
        {
            var costs = new SegmentCosts(s.Middles, s.Curves);
            var expected = Unpruned(costs, s.Edges, penalty, limits);
            var ends = ClearestCut.Of(costs, s.Edges, penalty, limits);
            Assert.Equal(double.IsFinite(expected.Cost), ends is not null);
            if (ends is null) return;
            Assert.Equal(expected.Cost, Total(costs, ends, penalty), 1e-8);
            for (var k = 0; k < ends.Length; k++) Assert.True(Allowed(s.Edges, k == 0 ? 0 : ends[k - 1], ends[k], limits));
        },
        iter: 1000);

    // As above, on series long enough for outdone starts to be swept.
    [Fact]
    public void Pruning_leaves_the_answer_exact_on_long_series() => Gen.Select(Gen.Double[-1, 1].Array[600], Gen.Double[0, 4], Gen.Double[0, 60], Gen.Double[0, 15]).Sample(
        (noise, step, least, penalty) =>
        {
            var values = noise.Select((e, i) => e + (step * (i / 97 % 3))).ToArray();
            var costs = new SegmentCosts(Middles(600), [new CutCurve(values, [.. values.Select(_ => 1.0)], false), new CutCurve(noise, [.. values.Select(_ => 1.0)], true)]);
            var limits = new ThicknessLimits(least, double.PositiveInfinity);
            Assert.Equal(Unpruned(costs, Edges(600), penalty, limits).Cost, Total(costs, ClearestCut.Of(costs, Edges(600), penalty, limits)!, penalty), 1e-8);
        },
        iter: 20);

    [Fact]
    public void So_many_segments_cost_least_of_all_ways_to_place_them() => Gen.Select(Of(2, 11), Limits).Sample((s, limits) =>
    {
        var costs = new SegmentCosts(s.Middles, s.Curves);
        var cut = new CountedCut(costs, s.Edges, limits, 5);
        for (var k = 1; k <= 5; k++)
        {
            var least = Every(costs, s.Edges, k, limits);
            if (double.IsInfinity(least)) Assert.Null(cut.Ends(k));
            else Assert.Equal(least, Total(costs, cut.Ends(k)!, 0), 1e-8); // the same sums, added in another order
            Assert.Equal(least, cut.Cost(k), 1e-8);
        }
    });

    // Several columns share a count out like one column that is cut at their joints.
    [Fact]
    public void Shares_of_a_count_cost_least_of_all_ways_to_share_it() => Gen.Select(Of(3, 9), Of(3, 9), Gen.Int[2, 6]).Sample((a, b, count) =>
    {
        CountedCut Cut(Series s) => new(new SegmentCosts(s.Middles, s.Curves), s.Edges, ThicknessLimits.None, 5);
        CountedCut[] cuts = [Cut(a), Cut(b)];
        var shares = CountShares.Of(cuts, count)!;
        Assert.Equal(count, shares.Sum());
        var least = Enumerable.Range(1, count - 1).Where(k => k <= 5 && count - k <= 5).Min(k => cuts[0].Cost(k) + cuts[1].Cost(count - k));
        Assert.Equal(least, cuts[0].Cost(shares[0]) + cuts[1].Cost(shares[1]), 0); // the same two numbers
    });
}
