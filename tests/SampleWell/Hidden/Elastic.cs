namespace SampleWell.Hidden;

/// <summary>Elastic constants of rock that is alike in every horizontal direction. Moduli in GPa.</summary>
/// <param name="Vertical">Young's modulus across the bedding.</param>
/// <param name="Horizontal">Young's modulus along the bedding.</param>
/// <param name="PoissonVertical">Horizontal strain over vertical strain under vertical load.</param>
/// <param name="PoissonHorizontal">The same within the bedding plane.</param>
internal readonly record struct Elastic(double Vertical, double Horizontal, double PoissonVertical, double PoissonHorizontal)
{
    /// <summary>
    /// From velocities across the bedding in m/s, density in kg/m3 and Thomsen's (1986) three parameters: the five stiffnesses,
    /// then the engineering constants by inverting them.
    /// </summary>
    public static Elastic FromVelocities(double vp, double vs, double density, double epsilon, double gamma, double delta)
    {
        var c33 = density * vp * vp * 1e-9;
        var c44 = density * vs * vs * 1e-9;
        var c11 = c33 * (1 + 2 * epsilon);
        var c66 = c44 * (1 + 2 * gamma);
        var c12 = c11 - 2 * c66;
        var c13 = Math.Sqrt((c33 - c44) * (c33 - c44 + 2 * delta * c33)) - c44;
        var block = c11 * c33 - c13 * c13;
        return new(
            c33 - 2 * c13 * c13 / (c11 + c12),
            (c11 - c12) * (c33 * (c11 + c12) - 2 * c13 * c13) / block,
            c13 / (c11 + c12),
            (c12 * c33 - c13 * c13) / block);
    }

    /// <summary>The same ratios with both moduli passed through a law from dynamic to static.</summary>
    public Elastic Static(Func<double, double> law) => this with { Vertical = law(Vertical), Horizontal = law(Horizontal) };

    /// <summary>
    /// Horizontal stress in MPa of rock pressed by its overburden and strained sideways: the share of the effective vertical stress
    /// that a fixed width returns, the pore pressure, and the stress of the two strains.
    /// </summary>
    public double HorizontalStress(double sv, double pore, double biot, double strainAlong, double strainAcross) =>
        Horizontal / Vertical * PoissonVertical / (1 - PoissonHorizontal) * (sv - biot * pore) + biot * pore
        + 1000 * Horizontal / (1 - PoissonHorizontal * PoissonHorizontal) * (strainAlong + PoissonHorizontal * strainAcross);
}
