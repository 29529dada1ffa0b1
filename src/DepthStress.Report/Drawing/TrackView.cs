using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Drawing;

/// <summary>The strip of origins of one curve: its name and the origin in each row of the page.</summary>
internal sealed record RibbonView(string Label, SampleOrigin[] Rows);

/// <summary>A track with what the model has of it.</summary>
/// <param name="Definition">The track.</param>
/// <param name="Traces">Its curves that have a value.</param>
/// <param name="Scales">The scale of each.</param>
/// <param name="Ribbons">The strips beside it.</param>
internal sealed record TrackView(
    TrackDefinition Definition, IReadOnlyList<CurveTrace> Traces, IReadOnlyList<CurveScale> Scales, IReadOnlyList<RibbonView> Ribbons)
{
    /// <summary>Reads a track; null when none of its curves has a value.</summary>
    public static TrackView? Read(EarthModel model, TrackDefinition track, UnitSystem units, double[] depths, DepthAxis axis)
    {
        var traces = track.Curves.Select(c => CurveTrace.Read(model, c, units, depths, axis)).OfType<CurveTrace>().ToList();
        return traces.Count == 0 ? null : new TrackView(track, traces, CurveTrace.Scales(traces), []);
    }

    /// <summary>The track with the origins of its curves.</summary>
    /// <param name="model">The model.</param>
    /// <param name="depths">Depth of each sample, growing, in the picture's unit.</param>
    /// <param name="axis">The depth axis.</param>
    public TrackView WithRibbons(EarthModel model, ReadOnlySpan<double> depths, DepthAxis axis)
    {
        var ribbons = new List<RibbonView>();
        foreach (var trace in Traces)
        {
            if (trace.Curve.Ribbon is not { } property || model.Origins(property) is not { } origins) continue;
            var symbol = DepthColumns.Numbers.First(c => c.Id == IdOf(property)).Symbol;
            ribbons.Add(new RibbonView($"{symbol} origin", OriginRibbon.Rows(origins, depths, axis)));
        }

        return this with { Ribbons = ribbons };
    }

    private static string IdOf(Property property) => property.ToString().ToLowerInvariant();
}
