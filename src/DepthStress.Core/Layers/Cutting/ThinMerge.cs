using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>
/// Joins layers that are too thin to the touching neighbour that differs less: by the distance of their means, each curve in
/// units of its scatter over the whole profile, trends taken off first. The zone of the thicker one stays.
/// </summary>
internal static class ThinMerge
{
    /// <summary>Merges from the thinnest on until none is too thin, or what is has no neighbour: layers never join across a boundary of the user's own, nor beyond the greatest thickness.</summary>
    public static void Apply(
        EarthModel model, SampleCells cells, List<LayerBounds> layers, IReadOnlyList<int> own, IReadOnlyList<CutCurveChoice> curves, ThicknessLimits limits, List<Finding> findings)
    {
        var weights = Enumerable.Range(0, model.Count).Select(cells.Thickness).ToArray();
        var values = curves.Select(c => Standard(model, weights, c)).ToArray();
        var merged = 0;
        bool Joins(int upper) => upper >= 0 && upper + 1 < layers.Count
            && layers[upper].Touches(layers[upper + 1], cells) && !own.Contains(layers[upper + 1].Start)
            && limits.IsThinEnough(layers[upper].Thickness(cells) + layers[upper + 1].Thickness(cells));
        double Contrast(int upper) => Joins(upper) ? Distance(values, weights, layers[upper], layers[upper + 1]) : double.PositiveInfinity;
        while (true)
        {
            var thin = Enumerable.Range(0, layers.Count)
                .Where(k => !limits.IsThickEnough(layers[k].Thickness(cells)) && (Joins(k - 1) || Joins(k)))
                .Cast<int?>().MinBy(k => layers[k!.Value].Thickness(cells));
            if (thin is not { } at) break;
            var upper = !Joins(at) || (Joins(at - 1) && Contrast(at - 1) <= Contrast(at)) ? at - 1 : at;
            var (above, below) = (layers[upper], layers[upper + 1]);
            layers[upper] = new LayerBounds(above.Start, below.End, above.Thickness(cells) >= below.Thickness(cells) ? above.Zone : below.Zone);
            layers.RemoveAt(upper + 1);
            merged++;
        }

        if (merged > 0) findings.Add(Finding.General(Severity.Note, $"[layers]: {merged} layers too thin to stand alone joined the neighbour that differs less"));
    }

    /// <summary>A curve in units of its scatter over the whole profile, without its trend; all zero when it has no scatter.</summary>
    private static double[] Standard(EarthModel model, double[] weights, CutCurveChoice choice)
    {
        var values = model.Values.Read(choice.Property).ToArray();
        var (w, _, y) = Centred.Of(model.Values.Read(Property.TrueVerticalDepth), new CutCurve(values, weights, choice.Trend));
        double squares = 0, total = 0;
        for (var i = 0; i < y.Length; i++)
        {
            squares += w[i] * y[i] * y[i];
            total += w[i];
        }

        var scatter = total > 0 ? Math.Sqrt(squares / total) : 0;
        return [.. y.Select((v, i) => double.IsNaN(values[i]) ? double.NaN : scatter > 0 ? v / scatter : 0)];
    }

    /// <summary>Distance of two layers' means; greatest of all finite numbers when no curve has values in both.</summary>
    private static double Distance(double[][] values, double[] weights, LayerBounds a, LayerBounds b)
    {
        var steps = values.Select(v => Mean(v, weights, a) - Mean(v, weights, b)).Where(d => !double.IsNaN(d)).ToList();
        return steps.Count > 0 ? Math.Sqrt(steps.Sum(d => d * d)) : double.MaxValue;
    }

    private static double Mean(double[] values, double[] weights, LayerBounds layer) =>
        LayerBuilder.Mean(values.AsSpan(layer.Start, layer.End - layer.Start), weights.AsSpan(layer.Start));
}
