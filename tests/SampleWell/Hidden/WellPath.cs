namespace SampleWell.Hidden;

/// <summary>A well that is vertical, then follows one circular arc in one vertical plane, then holds its inclination.</summary>
/// <param name="KickOff">Measured depth where the arc starts, m.</param>
/// <param name="BuildEnd">Measured depth where the arc ends, m.</param>
/// <param name="HoldDegrees">Inclination held below the arc; 0 makes a vertical well.</param>
/// <param name="AzimuthDegrees">Azimuth of the plane from grid north.</param>
public sealed record WellPath(double KickOff, double BuildEnd, double HoldDegrees, double AzimuthDegrees)
{
    /// <summary>Inclination in degrees at a measured depth in m.</summary>
    public double Inclination(double md) => HoldDegrees * Math.Clamp((md - KickOff) / (BuildEnd - KickOff), 0, 1);

    /// <summary>True vertical depth in m below the datum at a measured depth in m: vertical part, arc, straight part.</summary>
    public double Tvd(double md)
    {
        if (md <= KickOff || HoldDegrees == 0)
            return md;
        var angle = double.DegreesToRadians(Inclination(md));
        var radius = (BuildEnd - KickOff) / double.DegreesToRadians(HoldDegrees);
        return KickOff + radius * Math.Sin(angle) + Math.Max(0, md - BuildEnd) * Math.Cos(angle);
    }
}
