using DepthStress.Core.Calibration;
using DepthStress.Core.Quantities;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>
/// The plane of the two strains of one group: each value observation is a line of strains that would meet it, the ellipse
/// holds the estimate with 95 %.
/// </summary>
internal static class StrainPlane
{
    private const int Points = 72;
    private static readonly TextStyle Small = new(8);
    private static readonly TextStyle Faint = new(8, Palette.FaintText);
    private static readonly TextStyle Title = new(9.5, Palette.Text, true);

    /// <summary>Draws the plane of a group.</summary>
    public static void Draw(Sheet sheet, CalibrationResult result, int group, string name, OxyRect box)
    {
        var estimate = result.Strains[group];
        var plot = new OxyRect(box.Left + 46, box.Top + 22, box.Width - 52, box.Height - 62);
        var (center, start) = ((Micro(estimate.AlongShmin.Value), Micro(estimate.AlongShmax.Value)), (Micro(estimate.AlongShmin.Start), Micro(estimate.AlongShmax.Start)));
        var ellipse = Ellipse(result, group).ToList();
        var (x, y) = (Axis(ellipse.Select(p => p.X).Append(center.Item1).Append(start.Item1)), Axis(ellipse.Select(p => p.Y).Append(center.Item2).Append(start.Item2)));
        ScreenPoint At(double a, double b) => new(
            plot.Left + ((a - x.Left) / (x.Right - x.Left) * plot.Width), plot.Bottom - ((b - y.Left) / (y.Right - y.Left) * plot.Height));

        sheet.Write(new ScreenPoint((plot.Left + plot.Right) / 2, box.Top + 8), PlainText.Shorten(name, Title.Size, true, plot.Width), Title, HorizontalAlignment.Center);
        DrawForbidden(sheet, x, y, At);
        DrawGrid(sheet, plot, x, y, At);
        foreach (var (line, colour) in Lines(result, group, x, y)) sheet.Line(line.Select(p => At(p.X, p.Y)), new CurvePen(colour, 0.7));
        if (ellipse.Count > 0) sheet.Line(ellipse.Append(ellipse[0]).Select(p => At(p.X, p.Y)), new CurvePen(Palette.Ink, 1.4));
        Marks.Ring(sheet, At(start.Item1, start.Item2), 3.5, new CurvePen(Palette.Grey, 1.1));
        Marks.Disc(sheet, At(center.Item1, center.Item2), 3.4, Palette.Ink);
        sheet.Outline(plot, new CurvePen(Palette.Frame, 0.8));
        sheet.Write(new ScreenPoint((plot.Left + plot.Right) / 2, plot.Bottom + 24), "Along Shmin, microstrain", Small with { Bold = true }, HorizontalAlignment.Center);
        sheet.Write(new ScreenPoint(box.Left + 7, (plot.Top + plot.Bottom) / 2), "Along SHmax, microstrain", Small with { Bold = true }, HorizontalAlignment.Center, true);
    }

    private static double Micro(double strain) => Units.Microstrain.FromSi(strain);

    private static IEnumerable<(double X, double Y)> Ellipse(CalibrationResult result, int group)
    {
        var estimate = result.Strains[group];
        var (xx, xy, yy) = result.Covariances[group];
        if (!double.IsFinite(xx) || !double.IsFinite(yy)) yield break;
        // The lower triangle whose square is the covariance, stretched to the joint 95 % region of two parameters.
        var scale = 1e6 * result.JointQuantile;
        var a = Math.Sqrt(xx);
        var b = a > 0 ? xy / a : 0;
        var c = Math.Sqrt(Math.Max(0, yy - (b * b)));
        for (var k = 0; k < Points; k++)
        {
            var (sin, cos) = Math.SinCos(2 * Math.PI * k / Points);
            yield return (Micro(estimate.AlongShmin.Value) + (scale * a * cos), Micro(estimate.AlongShmax.Value) + (scale * ((b * cos) + (c * sin))));
        }
    }

    private static CurveScale Axis(IEnumerable<double> values)
    {
        var list = values.ToList();
        var (low, high) = (list.Min(), list.Max());
        var room = Math.Max(60, 0.12 * (high - low));
        return RoundSteps.Around(low - room, high + room, 6);
    }

