using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give static Poisson's ratio.</summary>
public static class StaticPoissonMethods
{
    /// <summary>The choice that takes the dynamic ratio.</summary>
    public static Law EqualToDynamic { get; } = new()
    {
        Id = "equal-to-dynamic",
        Title = "Static Poisson's ratio equal to the dynamic one",
        Predicts = Property.PoissonStatic,
        Unit = Units.One,
        Rocks = RockKinds.Any,
        Inputs = [new("nu_d", Property.PoissonDynamic, Units.One, new(-1, 0.5), new(0.05, 0.45))],
        Template = "nu_s = nu_d",
        Formula = LawForms.Same,
        Validity = "the sonic value is undrained; a drained value is lower, and the least stress with it",
        Source = "Zhang 2019, Applied Petroleum Geomechanics, p. 72 (data too scattered for a correlation), citing Yale and Jamieson 1994, SPE 27939",
        Standing = Standing.Confirmed,
        Example = new([0.25], 0.25, 6, ExampleBasis.Identity, "the choice itself"),
    };

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } = [EqualToDynamic];
}
