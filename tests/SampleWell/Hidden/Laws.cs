namespace SampleWell.Hidden;

/// <summary>Laws of the hidden rock. Those that carry a name are published; the others are of this invented basin.</summary>
internal static class Laws
{
    /// <summary>Static from dynamic Young's modulus, both GPa: Lacy 1997 (SPE 38716), whose coefficients take Mpsi.</summary>
    public static double Static(RockKind kind, double dynamicGpa)
    {
        var e = dynamicGpa / Physics.GpaPerMpsi;
        var (square, linear) = kind switch
        {
            RockKind.Sand => (0.0293, 0.4533),
            RockKind.Shale => (0.0428, 0.2334),
            _ => (0.018, 0.422),
        };
        return (square * e + linear) * e * Physics.GpaPerMpsi;
    }

    /// <summary>
    /// Unconfined strength, MPa. Sand: McNally 1987, fine sandstone. Shale: Horsrud 2001. Limestone and marl: a line on the static
    /// modulus, of this basin.
    /// </summary>
    public static double Strength(RockKind kind, double vp, double staticGpa) => kind switch
    {
        RockKind.Sand => 1200 * Math.Exp(-0.036 * Physics.SlownessTimesVelocity / vp),
        RockKind.Shale => 0.77 * Math.Pow(vp / 1000, 2.93),
        _ => 22 + 2.1 * staticGpa,
    };

    /// <summary>Angle of internal friction in degrees, Lal 1999 (SPE 54356).</summary>
    public static double FrictionAngle(double vp) => double.RadiansToDegrees(Math.Asin((vp - 1000) / (vp + 1000)));

    /// <summary>Biot's coefficient: the formation's mean, more where the rock is more porous than usual.</summary>
    public static double Biot(Formation formation, double porosity, double usual) =>
        Math.Clamp(formation.Biot + 1.2 * (porosity - usual), 0.4, 0.97);
}