    /// <summary>Tints where the strain along SHmax would be the lesser one.</summary>
    private static void DrawForbidden(Sheet sheet, CurveScale x, CurveScale y, Func<double, double, ScreenPoint> at)
    {
        var corners = Clip(x, y, (a, b) => a - b).ToList();
        if (corners.Count > 2) sheet.Fill(corners.Select(p => at(p.X, p.Y)), Palette.ZoneTint);
    }

    /// <summary>The part of the plot where a straight function is not negative.</summary>
    private static IEnumerable<(double X, double Y)> Clip(CurveScale x, CurveScale y, Func<double, double, double> inside)
    {
        (double X, double Y)[] corners = [(x.Left, y.Left), (x.Right, y.Left), (x.Right, y.Right), (x.Left, y.Right)];
        for (var k = 0; k < 4; k++)
        {
            var (a, b) = (corners[k], corners[(k + 1) % 4]);
            var (va, vb) = (inside(a.X, a.Y), inside(b.X, b.Y));
            if (va >= 0) yield return a;
            if (va * vb < 0) yield return (a.X + ((b.X - a.X) * va / (va - vb)), a.Y + ((b.Y - a.Y) * va / (va - vb)));
        }
    }

    private static void DrawGrid(Sheet sheet, OxyRect plot, CurveScale x, CurveScale y, Func<double, double, ScreenPoint> at)
    {
        var (stepX, stepY) = ((x.Right - x.Left) / x.Divisions, (y.Right - y.Left) / y.Divisions);
        for (var i = 0; i <= x.Divisions; i++)
        {
            var p = at(x.Left + (i * stepX), y.Left);
            sheet.Line(p.X, plot.Top, p.X, plot.Bottom, new CurvePen(Palette.Grid, 0.5));
            sheet.Write(new ScreenPoint(p.X, plot.Bottom + 9), RoundSteps.Show(x.Left + (i * stepX), stepX), Small, HorizontalAlignment.Center);
        }

        for (var i = 0; i <= y.Divisions; i++)
        {
            var p = at(x.Left, y.Left + (i * stepY));
            sheet.Line(plot.Left, p.Y, plot.Right, p.Y, new CurvePen(Palette.Grid, 0.5));
            sheet.Write(new ScreenPoint(plot.Left - 5, p.Y), RoundSteps.Show(y.Left + (i * stepY), stepY), Small, HorizontalAlignment.Right);
        }
    }

    /// <summary>The strains that meet each value observation, other groups as estimated, cut at the edges of the plot.</summary>
    private static IEnumerable<(IReadOnlyList<(double X, double Y)> Line, int Colour)> Lines(CalibrationResult result, int group, CurveScale x, CurveScale y)
    {
        var strains = result.Strains.SelectMany(s => new[] { s.AlongShmin.Value, s.AlongShmax.Value }).ToArray();
        foreach (var reading in result.AfterFit.Select(c => c.Reading).Where(r => r.OnStrains && r.Meaning == Meaning.Value))
        {
            double Miss(double a, double b)
            {
                (strains[2 * group], strains[(2 * group) + 1]) = (a * 1e-6, b * 1e-6);
                var (measured, modelled) = reading.At(strains);
                return modelled - measured;
            }

            var ends = Edges(x, y, Miss).ToList();
            if (ends.Count >= 2) yield return (ends, ResidualRows.Colour(reading));
        }
    }

    private static IEnumerable<(double X, double Y)> Edges(CurveScale x, CurveScale y, Func<double, double, double> value)
    {
        (double X, double Y)[] corners = [(x.Left, y.Left), (x.Right, y.Left), (x.Right, y.Right), (x.Left, y.Right)];
        var at = corners.Select(c => value(c.X, c.Y)).ToArray();
        for (var k = 0; k < 4; k++)
        {
            var (a, b, va, vb) = (corners[k], corners[(k + 1) % 4], at[k], at[(k + 1) % 4]);
            if (va * vb < 0) yield return (a.X + ((b.X - a.X) * va / (va - vb)), a.Y + ((b.Y - a.Y) * va / (va - vb)));
        }
    }
}
