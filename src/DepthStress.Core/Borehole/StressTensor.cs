namespace DepthStress.Core.Borehole;

/// <summary>Far-field stress: one principal stress vertical, two horizontal, Pa, compression positive.</summary>
/// <param name="Vertical">The vertical one.</param>
/// <param name="Shmax">The greater horizontal one.</param>
/// <param name="Shmin">The lesser horizontal one.</param>
/// <param name="ShmaxAzimuth">
/// Direction of the greater horizontal one, rad, clockwise from the same north that the survey's azimuths count from: only the
/// difference between it and the hole's azimuth matters.
/// </param>
public readonly record struct FarField(double Vertical, double Shmax, double Shmin, double ShmaxAzimuth)
{
    /// <summary>The effective stresses (coefficient 1) at a pore pressure, Pa.</summary>
    public FarField Less(double porePressure) => this with { Vertical = Vertical - porePressure, Shmax = Shmax - porePressure, Shmin = Shmin - porePressure };
}

/// <summary>A symmetric stress tensor in the frame of a hole, Pa, compression positive: x to the high side, y to the right looking down the hole, z along the hole downwards.</summary>
public readonly record struct StressTensor(double Xx, double Yy, double Zz, double Xy, double Xz, double Yz)
{
    /// <summary>
    /// Far-field stress seen along a hole: from axes north, east, down by S = R S R^T, the rows of R being
    /// (cos d cos f, sin d cos f, -sin f), (-sin d, cos d, 0), (cos d sin f, sin d sin f, cos f), with azimuth d and inclination f.
    /// So x points to the high side; the form with x to the low side differs by 180 degrees. Sources: Hiramatsu and Oka 1968;
    /// Peska and Zoback 1995, J. Geophys. Res. 100:12791-12811 (recalled); equal components are derived here.
    /// </summary>
    /// <param name="far">The stresses, total or effective.</param>
    /// <param name="inclination">Inclination of the hole, rad.</param>
    /// <param name="azimuth">Azimuth of the hole, rad, from the north of <see cref="FarField.ShmaxAzimuth"/>.</param>
    public static StressTensor AlongHole(FarField far, double inclination, double azimuth)
    {
        // Only the angle between the hole and SHmax enters; principal stresses lie along SHmax, across it, and down.
        var (sd, cd) = Math.SinCos(azimuth - far.ShmaxAzimuth);
        var (sf, cf) = Math.SinCos(inclination);
        (double A, double B, double C) x = (cd * cf, sd * cf, -sf), y = (-sd, cd, 0), z = (cd * sf, sd * sf, cf);
        return new(Part(x, x), Part(y, y), Part(z, z), Part(x, y), Part(x, z), Part(y, z));

        double Part((double A, double B, double C) u, (double A, double B, double C) v) =>
            (far.Shmax * u.A * v.A) + (far.Shmin * u.B * v.B) + (far.Vertical * u.C * v.C);
    }
}
