using DepthStress.Core.Catalogue;
using static DepthStress.Core.Rock.StrengthEntry;

namespace DepthStress.Core.Rock;

/// <summary>Strength of sandstone from slowness, velocity and density.</summary>
internal static class SandstoneSonicStrength
{
    private const RockKinds Sandstone = RockKinds.Sandstone;

    private const string Compilation = "in the compilation of Chang, Zoback and Khaksar 2006, J. Petrol. Sci. Eng. 51, 223-237";

    private static readonly LawInput[] DensityAndVp = [InputOf.Density, InputOf.VpMetre];

    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Read("mcnally-1987-sandstone", "McNally's strength of fine-grained sandstone from slowness", Sandstone,
            [InputOf.Slowness], "{a} exp({b} dt)", LawForms.Exponential, [1200, -0.036],
            "fine-grained, consolidated and unconsolidated sandstone, Bowen Basin",
            "McNally 1987; " + Zhang + "p. 100, eq. 3.17", WorkedExample.Computed(96.552, 5, 70)),
        Read("gulf-north-sea-sandstone-slowness", "Strength of Gulf of Mexico and North Sea reservoir sandstone from slowness", Sandstone,
            [InputOf.Slowness], "{a} dt^{b}", LawForms.Power, [156318, -2.064],
            "Tertiary reservoir sandstone of the Gulf of Mexico and Jurassic one of the North Sea",
            Zhang + "p. 100, eq. 3.18", WorkedExample.Computed(18.451, 5, 80)),
        Read("zhang-2013-weak-sandstone", "Zhang's strength of weak sandstone from slowness", Sandstone,
            [InputOf.Slowness], "{a} (304.8 / dt)^{b}", LawForms.SlownessPower, [0.68, 2.5],
            "weak, poorly consolidated sandstone, Gulf of Mexico and North Sea",
            "Zhang 2013; " + Zhang + "p. 100, eq. 3.19", WorkedExample.Computed(11.029, 5, 100)),
        Recalled("gulf-coast-sandstone-slowness", "Strength of weak Gulf Coast sandstone from slowness", Sandstone,
            [InputOf.Slowness], "{a} dt^{b}", LawForms.Power, [1.4138e7, -3],
            "weak, unconsolidated sandstone, Gulf Coast", Compilation, WorkedExample.Computed(8.1817, 5, 120)),
        Recalled("freyburg-1972-sandstone", "Freyburg's strength of sandstone from velocity", Sandstone,
            [InputOf.VpMetre], "{a} Vp - {b}", LawForms.LinearLess, [0.035, 31.5],
            "Thuringia; zero at 900 m/s, no result below", "Freyburg 1972", WorkedExample.Computed(108.5, 4, 4000)),
        Read("moos-1999-sandstone", "Moos and others' strength of coarse sandstone from density and velocity", Sandstone,
            DensityAndVp, "{a} rho Vp^2 + {b}", LawForms.ModulusLinear, [1.745e-9, -21],
            "coarse sandstone and conglomerate, Cook Inlet; density in kg/m3 and velocity in m/s; no result below rho Vp^2 = 12.03 GPa",
            "Moos and others 1999; " + Zhang + "pp. 101-102, eq. 3.20 (there 1.745 with g/cm3 and km/s, the same)",
            WorkedExample.Computed(48.80, 4, 2500, 4000)),
        Read("australia-sandstone-modulus", "Strength of consolidated Australian sandstone from density and velocity", Sandstone,
            DensityAndVp, "{a} exp({b} rho Vp^2)", LawForms.ModulusExponential, [42.1, 1.9e-11],
            "consolidated sandstone of 5 to 12 % porosity with UCS above 80 MPa, Australia; density in kg/m3 and velocity in m/s",
            Zhang + "p. 102, eq. 3.21 (there 1.9e-2 with g/cm3 and km/s, the same)", WorkedExample.Computed(110.159, 6, 2500, 4500)),
        Recalled("gulf-of-mexico-sandstone-modulus", "Strength of Gulf of Mexico sandstone from density and velocity", Sandstone,
            DensityAndVp, "{a} exp({b} rho Vp^2)", LawForms.ModulusExponential, [3.87, 1.14e-10],
            "Gulf of Mexico; density in kg/m3 and velocity in m/s", Compilation, WorkedExample.Computed(40.979, 5, 2300, 3000)),
        Recalled("fjaer-1992-sandstone", "Fjaer and others' strength of sandstone from sonic, density and clay", Sandstone,
            [InputOf.Density, InputOf.VpMetre, InputOf.DynamicPoisson, InputOf.Clay],
            "{a} rho^2 Vp^4 ((1 + nu) / (1 - nu))^2 (1 - 2 nu) (1 + {b} Vclay)", Fjaer, [3.3e-20, 0.78],
            "UCS above 30 MPa, Gulf Coast; density in kg/m3 and velocity in m/s; the source does not say which Poisson's ratio, the sonic one is taken",
            "Fjaer and others 1992", WorkedExample.Computed(79.053, 5, 2500, 4000, 0.25, 0.1)),
    ];

    private static double Fjaer(ReadOnlySpan<double> x, ReadOnlySpan<double> c)
    {
        double modulus = x[0] * x[1] * x[1], nu = x[2], ratio = (1 + nu) / (1 - nu);
        return c[0] * modulus * modulus * ratio * ratio * (1 - (2 * nu)) * (1 + (c[1] * x[3]));
    }
}
