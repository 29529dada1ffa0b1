using DepthStress.Core.Model;

namespace DepthStress.Report.Drawing;

/// <summary>The part of a zone that a picture shows.</summary>
/// <param name="Zone">Index of the zone.</param>
/// <param name="Name">Its name.</param>
/// <param name="Top">Depth of its first sample there.</param>
/// <param name="Base">Depth of the first sample below it, or of its last one.</param>
internal sealed record ZoneSpan(int Zone, string Name, double Top, double Base)
{
    /// <summary>The zones of a model in order of depth, depths as given.</summary>
    public static IReadOnlyList<ZoneSpan> Of(EarthModel model, ReadOnlySpan<double> depths)
    {
        var spans = new (double Top, double Base)[model.Setup.Zones.Count];
        Array.Fill(spans, (double.NaN, double.NaN));
        for (var i = 0; i < model.Count; i++)
        {
            var zone = model.Zones[i];
            if (zone == ZoneIndex.None || !double.IsFinite(depths[i])) continue;
            var end = i + 1 < model.Count && double.IsFinite(depths[i + 1]) ? depths[i + 1] : depths[i];
            var (low, high) = (Math.Min(depths[i], end), Math.Max(depths[i], end));
            ref var span = ref spans[zone];
            if (!(low >= span.Top)) span.Top = low;
            if (!(high <= span.Base)) span.Base = high;
        }

        return
        [
            .. spans.Select((s, zone) => new ZoneSpan(zone, PlainText.Clean(model.ZoneName(zone)), s.Top, s.Base))
                .Where(s => double.IsFinite(s.Top)).OrderBy(s => s.Top),
        ];
    }
}
