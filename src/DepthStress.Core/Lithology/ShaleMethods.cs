using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Lithology;

/// <summary>Catalogue entries that give shale volume.</summary>
public static class ShaleMethods
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Entry("linear-gamma-ray", "Shale volume equal to the gamma-ray index", "Vsh = I", LawForms.Same, [],
            "upper bound of the published curves (common practice)",
            "Asquith and Gibson 1982, Basic Well Log Analysis for Geologists",
            new([0.4], 0.4, 6, ExampleBasis.Identity, "the relation itself")),
        Entry("larionov-1969-tertiary", "Larionov's curve for Tertiary rock", "Vsh = {a} (2^({b} I) - 1)",
            Larionov, [new("a", 0.083), new("b", 3.7)],
            "unconsolidated Tertiary rock; reaches 0.996, not 1, at I = 1",
            "Larionov 1969, as printed in public shale-volume references; example in Asquith and Gibson 1982, fig. 38",
            new([0.115], 0.028, 2, ExampleBasis.Printed, "Asquith and Gibson 1982, fig. 38: 2.8 % at I = 0.115")),
        Entry("larionov-1969-older", "Larionov's curve for older rock", "Vsh = {a} (2^({b} I) - 1)",
            Larionov, [new("a", 0.33), new("b", 2)],
            "consolidated rock older than Tertiary; reaches 0.990, not 1, at I = 1",
            "Larionov 1969, as printed in public shale-volume references; example in Asquith and Gibson 1982, fig. 38",
            new([0.115], 0.057, 2, ExampleBasis.Printed, "Asquith and Gibson 1982, fig. 38: 5.7 % at I = 0.115")),
    ];

    private static double Larionov(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0] * (Math.Pow(2, c[1] * x[0]) - 1);

    private static Law Entry(
        string id, string title, string template, LawFormula formula, Coefficient[] coefficients, string validity, string source, WorkedExample example) => new()
        {
            Id = id,
            Title = title,
            Predicts = Property.ShaleVolume,
            Unit = Units.Fraction,
            Rocks = RockKinds.Any,
            Inputs = [new("I", Property.GammaRayIndex, Units.Fraction, new(0, 1), Interval.All)],
            Coefficients = coefficients,
            Template = template,
            Formula = formula,
            ResultDomain = new(0, 1),
            Validity = validity,
            Source = source,
            Standing = Standing.Confirmed,
            Example = example,
        };
}
