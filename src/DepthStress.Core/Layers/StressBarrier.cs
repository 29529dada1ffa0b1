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
    /// <summary>
    /// Finds the barriers of every target zone: going away from the target, the first layer whose mean Shmin exceeds the
    /// target's at equal depth by the wanted contrast, together with the layers behind it that do so too. "At equal depth"
    /// takes the target's mean Shmin gradient below the ground or sea surface, so that depth alone makes no barrier. Layers
    /// without stress end the search: nobody knows what they hold.
    /// </summary>
    public static IReadOnlyList<StressTarget> Find(EarthModel model, LayerTable table, LayerSettings settings)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(settings);
        var targets = new List<StressTarget>();
        foreach (var zone in model.Setup.Zones.Where(z => z.Target))
        {
            var layers = table.Layers;
            var inside = Enumerable.Range(0, layers.Count).Where(k => layers[k].Zone == zone.Name).ToList();
            var surface = model.Setup.Frame.SurfaceTvd;
            var (shmin, gradient) = (Mean(inside.Select(k => layers[k]), Least), Mean(inside.Select(k => layers[k]), l => Least(l) / (Middle(l) - surface)));
            double Contrast(Layer layer) => Least(layer) - (gradient * (Middle(layer) - surface));
            targets.Add(double.IsNaN(shmin)
                ? new StressTarget(zone.Name, double.NaN, null, null)
                : new StressTarget(
                    zone.Name,
                    shmin,
                    Nearest(layers, inside[0] - 1, -1, Contrast, layers[inside[0]].TopTvd, settings),
                    Nearest(layers, inside[^1] + 1, 1, Contrast, layers[inside[^1]].BaseTvd, settings)));
        }

        return targets;
    }

    private static StressBarrier? Nearest(
        IReadOnlyList<Layer> layers, int start, int step, Func<Layer, double> contrast, double edge, LayerSettings settings)
    {
        bool Inside(int k) => k >= 0 && k < layers.Count;
        var least = settings.BarrierContrast.Value;
        var first = start;
        while (Inside(first) && contrast(layers[first]) < least) first += step;
        if (!Inside(first) || double.IsNaN(contrast(layers[first]))) return null;
        var last = first;
        while (Inside(last + step) && contrast(layers[last + step]) >= least) last += step;

        var (top, bottom) = (Math.Min(first, last), Math.Max(first, last));
        var barrier = layers.Skip(top).Take(bottom - top + 1).ToList();
        return new StressBarrier(
            [.. barrier.Select(l => l.Zone).Distinct()],
            barrier[0].TopMd,
            barrier[^1].BaseMd,
            barrier.Sum(Thickness),
            Math.Abs(edge - (step < 0 ? barrier[^1].BaseTvd : barrier[0].TopTvd)),
            Mean(barrier, contrast),
            Mean(barrier, l => l.NotMeasured));
    }

    private static double Least(Layer layer) => layer.Profile(Property.MinHorizontalStress).Mean;

    private static double Thickness(Layer layer) => layer.BaseTvd - layer.TopTvd;

    private static double Middle(Layer layer) => 0.5 * (layer.TopTvd + layer.BaseTvd);

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
