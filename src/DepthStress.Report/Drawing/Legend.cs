using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>A mark with its name.</summary>
/// <param name="Mark">Draws the mark around a point.</param>
/// <param name="Text">Its name.</param>
internal sealed record LegendEntry(Action<Sheet, ScreenPoint> Mark, string Text)
{
    /// <summary>A line as an entry, a little wider than it is drawn.</summary>
    public static LegendEntry Line(CurvePen pen, string text) =>
        new((sheet, at) => sheet.Line(at.X - 11, at.Y, at.X + 11, at.Y, pen with { Width = pen.Width + 0.6 }), text);
}

/// <summary>Names of marks in rows.</summary>
internal static class Legend
{
    public const double LineHeight = 14;
    private const double TextAt = 28;
    private const double Gap = 16;
    private static readonly TextStyle Style = new(8);

    /// <summary>Draws the entries from a height on; the next row begins where the width ends. Gives the height of the last row.</summary>
    public static double Draw(Sheet sheet, IEnumerable<LegendEntry> entries, double left, double right, double y)
    {
        var x = left;
        foreach (var entry in entries)
        {
            var text = PlainText.Shorten(PlainText.Clean(entry.Text), Style.Size, false, right - left - TextAt);
            var width = TextAt + PlainText.Width(text, Style.Size, false);
            if (x > left && x + width > right) (x, y) = (left, y + LineHeight);
            entry.Mark(sheet, new ScreenPoint(x + 11, y));
            sheet.Write(new ScreenPoint(x + TextAt, y), text, Style);
            x += width + Gap;
        }

        return y;
    }
}
