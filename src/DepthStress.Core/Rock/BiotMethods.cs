using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give Biot's coefficient.</summary>
public static class BiotMethods
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        new()
        {
            Id = "krief-1990-biot",
            Title = "Krief's Biot coefficient from porosity",
            Predicts = Property.Biot,
            Unit = Units.One,
            Rocks = RockKinds.Any,
            Inputs = [new("phi", Property.Porosity, Units.Fraction, new(0, 0.99), Interval.All)],
            Coefficients = [new("a", 3)],
            Template = "alpha = 1 - (1 - phi)^({a} / (1 - phi))",
            Formula = (x, c) => 1 - Math.Pow(1 - x[0], c[0] / (1 - x[0])),
            ResultDomain = new(0, 1),
            Validity = "consolidated rock",
            Source = "Krief, Garat, Stellingwerff and Ventre 1990, The Log Analyst 31; coefficients recalled, not read",
            Standing = Standing.FromMemory,
            Example = new([0.2], 0.56690, 5, ExampleBasis.SelfComputed, "the formula at 20 % porosity"),
        },
    ];
}
