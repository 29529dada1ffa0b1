using DepthStress.Core.Catalogue;
using static DepthStress.Core.Rock.StrengthEntry;

namespace DepthStress.Core.Rock;

/// <summary>Strength of sandstone from Young's modulus and porosity.</summary>
internal static class SandstoneStrength
{
    private const RockKinds Sandstone = RockKinds.Sandstone;

    private const string Compilation = "in the compilation of Chang, Zoback and Khaksar 2006, J. Petrol. Sci. Eng. 51, 223-237";

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Read("bradford-1998-sandstone", "Bradford and others' strength of sandstone from Young's modulus", Sandstone,
            [InputOf.StaticModulus], "{a} + {b} Es", (x, c) => c[0] + (c[1] * x[0]), [2.28, 4.1089],
            "weak reservoir sandstone, and worldwide; " + StaticTaken,
            "Bradford and others 1998; " + Zhang + "p. 102, eq. 3.22", WorkedExample.Computed(84.458, 5, 20)),
        Read("gulf-tertiary-sandstone-modulus", "Strength of deep Gulf of Mexico sandstone from Young's modulus", Sandstone,
            [InputOf.StaticModulus], "{a} Es^{b}", LawForms.Power, [14.86, 0.464],
            "deep Tertiary sandstone, Gulf of Mexico; " + StaticTaken,
            Zhang + "p. 102, eq. 3.23", WorkedExample.Computed(59.662, 5, 20)),
        Recalled("sandstone-modulus", "Strength of sandstone from Young's modulus", Sandstone,
            [InputOf.StaticModulus], "{a} exp({b} Es)", LawForms.Exponential, [46.2, 0.027],
            "place and range unknown; " + StaticTaken, Compilation, WorkedExample.Computed(79.280, 5, 20)),
        Recalled("vernik-1993-sandstone", "Vernik and others' strength of sandstone from porosity", Sandstone,
            [InputOf.Porosity.Only(0, 1 / 2.7).Within(0, 0.30)], "{a} (1 - {b} phi)^2", LawForms.Parabola, [254, 2.7],
            "clean, well consolidated sandstone below 30 % porosity; no result beyond 37.0 %, where the parabola turns up again",
            "Vernik and others 1993", WorkedExample.Computed(89.922, 5, 0.15)),
        Recalled("sandstone-porosity", "Strength of sandstone from porosity", Sandstone,
            [InputOf.Porosity.Within(0.002, 0.3)], "{a} exp({b} phi)", LawForms.Exponential, [277, -10],
            "sandstone of 0.2 to 30 % porosity with UCS of 2 to 360 MPa", Compilation, WorkedExample.Computed(61.807, 5, 0.15)),
    ];
}
