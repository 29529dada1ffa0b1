namespace DepthStress.Core.Borehole;

/// <summary>Pressure in the hole at which the wall breaks in tension, Pa. Reopening is breakdown without tensile strength.</summary>
public static class BreakdownPressure
{
    /// <summary>Vertical hole, no fluid in the rock: 3 Shmin - SHmax - Pp + T. Source: Hubbert and Willis 1957, Trans. AIME 210:153-168.</summary>
    /// <param name="shmin">Total lesser horizontal stress.</param>
    /// <param name="shmax">Total greater horizontal stress.</param>
    /// <param name="porePressure">Pore pressure.</param>
    /// <param name="tensile">Tensile strength, zero or more.</param>
    /// <param name="inclination">Inclination of the hole, rad; refused above <see cref="VerticalHole.MaxInclination"/>.</param>
    /// <param name="thermal">Thermal stress at the wall.</param>
    public static WallAnswer NonPenetrating(double shmin, double shmax, double porePressure, double tensile, double inclination, double thermal = 0) =>
        VerticalHole.Answer(inclination, () => (3 * shmin) - shmax - porePressure + tensile + thermal);

    /// <summary>
    /// Vertical hole, fluid entering the rock: (3 Shmin - SHmax - 2 eta Pp + T) / (2 (1 - eta)). Source: Haimson and Fairhurst 1967,
    /// SPEJ 7:310-318 (recalled; derived again from Kirsch's hole with steady flow).
    /// </summary>
    /// <param name="shmin">Total lesser horizontal stress.</param>
    /// <param name="shmax">Total greater horizontal stress.</param>
    /// <param name="porePressure">Pore pressure.</param>
    /// <param name="tensile">Tensile strength, zero or more.</param>
    /// <param name="eta">Poroelastic factor of <see cref="Eta"/>, 0 to 0.5.</param>
    /// <param name="inclination">Inclination of the hole, rad; refused above <see cref="VerticalHole.MaxInclination"/>.</param>
    /// <param name="thermal">Thermal stress at the wall.</param>
    public static WallAnswer Penetrating(double shmin, double shmax, double porePressure, double tensile, double eta, double inclination, double thermal = 0) =>
        VerticalHole.Answer(inclination, () => ((3 * shmin) - shmax - (2 * eta * porePressure) + tensile + thermal) / (2 * (1 - eta)));

    /// <summary>alpha (1 - 2 nu) / (2 (1 - nu)), 0 to 0.5. Source: Detournay and Cheng 1988, IJRMMS 25:171-182.</summary>
    public static double Eta(double biot, double poisson) => biot * (1 - (2 * poisson)) / (2 * (1 - poisson));

    /// <summary>
    /// A hole of any direction, no fluid in the rock: the least pressure at which some point of the wall has a principal effective
    /// stress of -T. At each angle that is s + T - tau^2 / (axial + T) above pore pressure, s being the hoop stress without support.
    /// </summary>
    /// <param name="far">Total far-field stress.</param>
    /// <param name="porePressure">Pore pressure.</param>
    /// <param name="poisson">Static Poisson's ratio.</param>
    /// <param name="tensile">Tensile strength, zero or more.</param>
    /// <param name="inclination">Inclination of the hole, rad.</param>
    /// <param name="azimuth">Its azimuth, rad, from the same north as that of SHmax.</param>
    /// <param name="thermal">Thermal stress at the wall.</param>
    public static WallAnswer AnyDirection(FarField far, double porePressure, double poisson, double tensile, double inclination, double azimuth, double thermal = 0)
    {
        var wall = HoleWall.Of(far, porePressure, porePressure, poisson, inclination, azimuth, thermal);
        if (!double.IsFinite(wall.At(0).LesserInWall + tensile)) return WallAnswer.Of(double.NaN);
        if (!(wall.At(WallSearch.Least(x => wall.At(x).Axial)).Axial + tensile > 0)) return WallAnswer.None("the wall is open across the hole at any pressure");
        return WallAnswer.Of(porePressure + Above(WallSearch.Least(Above)));

        double Above(double angle)
        {
            var stress = wall.At(angle);
            return stress.Hoop + tensile - (stress.Shear * stress.Shear / (stress.Axial + tensile));
        }
    }
}
