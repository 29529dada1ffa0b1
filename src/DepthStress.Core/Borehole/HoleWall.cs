namespace DepthStress.Core.Borehole;

/// <summary>Effective stresses at a point of the hole wall, Pa, compression positive.</summary>
/// <param name="Radial">Normal to the wall.</param>
/// <param name="Hoop">Around the hole.</param>
/// <param name="Axial">Along the hole.</param>
/// <param name="Shear">Between the last two.</param>
public readonly record struct WallStress(double Radial, double Hoop, double Axial, double Shear)
{
    /// <summary>The greater principal stress in the plane of the wall.</summary>
    public double GreaterInWall => ((Axial + Hoop) / 2) + Radius;

    /// <summary>The lesser one.</summary>
    public double LesserInWall => ((Axial + Hoop) / 2) - Radius;

    /// <summary>The three principal stresses, greatest first.</summary>
    public (double Greatest, double Middle, double Least) Principal
    {
        get
        {
            var (a, b, r) = (GreaterInWall, LesserInWall, Radial);
            return r >= a ? (r, a, b) : r >= b ? (a, r, b) : (a, b, r);
        }
    }

    private double Radius => Math.Sqrt(((Axial - Hoop) * (Axial - Hoop)) + (4 * Shear * Shear)) / 2;
}

/// <summary>
/// The wall of a round hole of any direction in linear elastic rock under plane strain. Source: Zoback 2007, Reservoir
/// Geomechanics, chapter 8 (Hiramatsu and Oka 1968), with x to the high side.
/// </summary>
/// <param name="Effective">Effective far-field stress in the frame of the hole, Pa.</param>
/// <param name="Poisson">Static Poisson's ratio.</param>
/// <param name="Support">Pressure in the hole less pore pressure, Pa.</param>
/// <param name="Thermal">
/// Stress from a change of temperature at the wall, Pa: <see cref="ThermalStress"/>; adds to the hoop and, in plane strain, to the
/// axial stress. Cooling is negative.
/// </param>
public readonly record struct HoleWall(StressTensor Effective, double Poisson, double Support, double Thermal = 0)
{
    /// <summary>The wall in a hole of a direction under far-field stress.</summary>
    /// <param name="far">Total far-field stress, Pa.</param>
    /// <param name="porePressure">Pore pressure, Pa.</param>
    /// <param name="holePressure">Pressure in the hole, Pa.</param>
    /// <param name="poisson">Static Poisson's ratio.</param>
    /// <param name="inclination">Inclination of the hole, rad.</param>
    /// <param name="azimuth">Its azimuth, rad, from the same north as that of SHmax.</param>
    /// <param name="thermal">Thermal stress at the wall, Pa.</param>
    public static HoleWall Of(FarField far, double porePressure, double holePressure, double poisson, double inclination, double azimuth, double thermal = 0) =>
        new(StressTensor.AlongHole(far.Less(porePressure), inclination, azimuth), poisson, holePressure - porePressure, thermal);

    /// <summary>E a dT / (1 - nu), Pa, dT the temperature of the wall less that of the rock: cooling lowers the hoop stress.</summary>
    /// <param name="youngs">Static Young's modulus, Pa.</param>
    /// <param name="expansion">Linear thermal expansion, 1/K.</param>
    /// <param name="warming">Wall less rock, K.</param>
    /// <param name="poisson">Static Poisson's ratio.</param>
    public static double ThermalStress(double youngs, double expansion, double warming, double poisson) => youngs * expansion * warming / (1 - poisson);

    /// <summary>The stresses at an angle from the high side, rad, clockwise looking down the hole; in a vertical hole of azimuth d from north by d.</summary>
    public WallStress At(double angle)
    {
        var (sine2, cosine2) = Math.SinCos(2 * angle);
        var (sine, cosine) = Math.SinCos(angle);
        var difference = Effective.Xx - Effective.Yy;
        return new(
            Support,
            Effective.Xx + Effective.Yy - (2 * difference * cosine2) - (4 * Effective.Xy * sine2) - Support + Thermal,
            Effective.Zz - (2 * Poisson * difference * cosine2) - (4 * Poisson * Effective.Xy * sine2) + Thermal,
            2 * ((Effective.Yz * cosine) - (Effective.Xz * sine)));
    }
}
