using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;

namespace DepthStress.Report.Page;

/// <summary>A scale of the page, and how many samples lie beyond it.</summary>
internal readonly record struct PageScale(CurveScale Scale, int OffScale);

/// <summary>A curve of the page with its scale in both unit systems.</summary>
internal sealed record PageCurve(CurveDefinition Definition, PageScale Metric, PageScale Field);

/// <summary>A track of the page: the same definition as in the pictures.</summary>
/// <param name="Definition">The track.</param>
/// <param name="Curves">Its curves that have a value.</param>
/// <param name="Shown">True when it is shown at first.</param>
internal sealed record PageTrack(TrackDefinition Definition, IReadOnlyList<PageCurve> Curves, bool Shown)
{
    private const int Chunk = 4096;

    /// <summary>Every track that has a value: those of the pictures, then the rest, hidden at first, with the gradients last.</summary>
    public static IReadOnlyList<PageTrack> Of(EarthModel model, PictureOptions options)
    {
        var chosen = (options.Tracks ?? [.. TrackTable.All.Select(t => t.Id)]).Select(TrackTable.Find).OfType<TrackDefinition>().ToList();
        var gradient = TrackTable.StressPanels.Gradient;
        var rest = TrackTable.All.Where(t => !chosen.Contains(t)).Append(gradient with { Curves = [.. gradient.Curves.Where(c => DepthColumns.All.Contains(c.Column))] });
        return [.. chosen.Select(t => Read(model, t, options, true)).Concat(rest.Select(t => Read(model, t, options, false))).Where(t => t.Curves.Count > 0)];
    }

    private static PageTrack Read(EarthModel model, TrackDefinition track, PictureOptions options, bool shown)
    {
        List<(CurveDefinition Curve, ScaleTally Metric, ScaleTally Field)> read =
            [.. track.Curves.Select(c => Tally(model, c, options)).Where(c => double.IsFinite(c.Metric.Least))];
        var (metric, field) = (ScaleTally.Scales([.. read.Select(c => c.Metric)]), ScaleTally.Scales([.. read.Select(c => c.Field)]));
        return new PageTrack(track, [.. read.Select((c, i) => new PageCurve(c.Curve, new(metric[i], c.Metric.OffScale), new(field[i], c.Field.OffScale)))], shown);
    }

    /// <summary>Counts a curve's samples against its scales of both unit systems, in one pass.</summary>
    private static (CurveDefinition Curve, ScaleTally Metric, ScaleTally Field) Tally(EarthModel model, CurveDefinition curve, PictureOptions options)
    {
        var (metric, field) = (new ScaleTally(Scale(curve, options, UnitSystem.Metric)), new ScaleTally(Scale(curve, options, UnitSystem.Field)));
        var (values, converted) = (new double[Math.Min(Chunk, model.Count)], new double[Math.Min(Chunk, model.Count)]);
        for (var start = 0; start < model.Count; start += Chunk)
        {
            var n = Math.Min(Chunk, model.Count - start);
            curve.Column.Read(model, start, values.AsSpan(0, n));
            Add(ref metric, curve.Column.Metric.Unit);
            Add(ref field, curve.Column.Field.Unit);

            void Add(ref ScaleTally tally, Unit unit)
            {
                values.AsSpan(0, n).CopyTo(converted);
                unit.FromSi(converted.AsSpan(0, n));
                foreach (var value in converted.AsSpan(0, n)) tally.Add(value);
            }
        }

        return (curve, metric, field);
    }

    /// <summary>The curve's scale in a unit system; one of the user's is in the units of the pictures.</summary>
    private static CurveScale Scale(CurveDefinition curve, PictureOptions options, UnitSystem units)
    {
        if (options.Scales?.TryGetValue(curve.Column.Id, out var scale) != true) return curve.Scale(units);
        var (from, to) = (curve.Column.In(options.Units).Unit, curve.Column.In(units).Unit);
        return from == to ? scale : scale with { Left = to.FromSi(from.ToSi(scale.Left)), Right = to.FromSi(from.ToSi(scale.Right)) };
    }
}
