namespace SampleWell;

/// <summary>Constants of the invented well's own arithmetic.</summary>
internal static class Physics
{
    /// <summary>Standard gravity, m/s2 (exact).</summary>
    public const double Gravity = 9.80665;

    /// <summary>One million psi in GPa.</summary>
    public const double GpaPerMpsi = 6.894757293168361;

    /// <summary>One foot in metres (exact).</summary>
    public const double Foot = 0.3048;

    /// <summary>Half a foot in metres: the sampling of the logs (exact).</summary>
    public const double HalfFoot = 0.1524;

    /// <summary>Slowness in us/ft times velocity in m/s.</summary>
    public const double SlownessTimesVelocity = Foot * 1e6;

    /// <summary>Pressure in MPa of a column of fluid.</summary>
    /// <param name="density">Density, kg/m3.</param>
    /// <param name="height">Vertical height, m.</param>
    public static double ColumnMpa(double density, double height) => density * Gravity * height * 1e-6;

    /// <summary>A step from 0 to 1 between <paramref name="start"/> and <paramref name="end"/> with level ends.</summary>
    public static double Smooth(double start, double end, double x)
    {
        var t = Math.Clamp((x - start) / (end - start), 0, 1);
        return t * t * (3 - 2 * t);
    }
}
