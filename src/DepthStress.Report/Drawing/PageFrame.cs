using DepthStress.Core.Model;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>What every page has around its plots: a title above, the caution below.</summary>
internal static class PageFrame
{
    public const double Margin = 26;
    public const double TitleHeight = 42;

    /// <summary>The long side of A4, 297 mm in 1/96 inch.</summary>
    public const double LongSide = 1122.5;

    /// <summary>The short side of A4, 210 mm in 1/96 inch.</summary>
    public const double ShortSide = 793.7;

    private const double CautionLine = 9.5;
    private static readonly TextStyle Title = new(15, Palette.Text, true);
    private static readonly TextStyle Subtitle = new(9, Palette.FaintText);
    private static readonly TextStyle Small = new(8, Palette.FaintText);

    /// <summary>Height of the caution on a page of some width.</summary>
    public static double CautionHeight(double pageWidth) => (CautionLines(pageWidth).Count * CautionLine) + 4;

    /// <summary>Draws the well's name with what the page shows, and the surfaces its depths count from.</summary>
    public static void DrawTitle(Sheet sheet, string well, string subject, string subtitle)
    {
        var room = sheet.Width - (2 * Margin);
        var tail = " \u00b7 " + subject;
        var name = PlainText.Shorten(PlainText.Clean(well), Title.Size, true, room - PlainText.Width(tail, Title.Size, true));
        sheet.Write(new ScreenPoint(Margin, Margin + 8), name + tail, Title);
        sheet.Write(new ScreenPoint(Margin, Margin + 26), PlainText.Shorten(subtitle, Subtitle.Size, false, room), Subtitle);
    }

    /// <summary>Draws the caution at the foot.</summary>
    public static void DrawCaution(Sheet sheet)
    {
        var lines = CautionLines(sheet.Width);
        var y = sheet.Height - Margin - ((lines.Count - 0.5) * CautionLine);
        foreach (var line in lines)
        {
            sheet.Write(new ScreenPoint(Margin, y), line, Small);
            y += CautionLine;
        }
    }

    private static IReadOnlyList<string> CautionLines(double pageWidth) =>
        PlainText.Wrap(Caution.Text, Small.Size, false, pageWidth - (2 * Margin), 6);
}
