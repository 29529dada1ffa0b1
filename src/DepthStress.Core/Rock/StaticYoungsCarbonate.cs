using DepthStress.Core.Catalogue;
using static DepthStress.Core.Rock.ModulusEntry;

namespace DepthStress.Core.Rock;

/// <summary>Recalled relations between dynamic and static Young's modulus of limestone and dolomite.</summary>
internal static class StaticYoungsCarbonate
{
    private const string Brotons = "Brotons and others 2014, Bull. Eng. Geol. Environ. 73, 791";

    private const string Najibi = "Najibi and others 2015, J. Petrol. Sci. Eng. 126, 78-82";

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Recalled("ameen-2009-carbonate", "Ameen and others' line for Arab-D carbonate", RockKinds.Limestone | RockKinds.Dolomite,
            [InputOf.DynamicModulus], "Es = {a} Ed + {b}", LawForms.Linear, [0.541, 12.852],
            "Arab-D carbonate; above Ed below 28.0 GPa", "Ameen and others 2009, Mar. Petrol. Geol. 26, 430-444",
            WorkedExample.Computed(29.082, 5, 30)),
        Recalled("najibi-2015-limestone", "Najibi and others' curve for limestone", RockKinds.Limestone,
            [InputOf.DynamicModulus], "Es = {a} Ed^{b}", LawForms.Power, [0.014, 1.96],
            "Asmari and Sarvak limestone; above Ed above 85.3 GPa", Najibi, WorkedExample.Computed(29.930, 5, 50)),
        Recalled("najibi-2015-limestone-velocity", "Najibi and others' static modulus of limestone from velocity", RockKinds.Limestone,
            [InputOf.Vp], "Es = {a} Vp^{b}", LawForms.Power, [0.169, 3.324],
            "Asmari and Sarvak limestone", Najibi, WorkedExample.Computed(35.585, 5, 5)),
        Recalled("brotons-2014-calcarenite", "Brotons and others' line for calcarenite", RockKinds.Limestone,
            [InputOf.DynamicModulus], "Es = {a} Ed - {b}", LawForms.LinearLess, [0.867, 2.085],
            "San Julian calcarenite, 24 specimens (citation and number read, coefficients not); below zero, so no result, below Ed 2.40 GPa",
            Brotons, WorkedExample.Computed(15.255, 5, 20)),
        Recalled("brotons-2014-calcarenite-density", "Brotons and others' curve for calcarenite with density", RockKinds.Limestone,
            [InputOf.Density, InputOf.DynamicModulus], "log10 Es = {a} + {b} log10(rho Ed)", LawForms.LogarithmicProduct, [-4.71, 1.28],
            "San Julian calcarenite, 24 specimens (citation and number read, coefficients not); density in kg/m3, not g/cm3",
            Brotons, WorkedExample.Computed(18.127, 5, 2300, 20)),
    ];
}
