using OxyPlot;

namespace DepthStress.Report.Drawing;

/// <summary>Where a curve's data lies on the page: one scale across, the depth axis down.</summary>
/// <param name="Left">Left edge on the page.</param>
/// <param name="Right">Right edge on the page.</param>
/// <param name="Scale">Values at the edges.</param>
/// <param name="Depth">The depth axis.</param>
internal sealed record Panel(double Left, double Right, CurveScale Scale, DepthAxis Depth)
{
    /// <summary>Where a value lies across.</summary>
    public double Across(double value) => Left + ((value - Scale.Left) / (Scale.Right - Scale.Left) * (Right - Left));

    /// <summary>Where a data point lies on the page.</summary>
    public ScreenPoint ToScreen(LogPoint point) => new(Across(point.Value), Depth.ToScreen(point.Depth));

    /// <summary>The edge a value is beyond: -1 left, 1 right, 0 on the scale.</summary>
    public int Beyond(double value) =>
        value < Scale.Low ? (Scale.Left <= Scale.Right ? -1 : 1) : value > Scale.High ? (Scale.Left <= Scale.Right ? 1 : -1) : 0;
}
