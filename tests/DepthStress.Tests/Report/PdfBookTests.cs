using System.Text;
using DepthStress.Core.Layers;
using DepthStress.Core.Quantities;
using DepthStress.Report;
using DepthStress.Report.Drawing;
using OxyPlot;
using UglyToad.PdfPig;
using UglyToad.PdfPig.Content;
using UglyToad.PdfPig.Fonts.Standard14Fonts;

namespace DepthStress.Tests.Report;

/// <summary>Sheets in a PDF, read back by the package's own reader.</summary>
public class PdfBookTests
{
    /// <summary>1/72 inch: places on a sheet are rounded to tenths of 1/96 inch.</summary>
    private const double Near = 0.05;

    private static byte[] Written(string title, params Sheet[] sheets)
    {
        using var bytes = new MemoryStream();
        PdfBook.Write(sheets, title, bytes);
        return bytes.ToArray();
    }

    private static Sheet Upright() => new(PageFrame.ShortSide, PageFrame.LongSide, "upright");

    private static string Read(string text)
    {
        var sheet = Upright();
        sheet.Write(new ScreenPoint(100, 100), text, new TextStyle(10));
        sheet.Write(new ScreenPoint(100, 200), text, new TextStyle(10, Bold: true));
        using var document = PdfDocument.Open(Written("letters", sheet));
        var read = document.GetPage(1).Text;
        Assert.Equal(read[..(read.Length / 2)], read[(read.Length / 2)..]);
        return read[..(read.Length / 2)];
    }

    [Fact]
    public void The_same_pictures_give_the_same_bytes_and_no_date()
    {
        var (first, second) = (Pictures(), Pictures());
        Assert.Equal(first, second);
        Assert.DoesNotContain("Date", Encoding.Latin1.GetString(first), StringComparison.Ordinal);
        Assert.NotEqual(Identifier(first), Identifier(Written("other", Upright())));
    }

    [Fact]
    public void Pages_are_A4_as_the_sheets_lie_and_hold_all_their_texts()
    {
        var model = PictureModels.Full(400, "S\u00f8r 4/7 \u2013 \u00c6rfugl");
        var options = new PictureOptions(UnitSystem.Metric);
        Sheet[] sheets =
        [
            TracksPicture.Draw(model, options), StressPicture.Draw(model, UnitSystem.Metric),
            LayersPicture.Draw(model, PictureModels.Layers(model, 150), new LayerSettings(), UnitSystem.Metric), PolygonPicture.Draw(model, options),
        ];
        using var document = PdfDocument.Open(Written("a title", sheets));
        Assert.Equal("a title", document.Information.Title);
        Assert.Equal([(841.89, 595.276), (595.276, 841.89), (841.89, 595.276), (841.89, 595.276)], document.GetPages().Select(p => (p.Width, p.Height)));
        for (var k = 0; k < sheets.Length; k++)
        {
            Assert.Contains(sheets[k].Texts, t => t.Text.StartsWith("S\u00f8r 4/7 \u2013 \u00c6rfugl", StringComparison.Ordinal));
            Assert.Equal(string.Concat(sheets[k].Texts.Select(t => t.Text)), document.GetPage(k + 1).Text);
        }
    }

    [Fact]
    public void A_font_is_named_and_none_is_inside()
    {
        var sheet = Upright();
        sheet.Write(new ScreenPoint(10, 20), "plain", new TextStyle(10));
        sheet.Write(new ScreenPoint(10, 40), "bold", new TextStyle(12, Bold: true));
        var bytes = Written("fonts", sheet);
        using var document = PdfDocument.Open(bytes);
        var letters = document.GetPage(1).Letters;
        Assert.Equal(["Helvetica", "Helvetica-Bold"], letters.Select(l => l.FontName).Distinct());
        Assert.Equal(7.5, letters[0].PointSize, Near); // 10 of 1/96 inch in 1/72 inch
        Assert.DoesNotContain("FontFile", Encoding.Latin1.GetString(bytes), StringComparison.Ordinal);
    }

    [Fact]
    public void Letters_of_Western_Europe_stay() =>
        Assert.Equal("\u00f8\u00e6\u00e9\u00fc\u00b0\u00b7\u00b5\u00b2\u2026\u2013\u20ac(a\\b) 45%", Read("\u00f8\u00e6\u00e9\u00fc\u00b0\u00b7\u00b5\u00b2\u2026\u2013\u20ac(a\\b) 45%"));

    [Theory]
    [InlineData("\u041f\u043b\u0430\u0441\u0442 7", "????? 7")]
    [InlineData("\u7802\u5ca9", "??")]
    [InlineData("a \U0001F30B b", "a ? b")]
    [InlineData("e\u0301", "\u00e9")] // two code points that make one letter
    [InlineData("\u0141\u0105ka", "??ka")]
    [InlineData("a\uD800b", "ab")]
    public void Other_letters_become_question_marks_and_nothing_fails(string text, string expected) => Assert.Equal(expected, Read(text));

