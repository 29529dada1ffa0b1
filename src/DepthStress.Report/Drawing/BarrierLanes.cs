using System.Globalization;
using DepthStress.Core.Layers;
using DepthStress.Core.Quantities;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>Target zones with the stress barriers around them, one lane each.</summary>
internal static class BarrierLanes
{
    private const double LaneWidth = 17;
    private const double Gap = 4;
    private const int MostLanes = 4;
    private const double FootLine = 11;
    private static readonly TextStyle Small = new(8);
    private static readonly CurvePen Edge = new(Palette.Frame, 0.5);

    /// <summary>Names of the marks.</summary>
    public static IReadOnlyList<LegendEntry> Legend(UnitSystem units, LayerSettings settings) =>
    [
        new((s, p) => Box(s, new OxyRect(p.X - 8, p.Y - 5, 16, 10), Palette.Light(Palette.Gold)), "target zone"),
        new(
            (s, p) => Box(s, new OxyRect(p.X - 8, p.Y - 5, 16, 10), Palette.Light(Palette.Rust)),
            $"stress barrier: Shmin {units.Show(Quantity.Pressure(settings.BarrierContrast.Value))} or more above the target's at equal depth"),
    ];

    /// <summary>The width all lanes take; 0 without a target.</summary>
    public static double Width(IReadOnlyList<StressTarget> targets) => Math.Min(MostLanes, targets.Count) * (LaneWidth + Gap);

    /// <summary>The height of the words below.</summary>
    public static double FootHeight(IReadOnlyList<StressTarget> targets) =>
        (Math.Min(MostLanes, targets.Count) + (targets.Count > MostLanes ? 1 : 0)) * FootLine;

    /// <summary>Draws the lanes from left to right.</summary>
    public static void Draw(Sheet sheet, IReadOnlyList<StressTarget> targets, LayerTable table, UnitSystem units, DepthAxis axis, double left)
    {
        var length = units.UnitFor(Dimension.Length).Unit;
        double Y(double tvd) => axis.ToScreen(length.FromSi(tvd));
        for (var k = 0; k < Math.Min(MostLanes, targets.Count); k++)
        {
            var (target, x) = (targets[k], left + (k * (LaneWidth + Gap)));
            Lane(l => l.Zone == target.Zone, Palette.Gold, "target");
            foreach (var barrier in new[] { target.Above, target.Below }.OfType<StressBarrier>())
                Lane(l => l.TopMd >= barrier.TopMd && l.BaseMd <= barrier.BaseMd, Palette.Rust, $"barrier, {units.Show(Quantity.Pressure(barrier.Contrast))} more");

            void Lane(Func<Layer, bool> belongs, int colour, string name)
            {
                var layers = table.Layers.Where(belongs).ToList();
                if (layers.Count == 0) return;
                var (top, bottom) = (Y(layers.Min(l => l.TopTvd)), Y(layers.Max(l => l.BaseTvd)));
                var box = new OxyRect(x, top, LaneWidth, bottom - top);
                Box(sheet, box, Palette.Light(colour));
                if (PlainText.Width(name, Small.Size, false) + 4 <= box.Height)
                    sheet.Write(new ScreenPoint(x + (LaneWidth / 2), (top + bottom) / 2), name, Small, HorizontalAlignment.Center, true);
            }
        }
    }

    /// <summary>Says below the plots what lies around each target.</summary>
    public static void DrawFoot(Sheet sheet, IReadOnlyList<StressTarget> targets, UnitSystem units, double left, double right, double top)
    {
        var lines = targets.Take(MostLanes).Select(t => double.IsNaN(t.Shmin)
            ? $"Target {t.Zone}: no Shmin inside it"
            : $"Target {t.Zone}: barrier above {Words(t.Above, t.AboveUnknown, units)}; below {Words(t.Below, t.BelowUnknown, units)}").ToList();
        if (targets.Count > MostLanes) lines.Add(string.Create(CultureInfo.InvariantCulture, $"{targets.Count - MostLanes} more targets find no room here"));
        for (var k = 0; k < lines.Count; k++)
            sheet.Write(new ScreenPoint(left, top + ((k + 0.5) * FootLine)), PlainText.Shorten(PlainText.Clean(lines[k]), 8, false, right - left), new TextStyle(8));
    }

    private static string Words(StressBarrier? barrier, bool unknown, UnitSystem units) => barrier is null
        ? unknown ? "unknown, rock without Shmin comes first" : "none in the log"
        : $"{string.Join(" and ", barrier.Zones)}, {units.Show(Quantity.Pressure(barrier.Contrast))} more at equal depth over {units.Show(Quantity.Length(barrier.Thickness))}";

    private static void Box(Sheet sheet, OxyRect box, int colour)
    {
        sheet.Fill(box, colour);
        sheet.Outline(box, Edge);
    }
}
