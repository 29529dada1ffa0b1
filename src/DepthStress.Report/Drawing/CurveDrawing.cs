
namespace DepthStress.Report.Drawing;

/// <summary>Draws one curve into its panel: the parts on the scale as lines, the parts beyond it as marks at the edge.</summary>
internal static class CurveDrawing
{
    private const double MarkHeight = 5;
    private const double MarkDepth = 4;
    private const double Lone = 0.6;

    /// <summary>Draws a curve.</summary>
    /// <param name="sheet">The page.</param>
    /// <param name="panel">Where.</param>
    /// <param name="trace">The curve.</param>
    /// <param name="rank">Number of the curve in its track, so that marks of different curves stand side by side.</param>
    public static void Draw(Sheet sheet, Panel panel, CurveTrace trace, int rank)
    {
        foreach (var line in trace.Lines)
        {
            foreach (var part in OnScale(line, panel.Scale)) DrawPart(sheet, panel, part, trace.Curve.Pen);
        }

        foreach (var (side, top, bottom) in OffScale(trace.Lines, panel)) Mark(sheet, panel, side, top, bottom, rank, trace.Curve.Pen.Colour);
    }

    /// <summary>The parts of a line inside the scale, cut exactly at its ends.</summary>
    internal static IEnumerable<IReadOnlyList<LogPoint>> OnScale(IReadOnlyList<LogPoint> line, CurveScale scale)
    {
        var part = new List<LogPoint>();
        for (var i = 0; i < line.Count; i++)
        {
            var here = line[i];
            var inside = here.Value >= scale.Low && here.Value <= scale.High;
            if (i > 0) part.AddRange(Crossings(line[i - 1], here, scale));
            if (inside)
            {
                part.Add(here);
            }
            else if (part.Count > 0)
            {
                yield return part;
                part = [];
            }
        }

        if (part.Count > 0) yield return part;
    }

    /// <summary>Runs of points beyond an edge, as spans on the page; runs too near for two marks are joined.</summary>
    internal static IReadOnlyList<(int Side, double Top, double Base)> OffScale(IReadOnlyList<IReadOnlyList<LogPoint>> lines, Panel panel)
    {
        var spans = new List<(int Side, double Top, double Base)>();
        foreach (var side in (ReadOnlySpan<int>)[-1, 1])
        {
            var before = spans.Count;
            foreach (var line in lines)
            {
                foreach (var point in line)
                {
                    if (panel.Beyond(point.Value) != side) continue;
                    var y = panel.Depth.ToScreen(point.Depth);
                    if (spans.Count > before && Math.Abs(y - spans[^1].Base) <= MarkHeight + 1) spans[^1] = (side, Math.Min(y, spans[^1].Top), Math.Max(y, spans[^1].Base));
                    else spans.Add((side, y, y));
                }
            }
        }

        return spans;
    }

    private static IEnumerable<LogPoint> Crossings(LogPoint a, LogPoint b, CurveScale scale)
    {
        if (a.Value == b.Value) yield break;
        var (first, second) = a.Value < b.Value ? (scale.Low, scale.High) : (scale.High, scale.Low);
        if (IsBetween(first, a.Value, b.Value)) yield return At(first, a, b);
        if (IsBetween(second, a.Value, b.Value)) yield return At(second, a, b);
    }

    private static bool IsBetween(double level, double a, double b) => (level - a) * (level - b) < 0;

    private static LogPoint At(double level, LogPoint a, LogPoint b) =>
        new(a.Depth + ((b.Depth - a.Depth) * ((level - a.Value) / (b.Value - a.Value))), level);

    private static void DrawPart(Sheet sheet, Panel panel, IReadOnlyList<LogPoint> part, CurvePen pen)
    {
        var points = part.Select(panel.ToScreen).ToList();
        if (points.TrueForAll(p => Math.Abs(p.X - points[0].X) < Lone && Math.Abs(p.Y - points[0].Y) < Lone))
            sheet.Line(points[0].X, points[0].Y - Lone, points[0].X, points[0].Y + Lone, pen with { Width = pen.Width + 0.6, Dash = null });
        else
            sheet.Line(points, pen);
    }

    private static void Mark(Sheet sheet, Panel panel, int side, double top, double bottom, int rank, int colour)
    {
        var edge = side < 0 ? panel.Left + (rank * MarkDepth) : panel.Right - (rank * MarkDepth);
        var (middle, inner) = ((top + bottom) / 2, edge - (side * MarkDepth));
        sheet.Line(edge, top, edge, bottom, new CurvePen(colour, 1.6));
        sheet.Fill([new(edge, middle), new(inner, middle - (MarkHeight / 2)), new(inner, middle + (MarkHeight / 2))], colour);
    }
}
