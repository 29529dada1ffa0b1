using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Stress;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>One depth of the stress polygon picture: its name, its plot, and the numbers below.</summary>
internal static class PolygonPanel
{
    private const double HeadHeight = 34;
    private const double Line = 11;
    private const int Lines = 7;
    private const double OuterFriction = 1;

    /// <summary>Width over height from which a cell is wide, and the share of it that the plot then takes at most.</summary>
    private const double Wide = 1.3, PlotShare = 0.66;

    private const double Margin = 6;
    private const double TextGap = 24;
    private static readonly TextStyle Small = new(8);
    private static readonly TextStyle Name = new(9.5, Palette.Text, true);

    /// <summary>Draws the panel into its cell of the page.</summary>
    public static void Draw(Sheet sheet, StressState state, string datum, UnitSystem units, OxyRect cell)
    {
        // A wide cell has its texts beside the plot, a high one around it.
        var wide = cell.Width > Wide * cell.Height;
        var side = wide
            ? Math.Min(cell.Height - PolygonPlot.AxisHeight - Margin, (cell.Width * PlotShare) - PolygonPlot.AxisWidth)
            : Math.Min(cell.Width - PolygonPlot.AxisWidth, cell.Height - HeadHeight - PolygonPlot.AxisHeight - (Lines * Line));
        var left = wide ? cell.Left : cell.Left + ((cell.Width - PolygonPlot.AxisWidth - side) / 2);
        var box = new OxyRect(left + PolygonPlot.AxisWidth, cell.Top + (wide ? Margin : HeadHeight), side, side);
        if (wide) left = box.Right + TextGap;
        var width = cell.Right - left;
        if (state.Zone.Length > 0) sheet.Write(new ScreenPoint(left, cell.Top + 6), PlainText.Shorten(PlainText.Clean(state.Zone), Name.Size, true, width), Name);
        var depth = $"{units.Show(Quantity.Length(state.MeasuredDepth))} md, {units.Show(Quantity.Length(state.TrueVerticalDepth))} tvd below {datum}";
        sheet.Write(new ScreenPoint(left, cell.Top + 19), PlainText.Shorten(depth, Small.Size, false, width), Small);

        var polygon = new StressPolygon(state.Vertical, state.Pore, state.Friction);
        if (polygon.Exists) new PolygonPlot(sheet, state, polygon, polygon with { Friction = OuterFriction }, units, box).Draw();
        else sheet.Outline(box, new CurvePen(Palette.Frame, 0.8));
        var y = wide ? cell.Top + HeadHeight + Line : box.Bottom + PolygonPlot.AxisHeight + (Line / 2);
        var texts = PolygonTexts.Of(state, polygon, polygon with { Friction = OuterFriction }, units)
            .SelectMany(t => PlainText.Wrap(t, Small.Size, false, width, wide ? 4 : 2)).Take(wide ? (int)((cell.Height - HeadHeight) / Line) - 1 : Lines);
        foreach (var text in texts)
        {
            sheet.Write(new ScreenPoint(left, y), text, Small);
            y += Line;
        }
    }
}
