using DepthStress.Report.Drawing;
using OxyPlot;

namespace DepthStress.Tests.Report;

/// <summary>What holds of every picture.</summary>
internal static class SheetChecks
{
    public static void NoTextOverlapsOrIsCutOff(Sheet sheet)
    {
        var page = new OxyRect(0, 0, sheet.Width, sheet.Height);
        Assert.NotEmpty(sheet.Texts);
        Assert.All(sheet.Texts, t => Assert.True(Contains(page, t.Box), $"\"{t.Text}\" is cut off"));
        for (var i = 0; i < sheet.Texts.Count; i++)
        {
            for (var j = i + 1; j < sheet.Texts.Count; j++)
                Assert.False(Overlap(sheet.Texts[i].Box, sheet.Texts[j].Box), $"\"{sheet.Texts[i].Text}\" overlaps \"{sheet.Texts[j].Text}\"");
        }
    }

    /// <summary>On A4 no letter is smaller than 6 points, 1/72 inch.</summary>
    public static void IsLegibleOnA4(Sheet sheet)
    {
        var (width, height) = sheet.Width > sheet.Height ? (PdfPaper.LongSide, PdfPaper.ShortSide) : (PdfPaper.ShortSide, PdfPaper.LongSide);
        var scale = Math.Min(width / sheet.Width, height / sheet.Height);
        Assert.All(sheet.Texts, t => Assert.True(t.Style.Size * scale >= 5.999, $"\"{t.Text}\" is printed too small")); // A4 is no whole number of points
    }

    private static bool Overlap(OxyRect a, OxyRect b) =>
        Math.Min(a.Right, b.Right) - Math.Max(a.Left, b.Left) > 0.01 && Math.Min(a.Bottom, b.Bottom) - Math.Max(a.Top, b.Top) > 0.01;

    private static bool Contains(OxyRect page, OxyRect box) => box.Left >= 0 && box.Top >= 0 && box.Right <= page.Right && box.Bottom <= page.Bottom;
}
