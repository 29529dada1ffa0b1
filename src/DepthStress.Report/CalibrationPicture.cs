using System.Globalization;
using DepthStress.Core.Calibration;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;
using OxyPlot;

namespace DepthStress.Report;

/// <summary>
/// What a calibration did, as SVG: Shmin before and after with the observations, how far the model is off at each, and the
/// plane of the two strains.
/// </summary>
public static class CalibrationPicture
{
    private const double AxisWidth = 62;
    private const int MostPlanes = 3;
    private const double WordLine = 12;
    private static readonly TextStyle Small = new(8);

    /// <summary>Writes the picture: UTF-8, the same bytes for the same result and units.</summary>
    public static void Write(CalibrationResult result, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(destination);
        SvgPaper.Write(Draw(result, units), destination);
    }

    /// <summary>Writes the picture as a page of A4 in a PDF, without letters outside those of Western Europe.</summary>
    /// <param name="result">The calibration.</param>
    /// <param name="units">The units of every scale.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void WritePdf(CalibrationResult result, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(destination);
        var sheet = Draw(result, units);
        PdfBook.Write([sheet], sheet.Title, destination);
    }

    /// <summary>Draws the picture.</summary>
    internal static Sheet Draw(CalibrationResult result, UnitSystem units)
    {
        var model = result.After;
        var sheet = new Sheet(PageFrame.LongSide, PageFrame.ShortSide, $"{model.Setup.Name}: calibration");
        PageFrame.DrawTitle(sheet, model.Setup.Name, "calibration on observations", PageTexts.Surfaces(model.Setup.Frame, units));
        var top = PageFrame.Margin + PageFrame.TitleHeight;
        var bottom = sheet.Height - PageFrame.Margin - PageFrame.CautionHeight(sheet.Width) - 6;
        DrawProfile(sheet, result, units, new OxyRect(PageFrame.Margin, top, 352, bottom - top));
        ResidualRows.Draw(sheet, result, units, new OxyRect(PageFrame.Margin + 372, top, 372, bottom - top));
        DrawPlanes(sheet, result, new OxyRect(PageFrame.Margin + 766, top, sheet.Width - (2 * PageFrame.Margin) - 766, bottom - top));
        PageFrame.DrawCaution(sheet);
        return sheet;
    }

    private static void DrawProfile(Sheet sheet, CalibrationResult result, UnitSystem units, OxyRect box)
    {
        var model = result.After;
        var tvds = new double[model.Count];
        DepthColumns.Get("tvd").Fill(model, 0, units, tvds);
        var finite = tvds.Where(double.IsFinite).DefaultIfEmpty(double.NaN).ToList();
        var (left, right) = (box.Left + AxisWidth, box.Right);
        var axis = new DepthAxis(finite.Min(), finite.Max(), box.Top + 34, box.Bottom - 40);
        var curves = TrackTable.StressPanels.Stress.Curves.Where(c => c.Column.Id is "pp" or "sv" or "shmin" or "shmax").ToList();
        var traces = curves.Select(c => CurveTrace.Read(model, c, units, tvds, axis)).OfType<CurveTrace>().ToList();
        var shmin = curves.Find(c => c.Column.Id == "shmin")!;
        var before = CurveTrace.Read(result.Before, shmin with { Pen = new CurvePen(Palette.Grey, 0.7) }, units, tvds, axis);
        if (traces.Count == 0) return;
        var scale = CurveTrace.Scales(traces)[0];
        var panel = new Panel(left, right, scale, axis);

        var unit = shmin.Column.In(units).Unit;
        PanelFrame.Open(sheet, panel, $"Total stress and pore pressure, {unit.Symbol}");
        DepthScales.DrawOwn(sheet, axis, left, left, right);
        DepthScales.DrawTitle(sheet, model.Setup.Frame, units, axis, box.Left + 7);
        if (before is not null) CurveDrawing.Draw(sheet, panel, before, traces.Count);
        for (var i = 0; i < traces.Count; i++) CurveDrawing.Draw(sheet, panel, traces[i], i);
        var off = ObservationMarks.Draw(sheet, panel, ObservationMarks.Shown(result.AfterFit), units, unit);
        PanelFrame.Close(sheet, panel, traces, off);
        var entries = traces.Reverse<CurveTrace>().Select(t => LegendEntry.Line(t.Curve.Pen, t.Curve.Column.Symbol)).ToList();
        if (before is not null) entries.Add(LegendEntry.Line(before.Curve.Pen, "Shmin before"));
        Legend.Draw(sheet, entries, left, right, axis.ScreenBase + 22);
    }

    private static void DrawPlanes(Sheet sheet, CalibrationResult result, OxyRect box)
    {
        var count = Math.Min(MostPlanes, result.Strains.Count);
        if (count == 0) return;
        var words = Words(result, count).ToList();
        var height = Math.Min(470, (box.Height - 10 - (words.Count * WordLine)) / count);
        for (var g = 0; g < count; g++)
        {
            var zones = result.Strains[g].Group.Name(result.After.Setup);
            var name = zones.Length > 0 ? $"Strains, {zones}" : "Tectonic strains";
            StrainPlane.Draw(sheet, result, g, name, new OxyRect(box.Left, box.Top + (g * height), box.Width, height));
        }

        var y = box.Top + (count * height) + 10;
        foreach (var line in words)
        {
            sheet.Write(new ScreenPoint(box.Left, y), PlainText.Shorten(line, Small.Size, false, box.Width), Small);
            y += WordLine;
        }
    }

    private static IEnumerable<string> Words(CalibrationResult result, int shown)
    {
        yield return "Lines: strains that meet one observation. Ellipse: joint 95 % region.";
        foreach (var strain in result.Strains.Take(shown))
        {
            yield return $"along Shmin {Show(strain.AlongShmin)}, along SHmax {Show(strain.AlongShmax)} microstrain";
            if (!strain.Separated) yield return "The observations do not separate the two strains.";
        }

        if (result.Strains.Count > shown)
            yield return string.Create(CultureInfo.InvariantCulture, $"{result.Strains.Count - shown} more groups of zones find no room here");
    }

    private static string Show(Estimate estimate)
    {
        var value = string.Create(CultureInfo.InvariantCulture, $"{Units.Microstrain.FromSi(estimate.Value):F0}");
        if (estimate.Held) return value + " (held)";
        return string.Create(
            CultureInfo.InvariantCulture, $"{value} ({Units.Microstrain.FromSi(estimate.Low):F0} to {Units.Microstrain.FromSi(estimate.High):F0})");
    }
}
