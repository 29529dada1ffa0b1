namespace DepthStress.Report.Drawing;

/// <summary>A point in data coordinates: a depth and a value in the units of the picture. Screen points are another type.</summary>
internal readonly record struct LogPoint(double Depth, double Value);
