using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>Averages the profile over layers.</summary>
public static class LayerBuilder
{
    private static readonly Property[] Averaged =
    [
        Property.Density, Property.YoungsStatic, Property.PoissonStatic, Property.Biot, Property.Porosity, Property.ShaleVolume,
        Property.Ucs, Property.FrictionAngle, Property.TensileStrength, Property.YoungsDynamic, Property.PoissonDynamic,
    ];

    private static readonly Property[] Profiled =
        [Property.PorePressure, Property.VerticalStress, Property.MinHorizontalStress, Property.MaxHorizontalStress];

    /// <summary>Makes the layer table of a model.</summary>
    public static LayerTable Build(EarthModel model, LayerSettings settings)
    {
        ArgumentNullException.ThrowIfNull(model);
        var bounds = LayerBounds.Of(model, settings);
        var edges = Edges(model, bounds);
        var weights = Weights(model, bounds, edges);
        var layers = bounds.Select((b, k) => Make(model, k, b, edges[k], weights)).ToList();
        return new LayerTable([.. layers.Select((layer, k) => layer with
        {
            ContrastAbove = Contrast(layers, k, k - 1),
            ContrastBelow = Contrast(layers, k, k + 1),
        })]);
    }

    /// <summary>
    /// Tops and bases in true vertical depth: halfway between the samples of layers that touch, on the outer samples elsewhere.
    /// </summary>
    private static (double Top, double Base)[] Edges(EarthModel model, IReadOnlyList<LayerBounds> bounds)
    {
        var tvd = model.Values.Read(Property.TrueVerticalDepth);
        var edges = new (double Top, double Base)[bounds.Count];
        for (var k = 0; k < edges.Length; k++)
        {
            edges[k].Top = k > 0 && bounds[k - 1].End == bounds[k].Start ? edges[k - 1].Base : tvd[bounds[k].Start];
            var last = bounds[k].End - 1;
            edges[k].Base = k + 1 < edges.Length && bounds[k + 1].Start == bounds[k].End ? 0.5 * (tvd[last] + tvd[last + 1]) : tvd[last];
        }

        return edges;
    }

    /// <summary>The true vertical thickness each usable sample stands for, m: halfway to its neighbours, within its layer.</summary>
    private static double[] Weights(EarthModel model, IReadOnlyList<LayerBounds> bounds, (double Top, double Base)[] edges)
    {
        var tvd = model.Values.Read(Property.TrueVerticalDepth);
        var weights = new double[model.Count];
        for (var k = 0; k < bounds.Count; k++)
        {
            var previous = -1;
            var top = edges[k].Top;
            for (var i = bounds[k].Start; i < bounds[k].End; i++)
            {
                if (!model.Usable[i]) continue;
                if (previous >= 0)
                {
                    var middle = 0.5 * (tvd[previous] + tvd[i]);
                    weights[previous] = middle - top;
                    top = middle;
                }

                previous = i;
            }

            if (previous >= 0) weights[previous] = edges[k].Base - top;
        }

        return weights;
    }

    private static Layer Make(EarthModel model, int number, LayerBounds bounds, (double Top, double Base) edge, double[] weights)
    {
        var md = model.Values.Read(Property.MeasuredDepth);
        var weight = weights.AsSpan(bounds.Start, bounds.End - bounds.Start);
        return new Layer
        {
            Number = number + 1,
            TopMd = AtEdge(model, edge.Top, md[bounds.Start]),
            BaseMd = AtEdge(model, edge.Base, md[bounds.End - 1]),
            TopTvd = edge.Top,
            BaseTvd = edge.Base,
            Zone = model.ZoneName(bounds.Zone),
            Lithology = model.LithologyName(MostOf(model, bounds, weights)),
            Samples = Enumerable.Range(bounds.Start, bounds.End - bounds.Start).Count(i => model.Usable[i]),
            NotMeasured = NotMeasured(model, bounds, weights),
            Means = Averaged.Where(model.Values.Has).ToDictionary(p => p, p => Mean(Column(model, p, bounds), weights.AsSpan(bounds.Start))),
            Profiles = Profiled.Where(model.Values.Has).ToDictionary(p => p, p => Profile(Column(model, p, bounds), weights.AsSpan(bounds.Start))),
        };
    }

    /// <summary>Measured depth of an edge that lies at or next to a sample.</summary>
    private static double AtEdge(EarthModel model, double tvd, double sampleMd)
    {
        var md = model.Setup.Trajectory.MeasuredDepthAt(tvd);
        return double.IsNaN(md) ? sampleMd : md;
    }

    private static ReadOnlySpan<double> Column(EarthModel model, Property property, LayerBounds bounds) =>
        model.Values.Read(property)[bounds.Start..bounds.End];

    private static double Mean(ReadOnlySpan<double> values, ReadOnlySpan<double> weights)
    {
        double sum = 0, total = 0;
        for (var i = 0; i < values.Length; i++)
        {
            if (double.IsNaN(values[i])) continue;
            sum += weights[i] * values[i];
            total += weights[i];
        }

        return total > 0 ? sum / total : double.NaN;
    }

    private static LayerProfile Profile(ReadOnlySpan<double> values, ReadOnlySpan<double> weights)
    {
        int first = 0, last = values.Length - 1;
        while (first < values.Length && double.IsNaN(values[first])) first++;
        while (last >= 0 && double.IsNaN(values[last])) last--;
        return last < 0 ? LayerProfile.None : new LayerProfile(values[first], values[last], Mean(values, weights));
    }

    private static int MostOf(EarthModel model, LayerBounds bounds, double[] weights)
    {
        var thickness = new double[model.Setup.Lithologies.Count + 1];
        for (var i = bounds.Start; i < bounds.End; i++) thickness[model.Lithologies[i] + 1] += weights[i];
        return Array.IndexOf(thickness, thickness.Max()) - 1;
    }

    private static double NotMeasured(EarthModel model, LayerBounds bounds, double[] weights)
    {
        double other = 0, total = 0;
        for (var i = bounds.Start; i < bounds.End; i++)
        {
            total += weights[i];
            if (model.StressBasis[i] is not (SampleOrigin.Measured or SampleOrigin.Spliced)) other += weights[i];
        }

        return total > 0 ? other / total : double.NaN;
    }

    private static double Contrast(List<Layer> layers, int from, int to) =>
        to < 0 || to >= layers.Count
            ? double.NaN
            : layers[to].Profile(Property.MinHorizontalStress).Mean - layers[from].Profile(Property.MinHorizontalStress).Mean;
}
