using DepthStress.Core.Logs;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>A narrow strip beside a track that shows where a curve's samples came from.</summary>
internal static class OriginRibbon
{
    public const double Width = 6;

    private static readonly TextStyle Style = new(8);

    /// <summary>The colour of an origin; the weaker the origin, the more it stands out.</summary>
    public static int Colour(SampleOrigin origin) => origin switch
    {
        SampleOrigin.Measured => 0x5B8FA8,
        SampleOrigin.Spliced => 0x94BACB,
        SampleOrigin.Edited => 0xC6E0D8,
        SampleOrigin.Filled => 0xF4D35E,
        SampleOrigin.Predicted => 0xD98324,
        SampleOrigin.Extrapolated => 0xA23B72,
        SampleOrigin.Assumed => 0x2E0F26,
        _ => 0xFFFFFF,
    };

    /// <summary>The weakest origin in each row of the page: a weak stretch never hides behind a strong one.</summary>
    /// <param name="origins">The curve's origins.</param>
    /// <param name="depths">Depth of each sample, growing.</param>
    /// <param name="axis">The depth axis.</param>
    public static SampleOrigin[] Rows(OriginTrack origins, ReadOnlySpan<double> depths, DepthAxis axis)
    {
        var rows = new SampleOrigin[Math.Max(1, (int)Math.Ceiling(axis.ScreenBase - axis.ScreenTop))];
        foreach (var run in origins.Runs)
        {
            if (run.Origin == SampleOrigin.None) continue;
            var last = Math.Min(run.End, depths.Length - 1);
            var (from, to) = (Row(depths[run.Start]), Math.Max(Row(depths[run.Start]), Row(depths[last]) - (run.End < depths.Length ? 1 : 0)));
            for (var row = from; row <= to; row++)
            {
                if (run.Origin > rows[row]) rows[row] = run.Origin;
            }
        }

        return rows;

        int Row(double depth) => Math.Clamp((int)Math.Floor(axis.ToScreen(depth) - axis.ScreenTop), 0, rows.Length - 1);
    }

    /// <summary>Draws a strip.</summary>
    public static void Draw(Sheet sheet, SampleOrigin[] rows, DepthAxis axis, double left)
    {
        for (var start = 0; start < rows.Length;)
        {
            var end = start + 1;
            while (end < rows.Length && rows[end] == rows[start]) end++;
            var bottom = Math.Min(axis.ScreenBase, axis.ScreenTop + end);
            if (rows[start] != SampleOrigin.None) sheet.Fill(new OxyRect(left, axis.ScreenTop + start, Width, bottom - axis.ScreenTop - start), Colour(rows[start]));
            start = end;
        }

        sheet.Outline(new OxyRect(left, axis.ScreenTop, Width, axis.ScreenBase - axis.ScreenTop), new CurvePen(Palette.Frame, 0.4));
    }

    /// <summary>Draws the key of the colours in use, in one line.</summary>
    public static void DrawKey(Sheet sheet, IEnumerable<SampleOrigin> used, double left, double y)
    {
        const string Title = "Origin of the samples:";
        sheet.Write(new ScreenPoint(left, y), Title, Style);
        left += PlainText.Width(Title, Style.Size, false) + 8;
        foreach (var origin in used.Where(o => o != SampleOrigin.None).Distinct().Order())
        {
            sheet.Fill(new OxyRect(left, y - 4, 12, 8), Colour(origin));
            sheet.Outline(new OxyRect(left, y - 4, 12, 8), new CurvePen(Palette.Frame, 0.4));
            sheet.Write(new ScreenPoint(left + 16, y), origin.Name(), Style);
            left += 16 + PlainText.Width(origin.Name(), Style.Size, false) + 12;
        }
    }
}
