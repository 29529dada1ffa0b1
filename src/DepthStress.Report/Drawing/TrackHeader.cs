using DepthStress.Core.Quantities;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>The head of a track: its title, and for each curve its name, line, unit, scale ends and how much is off the scale.</summary>
internal static class TrackHeader
{
    private const double TitleLine = 11;
    private const double CurveHeight = 26;
    private const double NoteHeight = 9;
    private static readonly TextStyle Title = new(9, Palette.Text, true);
    private static readonly TextStyle Label = new(8);
    private static readonly TextStyle Number = new(8, Palette.FaintText);

    /// <summary>The height a track's head needs in a track of some width.</summary>
    public static double Height(TrackView track, double width) =>
        (TitleLines(track, width).Count * TitleLine) + 4 + track.Traces.Sum(Height);

    /// <summary>Draws a head that ends at a line on the page; its title stands at the top of all heads.</summary>
    public static void Draw(Sheet sheet, TrackView track, UnitSystem units, double left, double right, double top, double bottom)
    {
        var y = top + (TitleLine / 2);
        foreach (var line in TitleLines(track, right - left))
        {
            sheet.Write(new ScreenPoint(left, y), line, Title);
            y += TitleLine;
        }

        y = bottom - track.Traces.Sum(Height);
        for (var i = 0; i < track.Traces.Count; i++)
        {
            DrawCurve(sheet, track.Traces[i], track.Scales[i], units, left, right, y);
            y += Height(track.Traces[i]);
        }
    }

    private static void DrawCurve(Sheet sheet, CurveTrace trace, CurveScale scale, UnitSystem units, double left, double right, double y)
    {
        var curve = trace.Curve;
        sheet.Write(new ScreenPoint(left, y + 5), PlainText.Shorten(curve.Label, Label.Size, false, right - left), Label);
        sheet.Line(left, y + 11.5, right, y + 11.5, curve.Pen with { Width = curve.Pen.Width + 0.6 });
        sheet.Write(new ScreenPoint(left, y + 18), RoundSteps.Show(scale.Left), Number);
        sheet.Write(new ScreenPoint((left + right) / 2, y + 18), curve.Column.In(units).Unit.Symbol, Number, HorizontalAlignment.Center);
        sheet.Write(new ScreenPoint(right, y + 18), RoundSteps.Show(scale.Right), Number, HorizontalAlignment.Right);
        if (trace.OffScale > 0) sheet.Write(new ScreenPoint((left + right) / 2, y + 27), PageTexts.OffScale(trace.OffScale), Number with { Colour = curve.Pen.Colour }, HorizontalAlignment.Center);
    }

    private static double Height(CurveTrace trace) => CurveHeight + (trace.OffScale > 0 ? NoteHeight : 0);

    private static IReadOnlyList<string> TitleLines(TrackView track, double width) => PlainText.Wrap(track.Definition.Title, Title.Size, true, width, 2);
}
