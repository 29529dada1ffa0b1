using System.Globalization;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;
using OxyPlot;

namespace DepthStress.Report;

/// <summary>The layers over the profile they were cut from, against true vertical depth, with targets and stress barriers, as SVG.</summary>
public static class LayersPicture
{
    private const double AxisWidth = 66;
    private const double NumberWidth = 30;
    private const double NumberSpacing = 9.5;
    private const double Gap = 28;
    private const double LeastForMean = 7;
    private static readonly TextStyle Small = new(8);
    private static readonly TextStyle Head = new(9, Palette.Text, true);
    private static readonly CurvePen Boundary = new(Palette.ZoneEdge, 0.5);

    /// <summary>Writes the picture: UTF-8, the same bytes for the same model, layers and options.</summary>
    /// <param name="model">The finished model.</param>
    /// <param name="table">The layers it was cut into.</param>
    /// <param name="settings">What counts as a stress barrier.</param>
    /// <param name="options">Units; the choice of tracks does not matter here.</param>
    /// <param name="destination">Gets the picture; stays open.</param>
    public static void Write(EarthModel model, LayerTable table, LayerSettings settings, PictureOptions options, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(destination);
        SvgPaper.Write(Draw(model, table, settings, options.Units), destination);
    }

    /// <summary>Draws the picture.</summary>
    internal static Sheet Draw(EarthModel model, LayerTable table, LayerSettings settings, UnitSystem units)
    {
        var tvds = new double[model.Count];
        DepthColumns.Get("tvd").Fill(model, 0, units, tvds);
        var zones = ZoneSpan.Of(model, tvds);
        var targets = StressTarget.Find(model, table, settings);
        var finite = tvds.Where(double.IsFinite).DefaultIfEmpty(double.NaN).ToList();
        var sheet = new Sheet(PageFrame.LongSide, PageFrame.ShortSide, $"{model.Setup.Name}: layers over the profile");
        var count = string.Create(CultureInfo.InvariantCulture, $"{table.Layers.Count} {(table.Layers.Count == 1 ? "layer" : "layers")}");
        PageFrame.DrawTitle(sheet, model.Setup.Name, $"{count} over the profile", PageTexts.Surfaces(model.Setup.Frame, units));

        var (left, right) = (PageFrame.Margin + AxisWidth + NumberWidth, sheet.Width - PageFrame.Margin);
        var legendAt = PageFrame.Margin + PageFrame.TitleHeight + (Legend.LineHeight / 2);
        var legendEnd = Legend.Draw(sheet, Entries(model, units, settings, targets), PageFrame.Margin, right, legendAt);
        var foot = PageFrame.Margin + PageFrame.CautionHeight(sheet.Width) + BarrierLanes.FootHeight(targets) + 18;
        var axis = new DepthAxis(finite.Min(), finite.Max(), legendEnd + 12 + PanelFrame.Height + 10, sheet.Height - foot);
        var plotRight = right - (zones.Count > 0 ? ZoneStrip.Width(zones) + 8 : 0) - (targets.Count > 0 ? BarrierLanes.Width(targets) + 8 : 0);

        ZoneStrip.DrawBands(sheet, zones, axis, left, right);
        ZoneStrip.DrawNames(sheet, zones, axis, right - ZoneStrip.Width(zones), right, axis.ScreenBase + 9);
        DepthScales.DrawOwn(sheet, axis, PageFrame.Margin + AxisWidth, left, plotRight);
        DepthScales.DrawTitle(sheet, model.Setup.Frame, units, axis, PageFrame.Margin + 8);
        DrawLayers(sheet, table, units, axis, left, plotRight);
        DrawPanels(sheet, model, table, units, tvds, axis, left, plotRight);
        BarrierLanes.Draw(sheet, targets, table, units, axis, plotRight + 8);
        BarrierLanes.DrawFoot(sheet, targets, units, PageFrame.Margin, right, axis.ScreenBase + 18);
        PageFrame.DrawCaution(sheet);
        return sheet;
    }

