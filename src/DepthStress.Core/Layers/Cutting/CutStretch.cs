using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>A stretch between fixed boundaries as cells of one or several usable samples.</summary>
/// <param name="Bounds">Its samples.</param>
/// <param name="First">The first sample of each cell.</param>
/// <param name="Edges">True vertical depths of the edges of the cells, one more than cells, m.</param>
/// <param name="Curves">The curves, averaged over the cells.</param>
internal sealed record CutStretch(LayerBounds Bounds, int[] First, double[] Edges, IReadOnlyList<CutCurve> Curves)
{
    /// <summary>True vertical thickness, m.</summary>
    public double Thickness => Edges[^1] - Edges[0];

    /// <summary>Below this share of the greatest depth the scatter of a stress shrinks no further.</summary>
    private const double Shallow = 0.1;

    /// <summary>
    /// Makes the cells: a sample is worth its thickness in terms of what the tools resolve, but never more than one. Stresses and
    /// pressures scatter in proportion to their depth below the ground or sea surface, so that a deep sample of theirs is worth less.
    /// </summary>
    public static CutStretch Of(EarthModel model, SampleCells cells, LayerBounds bounds, IReadOnlyList<CutCurveChoice> curves, double resolution, int group)
    {
        var samples = Enumerable.Range(bounds.Start, bounds.End - bounds.Start).Where(i => model.Usable[i]).ToArray();
        var first = samples.Where((_, k) => k % group == 0).ToArray();
        var worth = samples.Select(i => Math.Min(1, cells.Thickness(i) / resolution)).ToArray();
        var surface = model.Setup.Frame.SurfaceTvd;
        var deepest = cells.Base(Array.LastIndexOf(model.Usable, true)) - surface;
        double Scale(int i) => deepest > 0 ? Math.Max(Shallow, (cells.Middle(i) - surface) / deepest) : 1;
        var deep = samples.Select((i, k) => worth[k] / (Scale(i) * Scale(i))).ToArray();
        return new CutStretch(
            bounds,
            first,
            [.. first.Select(cells.Top), cells.Base(bounds.End - 1)],
            [.. curves.Select(c => Averaged(model.Values.Read(c.Property), samples, c.Trend ? deep : worth, group, c.Trend))]);
    }

    /// <summary>The costs of its segments.</summary>
    public SegmentCosts Costs()
    {
        var middles = new double[First.Length];
        for (var k = 0; k < middles.Length; k++) middles[k] = 0.5 * (Edges[k] + Edges[k + 1]);
        return new SegmentCosts(middles, Curves);
    }

    /// <summary>The layers of segments that end before the given cells.</summary>
    public IEnumerable<LayerBounds> Layers(EarthModel model, int[] ends) => Bounds.CutAt(model, ends[..^1].Select(e => First[e]));

    private static CutCurve Averaged(ReadOnlySpan<double> values, int[] samples, double[] worth, int group, bool trend)
    {
        var count = (samples.Length + group - 1) / group;
        var (mean, weight) = (new double[count], new double[count]);
        for (var k = 0; k < samples.Length; k++)
        {
            var value = values[samples[k]];
            if (double.IsNaN(value)) continue;
            mean[k / group] += worth[k] * value;
            weight[k / group] += worth[k];
        }

        for (var c = 0; c < count; c++) mean[c] = weight[c] > 0 ? mean[c] / weight[c] : double.NaN;
        return new CutCurve(mean, weight, trend);
    }
}
