using CsCheck;
using DepthStress.Core.Logs;

namespace DepthStress.Tests.Ingest;

public sealed class DepthGridProperties
{
    /// <summary>Increasing depths with steps from 0.05 to 3 m.</summary>
    private static readonly Gen<double[]> Depths =
        Gen.Select(Gen.Double[0, 3000], Gen.Double[0.05, 3].Array[1, 60], (top, steps) =>
        {
            var depths = new double[steps.Length];
            for (var i = 0; i < depths.Length; i++) depths[i] = top + steps.Take(i).Sum();
            return depths;
        });

    [Fact]
    public void A_union_increases_keeps_the_first_file_and_spans_all() => Depths.Array[1, 4].Sample(files =>
    {
        var union = DepthGrid.Union(files);
        for (var i = 1; i < union.Length; i++) Assert.True(union[i] > union[i - 1]);
        Assert.Empty(files[0].Except(union));
        Assert.Empty(union.Except(files.SelectMany(f => f)));
        Assert.True(union[0] <= files.Min(f => f[0]) + 3, "the top is missed by more than a step");
        Assert.True(union[^1] >= files.Max(f => f[^1]) - 3, "the base is missed by more than a step");
    });

    [Fact]
    public void Bringing_a_curve_onto_its_own_depths_changes_nothing() => Depths.Sample(depths =>
    {
        var values = Array.ConvertAll(depths, Math.Sqrt);
        var resampled = new bool[depths.Length];
        Assert.Equal(values, DepthGrid.Bring(depths, values, depths, resampled));
        Assert.DoesNotContain(true, resampled);
    });

    [Fact]
    public void A_straight_line_stays_one_and_nothing_is_drawn_outside() => Gen.Select(Depths, Depths).Sample((from, to) =>
    {
        var values = Array.ConvertAll(from, d => 5 + (0.3 * d));
        var resampled = new bool[to.Length];
        var brought = DepthGrid.Bring(from, values, to, resampled);
        for (var i = 0; i < to.Length; i++)
        {
            if (double.IsNaN(brought[i]))
            {
                Assert.False(resampled[i]);
                continue;
            }

            Assert.InRange(to[i], from[0] - DepthGrid.Tolerance, from[^1] + DepthGrid.Tolerance);
            Assert.Equal(5 + (0.3 * to[i]), brought[i], 0.3 * DepthGrid.Tolerance + 1e-9); // a depth may be moved by the tolerance
        }
    });

    [Fact]
    public void Every_brought_value_lies_between_its_neighbours() => Gen.Select(Depths, Depths, Gen.Double[-10, 10].Array[60]).Sample((from, to, noise) =>
    {
        var values = noise[..from.Length];
        var resampled = new bool[to.Length];
        var brought = DepthGrid.Bring(from, values, to, resampled);
        for (var i = 0; i < to.Length; i++)
        {
            if (!resampled[i]) continue;
            var below = Array.FindIndex(from, d => d > to[i]);
            Assert.InRange(brought[i], Math.Min(values[below - 1], values[below]) - 1e-9, Math.Max(values[below - 1], values[below]) + 1e-9);
        }
    });
}
