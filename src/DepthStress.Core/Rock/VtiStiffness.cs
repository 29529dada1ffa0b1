namespace DepthStress.Core.Rock;

/// <summary>
/// The five stiffnesses of rock that is alike in every direction along its beds, axis 3 across the beds, Pa (or divided by
/// density, m2/s2). <c>C12 = C11 - 2 C66</c> (Berryman, Grechka and Berge 1997: <c>a = b + 2 m</c>).
/// </summary>
/// <param name="C11">Compression along the beds.</param>
/// <param name="C13">Between along and across.</param>
/// <param name="C33">Compression across the beds.</param>
/// <param name="C44">Shear in planes across the beds.</param>
/// <param name="C66">Shear in the plane of the beds.</param>
public readonly record struct VtiStiffness(double C11, double C13, double C33, double C44, double C66)
{
    /// <summary>Between the two directions along the beds.</summary>
    public double C12 => C11 - (2 * C66);

    /// <summary>
    /// True when every strain costs energy (positive definite): <c>C44 &gt; 0, C66 &gt; 0, C33 &gt; 0, (C11 + C12) C33 &gt; 2 C13^2</c>.
    /// False when one is NaN.
    /// </summary>
    public bool IsStable => C44 > 0 && C66 > 0 && C33 > 0 && (C11 + C12) * C33 > 2 * C13 * C13;

    /// <summary>Horizontal over vertical stress without lateral strain, <c>C13 / C33</c>.</summary>
    public double StressRatio => C13 / C33;

    /// <summary>Isotropic rock of a Young's modulus and a Poisson's ratio.</summary>
    public static VtiStiffness Isotropic(double youngs, double poisson)
    {
        var (shear, lambda) = (ElasticConstants.Shear(youngs, poisson), ElasticConstants.Lambda(youngs, poisson));
        return new(lambda + (2 * shear), lambda, lambda + (2 * shear), shear, shear);
    }
}
