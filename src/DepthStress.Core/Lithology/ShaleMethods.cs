using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Lithology;

/// <summary>Catalogue entries that give shale volume.</summary>
public static class ShaleMethods
{
    private const string Public = "as printed in public shale-volume references";

    private const string Larionovs = $"Larionov 1969, {Public}; example in Asquith and Gibson 1982, fig. 38; an SPWLA 2021 abstract holds that the source was partly mistranslated";

    private static readonly LawFamily Family = new(Property.ShaleVolume, "", Units.Fraction, new(0, 1));

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Entry("linear-gamma-ray", "Shale volume equal to the gamma-ray index", "Vsh = I", LawForms.Same, [],
            "upper bound of the published curves (common practice)",
            "Asquith and Gibson 1982, Basic Well Log Analysis for Geologists", Standing.Confirmed,
            new([0.4], 0.4, 6, ExampleBasis.Identity, "the relation itself")),
        Entry("larionov-1969-tertiary", "Larionov's curve for Tertiary rock", "Vsh = {a} (2^({b} I) - 1)", Larionov, [0.083, 3.7],
            "unconsolidated Tertiary rock; reaches 0.996, not 1, at I = 1", Larionovs, Standing.Confirmed,
            new([0.115], 0.028, 2, ExampleBasis.Printed, "Asquith and Gibson 1982, fig. 38: 2.8 % at I = 0.115")),
        Entry("larionov-1969-older", "Larionov's curve for older rock", "Vsh = {a} (2^({b} I) - 1)", Larionov, [0.33, 2],
            "consolidated rock older than Tertiary; reaches 0.990, not 1, at I = 1", Larionovs, Standing.Confirmed,
            new([0.115], 0.057, 2, ExampleBasis.Printed, "Asquith and Gibson 1982, fig. 38: 5.7 % at I = 0.115")),
        Entry("clavier-1971", "Clavier's curve", "Vsh = {a} - sqrt({b} - (I + {c})^2)", Clavier, [1.7, 3.38, 0.7],
            "any age", $"Clavier and others 1971, {Public}", Standing.Confirmed, WorkedExample.Computed(0.226908, 6, 0.4)),
        Entry("steiber-1970", "Steiber's curve", "Vsh = I / ({a} - {b} I)", Steiber, [3, 2],
            "young rock of the Gulf Coast (common practice)", $"Steiber (also Stieber) 1970, {Public}", Standing.Confirmed, WorkedExample.Computed(0.181818, 6, 0.4)),
        Entry("steiber-1970-gentle", "Steiber's curve, gentler variant", "Vsh = I / ({a} - I)", (x, c) => x[0] / (c[0] - x[0]), [2],
            "a variant of Steiber's curve", Variant, Standing.FromMemory, WorkedExample.Computed(0.25, 6, 0.4)),
        Entry("steiber-1970-steep", "Steiber's curve, steeper variant", "Vsh = I / ({a} - {b} I)", Steiber, [4, 3],
            "a variant of Steiber's curve", Variant, Standing.FromMemory, WorkedExample.Computed(0.142857, 6, 0.4)),
    ];

    private const string Variant = "Steiber 1970; coefficients recalled, not read";

    private static double Larionov(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0] * (Math.Pow(2, c[1] * x[0]) - 1);

    private static double Steiber(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => x[0] / (c[0] - (c[1] * x[0]));

    private static double Clavier(ReadOnlySpan<double> x, ReadOnlySpan<double> c)
    {
        var shifted = x[0] + c[2];
        return c[0] - Math.Sqrt(c[1] - (shifted * shifted));
    }

    private static Law Entry(
        string id, string title, string template, LawFormula formula, double[] c, string validity, string source, Standing standing, WorkedExample example) =>
        Family.Entry(id, title, [InputOf.GammaRayIndex], template, formula, Coefficient.Named(c), validity, source, standing, example);
}
