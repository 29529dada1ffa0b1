using System.Globalization;
using System.Security;
using System.Text;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>How text looks.</summary>
/// <param name="Size">Height of the font, 1/96 inch.</param>
/// <param name="Colour">0xRRGGBB.</param>
/// <param name="Bold">True for bold type.</param>
internal readonly record struct TextStyle(double Size, int Colour = Palette.Text, bool Bold = false);

/// <summary>Text as it was placed, for checks of the layout.</summary>
internal readonly record struct PlacedText(string Text, OxyRect Box);

/// <summary>A page in units of 1/96 inch that is written as SVG, with its origin at the upper left.</summary>
internal sealed class Sheet : IDisposable
{
    private const string Fonts = "Helvetica, Arial, 'Liberation Sans', sans-serif";
    private const double Ascent = 0.74;
    private const double Descent = 0.22;

    private readonly MemoryStream _svg = new();
    private readonly SvgRenderContext _context;
    private readonly List<PlacedText> _texts = [];

    public Sheet(double width, double height)
    {
        (Width, Height) = (width, height);
        _context = new SvgRenderContext(_svg, width, height, false, PlainText.Context, OxyColors.White);
    }

    public double Width { get; }

    public double Height { get; }

    /// <summary>Every text on the page.</summary>
    public IReadOnlyList<PlacedText> Texts => _texts;

    /// <summary>Writes one line of text, its vertical middle at a point; a rotated one reads upwards.</summary>
    public void Write(ScreenPoint at, string text, TextStyle style, HorizontalAlignment align = HorizontalAlignment.Left, bool rotated = false)
    {
        text = PlainText.Clean(text);
        if (text.Length == 0) return;
        var (width, drop) = (PlainText.Width(text, style.Size, style.Bold), (Ascent - Descent) / 2 * style.Size);
        var start = align switch { HorizontalAlignment.Left => 0, HorizontalAlignment.Center => -width / 2, _ => -width };
        var baseline = rotated ? new ScreenPoint(at.X + drop, at.Y) : new ScreenPoint(at.X, at.Y + drop);
        var (up, height) = (-(Ascent + Descent) / 2 * style.Size, (Ascent + Descent) * style.Size);
        _texts.Add(new PlacedText(text, rotated
            ? new OxyRect(at.X + up, at.Y - start - width, height, width)
            : new OxyRect(at.X + start, at.Y + up, width, height)));
        _context.DrawText(
            Round(baseline), text, Colour(style.Colour), Fonts, style.Size, style.Bold ? 700 : 400, rotated ? -90 : 0, align,
            VerticalAlignment.Bottom, null);
    }

    /// <summary>Draws a line through points.</summary>
    public void Line(IEnumerable<ScreenPoint> points, CurvePen pen)
    {
        var rounded = new List<ScreenPoint>();
        foreach (var point in points.Select(Round))
        {
            if (rounded.Count == 0 || !rounded[^1].Equals(point)) rounded.Add(point);
        }

        if (rounded.Count < 2) return;
        double[]? dash = pen.Dash is null ? null : [.. pen.Dash.Select(d => d * pen.Width)];
        _context.DrawLine(rounded, Colour(pen.Colour), pen.Width, EdgeRenderingMode.Adaptive, dash, LineJoin.Round);
    }

    /// <summary>Draws a straight line.</summary>
    public void Line(double x0, double y0, double x1, double y1, CurvePen pen) => Line([new(x0, y0), new(x1, y1)], pen);

    /// <summary>Fills a rectangle.</summary>
    public void Fill(OxyRect box, int colour)
    {
        if (box.Width <= 0 || box.Height <= 0) return;
        var (from, to) = (Round(new ScreenPoint(box.Left, box.Top)), Round(new ScreenPoint(box.Right, box.Bottom)));
        _context.DrawRectangle(new OxyRect(from, to), Colour(colour), OxyColors.Undefined, 0, EdgeRenderingMode.Adaptive);
    }

    /// <summary>Draws the outline of a rectangle.</summary>
    public void Outline(OxyRect box, CurvePen pen) => Line(
        [new(box.Left, box.Top), new(box.Right, box.Top), new(box.Right, box.Bottom), new(box.Left, box.Bottom), new(box.Left, box.Top)], pen);

    /// <summary>Fills a polygon.</summary>
    public void Fill(IEnumerable<ScreenPoint> corners, int colour) => _context.DrawPolygon(
        [.. corners.Select(Round)], Colour(colour), OxyColors.Undefined, 0, EdgeRenderingMode.Adaptive, null, LineJoin.Miter);

    /// <summary>Writes the page as SVG: UTF-8, line feeds, scalable, with its title for readers that cannot see it.</summary>
    public void WriteTo(Stream destination, string title)
    {
        _context.Complete();
        _context.Flush();
        var drawn = Encoding.UTF8.GetString(_svg.ToArray()).Replace("\r\n", "\n", StringComparison.Ordinal);
        var body = drawn[(drawn.IndexOf('>', drawn.IndexOf("<svg", StringComparison.Ordinal)) + 1)..].TrimEnd();
        var head = string.Create(
            CultureInfo.InvariantCulture,
            $"<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"{Width:0.##}\" height=\"{Height:0.##}\" viewBox=\"0 0 {Width:0.##} {Height:0.##}\" role=\"img\">\n  <title>{SecurityElement.Escape(PlainText.Clean(title))}</title>");
        destination.Write(Encoding.UTF8.GetBytes(head + body + "\n"));
    }

    public void Dispose()
    {
        _context.Dispose();
        _svg.Dispose();
    }

    private static OxyColor Colour(int rgb) => OxyColor.FromUInt32(0xFF000000 | (uint)rgb);

    private static ScreenPoint Round(ScreenPoint point) => new(Math.Round(point.X, 1), Math.Round(point.Y, 1));
}
