using DepthStress.Core.Rock;

namespace DepthStress.Core.Layers;

/// <summary>Elastic rock with flat beds and fluid in its pores: what a solver needs of it beside density.</summary>
/// <param name="Stiffness">Drained static stiffness, Pa.</param>
/// <param name="BiotVertical">Biot's coefficient across the beds.</param>
/// <param name="BiotHorizontal">Biot's coefficient along the beds.</param>
public readonly record struct PorousRock(VtiStiffness Stiffness, double BiotVertical, double BiotHorizontal)
{
    /// <summary>
    /// Total horizontal stress along one axis under vertical stress and lateral strains, Pa, compression positive:
    /// <c>C13/C33 (Sv - a_v p) + a_h p + (C11 - C13^2/C33) e + (C12 - C13^2/C33) e'</c> (identity; it is the stress of the profile's
    /// strain model, written with stiffnesses).
    /// </summary>
    /// <param name="vertical">Vertical total stress, Pa.</param>
    /// <param name="pore">Pore pressure, Pa.</param>
    /// <param name="along">Strain along the axis, compression positive.</param>
    /// <param name="across">Strain along the other horizontal axis.</param>
    public double Horizontal(double vertical, double pore, double along, double across)
    {
        var c = Stiffness;
        var bound = c.C13 * c.StressRatio;
        return (c.StressRatio * (vertical - (BiotVertical * pore))) + (BiotHorizontal * pore) + ((c.C11 - bound) * along) + ((c.C12 - bound) * across);
    }

    /// <summary>
    /// The isotropic rock that carries the same horizontal stress under equal lateral strains (identity):
    /// <c>nu/(1 - nu) = C13/C33, E/(1 - nu) = C11 + C12 - 2 C13^2/C33</c>, and one Biot's coefficient
    /// <c>(a_h - a_v C13/C33)/(1 - C13/C33)</c>. Under unequal strains the mean of the two stresses is kept, their difference is not.
    /// </summary>
    public IsotropicRock Isotropic()
    {
        var c = Stiffness;
        var ratio = c.StressRatio;
        var poisson = ratio / (1 + ratio);
        return new((c.C11 + c.C12 - (2 * c.C13 * ratio)) * (1 - poisson), poisson, (BiotHorizontal - (ratio * BiotVertical)) / (1 - ratio));
    }
}

/// <summary>Isotropic elastic rock with fluid in its pores.</summary>
/// <param name="Youngs">Young's modulus, Pa.</param>
/// <param name="Poisson">Poisson's ratio.</param>
/// <param name="Biot">Biot's coefficient.</param>
public readonly record struct IsotropicRock(double Youngs, double Poisson, double Biot)
{
    /// <summary>True for rock that a solver can take: <c>E &gt; 0, -1 &lt; nu &lt; 1/2</c>, and a coefficient that is a number.</summary>
    public bool IsStable => Youngs > 0 && Poisson is > -1 and < 0.5 && double.IsFinite(Biot);

    /// <summary>The same with its stiffness.</summary>
    public PorousRock ToPorous() => new(VtiStiffness.Isotropic(Youngs, Poisson), Biot, Biot);
}
