namespace DepthStress.Core.Rock;

/// <summary>
/// Thomsen's parameters (1986, Weak elastic anisotropy, Geophysics 51, 1954-1966), here in their exact definitions:
/// <c>epsilon = (C11 - C33) / (2 C33)</c>, <c>gamma = (C66 - C44) / (2 C44)</c>,
/// <c>delta = ((C13 + C44)^2 - (C33 - C44)^2) / (2 C33 (C33 - C44))</c>.
/// </summary>
/// <param name="Epsilon">How much stiffer compression is along the beds than across.</param>
/// <param name="Gamma">How much stiffer shear is in the plane of the beds than across.</param>
/// <param name="Delta">How compression changes close to the normal of the beds.</param>
public readonly record struct ThomsenParameters(double Epsilon, double Gamma, double Delta)
{
    /// <summary>The parameters of a stiffness.</summary>
    public static ThomsenParameters Of(VtiStiffness c)
    {
        var (sum, difference) = (c.C13 + c.C44, c.C33 - c.C44);
        return new(
            (c.C11 - c.C33) / (2 * c.C33),
            (c.C66 - c.C44) / (2 * c.C44),
            ((sum * sum) - (difference * difference)) / (2 * c.C33 * difference));
    }

    /// <summary>The stiffness with these parameters and two stiffnesses across the beds; C13 is NaN where no real one has this delta.</summary>
    public VtiStiffness ToStiffness(double c33, double c44) =>
        new(c33 * (1 + (2 * Epsilon)), C13(c33, c44, Delta), c33, c44, c44 * (1 + (2 * Gamma)));

    /// <summary><c>sqrt((C33 - C44)^2 + 2 delta C33 (C33 - C44)) - C44</c>, the root for which <c>C13 + C44</c> is not negative.</summary>
    public static double C13(double c33, double c44, double delta)
    {
        var difference = c33 - c44;
        // Taken out of the root, so that delta = 0 gives C33 - 2 C44 as an isotropic rock has it.
        return (difference * Math.Sqrt(1 + (2 * delta * c33 / difference))) - c44;
    }
}
