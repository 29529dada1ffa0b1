using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>Cuts stretches into parts of nearly equal true vertical thickness. A single sample is never cut.</summary>
internal static class EqualCut
{
    /// <summary>How many numbers of equal parts are tried.</summary>
    private const int Tries = 3;

    /// <summary>The fewest nearly equal parts that are not too thick.</summary>
    public static List<LayerBounds> AtMost(EarthModel model, SampleCells cells, IEnumerable<LayerBounds> stretches, ThicknessLimits limits) =>
        [.. stretches.SelectMany(s => AtMost(model, cells, s, limits))];

    /// <summary>A wanted number of layers, the thickest of them as thin as can be; null when there is no such cut, which is then reported.</summary>
    public static List<LayerBounds>? Counted(EarthModel model, SampleCells cells, List<LayerBounds> stretches, LayerSettings settings, DiagnosticBag diagnostics)
    {
        var (count, limits) = ((int)settings.Count.Value, settings.Limits);
        if (!WantedCount.CoversStretches(stretches.Count, settings, diagnostics)) return null;
        var parts = Enumerable.Repeat(1, stretches.Count).ToArray();
        var samples = stretches.Select(s => Enumerable.Range(s.Start, s.End - s.Start).Count(i => model.Usable[i])).ToArray();
        double Share(int s) => parts[s] < samples[s] ? stretches[s].Thickness(cells) / parts[s] : -1;
        for (var n = stretches.Count; n < count; n++)
        {
            var thickest = Enumerable.Range(0, parts.Length).MaxBy(Share);
            if (Share(thickest) < 0)
            {
                WantedCount.TooMany(settings, samples.Sum(), "the samples", diagnostics);
                return null;
            }

            parts[thickest]++;
        }

        var cut = stretches.SelectMany((s, k) => Shares(model, cells, s, parts[k])).ToList();
        if (cut.Count < count) WantedCount.TooMany(settings, cut.Count, "samples this far apart", diagnostics);
        else if (cut.Exists(b => !limits.IsThickEnough(b.Thickness(cells)) && !stretches.Contains(b))) WantedCount.Breaks(settings, "thinner than min_thickness", "fewer", diagnostics);
        else if (cut.Exists(b => !limits.IsThinEnough(b.Thickness(cells)) && b.End - b.Start > 1)) WantedCount.Breaks(settings, "thicker than max_thickness", "more", diagnostics);
        else return cut;
        return null;
    }

    private static List<LayerBounds> AtMost(EarthModel model, SampleCells cells, LayerBounds whole, ThicknessLimits limits)
    {
        if (double.IsInfinity(limits.Most)) return [whole];
        var fewest = (int)Math.Clamp(Math.Ceiling(whole.Thickness(cells) / limits.Most * (1 - 1e-9)), 1, int.MaxValue - Tries);
        for (var parts = fewest; parts < fewest + Tries; parts++)
        {
            var cut = Shares(model, cells, whole, parts);
            if (cut.TrueForAll(b => b.End - b.Start == 1 || limits.IsThinEnough(b.Thickness(cells)))) return cut;
        }

        return Fullest(model, cells, whole, limits);
    }

    /// <summary>Nearly equal parts; cuts lie between samples, so a part may differ from its share by one sample's cell.</summary>
    private static List<LayerBounds> Shares(EarthModel model, SampleCells cells, LayerBounds whole, int parts)
    {
        var (top, share) = (cells.Top(whole.Start), whole.Thickness(cells) / parts);
        return Cut(model, whole, (from, i) => Math.Floor((cells.Middle(i) - top) / share) > Math.Floor((cells.Middle(from) - top) / share));
    }

    /// <summary>Parts as thick as allowed, for samples too far apart for equal shares.</summary>
    private static List<LayerBounds> Fullest(EarthModel model, SampleCells cells, LayerBounds whole, ThicknessLimits limits) =>
        Cut(model, whole, (from, i) => !limits.IsThinEnough(cells.Base(i) - cells.Top(from)));

    private static List<LayerBounds> Cut(EarthModel model, LayerBounds whole, Func<int, int, bool> startsAnother)
    {
        var cuts = new List<int>();
        var from = whole.Start;
        for (var i = whole.Start + 1; i < whole.End; i++)
        {
            if (!model.Usable[i] || !startsAnother(from, i)) continue;
            cuts.Add(i);
            from = i;
        }

        return whole.CutAt(model, cuts);
    }
}
