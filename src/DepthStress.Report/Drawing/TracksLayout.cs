using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>Where the parts of the track picture lie: a title, headers over tracks, two depth scales and the zones at the left.</summary>
internal sealed record TracksLayout
{
    public const double DepthWidth = 46;
    private const double Gap = 7;
    private const double RibbonGap = 2;
    private const double NarrowestTrack = 76;
    private const double WidestTrack = 150;
    private const double NarrowestPage = 520;

    /// <summary>Lays out a page; it is A4 across, narrower for a few tracks and wider for very many.</summary>
    /// <param name="ribbons">Number of origin strips of each track.</param>
    /// <param name="zoneWidth">Width of the zone strip, 0 for none.</param>
    public TracksLayout(IReadOnlyList<int> ribbons, double zoneWidth)
    {
        var count = Math.Max(1, ribbons.Count);
        ZoneLeft = PageFrame.Margin + (2 * DepthWidth);
        ZoneRight = ZoneLeft + zoneWidth;
        var first = ZoneRight + (zoneWidth > 0 ? Gap : 0);
        var strips = ribbons.Sum() * (OriginRibbon.Width + RibbonGap);
        var free = PageFrame.LongSide - PageFrame.Margin - first - strips - ((count - 1) * Gap);
        var width = Math.Clamp(free / count, NarrowestTrack, WidestTrack);
        var tracks = new List<(double Left, double Right)>();
        foreach (var n in ribbons)
        {
            tracks.Add((first, first + width));
            first += width + (n * (OriginRibbon.Width + RibbonGap)) + Gap;
        }

        Tracks = tracks;
        Right = Math.Max(first - Gap, NarrowestPage - PageFrame.Margin);
        PageWidth = Right + PageFrame.Margin;
    }

    public double PageWidth { get; }

    /// <summary>The right edge of what is drawn.</summary>
    public double Right { get; }

    public double ZoneLeft { get; }

    public double ZoneRight { get; }

    /// <summary>Left and right edge of the plot of each track.</summary>
    public IReadOnlyList<(double Left, double Right)> Tracks { get; }

    /// <summary>The left edge of a strip beside a track.</summary>
    public double RibbonLeft(int track, int ribbon) => Tracks[track].Right + RibbonGap + (ribbon * (OriginRibbon.Width + RibbonGap));

    /// <summary>The plots of all tracks together.</summary>
    public OxyRect Plots(DepthAxis depth) => new(PageFrame.Margin, depth.ScreenTop, Right - PageFrame.Margin, depth.ScreenBase - depth.ScreenTop);
}
