using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>What a sheet is drawn on. Places are in 1/96 inch from the upper left corner, rounded to tenths.</summary>
internal interface IPaper
{
    /// <summary>Draws a line through two points or more, its joins round.</summary>
    void Line(IList<ScreenPoint> points, CurvePen pen);

    /// <summary>Fills a rectangle.</summary>
    void Fill(OxyRect box, int colour);

    /// <summary>Fills a polygon.</summary>
    void Fill(IList<ScreenPoint> corners, int colour);

    /// <summary>Writes clean text with the left end, middle or right end of its baseline at a point; a rotated one reads upwards.</summary>
    void Write(ScreenPoint baseline, string text, TextStyle style, HorizontalAlignment align, bool rotated);
}
