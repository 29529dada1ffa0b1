namespace DepthStress.Core.Depth;

/// <summary>A point of the hole; NaN throughout when the measured depth asked for is not finite.</summary>
/// <param name="MeasuredDepth">Depth along the hole from the datum, m.</param>
/// <param name="TrueVerticalDepth">Vertical depth below the datum, m.</param>
/// <param name="North">Distance north of the well head, m.</param>
/// <param name="East">Distance east of the well head, m.</param>
/// <param name="Inclination">Angle from the downward vertical, rad.</param>
/// <param name="Azimuth">Direction from north, clockwise seen from above, rad, 0 to 2 pi; means nothing where the hole is vertical.</param>
/// <param name="Extrapolated">True below the last survey station.</param>
public readonly record struct TrajectoryPoint(
    double MeasuredDepth, double TrueVerticalDepth, double North, double East, double Inclination, double Azimuth, bool Extrapolated);
