using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>The depth scales at the left of a page.</summary>
internal static class DepthScales
{
    private const double LabelSpacing = 38;
    private const double LabelHeight = 10;
    private const double Tick = 4;
    private const double Unlabelled = 70;
    private static readonly TextStyle Head = new(9, Palette.Text, true);
    private static readonly TextStyle Note = new(7.5, Palette.FaintText);
    private static readonly TextStyle Number = new(8);
    private static readonly CurvePen TickPen = new(Palette.Frame, 0.6);

    /// <summary>Draws the name of a scale, its unit and what it counts from, ending at a line on the page.</summary>
    public static void DrawHead(Sheet sheet, string name, string unit, string datum, double left, double width, double bottom)
    {
        var lines = PlainText.Wrap($"below {datum}", Note.Size, false, width - 2, 4);
        var y = bottom - 6 - ((lines.Count - 1) * 9);
        sheet.Write(new ScreenPoint(left, y - 12), $"{name}, {unit}", Head);
        foreach (var line in lines)
        {
            sheet.Write(new ScreenPoint(left, y), line, Note);
            y += 9;
        }
    }

    /// <summary>Draws the scale of the axis itself, its labels ending at a line, and the grid lines to the right of it.</summary>
    public static void DrawOwn(Sheet sheet, DepthAxis axis, double labelRight, double gridLeft, double gridRight)
    {
        var step = axis.Step(LabelSpacing);
        foreach (var depth in RoundSteps.Between(axis.Top, axis.Base, step))
        {
            var y = axis.ToScreen(depth);
            sheet.Line(gridLeft, y, gridRight, y, new CurvePen(Palette.DepthGrid, 0.5));
            DrawLabel(sheet, axis, y, RoundSteps.Show(depth, step), labelRight);
        }
    }

    /// <summary>
    /// Draws a second depth along the axis: round values where the samples pass them, and the value itself where a long
    /// stretch, such as a level hole, passes none.
    /// </summary>
    /// <param name="sheet">The page.</param>
    /// <param name="axis">The axis.</param>
    /// <param name="own">Depth of each sample on the axis, growing.</param>
    /// <param name="other">The second depth of each sample.</param>
    /// <param name="labelRight">Where labels end.</param>
    public static void DrawOther(Sheet sheet, DepthAxis axis, ReadOnlySpan<double> own, ReadOnlySpan<double> other, double labelRight)
    {
        if (own.IsEmpty) return;
        var (step, above) = (axis.Step(LabelSpacing), axis.ScreenTop - Unlabelled);
        for (var i = 0; i < own.Length; i++)
        {
            var y = axis.ToScreen(own[i]);
            if (i > 0 && Passed(other[i - 1], other[i], step) is { } round)
            {
                var at = axis.ToScreen(own[i - 1] + ((own[i] - own[i - 1]) * (round - other[i - 1]) / (other[i] - other[i - 1])));
                if (at - above < LabelHeight) continue;
                DrawLabel(sheet, axis, at, RoundSteps.Show(round, step), labelRight);
                above = at;
            }
            else if (y - above >= Unlabelled && double.IsFinite(other[i]))
            {
                DrawLabel(sheet, axis, y, RoundSteps.Show(other[i], 0.1), labelRight);
                above = y;
            }
        }
    }

    /// <summary>The round value that lies between two depths, the deeper one included.</summary>
    private static double? Passed(double from, double to, double step)
    {
        var (low, high) = (Math.Min(from, to), Math.Max(from, to));
        var round = Math.Floor(high / step) * step;
        return round > low && high > low ? round : null;
    }

    private static void DrawLabel(Sheet sheet, DepthAxis axis, double y, string text, double right)
    {
        sheet.Line(right - Tick, y, right, y, TickPen);
        var inside = Math.Clamp(y, axis.ScreenTop + (LabelHeight / 2), axis.ScreenBase - (LabelHeight / 2));
        sheet.Write(new ScreenPoint(right - Tick - 2, inside), text, Number, HorizontalAlignment.Right);
    }
}
