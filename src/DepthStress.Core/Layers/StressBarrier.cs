using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>Neighbouring layers whose Shmin exceeds what a target zone's mean gradient would give at their depth.</summary>
/// <param name="Zones">Names of the zones it lies in, from top to bottom.</param>
/// <param name="TopMd">Measured depth of its top, m.</param>
/// <param name="BaseMd">Measured depth of its base, m.</param>
/// <param name="Thickness">True vertical thickness, m.</param>
/// <param name="Distance">True vertical distance from the target to it, m.</param>
/// <param name="Contrast">Its mean Shmin minus the target's at equal depth, Pa.</param>
/// <param name="NotMeasured">Share of its thickness whose stress does not rest on measured logs alone, 0 to 1.</param>
public sealed record StressBarrier(
    IReadOnlyList<string> Zones, double TopMd, double BaseMd, double Thickness, double Distance, double Contrast, double NotMeasured);

/// <summary>A target zone with the nearest stress barriers around it.</summary>
/// <param name="Zone">The target's name.</param>
/// <param name="Shmin">Its mean Shmin over true vertical thickness, Pa; NaN when it has none.</param>
/// <param name="Above">The nearest barrier above, or null.</param>
/// <param name="Below">The nearest barrier below, or null.</param>
public sealed record StressTarget(string Zone, double Shmin, StressBarrier? Above, StressBarrier? Below)
{
    /// <summary>Edges of layers this close are one, m.</summary>
    private const double SameEdge = 1e-6;

    /// <summary>True when rock of unknown Shmin comes before any barrier above.</summary>
    public bool AboveUnknown { get; private init; }

    /// <summary>True when rock of unknown Shmin comes before any barrier below.</summary>
    public bool BelowUnknown { get; private init; }

    /// <summary>
    /// Finds the barriers of every target zone: going away from the target, the first layer whose mean Shmin exceeds the
    /// target's at equal depth by the wanted contrast, together with the layers behind it that do so too. "At equal depth"
    /// takes the target's mean Shmin gradient below the ground or sea surface, so that depth alone makes no barrier. A layer
    /// without stress or a part of the log that lies in no layer ends the search: nobody knows what it holds.
    /// </summary>
    public static IReadOnlyList<StressTarget> Find(EarthModel model, LayerTable table, LayerSettings settings)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(settings);
        return [.. model.Setup.Zones.Where(z => z.Target).Select(z => Find(z.Name, model, table.Layers, settings.BarrierContrast.Value))];
    }

    /// <summary>True vertical thickness of the nearest barrier above (step -1) or below (step 1) a single layer, m; NaN when there is none or nobody knows.</summary>
    internal static double BarrierThickness(IReadOnlyList<Layer> layers, int layer, int step, double surface, double least)
    {
        double Below(Layer l) => l.Profile(Property.MinHorizontalStress).Depth - surface;
        var gradient = Least(layers[layer]) / Below(layers[layer]);
        return Nearest(layers, layer, step, l => Least(l) - (gradient * Below(l)), least, out _)?.Thickness ?? double.NaN;
    }

    private static StressTarget Find(string name, EarthModel model, IReadOnlyList<Layer> layers, double least)
    {
        var inside = Enumerable.Range(0, layers.Count).Where(k => layers[k].Zone == name).ToList();
        var shmin = Mean(inside.Select(k => layers[k]), Least);
        if (double.IsNaN(shmin)) return new StressTarget(name, double.NaN, null, null);
        var surface = model.Setup.Frame.SurfaceTvd;
        double Below(Layer layer) => layer.Profile(Property.MinHorizontalStress).Depth - surface;
        var gradient = Mean(inside.Select(k => layers[k]), l => Least(l) / Below(l));
        double Contrast(Layer layer) => Least(layer) - (gradient * Below(layer));
        var above = Nearest(layers, inside[0], -1, Contrast, least, out var aboveUnknown);
        var below = Nearest(layers, inside[^1], 1, Contrast, least, out var belowUnknown);
        var first = Array.IndexOf(model.Usable, true);
        var last = Array.LastIndexOf(model.Usable, true);
        var tvd = model.Values.Read(Property.TrueVerticalDepth);
        return new StressTarget(name, shmin, above, below)
        {
            AboveUnknown = above is null && (aboveUnknown || layers[0].TopTvd > tvd[first] + SameEdge),
            BelowUnknown = below is null && (belowUnknown || layers[^1].BaseTvd < tvd[last] - SameEdge),
        };
    }

    /// <summary>Walks from a layer of the target to the nearest barrier; null when rock of unknown stress or the end of the layers comes first.</summary>
    private static StressBarrier? Nearest(
        IReadOnlyList<Layer> layers, int target, int step, Func<Layer, double> contrast, double least, out bool unknown)
    {
        bool Touches(int k)
        {
            var (upper, lower) = (Math.Min(k, k + step), Math.Max(k, k + step));
            return upper >= 0 && lower < layers.Count && Math.Abs(layers[lower].TopTvd - layers[upper].BaseTvd) <= SameEdge;
        }

        var at = target;
        while (Touches(at) && contrast(layers[at + step]) < least) at += step;
        unknown = at + step >= 0 && at + step < layers.Count;
        if (!Touches(at) || double.IsNaN(contrast(layers[at + step]))) return null;
        unknown = false;
        var first = at + step;
        var last = first;
        while (Touches(last) && contrast(layers[last + step]) >= least) last += step;

        var (top, bottom) = (Math.Min(first, last), Math.Max(first, last));
        var barrier = layers.Skip(top).Take(bottom - top + 1).ToList();
        return new StressBarrier(
            [.. barrier.Select(l => l.Zone).Distinct()],
            barrier[0].TopMd,
            barrier[^1].BaseMd,
            barrier.Sum(Thickness),
            Math.Abs(step < 0 ? layers[target].TopTvd - barrier[^1].BaseTvd : barrier[0].TopTvd - layers[target].BaseTvd),
            Mean(barrier, contrast),
            Mean(barrier, l => l.NotMeasured));
    }

    private static double Least(Layer layer) => layer.Profile(Property.MinHorizontalStress).Mean;

    private static double Thickness(Layer layer) => layer.BaseTvd - layer.TopTvd;

    /// <summary>Mean over thickness of the layers that have a value.</summary>
    private static double Mean(IEnumerable<Layer> layers, Func<Layer, double> value)
    {
        double sum = 0, total = 0;
        foreach (var layer in layers)
        {
            if (double.IsNaN(value(layer))) continue;
            sum += value(layer) * Thickness(layer);
            total += Thickness(layer);
        }

        return total > 0 ? sum / total : double.NaN;
    }
}
