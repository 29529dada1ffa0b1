using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;
using static DepthStress.Core.Rock.ModulusEntry;

namespace DepthStress.Core.Rock;

/// <summary>Recalled relations between dynamic and static Young's modulus of sandstone.</summary>
internal static class StaticYoungsSandstone
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Recalled("bradford-1998-sandstone-modulus", "Bradford and others' curve for weak sandstone", RockKinds.Sandstone,
            [InputOf.DynamicModulus], "Es = {a} Ed^{b}", LawForms.Power, [0.0018, 2.7],
            "weak North Sea sandstone; above Ed above 41.2 GPa", "Bradford and others 1998, SPE 47272",
            WorkedExample.Computed(5.8621, 5, 20)),
        Recalled("fei-2016-sandstone", "Fei and others' line for sandstone", RockKinds.Sandstone,
            [InputOf.DynamicModulus], "Es = {a} Ed - {b}", LawForms.LinearLess, [0.564, 3.4941],
            "sandstone, triaxial tests; below zero, so no result, below Ed 6.20 GPa", "Fei and others 2016, Electronic Journal of Geotechnical Engineering 21",
            WorkedExample.Computed(13.426, 5, 30)),
        Recalled("van-heerden-1987-10-mpa", "Van Heerden's curve at 10 MPa", RockKinds.Sandstone | RockKinds.Crystalline,
            [InputOf.DynamicModulus.Within(20, 135)], "Es = {a} Ed^{b}", LawForms.Power, [0.097, 1.485],
            "sandstone, granite and others at 10 MPa stress, Ed 20-135 GPa; above Ed above 123 GPa", VanHeerden, WorkedExample.Computed(15.146, 5, 30)),
        Recalled("van-heerden-1987-40-mpa", "Van Heerden's curve at 40 MPa", RockKinds.Sandstone | RockKinds.Crystalline,
            [InputOf.DynamicModulus.Within(20, 135)], "Es = {a} Ed^{b}", LawForms.Power, [0.152, 1.388],
            "sandstone, granite and others at 40 MPa stress, Ed 20-135 GPa; above Ed above 128 GPa", VanHeerden, WorkedExample.Computed(17.064, 5, 30)),
        Morales("morales-1993-sandstone-10-15", "10 to 15 %", 0.10, 0.15, 2.137, 0.6612, "; above Ed below 2.03 Mpsi", 3.3608e6),
        Morales("morales-1993-sandstone-15-25", "15 to 25 %", 0.15, 0.25, 1.829, 0.6920, "; above Ed below 0.868 Mpsi", 2.6480e6),
        Morales("morales-1993-sandstone-above-25", "more than 25 %", 0.25, 1, -0.4575, 0.9402, "", 0.60829e6),
    ];

    private const string VanHeerden = "van Heerden 1987, Int. J. Rock Mech. Min. Sci. 24, 381-385";

    private static Law Morales(string id, string porosity, double low, double high, double a, double b, string behaviour, double result) => Recalled(
        id, $"Morales and Marcinew's curve for sandstone of {porosity} porosity", RockKinds.Sandstone,
        [InputOf.DynamicModulus with { Unit = Units.Psi }, InputOf.Porosity.Only(low, high)],
        $"log10 Es = {{a}} + {{b}} log10 Ed, for phi of {porosity}", LawForms.Logarithmic, [a, b],
        $"high-permeability sandstone of {porosity} porosity, one of three classes, none meeting the next: a step at 15 and 25 % is no layer boundary; only psi makes sense{behaviour}",
        "Morales and Marcinew 1993, SPE 26561", WorkedExample.Computed(result, 5, 4.351132e6, 0.5 * (low + Math.Min(high, 0.35)))) with
    {
        Unit = Units.Psi,
    };
}
