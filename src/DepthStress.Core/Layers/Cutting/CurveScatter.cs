using MathNet.Numerics.Statistics;

namespace DepthStress.Core.Layers;

/// <summary>
/// How much a curve scatters between independent samples where nothing changes: from the steps between neighbouring means over
/// the thickness that the tools resolve. Their median size stands for it, so that the steps at boundaries do not count.
/// </summary>
internal static class CurveScatter
{
    /// <summary>Median absolute value to standard deviation for normal errors: 1 / 0.6745 (Hampel 1974, J. Am. Stat. Assoc. 69, 383-393).</summary>
    private const double NormalScale = 1.4826;

    /// <summary>Scatter below this share of the largest value is rounding.</summary>
    private const double Rounding = 1e-6;

    /// <summary>Divides every curve by its scatter; one that does not scatter at all is worth nothing.</summary>
    public static List<CutStretch> Standardised(IReadOnlyList<CutStretch> stretches, double resolution)
    {
        var curves = stretches.Count == 0 ? 0 : stretches[0].Curves.Count;
        var scatter = Enumerable.Range(0, curves).Select(c => Of(stretches, c, resolution)).ToArray();
        return [.. stretches.Select(s => s with { Curves = [.. s.Curves.Select((curve, c) => Divided(curve, scatter[c]))] })];
    }

    /// <summary>Standard deviation of one curve between independent samples; zero when it has none.</summary>
    public static double Of(IReadOnlyList<CutStretch> stretches, int curve, double resolution)
    {
        var steps = stretches.SelectMany(s => Steps(s.Edges, s.Curves[curve], resolution)).ToArray();
        var largest = stretches.SelectMany(s => s.Curves[curve].Values).Where(v => !double.IsNaN(v)).Select(Math.Abs).DefaultIfEmpty(0).Max();
        if (steps.Length == 0) return 0;
        var usual = NormalScale * steps.Select(Math.Abs).Median();
        if (usual > Rounding * largest) return usual;
        var all = Math.Sqrt(steps.Sum(s => s * s) / steps.Length);
        return all > Rounding * largest ? all : 0;
    }

    private static CutCurve Divided(CutCurve curve, double scatter) => scatter > 0
        ? curve with { Values = [.. curve.Values.Select(v => v / scatter)] }
        : curve with { Weights = new double[curve.Weights.Length] };

    /// <summary>
    /// Steps between the means of neighbouring groups of cells, each at least as thick as the tools resolve, in terms of what a
    /// sample of weight one scatters: means of weights v and w differ by that times sqrt(1/v + 1/w).
    /// </summary>
    private static IEnumerable<double> Steps(double[] edges, CutCurve curve, double resolution)
    {
        var (previous, before) = (double.NaN, double.NaN);
        for (var from = 0; from < curve.Values.Length;)
        {
            double sum = 0, weight = 0;
            var to = from;
            for (; to < curve.Values.Length && edges[to] - edges[from] < resolution * (1 - 1e-9); to++)
            {
                if (double.IsNaN(curve.Values[to])) continue;
                sum += curve.Weights[to] * curve.Values[to];
                weight += curve.Weights[to];
            }

            var mean = weight > 0 ? sum / weight : double.NaN;
            if (!double.IsNaN(mean - previous)) yield return (mean - previous) / Math.Sqrt((1 / weight) + (1 / before));
            (previous, before, from) = (mean, weight, to);
        }
    }
}
