using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>Averages the profile over layers.</summary>
public static class LayerBuilder
{
    private static readonly Property[] Averaged =
    [
        Property.Density, Property.YoungsStatic, Property.PoissonStatic, Property.Biot, Property.Porosity, Property.ShaleVolume,
        Property.Ucs, Property.FrictionAngle, Property.TensileStrength, Property.Toughness, Property.YoungsDynamic, Property.PoissonDynamic,
        Property.Temperature,
    ];

    private static readonly Property[] Profiled =
        [Property.PorePressure, Property.VerticalStress, Property.MinHorizontalStress, Property.MaxHorizontalStress];

    private static readonly Property[] Horizontal = [Property.MinHorizontalStress, Property.MaxHorizontalStress];

    /// <summary>Makes the layer table of a model.</summary>
    /// <param name="model">The model.</param>
    /// <param name="settings">How it is cut, already checked by <see cref="LayerCheck"/>.</param>
    /// <param name="diagnostics">Gets what makes the cut impossible.</param>
    /// <returns>The table, or null when there is none; the reason is then among the diagnostics.</returns>
    public static LayerTable? Build(EarthModel model, LayerSettings settings, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var cells = new SampleCells(model);
        var findings = new List<Finding>();
        if (LayerCutter.Of(model, cells, settings, diagnostics, findings) is not { } bounds) return null;
        var weights = new double[model.Count];
        for (var i = 0; i < weights.Length; i++) weights[i] = cells.Thickness(i);
        var strains = FarField.Of(model, weights);
        var layers = bounds.Select((b, k) => Make(model, k, b, cells, weights) with { Medium = LayerMedium.Of(model, b, weights, strains) }).ToList();
        if (!MissingShare.Accepts(layers, settings.LargestMissingShare, diagnostics)) return null;
        var (surface, contrast) = (model.Setup.Frame.SurfaceTvd, settings.BarrierContrast.Value);
        return new LayerTable([.. layers.Select((layer, k) => layer with
        {
            ContrastAbove = Contrast(layers, k, k - 1),
            ContrastBelow = Contrast(layers, k, k + 1),
            BarrierAbove = StressTarget.BarrierThickness(layers, k, -1, surface, contrast),
            BarrierBelow = StressTarget.BarrierThickness(layers, k, 1, surface, contrast),
        })])
        {
            Findings = [.. findings, .. MediumFindings.Of(layers)],
            Strains = strains,
        };
    }

    private static Layer Make(EarthModel model, int number, LayerBounds bounds, SampleCells cells, double[] weights)
    {
        var md = model.Values.Read(Property.MeasuredDepth);
        var (top, bottom) = (cells.Top(bounds.Start), cells.Base(bounds.End - 1));
        return new Layer
        {
            Number = number + 1,
            TopMd = AtEdge(model, top, md[bounds.Start]),
            BaseMd = AtEdge(model, bottom, md[bounds.End - 1]),
            TopTvd = top,
            BaseTvd = bottom,
            Zone = model.ZoneName(bounds.Zone),
            Lithology = model.LithologyName(MostOf(model, bounds, weights)),
            Samples = Enumerable.Range(bounds.Start, bounds.End - bounds.Start).Count(i => model.Usable[i]),
            NotMeasured = NotMeasured(model, bounds, weights),
            Missing = MissingShare.Of(model, bounds, weights),
            Misfits = Horizontal.Where(model.Values.Has).ToDictionary(p => p, p => StressMisfit.Of(Column(model, Property.TrueVerticalDepth, bounds), Column(model, p, bounds), weights.AsSpan(bounds.Start))),
            LeastUcs = model.Values.Has(Property.Ucs) ? Least(Column(model, Property.Ucs, bounds)) : double.NaN,
            Means = Averaged.Where(model.Values.Has).ToDictionary(p => p, p => Mean(Column(model, p, bounds), weights.AsSpan(bounds.Start))),
            Profiles = Profiled.Where(model.Values.Has).ToDictionary(p => p, p => Profile(Column(model, p, bounds), weights.AsSpan(bounds.Start), Column(model, Property.TrueVerticalDepth, bounds))),
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

    /// <summary>Weighted mean of the values that are there; NaN when none is.</summary>
    internal static double Mean(ReadOnlySpan<double> values, ReadOnlySpan<double> weights)
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

    private static double Least(ReadOnlySpan<double> values)
    {
        var least = double.NaN;
        foreach (var value in values)
        {
            if (!(value >= least)) least = double.IsNaN(value) ? least : value;
        }

        return least;
    }

    private static LayerProfile Profile(ReadOnlySpan<double> values, ReadOnlySpan<double> weights, ReadOnlySpan<double> tvd)
    {
        int first = 0, last = values.Length - 1;
        while (first < values.Length && double.IsNaN(values[first])) first++;
        while (last >= 0 && double.IsNaN(values[last])) last--;
        return last < 0 ? LayerProfile.None : new LayerProfile(values[first], values[last], Mean(values, weights), Depth(values, weights, tvd));
    }

    private static double Depth(ReadOnlySpan<double> values, ReadOnlySpan<double> weights, ReadOnlySpan<double> tvd)
    {
        var depths = tvd.ToArray();
        for (var i = 0; i < depths.Length; i++)
        {
            if (double.IsNaN(values[i])) depths[i] = double.NaN;
        }

        return Mean(depths, weights);
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
        var shmin = model.Values.Read(Property.MinHorizontalStress);
        for (var i = bounds.Start; i < bounds.End; i++)
        {
            total += weights[i];
            if (double.IsNaN(shmin[i]) || model.StressBasis[i] is not (SampleOrigin.Measured or SampleOrigin.Spliced)) other += weights[i];
        }

        return total > 0 ? other / total : double.NaN;
    }

    private static double Contrast(List<Layer> layers, int from, int to) =>
        to < 0 || to >= layers.Count
            ? double.NaN
            : layers[to].Profile(Property.MinHorizontalStress).Mean - layers[from].Profile(Property.MinHorizontalStress).Mean;
}
