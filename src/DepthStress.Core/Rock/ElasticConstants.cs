namespace DepthStress.Core.Rock;

/// <summary>The other isotropic constants from Young's modulus and Poisson's ratio (identities).</summary>
public static class ElasticConstants
{
    /// <summary>Shear modulus: <c>E / (2 (1 + nu))</c>.</summary>
    public static double Shear(double youngs, double poisson) => youngs / (2 * (1 + poisson));

    /// <summary>Bulk modulus: <c>E / (3 (1 - 2 nu))</c>.</summary>
    public static double Bulk(double youngs, double poisson) => youngs / (3 * (1 - (2 * poisson)));

    /// <summary>Lame's first constant: <c>E nu / ((1 + nu)(1 - 2 nu))</c>.</summary>
    public static double Lambda(double youngs, double poisson) => youngs * poisson / ((1 + poisson) * (1 - (2 * poisson)));

    /// <summary>Plane-strain modulus: <c>E / (1 - nu^2)</c>.</summary>
    public static double PlaneStrain(double youngs, double poisson) => youngs / (1 - (poisson * poisson));
}
