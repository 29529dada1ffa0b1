using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>How text looks.</summary>
/// <param name="Size">Height of the font, 1/96 inch.</param>
/// <param name="Colour">0xRRGGBB.</param>
/// <param name="Bold">True for bold type.</param>
internal readonly record struct TextStyle(double Size, int Colour = Palette.Text, bool Bold = false);

/// <summary>Text as it was placed, for checks of the layout.</summary>
internal readonly record struct PlacedText(string Text, OxyRect Box, TextStyle Style);

/// <summary>A page in units of 1/96 inch with its origin at the upper left; it keeps what is drawn, for paper of any kind.</summary>
internal sealed class Sheet(double width, double height, string title)
{
    private const double Ascent = 0.74;
    private const double Descent = 0.22;

    private readonly List<Action<IPaper>> _drawn = [];
    private readonly List<PlacedText> _texts = [];

    public double Width => width;

    public double Height => height;

    /// <summary>What the page shows, as clean text.</summary>
    public string Title { get; } = PlainText.Clean(title);

    /// <summary>Every text on the page.</summary>
    public IReadOnlyList<PlacedText> Texts => _texts;

    /// <summary>Writes one line of text, its vertical middle at a point; a rotated one reads upwards.</summary>
    public void Write(ScreenPoint at, string text, TextStyle style, HorizontalAlignment align = HorizontalAlignment.Left, bool rotated = false)
    {
        text = PlainText.Clean(text);
        if (text.Length == 0) return;
        var (length, drop) = (PlainText.Width(text, style.Size, style.Bold), (Ascent - Descent) / 2 * style.Size);
        var start = align switch { HorizontalAlignment.Left => 0, HorizontalAlignment.Center => -length / 2, _ => -length };
        var baseline = Round(rotated ? new ScreenPoint(at.X + drop, at.Y) : new ScreenPoint(at.X, at.Y + drop));
        var (up, line) = (-(Ascent + Descent) / 2 * style.Size, (Ascent + Descent) * style.Size);
        var box = rotated ? new OxyRect(at.X + up, at.Y - start - length, line, length) : new OxyRect(at.X + start, at.Y + up, length, line);
        _texts.Add(new PlacedText(text, box, style));
        _drawn.Add(p => p.Write(baseline, text, style, align, rotated));
    }

    /// <summary>Draws a line through points.</summary>
    public void Line(IEnumerable<ScreenPoint> points, CurvePen pen)
    {
        var rounded = new List<ScreenPoint>();
        foreach (var point in points.Select(Round))
        {
            if (rounded.Count == 0 || !rounded[^1].Equals(point)) rounded.Add(point);
        }

        if (rounded.Count >= 2) _drawn.Add(p => p.Line(rounded, pen));
    }

    /// <summary>Draws a straight line.</summary>
    public void Line(double x0, double y0, double x1, double y1, CurvePen pen) => Line([new(x0, y0), new(x1, y1)], pen);

    /// <summary>Fills a rectangle.</summary>
    public void Fill(OxyRect box, int colour)
    {
        if (box.Width <= 0 || box.Height <= 0) return;
        var rounded = new OxyRect(Round(new ScreenPoint(box.Left, box.Top)), Round(new ScreenPoint(box.Right, box.Bottom)));
        _drawn.Add(p => p.Fill(rounded, colour));
    }

    /// <summary>Draws the outline of a rectangle.</summary>
    public void Outline(OxyRect box, CurvePen pen) => Line(
        [new(box.Left, box.Top), new(box.Right, box.Top), new(box.Right, box.Bottom), new(box.Left, box.Bottom), new(box.Left, box.Top)], pen);

    /// <summary>Fills a polygon.</summary>
    public void Fill(IEnumerable<ScreenPoint> corners, int colour)
    {
        ScreenPoint[] rounded = [.. corners.Select(Round)];
        _drawn.Add(p => p.Fill(rounded, colour));
    }

    /// <summary>Draws everything on paper, in the order it was drawn here.</summary>
    public void DrawOn(IPaper paper)
    {
        foreach (var draw in _drawn) draw(paper);
    }

    private static ScreenPoint Round(ScreenPoint point) => new(Math.Round(point.X, 1), Math.Round(point.Y, 1));
}
