namespace DepthStress.Core.Rock;

/// <summary>
/// What gives the other three stiffnesses of a layered rock from the two that act across its beds. C66 is a constant plus a
/// multiple of C44.
/// </summary>
public readonly record struct VtiClosure
{
    private readonly bool _thomsen;
    private readonly double _first, _second, _shear, _slope;

    private VtiClosure(bool thomsen, double first, double second, double shear, double slope) =>
        (_thomsen, _first, _second, _shear, _slope) = (thomsen, first, second, shear, slope);

    /// <summary>By Thomsen's three parameters.</summary>
    public static VtiClosure Thomsen(ThomsenParameters parameters) =>
        new(true, parameters.Epsilon, parameters.Delta, 0, 1 + (2 * parameters.Gamma));

    /// <summary>By the links of <see cref="AnnieConstraints"/> and Thomsen's gamma.</summary>
    public static VtiClosure AnnieFromGamma(double c11Factor, double c12Factor, double gamma) =>
        new(false, c11Factor, c12Factor, 0, 1 + (2 * gamma));

    /// <summary>By the links of <see cref="AnnieConstraints"/> and C66 itself.</summary>
    public static VtiClosure AnnieFromC66(double c11Factor, double c12Factor, double c66) => new(false, c11Factor, c12Factor, c66, 0);

    /// <summary>
    /// By the links of <see cref="AnnieConstraints"/> and the shear wave that moves along the beds, seen obliquely:
    /// <c>rho V^2 = C66 sin^2 + C44 cos^2</c>.
    /// </summary>
    /// <param name="c11Factor">Factor of C11.</param>
    /// <param name="c12Factor">Factor of C12.</param>
    /// <param name="modulus">Its velocity squared times density.</param>
    /// <param name="angle">Angle between the hole and the normal of the beds, rad, above zero.</param>
    public static VtiClosure AnnieFromShear(double c11Factor, double c12Factor, double modulus, double angle)
    {
        var (sin, cos) = Math.SinCos(angle);
        return new(false, c11Factor, c12Factor, modulus / (sin * sin), -cos * cos / (sin * sin));
    }

    /// <summary>The whole stiffness.</summary>
    public VtiStiffness Of(double c33, double c44)
    {
        var c66 = _shear + (_slope * c44);
        if (_thomsen) return new(c33 * (1 + (2 * _first)), ThomsenParameters.C13(c33, c44, _second), c33, c44, c66);
        var c11 = AnnieConstraints.C11(c33, c44, c66, _first);
        return new(c11, AnnieConstraints.C13(c11, c66, _second), c33, c44, c66);
    }

    /// <summary>The same for stiffnesses divided by density, m2/s2.</summary>
    public VtiClosure Over(double density) => new(_thomsen, _first, _second, _shear / density, _slope);
}