    private static IEnumerable<LegendEntry> Entries(EarthModel model, UnitSystem units, LayerSettings settings, IReadOnlyList<StressTarget> targets)
    {
        yield return LegendEntry.Line(LayerCurves.Behind(LayerCurves.Panels[0].Curves[0].Curve).Pen, "profile");
        yield return LegendEntry.Line(new CurvePen(Palette.Ink, LayerCurves.Bold), "layer: its mean, or stress from its top to its base");
        yield return new LegendEntry((s, p) => Marks.Disc(s, p, 2, Palette.Ink), "mean stress of the layer");
        foreach (var curve in LayerCurves.Panels[^1].Curves.Reverse().Where(c => model.Values.Read(c.Property).ContainsAnyInRange(double.MinValue, double.MaxValue)))
            yield return LegendEntry.Line(new CurvePen(curve.Curve.Pen.Colour, LayerCurves.Bold), curve.Curve.Column.Symbol);
        if (targets.Count == 0) yield break;
        foreach (var entry in BarrierLanes.Legend(units, settings)) yield return entry;
    }

    /// <summary>Draws the panels that have a value; they share the width.</summary>
    private static void DrawPanels(
        Sheet sheet, EarthModel model, LayerTable table, UnitSystem units, double[] tvds, DepthAxis axis, double left, double right)
    {
        var panels = LayerCurves.Panels
            .Select(p => (p.Title, p.Share, p.Curves, Profiles: p.Curves.Select(c => CurveTrace.Read(model, LayerCurves.Behind(c.Curve), units, tvds, axis)).OfType<CurveTrace>().ToList()))
            .Where(p => p.Profiles.Count > 0).ToList();
        var each = (right - left - ((panels.Count - 1) * Gap)) / panels.Sum(p => p.Share);
        foreach (var (title, share, curves, profiles) in panels)
        {
            DrawPanel(sheet, table, units, axis, title, curves, profiles, left, left + (share * each));
            left += (share * each) + Gap;
        }
    }

    private static void DrawPanel(
        Sheet sheet, LayerTable table, UnitSystem units, DepthAxis axis, string title, IReadOnlyList<LayerCurve> curves, List<CurveTrace> profiles,
        double left, double right)
    {
        var unit = profiles[0].Curve.Column.In(units).Unit.Symbol;
        var panel = new Panel(left, right, CurveTrace.Scales(profiles)[0], axis);
        PanelFrame.Open(sheet, panel, unit.Length > 0 ? $"{title}, {unit}" : title);
        for (var i = 0; i < profiles.Count; i++) CurveDrawing.Draw(sheet, panel, profiles[i], i);
        foreach (var curve in curves)
        {
            if (LayerCurves.Trace(table, curve, units) is { } trace) CurveDrawing.Draw(sheet, panel, trace, profiles.Count);
            if (curve.Sloping) DrawMeans(sheet, table, curve, units, panel);
        }

        PanelFrame.Close(sheet, panel, profiles);
    }

    private static void DrawMeans(Sheet sheet, LayerTable table, LayerCurve curve, UnitSystem units, Panel panel)
    {
        var (unit, length) = (curve.Curve.Column.In(units).Unit, units.UnitFor(Dimension.Length).Unit);
        foreach (var layer in table.Layers.Where(l => length.FromSi(l.BaseTvd - l.TopTvd) / panel.Depth.Pixel >= LeastForMean))
        {
            var profile = layer.Profile(curve.Property);
            var value = unit.FromSi(profile.Mean);
            if (!double.IsFinite(value) || panel.Beyond(value) != 0) continue;
            var at = panel.ToScreen(new LogPoint(length.FromSi(profile.Depth), value));
            Marks.Disc(sheet, at, 2.8, Palette.Paper);
            Marks.Disc(sheet, at, 2, curve.Curve.Pen.Colour);
        }
    }

    private static void DrawLayers(Sheet sheet, LayerTable table, UnitSystem units, DepthAxis axis, double left, double right)
    {
        var length = units.UnitFor(Dimension.Length).Unit;
        var last = double.NegativeInfinity;
        sheet.Write(new ScreenPoint(left - 18, axis.ScreenTop - 6), "Layer", Head, HorizontalAlignment.Right);
        foreach (var layer in table.Layers)
        {
            var (top, bottom) = (axis.ToScreen(length.FromSi(layer.TopTvd)), axis.ToScreen(length.FromSi(layer.BaseTvd)));
            sheet.Line(left - 5, top, right, top, Boundary);
            sheet.Line(left - 5, bottom, right, bottom, Boundary);
            var y = Math.Max((top + bottom) / 2, axis.ScreenTop + (NumberSpacing / 2));
            if (y - last < NumberSpacing || y > axis.ScreenBase) continue;
            sheet.Write(new ScreenPoint(left - 7, y), layer.Number.ToString(CultureInfo.InvariantCulture), Small, HorizontalAlignment.Right);
            last = y;
        }
    }
}
