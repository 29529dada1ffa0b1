namespace DepthStress.Core.Depth;

/// <summary>
/// The lie of the beds. Dip and dip azimuth give the downward normal of the beds as
/// <c>(-sin d cos a, -sin d sin a, cos d)</c> north, east and down (geometry).
/// </summary>
/// <param name="Dip">Angle between the beds and the horizontal, rad, 0 to pi/2.</param>
/// <param name="DipAzimuth">The direction in which the beds go down, rad clockwise from the north that azimuths of the hole count from.</param>
public sealed record Bedding(double Dip, double DipAzimuth)
{
    /// <summary>Flat beds.</summary>
    public static Bedding Flat { get; } = new(0, 0);

    /// <summary>
    /// Angle between the hole and the normal of the beds, rad, 0 to pi/2: 0 across the beds, pi/2 along them. NaN gives NaN.
    /// </summary>
    /// <param name="inclination">Angle of the hole from the downward vertical, rad.</param>
    /// <param name="azimuth">Direction of the hole from north, rad.</param>
    public double Angle(double inclination, double azimuth)
    {
        var angle = SurveyArc.Angle(Heading.Of(inclination, azimuth), Heading.Of(-Dip, DipAzimuth));
        return Math.Min(angle, Math.PI - angle);
    }

    /// <summary>The angle at many samples, equal to <see cref="Angle"/>.</summary>
    /// <param name="inclination">Inclinations, rad.</param>
    /// <param name="azimuth">Azimuths, rad.</param>
    /// <param name="angle">Gets the angles, rad.</param>
    /// <exception cref="ArgumentException">The lengths differ.</exception>
    public void Fill(ReadOnlySpan<double> inclination, ReadOnlySpan<double> azimuth, Span<double> angle)
    {
        if (azimuth.Length != inclination.Length) throw new ArgumentException("its length differs from that of inclination", nameof(azimuth));
        if (angle.Length != inclination.Length) throw new ArgumentException("its length differs from that of inclination", nameof(angle));
        for (var i = 0; i < angle.Length; i++) angle[i] = Angle(inclination[i], azimuth[i]);
    }
}
