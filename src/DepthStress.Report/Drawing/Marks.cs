using DepthStress.Core.Calibration;
using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>Marks for observations: a disc for a value, a triangle for a bound, its tip on the side where the model must lie.</summary>
internal static class Marks
{
    private const int Corners = 16;

    /// <summary>Width of the light edge that sets a mark off from the curves behind it.</summary>
    private const double Halo = 1.2;

    /// <summary>Draws the mark of what an observation says.</summary>
    public static void Draw(Sheet sheet, ScreenPoint at, Meaning meaning, double size, int colour)
    {
        Shape(sheet, at, meaning, size + Halo, Palette.Paper);
        Shape(sheet, at, meaning, size, colour);
    }

    private static void Shape(Sheet sheet, ScreenPoint at, Meaning meaning, double size, int colour)
    {
        switch (meaning)
        {
            case Meaning.Value:
                Disc(sheet, at, size, colour);
                break;
            case Meaning.UpperBound:
                sheet.Fill([new(at.X, at.Y - size), new(at.X, at.Y + size), new(at.X - (1.6 * size), at.Y)], colour);
                break;
            case Meaning.LowerBound:
                sheet.Fill([new(at.X, at.Y - size), new(at.X, at.Y + size), new(at.X + (1.6 * size), at.Y)], colour);
                break;
        }
    }

    /// <summary>A filled disc.</summary>
    public static void Disc(Sheet sheet, ScreenPoint at, double radius, int colour) => sheet.Fill(Circle(at, radius), colour);

    /// <summary>A ring.</summary>
    public static void Ring(Sheet sheet, ScreenPoint at, double radius, CurvePen pen) => sheet.Line([.. Circle(at, radius), Circle(at, radius).First()], pen);

    private static IEnumerable<ScreenPoint> Circle(ScreenPoint at, double radius) => Enumerable.Range(0, Corners)
        .Select(k => 2 * Math.PI * k / Corners).Select(a => new ScreenPoint(at.X + (radius * Math.Cos(a)), at.Y + (radius * Math.Sin(a))));
}
