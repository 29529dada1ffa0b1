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

    /// <summary>How many numbers of equal parts are tried.</summary>
    private const int Tries = 3;

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

        var most = settings.MaxThickness.Value * (1 + Slack);
        var fewest = (int)Math.Clamp(Math.Ceiling(whole.Thickness(cells) / most), 1, int.MaxValue - Tries);
        for (var parts = fewest; parts < fewest + Tries; parts++)
        {
            var cut = whole.Shares(model, cells, parts);
            if (!cut.TrueForAll(b => b.End - b.Start == 1 || b.Thickness(cells) <= most)) continue;
            bounds.AddRange(cut);
            return;
        }

        bounds.AddRange(whole.Fullest(model, cells, most));
    }

    private double Thickness(SampleCells cells) => cells.Base(End - 1) - cells.Top(Start);

    /// <summary>Nearly equal parts; cuts lie between samples, so a part may differ from its share by one sample's cell.</summary>
    private List<LayerBounds> Shares(EarthModel model, SampleCells cells, int parts)
    {
        var (top, share) = (cells.Top(Start), Thickness(cells) / parts);
        return Cut(model, (from, i) => Math.Floor((cells.Middle(i) - top) / share) > Math.Floor((cells.Middle(from) - top) / share));
    }

    /// <summary>Parts as thick as allowed, for samples too far apart for equal shares.</summary>
    private List<LayerBounds> Fullest(EarthModel model, SampleCells cells, double most) =>
        Cut(model, (from, i) => cells.Base(i) - cells.Top(from) > most);

    private List<LayerBounds> Cut(EarthModel model, Func<int, int, bool> startsAnother)
    {
        var cut = new List<LayerBounds>();
        var from = Start;
        for (var i = Start + 1; i < End; i++)
        {
            if (!model.Usable[i] || !startsAnother(from, i)) continue;
            cut.Add(new LayerBounds(from, i, Zone).Trimmed(model));
            from = i;
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
