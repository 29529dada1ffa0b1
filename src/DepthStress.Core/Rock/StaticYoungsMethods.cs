using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Rock;

/// <summary>Catalogue entries that give static Young's modulus: those whose coefficients were read, then the recalled ones.</summary>
public static class StaticYoungsMethods
{
    private const string Lacy =
        "Lacy 1997, Dynamic rock mechanics testing for optimized fracture designs, SPE 38716; read in Zhang 2019, Applied Petroleum Geomechanics, p. 67, eqs 2.64-2.66, which states the unit Mpsi";

    private static readonly LawInput DynamicMpsi = InputOf.DynamicModulus with { Unit = Units.Mpsi };

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        OfLacy("lacy-1997-sandstone", "Lacy's curve for sandstone", RockKinds.Sandstone, 0.0293, 0.4533, 2.2820),
        OfLacy("lacy-1997-shale", "Lacy's curve for shale", RockKinds.Shale, 0.0428, 0.2334, 1.6184),
        OfLacy("lacy-1997-combined", "Lacy's curve for all rocks", RockKinds.Any, 0.018, 0.422, 1.9760),
        Read("ohen-2003-shale", "Ohen's curve for shale", Units.Mpsi, DynamicMpsi, "Es = {a} Ed^{b}", LawForms.Power, [0.0158, 2.74],
            "shale of the Gulf of Mexico; both moduli in Mpsi: taken for GPa it would give more than Ed above 10.8 GPa",
            "Ohen 2003, SPE 84397 (paper number from memory); read in Zhang 2019, Applied Petroleum Geomechanics, p. 67, eq. 2.67, which states the unit Mpsi",
            WorkedExample.Computed(0.32060, 5, 3)),
        Read("horsrud-2001-shale-modulus", "Horsrud's static modulus of shale from velocity", Units.Gigapascal, InputOf.Vp, "Es = {a} Vp^{b}", LawForms.Power, [0.076, 3.23],
            "high-porosity Tertiary shale of the North Sea, from core",
            "Horsrud 2001, SPE Drilling & Completion 16(2) 68-73, SPE 56017; read in Zhang 2019, Applied Petroleum Geomechanics, p. 96, eq. 3.9",
            WorkedExample.Computed(2.6419, 5, 3.0)),
        .. StaticYoungsSandstone.All,
        .. StaticYoungsCarbonate.All,
        .. StaticYoungsMixed.All,
        .. StaticYoungsCrystalline.All,
    ];

    private static Law OfLacy(string id, string title, RockKinds rocks, double a, double b, double at4) => ModulusEntry.Of(
        id, title, rocks, Units.Mpsi, [DynamicMpsi], "Es = {a} Ed^2 + {b} Ed", LawForms.Quadratic, [a, b],
        "about 600 cores, Gulf of Mexico; both moduli in Mpsi", Lacy, Standing.Confirmed, WorkedExample.Computed(at4, 5, 4));

    private static Law Read(
        string id, string title, Unit unit, LawInput input, string template, LawFormula formula, double[] c, string validity, string source, WorkedExample example) =>
        ModulusEntry.Of(id, title, RockKinds.Shale, unit, [input], template, formula, c, validity, source, Standing.Confirmed, example);
}
