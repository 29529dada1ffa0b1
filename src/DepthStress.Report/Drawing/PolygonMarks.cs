using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>How the stress polygon marks things, on its panels and in its legend.</summary>
internal static class PolygonMarks
{
    /// <summary>The polygon of the settings' friction.</summary>
    public static CurvePen Limit { get; } = new(Palette.Ink, 1.5);

    /// <summary>The polygon of a friction coefficient of one.</summary>
    public static CurvePen Outer { get; } = new(Palette.Grey, 0.9, [5, 2.5]);

    /// <summary>What SHmax may be where it is not known.</summary>
    public static CurvePen Range { get; } = new(Palette.Rust, 1.6, [2, 1.5]);

    /// <summary>The marks in the order of the legend.</summary>
    public static IReadOnlyList<LegendEntry> Legend { get; } =
    [
        new((s, p) => s.Line(p.X - 11, p.Y, p.X + 11, p.Y, Limit), "limit by the friction coefficient of the settings"),
        new((s, p) => s.Line(p.X - 11, p.Y, p.X + 11, p.Y, Outer), "limit by a friction coefficient of 1.00"),
        new(State, "the model"),
        new((s, p) => s.Line(p.X - 11, p.Y, p.X + 11, p.Y, Range), "the model's Shmin, SHmax unknown"),
        new(Vertical, "both equal Sv"),
        new(Pore, "both equal Pp"),
    ];

    /// <summary>The model's state.</summary>
    public static void State(Sheet sheet, ScreenPoint at)
    {
        sheet.Fill(Diamond(at, 6), 0xFFFFFF);
        sheet.Fill(Diamond(at, 4.6), Palette.Rust);
    }

    /// <summary>The state of no difference between the three stresses.</summary>
    public static void Vertical(Sheet sheet, ScreenPoint at) => sheet.Fill(new OxyRect(at.X - 3, at.Y - 3, 6, 6), Palette.Ink);

    /// <summary>No effective stress.</summary>
    public static void Pore(Sheet sheet, ScreenPoint at) =>
        sheet.Fill([new(at.X - 4, at.Y + 3), new(at.X + 4, at.Y + 3), new(at.X, at.Y - 4)], Palette.Sky);

    private static ScreenPoint[] Diamond(ScreenPoint at, double half) =>
        [new(at.X - half, at.Y), new(at.X, at.Y - half), new(at.X + half, at.Y), new(at.X, at.Y + half)];
}
