using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>A layer's samples [Start, End) and zone; the first and the last of them are usable.</summary>
/// <param name="Start">First sample.</param>
/// <param name="End">One past the last sample.</param>
/// <param name="Zone">Index of the zone, or -1.</param>
internal readonly record struct LayerBounds(int Start, int End, short Zone)
{
    /// <summary>Room for rounding when a thickness is compared with the greatest one allowed.</summary>
    private const double Slack = 1e-9;

    /// <summary>
    /// Cuts the samples that enter layers into one layer per zone, or one in all when there are no zones, each split into nearly
    /// equal parts of true vertical thickness where it is thicker than allowed. A single sample is never split.
    /// </summary>
    public static IReadOnlyList<LayerBounds> Of(EarthModel model, SampleCells cells, LayerSettings settings)
    {
        var bounds = new List<LayerBounds>();
        for (var start = 0; start < model.Count;)
        {
            var zone = model.Zones[start];
            var end = start + 1;
            while (end < model.Count && model.Zones[end] == zone) end++;
            if (zone >= 0 || model.Setup.Zones.Count == 0) Split(model, cells, settings, new LayerBounds(start, end, zone).Trimmed(model), bounds);
            start = end;
        }

        return bounds;
    }

    private static void Split(EarthModel model, SampleCells cells, LayerSettings settings, LayerBounds whole, List<LayerBounds> bounds)
    {
        if (whole.Start == whole.End) return;
        if (!settings.MaxThickness.IsSet)
        {
            bounds.Add(whole);
            return;
        }

        var (thickness, most) = (whole.Thickness(cells), settings.MaxThickness.Value);
        var cut = whole.Cut(model, cells, Parts(thickness, most));
        if (cut.Exists(b => b.Thickness(cells) > most * (1 + Slack)))
        {
            // Cuts lie between samples: a part may be thicker than an equal share by one sample's cell.
            var cell = Enumerable.Range(whole.Start, whole.End - whole.Start).Max(cells.Thickness);
            cut = whole.Cut(model, cells, most > cell ? Parts(thickness, most - cell) : whole.End - whole.Start);
        }

        bounds.AddRange(cut);
    }

    private static int Parts(double thickness, double most) =>
        (int)Math.Clamp(Math.Ceiling(thickness / most * (1 - Slack)), 1, int.MaxValue);

    private double Thickness(SampleCells cells) => cells.Base(End - 1) - cells.Top(Start);

    private List<LayerBounds> Cut(EarthModel model, SampleCells cells, int parts)
    {
        var (top, share) = (cells.Top(Start), Thickness(cells) / parts);
        var cut = new List<LayerBounds>();
        var (from, limit) = (Start, 1);
        for (var i = Start + 1; i < End; i++)
        {
            if (!model.Usable[i] || cells.Middle(i) < top + (limit * share)) continue;
            cut.Add(new LayerBounds(from, i, Zone).Trimmed(model));
            from = i;
            limit = Math.Max(limit + 1, (int)((cells.Middle(i) - top) / share) + 1);
        }

        cut.Add(new LayerBounds(from, End, Zone));
        return cut;
    }

    private LayerBounds Trimmed(EarthModel model)
    {
        var (start, end) = (Start, End);
        while (start < end && !model.Usable[start]) start++;
        while (end > start && !model.Usable[end - 1]) end--;
        return this with { Start = start, End = end };
    }
}
