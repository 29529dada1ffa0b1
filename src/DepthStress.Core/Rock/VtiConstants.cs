namespace DepthStress.Core.Rock;

/// <summary>
/// Engineering constants of rock that is alike in every direction along its flat beds (identities with
/// <see cref="VtiStiffness"/>, by inverting the stiffness). Vertical means across the beds.
/// </summary>
/// <param name="Vertical">Young's modulus under vertical load, Pa.</param>
/// <param name="Horizontal">Young's modulus under horizontal load, Pa.</param>
/// <param name="PoissonVertical">Horizontal strain over vertical strain under vertical load.</param>
/// <param name="PoissonHorizontal">Strain across over strain along, both horizontal, under horizontal load.</param>
/// <param name="ShearVertical">Shear modulus in vertical planes, Pa.</param>
public readonly record struct VtiConstants(
    double Vertical, double Horizontal, double PoissonVertical, double PoissonHorizontal, double ShearVertical)
{
    /// <summary>Vertical strain over horizontal strain under horizontal load: <c>nu_v Eh / Ev</c>.</summary>
    public double PoissonCross => PoissonVertical * Horizontal / Vertical;

    /// <summary>Horizontal over vertical stress without lateral strain: <c>(Eh / Ev) nu_v / (1 - nu_hh)</c>, which is <c>C13 / C33</c>.</summary>
    public double StressRatio => Horizontal / Vertical * (PoissonVertical / (1 - PoissonHorizontal));

    /// <summary>
    /// True when every strain costs energy: <c>Ev &gt; 0, Eh &gt; 0, G &gt; 0, |nu_hh| &lt; 1, 1 - nu_hh &gt; 2 nu_v^2 Eh / Ev</c>.
    /// False when one is NaN.
    /// </summary>
    public bool IsStable => ShearVertical > 0 && AreStable(Vertical, Horizontal, PoissonVertical, PoissonHorizontal);

    /// <summary>The same without the shear modulus, which no other constant limits.</summary>
    public static bool AreStable(double vertical, double horizontal, double poissonVertical, double poissonHorizontal) =>
        vertical > 0 && horizontal > 0 && Math.Abs(poissonHorizontal) < 1
        && 1 - poissonHorizontal > 2 * poissonVertical * poissonVertical * horizontal / vertical;

    /// <summary>The constants of a stiffness.</summary>
    public static VtiConstants Of(VtiStiffness c)
    {
        var sum = c.C11 + c.C12;
        var across = c.C13 * c.C13;
        var block = (c.C11 * c.C33) - across;
        return new(
            c.C33 - (2 * across / sum),
            2 * c.C66 * ((c.C33 * sum) - (2 * across)) / block,
            c.C13 / sum,
            ((c.C12 * c.C33) - across) / block,
            c.C44);
    }

    /// <summary>The stiffness that has these constants.</summary>
    public VtiStiffness ToStiffness()
    {
        var room = 1 - PoissonHorizontal - (2 * PoissonVertical * PoissonVertical * Horizontal / Vertical);
        var c66 = Horizontal / (2 * (1 + PoissonHorizontal));
        return new(
            (Horizontal / (2 * room)) + c66,
            Horizontal * PoissonVertical / room,
            Vertical * (1 - PoissonHorizontal) / room,
            ShearVertical,
            c66);
    }
}
