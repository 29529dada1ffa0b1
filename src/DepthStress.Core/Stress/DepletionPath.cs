namespace DepthStress.Core.Stress;

/// <summary>
/// How the least horizontal stress follows a change of pore pressure in rock that cannot strain sideways, under a
/// vertical stress that stays: <c>A = dSh/dPp = alpha (1 - 2 nu)/(1 - nu)</c>, from the uniaxial-strain stress of
/// <see cref="StrainModel"/>; tectonic strains cancel.
/// </summary>
public static class DepletionPath
{
    /// <summary>The path coefficient; 0 for a Poisson's ratio of one half.</summary>
    /// <param name="biot">Biot's coefficient.</param>
    /// <param name="poisson">Static (drained) Poisson's ratio.</param>
    public static double Coefficient(double biot, double poisson) => biot * (1 - (2 * poisson)) / (1 - poisson);

    /// <summary>
    /// The same of rock with flat beds, from <see cref="VtiStrainModel"/>: <c>a_h - a_v (Eh/Ev) nu_v/(1 - nu_hh)</c>; equal constants
    /// both ways give the isotropic coefficient.
    /// </summary>
    /// <param name="biotVertical">Biot's coefficient across the beds.</param>
    /// <param name="biotHorizontal">Biot's coefficient along the beds.</param>
    /// <param name="stiffnessRatio">Static Young's modulus along the beds over that across them.</param>
    /// <param name="poissonVertical">Horizontal over vertical strain under vertical load.</param>
    /// <param name="poissonHorizontal">The same within the plane of the beds.</param>
    public static double Coefficient(double biotVertical, double biotHorizontal, double stiffnessRatio, double poissonVertical, double poissonHorizontal) =>
        biotHorizontal - (biotVertical * stiffnessRatio * poissonVertical / (1 - poissonHorizontal));

    /// <summary>The coefficient at which normal faulting is neither approached nor left: <c>1 - 1/q</c>.</summary>
    public static double Neutral(double friction) => 1 - (1 / FrictionalLimit.Ratio(friction));
}
