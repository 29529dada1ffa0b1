using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>A layer's samples [Start, End) and zone.</summary>
/// <param name="Start">First sample.</param>
/// <param name="End">One past the last sample.</param>
/// <param name="Zone">Index of the zone, or -1.</param>
public readonly record struct LayerBounds(int Start, int End, short Zone)
{
    /// <summary>
    /// Cuts the samples that enter layers into one layer per zone, or one in all when there are no zones, each split into
    /// equal parts of true vertical thickness where it is thicker than allowed.
    /// </summary>
    public static IReadOnlyList<LayerBounds> Of(EarthModel model, LayerSettings settings)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(settings);
        var bounds = new List<LayerBounds>();
        for (var start = 0; start < model.Count;)
        {
            var zone = model.Zones[start];
            var end = start + 1;
            while (end < model.Count && model.Zones[end] == zone) end++;
            if (zone >= 0 || model.Setup.Zones.Count == 0) Split(model, settings, Trim(model, start, end), zone, bounds);
            start = end;
        }

        return bounds;
    }

    private static (int Start, int End) Trim(EarthModel model, int start, int end)
    {
        while (start < end && !model.Usable[start]) start++;
        while (end > start && !model.Usable[end - 1]) end--;
        return (start, end);
    }

    private static void Split(EarthModel model, LayerSettings settings, (int Start, int End) range, short zone, List<LayerBounds> bounds)
    {
        var (start, end) = range;
        if (start == end) return;
        var tvd = model.Values.Read(Property.TrueVerticalDepth);
        var thickness = tvd[end - 1] - tvd[start];
        var parts = settings.MaxThickness.IsSet ? Math.Max(1, (int)Math.Ceiling(thickness / settings.MaxThickness.Value)) : 1;
        var from = start;
        for (var part = 1; part <= parts && from < end; part++)
        {
            var limit = tvd[start] + (thickness * part / parts);
            var to = from + 1;
            while (to < end && (part == parts || !model.Usable[to] || tvd[to] < limit)) to++;
            bounds.Add(new LayerBounds(from, to, zone));
            from = to;
        }
    }
}
