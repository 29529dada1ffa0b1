using System.Globalization;
using DepthStress.Core.Calibration;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>One row per observation, from top to bottom of the hole: how far the model is off, in standard deviations.</summary>
internal static class ResidualRows
{
    private const double LeastRow = 14, GreatestRow = 26;
    private const double LabelWidth = 128;
    private const double Inner = 1.96;
    private static readonly TextStyle Small = new(8);
    private static readonly TextStyle Title = new(9.5, Palette.Text, true);

    /// <summary>Draws the rows that find room.</summary>
    public static void Draw(Sheet sheet, CalibrationResult result, UnitSystem units, OxyRect box)
    {
        var rows = result.AfterFit.Zip(result.BeforeFit, (after, before) => (After: after, Before: before))
            .Where(r => double.IsFinite(r.After.Residual)).OrderBy(r => r.After.Reading.Interval.MiddleTvd).ToList();
        var (left, right, top) = (box.Left + LabelWidth, box.Right - 6, box.Top + 34);
        var room = box.Bottom - top - 44;
        var height = Math.Clamp(room / Math.Max(1, rows.Count), LeastRow, GreatestRow);
        var fitting = Math.Min(rows.Count, (int)(room / height));
        var bottom = top + (fitting * height);
        var reach = Reach(rows.Take(fitting).Select(r => r.After.Residual).Concat(rows.Take(fitting).Select(r => r.Before.Residual)));
        double X(double sigmas) => left + ((Math.Clamp(sigmas, -reach, reach) + reach) / (2 * reach) * (right - left));

        sheet.Write(new ScreenPoint((left + right) / 2, box.Top + 8), "Model less observation, standard deviations", Title, HorizontalAlignment.Center);
        DepthScales.DrawHead(sheet, "MD", units.UnitFor(Dimension.Length).Unit.Symbol, PageTexts.Datum(result.After.Setup.Frame), box.Left, LabelWidth - 12, top);
        sheet.Fill(new OxyRect(X(-Inner), top, X(Inner) - X(-Inner), bottom - top), Palette.ZoneTint);
        var step = RoundSteps.Step(2 * reach, 8);
        foreach (var tick in RoundSteps.Between(-reach, reach, step))
        {
            sheet.Line(X(tick), top, X(tick), bottom, new CurvePen(tick == 0 ? Palette.Frame : Palette.Grid, tick == 0 ? 0.8 : 0.5));
            sheet.Write(new ScreenPoint(X(tick), top - 8), RoundSteps.Show(tick, step), Small, HorizontalAlignment.Center);
        }

        for (var k = 0; k < fitting; k++) DrawRow(sheet, rows[k].Before, rows[k].After, units, box.Left, left, top + ((k + 0.5) * height), X);
        sheet.Outline(new OxyRect(left, top, right - left, bottom - top), new CurvePen(Palette.Frame, 0.8));
        DrawLegend(sheet, box.Left, box.Right, bottom + 14, rows.Count - fitting);
    }

    private static double Reach(IEnumerable<double> residuals) =>
        Math.Min(12, Math.Max(4, 2 * Math.Ceiling(residuals.Select(Math.Abs).DefaultIfEmpty(0).Max() / 2)));

    private static void DrawRow(
        Sheet sheet, Comparison before, Comparison after, UnitSystem units, double labelLeft, double left, double y, Func<double, double> across)
    {
        var interval = after.Reading.Interval;
        var (unit, _) = units.UnitFor(Dimension.Length);
        var depth = unit.FromSi((interval.Top + interval.Base) / 2).ToString("F0", CultureInfo.InvariantCulture);
        var label = $"{interval.Observation.Kind.Word()}  {depth} {unit.Symbol}";
        sheet.Write(new ScreenPoint(left - 6, y), PlainText.Shorten(label, Small.Size, false, left - labelLeft - 6), Small, HorizontalAlignment.Right);
        sheet.Line(across(before.Residual), y, across(after.Residual), y, new CurvePen(Palette.Grey, 0.6));
        Marks.Ring(sheet, new ScreenPoint(across(before.Residual), y), 3, new CurvePen(Palette.Grey, 0.9));
        if (double.IsFinite(after.LeftOut))
            sheet.Line(across(after.LeftOut), y - 5, across(after.LeftOut), y + 5, new CurvePen(Palette.Plum, 1.2));
        Marks.Draw(sheet, new ScreenPoint(across(after.Residual), y), after.Reading.Meaning, 3.2, Colour(after.Reading));
    }

    /// <summary>The colour of an observation, by what it is compared with.</summary>
    public static int Colour(Reading reading) => reading.Subject switch
    {
        Reading.Shmin => Palette.Rust,
        Reading.PorePressure => Palette.Sky,
        _ => Palette.Gold,
    };

    private static void DrawLegend(Sheet sheet, double left, double right, double y, int unshown)
    {
        LegendEntry[] entries =
        [
            new((s, at) => Marks.Ring(s, at, 3, new CurvePen(Palette.Grey, 0.9)), "before"),
            new((s, at) => Marks.Disc(s, at, 3.2, Palette.Rust), "value of Shmin"),
            new((s, at) => Marks.Draw(s, at, Meaning.UpperBound, 3.2, Palette.Rust), "upper bound"),
            new((s, at) => Marks.Disc(s, at, 3.2, Palette.Gold), "on SHmax too"),
            new((s, at) => Marks.Disc(s, at, 3.2, Palette.Sky), "pore pressure"),
            new((s, at) => s.Line(at.X, at.Y - 5, at.X, at.Y + 5, new CurvePen(Palette.Plum, 1.2)), "fitted without it"),
        ];
        y = Legend.Draw(sheet, entries, left, right, y) + Legend.LineHeight;
        if (unshown > 0) sheet.Write(new ScreenPoint(left, y), string.Create(CultureInfo.InvariantCulture, $"{unshown} more observations find no room here"), Small);
    }
}
