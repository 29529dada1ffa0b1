using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>What a panel of a profile has around its curves: title, scale, grid lines, edge.</summary>
internal static class PanelFrame
{
    /// <summary>Room for the title and the numbers above a panel.</summary>
    public const double Height = 34;

    private const double TitleLine = 11;
    private static readonly TextStyle Small = new(8);
    private static readonly TextStyle Title = new(9.5, Palette.Text, true);

    /// <summary>Draws what lies behind the curves.</summary>
    /// <param name="sheet">The page.</param>
    /// <param name="panel">The panel.</param>
    /// <param name="title">What it shows, with the unit; two lines at most.</param>
    /// <param name="beyond">How much wider than the panel the title may be.</param>
    public static void Open(Sheet sheet, Panel panel, string title, double beyond = 20)
    {
        var (axis, scale) = (panel.Depth, panel.Scale);
        var lines = PlainText.Wrap(title, Title.Size, true, panel.Right - panel.Left + beyond, 2);
        for (var i = 0; i < lines.Count; i++)
        {
            var y = axis.ScreenTop - 26 - ((lines.Count - 1 - i) * TitleLine);
            sheet.Write(new ScreenPoint((panel.Left + panel.Right) / 2, y), lines[i], Title, HorizontalAlignment.Center);
        }

        var step = (scale.Right - scale.Left) / scale.Divisions;
        for (var i = 0; i <= scale.Divisions; i++)
        {
            var x = panel.Across(scale.Left + (i * step));
            sheet.Line(x, axis.ScreenTop, x, axis.ScreenBase, new CurvePen(Palette.Grid, 0.5));
            sheet.Line(x, axis.ScreenTop - 4, x, axis.ScreenTop, new CurvePen(Palette.Frame, 0.6));
            sheet.Write(new ScreenPoint(x, axis.ScreenTop - 10), RoundSteps.Show(scale.Left + (i * step), Math.Abs(step)), Small, HorizontalAlignment.Center);
        }
    }

    /// <summary>Draws the edge, and below it how many samples and observations lie off the scale.</summary>
    public static void Close(Sheet sheet, Panel panel, IReadOnlyList<CurveTrace> drawn, int observationsOff = 0)
    {
        var axis = panel.Depth;
        sheet.Outline(new OxyRect(panel.Left, axis.ScreenTop, panel.Right - panel.Left, axis.ScreenBase - axis.ScreenTop), new CurvePen(Palette.Frame, 0.8));
        var off = drawn.Where(t => t.OffScale > 0).Select(t => (drawn.Count > 1 ? t.Curve.Label.Split(',')[0] + ": " : "") + PageTexts.OffScale(t.OffScale)).ToList();
        if (observationsOff > 0) off.Add($"observations: {PageTexts.OffScale(observationsOff)}");
        sheet.Write(
            new ScreenPoint(panel.Left, axis.ScreenBase + 9), PlainText.Shorten(string.Join(", ", off), Small.Size, false, panel.Right - panel.Left), Small);
    }
}
