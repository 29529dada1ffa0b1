using DepthStress.Core.Calibration;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;

namespace DepthStress.Report;

/// <summary>Stresses and pore pressure, and their gradients, over true vertical depth, as SVG.</summary>
public static class StressPicture
{
    private const double AxisWidth = 66;
    private const double Gap = 32;

    /// <summary>Writes the picture: UTF-8, the same bytes for the same model and options.</summary>
    /// <param name="model">The finished model.</param>
    /// <param name="options">Units; the choice of tracks does not matter here.</param>
    /// <param name="destination">Gets the picture; stays open.</param>
    public static void Write(EarthModel model, PictureOptions options, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(destination);
        SvgPaper.Write(Draw(model, options.Units), destination);
    }

    /// <summary>Draws the picture.</summary>
    internal static Sheet Draw(EarthModel model, UnitSystem units)
    {
        var tvds = new double[model.Count];
        DepthColumns.Get("tvd").Fill(model, 0, units, tvds);
        var zones = ZoneSpan.Of(model, tvds);
        var finite = tvds.Where(double.IsFinite).DefaultIfEmpty(double.NaN).ToList();
        var sheet = new Sheet(PageFrame.ShortSide, PageFrame.LongSide, $"{model.Setup.Name}: stress over depth");

        var legendTop = PageFrame.Margin + PageFrame.TitleHeight;
        var comparisons = ComparisonCurves.Of(model);
        var (left, right, names) = (PageFrame.Margin + AxisWidth, sheet.Width - PageFrame.Margin, ZoneStrip.Width(zones));
        var keys = ComparisonCurves.Keys(comparisons, right - left);
        var observations = ObservationMarks.Shown(Comparison.Of(model));
        var lines = 2 + (observations.Count > 0 ? 1 : 0);
        var plotTop = legendTop + ((lines + keys.Count) * Legend.LineHeight) + PanelFrame.Height + 6;
        var axis = new DepthAxis(finite.Min(), finite.Max(), plotTop, PageFrame.LongSide - PageFrame.Margin - PageFrame.CautionHeight(sheet.Width) - 16);
        var middle = left + ((right - names - left) * 0.58);
        var views = new[] { TrackTable.StressPanels.Stress with { Curves = [.. comparisons, .. TrackTable.StressPanels.Stress.Curves] }, TrackTable.StressPanels.Gradient }
            .Select(d => TrackView.Read(model, d, units, tvds, axis)).ToArray();

        DrawFrame(sheet, model, units, axis, zones, left, right - names - 8, right);
        if (views[0] is { } stress)
        {
            Legend.Draw(sheet, Entries(model, units, stress), left, right, legendTop + (Legend.LineHeight / 2));
            ComparisonCurves.DrawKeys(sheet, keys, left, legendTop + ((lines + 0.5) * Legend.LineHeight), Legend.LineHeight);
            Legend.Draw(sheet, ObservationMarks.Entries(observations), left, right, legendTop + (2.5 * Legend.LineHeight));
            DrawPanel(sheet, stress, "Total stress and pore pressure", units, axis, left, middle, observations);
            ComparisonCurves.DrawLetters(sheet, stress, comparisons, new Panel(left, middle, stress.Scales[0], axis));
        }

        if (views[1] is { } gradient)
            DrawPanel(sheet, gradient, $"Gradient: {PageTexts.Gradient(model.Setup.Frame)}", units, axis, middle + Gap, right - names - 8, []);
        PageFrame.DrawCaution(sheet);
        return sheet;
    }

    private static void DrawFrame(
        Sheet sheet, EarthModel model, UnitSystem units, DepthAxis axis, IReadOnlyList<ZoneSpan> zones, double left, double plotRight, double right)
    {
        var frame = model.Setup.Frame;
        PageFrame.DrawTitle(sheet, model.Setup.Name, "stress over depth", PageTexts.Surfaces(frame, units));
        ZoneStrip.DrawBands(sheet, zones, axis, left, right);
        ZoneStrip.DrawNames(sheet, zones, axis, plotRight + 8, right, axis.ScreenBase + 9);
        DepthScales.DrawOwn(sheet, axis, left, left, plotRight);
        DepthScales.DrawTitle(sheet, frame, units, axis, PageFrame.Margin + 8);
    }

    private static IEnumerable<LegendEntry> Entries(EarthModel model, UnitSystem units, TrackView stress) =>
        stress.Traces.Select(t => t.Curve).Where(c => !ComparisonCurves.Has(model, c)).Reverse().OrderBy(c => c.Column == HydrostaticColumns.Pressure)
            .Select(c => LegendEntry.Line(c.Pen, c.Column == HydrostaticColumns.Pressure ? Hydrostatic(model, units) : $"{c.Column.Symbol}, {c.Column.Title}"));

    private static string Hydrostatic(EarthModel model, UnitSystem units)
    {
        var (metric, field) = ColumnUnits.MudDensities;
        var unit = (units == UnitSystem.Metric ? metric : field).Unit;
        var density = RoundSteps.Show(unit.FromSi(HydrostaticColumns.Density(model)), 0.01);
        return $"reference: water of {density} {unit.Symbol} below the {(model.Setup.Frame.IsOffshore ? "sea surface" : "water table")}";
    }

    private static void DrawPanel(
        Sheet sheet, TrackView view, string title, UnitSystem units, DepthAxis axis, double left, double right, IReadOnlyList<Comparison> observations)
    {
        var (panel, unit) = (new Panel(left, right, view.Scales[0], axis), view.Traces[0].Curve.Column.In(units).Unit);
        PanelFrame.Open(sheet, panel, $"{title}, {unit.Symbol}", 2 * Gap);
        for (var i = 0; i < view.Traces.Count; i++) CurveDrawing.Draw(sheet, panel, view.Traces[i], i);
        var off = ObservationMarks.Draw(sheet, panel, observations, units, unit);
        PanelFrame.Close(sheet, panel, view.Traces, off);
    }
}
