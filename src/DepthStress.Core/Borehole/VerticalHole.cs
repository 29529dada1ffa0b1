namespace DepthStress.Core.Borehole;

/// <summary>
/// Breakouts in a near-vertical hole by Mohr and Coulomb where the hoop stress is greatest and the mud's support least: closed
/// forms from Kirsch's hole. Total stresses and pressures in Pa; angles in rad; a width is the full opening angle of one side.
/// </summary>
public static class VerticalHole
{
    /// <summary>Greatest inclination at which a hole passes for vertical, rad: 15 deg (common practice).</summary>
    public const double MaxInclination = 15 * Math.PI / 180;

    /// <summary>Width at which hoop stress no longer depends on SHmax, rad: 120 deg.</summary>
    private const double BlindWidth = 2 * Math.PI / 3;

    /// <summary>The factor q of Mohr and Coulomb: tan^2(45 deg + phi / 2).</summary>
    public static double FrictionFactor(double frictionAngle)
    {
        var tangent = Math.Tan((Math.PI / 4) + (frictionAngle / 2));
        return tangent * tangent;
    }

    /// <summary>Width of breakouts, 0 where the wall holds, pi where it fails all round: pi - arccos[(sH + sh + thermal - UCS - (1 + q) dP) / (2 (sH - sh))], effective stresses.</summary>
    public static WallAnswer BreakoutWidth(
        double shmin, double shmax, double porePressure, double holePressure, double ucs, double frictionAngle, double inclination, double thermal = 0) =>
        Answer(inclination, () =>
        {
            var (support, difference) = (holePressure - porePressure, shmax - shmin);
            var over = shmax + shmin - (2 * porePressure) + thermal - Resistance(ucs, frictionAngle, support);
            if (double.IsNaN(over) || difference < 0) return double.NaN;
            return over >= 2 * difference ? Math.PI : over <= -2 * difference ? 0 : Math.PI - Math.Acos(over / (2 * difference));
        });

    /// <summary>
    /// SHmax that gives a width; a width of 0 is the onset, so for an interval without breakouts it is an upper bound. No answer from
    /// 120 deg on, where width no longer tells SHmax, nor where it would be below Shmin.
    /// </summary>
    public static WallAnswer ShmaxFromWidth(
        double width, double shmin, double porePressure, double holePressure, double ucs, double frictionAngle, double inclination, double thermal = 0)
    {
        if (width >= BlindWidth) return WallAnswer.None("a breakout of 120 deg or more says nothing of SHmax");
        var cosine = Math.Cos(Math.PI - width);
        var answer = Answer(inclination, () => porePressure
            + ((Resistance(ucs, frictionAngle, holePressure - porePressure) - thermal - ((shmin - porePressure) * (1 + (2 * cosine)))) / (1 - (2 * cosine))));
        return answer.Value < shmin ? WallAnswer.None("the wall breaks all round at any SHmax: the rock is too weak or the mud too light for this width") : answer;
    }

    /// <summary>
    /// SHmax from width where the rock's strength is not raised by the mud's support: [(C0 + 2 Pp + dP + sigma_dT) -
    /// Shmin (1 + 2 cos 2 theta)] / (1 - 2 cos 2 theta), 2 theta = pi - width. Source: Barton, Zoback and Burns 1988, Geophys. Res. Lett.
    /// 15:467-470. Agrees with <see cref="ShmaxFromWidth"/> at dP = 0 only.
    /// </summary>
    public static WallAnswer ShmaxFromWidthUnconfined(
        double width, double shmin, double porePressure, double holePressure, double strength, double inclination, double thermal = 0)
    {
        if (width >= BlindWidth) return WallAnswer.None("a breakout of 120 deg or more says nothing of SHmax");
        var cosine = Math.Cos(Math.PI - width);
        return Answer(inclination, () =>
            (strength + (2 * porePressure) + (holePressure - porePressure) - thermal - (shmin * (1 + (2 * cosine)))) / (1 - (2 * cosine)));
    }

    /// <summary>Pressure in the hole below which breakouts begin: [3 SH - Sh + thermal - UCS + Pp (q - 1)] / (1 + q).</summary>
    public static WallAnswer OnsetPressure(
        double shmin, double shmax, double porePressure, double ucs, double frictionAngle, double inclination, double thermal = 0) =>
        Answer(inclination, () =>
        {
            var q = FrictionFactor(frictionAngle);
            return ((3 * shmax) - shmin + thermal - ucs + (porePressure * (q - 1))) / (1 + q);
        });

    /// <summary>The answer, unless the hole is too far from vertical.</summary>
    internal static WallAnswer Answer(double inclination, Func<double> value) => inclination <= MaxInclination
        ? WallAnswer.Of(value())
        : WallAnswer.None(double.IsNaN(inclination) ? "an input is missing" : "the hole leans by more than 15 deg: formulas for a vertical hole do not hold");

    private static double Resistance(double ucs, double frictionAngle, double support) => ucs + ((1 + FrictionFactor(frictionAngle)) * support);
}
