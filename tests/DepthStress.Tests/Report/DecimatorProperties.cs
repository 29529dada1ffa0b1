using CsCheck;
using DepthStress.Report.Drawing;

namespace DepthStress.Tests.Report;

public class DecimatorProperties
{
    private static readonly Gen<(double[] Values, double Bin)> Curves = Gen.Select(
        Gen.Frequency((6, Gen.Int[-50, 50].Select(v => (double)v)), (1, Gen.Const(double.NaN)), (1, Gen.Const(double.PositiveInfinity))).Array[0, 300],
        Gen.Double[0.2, 40]);

    [Fact]
    public void Least_and_greatest_values_of_every_bin_are_kept() => Curves.Sample((values, bin) =>
    {
        var kept = Thin(values, bin).SelectMany(l => l).ToList();
        foreach (var samples in Finite(values).GroupBy(p => Math.Floor(p.Depth * (1 / bin))))
        {
            var here = kept.Where(p => Math.Floor(p.Depth * (1 / bin)) == samples.Key).ToList();
            Assert.Equal(samples.Min(p => p.Value), here.Min(p => p.Value));
            Assert.Equal(samples.Max(p => p.Value), here.Max(p => p.Value));
            Assert.Equal(samples.First(), here[0]);
            Assert.Equal(samples.Last(), here[^1]);
        }
    });

    [Fact]
    public void Points_are_samples_in_their_order() => Curves.Sample((values, bin) =>
    {
        var kept = Thin(values, bin).SelectMany(l => l).ToList();
        Assert.All(kept, p => Assert.Equal(values[(int)p.Depth], p.Value));
        Assert.True(kept.Zip(kept.Skip(1)).All(p => p.First.Depth < p.Second.Depth));
    });

    [Fact]
    public void A_line_breaks_exactly_where_a_gap_lies_between_two_bins() => Curves.Sample((values, bin) =>
    {
        var breaks = Thin(values, bin).Skip(1).Select(l => l[0].Depth).ToList();
        var finite = Finite(values);
        var expected = finite.Zip(finite.Skip(1))
            .Where(p => p.Second.Depth - p.First.Depth > 1 && Math.Floor(p.First.Depth * (1 / bin)) != Math.Floor(p.Second.Depth * (1 / bin)))
            .Select(p => p.Second.Depth);
        Assert.Equal(expected, breaks);
    });

    [Fact]
    public void No_bin_leaves_more_than_four_points() => Curves.Sample((values, bin) =>
    {
        var lines = Thin(values, bin);
        Assert.All(lines, l => Assert.NotEmpty(l));
        Assert.All(lines.SelectMany(l => l).GroupBy(p => Math.Floor(p.Depth * (1 / bin))), b => Assert.True(b.Count() <= 4));
    });

    [Fact]
    public void A_curve_with_fewer_samples_than_bins_is_kept_whole() => Curves.Sample((values, _) =>
        Assert.Equal(Finite(values), Thin(values, 0.5).SelectMany(l => l)));

    private static IReadOnlyList<IReadOnlyList<LogPoint>> Thin(double[] values, double bin)
    {
        var decimator = new Decimator(0, bin);
        for (var i = 0; i < values.Length; i++) decimator.Add(i, values[i]);
        return decimator.Lines();
    }

    private static List<LogPoint> Finite(double[] values) =>
        [.. values.Select((v, i) => new LogPoint(i, v)).Where(p => double.IsFinite(p.Value))];
}
