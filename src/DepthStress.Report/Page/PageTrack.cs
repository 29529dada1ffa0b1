using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;

namespace DepthStress.Report.Page;

/// <summary>A track of the page: the same definition as in the pictures, with its scales in both unit systems.</summary>
/// <param name="Metric">What the model has of it, in metric units.</param>
/// <param name="Field">The same in field units; the same curves in the same order.</param>
/// <param name="Shown">True when it is shown at first.</param>
internal sealed record PageTrack(TrackView Metric, TrackView Field, bool Shown)
{
    /// <summary>Every track that has a value: those of the pictures, then the rest, hidden at first, with the gradients last.</summary>
    public static IReadOnlyList<PageTrack> Of(EarthModel model, PictureOptions options)
    {
        var chosen = (options.Tracks ?? [.. TrackTable.All.Select(t => t.Id)]).Select(TrackTable.Find).OfType<TrackDefinition>().ToList();
        var gradient = TrackTable.StressPanels.Gradient;
        var rest = TrackTable.All.Where(t => !chosen.Contains(t)).Append(gradient with { Curves = [.. gradient.Curves.Where(c => DepthColumns.All.Contains(c.Column))] });
        var tracks = new List<PageTrack>();
        foreach (var (track, shown) in chosen.Select(t => (t, true)).Concat(rest.Select(t => (t, false))))
        {
            if (Read(model, track, options, UnitSystem.Metric) is { } metric && Read(model, track, options, UnitSystem.Field) is { } field)
                tracks.Add(new PageTrack(metric, field, shown));
        }

        return tracks;
    }

    private static TrackView? Read(EarthModel model, TrackDefinition track, PictureOptions options, UnitSystem units)
    {
        var depths = new double[model.Count];
        DepthColumns.Get("md").Fill(model, 0, units, depths);
        var axis = new DepthAxis(depths.FirstOrDefault(double.NaN), depths.LastOrDefault(double.NaN), 0, 1000);
        return TrackView.Read(model, track.With(Scales(track, options, units)), units, depths, axis);
    }

    /// <summary>The user's scales, which are in the units of the pictures, in a unit system.</summary>
    private static Dictionary<string, CurveScale> Scales(TrackDefinition track, PictureOptions options, UnitSystem units)
    {
        var scales = new Dictionary<string, CurveScale>();
        foreach (var column in track.Curves.Select(c => c.Column))
        {
            if (options.Scales?.TryGetValue(column.Id, out var scale) != true) continue;
            var (from, to) = (column.In(options.Units).Unit, column.In(units).Unit);
            scales[column.Id] = from == to ? scale : scale with { Left = to.FromSi(from.ToSi(scale.Left)), Right = to.FromSi(from.ToSi(scale.Right)) };
        }

        return scales;
    }
}
