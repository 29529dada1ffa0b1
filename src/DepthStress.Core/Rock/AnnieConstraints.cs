namespace DepthStress.Core.Rock;

/// <summary>
/// The links between stiffnesses of the three-parameter shale of Schoenberg, Muir and Sayers (1996, J. Seismic Exploration 5,
/// 35-49) and of its modification with two factors from core.
/// </summary>
public static class AnnieConstraints
{
    /// <summary><c>C11 = z (C33 - 2 C44 + 2 C66)</c>; z = 1 is the unmodified link.</summary>
    public static double C11(double c33, double c44, double c66, double factor) => factor * ((2 * (c66 - c44)) + c33);

    /// <summary><c>C13 = (C11 - 2 C66) / x</c>, that is <c>C12 = x C13</c>; x = 1 is the unmodified link.</summary>
    public static double C13(double c11, double c66, double factor) => (c11 - (2 * c66)) / factor;
}
