namespace DepthStress.Core.Rock;

/// <summary>
/// Biot's coefficient in both directions from drained static stiffnesses and isotropic grains (Cheng 1997, recalled, not read;
/// the isotropic limit is <c>1 - K / Ks</c>, an identity).
/// </summary>
public static class VtiBiot
{
    /// <summary><c>1 - (2 C13 + C33) / (3 Ks)</c>.</summary>
    public static double Vertical(VtiStiffness c, double grains) => 1 - (((2 * c.C13) + c.C33) / (3 * grains));

    /// <summary><c>1 - (C11 + C12 + C13) / (3 Ks)</c>.</summary>
    public static double Horizontal(VtiStiffness c, double grains) => 1 - ((c.C11 + c.C12 + c.C13) / (3 * grains));
}
