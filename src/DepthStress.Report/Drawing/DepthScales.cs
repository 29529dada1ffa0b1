using DepthStress.Core.Depth;
using DepthStress.Core.Quantities;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>The depth scales at the left of a page.</summary>
internal static class DepthScales
{
    private const double LabelSpacing = 38;
    private const double LabelHeight = 10;
    private const double Tick = 4;
    private const double StepsUnlabelled = 2.5;
    private static readonly TextStyle Head = new(9, Palette.Text, true);
    private static readonly TextStyle Note = new(8, Palette.FaintText);
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

    /// <summary>Names the axis of true vertical depth, reading upwards beside it.</summary>
    public static void DrawTitle(Sheet sheet, DepthFrame frame, UnitSystem units, DepthAxis axis, double x) => sheet.Write(
        new ScreenPoint(x, (axis.ScreenTop + axis.ScreenBase) / 2),
        $"True vertical depth below {PageTexts.Datum(frame)}, {units.UnitFor(Dimension.Length).Unit.Symbol}",
        new TextStyle(9.5, Palette.Text, true), HorizontalAlignment.Center, true);

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
        var (step, above) = (axis.Step(LabelSpacing), axis.ScreenTop - LabelHeight);
        var unlabelled = StepsUnlabelled * step / axis.Pixel;
        for (var i = 0; i < own.Length; i++)
        {
            var previous = Math.Max(0, i - 1);
            foreach (var round in Passed(other[previous], other[i], step))
            {
                var part = i == 0 ? 0 : (round - other[previous]) / (other[i] - other[previous]);
                Label(axis.ToScreen(own[previous] + ((own[i] - own[previous]) * part)), LabelHeight, RoundSteps.Show(round, step));
            }

            var y = axis.ToScreen(own[i]);
            if (y - above >= unlabelled && double.IsFinite(other[i])) Label(y, unlabelled, RoundSteps.Show(other[i], Math.Min(step, 0.1)));
        }

        void Label(double y, double spacing, string text)
        {
            if (y - above < spacing) return;
            DrawLabel(sheet, axis, y, text, labelRight);
            above = Inside(axis, y);
        }
    }

    /// <summary>The round values from one depth to the next, in the order they are passed.</summary>
    private static double[] Passed(double from, double to, double step)
    {
        var (low, high) = (Math.Min(from, to), Math.Max(from, to));
        if (!double.IsFinite(from) || !double.IsFinite(to) || (from != to && Math.Floor(low / step) == Math.Floor(high / step) && low % step != 0)) return [];
        var passed = RoundSteps.Between(low, high, step);
        return [.. from <= to ? passed : passed.Reverse()];
    }

    private static void DrawLabel(Sheet sheet, DepthAxis axis, double y, string text, double right)
    {
        sheet.Line(right - Tick, y, right, y, TickPen);
        sheet.Write(new ScreenPoint(right - Tick - 2, Inside(axis, y)), text, Number, HorizontalAlignment.Right);
    }

    private static double Inside(DepthAxis axis, double y) => Math.Clamp(y, axis.ScreenTop + (LabelHeight / 2), axis.ScreenBase - (LabelHeight / 2));
}
