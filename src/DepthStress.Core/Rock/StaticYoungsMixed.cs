using DepthStress.Core.Catalogue;
using static DepthStress.Core.Rock.ModulusEntry;

namespace DepthStress.Core.Rock;

/// <summary>Recalled relations between dynamic and static Young's modulus fitted to rocks of several kinds.</summary>
internal static class StaticYoungsMixed
{
    private const RockKinds Mixed = RockKinds.Any | RockKinds.Crystalline;

    private const string EissaKazi = "Eissa and Kazi 1988, Int. J. Rock Mech. Min. Sci. 25, 479-482 (citation read)";

    private const string Brotons = "Brotons and others 2016, Materials and Structures 49, 3021-3037";

    private const string Wang = "Wang 2000, in Seismic and Acoustic Velocities in Reservoir Rocks, vol. 3";

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Recalled("eissa-kazi-1988-linear", "Eissa and Kazi's line", Mixed, [InputOf.DynamicModulus], "Es = {a} Ed - {b}",
            LawForms.LinearLess, [0.74, 0.82], "mixed rocks, 76 observations; below zero, so no result, below Ed 1.11 GPa",
            EissaKazi, WorkedExample.Computed(21.380, 5, 30)),
        Recalled("eissa-kazi-1988-log", "Eissa and Kazi's curve with density", Mixed, [InputOf.DensityGram, InputOf.DynamicModulus],
            "log10 Es = {a} + {b} log10(rho Ed)", LawForms.LogarithmicProduct, [0.02, 0.77],
            "mixed rocks; density in g/cm3, not kg/m3; above Ed below 26.3 GPa at 2.5 g/cm3. Reprints with 0.70 for 0.77 circulate and give a quarter less",
            EissaKazi, WorkedExample.Computed(29.0936, 6, 2.5, 30)),
        Recalled("wang-2000-soft", "Wang's line for soft rock", RockKinds.Any, [InputOf.DynamicModulus.Only(0, 15)], "Es = {a} Ed - {b}",
            LawForms.LinearLess, [0.4145, 1.0593],
            "Ed up to 15 GPa; below zero, so no result, below Ed 2.56 GPa. " + WangJump, Wang, WorkedExample.Computed(3.0857, 5, 10)),
        Recalled("wang-2000-hard", "Wang's line for hard rock", RockKinds.Any, [InputOf.DynamicModulus.Only(15, double.PositiveInfinity)], "Es = {a} Ed - {b}",
            LawForms.LinearLess, [1.153, 15.197],
            "Ed from 15 GPa; above Ed above 99.3 GPa. " + WangJump, Wang, WorkedExample.Computed(19.393, 5, 30)),
        Recalled("canady-2011", "Canady's curve for the full range", RockKinds.Any, [InputOf.DynamicModulus], "Es = ln(Ed + {a}) (Ed - {b}) / {c}",
            (x, c) => Math.Log(x[0] + c[0]) * (x[0] - c[1]) / c[2], [1, 2, 4.5],
            "soft to hard rock in one curve, without a join; no result below Ed 2 GPa, above Ed above 97.9 GPa",
            "Canady 2011, SPE 143604", WorkedExample.Computed(21.3670, 6, 30)),
        Recalled("brotons-2016-linear", "Brotons and others' line", Mixed, [InputOf.DynamicModulus], "Es = {a} Ed - {b}",
            LawForms.LinearLess, [0.932, 3.421],
            BrotonsRocks + " linear R2 0.97); below zero, so no result, below Ed 3.67 GPa", Brotons, WorkedExample.Computed(33.859, 5, 40)),
        Recalled("brotons-2016-log", "Brotons and others' curve with density", Mixed, [InputOf.Density, InputOf.DynamicModulus],
            "log10 Es = {a} + {b} log10(rho Ed)", LawForms.LogarithmicProduct, [-3.306, 0.967],
            BrotonsRocks + " nonlinear R2 0.99); density in kg/m3, not g/cm3", Brotons, WorkedExample.Computed(35.113, 5, 2600, 40)),
        Recalled("brotons-2016-density", "Brotons and others' power law with density", Mixed, [InputOf.Density, InputOf.DynamicModulus],
            "Es = {a} rho^{b} Ed^{c}", (x, c) => c[0] * Math.Pow(x[0], c[1]) * Math.Pow(x[1], c[2]), [11.531, -0.457, 1.251],
            BrotonsRocks + " R2 0.993 with bulk density); density in kg/m3, not g/cm3", Brotons, WorkedExample.Computed(32.019, 5, 2600, 40)),
    ];

    private const string WangJump = "The two lines do not meet: at 15 GPa they give 5.16 (soft) and 2.10 GPa (hard), so a step there is no layer boundary";

    private const string BrotonsRocks = "8 igneous, sedimentary and metamorphic rocks (read in the abstract, as is";
}
