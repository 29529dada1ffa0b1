namespace DepthStress.Core.Depth;

/// <summary>One station of a directional survey.</summary>
/// <param name="MeasuredDepth">Depth along the hole from the datum, m.</param>
/// <param name="Inclination">Angle from the downward vertical, rad, 0 to pi.</param>
/// <param name="Azimuth">Direction of the hole from north, clockwise seen from above, rad.</param>
public readonly record struct SurveyStation(double MeasuredDepth, double Inclination, double Azimuth);
