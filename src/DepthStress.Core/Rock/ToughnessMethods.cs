using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give mode-I fracture toughness, MPa.m0.5. All coefficients were recalled.</summary>
public static class ToughnessMethods
{
    private const string Whittaker = "Whittaker, Singh and Sun 1992, Rock Fracture Mechanics";

    private static readonly LawFamily Family = new(Property.Toughness, "KIC", Units.MegapascalRootMetre, Interval.NotNegative);

    private static readonly LawInput Tensile = new("T0", Property.TensileStrength, Units.Megapascal, Interval.NotNegative, Interval.All);

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Entry("zhang-2002-tensile-toughness", "Zhang's toughness from tensile strength", Tensile, "T0 / {a}", LawForms.Share, [6.88],
            "rocks and soils of many kinds", "Zhang 2002, Int. J. Rock Mech. Min. Sci. 39", WorkedExample.Computed(0.72674, 5, 5)),
        Entry("whittaker-1992-tensile-toughness", "Whittaker's toughness from tensile strength", Tensile, "{a} T0 + {b}", LawForms.Linear, [0.107, 0.271],
            "mixed rocks; not zero where the strength is", Whittaker, WorkedExample.Computed(0.8060, 4, 5)),
        Entry("whittaker-1992-ucs-toughness", "Whittaker's toughness from unconfined strength", new("UCS", Property.Ucs, Units.Megapascal, Interval.NotNegative, Interval.All),
            "{a} UCS + {b}", LawForms.Linear, [0.006, 0.708], "mixed rocks; not zero where the strength is", Whittaker, WorkedExample.Computed(1.1880, 5, 80)),
        Entry("whittaker-1992-modulus-toughness", "Whittaker's toughness from Young's modulus", InputOf.StaticModulus, "{a} Es + {b}", LawForms.Linear, [0.026, 0.336],
            "mixed rocks; not zero where the modulus is; whether E is static was not read", Whittaker, WorkedExample.Computed(0.9860, 4, 25)),
        Entry("whittaker-1992-velocity-toughness", "Whittaker's toughness from compressional velocity", InputOf.Vp, "{a} Vp - {b}", LawForms.LinearLess, [0.65, 1.68],
            "mixed rocks; no result below 2.58 km/s, where the line passes zero", Whittaker, WorkedExample.Computed(0.9200, 4, 4)),
    ];

    private static Law Entry(
        string id, string title, LawInput input, string template, LawFormula formula, double[] c, string validity, string source, WorkedExample example) =>
        Family.Recalled(id, title, [input], template, formula, Coefficient.Named(c), validity, source, example);
}
