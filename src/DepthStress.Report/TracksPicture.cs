using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;
using OxyPlot;

namespace DepthStress.Report;

/// <summary>The depth tracks of a model over measured depth, as SVG.</summary>
public static class TracksPicture
{
    private const double UsualPlotHeight = 540;

    /// <summary>Writes the picture: UTF-8, the same bytes for the same model and options.</summary>
    /// <param name="model">The finished model.</param>
    /// <param name="options">Units and tracks; tracks without any value are left out.</param>
    /// <param name="destination">Gets the picture; stays open.</param>
    /// <exception cref="ArgumentException">The options name a track that the table does not have.</exception>
    public static void Write(EarthModel model, PictureOptions options, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(destination);
        SvgPaper.Write(Draw(model, options), destination);
    }

    /// <summary>Draws the picture.</summary>
    internal static Sheet Draw(EarthModel model, PictureOptions options) => Draw(model, options.Units, Chosen(options));

    /// <summary>Draws some tracks.</summary>
    internal static Sheet Draw(EarthModel model, UnitSystem units, IReadOnlyList<TrackDefinition> definitions)
    {
        var (mds, tvds) = (Read(model, "md", units), Read(model, "tvd", units));
        var zones = ZoneSpan.Of(model, mds);
        var (top, bottom) = mds.Length == 0 ? (double.NaN, double.NaN) : (mds[0], mds[^1]);

        // The curves decide how tall the heads are, and the heads how tall the plots: curves are thinned for the usual height.
        var draft = new DepthAxis(top, bottom, 0, UsualPlotHeight);
        var tracks = definitions.Select(d => TrackView.Read(model, d, units, mds, draft)).OfType<TrackView>().ToList();
        var layout = new TracksLayout([.. tracks.Select(t => t.Traces.Count(c => c.Curve.Ribbon is { } p && model.Origins(p) is not null))], ZoneStrip.Width(zones));
        var heads = Math.Max(64, tracks.Select((t, i) => TrackHeader.Height(t, layout.Tracks[i].Right - layout.Tracks[i].Left)).DefaultIfEmpty().Max());
        var foot = PageFrame.Margin + PageFrame.CautionHeight(layout.PageWidth) + 16;
        var axis = new DepthAxis(top, bottom, PageFrame.Margin + PageFrame.TitleHeight + heads + 4, PageFrame.ShortSide - foot);
        tracks = [.. tracks.Select(t => t.WithRibbons(model, mds, axis))];

        var sheet = new Sheet(layout.PageWidth, PageFrame.ShortSide, $"{model.Setup.Name}: depth tracks");
        DrawFrame(sheet, model, units, layout, axis, zones, mds, tvds);
        for (var i = 0; i < tracks.Count; i++) DrawTrack(sheet, tracks[i], units, layout, i, axis);
        if (tracks.Count == 0) sheet.Write(new ScreenPoint(layout.ZoneRight + 12, axis.ScreenTop - 8), "No curve of these tracks has a value.", new TextStyle(9));
        DrawFoot(sheet, tracks, axis);
        return sheet;
    }

    private static IReadOnlyList<TrackDefinition> Chosen(PictureOptions options)
    {
        var chosen = options.Tracks?.Select(id => TrackTable.Find(id) ?? throw new ArgumentException(
            $"found the unknown track \"{id}\", expected one of {string.Join(", ", TrackTable.All.Select(t => t.Id))}", nameof(options)));
        return [.. (chosen ?? TrackTable.All).Select(t => t.With(options.Scales))];
    }

    private static double[] Read(EarthModel model, string column, UnitSystem units)
    {
        var values = new double[model.Count];
        DepthColumns.Get(column).Fill(model, 0, units, values);
        return values;
    }

    private static void DrawFrame(
        Sheet sheet, EarthModel model, UnitSystem units, TracksLayout layout, DepthAxis axis, IReadOnlyList<ZoneSpan> zones, double[] mds, double[] tvds)
    {
        var (frame, unit) = (model.Setup.Frame, units.UnitFor(Dimension.Length).Unit.Symbol);
        PageFrame.DrawTitle(sheet, model.Setup.Name, "depth tracks", PageTexts.Surfaces(frame, units));
        ZoneStrip.DrawBands(sheet, zones, axis, layout.ZoneRight, layout.Right);
        var left = PageFrame.Margin;
        DepthScales.DrawHead(sheet, "MD", unit, PageTexts.Datum(frame), left, TracksLayout.DepthWidth, axis.ScreenTop);
        DepthScales.DrawHead(sheet, "TVD", unit, PageTexts.Datum(frame), left + TracksLayout.DepthWidth, TracksLayout.DepthWidth, axis.ScreenTop);
        DepthScales.DrawOwn(sheet, axis, left + TracksLayout.DepthWidth - 8, layout.ZoneRight, layout.Right);
        DepthScales.DrawOther(sheet, axis, mds, tvds, left + (2 * TracksLayout.DepthWidth) - 8);
        ZoneStrip.DrawNames(sheet, zones, axis, layout.ZoneLeft, layout.ZoneRight, axis.ScreenTop - 18);
    }

    private static void DrawTrack(Sheet sheet, TrackView track, UnitSystem units, TracksLayout layout, int index, DepthAxis axis)
    {
        var (left, right) = layout.Tracks[index];
        TrackHeader.Draw(sheet, track, units, left, right, PageFrame.Margin + PageFrame.TitleHeight, axis.ScreenTop - 4);
        var divisions = track.Scales[0].Divisions;
        for (var i = 1; i < divisions; i++)
        {
            var x = left + ((right - left) * i / divisions);
            sheet.Line(x, axis.ScreenTop, x, axis.ScreenBase, new CurvePen(Palette.Grid, 0.5));
        }

        for (var i = 0; i < track.Traces.Count; i++)
            CurveDrawing.Draw(sheet, new Panel(left, right, track.Scales[i], axis), track.Traces[i], i);
        sheet.Outline(new OxyRect(left, axis.ScreenTop, right - left, axis.ScreenBase - axis.ScreenTop), new CurvePen(Palette.Frame, 0.6));
        for (var i = 0; i < track.Ribbons.Count; i++)
        {
            var x = layout.RibbonLeft(index, i);
            OriginRibbon.Draw(sheet, track.Ribbons[i].Rows, axis, x);
            sheet.Write(new ScreenPoint(x + (OriginRibbon.Width / 2), axis.ScreenTop - 5), track.Ribbons[i].Label, new TextStyle(8), HorizontalAlignment.Left, true);
        }
    }

    private static void DrawFoot(Sheet sheet, IReadOnlyList<TrackView> tracks, DepthAxis axis)
    {
        var y = axis.ScreenBase + 11;
        var origins = tracks.SelectMany(t => t.Ribbons).SelectMany(r => r.Rows).ToList();
        if (origins.Exists(o => o != SampleOrigin.None)) OriginRibbon.DrawKey(sheet, origins, PageFrame.Margin, y);
        if (tracks.SelectMany(t => t.Traces).Any(t => t.OffScale > 0))
        {
            sheet.Write(
                new ScreenPoint(sheet.Width - PageFrame.Margin, y), "A wedge at a track's edge: values off the scale, samples counted in the head.",
                new TextStyle(8, Palette.FaintText), HorizontalAlignment.Right);
        }

        PageFrame.DrawCaution(sheet);
    }
}
