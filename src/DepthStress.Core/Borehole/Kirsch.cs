namespace DepthStress.Core.Borehole;

/// <summary>
/// Effective stresses in the rock around a vertical hole. Source: Kirsch 1898, as in Zoback 2007, Reservoir Geomechanics,
/// chapter 6. Pa, compression positive.
/// </summary>
public static class Kirsch
{
    /// <summary>Radial, hoop, axial and radial-hoop shear stress at a distance from the axis.</summary>
    /// <param name="vertical">Effective vertical stress.</param>
    /// <param name="shmax">Effective greater horizontal stress.</param>
    /// <param name="shmin">Effective lesser horizontal stress.</param>
    /// <param name="poisson">Static Poisson's ratio.</param>
    /// <param name="support">Pressure in the hole less pore pressure.</param>
    /// <param name="angle">Angle from the direction of SHmax, rad.</param>
    /// <param name="distance">Distance from the axis in radii of the hole, 1 or more.</param>
    public static (double Radial, double Hoop, double Axial, double Shear) At(
        double vertical, double shmax, double shmin, double poisson, double support, double angle, double distance)
    {
        var square = 1 / (distance * distance);
        var fourth = square * square;
        var (mean, half) = ((shmax + shmin) / 2, (shmax - shmin) / 2);
        var (sine, cosine) = Math.SinCos(2 * angle);
        return (
            (mean * (1 - square)) + (half * (1 - (4 * square) + (3 * fourth)) * cosine) + (support * square),
            (mean * (1 + square)) - (half * (1 + (3 * fourth)) * cosine) - (support * square),
            vertical - (4 * poisson * half * square * cosine),
            -half * (1 + (2 * square) - (3 * fourth)) * sine);
    }
}
