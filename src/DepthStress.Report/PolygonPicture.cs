using DepthStress.Core.Model;
using DepthStress.Report.Drawing;
using OxyPlot;

namespace DepthStress.Report;

/// <summary>The horizontal stresses that friction allows at some depths, with the model's own, as SVG; one panel for each depth.</summary>
public static class PolygonPicture
{
    private const double Gap = 22;
    private static readonly TextStyle Small = new(8);

    /// <summary>Writes the picture: UTF-8, the same bytes for the same model and options.</summary>
    /// <param name="model">The finished model.</param>
    /// <param name="options">Units and depths; the choice of tracks does not matter here.</param>
    /// <param name="destination">Gets the picture; stays open.</param>
    public static void Write(EarthModel model, PictureOptions options, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(options);
        ArgumentNullException.ThrowIfNull(destination);
        SvgPaper.Write(Draw(model, options), destination);
    }

    /// <summary>Draws the picture.</summary>
    internal static Sheet Draw(EarthModel model, PictureOptions options)
    {
        var states = options.Depths is { } depths
            ? [.. depths.Select(d => StressState.At(model, d.Depth, d.Kind)).OfType<StressState>()]
            : StressState.Chosen(model);
        var sheet = new Sheet(PageFrame.LongSide, PageFrame.ShortSide, $"{model.Setup.Name}: stress polygons");
        PageFrame.DrawTitle(
            sheet, model.Setup.Name, "stress polygons", $"{PageTexts.Surfaces(model.Setup.Frame, options.Units)}. {Choice(model, options)}");
        var top = PageFrame.Margin + PageFrame.TitleHeight;
        Legend.Draw(sheet, PolygonMarks.Legend, PageFrame.Margin, sheet.Width - PageFrame.Margin, top + (Legend.LineHeight / 2));
        PageFrame.DrawCaution(sheet);

        var area = new OxyRect(
            new ScreenPoint(PageFrame.Margin, top + Legend.LineHeight + 8),
            new ScreenPoint(sheet.Width - PageFrame.Margin, sheet.Height - PageFrame.Margin - PageFrame.CautionHeight(sheet.Width) - 6));
        if (states.Count == 0) sheet.Write(new ScreenPoint(area.Left, area.Top + 8), "No sample lies at these depths.", Small);
        var columns = states.Count <= 3 ? Math.Max(1, states.Count) : states.Count == 4 ? 2 : 3;
        var rows = Math.Max(1, (states.Count + columns - 1) / columns);
        var (width, height) = ((area.Width - ((columns - 1) * Gap)) / columns, (area.Height - ((rows - 1) * Gap)) / rows);
        for (var k = 0; k < states.Count; k++)
        {
            var cell = new OxyRect(area.Left + (k % columns * (width + Gap)), area.Top + (k / columns * (height + Gap)), width, height);
            PolygonPanel.Draw(sheet, states[k], PageTexts.Datum(model.Setup.Frame), options.Units, cell);
        }

        return sheet;
    }

    /// <summary>Who chose the depths.</summary>
    private static string Choice(EarthModel model, PictureOptions options)
    {
        if (options.Depths is not null) return "Depths as the well file names them, each at its nearest sample";
        return model.Setup.Zones.Any(z => z.Target)
            ? "Depths: the middle of each target zone, or the nearest sample to it with a Shmin"
            : "Depth: the middle of the profile, or the nearest sample to it with a Shmin";
    }
}
