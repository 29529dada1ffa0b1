using DepthStress.Core.Model;
using DepthStress.Report.Drawing;
using OxyPlot;

namespace DepthStress.Report;

/// <summary>
/// The comparison curves in the stress picture: thin broken lines, each with a letter on it, and their names apart from the
/// model's own.
/// </summary>
internal static class ComparisonCurves
{
    private const double KeyLength = 26;
    private const string Letters = "ABCDEFGHJKLMNPQRSTUVWXYZ";
    private static readonly TextStyle Small = new(8);
    private static readonly TextStyle Letter = new(8, Palette.Text, true);
    private static readonly int[] Colours = [Palette.Teal, Palette.Plum];
    private static readonly double[][] Dashes = [[7, 3], [2, 2.5], [9, 2.5, 2, 2.5], [14, 4]];

    /// <summary>The curves; their labels begin with their letters.</summary>
    public static IReadOnlyList<CurveDefinition> Of(EarthModel model) =>
    [
        .. model.Comparisons.Select((curve, k) => new CurveDefinition(
            ComparisonColumns.Of(curve), Name(k) + ", " + ComparisonColumns.Of(curve).Title,
            new CurvePen(Colours[k % Colours.Length], 0.7, Dashes[k / Colours.Length % Dashes.Length]), Scale(400), Scale(60000))),
    ];

    /// <summary>True for one of the model's comparison curves.</summary>
    public static bool Has(EarthModel model, CurveDefinition curve) => model.Comparisons.Any(c => c.Law.Id == curve.Column.Symbol);

    /// <summary>The lines of names that a width takes: each name with its curve and where it begins; nothing without curves.</summary>
    public static IReadOnlyList<IReadOnlyList<(CurveDefinition? Curve, string Text, double At)>> Keys(IReadOnlyList<CurveDefinition> curves, double width)
    {
        if (curves.Count == 0) return [];
        var lines = new List<List<(CurveDefinition?, string, double)>> { new() { (null, "For comparison only, no part of the model:", 0) } };
        var at = width;
        foreach (var curve in curves)
        {
            var text = PlainText.Shorten(curve.Label, Small.Size, false, width - KeyLength - 6);
            var length = KeyLength + 6 + PlainText.Width(text, Small.Size, false);
            if (at > 0 && at + length > width)
            {
                lines.Add([]);
                at = 0;
            }

            lines[^1].Add((curve, text, at));
            at += length + 16;
        }

        return lines;
    }

    /// <summary>Draws the names.</summary>
    public static void DrawKeys(
        Sheet sheet, IReadOnlyList<IReadOnlyList<(CurveDefinition? Curve, string Text, double At)>> lines, double left, double top, double height)
    {
        for (var line = 0; line < lines.Count; line++)
        {
            var y = top + (line * height);
            foreach (var (curve, text, at) in lines[line])
            {
                if (curve is not null) sheet.Line(left + at, y, left + at + KeyLength, y, curve.Pen with { Width = curve.Pen.Width + 0.3 });
                sheet.Write(new ScreenPoint(left + at + (curve is null ? 0 : KeyLength + 6), y), text, curve is null ? new TextStyle(8, Palette.FaintText) : Small);
            }
        }
    }

    /// <summary>Draws each curve's letter on it, at depths that differ from curve to curve.</summary>
    public static void DrawLetters(Sheet sheet, TrackView view, IReadOnlyList<CurveDefinition> curves, Panel panel)
    {
        for (var k = 0; k < curves.Count; k++)
        {
            if (view.Traces.FirstOrDefault(t => t.Curve == curves[k]) is not { } trace) continue;
            var points = trace.Lines.SelectMany(l => l).Where(p => panel.Beyond(p.Value) == 0).Select(panel.ToScreen).ToList();
            if (points.Count == 0) continue;
            var (top, bottom) = (panel.Depth.ScreenTop + 14, panel.Depth.ScreenBase - 14);
            var wanted = top + ((bottom - top) * (k + 0.5) / curves.Count);
            var at = points.MinBy(p => Math.Abs(p.Y - wanted));
            var y = Math.Abs(at.Y - wanted) < (bottom - top) / (2.1 * curves.Count) ? at.Y : wanted;
            var half = (PlainText.Width(Name(k), Letter.Size, true) / 2) + 1;
            var x = Math.Clamp(at.X, panel.Left + half + 1, panel.Right - half - 1);
            sheet.Fill(new OxyRect(x - half, y - 5, 2 * half, 10), 0xFFFFFF);
            sheet.Write(new ScreenPoint(x, y), Name(k), Letter with { Colour = curves[k].Pen.Colour }, HorizontalAlignment.Center);
        }
    }

    /// <summary>A letter that no line of the picture looks like.</summary>
    private static string Name(int index) => Letters[index % Letters.Length].ToString();

    private static CurveScale Scale(double most) => new(0, most, 4, ScaleFit.RightEnd);
}
