namespace DepthStress.Core.Stress;

/// <summary>
/// How the least horizontal stress follows a change of pore pressure in isotropic rock that cannot strain sideways, under a
/// vertical stress that stays: <c>A = dSh/dPp = alpha (1 - 2 nu)/(1 - nu)</c>, from the uniaxial-strain stress of
/// <see cref="StrainModel"/>; tectonic strains cancel.
/// </summary>
public static class DepletionPath
{
    /// <summary>The path coefficient; 0 for a Poisson's ratio of one half.</summary>
    /// <param name="biot">Biot's coefficient.</param>
    /// <param name="poisson">Static (drained) Poisson's ratio.</param>
    public static double Coefficient(double biot, double poisson) => biot * (1 - (2 * poisson)) / (1 - poisson);

    /// <summary>The coefficient at which normal faulting is neither approached nor left: <c>1 - 1/q</c>.</summary>
    public static double Neutral(double friction) => 1 - (1 / FrictionalLimit.Ratio(friction));
}
