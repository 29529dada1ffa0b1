using BenchmarkDotNet.Attributes;
using DepthStress.Core.Layers;

namespace DepthStress.Benchmarks;

/// <summary>Cutting two constant curves and one with a trend; without any change nothing can be pruned, which is the worst case.</summary>
[MemoryDiagnoser]
public class CutBenchmarks
{
    private const double Cell = 0.1524;
    private SegmentCosts _costs = null!;
    private double[] _edges = [];

    [Params(4_000, 15_000, 20_000)]
    public int Cells { get; set; }

    [Params(0, 12)]
    public int Changes { get; set; }

    [GlobalSetup]
    public void Setup()
    {
        var random = new Random(4);
        _edges = [.. Enumerable.Range(0, Cells + 1).Select(i => Cell * i)];
        double[] middles = [.. Enumerable.Range(0, Cells).Select(i => Cell * (i + 0.5))];
        double[] weights = [.. middles.Select(_ => Cell / 0.6)];
        CutCurve Make(bool trend) =>
            new([.. middles.Select((z, i) => (3 * random.NextDouble()) + (i * (Changes + 1) / Cells % 2 * 4) + (trend ? 0.02 * z : 0))], weights, trend);
        _costs = new SegmentCosts(middles, [Make(false), Make(false), Make(true)]);
    }

    /// <summary>As many segments as a penalty leaves: about five numbers of ln(n) each.</summary>
    [Benchmark]
    public int[]? Clearest() => ClearestCut.Of(_costs, _edges, 5 * Math.Log(Cells * Cell / 0.6), new ThicknessLimits(0.6, double.PositiveInfinity));

    /// <summary>Fifty segments; a run averages longer columns down to what takes a second or two.</summary>
    [Benchmark]
    public CountedCut Counted() => new(_costs, _edges, new ThicknessLimits(0.6, double.PositiveInfinity), Cells > 4_000 ? 1 : 50);
}