    [Fact]
    public void Every_letter_of_the_code_page_has_a_width()
    {
        int[] unused = [0x7F, 0x81, 0x8D, 0x8F, 0x90, 0x9D];
        foreach (var code in Enumerable.Range(0x20, 0xE0).Except(unused))
        {
            Assert.InRange(PdfText.Width([(byte)code], Standard14Font.Helvetica), 0.1, 1.1);
            Assert.InRange(PdfText.Width([(byte)code], Standard14Font.HelveticaBold), 0.1, 1.1);
        }
    }

    [Fact]
    public void A_sheet_of_another_shape_fills_its_page_as_far_as_it_fits()
    {
        var sheet = new Sheet(2000, 1000, "wide");
        sheet.Line(0, 0, 2000, 1000, new CurvePen(Palette.Ink));
        using var document = PdfDocument.Open(Written("wide", sheet));
        Inside([0, (595.276 - 420.945) / 2, 841.89, (595.276 + 420.945) / 2], Assert.Single(document.GetPage(1).Paths));
    }

    [Fact]
    public void What_is_drawn_lies_where_it_lies_on_the_sheet()
    {
        var sheet = Upright();
        sheet.Line(100, 200, 300.4, 400.8, new CurvePen(0x336699, 2, [3, 1.5]));
        sheet.Fill(new OxyRect(50, 60, 70, 80), 0xFF0000);
        sheet.Write(new ScreenPoint(100, 500), "left", new TextStyle(12));
        sheet.Write(new ScreenPoint(400, 500), "right", new TextStyle(12), HorizontalAlignment.Right);
        sheet.Write(new ScreenPoint(400, 600), "middle", new TextStyle(12), HorizontalAlignment.Center);
        sheet.Write(new ScreenPoint(500, 700), "up", new TextStyle(12), HorizontalAlignment.Center, true);
        using var document = PdfDocument.Open(Written("places", sheet));
        var page = document.GetPage(1);
        double X(double x) => x * 0.75;
        double Y(double y) => 841.89 - (y * 0.75);

        var (line, box) = (page.Paths[0], page.Paths[1]);
        Inside([X(100), Y(400.8), X(300.4), Y(200)], line);
        Inside([X(50), Y(140), X(120), Y(60)], box);
        Assert.Equal((0.2, 0.4, 0.6), line.StrokeColor!.ToRGBValues());
        Assert.Equal((1.0, 0.0, 0.0), box.FillColor!.ToRGBValues());
        Assert.Equal([6, 3], line.LineDashPattern!.Value.Array); // lengths in line widths of 2

        var drop = 0.26 * 12; // from the middle of a line of text to its baseline
        AtBaseline(Word("left")[0].StartBaseLine, X(100), Y(500 + drop));
        AtBaseline(Word("right")[^1].EndBaseLine, X(400), Y(500 + drop));
        var middle = Word("middle");
        Assert.Equal(X(400), (middle[0].StartBaseLine.X + middle[^1].EndBaseLine.X) / 2, Near);
        var up = Word("up");
        Assert.Equal(X(500 + drop), up[0].StartBaseLine.X, Near);
        Assert.True(up[^1].EndBaseLine.Y > up[0].StartBaseLine.Y + 5);
        Assert.Equal(Y(700), (up[0].StartBaseLine.Y + up[^1].EndBaseLine.Y) / 2, Near);

        List<Letter> Word(string word)
        {
            var at = page.Text.IndexOf(word, StringComparison.Ordinal);
            return [.. page.Letters.Skip(at).Take(word.Length)];
        }
    }

    private static void AtBaseline(UglyToad.PdfPig.Core.PdfPoint point, double x, double y)
    {
        Assert.Equal(x, point.X, Near);
        Assert.Equal(y, point.Y, Near);
    }

    private static void Inside(double[] expected, UglyToad.PdfPig.Graphics.PdfPath path)
    {
        var box = path.GetBoundingRectangle()!.Value;
        Assert.Equal(expected, new[] { box.Left, box.Bottom, box.Right, box.Top }, (a, b) => Math.Abs(a - b) < Near);
    }

    private static byte[] Pictures()
    {
        var model = PictureModels.Full(200);
        using var bytes = new MemoryStream();
        new DrawnPictures(model, PictureModels.Layers(model, 200), new LayerSettings(), new PictureOptions(UnitSystem.Metric)).WritePdf(bytes);
        return bytes.ToArray();
    }

    private static string Identifier(byte[] document)
    {
        var text = Encoding.Latin1.GetString(document);
        var pair = text[(text.LastIndexOf("/ID [ <", StringComparison.Ordinal) + 7)..].Split('>')[0];
        Assert.Contains($"/ID [ <{pair}><{pair}>", text, StringComparison.Ordinal);
        return pair;
    }
}
