using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>
/// Catalogue entries of brittleness indices, numbers without a unit that compare only within one index. No universal relation
/// between them and fracturing is known (Mews, Alhubail and Barati 2019, Geosciences 9, 319).
/// </summary>
public static class BrittlenessMethods
{
    private static readonly LawFamily Family = new(Property.Brittleness, "B", Units.One, Interval.NotNegative);

    private static readonly LawInput Strength = new("UCS", Property.Ucs, Units.Megapascal, new(double.Epsilon, double.PositiveInfinity), Interval.All);

    private static readonly LawInput Tensile = new("T0", Property.TensileStrength, Units.Megapascal, new(double.Epsilon, double.PositiveInfinity), Interval.All);

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Entry(
            "rickman-2008", "Rickman's brittleness from static modulus and Poisson's ratio, percent",
            [
                new("Es", Property.YoungsStatic, Units.Mpsi, new(double.Epsilon, double.PositiveInfinity), new(1, 8)),
                new("nu", Property.PoissonStatic, Units.One, new(-1, 0.5), new(0.15, 0.4)),
            ],
            [new("a", 1, "Mpsi"), new("b", 8, "Mpsi"), new("c", 0.4), new("d", 0.15)], "50 (Es - {a})/({b} - {a}) + 50 ({c} - nu)/({c} - {d})",
            (x, c) => (50 * (x[0] - c[0]) / (c[1] - c[0])) + (50 * (c[2] - x[1]) / (c[2] - c[3])),
            "gas shale; the modulus is static and in Mpsi; no result below zero",
            "Rickman and others 2008, SPE 115258; numbers recalled, not read", Standing.FromMemory, WorkedExample.Computed(44.286, 5, 3, 0.25)),
        Entry(
            "strength-ratio-brittleness", "Brittleness as the ratio of compressive to tensile strength", [Strength, Tensile], [], "UCS / T0", (x, _) => x[0] / x[1],
            "the strengths must come from relations of their own: a tensile strength that is a share of UCS gives one number throughout",
            "Hucka and Das 1974, Altindag 2003; definition", Standing.Identity, new([80, 5], 16, 3, ExampleBasis.Identity, "80 over 5")),
        Entry(
            "strength-contrast-brittleness", "Brittleness as the contrast of compressive and tensile strength", [Strength, Tensile], [], "(UCS - T0) / (UCS + T0)",
            (x, _) => (x[0] - x[1]) / (x[0] + x[1]), "as for the ratio of the strengths",
            "Hucka and Das 1974; definition", Standing.Identity, new([80, 5], 0.88235, 5, ExampleBasis.Identity, "75 over 85")),
    ];

    private static Law Entry(
        string id, string title, LawInput[] inputs, Coefficient[] coefficients, string template, LawFormula formula, string validity, string source, Standing standing, WorkedExample example) =>
        Family.Entry(id, title, inputs, template, formula, coefficients, validity, source, standing, example);
}
