using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;

namespace DepthStress.Report;

/// <summary>Two profiles of stress over each other, and their difference, over true vertical depth, as SVG.</summary>
public static class ComparePicture
{
    private const double AxisWidth = 66;
    private const double Gap = 34;
    private static readonly double[] Dashed = [4, 2];

    /// <summary>Writes the picture: UTF-8, the same bytes for the same profiles and units.</summary>
    public static void Write(ProfilePair pair, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(pair);
        ArgumentNullException.ThrowIfNull(destination);
        SvgPaper.Write(Draw(pair, units), destination);
    }

    /// <summary>Draws the picture.</summary>
    internal static Sheet Draw(ProfilePair pair, UnitSystem units)
    {
        var length = units.UnitFor(Dimension.Length).Unit;
        double[] before = [.. pair.BeforeTvd.Select(length.FromSi)], after = [.. pair.AfterTvd.Select(length.FromSi)];
        var finite = before.Concat(after).Where(double.IsFinite).DefaultIfEmpty(double.NaN).ToList();
        var sheet = new Sheet(PageFrame.ShortSide, PageFrame.LongSide, $"{pair.Well}: two results compared");
        PageFrame.DrawTitle(sheet, pair.Well, "two results compared", PageTexts.Surfaces(pair.Frame, units));
        var (left, right) = (PageFrame.Margin + AxisWidth, sheet.Width - PageFrame.Margin);
        var curves = pair.Curves.Select(c => (Data: c, Style: Style(c.Column))).ToList();
        var legendEnd = Legend.Draw(sheet, Entries(pair, curves.Select(c => c.Style)), PageFrame.Margin, right, PageFrame.Margin + PageFrame.TitleHeight + (Legend.LineHeight / 2));
        var axis = new DepthAxis(finite.Min(), finite.Max(), legendEnd + 12 + PanelFrame.Height, sheet.Height - PageFrame.Margin - PageFrame.CautionHeight(sheet.Width) - 16);
        DepthScales.DrawOwn(sheet, axis, left, left, right);
        DepthScales.DrawTitle(sheet, pair.Frame, units, axis, PageFrame.Margin + 8);

        var (middle, unit) = (left + ((right - left) * 0.58), curves[0].Style.Column.In(units).Unit);
        var old = Traces(curves.Select(c => (c.Style with { Pen = Before(c.Style.Pen) }, c.Data.Before)), before, units, axis);
        var young = Traces(curves.Select(c => (c.Style, c.Data.After)), after, units, axis);
        var difference = Traces(curves.Select(c => (Signed(c.Style), c.Data.Difference)), before, units, axis);
        DrawPanel(sheet, [.. old, .. young], $"Total stress and pore pressure, {unit.Symbol}", left, middle, axis, units);
        DrawPanel(sheet, difference, $"Second less first, {unit.Symbol}", middle + Gap, right, axis, units);
        PageFrame.DrawCaution(sheet);
        return sheet;
    }

    private static CurveDefinition Style(string column) => TrackTable.StressPanels.Stress.Curves.First(c => c.Column.Id == column);

    private static CurvePen Before(CurvePen pen) => new(Palette.Light(pen.Colour), 1, Dashed);

    /// <summary>The curve on a scale that lets differences of both signs in.</summary>
    private static CurveDefinition Signed(CurveDefinition curve) => curve with
    {
        Metric = new CurveScale(-400, 400, 4, ScaleFit.BothEnds),
        Field = new CurveScale(-60000, 60000, 4, ScaleFit.BothEnds),
    };

    private static IEnumerable<LegendEntry> Entries(ProfilePair pair, IEnumerable<CurveDefinition> curves)
    {
        yield return LegendEntry.Line(new CurvePen(Palette.Grey, 1, Dashed), $"first: {pair.Before}");
        yield return LegendEntry.Line(new CurvePen(Palette.Ink), $"second: {pair.After}");
        foreach (var curve in curves.Reverse()) yield return LegendEntry.Line(curve.Pen, $"{curve.Column.Symbol}, {curve.Column.Title}");
    }

    private static List<CurveTrace> Traces(IEnumerable<(CurveDefinition Curve, double[] Values)> curves, double[] depths, UnitSystem units, DepthAxis axis) =>
        [.. curves.Select(c => CurveTrace.Of(c.Curve, c.Values, units, depths, axis)).OfType<CurveTrace>()];

    private static void DrawPanel(Sheet sheet, List<CurveTrace> traces, string title, double left, double right, DepthAxis axis, UnitSystem units)
    {
        if (traces.Count == 0) return;
        var panel = new Panel(left, right, CurveTrace.Scales(traces)[0], axis);
        PanelFrame.Open(sheet, panel, title);
        if (panel.Beyond(0) == 0) sheet.Line(panel.Across(0), axis.ScreenTop, panel.Across(0), axis.ScreenBase, new CurvePen(Palette.Frame, 0.8));
        for (var i = 0; i < traces.Count; i++) CurveDrawing.Draw(sheet, panel, traces[i], i);
        PanelFrame.Close(sheet, panel, traces);
    }
}
