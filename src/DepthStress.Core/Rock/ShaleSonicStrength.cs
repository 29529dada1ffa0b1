using DepthStress.Core.Catalogue;
using static DepthStress.Core.Rock.StrengthEntry;

namespace DepthStress.Core.Rock;

/// <summary>Strength of shale from slowness and velocity.</summary>
internal static class ShaleSonicStrength
{
    /// <summary>The entries.</summary>
    public static IReadOnlyList<Law> All { get; } =
    [
        Read("horsrud-2001-shale", "Horsrud's strength of shale from velocity", RockKinds.Shale,
            [InputOf.Vp], "{a} Vp^{b}", LawForms.Power, [0.77, 2.93],
            "high-porosity Tertiary shale of the North Sea",
            "Horsrud 2001, SPE Drilling & Completion 16(2) 68-73, SPE 56017; " + Handbook, WorkedExample.Computed(19.251, 5, 3)),
        Slowness("gulf-pliocene-shale-slowness", "Strength of young Gulf of Mexico shale from slowness", 0.43, 3.2,
            "Pliocene and younger shale, Gulf of Mexico", 15.217),
        Slowness("worldwide-shale-slowness", "Strength of shale worldwide from slowness", 1.35, 2.6, "shale, worldwide", 24.478),
        Slowness("gulf-shale-slowness", "Strength of Gulf of Mexico shale from slowness", 0.5, 3, "shale, Gulf of Mexico", 14.158),
        Read("lal-1999-shale", "Lal's strength of shale from slowness", RockKinds.Shale,
            [InputOf.Slowness], "{a} ({b} / dt - 1)", (x, c) => c[0] * ((c[1] / x[0]) - 1), [10, 304.8],
            "high-porosity Tertiary shale of the North Sea; zero at 304.8 us/ft, no result beyond",
            "Lal 1999, SPE 54356; " + Handbook,
            new([100], 20.480, 5, ExampleBasis.Identity, "2 c cos(phi) / (1 - sin(phi)) of Lal's cohesion and friction is 10 (Vp - 1) exactly")),
    ];

    private static Law Slowness(string id, string title, double a, double b, string validity, double at100) => Read(
        id, title, RockKinds.Shale, [InputOf.Slowness], "{a} (304.8 / dt)^{b}", LawForms.SlownessPower, [a, b], validity, Handbook,
        WorkedExample.Computed(at100, 5, 100));
}
