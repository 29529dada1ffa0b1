using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Lithology;

/// <summary>Catalogue entries that give porosity.</summary>
public static class PorosityMethods
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        new()
        {
            Id = "density-porosity",
            Title = "Porosity from bulk density",
            Predicts = Property.Porosity,
            Unit = Units.Fraction,
            Rocks = RockKinds.Any,
            Inputs =
            [
                new("rho_b", Property.Density, Units.GramPerCubicCentimetre),
                new("rho_ma", Property.MatrixDensity, Units.GramPerCubicCentimetre),
                new("rho_f", Property.PoreFluidDensity, Units.GramPerCubicCentimetre),
            ],
            Template = "phi = (rho_ma - rho_b) / (rho_ma - rho_f)",
            Formula = (x, _) => (x[1] - x[0]) / (x[1] - x[2]),
            ResultDomain = new(0, 1),
            Validity = "one matrix and one fluid density per zone; shale and gas bias it (common practice)",
            Source = "mass balance; printed in Hydrocarbon Exploration and Production, 2nd ed.",
            Standing = Standing.Identity,
            Example = new([2.32, 2.65, 1.0], 0.2, 2, ExampleBasis.Printed, "Rider, The Geological Interpretation of Well Logs, p. 115: sandstone of 20 % porosity in fresh water reads 2.32 g/cm3"),
        },
    ];
}
