using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>Cuts straight lines at the edges of a box (Liang and Barsky 1984).</summary>
internal static class SegmentClip
{
    /// <summary>The part of a line inside a box; null when none is.</summary>
    public static (ScreenPoint From, ScreenPoint To)? Inside(OxyRect box, ScreenPoint from, ScreenPoint to)
    {
        var (dx, dy, first, last) = (to.X - from.X, to.Y - from.Y, 0.0, 1.0);
        ReadOnlySpan<(double Step, double Room)> edges =
        [
            (-dx, from.X - box.Left), (dx, box.Right - from.X), (-dy, from.Y - box.Top), (dy, box.Bottom - from.Y),
        ];
        foreach (var (step, room) in edges)
        {
            if (step == 0 && room < 0) return null;
            if (step < 0) first = Math.Max(first, room / step);
            else if (step > 0) last = Math.Min(last, room / step);
        }

        return first > last ? null : (new(from.X + (first * dx), from.Y + (first * dy)), new(from.X + (last * dx), from.Y + (last * dy)));
    }
}
