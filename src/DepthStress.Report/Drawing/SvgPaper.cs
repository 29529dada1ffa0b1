using System.Globalization;
using System.Security;
using System.Text;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>A sheet as SVG.</summary>
internal sealed class SvgPaper : IPaper, IDisposable
{
    private const string Fonts = "Helvetica, Arial, 'Liberation Sans', sans-serif";

    private readonly MemoryStream _svg = new();
    private readonly SvgRenderContext _context;

    private SvgPaper(Sheet sheet) => _context = new SvgRenderContext(_svg, sheet.Width, sheet.Height, false, PlainText.Context, OxyColors.White);

    /// <summary>Writes a sheet: UTF-8, line feeds, scalable, with its title for readers that cannot see it.</summary>
    public static void Write(Sheet sheet, Stream destination)
    {
        using var paper = new SvgPaper(sheet);
        sheet.DrawOn(paper);
        paper._context.Complete();
        paper._context.Flush();
        var drawn = Encoding.UTF8.GetString(paper._svg.ToArray()).Replace("\r\n", "\n", StringComparison.Ordinal);
        var body = drawn[(drawn.IndexOf('>', drawn.IndexOf("<svg", StringComparison.Ordinal)) + 1)..].TrimEnd();
        var head = string.Create(
            CultureInfo.InvariantCulture,
            $"<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"{sheet.Width:0.##}\" height=\"{sheet.Height:0.##}\" viewBox=\"0 0 {sheet.Width:0.##} {sheet.Height:0.##}\" role=\"img\">\n  <title>{SecurityElement.Escape(sheet.Title)}</title>");
        destination.Write(Encoding.UTF8.GetBytes(head + body + "\n"));
    }

    public void Line(IList<ScreenPoint> points, CurvePen pen)
    {
        double[]? dash = pen.Dash is null ? null : [.. pen.Dash.Select(d => d * pen.Width)];
        _context.DrawLine(points, Colour(pen.Colour), pen.Width, EdgeRenderingMode.Adaptive, dash, LineJoin.Round);
    }

    public void Fill(OxyRect box, int colour) =>
        _context.DrawRectangle(box, Colour(colour), OxyColors.Undefined, 0, EdgeRenderingMode.Adaptive);

    public void Fill(IList<ScreenPoint> corners, int colour) =>
        _context.DrawPolygon(corners, Colour(colour), OxyColors.Undefined, 0, EdgeRenderingMode.Adaptive, null, LineJoin.Miter);

    public void Write(ScreenPoint baseline, string text, TextStyle style, HorizontalAlignment align, bool rotated) => _context.DrawText(
        baseline, text, Colour(style.Colour), Fonts, style.Size, style.Bold ? 700 : 400, rotated ? -90 : 0, align, VerticalAlignment.Bottom, null);

    public void Dispose()
    {
        _context.Dispose();
        _svg.Dispose();
    }

    private static OxyColor Colour(int rgb) => OxyColor.FromUInt32(0xFF000000 | (uint)rgb);
}
