using DepthStress.Core.Calibration;
using DepthStress.Core.Quantities;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>Observations over a profile of stress: a mark of what each says, with its 95 % interval, in the colour of its curve.</summary>
internal static class ObservationMarks
{
    private const double Size = 3.2;
    private const double Within = 1.96;

    private static readonly (Meaning Meaning, string Text)[] Names =
    [
        (Meaning.Value, "observed, with its 95 % interval"),
        (Meaning.UpperBound, "the curve of its colour is at most this"),
        (Meaning.LowerBound, "the curve of its colour is at least this"),
    ];

    /// <summary>The observations that speak of one of the profile's curves.</summary>
    public static IReadOnlyList<Comparison> Shown(IEnumerable<Comparison> comparisons) =>
    [
        .. comparisons.Where(c => c.Reading.Subject is Reading.Shmin or Reading.Shmax or Reading.PorePressure
            && c.Reading.Meaning != Meaning.Nothing && double.IsFinite(c.Measured)),
    ];

    /// <summary>Names of the marks that are there.</summary>
    public static IEnumerable<LegendEntry> Entries(IReadOnlyList<Comparison> shown) =>
        Names.Where(n => shown.Any(c => c.Reading.Meaning == n.Meaning))
            .Select(n => new LegendEntry((sheet, at) => Mark(sheet, at, at.X - 9, at.X + 9, n.Meaning, Palette.Ink), n.Text));

    /// <summary>Draws the observations into a panel of stress; gives how many lie off its scale.</summary>
    public static int Draw(Sheet sheet, Panel panel, IReadOnlyList<Comparison> shown, UnitSystem units, Unit unit)
    {
        var (length, off) = (units.UnitFor(Dimension.Length).Unit, 0);
        double X(double pascal) => panel.Across(Math.Clamp(unit.FromSi(pascal), panel.Scale.Low, panel.Scale.High));
        foreach (var comparison in shown)
        {
            var y = panel.Depth.ToScreen(length.FromSi(comparison.Reading.Interval.MiddleTvd));
            if (panel.Beyond(unit.FromSi(comparison.Measured)) != 0 || !(y >= panel.Depth.ScreenTop && y <= panel.Depth.ScreenBase))
            {
                off++;
                continue;
            }

            var reach = Within * comparison.Reading.Sigma;
            var at = new ScreenPoint(X(comparison.Measured), y);
            Mark(sheet, at, X(comparison.Measured - reach), X(comparison.Measured + reach), comparison.Reading.Meaning, ResidualRows.Colour(comparison.Reading));
        }

        return off;
    }

    private static void Mark(Sheet sheet, ScreenPoint at, double low, double high, Meaning meaning, int colour)
    {
        sheet.Line(low, at.Y, high, at.Y, new CurvePen(Palette.Paper, 2.6));
        sheet.Line(low, at.Y, high, at.Y, new CurvePen(colour, 1.1));
        sheet.Line(low, at.Y - 2, low, at.Y + 2, new CurvePen(colour, 1.1));
        sheet.Line(high, at.Y - 2, high, at.Y + 2, new CurvePen(colour, 1.1));
        Marks.Draw(sheet, at, meaning, Size, colour);
    }
}
