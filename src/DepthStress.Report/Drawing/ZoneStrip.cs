using System.Globalization;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>Zones as bands behind the tracks, and as a strip with their names.</summary>
internal static class ZoneStrip
{
    private const double BarWidth = 7;
    private const double Room = 5;
    private static readonly TextStyle Head = new(9, Palette.Text, true);
    private static readonly TextStyle NameStyle = new(8);
    private static readonly CurvePen Edge = new(Palette.ZoneEdge, 0.5);
    private static readonly CurvePen Leader = new(Palette.FaintText, 0.4);

    /// <summary>The width a strip needs to show the longest name in one line, within bounds; 0 without zones.</summary>
    public static double Width(IReadOnlyList<ZoneSpan> zones) => zones.Count == 0
        ? 0
        : Math.Clamp(zones.Max(z => PlainText.Width(z.Name, NameStyle.Size, false)) + BarWidth + (3 * Room), 44, 120);

    /// <summary>Draws every other zone as a tint and each edge as a line.</summary>
    public static void DrawBands(Sheet sheet, IReadOnlyList<ZoneSpan> zones, DepthAxis depth, double left, double right)
    {
        foreach (var zone in zones)
        {
            var (top, bottom) = (depth.ToScreen(zone.Top), depth.ToScreen(zone.Base));
            if (zone.Zone % 2 == 0) sheet.Fill(new OxyRect(left, top, right - left, bottom - top), Palette.ZoneTint);
            sheet.Line(left, top, right, top, Edge);
            sheet.Line(left, bottom, right, bottom, Edge);
        }
    }

    /// <summary>
    /// Draws the strip with its head: a bar of the zones at its right edge, names to the left of it with a leader where they had to move;
    /// at a given height how many zones found no room for a name.
    /// </summary>
    public static void DrawNames(Sheet sheet, IReadOnlyList<ZoneSpan> zones, DepthAxis depth, double left, double right, double noteAt)
    {
        if (zones.Count == 0) return;
        sheet.Write(new ScreenPoint(right, depth.ScreenTop - 6), "Zone", Head, HorizontalAlignment.Right);
        var (bar, lineHeight) = (right - BarWidth, NameStyle.Size * 1.2);
        foreach (var zone in zones)
        {
            var (top, bottom) = (depth.ToScreen(zone.Top), depth.ToScreen(zone.Base));
            if (zone.Zone % 2 == 0) sheet.Fill(new OxyRect(bar, top, BarWidth, bottom - top), Palette.ZoneMark);
            sheet.Outline(new OxyRect(bar, top, BarWidth, bottom - top), Edge);
        }

        var width = bar - left - (2 * Room);
        var named = Named(zones, depth, lineHeight);
        if (named.Count < zones.Count)
        {
            var rest = string.Create(CultureInfo.InvariantCulture, $"{zones.Count - named.Count} unnamed");
            sheet.Write(new ScreenPoint(right, noteAt), rest, NameStyle, HorizontalAlignment.Right);
        }

        var labels = named.Select(z => (Zone: z, Lines: PlainText.Wrap(z.Name, NameStyle.Size, false, width, 2))).ToList();
        if (labels.Sum(l => l.Lines.Count) * lineHeight > depth.ScreenBase - depth.ScreenTop)
            labels = [.. labels.Select(l => (l.Zone, (IReadOnlyList<string>)[PlainText.Shorten(l.Zone.Name, NameStyle.Size, false, width)]))];
        double[] wanted = [.. labels.Select(l => depth.ToScreen((l.Zone.Top + l.Zone.Base) / 2))];
        var centres = LabelSpread.Place(wanted, [.. labels.Select(l => l.Lines.Count * lineHeight)], depth.ScreenTop, depth.ScreenBase);
        for (var i = 0; i < labels.Count; i++)
        {
            if (Math.Abs(centres[i] - wanted[i]) > 2) sheet.Line([new(bar, wanted[i]), new(bar - (Room * 0.8), centres[i])], Leader);
            var y = centres[i] - ((labels[i].Lines.Count - 1) * lineHeight / 2);
            foreach (var line in labels[i].Lines)
            {
                sheet.Write(new ScreenPoint(bar - Room, y), line, NameStyle, HorizontalAlignment.Right);
                y += lineHeight;
            }
        }
    }

    /// <summary>The zones that get a name: all, or the thickest when there is no room for all.</summary>
    private static IReadOnlyList<ZoneSpan> Named(IReadOnlyList<ZoneSpan> zones, DepthAxis depth, double lineHeight)
    {
        var room = (int)((depth.ScreenBase - depth.ScreenTop) / lineHeight);
        return zones.Count <= room ? zones : [.. zones.OrderByDescending(z => z.Base - z.Top).Take(room).OrderBy(z => z.Top)];
    }
}
