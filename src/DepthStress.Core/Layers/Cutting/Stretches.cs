using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Layers;

/// <summary>The stretches between fixed boundaries: zones, or the whole when there are none, cut at the user's own boundaries.</summary>
internal static class Stretches
{
    /// <summary>The stretches from top to bottom, each with at least one usable sample. A zone without one is reported.</summary>
    public static List<LayerBounds> Of(EarthModel model, IReadOnlyList<int> own, List<Finding> findings)
    {
        var stretches = new List<LayerBounds>();
        var zones = new HashSet<short>();
        for (var start = 0; start < model.Count;)
        {
            var zone = model.Zones[start];
            var end = start + 1;
            while (end < model.Count && model.Zones[end] == zone) end++;
            var whole = new LayerBounds(start, end, zone).Trimmed(model);
            if (whole.Start < whole.End && (zone >= 0 || model.Setup.Zones.Count == 0))
            {
                zones.Add(zone);
                stretches.AddRange(whole.CutAt(model, own));
            }

            start = end;
        }

        for (short zone = 0; zone < model.Setup.Zones.Count; zone++)
        {
            if (!zones.Contains(zone)) findings.Add(Finding.General(Severity.Warning, $"zone {model.ZoneName(zone)} has no samples: it gives no layer"));
        }

        return stretches;
    }

    /// <summary>The first usable sample below each of the user's own boundaries, rising; a boundary that cuts nothing is an error.</summary>
    public static IReadOnlyList<int> Own(EarthModel model, LayerSettings settings, DiagnosticBag diagnostics)
    {
        if (!settings.Boundaries.IsSet) return [];
        var md = model.Values.Read(Core.Logs.Property.MeasuredDepth);
        var (first, last) = (Array.IndexOf(model.Usable, true), Array.LastIndexOf(model.Usable, true));
        var own = new SortedSet<int>();
        foreach (var depth in settings.Boundaries.Value)
        {
            var at = ZoneIndex.ToMeasured(model.Setup, depth, settings.DepthKind.Value);
            var below = first;
            while (below >= 0 && below <= last && (md[below] < at || !model.Usable[below])) below++;
            var lies = !double.IsNaN(at) && below > first && below <= last && (model.Zones[below] >= 0 || model.Setup.Zones.Count == 0);
            if (lies) own.Add(below);
            else diagnostics.Error(settings.Boundaries.Source.Position, UnitSystem.Metric.Show($"[layers]: found the boundary {Quantity.Length(depth)}, expected depths that the samples of a layer lie on both sides of"));
        }

        return [.. own];
    }
}
