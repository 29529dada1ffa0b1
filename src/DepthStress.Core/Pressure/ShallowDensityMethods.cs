using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Pressure;

/// <summary>Catalogue entries that give density where it is not logged, above the first log.</summary>
public static class ShallowDensityMethods
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        new()
        {
            Id = "traugott-1997",
            Title = "Traugott's mean density of sediment below the mudline",
            Predicts = Property.MeanDensityAbove,
            Unit = Units.PoundPerGallon,
            Rocks = RockKinds.Any,
            Inputs = [new("d", Property.DepthBelowSurface, Units.Foot, Interval.NotNegative, Interval.All)],
            Coefficients = [new("a", 16.3, "lb/gal"), new("b", 3125, "ft"), new("n", 0.6)],
            Template = "rho_mean = {a} + (d / {b})^{n}",
            Formula = (x, c) => c[0] + Math.Pow(x[0] / c[1], c[2]),
            Validity = "deep-water Gulf of Mexico, where no shallow density is logged; mean from the mudline to d",
            Source = "Traugott 1997, Pore/fracture pressure determinations in deep water, World Oil, Deepwater Technology supplement, August; read in Zhang 2019, Applied Petroleum Geomechanics, p. 190, eqs 6.4-6.6",
            Standing = Standing.Confirmed,
            Example = new([8103.67], 18.071328, 7, ExampleBasis.SelfComputed, "the formula 9842.52 ft below the drill floor with 1640.42 ft of water and 98.43 ft of air"),
        },
        new()
        {
            Id = "barker-wood-1997",
            Title = "Barker and Wood's mean density of sediment below the mudline",
            Predicts = Property.MeanDensityAbove,
            Unit = Units.PoundPerGallon,
            Rocks = RockKinds.Any,
            Inputs = [new("d", Property.DepthBelowSurface, Units.Foot, Interval.NotNegative, Interval.All)],
            Coefficients = [new("a", 5.3, "lb/gal"), new("b", 0.1356)],
            Template = "rho_mean = {a} d^{b}",
            Formula = LawForms.Power,
            Validity = "deep-water Gulf of Mexico; mean from the mudline to d",
            Source = "Barker and Wood 1997, coefficients recalled; the citation is listed in Zhang 2019, Applied Petroleum Geomechanics, p. 190",
            Standing = Standing.FromMemory,
            Example = new([8000], 17.9281, 6, ExampleBasis.SelfComputed, "the formula at 8000 ft"),
        },
        new()
        {
            Id = "miller-gulf",
            Title = "Miller's density of sediment near the mudline",
            Predicts = Property.ShallowDensity,
            Unit = Units.GramPerCubicCentimetre,
            Rocks = RockKinds.Any,
            Inputs = [new("d", Property.DepthBelowSurface, Units.Foot, Interval.NotNegative, Interval.All)],
            Coefficients =
            [
                new("phi_a", 0.35), new("phi_b", 0.35), new("k", 0.0035, "ft^(-1/n)"), new("n", 1.09),
                new("rho_m", 2.675, "g/cm3"), new("rho_w", 1.05, "g/cm3"),
            ],
            Template = "rho = {rho_m} (1 - phi) + {rho_w} phi, phi = {phi_a} + {phi_b} exp(-{k} d^(1/{n}))",
            Formula = Miller,
            Validity = "Gulf of Mexico coefficients; sediment that compacts normally",
            Source = "Miller, read in Zhang 2019, Applied Petroleum Geomechanics, p. 34, eqs 2.3-2.4",
            Standing = Standing.Confirmed,
            Example = new([1000], 2.027614, 7, ExampleBasis.SelfComputed, "the formula at 1000 ft"),
        },
    ];

    private static double Miller(ReadOnlySpan<double> x, ReadOnlySpan<double> c)
    {
        var porosity = c[0] + (c[1] * Math.Exp(-c[2] * Math.Pow(x[0], 1 / c[3])));
        return (c[4] * (1 - porosity)) + (c[5] * porosity);
    }
}
