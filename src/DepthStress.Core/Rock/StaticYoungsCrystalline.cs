using DepthStress.Core.Catalogue;
using static DepthStress.Core.Rock.ModulusEntry;

namespace DepthStress.Core.Rock;

/// <summary>Recalled relations between dynamic and static Young's modulus of igneous and metamorphic rock, for basement.</summary>
internal static class StaticYoungsCrystalline
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Recalled("king-1983-crystalline", "King's line for crystalline rock", RockKinds.Crystalline,
            [InputOf.DynamicModulus.Within(40, 120)], "Es = {a} Ed - {b}", LawForms.LinearLess, [1.263, 29.5],
            "igneous and metamorphic rock, Ed 40-120 GPa; below zero, so no result, below Ed 23.4 GPa, above Ed above 112 GPa",
            "King 1983, Int. J. Rock Mech. Min. Sci. 20, 237-241", WorkedExample.Computed(46.280, 5, 60)),
        Recalled("mccann-entwisle-1992", "McCann and Entwisle's line", RockKinds.Crystalline | RockKinds.Sandstone | RockKinds.Shale,
            [InputOf.DynamicModulus], "Es = {a} Ed + {b}", LawForms.Linear, [0.69, 6.40],
            "granite and Jurassic sediments; above Ed below 20.6 GPa",
            "McCann and Entwisle 1992, Geol. Soc. Spec. Publ. 65", WorkedExample.Computed(47.80, 4, 60)),
        Recalled("mockovciakova-pandula-2003", "Line attributed to Mockovciakova and Pandula", RockKinds.Crystalline,
            [InputOf.DynamicModulus], "Es = {a} Ed - {b}", LawForms.LinearLess, [0.64, 0.32],
            "crystalline rock; attributed elsewhere to McCann and Entwisle 1992; below zero, so no result, below Ed 0.50 GPa",
            "Mockovciakova and Pandula 2003", WorkedExample.Computed(18.88, 4, 30)),
        Recalled("belikov-1970-granite", "Belikov and others' line for granite", RockKinds.Crystalline,
            [InputOf.DynamicModulus], "Es = {a} Ed - {b}", LawForms.LinearLess, [1.137, 9.685],
            "granite; below zero, so no result, below Ed 8.52 GPa, above Ed above 70.7 GPa",
            "Belikov and others 1970", WorkedExample.Computed(58.535, 5, 60)),
    ];
}
