namespace DepthStress.Report.Drawing;

/// <summary>Depth on the page, growing downwards.</summary>
internal sealed record DepthAxis
{
    /// <summary>Lays depths from top to base, in the picture's unit, on the page from one line to another.</summary>
    public DepthAxis(double top, double bottom, double screenTop, double screenBase)
    {
        if (!(bottom > top)) (top, bottom) = double.IsFinite(top) ? (top - 1, top + 1) : (0, 1);
        (Top, Base, ScreenTop, ScreenBase) = (top, bottom, screenTop, screenBase);
    }

    public double Top { get; }

    public double Base { get; }

    public double ScreenTop { get; }

    public double ScreenBase { get; }

    /// <summary>The depth that one screen unit spans.</summary>
    public double Pixel => (Base - Top) / (ScreenBase - ScreenTop);

    /// <summary>Where a depth lies on the page.</summary>
    public double ToScreen(double depth) => ScreenTop + ((depth - Top) / Pixel);

    /// <summary>The round step of its labels, so far apart at least.</summary>
    public double Step(double spacing) => RoundSteps.Step(Base - Top, (ScreenBase - ScreenTop) / spacing);
}
