using OxyPlot;
using UglyToad.PdfPig.Core;
using UglyToad.PdfPig.Fonts.Standard14Fonts;
using UglyToad.PdfPig.Graphics.Core;
using UglyToad.PdfPig.Graphics.Operations;
using UglyToad.PdfPig.Graphics.Operations.General;
using UglyToad.PdfPig.Graphics.Operations.PathConstruction;
using UglyToad.PdfPig.Graphics.Operations.PathPainting;
using UglyToad.PdfPig.Graphics.Operations.SpecialGraphicsState;
using UglyToad.PdfPig.Graphics.Operations.TextObjects;
using UglyToad.PdfPig.Graphics.Operations.TextPositioning;
using UglyToad.PdfPig.Graphics.Operations.TextShowing;
using UglyToad.PdfPig.Graphics.Operations.TextState;
using UglyToad.PdfPig.Tokens;
using UglyToad.PdfPig.Writer;

namespace DepthStress.Report.Drawing;

/// <summary>A sheet as a page of a PDF: A4, upright or across as the sheet is, and the sheet as large as it fits, in its middle.</summary>
internal sealed class PdfPaper : IPaper
{
    /// <summary>The sides of A4, 210 mm and 297 mm in 1/72 inch.</summary>
    internal const double ShortSide = 595.276, LongSide = 841.89;

    private readonly List<IGraphicsStateOperation> _drawn;
    private readonly NameToken _plain;
    private readonly NameToken _bold;

    /// <summary>Adds a page.</summary>
    /// <param name="document">Gets the page.</param>
    /// <param name="plain">Helvetica in the document.</param>
    /// <param name="bold">Helvetica-Bold in the document.</param>
    /// <param name="sheet">What will be drawn.</param>
    public PdfPaper(PdfDocumentBuilder document, PdfDocumentBuilder.AddedFont plain, PdfDocumentBuilder.AddedFont bold, Sheet sheet)
    {
        var (width, height) = sheet.Width > sheet.Height ? (LongSide, ShortSide) : (ShortSide, LongSide);
        var page = document.AddPage(width, height);
        _drawn = page.CurrentStream.Operations;
        (_plain, _bold) = (NameOf(page, plain), NameOf(page, bold));

        // From the sheet, 1/96 inch downwards, to the page, 1/72 inch upwards.
        var scale = Math.Min(width / sheet.Width, height / sheet.Height);
        var (left, top) = ((width - (scale * sheet.Width)) / 2, (height + (scale * sheet.Height)) / 2);
        _drawn.Add(new ModifyCurrentTransformationMatrix([scale, 0, 0, -scale, left, top]));
        _drawn.Add(new SetLineJoin(LineJoinStyle.Round));
    }

    public void Line(IList<ScreenPoint> points, CurvePen pen)
    {
        var (red, green, blue) = Colour(pen.Colour);
        _drawn.Add(new SetStrokeColorDeviceRgb(red, green, blue));
        _drawn.Add(new SetLineWidth(pen.Width));
        _drawn.Add(new SetLineDashPattern([.. (pen.Dash ?? []).Select(d => Math.Round(d * pen.Width, 3))], 0));
        Path(points);
        _drawn.Add(StrokePath.Value);
    }

    public void Fill(OxyRect box, int colour) =>
        Fill([new(box.Left, box.Top), new(box.Right, box.Top), new(box.Right, box.Bottom), new(box.Left, box.Bottom)], colour);

    public void Fill(IList<ScreenPoint> corners, int colour)
    {
        SetFill(colour);
        Path(corners);
        _drawn.Add(FillPathNonZeroWinding.Value);
    }

    public void Write(ScreenPoint baseline, string text, TextStyle style, HorizontalAlignment align, bool rotated)
    {
        var codes = PdfText.Codes(text);
        var width = style.Size * PdfText.Width(codes, style.Bold ? Standard14Font.HelveticaBold : Standard14Font.Helvetica);
        var back = Math.Round(align switch { HorizontalAlignment.Left => 0, HorizontalAlignment.Center => width / 2, _ => width }, 3);
        SetFill(style.Colour);
        _drawn.Add(BeginText.Value);
        _drawn.Add(new SetFontAndSize(style.Bold ? _bold : _plain, style.Size));
        _drawn.Add(new SetTextMatrix(rotated ? [0, -1, -1, 0, baseline.X, baseline.Y + back] : [1, 0, 0, -1, baseline.X - back, baseline.Y]));
        _drawn.Add(new ShowText(codes));
        _drawn.Add(EndText.Value);
    }

    /// <summary>A font's name on a page. The page learns of a font only by writing with it, so a blank is written and taken out again.</summary>
    private static NameToken NameOf(PdfPageBuilder page, PdfDocumentBuilder.AddedFont font)
    {
        page.AddText(" ", 1, new PdfPoint(0, 0), font);
        var name = page.CurrentStream.Operations.OfType<SetFontAndSize>().Single().Font;
        page.CurrentStream.Operations.Clear();
        return name;
    }

    private static (double Red, double Green, double Blue) Colour(int rgb) => (Share(rgb >> 16), Share(rgb >> 8), Share(rgb));

    private static double Share(int value) => Math.Round((value & 0xFF) / 255.0, 4);

    private void SetFill(int colour)
    {
        var (red, green, blue) = Colour(colour);
        _drawn.Add(new SetNonStrokeColorDeviceRgb(red, green, blue));
    }

    private void Path(IList<ScreenPoint> points)
    {
        _drawn.Add(new BeginNewSubpath(points[0].X, points[0].Y));
        for (var i = 1; i < points.Count; i++) _drawn.Add(new AppendStraightLineSegment(points[i].X, points[i].Y));
    }
}
